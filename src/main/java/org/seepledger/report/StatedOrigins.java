package org.seepledger.report;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Source;
import org.seepledger.io.result.Provenance;
import org.seepledger.ledger.Group;

/**
 * What the set states of where the terms of a budget come from. Sides and lids have what is stated of flow, storage items
 * what is stated of storage, sources what is stated of theirs; wells with a category of their own have what is stated of
 * the source that lists them.
 */
public final class StatedOrigins {

    private final List<Provenance> flow = new ArrayList<>();
    private final List<Provenance> storage = new ArrayList<>();
    private final List<Provenance> sources = new ArrayList<>();
    private final Map<String, Set<String>> categories = new HashMap<>();

    private StatedOrigins() {}

    /**
     * {@return what a set states}
     *
     * @param aquifer the set
     * @param origins what it states: of flow, of storage if there is any, then of each source
     */
    public static StatedOrigins of(Aquifer aquifer, List<Provenance> origins) {
        StatedOrigins stated = new StatedOrigins();
        for (int i = 0; i < origins.size(); i++) {
            String term = origins.get(i).term();
            boolean isFlow = i == 0 && term.equals("flow");
            boolean isStorage = i == 1 && term.equals("storage");
            (isFlow ? stated.flow : isStorage ? stated.storage : stated.sources).add(origins.get(i));
        }
        for (Source source : aquifer.sources()) {
            stated.add(source.category(), source.category());
            if (source instanceof Source.Points points) {
                points.wells().forEach(well -> stated.add(well.category(), points.category()));
            }
        }
        return stated;
    }

    private void add(String item, String source) {
        categories.computeIfAbsent(item, key -> new LinkedHashSet<>()).add(source);
    }

    /**
     * {@return what is stated of a term}
     *
     * @param term the term
     */
    public List<Provenance> of(Term term) {
        if (term.group() == Group.SOURCE) {
            Set<String> from = categories.getOrDefault(term.item(), Set.of(term.item()));
            return sources.stream()
                    .filter(origin -> from.contains(origin.term()))
                    .toList();
        }
        return term.group() == Group.STORAGE ? storage : flow;
    }

    /**
     * {@return one stated standard deviation of a term, in percent; the largest where several sources make it up; empty
     * unless each of them states one in percent}
     *
     * @param term the term
     */
    public OptionalDouble percent(Term term) {
        List<Provenance> origins = of(term);
        return origins.stream().allMatch(origin -> origin.percent().isPresent())
                ? origins.stream()
                        .mapToDouble(origin -> origin.percent().getAsDouble())
                        .max()
                : OptionalDouble.empty();
    }

    /**
     * {@return whether a term, or part of it, was computed so that the budget closes}
     *
     * @param term the term
     */
    public boolean byDifference(Term term) {
        return of(term).stream().anyMatch(Provenance::byDifference);
    }
}
