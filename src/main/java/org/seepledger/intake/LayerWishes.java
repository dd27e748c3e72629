package org.seepledger.intake;

import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.seepledger.intake.Wishes.Topic;

/** What a person said of layers. */
final class LayerWishes {

    private LayerWishes() {}

    /** {@return how many layers there are: as files tell, or more where more are named or typed} */
    static int of(Plan plan) {
        int typed = Numbers.of(plan.wishes().of(Topic.BOTTOM)).size();
        return Math.max(LayerCount.of(plan.items()), Math.max(names(plan).size(), typed));
    }

    static List<String> names(Plan plan) {
        String said = plan.wishes().of(Topic.LAYERS);
        return said.isEmpty()
                ? List.of()
                : Arrays.stream(said.split(",")).map(String::strip).toList();
    }

    /** {@return whether the water table can lie in each layer; in the first alone if nothing else was said} */
    static List<Boolean> waterTables(Plan plan, int layers) {
        String said = plan.wishes().of(Topic.WATER_TABLE);
        List<Double> numbers = said.isEmpty() ? List.of(1.0) : Numbers.of(said);
        return IntStream.rangeClosed(1, layers)
                .mapToObj(layer -> numbers.contains((double) layer))
                .toList();
    }
}
