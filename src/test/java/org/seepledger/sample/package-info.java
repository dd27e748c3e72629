/**
 * Invented aquifers, made from nothing but formulas: a finite-difference solution of the flow equation, and the files
 * of an aquifer folder written from it.
 *
 * <p>Conventions: metres and days. Cells are numbered layer slowest, then rows from the north, then columns from the
 * west; layers from the top. Faces have one numbering of their own, see {@link org.seepledger.sample.BlockGrid}; a flow
 * is positive toward +x, +y and up. Supplies and exchanges are positive where the aquifer gains water.
 *
 * <p>The solver is {@link org.seepledger.sample.FlowEquations} (one linear system), {@link
 * org.seepledger.sample.WaterTableFlow} (steady flow with a water table, by repetition) and {@link
 * org.seepledger.sample.TimeStep} (flow that changes with time, one step); they know nothing of any one sample. A sample is
 * a scenario, which poses the problem, and its files.
 *
 * <p>The terrace is steady and given as specific discharge at the cells' centres, from which the flow cannot be had back
 * exactly; the valley changes with time and is given as heads and conductivity, from which it can.
 *
 * <p>Everything is the same to the last byte on every machine: transcendental functions are {@link StrictMath}'s, sums
 * have a fixed order, and decimal digits come from exact arithmetic. Of rasters that is said of the values: how DEFLATE
 * packs them is left to the machine's zlib.
 */
package org.seepledger.sample;
