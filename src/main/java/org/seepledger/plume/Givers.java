package org.seepledger.plume;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Well;

/** Which of the set's sources each term and well of an interval's state belongs to. */
final class Givers {

    /** Stands for what is no source: storage. */
    static final int NONE = -1;

    private final List<Integer> terms = new ArrayList<>();
    private final Map<Well, Integer> sourceOfWell = new IdentityHashMap<>();

    Givers(Aquifer aquifer) {
        for (int i = 0; i < aquifer.sources().size(); i++) {
            if (aquifer.sources().get(i) instanceof Source.Points points) {
                for (Well well : points.wells()) {
                    sourceOfWell.put(well, i);
                }
            } else {
                terms.add(i);
            }
        }
    }

    /** The source of each term, {@link #NONE} for storage, and then of each well. */
    List<Integer> of(IntervalState state) {
        List<Integer> sources = new ArrayList<>(terms);
        while (sources.size() < state.terms().size()) {
            sources.add(NONE);
        }
        state.wells().forEach(rate -> sources.add(sourceOfWell.get(rate.well().well())));
        return sources;
    }
}
