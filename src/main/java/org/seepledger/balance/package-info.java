/**
 * The balance: an aquifer and cut prisms become ledgers, with what the prisms give to each other and what does not
 * balance, cell by cell; and the way back, from a row of a ledger to the stored numbers that it rests on.
 *
 * <p>The work is done by interval and band of rows, within the prisms' joint window. Outflow through a prism's faces is
 * worked out twice, by different routes: piece by piece along its boundary, and as the integral of the cells' own gains
 * over its volume. In the lowest-order field of Raviart and Thomas (1977) the two are the same for any polygon; a
 * difference beyond {@value org.seepledger.balance.WaterBalance#ROUTES_AGREE} of the gross flow through the faces of
 * the cells touched, and of what enters at the water table where a lid lies at an elevation, is a fault of the program, and no result is given out.
 *
 * <p>A {@link org.seepledger.balance.Trace} goes the way back: a row is linear in the stored numbers, and ones are booked
 * in their place, by the same code, to find their weights. Given face flows, flux and heads count while thicknesses,
 * conductances, upstream cells and the signs of gross flows stand; source rates, supplied storage and storage
 * coefficients likewise. A dry cell's head counts 0, and the elevation of its bottom stands in for it.
 *
 * <p>Sums run in a fixed order that does not depend on the number of threads, and are compensated (Neumaier 1974).
 */
package org.seepledger.balance;
