package org.seepledger.desktop.session;

import org.seepledger.sketch.Drawing;

/**
 * The drawing as its author has it, the hand at rest.
 *
 * @param drawing the shapes
 * @param saved whether the file beside the aquifer holds just these
 */
public record DrawnShapes(Drawing drawing, boolean saved) {

    /** Nothing drawn. */
    public static final DrawnShapes NONE = new DrawnShapes(Drawing.EMPTY, true);
}
