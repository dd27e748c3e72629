package org.seepledger.aquifer;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * Volumetric flows through cell faces as they were given: each cell's east, north and up face, and where wanted its
 * west, south and down face.
 *
 * <p>The east, north and up values stand for inner faces; where the opposite cell gives a value too and it differs, the
 * greatest difference is reported. At the grid's western, southern and lowest faces the west, south and down values
 * hold, 0 where there are none.
 *
 * @param east length³/time by interval, positive toward +x
 * @param north positive toward +y
 * @param up positive upward; empty: no vertical flow
 * @param west the same through the opposite faces
 * @param south the same
 * @param down the same, positive upward too
 */
public record GivenFaceFlow(
        GriddedValues east,
        GriddedValues north,
        Optional<GriddedValues> up,
        Optional<GriddedValues> west,
        Optional<GriddedValues> south,
        Optional<GriddedValues> down)
        implements Flow {

    @Override
    public String given() {
        return "volumetric flow through cell faces";
    }

    @Override
    public boolean closedSides() {
        return false;
    }

    @Override
    public FaceFlows faceFlows(int interval, CellGeometry geometry, Saturation saturation) {
        return GivenFaces.read(this, interval, geometry, saturation).fill();
    }

    @Override
    public List<GriddedValues> drivers(Aquifer aquifer) {
        return drivers();
    }

    List<GriddedValues> drivers() {
        return Stream.concat(
                        Stream.of(east, north), Stream.of(up, west, south, down).flatMap(Optional::stream))
                .toList();
    }

    @Override
    public LinearFlow linear(int interval, CellGeometry geometry, Saturation saturation, boolean[] active) {
        return values -> GivenFaces.of(this, values, geometry, active).fill();
    }
}
