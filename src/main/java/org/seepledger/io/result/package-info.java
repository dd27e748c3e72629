/**
 * Writers of results: {@code budget.csv}, {@code exchange.csv}, {@code faces.geojson}, a trace, and {@code run.json},
 * which is read too, to tell an earlier run's files from others. Rasters are written by {@link org.seepledger.io.raster}.
 *
 * <p>Every table and file carries the inputs' hashes, the conventions and the disclaimer, or lies beside one that does.
 * Numbers are written so that they read back to the same double; a number that cannot be given is empty.
 */
package org.seepledger.io.result;
