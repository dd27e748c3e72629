package org.seepledger.aquifer;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.unit.Measure;

/** An aquifer for tests: one layer from 10 down to 0, one day and no flow, as far as not told otherwise. */
public final class AquiferDraft {

    private final Grid grid;
    private final List<Source> sources = new ArrayList<>();
    private List<Layer> layers = flat(false, 10, 0);
    private double[] instants = {0, 1};
    private Measure timeUnit = Measure.of("d");
    private Optional<LocalDateTime> start = Optional.empty();
    private Flow flow = still();
    private Optional<GriddedValues> head = Optional.empty();
    private Storage storage = Storage.NONE;

    private AquiferDraft(Grid grid) {
        this.grid = grid;
    }

    public static AquiferDraft on(Grid grid) {
        return new AquiferDraft(grid);
    }

    /** Layers between level surfaces, given from the top down. */
    public static List<Layer> flat(boolean waterTable, double... elevations) {
        List<Layer> layers = new ArrayList<>();
        for (int i = 1; i < elevations.length; i++) {
            Optional<GriddedValues> top =
                    i == 1 ? Optional.of(GriddedValues.constant(elevations[0])) : Optional.empty();
            layers.add(new Layer("layer " + i, top, GriddedValues.constant(elevations[i]), waterTable));
        }
        return layers;
    }

    /** No flow anywhere. */
    public static Flow still() {
        GriddedValues none = GriddedValues.constant(0);
        return new DarcyFlux(none, none, Optional.empty(), false, new OuterFaces(true, false, false));
    }

    public AquiferDraft layers(List<Layer> given) {
        layers = given;
        return this;
    }

    public AquiferDraft layers(double... elevations) {
        return layers(flat(false, elevations));
    }

    public AquiferDraft waterTableLayers(double... elevations) {
        return layers(flat(true, elevations));
    }

    public AquiferDraft times(double... given) {
        instants = given;
        return this;
    }

    public AquiferDraft timeUnit(String unit) {
        timeUnit = Measure.of(unit);
        return this;
    }

    public AquiferDraft start(LocalDateTime date) {
        start = Optional.of(date);
        return this;
    }

    public AquiferDraft flow(Flow given) {
        flow = given;
        return this;
    }

    public AquiferDraft head(GriddedValues given) {
        head = Optional.of(given);
        return this;
    }

    public AquiferDraft storage(Storage given) {
        storage = given;
        return this;
    }

    public AquiferDraft source(Source given) {
        sources.add(given);
        return this;
    }

    public Aquifer done() {
        return new Aquifer(
                "invented",
                grid,
                layers,
                new Times(instants, timeUnit, start),
                flow,
                head,
                storage,
                sources,
                Measure.of("m"),
                timeUnit);
    }

    /** What is known of the whole grid in an interval. */
    public static IntervalState state(Aquifer aquifer, int interval) {
        return aquifer.state(interval, aquifer.geometry(aquifer.grid().window()), aquifer.placedWells());
    }
}
