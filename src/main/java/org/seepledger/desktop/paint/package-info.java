/** Replays pictures on a canvas, in the colours of the theme. */
package org.seepledger.desktop.paint;
