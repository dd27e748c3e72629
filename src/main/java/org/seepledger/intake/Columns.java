package org.seepledger.intake;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import org.seepledger.io.table.TableLook;

/** What the columns of a table are for, by their headings and by what stands in them. */
final class Columns {

    private static final Map<Place, Set<String>> WORDS = Map.ofEntries(
            Map.entry(
                    Place.X,
                    Set.of(
                            "x",
                            "xcoord",
                            "xcoordinate",
                            "easting",
                            "east coordinate",
                            "x coord",
                            "x coordinate",
                            "xc",
                            "x m",
                            "x utm",
                            "utm x",
                            "e")),
            Map.entry(
                    Place.Y,
                    Set.of(
                            "y",
                            "ycoord",
                            "ycoordinate",
                            "northing",
                            "north coordinate",
                            "y coord",
                            "y coordinate",
                            "yc",
                            "y m",
                            "y utm",
                            "utm y",
                            "n")),
            Map.entry(Place.ROW, Set.of("row", "rows", "i row", "row number", "row no")),
            Map.entry(Place.COL, Set.of("col", "column", "cols", "column number", "col no")),
            Map.entry(Place.LAYER, Set.of("layer", "lay", "lyr", "layer number", "layer no")),
            Map.entry(Place.INTERVAL, Set.of("interval", "period", "stress period", "interval number")),
            Map.entry(Place.INSTANT, Set.of("instant", "time step", "timestep", "step")),
            Map.entry(
                    Place.TIME, Set.of("time", "date", "day", "datetime", "time d", "time days", "days", "month", "t")),
            Map.entry(
                    Place.NAME,
                    Set.of("name", "well", "id", "well id", "well name", "borehole", "station", "bore", "label")),
            Map.entry(Place.FROM, Set.of("from", "start", "begin", "start date", "from date", "date from", "since")),
            Map.entry(Place.TO, Set.of("to", "end", "until", "end date", "to date", "date to", "till")),
            Map.entry(
                    Place.RATE,
                    Set.of(
                            "rate",
                            "q",
                            "pumping rate",
                            "discharge",
                            "flow",
                            "abstraction",
                            "pumping",
                            "flow rate",
                            "extraction",
                            "yield")),
            Map.entry(Place.VOLUME, Set.of("volume", "vol", "pumped volume")),
            Map.entry(
                    Place.SCREEN_TOP, Set.of("screen top", "top of screen", "screentop", "filter top", "screen from")),
            Map.entry(
                    Place.SCREEN_BOTTOM,
                    Set.of(
                            "screen bottom",
                            "bottom of screen",
                            "screenbottom",
                            "filter bottom",
                            "screen to",
                            "screen bot")),
            Map.entry(Place.CATEGORY, Set.of("category", "use", "purpose", "type", "kind")));

    private static final Set<Place> OF_POINTS = EnumSet.of(
            Place.NAME,
            Place.FROM,
            Place.TO,
            Place.RATE,
            Place.VOLUME,
            Place.SCREEN_TOP,
            Place.SCREEN_BOTTOM,
            Place.CATEGORY);

    private Columns() {}

    /** {@return whether lines of a table are points, such as wells, rather than cells} */
    static boolean arePoints(TableLook look) {
        List<Place> places = new ArrayList<>();
        for (TableLook.Column column : look.columns()) {
            places.add(word(column, true));
        }
        boolean placed = places.contains(Place.X) && places.contains(Place.Y);
        boolean amount = places.contains(Place.RATE) || places.contains(Place.VOLUME);
        boolean named = places.contains(Place.NAME) || places.contains(Place.SCREEN_TOP) || places.contains(Place.FROM);
        return placed && amount && named;
    }

    /** {@return what each column is for} */
    static List<Place> of(TableLook look) {
        boolean points = arePoints(look);
        Set<Place> taken = EnumSet.noneOf(Place.class);
        List<Place> places = new ArrayList<>();
        for (TableLook.Column column : look.columns()) {
            Place place = word(column, points);
            boolean free = place == Place.VALUE || place == Place.NOTHING || taken.add(place);
            places.add(free ? place : Place.NOTHING);
        }
        if (taken.contains(Place.INSTANT) && taken.contains(Place.INTERVAL)) {
            places.set(places.indexOf(Place.INSTANT), Place.NOTHING);
        }
        return places;
    }

    private static Place word(TableLook.Column column, boolean points) {
        String name = String.join(" ", Vocabulary.words(Vocabulary.withoutUnit(column.name())));
        String whole = name.isEmpty() ? column.name().toLowerCase(Locale.ROOT) : name;
        for (Map.Entry<Place, Set<String>> entry : WORDS.entrySet()) {
            boolean fits = points || !OF_POINTS.contains(entry.getKey());
            if (fits && entry.getValue().contains(whole)) {
                return points && entry.getKey() == Place.TIME ? Place.FROM : entry.getKey();
            }
        }
        boolean values = !points && column.isNumeric() && !column.name().isEmpty();
        return values ? Place.VALUE : Place.NOTHING;
    }
}
