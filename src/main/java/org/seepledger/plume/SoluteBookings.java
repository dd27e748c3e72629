package org.seepledger.plume;

import java.util.List;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.balance.Bookings;

/** Books what the water of one prism carries of a solute, in one band and interval, and what the prism holds of it. */
final class SoluteBookings implements Bookings {

    private static final int CHOICES = NonDetects.values().length;

    /** By what share more water than pores may drain before it counts: rounding. */
    private static final double ROUNDING = 1e-9;

    private final SoluteChart chart;
    private final IntervalState state;
    private final SoluteState solute;
    private final List<? extends Bookings> flows;
    private final SoluteTally tally;
    private final double length;
    private final Counting counting;
    private int row;
    private int column;
    private int inside;
    private int outside;
    private int adder;
    private int giver;
    private int layer;
    private int heldIn = -1;
    private double drained;
    private double poresDrained;
    private boolean aboveInColumn;
    private boolean aboveBefore;
    private final double[] held = new double[CHOICES];

    /**
     * What is counted beside flows.
     *
     * @param firstLayer the prism's first layer
     * @param start whether what is held at the interval's begin is asked for
     * @param above the concentration above which volume and area are counted, mass/length³; infinite for none
     */
    record Counting(int firstLayer, boolean start, double above) {}

    SoluteBookings(
            SoluteChart chart,
            IntervalState state,
            SoluteState solute,
            SoluteTally tally,
            double length,
            Counting counting) {
        this(chart, state, solute, tally.flows(), tally, length, counting);
    }

    /** Books flows elsewhere than in a tally, for each way to count non-detects. */
    SoluteBookings(
            SoluteChart chart,
            IntervalState state,
            SoluteState solute,
            List<? extends Bookings> flows,
            SoluteTally tally,
            double length,
            Counting counting) {
        this.flows = flows;
        this.chart = chart;
        this.state = state;
        this.solute = solute;
        this.tally = tally;
        this.length = length;
        this.counting = counting;
    }

    @Override
    public void at(int cellRow, int cellColumn) {
        finish();
        flows.forEach(sink -> sink.at(cellRow, cellColumn));
        row = cellRow;
        column = cellColumn;
        aboveInColumn = false;
        aboveBefore = false;
    }

    @Override
    public void between(int insideCell, int outsideCell) {
        inside = insideCell;
        outside = outsideCell;
    }

    @Override
    public void throughPiece(int account, double start, double end) {
        if (start != 0 || end != 0) {
            boolean out = start + end >= 0;
            for (int choice = 0; choice < CHOICES; choice++) {
                double carried = upstream(choice, out);
                flows.get(choice).throughPiece(account, carried * start, carried * end);
            }
        }
    }

    @Override
    public void throughFace(int account, double out) {
        if (out != 0) {
            for (int choice = 0; choice < CHOICES; choice++) {
                flows.get(choice).throughFace(account, upstream(choice, out > 0) * out);
            }
        }
    }

    /** The concentration of the cell that the water leaves. A piece within a cell has that cell on both sides. */
    private double upstream(int choice, boolean out) {
        if (out || outside >= 0) {
            return solute.mean().needed(choice, out ? inside : outside);
        }
        double given = solute.boundary().map(values -> values[inside]).orElse(Double.NaN);
        return Double.isNaN(given) ? solute.mean().needed(choice, inside) : given;
    }

    @Override
    public void from(int cell, int ofWhich) {
        adder = cell;
        giver = ofWhich;
    }

    @Override
    public void added(int account, double rate) {
        if (rate == 0) {
            return;
        }
        boolean term = giver < state.terms().size();
        if (term && state.terms().get(giver).storage()) {
            addStorage(state.terms().get(giver), rate);
            return;
        }
        for (int choice = 0; choice < CHOICES; choice++) {
            double carried = rate < 0
                    ? solute.mean().needed(choice, adder)
                    : solute.carried().get(giver).map(values -> values[adder]).orElse(0.0);
            flows.get(choice).added(account, (Double.isNaN(carried) ? 0 : carried) * rate);
        }
    }

    private void addStorage(CellTerm term, double rate) {
        for (int choice = 0; choice < CHOICES; choice++) {
            double mass = solute.mean().needed(choice, adder) * rate;
            if (term.entry() == CellTerm.Entry.WHERE_IT_PASSES) {
                held[choice] -= mass;
            } else {
                flows.get(choice).added(chart.elastic(layer), mass);
            }
        }
        if (term.entry() == CellTerm.Entry.WHERE_IT_PASSES) {
            drained += rate * length;
        }
    }

