package org.seepledger.picture;

import java.util.List;
import java.util.Optional;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;

/**
 * An arrow as one area: a shaft of even width and a head.
 *
 * @param fromX where it begins, in logical pixels
 * @param fromY where it begins
 * @param toX where its tip is
 * @param toY where its tip is
 * @param width of its shaft, in logical pixels
 */
public record Arrow(double fromX, double fromY, double toX, double toY, double width) {

    /**
     * {@return the arrow as a mark}
     *
     * @param fill how it is filled
     * @param outline its outline
     */
    public Mark.Area mark(Fill fill, Stroke outline) {
        return new Mark.Area(List.of(ring()), Optional.of(fill), Optional.of(outline));
    }

    private double[] ring() {
        double length = Math.hypot(toX - fromX, toY - fromY);
        double alongX = length == 0 ? 1 : (toX - fromX) / length;
        double alongY = length == 0 ? 0 : (toY - fromY) / length;
        double head = Math.min(0.7 * length, width + 6);
        double neck = length - head;
        double half = width / 2;
        double wing = half + 3.5;
        double[][] outline = {
            {0, half}, {neck, half}, {neck, wing}, {length, 0}, {neck, -wing}, {neck, -half}, {0, -half}
        };
        double[] ring = new double[2 * outline.length];
        for (int i = 0; i < outline.length; i++) {
            ring[2 * i] = fromX + outline[i][0] * alongX - outline[i][1] * alongY;
            ring[2 * i + 1] = fromY + outline[i][0] * alongY + outline[i][1] * alongX;
        }
        return ring;
    }
}
