package org.seepledger.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Commands as a shell takes them apart. */
final class ShellWords {

    private ShellWords() {}

    /** The words of each command of a script, without the program's name. */
    static List<List<String>> of(Path folder, String script) throws IOException {
        Path file = Files.writeString(
                folder.resolve("script.sh"), "seepledger() { printf '%s\\n' \"$@\"; echo ----; }\n" + script + "\n");
        Process shell = new ProcessBuilder("sh", file.toString())
                .redirectErrorStream(true)
                .start();
        List<List<String>> commands = new ArrayList<>();
        List<String> words = new ArrayList<>();
        for (String word : new String(shell.getInputStream().readAllBytes(), StandardCharsets.UTF_8).split("\n")) {
            if (word.equals("----")) {
                commands.add(words);
                words = new ArrayList<>();
            } else {
                words.add(word);
            }
        }
        return commands;
    }
}
