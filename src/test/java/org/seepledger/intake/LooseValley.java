package org.seepledger.intake;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.YearMonth;
import java.util.stream.Stream;

/** The valley's files as a stranger would have them: other names, scattered over folders, nothing that describes them. */
public final class LooseValley {

    private static final Path VALLEY = Path.of("sample-aquifers/valley");

    private LooseValley() {}

    /** Copies the files below a folder. */
    public static void scatter(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(VALLEY)) {
            for (Path file : files.sorted().toList()) {
                String to = renamed(file.getFileName().toString());
                if (!to.isEmpty()) {
                    Path target = folder.resolve(to);
                    Files.createDirectories(target.getParent());
                    Files.copy(file, target);
                }
            }
        }
    }

    private static String renamed(String name) {
        String[] parts = name.replaceAll("\\..*", "").split("_");
        return switch (parts[0]) {
            case "head" ->
                "results/heads/Head_L%s_T%02d.tif".formatted(parts[1].substring(1), Integer.parseInt(parts[2]));
            case "conductivity" -> "parameters/kx-layer-" + parts[1].substring(1) + ".tiff";
            case "recharge" ->
                "climate/recharge_" + YearMonth.of(2021, 9).plusMonths(Integer.parseInt(parts[1])) + ".tif";
            case "loam", "gravel", "clay" -> "geology/" + name;
            case "rock" -> "geology/bedrock.tif";
            case "specific" -> "parameters/Sy.tif";
            case "river" -> "results/river exchange.csv";
            case "wells" -> "wells/abstraction wells.csv";
            default -> "";
        };
    }

    /** {@return what a person says of the set after a look at the guesses} */
    public static Plan corrected(Plan guessed) {
        Wishes wishes = guessed.wishes()
                .with(Wishes.Topic.NAME, "Invented valley")
                .with(Wishes.Topic.LAYERS, "Gravel, Clay, Old gravel")
                .with(Wishes.Topic.VERTICAL_SHARE, "0.1, 0.05, 0.1")
                .with(Wishes.Topic.SPECIFIC_STORAGE, "0.00008, 0.0001, 0.00002");
        Plan plan = guessed.with(wishes);
        for (int i = 0; i < plan.items().size(); i++) {
            Item item = plan.items().get(i);
            for (int u = 0; u < item.uses().size(); u++) {
                Use use = item.uses().get(u);
                String name = switch (use.role()) {
                    case CELLS -> "river exchange";
                    case POINTS -> "public supply";
                    default -> use.name();
                };
                Use named = use.role() == Role.AREAL ? use.withUnit("mm/yr") : use.withName(name);
                plan = plan.with(i, plan.items().get(i).with(u, named));
            }
        }
        return plan;
    }
}
