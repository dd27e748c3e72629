package org.seepledger.sample;

/**
 * Heads that satisfy the flow equation, and the flows that belong to them.
 *
 * @param heads of each cell, m; without meaning in inactive cells
 * @param saturated the water-filled thickness of each cell, m
 * @param faceFlows through each face, m³/d, positive toward +x, +y and up
 * @param imbalance what each cell gains, m³/d: what the solver left
 */
record FlowSolution(double[] heads, double[] saturated, double[] faceFlows, double[] imbalance) {}
