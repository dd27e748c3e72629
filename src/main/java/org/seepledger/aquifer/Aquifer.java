package org.seepledger.aquifer;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.DoubleUnaryOperator;
import org.seepledger.unit.Measure;

/**
 * An aquifer: what is known, as suppliers by interval and window.
 *
 * @param name its name
 * @param grid the grid
 * @param layers the layers from the top down
 * @param times the instants
 * @param flow what was given of flow
 * @param head heads at instants, negative infinity where a cell is dry
 * @param storage what is known of storage
 * @param sources what adds and takes water
 * @param lengthUnit the set's length unit
 * @param timeUnit the set's time unit
 */
public record Aquifer(
        String name,
        Grid grid,
        List<Layer> layers,
        Times times,
        Flow flow,
        Optional<GriddedValues> head,
        Storage storage,
        List<Source> sources,
        Measure lengthUnit,
        Measure timeUnit)
        implements KnownCells {

    /** The storage item that specific yield gives. */
    public static final String WATER_TABLE_STORAGE = "water-table storage";

    /** The storage item that specific storage gives. */
    public static final String ELASTIC_STORAGE = "elastic storage";

    /** Copies the lists. */
    public Aquifer {
        layers = List.copyOf(layers);
        sources = List.copyOf(sources);
    }

    /**
     * {@return the surface between layers: an elevation per cell, in length units}
     *
     * @param index 0 for the uppermost top, k for the bottom of the k-th layer
     */
    public GriddedValues surface(int index) {
        return index == 0
                ? layers.get(0).top().orElseThrow()
                : layers.get(index - 1).bottom();
    }

    /**
     * {@return the categories of all sources, in order of first mention}
     */
    public List<String> categories() {
        Set<String> categories = new LinkedHashSet<>();
        for (Source source : sources) {
            if (source instanceof Source.Points points) {
                points.wells().forEach(well -> categories.add(well.category()));
            } else {
                categories.add(source.category());
            }
        }
        return List.copyOf(categories);
    }

    /**
     * {@return the items of storage in the budget}
     */
    public List<String> storageItems() {
        List<String> items = new ArrayList<>();
        if (storageFromHeads() || storage.supplied().isEmpty()) {
            items.add(WATER_TABLE_STORAGE);
            items.add(ELASTIC_STORAGE);
        }
        storage.supplied().forEach(supplied -> items.add(supplied.item()));
        return items;
    }

    /**
     * {@return whether change in storage can be given}
     */
    public StorageKnowledge storageKnowledge() {
        if (!storage.supplied().isEmpty() || storageFromHeads()) {
            return StorageKnowledge.KNOWN;
        }
        boolean steady = head.isPresent() ? !head.get().changes() : times.intervals() == 1;
        return steady ? StorageKnowledge.STEADY : StorageKnowledge.UNKNOWN;
    }

    private boolean storageFromHeads() {
        boolean waterTable = layers.stream().anyMatch(Layer::waterTable);
        boolean confined = layers.stream().anyMatch(layer -> !layer.waterTable());
        boolean elastic =
                storage.specificStorage().isPresent() || storage.storativity().isPresent();
        return head.isPresent()
                && head.get().changes()
                && (!waterTable || storage.specificYield().isPresent())
                && (!confined || elastic);
    }

    /**
     * {@return the wells of all point sources, each in its cell}
     */
    public List<PlacedWell> placedWells() {
        return sources.stream()
                .filter(Source.Points.class::isInstance)
                .flatMap(source -> ((Source.Points) source).wells().stream())
                .map(well -> PlacedWell.of(well, grid))
                .toList();
    }

    @Override
    public CellGeometry geometry(Window window) {
        return CellGeometry.of(grid, layers, window);
    }

    @Override
    public IntervalState state(int interval, CellGeometry geometry, List<PlacedWell> wells) {
        Saturation saturation = saturation(interval, geometry);
        FaceFlows flows = flow.faceFlows(interval, geometry, saturation);
        List<CellTerm> terms = terms(interval, geometry, saturation, flows.active()).stream()
                .map(GivenTerm::term)
                .toList();
        List<WellRate> rates = wellRates(interval, geometry, flows.active(), wells, rate -> rate);
        return new IntervalState(geometry, saturation, flows, terms, rates);
    }

    /**
     * {@return heads and saturated thickness of a block of cells in an interval}
     *
     * @param interval the interval, from 0
     * @param geometry the cells, from {@link #geometry}
     * @throws org.seepledger.fault.DataFault if the data are wrong
     */
    public Saturation saturation(int interval, CellGeometry geometry) {
        return Saturation.of(geometry, layers, head, interval);
    }

    /**
     * {@return how a block of cells answers to what was given}
     *
     * @param interval the interval, from 0
     * @param geometry the cells, from {@link #geometry}
     * @param wells the wells to count, all of them in the block
     * @throws org.seepledger.fault.DataFault if the data are wrong
     */
    public Response response(int interval, CellGeometry geometry, List<PlacedWell> wells) {
        IntervalState state = state(interval, geometry, wells);
        boolean[] active = state.flows().active();
        return new Response(
                this,
                interval,
                state,
                terms(interval, geometry, state.saturation(), active),
                wellRates(interval, geometry, active, wells, rate -> 1));
    }

    private List<GivenTerm> terms(int interval, CellGeometry geometry, Saturation saturation, boolean[] active) {
        CellTerms terms = new CellTerms(this, interval, geometry, saturation, active);
        List<GivenTerm> all = new ArrayList<>(terms.sources());
        all.addAll(terms.suppliedStorage());
        if (storageFromHeads()) {
            all.addAll(terms.storageFromHeads());
        }
        return all;
    }

    /** Shares out what is to be counted of each well that has a rate in the interval. */
    private List<WellRate> wellRates(
            int interval,
            CellGeometry geometry,
            boolean[] active,
            List<PlacedWell> wells,
            DoubleUnaryOperator counted) {
        List<WellRate> rates = new ArrayList<>();
        Optional<double[]> conductivity = wells.isEmpty()
                ? Optional.empty()
                : flow.knownConductivity().map(values -> geometry.block().read(values, interval));
        for (PlacedWell well : wells) {
            double rate = well.well().meanRate(times.instant(interval), times.instant(interval + 1));
            if (rate != 0) {
                rates.addAll(well.shares(counted.applyAsDouble(rate), geometry, active, conductivity));
            }
        }
        return rates;
    }
}
