package org.seepledger.balance;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.FaceMismatch;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.prism.Overlap;
import org.seepledger.prism.PrismCut;
import org.seepledger.prism.Side;
import org.seepledger.prism.VerticalRange;
import org.seepledger.prism.WellCut;

/**
 * What the reader of a balance must know beside its numbers.
 *
 * @param overlaps prisms that claim the same ground
 * @param inactive area inside prisms that takes no part, where there is any
 * @param closedSides sides that lie on closed outer faces, by prism
 * @param cutWells wells in cells that a prism cuts
 * @param uncounted what of each source was not counted, in the interval where it was most
 * @param still intervals, from 0, in which no cell of the prisms' window is active
 * @param mismatch the greatest difference between two given values of one face
 * @param disagreement the greatest difference between the two routes, as a share of gross flow
 */
public record RunNotes(
        List<Overlap> overlaps,
        List<InactiveArea> inactive,
        List<ClosedSide> closedSides,
        List<CutWell> cutWells,
        Map<String, Uncounted> uncounted,
        List<Integer> still,
        Optional<FaceMismatch> mismatch,
        double disagreement) {

    /**
     * Area inside a prism whose cells are inactive or pinched out.
     *
     * @param prism the prism
     * @param layer the layer, from 0
     * @param area length², in the interval where it is largest
     */
    public record InactiveArea(String prism, int layer, double area) {}

    /**
     * A side on a closed outer face of the grid.
     *
     * @param prism the prism
     * @param side the side
     * @param item what it counts under
     * @param empty whether nothing else counts under that, so that its flow cannot be given
     */
    public record ClosedSide(String prism, String side, String item, boolean empty) {}

    /**
     * A well in a cell that a prism's sides cut, or held by a prism whose lids may cut its cells.
     *
     * @param prism the prism
     * @param well the well
     * @param inside whether the prism holds it in plan
     * @param bySides whether the prism's sides cut its cell
     * @param byLids whether the prism's lids lie at elevations, so that a part of its cells may count
     */
    public record CutWell(String prism, String well, boolean inside, boolean bySides, boolean byLids) {}

    /** Copies the collections. */
    public RunNotes {
        overlaps = List.copyOf(overlaps);
        inactive = List.copyOf(inactive);
        closedSides = List.copyOf(closedSides);
        still = List.copyOf(still);
        cutWells = List.copyOf(cutWells);
        uncounted = Collections.unmodifiableMap(new LinkedHashMap<>(uncounted));
    }

    static RunNotes of(
            Aquifer aquifer, Span span, List<PrismAccounts> prisms, List<Overlap> overlaps, BandResult total) {
        List<InactiveArea> inactive = new ArrayList<>();
        List<ClosedSide> closed = new ArrayList<>();
        List<CutWell> wells = new ArrayList<>();
        double disagreement = 0;
        for (int prism = 0; prism < prisms.size(); prism++) {
            PrismAccounts accounts = prisms.get(prism);
            String name = accounts.cut().prism().name();
            double[] areas = new double[accounts.chart().layers()];
            for (int interval = span.from(); interval < span.to(); interval++) {
                Tally tally = total.tally(interval, prism);
                disagreement = Math.max(disagreement, tally.disagreement());
                double[] now = tally.inactiveArea();
                for (int layer = 0; layer < areas.length; layer++) {
                    areas[layer] = Math.max(areas[layer], now[layer]);
                }
            }
            for (int layer = 0; layer < areas.length; layer++) {
                if (areas[layer] > 0) {
                    inactive.add(new InactiveArea(name, accounts.chart().first() + layer, areas[layer]));
                }
            }
            if (aquifer.flow().closedSides()) {
                addClosedSides(closed, name, accounts.cut());
            }
            boolean byLids = accounts.cut().prism().range() instanceof VerticalRange.Elevations;
            accounts.wells().forEach((well, cut) -> addCutWell(wells, name, well, cut, byLids));
        }
        return new RunNotes(
                overlaps, inactive, closed, wells, total.uncounted(), total.still(), total.mismatch(), disagreement);
    }

    private static void addClosedSides(List<ClosedSide> closed, String prism, PrismCut cut) {
        boolean[] sideOnEdge = cut.sidesOnEdge();
        boolean[] itemOnEdge = cut.itemsOnEdge();
        for (int side = 0; side < sideOnEdge.length; side++) {
            if (sideOnEdge[side]) {
                Side named = cut.sides().get(side);
                closed.add(new ClosedSide(prism, named.name(), named.item(), itemOnEdge[cut.item(side)]));
            }
        }
    }

    private static void addCutWell(List<CutWell> wells, String prism, PlacedWell well, WellCut cut, boolean byLids) {
        boolean bySides = cut.share() > 0 && cut.share() < 1;
        if (bySides || byLids && cut.inside()) {
            wells.add(new CutWell(prism, well.well().name(), cut.inside(), bySides, byLids));
        }
    }
}
