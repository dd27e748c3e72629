package org.seepledger.job;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Well;

/**
 * A well on the map.
 *
 * @param name its name
 * @param category what it counts as in the budget
 * @param x map x
 * @param y map y
 * @param screen where in depth, in words
 * @param rate its mean rate in the interval, length³/time, positive where it adds water
 */
public record WellPlace(String name, String category, double x, double y, String screen, double rate) {

    static List<WellPlace> of(Aquifer aquifer, int interval) {
        double from = aquifer.times().instant(interval);
        double to = aquifer.times().instant(interval + 1);
        List<WellPlace> places = new ArrayList<>();
        for (Source source : aquifer.sources()) {
            if (source instanceof Source.Points points) {
                for (Well well : points.wells()) {
                    String screen = screen(aquifer, well.screen());
                    double rate = well.meanRate(from, to);
                    places.add(new WellPlace(well.name(), well.category(), well.x(), well.y(), screen, rate));
                }
            }
        }
        return places;
    }

    private static String screen(Aquifer aquifer, Screen screen) {
        return screen instanceof Screen.Between between
                ? String.format(Locale.ROOT, "%.4g to %.4g %s", between.top(), between.bottom(), aquifer.lengthUnit())
                : aquifer.layers().get(((Screen.InLayer) screen).layer()).name();
    }
}
