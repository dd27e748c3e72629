package org.seepledger.desktop.paint;

import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.concurrent.CompletableFuture;
import javafx.application.Platform;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageTypeSpecifier;
import javax.imageio.ImageWriter;
import javax.imageio.metadata.IIOMetadata;
import javax.imageio.metadata.IIOMetadataNode;
import javax.imageio.stream.ImageOutputStream;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.job.PngPainter;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Picture;

/**
 * Paints pictures as PNG with the same brush as the window, in light colours, fine enough for print: three pixels for a
 * logical one, 288 to the inch.
 */
public final class PicturePng implements PngPainter {

    private static final int FINER = 3;

    /** A logical pixel is 1/96 inch (W3C, CSS Values and Units 3). */
    private static final long PIXELS_PER_METRE = Math.round(FINER * 96 / 0.0254);

    private static final String FORMAT = "javax_imageio_png_1.0";

    /** Made where the window is. */
    public PicturePng() {}

    /** Waits for the window's own thread, on which alone a canvas is painted; it must not be called there. */
    @Override
    public byte[] png(Picture picture) {
        CompletableFuture<BufferedImage> painted = new CompletableFuture<>();
        Platform.runLater(() -> {
            try {
                painted.complete(painted(picture));
            } catch (RuntimeException e) {
                painted.completeExceptionally(e);
            }
        });
        try {
            return written(painted.join());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static BufferedImage painted(Picture picture) {
        int width = (int) Math.ceil(picture.width() * FINER);
        int height = (int) Math.ceil(picture.height() * FINER);
        Canvas canvas = new Canvas(width, height);
        GraphicsContext brush = canvas.getGraphicsContext2D();
        brush.setFill(Paints.of(Ink.Token.PAPER, 1, Theme.LIGHT));
        brush.fillRect(0, 0, width, height);
        brush.scale(FINER, FINER);
        new MarkPainter(brush, Theme.LIGHT).paint(picture.marks());
        WritableImage taken = canvas.snapshot(null, null);
        int[] pixels = new int[width * height];
        taken.getPixelReader().getPixels(0, 0, width, height, PixelFormat.getIntArgbInstance(), pixels, 0, width);
        BufferedImage image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
        image.setRGB(0, 0, width, height, pixels, 0, width);
        return image;
    }

    private static byte[] written(BufferedImage image) throws IOException {
        ImageWriter writer = ImageIO.getImageWritersByFormatName("png").next();
        IIOMetadata metadata = writer.getDefaultImageMetadata(
                ImageTypeSpecifier.createFromRenderedImage(image), writer.getDefaultWriteParam());
        IIOMetadataNode size = new IIOMetadataNode("pHYs");
        size.setAttribute("pixelsPerUnitXAxis", String.valueOf(PIXELS_PER_METRE));
        size.setAttribute("pixelsPerUnitYAxis", String.valueOf(PIXELS_PER_METRE));
        size.setAttribute("unitSpecifier", "meter");
        IIOMetadataNode root = new IIOMetadataNode(FORMAT);
        root.appendChild(size);
        metadata.mergeTree(FORMAT, root);
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ImageOutputStream out = ImageIO.createImageOutputStream(bytes)) {
            writer.setOutput(out);
            writer.write(new IIOImage(image, null, metadata));
        } finally {
            writer.dispose();
        }
        return bytes.toByteArray();
    }
}
