package org.seepledger.prism;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.locationtech.jts.math.DD;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.fault.ProgramFault;

/**
 * A prism cut by a grid: pieces of its sides, shares of its cells. Made once, used for every interval.
 *
 * <p>Vertices that {@link Grid#near()} counts as on a grid line are put on it. The work is proportional to the perimeter and
 * the rows' spans in cells, not to the grid.
 */
public final class PrismCut {

    private static final double AREA_AGREES = 1e-12;

    private final Prism prism;
    private final Grid grid;
    private final List<Side> sides;
    private final List<String> items;
    private final int[] itemOfSide;
    private final Pieces pieces;
    private final Coverage coverage;
    private final double area;

    private PrismCut(Prism prism, Grid grid, List<Side> sides, Pieces pieces, double area) {
        this.prism = prism;
        this.grid = grid;
        this.sides = sides;
        this.items = itemsOf(sides);
        this.itemOfSide =
                sides.stream().mapToInt(side -> items.indexOf(side.item())).toArray();
        this.pieces = pieces;
        this.coverage = new Coverage(pieces);
        this.area = area;
    }

    /**
     * Cuts a prism.
     *
     * @param prism a valid prism that lies within the grid
     * @param grid the grid
     * @return the cut
     * @throws ProgramFault if the shares of the cells do not add up to the polygon's area
     */
    public static PrismCut of(Prism prism, Grid grid) {
        List<Side> sides = new ArrayList<>();
        List<Pieces.Piece> walked = new ArrayList<>();
        DD doubledArea = new DD(0);
        for (Ring ring : prism.rings()) {
            double[] xs = new double[ring.sides().size()];
            double[] ys = new double[xs.length];
            for (int i = 0; i < xs.length; i++) {
                Side side = ring.sides().get(i);
                xs[i] = grid.snappedX(side.x(), side.y());
                ys[i] = grid.snappedY(side.x(), side.y());
            }
            for (int i = 0; i < xs.length; i++) {
                int next = (i + 1) % xs.length;
                new SideWalk(grid, sides.size(), xs[i], ys[i], xs[next], ys[next], walked).walk();
                sides.add(ring.sides().get(i));
                doubledArea.selfAdd((xs[i] - xs[0]) * (ys[next] - ys[0]) - (xs[next] - xs[0]) * (ys[i] - ys[0]));
            }
        }
        double area = 0.5 * doubledArea.doubleValue() * grid.planUnit() * grid.planUnit();
        PrismCut cut = new PrismCut(prism, grid, List.copyOf(sides), new Pieces(walked), area);
        cut.checkArea();
        return cut;
    }

    private static List<String> itemsOf(List<Side> sides) {
        Set<String> items = new LinkedHashSet<>();
        sides.stream()
                .map(Side::item)
                .filter(item -> !item.equals(Prism.GRID_EDGE))
                .forEach(items::add);
        if (sides.stream().anyMatch(side -> side.item().equals(Prism.GRID_EDGE))) {
            items.add(Prism.GRID_EDGE);
        }
        return List.copyOf(items);
    }

    /** Adds in twice the precision, since rounding grows with the number of cells and they may be millions. */
    private void checkArea() {
        DD covered = new DD(0);
        double touched = 0;
        for (int row = coverage.window().row(); row < coverage.window().rowEnd(); row++) {
            for (int column = coverage.firstColumn(row); column < coverage.columnEnd(row); column++) {
                double share = coverage.share(row, column);
                covered.selfAdd(share * grid.area(row, column));
                touched += share == 0 ? 0 : grid.area(row, column);
            }
        }
        if (!(Math.abs(covered.doubleValue() - area) <= AREA_AGREES * touched)) {
            throw new ProgramFault("The cells of prism \"" + prism.name() + "\" cover " + covered.doubleValue()
                    + ", but its polygon has an area of " + area + ".");
        }
    }

    /**
     * {@return the prism}
     */
    public Prism prism() {
        return prism;
    }

    /**
     * {@return the sides of all rings, one after the other}
     */
    public List<Side> sides() {
        return sides;
    }

    /**
     * {@return what sides count under, in order of first mention, the grid's edge last}
     */
    public List<String> items() {
        return items;
    }

    /**
     * {@return the item that a side counts under, as its place in {@link #items()}}
     *
     * @param side a side, counted through all rings
     */
    public int item(int side) {
        return itemOfSide[side];
    }

    /**
     * {@return the prism's plan area, islands taken out, in length units squared}
     */
    public double area() {
        return area;
    }

    /**
     * {@return the pieces of the sides}
     */
    public Pieces pieces() {
        return pieces;
    }

    /**
     * {@return the shares of the cells}
     */
    public Coverage coverage() {
        return coverage;
    }

    /**
     * {@return for each side, whether it lies on the grid's outer sides}
     */
    public boolean[] sidesOnEdge() {
        boolean[] onEdge = new boolean[sides.size()];
        Arrays.fill(onEdge, true);
        for (int piece = 0; piece < pieces.count(); piece++) {
            onEdge[pieces.side(piece)] &= pieces.isOnEdge(piece, grid.rows() - 1, grid.columns() - 1);
        }
        return onEdge;
    }

    /**
     * {@return for each item, whether all of its sides lie on the grid's outer sides}
     */
    public boolean[] itemsOnEdge() {
        boolean[] sideOnEdge = sidesOnEdge();
        boolean[] onEdge = new boolean[items.size()];
        Arrays.fill(onEdge, true);
        for (int side = 0; side < sideOnEdge.length; side++) {
            onEdge[item(side)] &= sideOnEdge[side];
        }
        return onEdge;
    }

    /**
     * {@return how the prism meets a well}
     *
     * <p>The shares that the pieces carry and the share of the cell add up to 1 for a well inside, to 0 for one outside:
     * that is what decides.
     *
     * @param well the well
     */
    public WellCut meet(PlacedWell well) {
        double share = coverage.share(well.row(), well.column());
        if (!coverage.isCut(well.row(), well.column())) {
            return new WellCut(share > 0.5, share, new int[0], new double[0]);
        }
        int from = pieces.firstFrom(well.row());
        int to = pieces.firstFrom(well.row() + 1);
        int[] met = IntStream.range(from, to)
                .filter(piece -> pieces.column(piece) == well.column())
                .toArray();
        double[] carried = Arrays.stream(met)
                .mapToDouble(piece -> pieces.shareBehind(piece, well.across(), well.up()))
                .toArray();
        return new WellCut(share + Arrays.stream(carried).sum() > 0.5, share, met, carried);
    }
}
