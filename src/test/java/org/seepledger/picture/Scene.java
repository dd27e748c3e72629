package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.GivenFaceFlow;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Layer;
import org.seepledger.aquifer.PointRate;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Storage;
import org.seepledger.aquifer.Times;
import org.seepledger.aquifer.Well;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.unit.Measure;

/** Something to draw: 30 by 20 cells of 10 m, layers from 100 to 90 and from 90 to 70 m, head at 95 m. */
final class Scene {

    static final Grid GRID = new Grid(Axis.even(1000, 10, 30), Axis.even(2000, 10, 20), 0, 1);

    private Scene() {}

    static Aquifer aquifer(Well... wells) {
        GriddedValues nothing = GriddedValues.constant(0);
        return new Aquifer(
                "scene",
                GRID,
                List.of(
                        new Layer("sand", Optional.of(GriddedValues.constant(100)), GriddedValues.constant(90), true),
                        new Layer("gravel", Optional.empty(), GriddedValues.constant(70), false)),
                new Times(new double[] {0, 10}, Measure.of("d"), Optional.empty()),
                new GivenFaceFlow(
                        nothing, nothing, Optional.of(nothing), Optional.empty(), Optional.empty(), Optional.empty()),
                Optional.of(GriddedValues.constant(95)),
                Storage.NONE,
                List.of(new Source.Points("pumping", List.of(wells))),
                Measure.of("m"),
                Measure.of("d"));
    }

    static Well well(String name, double x, double y, Screen screen) {
        return Well.of(List.of(new PointRate(
                        name,
                        "pumping",
                        x,
                        y,
                        screen,
                        Double.NEGATIVE_INFINITY,
                        Double.POSITIVE_INFINITY,
                        -5,
                        "wells.csv, line 2")))
                .get(0);
    }

    /** A budget over 10 d with the given net rates, the keys as {@code side:item} or {@code lid:item}. */
    static PeriodBudget budget(Map<String, Double> net) {
        List<Account> accounts = new ArrayList<>();
        double[] inflow = new double[net.size()];
        double[] outflow = new double[net.size()];
        net.forEach((key, rate) -> {
            String[] parts = key.split(":");
            Group group = parts[0].equals("side") ? Group.SIDE : Group.LID;
            inflow[accounts.size()] = Math.max(rate, 0);
            outflow[accounts.size()] = Math.max(-rate, 0);
            accounts.add(new Account(group, parts[1], 0, !Double.isNaN(rate)));
        });
        Ledger ledger = new Ledger("a", accounts, true, new double[][] {inflow}, new double[][] {outflow});
        return ledger.budget(new Period("record", 0, 10, List.of(new Period.Part(0, 10))));
    }

    /** All marks, those of groups too. */
    static Stream<Mark> flat(List<Mark> marks) {
        return marks.stream().flatMap(mark -> mark instanceof Mark.Group group ? flat(group.marks()) : Stream.of(mark));
    }

    static List<Mark.Text> texts(Picture picture) {
        return flat(picture.marks())
                .filter(Mark.Text.class::isInstance)
                .map(Mark.Text.class::cast)
                .toList();
    }
}
