package org.seepledger.desktop.welcome;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/**
 * A folder that can be opened.
 *
 * @param folder where it lies
 * @param title what it is called
 * @param lead what is said of it, in a sentence; empty if nothing is
 */
public record Place(Path folder, String title, String lead) {

    /**
     * {@return a folder with the heading and first sentence of the scenario in its own README, as far as there are any}
     *
     * @param folder the folder
     */
    static Place of(Path folder) {
        try {
            List<String> lines = Files.readAllLines(folder.resolve("README.md"));
            String title = lines.stream()
                    .filter(line -> line.startsWith("# "))
                    .map(line -> line.substring(2).strip())
                    .findFirst()
                    .orElse(name(folder));
            return new Place(folder, title, lead(lines));
        } catch (IOException e) {
            return new Place(folder, name(folder), "");
        }
    }

    private static String name(Path folder) {
        return folder.toAbsolutePath().normalize().getFileName().toString();
    }

    private static String lead(List<String> lines) {
        int begin = lines.indexOf("## The scenario") + 1;
        String text = lines.stream()
                .skip(begin)
                .dropWhile(line -> line.isBlank() || line.startsWith("#"))
                .takeWhile(line -> !line.isBlank())
                .reduce("", (before, line) -> before + " " + line)
                .strip()
                .replaceAll("\\[([^\\]]*)\\]\\([^)]*\\)", "$1");
        int end = text.indexOf(". ");
        return end < 0 ? text : text.substring(0, end + 1);
    }
}