    @Override
    public void holds(int cellLayer, int cell, double share, double floor, double ceiling) {
        finish();
        layer = cellLayer - counting.firstLayer();
        CellGeometry geometry = state.geometry();
        double area = share * geometry.grid().area(row, column);
        double bottom = Math.max(geometry.bottom(cell), floor);
        double before = Math.max(
                0, Math.min(geometry.bottom(cell) + state.saturation().thicknessBefore(cell), ceiling) - bottom);
        double after =
                Math.max(0, Math.min(geometry.bottom(cell) + state.saturation().thickness(cell), ceiling) - bottom);
        if (before <= 0 && after <= 0) {
            return;
        }
        heldIn = layer;
        if (counting.start()) {
            aboveBefore |= held(cell, area, bottom, before).count(solute.start(), tally.start(), aboveBefore);
        }
        aboveInColumn |= held(cell, area, bottom, after).count(solute.end(), tally.end(), aboveInColumn);
        for (int choice = 0; choice < CHOICES; choice++) {
            bookRock(choice, cell, area * before, area * after);
        }
        addDoubts(cell);
        poresDrained = solute.matrix().dissolved(cell, 1) * area * (before - after);
    }

    private Holding held(int cell, double area, double bottom, double height) {
        Grid grid = state.geometry().grid();
        int fromSouth = grid.flipped(row);
        double x = grid.x().edge(column) + 0.5 * grid.x().size(column);
        double y = grid.y().edge(fromSouth) + 0.5 * grid.y().size(fromSouth);
        double[] centre = {x, y, bottom + 0.5 * height};
        return new Holding(solute.matrix(), cell, layer, area, height, centre, counting.above());
    }

    private void addDoubts(int cell) {
        Grid grid = state.geometry().grid();
        tally.doubts().addDecay(solute.matrix().dissolvedDecay(cell) * length);
        tally.doubts().addDecay(solute.matrix().sorbedDecay(cell) * length);
        tally.doubts()
                .addDispersivity(
                        0.5 * Math.max(grid.width(column), grid.height(row)),
                        solute.matrix().longitudinal()[cell]);
    }

    /** Books what follows from saturated rock inside at both ends: change of mass, what stays above water, decay. */
    private void bookRock(int choice, int cell, double before, double after) {
        double change =
                mass(solute, solute.end(), choice, cell, after) - mass(solute, solute.start(), choice, cell, before);
        flows.get(choice).added(chart.massChange(layer), -change / length);
        held[choice] = mass(solute, solute.mean(), choice, cell, before - after) / length;
        double decays = decay(solute, choice, cell, before, after);
        if (decays != 0) {
            flows.get(choice).added(chart.decay(layer), -decays);
        }
        solute.parent().ifPresent(parent -> {
            double produced = solute.matrix().yield(cell) * decay(parent, choice, cell, before, after);
            if (produced != 0) {
                flows.get(choice).added(chart.production(layer), produced);
            }
        });
    }

    private static double mass(SoluteState of, Reading when, int choice, int cell, double rock) {
        if (rock == 0) {
            return 0;
        }
        double concentration = when.needed(choice, cell);
        return rock * (of.matrix().dissolved(cell, concentration) + of.matrix().sorbed(cell, concentration));
    }

    /** What decays of both phases, by the mean of both ends, mass/time. */
    private static double decay(SoluteState of, int choice, int cell, double before, double after) {
        double dissolved = of.matrix().dissolvedDecay(cell);
        double sorbed = of.matrix().sorbedDecay(cell);
        if (dissolved == 0 && sorbed == 0) {
            return 0;
        }
        return 0.5
                * (decay(of.matrix(), dissolved, sorbed, cell, before, of.start(), choice)
                        + decay(of.matrix(), dissolved, sorbed, cell, after, of.end(), choice));
    }

    private static double decay(
            Matrix matrix, double dissolved, double sorbed, int cell, double rock, Reading when, int choice) {
        if (rock == 0) {
            return 0;
        }
        double concentration = when.needed(choice, cell);
        return rock * (dissolved * matrix.dissolved(cell, concentration) + sorbed * matrix.sorbed(cell, concentration));
    }

    /** Books what was held back of the last cell. */
    void finish() {
        if (heldIn < 0) {
            return;
        }
        for (int choice = 0; choice < CHOICES; choice++) {
            if (held[choice] != 0) {
                flows.get(choice).added(chart.held(heldIn), -held[choice]);
            }
        }
        if (Math.abs(drained) > Math.abs(poresDrained) * (1 + ROUNDING)) {
            tally.doubts().addDrainsMoreThanPores();
        }
        heldIn = -1;
        drained = 0;
        poresDrained = 0;
    }

    @Override
    public void fromVolume(double out, double gross) {
        // The water's budget has checked its two routes.
    }

    @Override
    public void inactive(int cellLayer, double area) {
        // The water's budget tells the area that takes no part.
    }
}
