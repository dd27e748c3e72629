/**
 * The result as data: rows, periods, sign conventions.
 *
 * <p>Times are in the set's time unit, on the axis of {@link org.seepledger.aquifer.Times}.
 */
package org.seepledger.ledger;
