package org.seepledger.job;

import java.util.List;
import java.util.Optional;
import org.seepledger.picture.ValueScale;
import org.seepledger.prism.Prism;
import org.seepledger.unit.Measure;

/**
 * What a map on paper is to show.
 *
 * @param quantity the values that lie under it
 * @param layer of which layer, from 0
 * @param interval in which interval, from 0
 * @param scale which colour a value has
 * @param contoured whether lines of equal value are drawn
 * @param wells whether wells are shown
 * @param part the part of the map
 * @param prisms the prisms
 * @param selected the name of the one whose faces have arrows; empty for none
 * @param rateUnit the unit of the flow through its faces; empty for the set's own
 * @param title what it shows, in a line
 */
public record MapAsked(
        MapQuantity quantity,
        int layer,
        int interval,
        ValueScale scale,
        boolean contoured,
        boolean wells,
        Part part,
        List<Prism> prisms,
        String selected,
        Optional<Measure> rateUnit,
        String title) {

    /** Copies the list. */
    public MapAsked {
        prisms = List.copyOf(prisms);
    }

    /**
     * A part of the map.
     *
     * @param west the least map x
     * @param south the least map y
     * @param east the greatest map x
     * @param north the greatest map y
     */
    public record Part(double west, double south, double east, double north) {}
}
