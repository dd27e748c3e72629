package org.seepledger.aquifer;

import java.util.List;
import java.util.Optional;
import org.seepledger.fault.DataFault;

/**
 * Heads and hydraulic conductivity, from which flow follows by Darcy's law (Darcy 1856).
 *
 * <p>Between two cells of a layer their half-cells stand in series. In a water-table layer that is the distance-weighted
 * harmonic mean of the conductivities, times the saturated thickness of the cell with the higher head; in others the
 * conductivities times the whole thicknesses are in series. Vertically, half-cells of the whole layer thicknesses are in
 * series. The grid's outer faces are closed.
 *
 * @param conductivity along x, length/time, by interval
 * @param conductivityY along y; empty: the same as along x
 * @param verticalConductivity upward; there wherever there are several layers
 * @param meanHeads whether the mean of an interval's two heads drives the flow, rather than the head at its end
 */
public record HeadGradient(
        GriddedValues conductivity,
        Optional<GriddedValues> conductivityY,
        Optional<GriddedValues> verticalConductivity,
        boolean meanHeads)
        implements Flow {

    @Override
    public String given() {
        return "heads and hydraulic conductivity";
    }

    @Override
    public boolean closedSides() {
        return true;
    }

    @Override
    public Optional<GriddedValues> knownConductivity() {
        return Optional.of(conductivity);
    }

    @Override
    public FaceFlows faceFlows(int interval, CellGeometry geometry, Saturation saturation) {
        Block block = geometry.block();
        Conductivities known = conductivities(interval, geometry);
        boolean[] active = saturation.active();
        for (int cell = 0; cell < active.length; cell++) {
            active[cell] &= !Double.isNaN(known.alongX[cell] + known.alongY[cell] + known.upward[cell]);
        }
        GradientFaces faces = new GradientFaces(geometry, saturation, heads(saturation, block), active);
        return flows(known, faces, geometry, active);
    }

    @Override
    public List<GriddedValues> drivers(Aquifer aquifer) {
        return List.of(new DrivingHead(aquifer.head().orElseThrow(), aquifer.layers(), meanHeads));
    }

    @Override
    public LinearFlow linear(int interval, CellGeometry geometry, Saturation saturation, boolean[] active) {
        Conductivities conductivities = conductivities(interval, geometry);
        GradientFaces faces = new GradientFaces(geometry, saturation, heads(saturation, geometry.block()), active);
        return heads -> flows(conductivities, faces.drivenBy(heads[0]), geometry, active);
    }

    /** Conductivities by cell along the three axes. */
    private record Conductivities(double[] alongX, double[] alongY, double[] upward) {}

    private Conductivities conductivities(int interval, CellGeometry geometry) {
        double[] alongX = read(conductivity, interval, geometry, "conductivity");
        double[] alongY = conductivityY
                .map(values -> read(values, interval, geometry, "conductivity_y"))
                .orElse(alongX);
        double[] upward = verticalConductivity
                .map(values -> read(values, interval, geometry, "vertical_conductivity"))
                .orElse(alongX);
        return new Conductivities(alongX, alongY, upward);
    }

    private static FaceFlows flows(
            Conductivities conductivities, GradientFaces faces, CellGeometry geometry, boolean[] active) {
        FaceFlows flows = FaceFlows.still(geometry.block(), active);
        faces.fillX(conductivities.alongX, flows.x());
        faces.fillY(conductivities.alongY, flows.y());
        new VerticalFaces(geometry, active)
                .fill(
                        flows.z(),
                        (above, below, row, column) -> faces.upward(conductivities.upward, above, below, row, column));
        return flows;
    }

    /** The heads that drive the flow. */
    private double[] heads(Saturation saturation, Block block) {
        double[] heads = new double[block.size()];
        for (int cell = 0; cell < heads.length; cell++) {
            heads[cell] = meanHeads ? 0.5 * (saturation.start(cell) + saturation.end(cell)) : saturation.end(cell);
        }
        return heads;
    }

    private static double[] read(GriddedValues values, int interval, CellGeometry geometry, String name) {
        double[] read = geometry.block().read(values, interval);
        for (int cell = 0; cell < read.length; cell++) {
            if (read[cell] < 0) {
                throw new DataFault(
                        "flow." + name,
                        geometry.place(cell),
                        "a conductivity of " + read[cell],
                        "0 or more",
                        "Correct it, or leave the cell without a value to make it inactive.");
            }
        }
        return read;
    }
}
