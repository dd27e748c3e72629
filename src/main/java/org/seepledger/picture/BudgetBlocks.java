package org.seepledger.picture;

import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.unit.Figures;

/**
 * A budget as three blocks to scale: what the prism gains, what it loses, and what closes the gap between the two, storage
 * and the residual. The third block begins at the height of the losses and ends, with the residual, at the height of the
 * gains.
 */
public final class BudgetBlocks {

    private static final double FEWEST_OF_ALL = 0.012;
    private static final int MOST_SLICES = 8;

    /** Which flows of an item are shown. */
    public enum Flows {
        /** What comes in under gains and what goes out under losses, though both be of one item. */
        GROSS,
        /** The difference of the two, on the side where it is positive. */
        NET
    }

    private final String prism;
    private final PeriodBudget budget;
    private final Flows flows;
    private final UnitShown unit;
    private final Slices slices;
    private final double gains;
    private final double losses;
    private final double storage;
    private final double residual;

    private BudgetBlocks(String prism, PeriodBudget budget, Flows flows, UnitShown unit) {
        this.prism = prism;
        this.budget = budget;
        this.flows = flows;
        this.unit = unit;
        this.slices = Slices.of(budget, flows, unit);
        this.gains = Slices.sum(slices.gains());
        this.losses = Slices.sum(slices.losses());
        this.storage = unit.of(budget.totals().storageChange(), budget.period());
        this.residual = unit.of(budget.totals().residual(), budget.period());
    }

    /**
     * {@return the blocks of a budget}
     *
     * @param prism the prism's name
     * @param budget its budget in a period
     * @param flows which flows of an item are shown
     * @param unit the unit to show
     * @param width in logical pixels, at least 340
     */
    public static Picture of(String prism, PeriodBudget budget, Flows flows, UnitShown unit, double width) {
        return new BudgetBlocks(prism, budget, flows, unit).picture(width);
    }

    private Picture picture(double width) {
        BlockSheet sheet = new BlockSheet(width, Math.min(0, losses + Math.min(0, known(storage))), top());
        List<Block> third = third();
        sheet.column(0, "Gains", Figures.typeset(gains), stacked(slices.gains(), Ink.Token.GAIN));
        sheet.column(1, "Losses", Figures.typeset(losses), stacked(slices.losses(), Ink.Token.LOSS));
        sheet.bridge(gains, losses, third, Double.isNaN(storage));
        sheet.words(equation());
        if (!slices.unknown().isEmpty()) {
            sheet.words("Not counted, since no number can be given: "
                    + slices.unknown().stream().map(name -> name + "\u00a0–").collect(Collectors.joining(", ")) + ".");
        }
        return new Picture(
                width,
                sheet.height(),
                "Gains, losses and storage of " + prism + ", " + budget.period().name(),
                description(),
                sheet.marks());
    }

    private List<Block> stacked(List<Slice> all, Ink.Token ink) {
        List<Slice> few = Slices.merged(all, FEWEST_OF_ALL * Math.max(gains, losses), MOST_SLICES);
        return Block.stack(few, ink, ink == Ink.Token.GAIN ? Mark.Texture.RISING : Mark.Texture.FALLING);
    }

    /** {@return storage and the residual, as shares of throughput; where storage is not known, the gap alone} */
    private List<Block> third() {
        double most = unit.of(
                flows == Flows.GROSS
                        ? budget.totals().throughput()
                        : budget.totals().netThroughput(),
                budget.period());
        if (Double.isNaN(storage)) {
            double gap = gains - losses;
            return List.of(
                    new Block("not explained", gap, most, losses, gains, Ink.Token.RESIDUAL, Mark.Texture.PLAIN));
        }
        String verb = storage < 0 ? "storage gives" : "storage takes";
        double level = losses + storage;
        return List.of(
                new Block(verb, Math.abs(storage), most, losses, level, Ink.Token.STORAGE, Mark.Texture.DOTS),
                new Block("residual", residual, most, level, gains, Ink.Token.RESIDUAL, Mark.Texture.CROSSED));
    }

    private double top() {
        double top = Math.max(Math.max(gains, losses), losses + known(storage));
        return top > 0 ? top : 1;
    }

    private static double known(double value) {
        return Double.isFinite(value) ? value : 0;
    }

    private String equation() {
        String sides = "Gains " + Figures.typeset(gains) + " = losses " + Figures.typeset(losses);
        if (Double.isNaN(storage)) {
            return sides + " + not explained " + Figures.typeset(gains - losses) + ", in " + unit.words()
                    + ". Storage is not known: the open block is change in storage and residual together.";
        }
        return sides + " + change in storage " + Figures.typeset(storage) + " + residual " + Figures.typeset(residual)
                + ", in " + unit.words() + "; heights are to scale."
                + (flows == Flows.NET ? " Of each item the net flow is shown." : "")
                + " Within the period storage gave "
                + Figures.typeset(stored(Entry::inflow)) + " and took " + Figures.typeset(stored(Entry::outflow)) + ".";
    }

    private double stored(ToDoubleFunction<Entry> side) {
        double volume = budget.entries().stream()
                .filter(entry -> entry.account().group() == Group.STORAGE
                        && entry.account().quantified())
                .mapToDouble(side)
                .sum();
        return unit.of(volume, budget.period());
    }

    private String description() {
        return equation()
                + largest(" The largest gains: ", slices.gains())
                + largest(" The largest losses: ", slices.losses());
    }

    private static String largest(String begin, List<Slice> slices) {
        return slices.isEmpty()
                ? ""
                : begin
                        + slices.stream()
                                .limit(3)
                                .map(slice -> slice.name() + " " + Figures.typeset(slice.amount()))
                                .collect(Collectors.joining(", "))
                        + ".";
    }
}
