package org.seepledger.job;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Grid;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WaterBalance;
import org.seepledger.balance.WellRule;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.VerticalRange;
import org.seepledger.progress.Progress;
import org.seepledger.report.InspectionText;
import org.seepledger.report.ValueRange;

/** Reads everything that a set has and says what it is, where it does not balance, and what looks wrong. */
public final class InspectJob {

    private static final String WHOLE = "the whole grid";

    private InspectJob() {}

    /**
     * Inspects a set.
     *
     * @param folder the aquifer folder
     * @param threads how many threads may work
     * @param progress told how far the work is
     * @return the report, lines of text
     * @throws org.seepledger.fault.DataFault if something is wrong with the set
     */
    public static String run(Path folder, int threads, Progress progress) {
        try (AquiferFolder opened = AquiferReader.open(folder)) {
            return of(opened, threads, progress).text();
        }
    }

    /**
     * Inspects a set that is open.
     *
     * @param opened the set
     * @param threads how many threads may work
     * @param progress told how far the work is
     * @return what was found
     * @throws org.seepledger.fault.DataFault if something is wrong with its values
     */
    static Inspection of(AquiferFolder opened, int threads, Progress progress) {
        Aquifer aquifer = opened.aquifer();
        List<ValueRange> ranges = Survey.of(aquifer, opened.quantities(), progress);
        Prism whole = whole(aquifer);
        Balance balance = WaterBalance.of(aquifer, List.of(whole), WellRule.POINT, threads, progress);
        PeriodBudget record = balance.ledgers().get(0).budget(new Periods(aquifer.times()).record());
        RunWarnings words = new RunWarnings(aquifer, balance.notes());
        List<String> warnings = new ArrayList<>(opened.warnings());
        warnings.addAll(Plausibility.doubts(ranges));
        warnings.addAll(PorosityDoubts.of(aquifer, opened.solutes(), progress));
        warnings.addAll(HeadDoubts.of(aquifer));
        warnings.addAll(words.warningsOfSet(List.of(record)));
        List<String> notes = new ArrayList<>(opened.notes());
        notes.addAll(words.remarks(WellRule.POINT));
        return new Inspection(new InspectionText(opened, ranges, balance, record).write(warnings, notes), warnings);
    }

    /** The grid as a prism, from its south-western corner counter-clockwise. */
    private static Prism whole(Aquifer aquifer) {
        Grid grid = aquifer.grid();
        double width = grid.x().edge(grid.columns());
        double height = grid.y().edge(grid.rows());
        List<Side> sides = List.of(
                side("lower y edge", grid, 0, 0),
                side("upper x edge", grid, width, 0),
                side("upper y edge", grid, width, height),
                side("lower x edge", grid, 0, height));
        VerticalRange all = new VerticalRange.Layers(0, aquifer.layers().size() - 1);
        return new Prism(WHOLE, List.of(new Ring(1, 0, sides)), all);
    }

    private static Side side(String name, Grid grid, double localX, double localY) {
        return new Side(name, name, grid.mapX(localX, localY), grid.mapY(localX, localY));
    }
}
