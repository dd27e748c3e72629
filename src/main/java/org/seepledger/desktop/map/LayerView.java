package org.seepledger.desktop.map;

import java.util.Optional;
import org.seepledger.job.MapQuantity;
import org.seepledger.picture.ValueScale;

/**
 * What is laid over the map.
 *
 * @param request what was asked for
 * @param pyramid its values
 * @param natural the colours that the values themselves suggest
 * @param limits the limits of non-detects; empty where there are none
 */
record LayerView(Request request, Pyramid pyramid, ValueScale natural, Optional<Pyramid> limits) {

    /**
     * A question for values.
     *
     * @param quantity of what
     * @param layer in which layer, from 0
     * @param interval in which interval, from 0; 0 for what does not change
     */
    record Request(MapQuantity quantity, int layer, int interval) {

        static Request of(MapQuantity quantity, int layer, int interval) {
            return new Request(quantity, layer, quantity.changes() ? interval : 0);
        }

        /** Whether both can have the same colours: the same quantity and layer at two times. */
        boolean isLike(Request other) {
            return quantity.equals(other.quantity) && layer == other.layer;
        }
    }
}
