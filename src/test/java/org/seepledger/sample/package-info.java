/**
 * Invented aquifers, made from nothing but formulas: a finite-difference solution of the flow equation, and the files
 * of an aquifer folder written from it.
 *
 * <p>Conventions: metres and days. Cells are numbered layer slowest, then rows from the north, then columns from the
 * west; layers from the top. Faces have one numbering of their own, see {@link org.seepledger.sample.BlockGrid}; a flow
 * is positive toward +x, +y and up. Supplies and exchanges are positive where the aquifer gains water.
 *
 * <p>The solver is {@link org.seepledger.sample.FlowEquations} (one linear system) and {@link
 * org.seepledger.sample.WaterTableFlow} (a water table, by repetition); both know nothing of any one sample. A sample is
 * a scenario, which poses the problem, and its files.
 *
 * <p>Everything is the same to the last byte on every machine: transcendental functions are {@link StrictMath}'s, sums
 * have a fixed order, and decimal digits come from exact arithmetic.
 */
package org.seepledger.sample;
