package org.seepledger.report;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.GivenFaceFlow;
import org.seepledger.aquifer.HeadGradient;
import org.seepledger.balance.HotSpot;

/** Why a budget may fail to close: what the program knows of the set that can leave a residual. Leads, not findings. */
public final class ClosureLeads {

    private final Aquifer aquifer;
    private final PrismResult result;

    private ClosureLeads(Aquifer aquifer, PrismResult result) {
        this.aquifer = aquifer;
        this.result = result;
    }

    /**
     * {@return what may be the reason, in sentences}
     *
     * @param aquifer the set
     * @param result the prism's result, which has cells that do not balance
     */
    public static List<String> of(Aquifer aquifer, PrismResult result) {
        return new ClosureLeads(aquifer, result).sentences();
    }

    private List<String> sentences() {
        List<String> sentences = new ArrayList<>();
        addWells(sentences);
        addFlow(sentences);
        if (aquifer.head().isEmpty() && aquifer.layers().stream().anyMatch(layer -> layer.waterTable())) {
            sentences.add(
                    "No heads are given, so that water-table layers count as full; where the flow was computed with a"
                            + " lower water table, the two do not belong together.");
        }
        if (aquifer.times().intervals() > 1) {
            sentences.add(
                    "Flow, sources and heads of an interval must belong to the same time: values that are shifted by"
                            + " an interval leave a residual that changes sign with the seasons.");
        }
        return sentences;
    }

    private void addWells(List<String> sentences) {
        List<String> wells = result.whereabouts().largest().stream()
                .flatMap(spot -> wellsIn(aquifer, spot).stream())
                .distinct()
                .toList();
        if (!wells.isEmpty()) {
            sentences.add("Wells stand in the largest cells: " + Wording.listed(wells)
                    + ". Flux at cell centres does not show water that turns into a well within one cell; neighbouring"
                    + " cells then err the other way. A rate or layer that differs from the one the flow was computed"
                    + " with leaves a residual without such neighbours.");
        }
    }

    /**
     * {@return the names of the wells that stand in a cell's column}
     *
     * @param aquifer the set
     * @param spot the cell
     */
    public static List<String> wellsIn(Aquifer aquifer, HotSpot spot) {
        return aquifer.placedWells().stream()
                .filter(well -> well.row() == spot.row() && well.column() == spot.column())
                .map(well -> well.well().name())
                .distinct()
                .toList();
    }

    private void addFlow(List<String> sentences) {
        if (aquifer.flow() instanceof DarcyFlux flux) {
            sentences.add(
                    "Flow is given as specific discharge at cell centres and interpolated to cell faces, which does"
                            + " not balance at jumps of conductivity or thickness, nor where flow turns within a cell.");
            if (flux.outerFaces().top()) {
                sentences.add(
                        "The top of the grid is open to vertical flux: recharge that is also given as a source counts"
                                + " twice.");
            }
        } else if (aquifer.flow() instanceof HeadGradient) {
            sentences.add("Flow is worked out from heads and conductivity; it balances as far as whatever computed the"
                    + " heads used the same conductances, saturated thicknesses and instants.");
        } else if (aquifer.flow() instanceof GivenFaceFlow) {
            sentences.add(
                    "Flow is given at cell faces; what does not balance was not balanced there, or stands in a source"
                            + " or storage term that the set lacks.");
        }
    }
}
