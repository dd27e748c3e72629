package org.seepledger.picture;

import java.util.Arrays;
import org.seepledger.picture.Profile.Stretch;

/** Values of a section's cells as pixels, a logical pixel each: up to the water level where the water table can lie. */
final class SectionColours {

    private SectionColours() {}

    static Mark.Image of(Section section, Section.Colours colours, SectionFrame frame) {
        Box box = frame.box();
        int width = (int) Math.ceil(box.width());
        int height = (int) Math.ceil(box.height());
        int[] argb = new int[width * height];
        for (Stretch stretch : section.profile().stretches()) {
            int left = pixel(frame.x(stretch.from()) - box.x(), width);
            int right = pixel(frame.x(stretch.to()) - box.x(), width);
            double[] values = stretch.column().values();
            double[] surfaces = stretch.column().surfaces();
            for (int layer = 0; layer < values.length && right > left; layer++) {
                if (!(surfaces[layer] > surfaces[layer + 1])) {
                    continue;
                }
                int colour = colours.scale().argb(values[layer], 1);
                double top = Math.min(surfaces[layer], section.level(stretch.column(), layer));
                int upper = pixel(frame.y(top) - box.y(), height);
                int lower = pixel(frame.y(surfaces[layer + 1]) - box.y(), height);
                for (int row = upper; row < lower && colour != 0; row++) {
                    Arrays.fill(argb, row * width + left, row * width + right, colour);
                }
            }
        }
        return new Mark.Image(width, height, argb, new double[] {1, 0, 0, 1, box.x(), box.y()});
    }

    /** The pixel whose middle is the first beyond a place; 0 where the place is none. */
    private static int pixel(double place, int count) {
        return (int) Math.max(0, Math.min(count, Math.ceil(place - 0.5)));
    }
}
