package org.seepledger.io.table;

import java.util.Optional;
import org.seepledger.aquifer.Screen;
import org.seepledger.unit.Measure;

/** Reads in which layer, or between which elevations, a point takes or gives water. */
final class PointScreen {

    private static final String REMEDY =
            "Give the layer, counted from 1 at the top, or the elevations screen_top and screen_bottom.";

    private final TableReader table;
    private final int layers;
    private final Optional<Ordinal> layer;
    private final OptionalNumber top;
    private final OptionalNumber bottom;

    PointScreen(TableReader table, int layers, Measure lengthUnit) {
        this.table = table;
        this.layers = layers;
        Header header = table.header();
        this.layer = header.known("layer").stream()
                .mapToObj(column -> new Ordinal(column, 1, layers, "Layers count from 1, the uppermost."))
                .findFirst();
        this.top = OptionalNumber.of(header, "screen_top", lengthUnit, lengthUnit);
        this.bottom = OptionalNumber.of(header, "screen_bottom", lengthUnit, lengthUnit);
    }

    /**
     * {@return the screen of the current line}
     *
     * @throws org.seepledger.fault.DataFault if there is none, or one too many
     */
    Screen read() {
        int inLayer = layer.map(ordinal -> ordinal.indexOrAll(table)).orElse(Ordinal.ALL);
        double upper = top.read(table);
        double lower = bottom.read(table);
        if (Double.isNaN(upper) != Double.isNaN(lower)) {
            throw table.fault("one end of a screen", "both screen_top and screen_bottom", REMEDY);
        }
        if (!Double.isNaN(upper)) {
            return between(inLayer, upper, lower);
        }
        if (inLayer == Ordinal.ALL && layers > 1) {
            throw table.fault(
                    "neither a layer nor a screen", "one of them, since there are " + layers + " layers", REMEDY);
        }
        return new Screen.InLayer(Math.max(0, inLayer));
    }

    private Screen between(int inLayer, double upper, double lower) {
        if (inLayer != Ordinal.ALL) {
            throw table.fault("a layer and a screen", "one of them", "Leave the other cells empty.");
        }
        if (!(upper > lower)) {
            throw table.fault(
                    "a screen from " + CsvText.number(lower) + " up to " + CsvText.number(upper),
                    "a screen_top above its screen_bottom",
                    "Give both as elevations, not as depths.");
        }
        return new Screen.Between(upper, lower);
    }
}
