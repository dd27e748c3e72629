package org.seepledger.desktop.map;

import org.seepledger.job.FluxField;

/**
 * Flux as arrows show it.
 *
 * @param field the flux of a part of the grid
 * @param greatest the magnitude that has the longest arrow
 */
record Flux(FluxField field, double greatest) {

    /** The greatest magnitude of a field; 0 where there is none. */
    static double greatest(FluxField field) {
        double greatest = 0;
        for (int i = 0; i < field.east().values().length; i++) {
            double size = Math.hypot(field.east().values()[i], field.north().values()[i]);
            greatest = Double.isNaN(size) ? greatest : Math.max(greatest, size);
        }
        return greatest;
    }
}
