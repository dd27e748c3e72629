package org.seepledger.desktop;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.geom.Path2D;
import java.awt.geom.PathIterator;
import java.awt.geom.RoundRectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import javax.imageio.ImageIO;

/** Draws the program's icon, layers with a prism cut out of them, and writes it in the forms that desktops take. */
public final class ProgramIcon {

    private static final double SIZE = 256;

    private static final List<Piece> PIECES = List.of(
            new Piece(new RoundRectangle2D.Double(8, 8, 240, 240, 56, 56), "#0a6870"),
            new Piece(layer(150, 208), "#3f9296"),
            new Piece(layer(100, 156), "#7db9bc"),
            new Piece(layer(56, 106), "#c4e2e1"),
            new Piece(polygon(86, 62, 148, 44, 196, 82, 184, 174, 112, 206, 66, 148), "#fffefb"),
            new Piece(polygon(95, 72, 145, 57, 185, 88, 175, 166, 115, 193, 77, 143), "#0a6870"),
            new Piece(arrow(36, 128, 118), "#7fb2e5"),
            new Piece(arrow(146, 128, 228), "#f0a26c"));

    private record Piece(Shape shape, String colour) {}

    private ProgramIcon() {}

    /** A layer from side to side, its surfaces waved. */
    private static Shape layer(double top, double bottom) {
        Path2D path = new Path2D.Double();
        path.moveTo(8, top);
        path.curveTo(80, top - 26, 160, top + 26, 248, top);
        path.lineTo(248, bottom);
        path.curveTo(160, bottom + 26, 80, bottom - 26, 8, bottom);
        path.closePath();
        return path;
    }

    private static Shape polygon(double... xy) {
        Path2D path = new Path2D.Double();
        for (int i = 0; i < xy.length; i += 2) {
            if (i == 0) {
                path.moveTo(xy[0], xy[1]);
            } else {
                path.lineTo(xy[i], xy[i + 1]);
            }
        }
        path.closePath();
        return path;
    }

    private static Shape arrow(double from, double y, double to) {
        double neck = to - 34;
        return polygon(from, y - 10, neck, y - 10, neck, y - 26, to, y, neck, y + 26, neck, y + 10, from, y + 10);
    }

    private static BufferedImage image(int pixels) {
        BufferedImage image = new BufferedImage(pixels, pixels, BufferedImage.TYPE_INT_ARGB);
        Graphics2D brush = image.createGraphics();
        brush.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        brush.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        brush.scale(pixels / SIZE, pixels / SIZE);
        brush.setStroke(new BasicStroke(1));
        for (Piece piece : PIECES) {
            brush.setColor(Color.decode(piece.colour()));
            brush.fill(piece.shape());
        }
        brush.dispose();
        return image;
    }

    private static byte[] png(int pixels) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        ImageIO.write(image(pixels), "png", bytes);
        return bytes.toByteArray();
    }

    private static String svg() {
        StringBuilder svg = new StringBuilder("<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 256 256\">\n");
        for (Piece piece : PIECES) {
            svg.append("<path fill=\"").append(piece.colour()).append("\" d=\"");
            svg.append(path(piece.shape())).append("\"/>\n");
        }
        return svg.append("</svg>\n").toString();
    }

    private static String path(Shape shape) {
        StringBuilder path = new StringBuilder();
        double[] xy = new double[6];
        for (PathIterator walk = shape.getPathIterator(null); !walk.isDone(); walk.next()) {
            int kind = walk.currentSegment(xy);
            int numbers = new int[] {2, 2, 4, 6, 0}[kind];
            path.append("MLQCZ".charAt(kind));
            for (int i = 0; i < numbers; i++) {
                path.append(i == 0 ? "" : " ").append(String.format(Locale.ROOT, "%.4g", xy[i]));
            }
        }
        return path.toString();
    }

    /** An icon file of Windows with one picture, which may be PNG since Windows Vista. */
    private static byte[] ico(byte[] png) {
        ByteBuffer file = ByteBuffer.allocate(22 + png.length).order(ByteOrder.LITTLE_ENDIAN);
        file.putShort((short) 0).putShort((short) 1).putShort((short) 1);
        file.putInt(0)
                .putShort((short) 1)
                .putShort((short) 32)
                .putInt(png.length)
                .putInt(22);
        return file.put(png).array();
    }

    /** An icon file of macOS with one picture of 512 pixels. */
    private static byte[] icns(byte[] png) {
        ByteBuffer file = ByteBuffer.allocate(16 + png.length);
        file.put("icns".getBytes(StandardCharsets.US_ASCII)).putInt(16 + png.length);
        file.put("ic09".getBytes(StandardCharsets.US_ASCII)).putInt(8 + png.length);
        return file.put(png).array();
    }

    /**
     * Writes the icons of the app image, and the window's.
     *
     * @param arguments the folder of the image's, and that of the window's
     * @throws IOException if one cannot be written
     */
    public static void main(String[] arguments) throws IOException {
        Path image = Files.createDirectories(Path.of(arguments[0]));
        Files.writeString(image.resolve("seepledger.svg"), svg());
        Files.write(image.resolve("seepledger.png"), png(512));
        Files.write(image.resolve("seepledger.ico"), ico(png(256)));
        Files.write(image.resolve("seepledger.icns"), icns(png(512)));
        Files.write(Path.of(arguments[1]).resolve("icon.png"), png(128));
    }
}
