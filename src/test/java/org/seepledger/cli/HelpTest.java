package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What a newcomer reads first; the examples in it work from the project's folder. */
class HelpTest {

    @TempDir
    Path folder;

    @Test
    void printsUsageWithoutArguments() {
        Ran ran = Ran.of();
        assertThat(ran.out()).startsWith("Usage: seepledger").contains("inspect", "balance", "Exit status");
        assertThat(ran.err()).isEmpty();
    }

    @Test
    void printsTheVersion() {
        Ran ran = Ran.of("--version");
        assertThat(ran.status()).isZero();
        assertThat(ran.out()).matches("seepledger \\d+\\.\\d+\\.\\d+\\S*\\R");
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "inspect", "balance", "trace", "extract", "plume"})
    void givesAnExampleThatWorks(String command) {
        Ran help = command.isEmpty() ? Ran.of("--help") : Ran.of(command, "--help");
        assertThat(help.status()).isZero();
        assertThat(help.err()).isEmpty();
        List<String> examples = help.out()
                .replaceAll(" \\\\\\R *", " ")
                .lines()
                .map(String::strip)
                .filter(line -> line.startsWith("seepledger ") && line.contains("sample-aquifers/"))
                .toList();
        assertThat(examples).isNotEmpty();
        for (String example : examples) {
            List<String> arguments = words(example);
            arguments.remove(0);
            int out = arguments.indexOf("--out") + 1;
            if (out > 0) {
                arguments.set(
                        out, folder.resolve("out " + examples.indexOf(example)).toString());
            }
            Ran ran = Ran.of(arguments.toArray(String[]::new));
            assertThat(ran.err()).as(example).isEmpty();
            assertThat(ran.status()).as(example).isZero();
        }
    }

    /** As a shell would split them. */
    private static List<String> words(String line) {
        List<String> words = new ArrayList<>();
        Matcher word = Pattern.compile("\"([^\"]*)\"|\\S+").matcher(line);
        while (word.find()) {
            words.add(word.group(1) == null ? word.group() : word.group(1));
        }
        return words;
    }

    @Test
    void fitsTheTerminal() {
        for (String[] command : new String[][] {
            {"--help"},
            {"inspect", "--help"},
            {"balance", "--help"},
            {"trace", "--help"},
            {"extract", "--help"},
            {"plume", "--help"},
            {"review", "--help"},
            {"compare", "--help"}
        }) {
            assertThat(Ran.of(command).out().lines()).allMatch(line -> line.length() <= 100);
        }
    }

    @Test
    void namesTheCommandThatWasProbablyMeant() {
        Ran ran = Ran.of("balanc");
        assertThat(ran.status()).isEqualTo(2);
        assertThat(ran.err()).contains("'balanc'", "Did you mean balance?", "See seepledger --help.");
        assertThat(ran.err().lines()).hasSize(1);
    }
}
