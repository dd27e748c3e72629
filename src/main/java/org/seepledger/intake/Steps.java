package org.seepledger.intake;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.seepledger.io.table.TableLook;

/**
 * The instants or intervals that an item tells apart, in their order.
 *
 * @param texts how its names, bands or lines write them
 * @param days their days; empty unless all have one
 * @param months whether they are months rather than days
 * @param numbers their times as numbers; empty unless a column gives them
 * @param counted whether lines count them themselves, so that some may be absent
 */
record Steps(List<String> texts, List<LocalDate> days, boolean months, List<Double> numbers, boolean counted) {

    int count() {
        return texts.size();
    }

    /** {@return the steps of an item; empty if it tells none apart} */
    static Optional<Steps> of(Item item) {
        if (item instanceof Item.Rasters rasters) {
            return ofRasters(rasters);
        }
        return item instanceof Item.Table table && !table.arePoints() ? ofTable(table) : Optional.empty();
    }

    private static Optional<Steps> ofRasters(Item.Rasters rasters) {
        int field = rasters.fields().indexOf(Means.TIME);
        if (field >= 0) {
            List<NameField> fields = rasters.names().stream()
                    .map(name -> name.fields().get(field))
                    .sorted(Comparator.comparingLong(NameField::order))
                    .toList();
            List<NameField> different = new ArrayList<>();
            for (NameField each : fields) {
                if (different.isEmpty() || different.get(different.size() - 1).order() != each.order()) {
                    different.add(each);
                }
            }
            List<LocalDate> days = different.stream()
                    .map(NameField::day)
                    .flatMap(Optional::stream)
                    .toList();
            boolean months = different.get(0).kind() == NameField.Kind.MONTH;
            boolean all = days.size() == different.size();
            List<String> texts = different.stream().map(NameField::text).toList();
            return Optional.of(new Steps(texts, all ? days : List.of(), months, List.of(), false));
        }
        if (rasters.bands() != Means.TIME) {
            return Optional.empty();
        }
        return Optional.of(ofBands(rasters));
    }

    /** Bands that are described by dates tell days; others are counted. */
    private static Steps ofBands(Item.Rasters rasters) {
        List<String> texts = new ArrayList<>();
        List<LocalDate> days = new ArrayList<>();
        boolean months = true;
        for (int band = 0; band < rasters.bandCount(); band++) {
            String text = rasters.files().get(0).bands().get(band).description();
            DateText.read(text).ifPresent(date -> days.add(date.toLocalDate()));
            months &= text.length() <= 7;
            texts.add("band " + (band + 1));
        }
        boolean dated =
                days.size() == texts.size() && days.stream().sorted().toList().equals(days);
        return new Steps(texts, dated ? days : List.of(), months, List.of(), false);
    }

    private static Optional<Steps> ofTable(Item.Table table) {
        for (Place place : List.of(Place.INSTANT, Place.INTERVAL)) {
            int column = table.places().indexOf(place);
            if (column >= 0) {
                TableLook.Column look = table.file().look().columns().get(column);
                int last = Double.isNaN(look.greatest()) ? 0 : (int) look.greatest();
                int first = Double.isNaN(look.least()) ? 0 : (int) look.least();
                List<String> texts = new ArrayList<>();
                for (int step = Math.min(first, place == Place.INSTANT ? 0 : 1); step <= last; step++) {
                    texts.add(String.valueOf(step));
                }
                return texts.isEmpty()
                        ? Optional.empty()
                        : Optional.of(new Steps(texts, List.of(), false, List.of(), true));
            }
        }
        int column = table.places().indexOf(Place.TIME);
        return column < 0
                ? Optional.empty()
                : ofTimes(table.file().look().columns().get(column));
    }

    private static Optional<Steps> ofTimes(TableLook.Column look) {
        List<String> texts = new ArrayList<>(
                look.distinct().stream().filter(text -> !text.isBlank()).toList());
        if (texts.isEmpty()) {
            return Optional.empty();
        }
        if (look.isNumeric()) {
            texts.sort(Comparator.comparingDouble(Steps::number));
            List<Double> numbers = texts.stream().map(Steps::number).toList();
            return Optional.of(new Steps(texts, List.of(), false, numbers, false));
        }
        List<LocalDateTime> read =
                texts.stream().map(DateText::read).flatMap(Optional::stream).toList();
        if (read.size() < texts.size()) {
            return Optional.empty();
        }
        texts.sort(Comparator.comparing(text -> DateText.read(text).orElseThrow()));
        List<LocalDate> days =
                read.stream().sorted().map(LocalDateTime::toLocalDate).toList();
        return Optional.of(new Steps(texts, days, texts.get(0).length() <= 7, List.of(), false));
    }

    private static double number(String text) {
        return Double.parseDouble(text.replace(',', '.'));
    }

    /** {@return the days between the first step and each of them; with the end of the last interval, if that is wanted} */
    List<Double> sinceFirst(boolean withEnd) {
        List<LocalDate> ends = new ArrayList<>(days);
        LocalDate last = days.get(days.size() - 1);
        if (withEnd) {
            long gap = days.size() > 1 ? ChronoUnit.DAYS.between(days.get(days.size() - 2), last) : 1;
            ends.add(months ? last.plusMonths(1) : last.plusDays(gap));
        }
        return ends.stream()
                .map(day -> (double) ChronoUnit.DAYS.between(days.get(0), day))
                .toList();
    }
}
