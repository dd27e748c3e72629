package org.seepledger.prism;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Grid;

/**
 * A vertical control plane along a drawn line, through all layers. Forward is to the right of the line as it is drawn.
 *
 * @param name its name
 * @param vertices map x and y of at least two places, in order
 */
public record Transect(String name, List<double[]> vertices) {

    /** Copies the list. */
    public Transect {
        vertices = List.copyOf(vertices);
    }

    /**
     * {@return the pieces that the grid lines cut the line into; a piece's side is its segment, from 0}
     *
     * @param grid the grid, within which the line lies
     */
    public Pieces cut(Grid grid) {
        List<Pieces.Piece> walked = new ArrayList<>();
        for (int i = 0; i + 1 < vertices.size(); i++) {
            double[] from = vertices.get(i);
            double[] to = vertices.get(i + 1);
            new SideWalk(
                            grid,
                            i,
                            grid.snappedX(from[0], from[1]),
                            grid.snappedY(from[0], from[1]),
                            grid.snappedX(to[0], to[1]),
                            grid.snappedY(to[0], to[1]),
                            walked)
                    .walk();
        }
        return new Pieces(walked);
    }

    /** {@return the number of segments} */
    public int segments() {
        return vertices.size() - 1;
    }
}
