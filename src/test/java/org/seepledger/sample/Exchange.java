package org.seepledger.sample;

/**
 * Flow between a cell and water that stands at a known level: a river through its bed, or, in one implicit time step,
 * storage (conductance S A / Δt, level the head at the step's beginning).
 *
 * @param cell the cell
 * @param conductance flow per difference in level, m²/d
 * @param level in metres
 */
record Exchange(int cell, double conductance, double level) {

    /** What the cell gains at a head, m³/d. */
    double flow(double head) {
        return conductance * (level - head);
    }
}
