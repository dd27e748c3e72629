package org.seepledger.prism;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Grid;

/**
 * The outer edge of the grid in plan, beyond which a prism must not reach: tells what does, and cuts it off.
 *
 * <p>A place within a billionth of the smallest cell of the edge is on it, and so is one that map coordinates cannot
 * tell from it.
 *
 * <p>Cutting works part by part in grid-local coordinates. The edge is convex, so that each side has at most one piece
 * within it. Pieces are strung together to chains as they follow one another; where a chain goes out, the inside of the
 * prism goes on counter-clockwise along the edge up to where the next chain comes in (Weiler and Atherton 1977, for a
 * rectangle). Sides along the edge keep what they are; those whose inner side is off the grid fall away. Vertices within
 * the edge stay as they are to the last bit. A side is cut at the same place whichever way round it is given.
 */
public final class GridEdge {

    private final Grid grid;
    private final Perimeter perimeter;
    private final double tolerance;

    private GridEdge(Grid grid, Perimeter perimeter, double tolerance) {
        this.grid = grid;
        this.perimeter = perimeter;
        this.tolerance = tolerance;
    }

    /**
     * {@return the edge of a grid}
     *
     * @param grid the grid
     */
    public static GridEdge of(Grid grid) {
        double width = grid.x().edge(grid.columns());
        double height = grid.y().edge(grid.rows());
        double tolerance = grid.near() * Math.min(grid.x().smallest(), grid.y().smallest());
        return new GridEdge(grid, new Perimeter(width, height), tolerance);
    }

    /**
     * {@return whether a prism lies within the edge}
     *
     * @param prism the prism
     */
    public boolean holds(Prism prism) {
        return prism.rings().stream()
                .flatMap(ring -> ring.sides().stream())
                .map(this::vertex)
                .allMatch(perimeter::holds);
    }

    /**
     * {@return the share of a prism's plan area that lies beyond the edge, from 0 to 1}
     *
     * @param whole the prism
     * @param clipped what {@link #clip} leaves of it
     */
    public double shareOutside(Prism whole, Prism clipped) {
        double share = 1 - Footprint.area(clipped) / Footprint.area(whole);
        return Math.min(1, Math.max(0, share));
    }

    /**
     * {@return what lies within the edge: without rings when nothing does}
     *
     * <p>The sides that the cut makes are named {@link Prism#GRID_EDGE}; the others keep name and
     * item. A part may fall into several rings of the same part number.
     *
     * @param prism a prism whose rings neither cross nor touch along a line
     * @throws IllegalArgumentException if sides lie so close together at the edge that their order along it is lost
     */
    public Prism clip(Prism prism) {
        List<Ring> kept = new ArrayList<>();
        prism.parts().forEach(part -> kept.addAll(clipPart(part)));
        return new Prism(prism.name(), kept, prism.range());
    }

    private List<Ring> clipPart(List<Ring> rings) {
        PartClip clip = new PartClip(grid, perimeter, rings.get(0).part());
        for (Ring ring : rings) {
            clip.add(ring, ring.sides().stream().map(this::vertex).toList());
        }
        return clip.rings();
    }

    /** The place where a side begins, put on the edge when it is as good as there. */
    private Vertex vertex(Side side) {
        double x = grid.localX(side.x(), side.y());
        double y = grid.localY(side.x(), side.y());
        return new Vertex(snapped(x, perimeter.width()), snapped(y, perimeter.height()), side.x(), side.y());
    }

    private double snapped(double distance, double end) {
        if (Math.abs(distance) <= tolerance) {
            return 0;
        }
        return Math.abs(distance - end) <= tolerance ? end : distance;
    }
}
