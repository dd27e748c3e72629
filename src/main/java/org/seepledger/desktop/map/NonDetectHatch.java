package org.seepledger.desktop.map;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;

/** Lines over the cells whose concentration is below a limit: rising to the right, as far apart at every scale. */
final class NonDetectHatch {

    static final double APART = 9;

    private static final double STEP = 2;
    private static final double WIDTH = 1;

    private final Pyramid limits;
    private final Camera camera;
    private final List<Mark> marks = new ArrayList<>();

    private NonDetectHatch(Pyramid limits, Camera camera) {
        this.limits = limits;
        this.camera = camera;
    }

    static List<Mark> of(Pyramid limits, Camera camera) {
        NonDetectHatch hatch = new NonDetectHatch(limits, camera);
        double moved = Math.floorMod(Math.round(camera.x(0) + camera.y(0)), (long) APART);
        for (double sum = moved; sum < camera.width() + camera.height(); sum += APART) {
            hatch.line(sum);
        }
        return hatch.marks;
    }

    /** {@return how the lines are drawn, for a key} */
    static Mark.Stroke stroke() {
        return Mark.Stroke.of(Ink.Token.MUTED, WIDTH);
    }

    /** The places whose x and y add up to a sum, from the lower left to the upper right. */
    private void line(double sum) {
        double from = Math.max(0, sum - camera.height());
        double to = Math.min(camera.width(), sum);
        double begun = Double.NaN;
        for (double x = from; x <= to + STEP; x += STEP) {
            boolean inside = x <= to && !Float.isNaN(limits.at(camera.mapX(x), camera.mapY(sum - x)));
            if (inside && Double.isNaN(begun)) {
                begun = x;
            } else if (!inside && !Double.isNaN(begun)) {
                double end = x - STEP;
                marks.add(new Mark.Line(new double[] {begun, sum - begun, end, sum - end}, stroke()));
                begun = Double.NaN;
            }
        }
    }
}
