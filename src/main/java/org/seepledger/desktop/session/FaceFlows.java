package org.seepledger.desktop.session;

import java.util.Map;

/**
 * The net flow through each face of a prism in the interval looked at.
 *
 * @param revision which drawing they were worked out for; −1 for an earlier one than is drawn now
 * @param prism its name
 * @param unit the unit of the flows, as users write it
 * @param net by item, as {@code side 3}; positive where water comes in
 * @param lids the same of {@code top} and {@code bottom}
 */
public record FaceFlows(long revision, String prism, String unit, Map<String, Double> net, Map<String, Double> lids) {

    /** Nothing worked out. */
    public static final FaceFlows NONE = new FaceFlows(-1, "", "", Map.of(), Map.of());

    /** Copies the maps. */
    public FaceFlows {
        net = Map.copyOf(net);
        lids = Map.copyOf(lids);
    }
}
