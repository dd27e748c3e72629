package org.seepledger.job;

import org.seepledger.picture.Picture;

/** Paints a picture as PNG (ISO/IEC 15948). */
@FunctionalInterface
public interface PngPainter {

    /**
     * {@return the bytes of the file}
     *
     * @param picture the picture
     */
    byte[] png(Picture picture);
}
