package org.seepledger.plume;

import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;

/** Aquifers with a uniform flow, and boxes in them. */
final class SmallPlumes {

    private SmallPlumes() {}

    /** Layers from 10 to 0 m, columns and rows of a size from (0, 0), a uniform specific discharge, some instants. */
    static Aquifer uniform(int columns, int rows, int layers, double size, double[] q, double... instants) {
        return uniform(new Grid(Axis.even(0, size, columns), Axis.even(0, size, rows), 0, 1), layers, q, instants);
    }

    static Aquifer uniform(Grid grid, int layers, double[] q, double... instants) {
        double[] elevations = new double[layers + 1];
        for (int i = 0; i <= layers; i++) {
            elevations[i] = 10 - 10.0 * i / layers;
        }
        return AquiferDraft.on(grid)
                .layers(elevations)
                .times(instants)
                .flow(new DarcyFlux(
                        GriddedValues.constant(q[0]),
                        GriddedValues.constant(q[1]),
                        Optional.of(GriddedValues.constant(q[2])),
                        false,
                        new OuterFaces(true, true, true)))
                .done();
    }

    static Prism box(String name, int first, int last, double west, double south, double east, double north) {
        return Prisms.of(name, first, last, west, south, east, south, east, north, west, north);
    }
}
