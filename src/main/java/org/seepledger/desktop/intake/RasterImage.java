package org.seepledger.desktop.intake;

import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;
import org.seepledger.job.RasterPreview;
import org.seepledger.picture.ValueScale;

/** A band as an image, a pixel for each value. */
final class RasterImage {

    private RasterImage() {}

    static WritableImage of(RasterPreview preview) {
        ValueScale over = ValueScale.over(preview.values());
        ValueScale scale = over.from() < 0 && over.to() > 0 ? ValueScale.aboutZero(preview.values()) : over;
        int[] pixels = new int[preview.values().length];
        for (int i = 0; i < pixels.length; i++) {
            pixels[i] = scale.argb(preview.values()[i], 1);
        }
        WritableImage image = new WritableImage(preview.columns(), preview.rows());
        image.getPixelWriter()
                .setPixels(
                        0,
                        0,
                        preview.columns(),
                        preview.rows(),
                        PixelFormat.getIntArgbInstance(),
                        pixels,
                        0,
                        preview.columns());
        return image;
    }
}
