/**
 * Writers of results: {@code budget.csv}, {@code faces.geojson}, {@code imbalance_l{layer}.tif} and {@code run.json}.
 *
 * <p>Every table and file carries the inputs' hashes, the conventions and the disclaimer, or lies beside one that does.
 * Numbers are written so that they read back to the same double; a number that cannot be given is empty.
 */
package org.seepledger.io.result;
