package org.seepledger.desktop.session;

import org.seepledger.job.MapQuantity;
import org.seepledger.picture.ValueScale;

/**
 * What lies over the map.
 *
 * @param quantity of what the values are
 * @param scale which colour a value has
 */
public record Draped(MapQuantity quantity, ValueScale scale) {}
