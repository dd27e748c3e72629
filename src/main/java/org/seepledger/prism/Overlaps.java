package org.seepledger.prism;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.MultiPolygon;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.prism.VerticalRange.Layers;

/**
 * Finds prisms that overlap: in plan by more than a billionth of the smaller one's area and more than a strip as thin as
 * the nearness at which two places count as one, and in height somewhere in that area.
 *
 * <p>Two stacks of whole layers overlap in height when they have a layer in common. Elevations and surfaces are compared
 * cell by cell, in the cells that the common area lies in, with the layers' own surfaces where the other prism is a
 * stack of layers or reaches to the grid's top or bottom; a cell without a value does not count.
 */
public final class Overlaps {

    private static final double SHARE = 1e-9;

    private final Grid grid;
    private final int layers;
    private final IntFunction<GriddedValues> interfaces;

    /**
     * Looks for overlaps on a grid.
     *
     * @param grid the grid
     * @param layers the number of layers
     * @param interfaces gives the surfaces between the layers: {@code k} is the top of layer {@code k}, and the number of
     *     layers the bottom of the last; asked for only where a prism reaches between elevations
     */
    public Overlaps(Grid grid, int layers, IntFunction<GriddedValues> interfaces) {
        this.grid = grid;
        this.layers = layers;
        this.interfaces = interfaces;
    }

    /**
     * {@return each pair that overlaps, in the order of the prisms}
     *
     * @param prisms the prisms, none reaching beyond the grid
     */
    public List<Overlap> of(List<Prism> prisms) {
        List<MultiPolygon> shapes = prisms.stream().map(Footprint::of).toList();
        List<Overlap> overlaps = new ArrayList<>();
        for (int i = 0; i < prisms.size(); i++) {
            for (int j = i + 1; j < prisms.size(); j++) {
                overlap(prisms.get(i), shapes.get(i), prisms.get(j), shapes.get(j))
                        .ifPresent(overlaps::add);
            }
        }
        return overlaps;
    }

    private Optional<Overlap> overlap(Prism one, MultiPolygon shape, Prism other, MultiPolygon otherShape) {
        boolean apart = !shape.getEnvelopeInternal().intersects(otherShape.getEnvelopeInternal());
        if (apart || !mayMeet(one.range(), other.range())) {
            return Optional.empty();
        }
        Geometry common = OverlayNGRobust.overlay(shape, otherShape, OverlayNG.INTERSECTION);
        double smaller = Math.min(shape.getArea(), otherShape.getArea());
        double strip = grid.near() * Math.min(grid.x().smallest(), grid.y().smallest()) * common.getLength();
        if (common.getArea() <= Math.max(SHARE * smaller, strip) || !meet(one.range(), other.range(), common)) {
            return Optional.empty();
        }
        double area = common.getArea() * grid.planUnit() * grid.planUnit();
        return Optional.of(new Overlap(one.name(), other.name(), area));
    }

    private static boolean mayMeet(VerticalRange one, VerticalRange other) {
        return !(one instanceof Layers a && other instanceof Layers b)
                || a.first() <= b.last() && b.first() <= a.last();
    }

    private boolean meet(VerticalRange one, VerticalRange other, Geometry common) {
        if (one instanceof Layers && other instanceof Layers) {
            return true;
        }
        return new HeightComparison(grid, common)
                .meet(List.of(top(one), top(other)), List.of(bottom(one), bottom(other)));
    }

    private GriddedValues top(VerticalRange range) {
        if (range instanceof VerticalRange.Elevations elevations) {
            return elevations.top().orElseGet(() -> interfaces.apply(0));
        }
        return interfaces.apply(((Layers) range).first());
    }

    private GriddedValues bottom(VerticalRange range) {
        if (range instanceof VerticalRange.Elevations elevations) {
            return elevations.bottom().orElseGet(() -> interfaces.apply(layers));
        }
        return interfaces.apply(((Layers) range).last() + 1);
    }
}
