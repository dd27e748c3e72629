package org.seepledger.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/** Runs a command of each kind at a fixed time, in a Java of its own, and keeps what each printed. */
final class CommandsInTurn {

    private CommandsInTurn() {}

    /**
     * Runs them.
     *
     * @param arguments the folder of the samples, and the folder for what comes out
     */
    public static void main(String[] arguments) throws IOException {
        Path samples = Path.of(arguments[0]);
        Path out = Path.of(arguments[1]);
        String valley = samples.resolve("valley").toString();
        String depot = samples.resolve("depot").toString();
        String prisms = samples.resolve("valley/prisms.geojson").toString();
        List<List<String>> commands = List.of(
                List.of("inspect", samples.resolve("terrace").toString()),
                List.of("inspect", depot),
                List.of(
                        "balance",
                        valley,
                        "--prisms",
                        prisms,
                        "--out",
                        "water",
                        "--every",
                        "water-year",
                        "--rate-unit",
                        "ML/d"),
                List.of(
                        "plume",
                        depot,
                        "--prisms",
                        depot + "/prisms.geojson",
                        "--transects",
                        depot + "/transects.geojson",
                        "--out",
                        "solutes",
                        "--every",
                        "year",
                        "--above",
                        "0.5 mg/L"),
                List.of(
                        "trace",
                        valley,
                        "--prisms",
                        prisms,
                        "--row",
                        "well field/interval 1/pit edge/1",
                        "--out",
                        "trace.csv"),
                List.of("extract", valley, "--prisms", prisms, "--out", "part"),
                List.of("balance", valley, "--prisms", "no such file", "--out", "nothing"),
                List.of("balance", valley, "--prisms", prisms, "--out", "nothing", "--rate-unit", "İ/I"));
        StringBuilder printed = new StringBuilder();
        for (List<String> command : commands) {
            String[] words = command.stream()
                    .map(word -> List.of("water", "solutes", "trace.csv", "part", "nothing")
                                    .contains(word)
                            ? out.resolve(word).toString()
                            : word)
                    .toArray(String[]::new);
            printed.append(Ran.of(words).toString().replace(out.toString(), "OUT"))
                    .append('\n');
        }
        Files.writeString(out.resolve("printed.txt"), printed, StandardCharsets.UTF_8);
    }
}
