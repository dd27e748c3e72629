package org.seepledger.intake;

import java.util.List;
import java.util.stream.Stream;

/** The layers that names or lines tell, from 1: where they count from 0, one more. */
final class LayerNumbers {

    private LayerNumbers() {}

    /** {@return the layer of each of the files, 0 where its name tells none} */
    static List<Integer> of(Item.Rasters rasters) {
        int field = rasters.fields().indexOf(Means.LAYER);
        if (field < 0) {
            return rasters.names().stream().map(name -> 0).toList();
        }
        List<Long> written = rasters.names().stream()
                .map(name -> name.fields().get(field).order())
                .toList();
        return counted(written.stream());
    }

    /** {@return the layers that lines tell} */
    static List<Integer> of(Item.Table table) {
        return counted(texts(table).map(LayerNumbers::number));
    }

    private static Stream<String> texts(Item.Table table) {
        int column = table.places().indexOf(Place.LAYER);
        return column < 0
                ? Stream.empty()
                : table.file().look().columns().get(column).distinct().stream()
                        .filter(text -> text.matches("\\d{1,4}"));
    }

    private static long number(String text) {
        return Long.parseLong(text);
    }

    private static List<Integer> counted(Stream<Long> written) {
        List<Long> all = written.toList();
        int more = all.contains(0L) ? 1 : 0;
        return all.stream()
                .map(number -> (int) Math.min(number + more, 100_000))
                .toList();
    }
}
