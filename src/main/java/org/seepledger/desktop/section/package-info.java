/**
 * The section: what stands along a line drawn on the map, with prisms, whose tops and bottoms are moved here.
 *
 * <p>{@code SectionFeed} keeps the section up with line, interval, quantity and drawing; {@code SectionModel} says which
 * part of it is seen; {@code LidHand} moves lids. Places are logical pixels from the picture's upper left corner, y down.
 */
package org.seepledger.desktop.section;
