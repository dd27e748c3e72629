/**
 * The result as data: accounts, gross rates, periods, totals, and what prisms give to each other.
 *
 * <p>Sign conventions: inflow and outflow are never negative and net = inflow − outflow. Release from storage counts
 * under inflow, uptake under outflow; storage change = uptake − release; residual = inflow − outflow − storage change,
 * where inflow and outflow leave storage out. A number that cannot be given is {@code NaN} here and empty in files.
 */
package org.seepledger.ledger;
