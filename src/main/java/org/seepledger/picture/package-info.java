/**
 * Pictures: maps, sections and charts as plain marks, drawn once for page and window.
 *
 * <p>A {@link org.seepledger.picture.Picture} is a list of {@link org.seepledger.picture.Mark}s in logical pixels, y down.
 * Whoever shows it turns marks into SVG or replays them on a canvas, and gives the {@link org.seepledger.picture.Ink}s
 * their colours in light and dark. What gains and what loses water is told apart by texture and direction too, never by
 * colour alone.
 */
package org.seepledger.picture;
