package org.seepledger.desktop.chart;

import java.util.function.DoubleConsumer;
import org.seepledger.picture.Picture;

/**
 * A chart through time.
 *
 * @param picture what it looks like
 * @param look looks at the time at an x of the picture, in logical pixels
 */
record Drawn(Picture picture, DoubleConsumer look) {}
