package org.seepledger.prism;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.seepledger.aquifer.Grid;

/** Closes chains to rings by walking counter-clockwise along the grid's edge; see {@link GridEdge}. */
final class EdgeWalk {

    /** A chain's end on the edge, and the place inside that the chain goes to or comes from. */
    private record Crossing(Chain chain, boolean out, Vertex place, Coordinate inside, Perimeter.Position position) {}

    private final Grid grid;
    private final Perimeter perimeter;

    EdgeWalk(Grid grid, Perimeter perimeter) {
        this.grid = grid;
        this.perimeter = perimeter;
    }

    /** {@return the whole way round} */
    List<Side> round() {
        List<Side> sides = new ArrayList<>();
        for (int edge = 0; edge < 4; edge++) {
            sides.add(along(corner((edge + 3) % 4)));
        }
        return sides;
    }

    /**
     * {@return the rings that chains make}
     *
     * @throws IllegalArgumentException if chains do not go out and come in by turns
     */
    List<List<Side>> link(List<Chain> chains) {
        List<Crossing> crossings = crossings(chains);
        Map<Chain, Integer> exits = new IdentityHashMap<>();
        for (int i = 0; i < crossings.size(); i++) {
            if (crossings.get(i).out()) {
                exits.put(crossings.get(i).chain(), i);
            }
        }
        boolean[] done = new boolean[crossings.size()];
        List<List<Side>> rings = new ArrayList<>();
        for (int i = 0; i < crossings.size(); i++) {
            if (!crossings.get(i).out() && !done[i]) {
                rings.add(ring(crossings, exits, i, done));
            }
        }
        return rings;
    }

    private List<Side> ring(List<Crossing> crossings, Map<Chain, Integer> exits, int start, boolean[] done) {
        List<Side> sides = new ArrayList<>();
        int entry = start;
        do {
            done[entry] = true;
            Chain chain = crossings.get(entry).chain();
            sides.addAll(chain.sides());
            int exit = exits.get(chain);
            entry = (exit + 1) % crossings.size();
            walk(crossings.get(exit), crossings.get(entry), entry == 0, sides);
        } while (entry != start);
        return sides;
    }

    private List<Crossing> crossings(List<Chain> chains) {
        List<Crossing> crossings = new ArrayList<>();
        for (Chain chain : chains) {
            crossings.add(crossing(chain, false, chain.begin(), chain.second()));
            crossings.add(crossing(chain, true, chain.end(), chain.beforeLast()));
        }
        crossings.sort(Comparator.comparing(Crossing::position).thenComparing(EdgeWalk::clockwise));
        for (int i = 0; i < crossings.size(); i++) {
            Crossing next = crossings.get((i + 1) % crossings.size());
            if (crossings.get(i).out() == next.out()) {
                Vertex place = next.place();
                throw new IllegalArgumentException(
                        "sides that cannot be told apart near x " + place.mapX() + ", y " + place.mapY());
            }
        }
        return crossings;
    }

    private Crossing crossing(Chain chain, boolean out, Vertex place, Vertex inside) {
        return new Crossing(chain, out, place, inside.local(), perimeter.position(place));
    }

    /**
     * At one place the way round, pushed a little inward, meets the sides in clockwise order. Two in line with each
     * other are a side that comes along the edge, first, and one that goes on along it.
     */
    private static int clockwise(Crossing one, Crossing other) {
        int turn = Orientation.index(one.place().local(), one.inside(), other.inside());
        return turn != 0 ? turn : Boolean.compare(other.out(), one.out());
    }

    private void walk(Crossing out, Crossing in, boolean pastTheStart, List<Side> sides) {
        int edge = out.position().edge();
        int corners = in.position().edge() - edge + (pastTheStart ? 4 : 0);
        List<Vertex> stops = new ArrayList<>();
        stops.add(out.place());
        for (int i = 0; i < corners; i++) {
            stops.add(corner((edge + i) % 4));
        }
        stops.add(in.place());
        for (int i = 0; i + 1 < stops.size(); i++) {
            if (!stops.get(i).isAt(stops.get(i + 1))) {
                sides.add(along(stops.get(i)));
            }
        }
    }

    private Vertex corner(int edge) {
        return Vertex.at(perimeter.cornerX(edge), perimeter.cornerY(edge), grid);
    }

    private static Side along(Vertex from) {
        return new Side(Prism.GRID_EDGE, Prism.GRID_EDGE, from.mapX(), from.mapY());
    }
}
