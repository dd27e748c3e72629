/**
 * The plume: what a prism holds of a solute, and what of it comes in and goes out.
 *
 * <p>Everything is worked out on the walk of the water budget ({@link org.seepledger.balance.PrismWalk}): the same pieces,
 * lids and cells with the same weights.
 *
 * <ul>
 *   <li><b>Mass in place</b> at an instant is the sum over cells of plan area inside × saturated height inside × (θ C + ρb
 *       S(C)), with total porosity θ, dry bulk density ρb and an isotherm S. It is as if a cell's concentration held
 *       throughout the cell.
 *   <li><b>Advective flow</b> in an interval is the water's, times the concentration of the cell that the water leaves, the
 *       mean of the interval's two ends; in and out apart. This spreads a plume like a longitudinal dispersivity of half a
 *       cell. From beyond the grid comes the boundary concentration, else the cell's own.
 *   <li><b>Cutting</b>: where a side or lid cuts cells, the cell's own concentration counts all through it, while its
 *       balance is kept at its faces. What that leaves in the residual is the difference to a walk of the mass flow through
 *       cell faces ({@link org.seepledger.plume.CarriedField}), and told by account.
 *   <li><b>Dispersive flow</b>, by choice, is worked out on cell faces ({@link org.seepledger.plume.DispersiveFaces}) and
 *       walked like the flow of water. Nothing disperses through the grid's outer faces.
 *   <li><b>Sources</b> add water with their own concentration (0 where none is given), and take it with the cell's.
 *   <li><b>Decay</b> is first order, of dissolved and sorbed mass each with its rate, by the mean of both ends; a product
 *       gains its yield × the parent's decay.
 *   <li><b>Storage</b> has three rows: the change of mass in place; pore and sorbed mass that a falling water table leaves
 *       above it, less what drains with the water, taken back on a rise; and concentration × the water that elastic and
 *       supplied storage take up. With one concentration everywhere and always, and none decaying, each flow and the three
 *       together are that concentration × the water budget's.
 *   <li><b>Non-detects</b> count three times over: as 0, as half the limit and as the limit ({@link
 *       org.seepledger.plume.NonDetects}).
 * </ul>
 *
 * <p>Masses are in kilograms, lengths and times in the set's units.
 */
package org.seepledger.plume;
