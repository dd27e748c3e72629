/**
 * The aquifer: grid, layers, times, what is known of flow, heads and sources, and the face flows that follow from it.
 *
 * <p>Conventions, which hold in the whole engine:
 *
 * <ul>
 *   <li><b>Arrays</b> are row-major with the layer slowest: {@code [layer][row][column]}. Row 0 is the northernmost
 *       (largest y), column 0 has the smallest x, layer 0 is the uppermost. A face array has one more entry along its
 *       own axis: x-face {@code c} is the west face of column {@code c}, y-face {@code r} the north face of row
 *       {@code r}, interface {@code k} the top of layer {@code k}.
 *   <li><b>Signs</b>: flow is positive toward +x, +y (north) and up, whichever face it stands on. A source is positive
 *       where it adds water.
 *   <li><b>Units</b>: lengths in the set's length unit, times in its time unit; plan coordinates are turned into the
 *       length unit when the grid is made.
 *   <li><b>No value</b> is {@code NaN}. A cell without a value of flow or surface is inactive: nothing flows through
 *       its faces.
 *   <li><b>Time</b>: interval {@code i} of {@code n} (counted from 0 here, from 1 in files) lasts from instant
 *       {@code i} to instant {@code i + 1}.
 * </ul>
 *
 * <p>Values are asked for by interval and {@link org.seepledger.aquifer.Window}, a block of rows and columns, so that
 * memory does not grow with the number of intervals or the height of the grid.
 */
package org.seepledger.aquifer;
