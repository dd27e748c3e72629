package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What commands print and write is the same byte for byte whatever the country that the machine is set to. */
class LocaleTest {

    @TempDir
    private static Path folder;

    private static Map<String, String> english;

    @BeforeAll
    static void runInEnglish() throws Exception {
        english = run("en", "US");
    }

    private static Map<String, String> run(String language, String country) throws Exception {
        Path out = Files.createDirectories(folder.resolve(language));
        Process process = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-Duser.language=" + language,
                        "-Duser.country=" + country,
                        "-Djava.awt.headless=true",
                        "-cp",
                        System.getProperty("java.class.path"),
                        CommandsInTurn.class.getName(),
                        Path.of("sample-aquifers").toAbsolutePath().toString(),
                        out.toString())
                .redirectErrorStream(true)
                .redirectOutput(folder.resolve(language + ".log").toFile())
                .start();
        assertThat(process.waitFor(300, TimeUnit.SECONDS)).isTrue();
        assertThat(process.exitValue())
                .as(Files.readString(folder.resolve(language + ".log")))
                .isZero();
        return filesOf(out);
    }

    /** The files as text, byte for byte, but for the run's own folder and how long it took. */
    private static Map<String, String> filesOf(Path out) throws IOException {
        Map<String, String> files = new TreeMap<>();
        try (Stream<Path> all = Files.walk(out)) {
            for (Path file : all.filter(Files::isRegularFile).toList()) {
                files.put(
                        out.relativize(file).toString(),
                        text(file).replace(out.toString(), "OUT").replaceAll("\"\\w+ing( \\w+)?\" : [0-9.E-]+", ""));
            }
        }
        return files;
    }

    private static String text(Path file) {
        try {
            return Files.readString(file, StandardCharsets.ISO_8859_1);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Test
    void theCommandsDoWhatTheyAreToDo() {
        assertThat(english)
                .containsKeys("printed.txt", "water/budget.csv", "water/report.html", "solutes/plume.csv", "trace.csv");
        assertThat(english.get("printed.txt").lines().filter(line -> line.startsWith("Ran[status=0")))
                .hasSize(6);
    }

    @ParameterizedTest
    @CsvSource({"de, DE", "tr, TR"})
    void otherCountriesChangeNothing(String language, String country) throws Exception {
        Map<String, String> other = run(language, country);
        assertThat(other.keySet()).isEqualTo(english.keySet());
        List<String> differing = english.keySet().stream()
                .filter(file -> !other.get(file).equals(english.get(file)))
                .toList();
        assertThat(differing).isEmpty();
    }
}
