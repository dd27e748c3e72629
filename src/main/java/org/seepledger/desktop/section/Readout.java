package org.seepledger.desktop.section;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Optional;
import org.seepledger.desktop.session.Draped;
import org.seepledger.desktop.words.Words;
import org.seepledger.picture.Profile;
import org.seepledger.picture.Section;
import org.seepledger.unit.Figures;

/** What is under the cursor in a section, as it is read. */
final class Readout {

    private static final int DECIMALS = 2;

    private Readout() {}

    /** A distance alone, as the map points to it. */
    static String of(Section section, double along) {
        return Words.of("section.along", length(along), section.lengthUnit());
    }

    static String of(Section section, Optional<Draped> draped, double along, double elevation) {
        String place = Words.of("section.place", length(along), length(elevation), section.lengthUnit());
        Optional<Profile.Stretch> stretch = section.profile().at(along);
        int layer = stretch.map(found -> found.column().layerAt(elevation)).orElse(-1);
        if (layer < 0) {
            return place;
        }
        String name =
                Words.of("map.layer", layer + 1, section.layers().get(layer).name());
        double[] values = stretch.get().column().values();
        String value = draped.filter(shown -> layer < values.length)
                .map(shown -> value(shown, values[layer]))
                .orElse("");
        return place + "   " + name + "   " + value;
    }

    private static String value(Draped draped, double value) {
        String label = draped.quantity().label();
        return Double.isNaN(value)
                ? Words.of("map.novalue", label)
                : Words.of(
                        "map.value",
                        label,
                        Figures.typeset(value),
                        draped.quantity().unit());
    }

    private static String length(double value) {
        return new BigDecimal(value)
                .setScale(DECIMALS, RoundingMode.HALF_EVEN)
                .toPlainString()
                .replace('-', '−');
    }
}
