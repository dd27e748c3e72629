package org.seepledger.intake;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.seepledger.io.table.StepKind;
import org.seepledger.io.table.TableCopy;
import org.seepledger.io.table.TableLook;
import org.seepledger.unit.Measure;

/**
 * What becomes of a table so that an aquifer folder can read it: its headings, and cells that are counted or written
 * otherwise.
 *
 * @param columns what becomes of each column
 * @param reasons why it cannot stay as it is, each the end of a sentence that begins with its name; empty if it can
 */
record MendedTable(List<TableCopy.Column> columns, List<String> reasons) {

    private static final Set<String> PLACES = Stream.of(Place.values())
            .map(Place::heading)
            .filter(heading -> !heading.isEmpty())
            .collect(Collectors.toSet());

    static MendedTable of(Item.Table item, FoundTimes times) {
        return new Mender(item, times).mended();
    }

    /** Goes through the columns. */
    private static final class Mender {

        private final Item.Table item;
        private final FoundTimes times;
        private final boolean points;
        private final List<String> reasons = new ArrayList<>();

        Mender(Item.Table item, FoundTimes times) {
            this.item = item;
            this.times = times;
            this.points = item.arePoints();
        }

        MendedTable mended() {
            List<TableCopy.Column> columns = new ArrayList<>();
            for (int column = 0; column < item.places().size(); column++) {
                columns.add(column(column));
            }
            return new MendedTable(List.copyOf(columns), List.copyOf(reasons));
        }

        private TableCopy.Column column(int column) {
            TableLook.Column look = item.file().look().columns().get(column);
            Place place = item.places().get(column);
            return switch (place) {
                case VALUE -> new TableCopy.Column(valueHeading(look), UnaryOperator.identity());
                case NOTHING -> unused(look);
                case TIME -> time(column, look);
                default -> new TableCopy.Column(heading(place, look), cells(place, look));
            };
        }

        /** A column that is not read stays, unless its name would be taken for a place. */
        private TableCopy.Column unused(TableLook.Column look) {
            boolean clash = PLACES.contains(look.name().toLowerCase(Locale.ROOT));
            if (clash) {
                reasons.add("has a column \"" + look.name() + "\" that is not to be read");
            }
            return new TableCopy.Column(points || clash ? "" : look.heading(), UnaryOperator.identity());
        }

        private String valueHeading(TableLook.Column look) {
            if (look.unit().isEmpty() || known(look.unit())) {
                return look.heading();
            }
            boolean used = item.uses().stream()
                    .anyMatch(use -> use.role() != Role.NONE && use.part().equals(look.name()));
            if (used) {
                reasons.add("writes the unit \"" + look.unit() + "\" in a way that an aquifer folder does not know");
            }
            return look.name();
        }

        private static boolean known(String unit) {
            try {
                Measure.of(unit);
                return true;
            } catch (IllegalArgumentException e) {
                return false;
            }
        }

        private String heading(Place place, TableLook.Column look) {
            String unit = place == Place.RATE ? item.uses().get(0).unit() : "";
            if (place == Place.SCREEN_TOP || place == Place.SCREEN_BOTTOM) {
                unit = UnitGuess.of(look.heading(), Role.Amount.LENGTH).orElse("");
            }
            String written = unit.isEmpty() ? place.heading() : place.heading() + " [" + unit + "]";
            boolean same = look.name().equalsIgnoreCase(place.heading())
                    && (unit.isEmpty() || look.unit().equals(unit));
            boolean foreign = unit.isEmpty() && !look.unit().isEmpty() && (place == Place.LAYER || !known(look.unit()));
            if (!same || foreign) {
                reasons.add("calls a column \"" + look.heading() + "\" that must be called \"" + written + "\"");
            }
            return same && !foreign ? look.heading() : written;
        }

        private UnaryOperator<String> cells(Place place, TableLook.Column look) {
            if ((place == Place.RATE || place == Place.VOLUME)
                    && item.uses().get(0).turned()) {
                reasons.add("gives what is taken as positive");
                return Mender::turned;
            }
            boolean counts =
                    place == Place.LAYER || place == Place.ROW || place == Place.COL || place == Place.INTERVAL;
            if (counts && look.least() == 0) {
                reasons.add("counts the column \"" + look.name() + "\" from 0");
                return text -> String.valueOf(Long.parseLong(text) + 1);
            }
            if (place == Place.INSTANT && look.least() == 1 && look.greatest() == times.intervals() + 1.0) {
                reasons.add("counts the column \"" + look.name() + "\" from 1");
                return text -> String.valueOf(Long.parseLong(text) - 1);
            }
            if ((place == Place.FROM || place == Place.TO)
                    && look.distinct().stream()
                            .anyMatch(text -> !DateText.iso(text).equals(text))) {
                reasons.add("writes dates otherwise than ISO 8601");
                return DateText::iso;
            }
            return UnaryOperator.identity();
        }

        private static String turned(String text) {
            return text.startsWith("-") ? text.substring(1) : "-" + (text.startsWith("+") ? text.substring(1) : text);
        }

        private TableCopy.Column time(int column, TableLook.Column look) {
            Optional<Steps> steps = Steps.of(item);
            boolean instants = item.uses().stream().anyMatch(use -> use.role().steps() == StepKind.INSTANT);
            String heading = instants ? Place.INSTANT.heading() : Place.INTERVAL.heading();
            reasons.add("tells times by \"" + look.heading() + "\", which must be counted as " + heading + "s");
            if (steps.isEmpty() || steps.get().count() < 2) {
                return new TableCopy.Column("", UnaryOperator.identity());
            }
            Map<String, String> numbers = new HashMap<>();
            List<String> texts = steps.get().texts();
            int first = instants ? 0 : times.skipFirst() ? 0 : 1;
            for (int step = 0; step < texts.size(); step++) {
                numbers.put(texts.get(step), String.valueOf(step + first));
            }
            return new TableCopy.Column(heading, text -> numbers.getOrDefault(text, text));
        }
    }
}
