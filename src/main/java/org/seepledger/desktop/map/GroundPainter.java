package org.seepledger.desktop.map;

import java.util.Optional;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.image.Image;
import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;
import javafx.scene.transform.Affine;
import org.seepledger.job.GroundPicture;

/** Paints the picture under the map; its pixels are handed to the toolkit once. */
final class GroundPainter {

    private Optional<GroundPicture> known = Optional.empty();
    private Optional<Image> image = Optional.empty();

    void paint(GraphicsContext canvas, Camera camera, Optional<GroundPicture> picture) {
        if (!picture.equals(known)) {
            known = picture;
            image = picture.map(GroundPainter::pixels);
        }
        if (image.isEmpty()) {
            return;
        }
        double[] place = known.orElseThrow().placement();
        double scale = camera.scale();
        canvas.save();
        canvas.transform(new Affine(
                scale * place[0],
                scale * place[2],
                camera.x(place[4]),
                -scale * place[1],
                -scale * place[3],
                camera.y(place[5])));
        canvas.drawImage(image.get(), 0, 0);
        canvas.restore();
    }

    private static Image pixels(GroundPicture picture) {
        WritableImage image = new WritableImage(picture.columns(), picture.rows());
        image.getPixelWriter()
                .setPixels(
                        0,
                        0,
                        picture.columns(),
                        picture.rows(),
                        PixelFormat.getIntArgbInstance(),
                        picture.argb(),
                        0,
                        picture.columns());
        return image;
    }
}
