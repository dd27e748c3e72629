package org.seepledger.aquifer;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/**
 * How a block of cells answers to what was given: its state in an interval as a linear function of one quantity, while
 * all else is as it stands.
 *
 * <p>Flow rests on the given face flows; on the flux at centres, while thicknesses stand; or on the heads, while
 * conductances stand. Sources rest on their rates, storage on its coefficients or supplied rates, wells on theirs. The
 * answers come from the same code that works out the state, fed with ones and zeros.
 */
public final class Response {

    /**
     * A quantity that the state rests on.
     *
     * @param values the quantity
     * @param step the interval, or for what does not change 0, that its values are to be read at
     * @param flow whether it drives flow through faces, where a value acts on its cell and the eight around it; else it
     *     acts on its own cell alone
     */
    public record Input(GriddedValues values, int step, boolean flow) {}

    private final IntervalState state;
    private final LinearFlow flow;
    private final List<CellTerm> units;
    private final List<WellRate> unitWells;
    private final List<Input> inputs = new ArrayList<>();
    private final FaceFlows still;
    private final List<CellTerm> noTerms;
    private final List<WellRate> noWells;
    private final int drivers;

    Response(Aquifer aquifer, int interval, IntervalState state, List<GivenTerm> given, List<WellRate> unitWells) {
        this.state = state;
        boolean[] active = state.flows().active();
        this.flow = aquifer.flow().linear(interval, state.geometry(), state.saturation(), active);
        aquifer.flow().drivers(aquifer).forEach(values -> inputs.add(new Input(values, interval, true)));
        this.drivers = inputs.size();
        given.forEach(term -> inputs.add(new Input(term.values(), interval, false)));
        this.units = given.stream().map(GivenTerm::perUnit).toList();
        this.unitWells = unitWells;
        this.still = FaceFlows.still(state.flows().block(), active);
        double[] zeros = new double[still.block().size()];
        this.noTerms = units.stream().map(term -> term.with(zeros)).toList();
        this.noWells = unitWells.stream()
                .map(rate -> new WellRate(rate.well(), rate.layer(), 0))
                .toList();
    }

    /**
     * {@return the state as it stands}
     */
    public IntervalState state() {
        return state;
    }

    /**
     * {@return the quantities that the state rests on, wells apart}
     */
    public List<Input> inputs() {
        return inputs;
    }

    /**
     * {@return the state if one quantity were 1 in some cells, and it and all others were 0 elsewhere}
     *
     * @param input the quantity, as its place in {@link #inputs()}
     * @param layer the layer of the cells that are acted on or, for flow, that the values are in
     * @param lit by cell of the block's window, row-major, whether the value is 1 there
     */
    public IntervalState unit(int input, int layer, boolean[] lit) {
        boolean[] active = still.active();
        double[][] drive = new double[drivers][active.length];
        List<CellTerm> terms = new ArrayList<>(noTerms);
        double[] rates = input < drivers ? drive[input] : new double[active.length];
        for (int i = 0; i < lit.length; i++) {
            int cell = layer * lit.length + i;
            double unit = input < drivers ? 1 : units.get(input - drivers).rates()[cell];
            rates[cell] = lit[i] && active[cell] ? unit : 0;
        }
        if (input < drivers) {
            return new IntervalState(state.geometry(), state.saturation(), flow.of(drive), terms, noWells);
        }
        terms.set(input - drivers, units.get(input - drivers).with(rates));
        return new IntervalState(state.geometry(), state.saturation(), still, terms, noWells);
    }

    /**
     * {@return the state if the mean rate of some wells were 1, and all else were 0}
     *
     * @param lit the wells, of those that the state has
     */
    public IntervalState unit(Set<PlacedWell> lit) {
        List<WellRate> wells = unitWells.stream()
                .map(rate -> lit.contains(rate.well()) ? rate : new WellRate(rate.well(), rate.layer(), 0))
                .toList();
        return new IntervalState(state.geometry(), state.saturation(), still, noTerms, wells);
    }
}
