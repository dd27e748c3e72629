package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The output folder appears whole or not at all, and what is not ours in it is left alone. */
class OutputFolderTest {

    private static final String[] FILES = {
        "budget.csv", "exchange.csv", "faces.geojson", "imbalance_l1.tif", "imbalance_l2.tif", "report.html", "run.json"
    };

    @TempDir
    Path folder;

    private static void succeeded(Ran ran) {
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
    }

    private static void refused(Ran ran, String... words) {
        assertThat(ran.err()).contains(words).doesNotContain("Exception");
        assertThat(ran.err().lines()).hasSize(1);
        assertThat(ran.status()).isEqualTo(2);
        assertThat(ran.out()).isEmpty();
    }

    private static Map<String, String> contents(Path folder) throws IOException {
        Map<String, String> contents = new TreeMap<>();
        try (Stream<Path> files = Files.list(folder)) {
            for (Path file : files.toList()) {
                contents.put(
                        file.getFileName().toString(),
                        Files.isDirectory(file) ? "folder" : Files.readString(file, StandardCharsets.ISO_8859_1));
            }
        }
        return contents;
    }

    @Test
    void isMadeWithTheFoldersAboveIt() {
        AquiferFiles files = new AquiferFiles(folder).write();
        Path deep = folder.resolve("a/b/c");
        Ran ran = Ran.of(
                "balance",
                files.aquifer().toString(),
                "--prisms",
                files.prisms().toString(),
                "--out",
                deep.toString());
        succeeded(ran);
        assertThat(AquiferFiles.names(deep)).containsExactly(FILES);
        assertThat(AquiferFiles.names(deep.getParent())).containsExactly("c");
        assertThat(ran.out()).contains("Written to " + deep + ": " + String.join(", ", FILES));
    }

    @Test
    void leavesNoFoldersAboveItWhenTheRunFails() {
        AquiferFiles files = new AquiferFiles(folder).with("grids", "1").write();
        Path deep = folder.resolve("a/b/c");
        Ran ran = Ran.of(
                "balance",
                files.aquifer().toString(),
                "--prisms",
                files.prisms().toString(),
                "--out",
                deep.toString());
        assertThat(ran.status()).isEqualTo(3);
        assertThat(files.left()).containsExactly("aquifer", "prisms.geojson");
    }

    @Test
    void mayBeEmpty() throws IOException {
        AquiferFiles files = new AquiferFiles(folder);
        Files.createDirectory(files.out());
        succeeded(files.balance());
        assertThat(AquiferFiles.names(files.out())).containsExactly(FILES);
    }

    @Test
    void mayNotHoldAnything() throws IOException {
        AquiferFiles files = new AquiferFiles(folder);
        Files.createDirectory(files.out());
        Files.writeString(files.out().resolve("mine.txt"), "mine");
        refused(files.balance(), "is not empty", "--overwrite");
        refused(files.balance("--overwrite"), "no run.json");
        assertThat(contents(files.out())).isEqualTo(Map.of("mine.txt", "mine"));
        assertThat(files.left()).containsExactly("aquifer", "out", "prisms.geojson");
    }

    @Test
    void mayNotBeAFile() throws IOException {
        AquiferFiles files = new AquiferFiles(folder);
        Files.writeString(files.out(), "mine");
        refused(files.balance(), "is a file");
        refused(files.balance("--overwrite"), "is a file");
        assertThat(files.out()).hasContent("mine");
    }

    @Test
    void mayNotBeBelowAFile() {
        AquiferFiles files = new AquiferFiles(folder).write();
        Path below = files.prisms().resolve("out");
        refused(
                Ran.of(
                        "balance",
                        files.aquifer().toString(),
                        "--prisms",
                        files.prisms().toString(),
                        "--out",
                        below.toString()),
                "cannot be used (a file is in its place)",
                "Name a folder where you may write.");
    }

    /** Even a superuser may make no folder there. */
    @Test
    void mustBeWritable() {
        assumeTrue(Files.isDirectory(Path.of("/proc/self")), "this system has no /proc");
        AquiferFiles files = new AquiferFiles(folder).write();
        refused(
                Ran.of(
                        "balance",
                        files.aquifer().toString(),
                        "--prisms",
                        files.prisms().toString(),
                        "--out",
                        "/proc/self/seepledger-out"),
                "The output folder /proc/self/seepledger-out cannot be used (",
                "Name a folder where you may write.");
    }

    @Test
    void overwritesJustWhatTheEarlierRunWrote() throws IOException {
        AquiferFiles files = new AquiferFiles(folder);
        succeeded(files.balance());
        Files.writeString(files.out().resolve("mine.txt"), "mine");
        Files.createDirectory(files.out().resolve("drawings"));
        String before = Files.readString(files.out().resolve("budget.csv"));
        refused(files.with("flow/x", "0.2").balance(), "is not empty");
        succeeded(files.balance("--overwrite"));
        assertThat(Files.readString(files.out().resolve("budget.csv"))).isNotEqualTo(before);
        assertThat(AquiferFiles.names(files.out()))
                .containsExactly(
                        "budget.csv",
                        "drawings",
                        "exchange.csv",
                        "faces.geojson",
                        "imbalance_l1.tif",
                        "imbalance_l2.tif",
                        "mine.txt",
                        "report.html",
                        "run.json");
        assertThat(files.out().resolve("mine.txt")).hasContent("mine");
    }

    @Test
    void removesFilesThatTheNewRunDoesNotHave() {
        AquiferFiles files = new AquiferFiles(folder);
        succeeded(files.balance());
        succeeded(files.with("layers", "[{'top': 10, 'bottom': 0}]").balance("--overwrite"));
        assertThat(AquiferFiles.names(files.out()))
                .containsExactly(
                        "budget.csv", "exchange.csv", "faces.geojson", "imbalance_l1.tif", "report.html", "run.json");
    }

    @Test
    void keepsTheEarlierRunWhenTheNewOneFails() throws IOException {
        AquiferFiles files = new AquiferFiles(folder);
        succeeded(files.balance());
        Map<String, String> before = contents(files.out());
        assertThat(files.with("grids", "1").balance("--overwrite").status()).isEqualTo(3);
        assertThat(files.without("grids")
                        .balance("--overwrite", "--every", "month")
                        .status())
                .isEqualTo(3);
        assertThat(contents(files.out())).isEqualTo(before);
        assertThat(files.left()).containsExactly("aquifer", "out", "prisms.geojson");
    }

    @Test
    void doesNotReplaceAFileThatNoEarlierRunWrote() throws IOException {
        AquiferFiles files = new AquiferFiles(folder).with("layers", "[{'top': 10, 'bottom': 0}]");
        succeeded(files.balance());
        Files.writeString(files.out().resolve("imbalance_l2.tif"), "mine");
        Map<String, String> before = contents(files.out());
        files.with("layers", "[{'top': 10, 'bottom': 5}, {'bottom': 0}]");
        refused(files.balance("--overwrite"), "imbalance_l2.tif is in the way");
        assertThat(contents(files.out())).isEqualTo(before);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "../mine.txt",
                "/etc/mine.txt",
                "..",
                ".",
                ".mine",
                "drawings",
                "drawings/../../mine.txt",
                "mine.txt\\u0000"
            })
    void takesNoNameOutOfTheFolderFromARunRecord(String hostile) throws IOException {
        AquiferFiles files = new AquiferFiles(folder);
        succeeded(files.balance());
        Files.writeString(folder.resolve("mine.txt"), "mine");
        Files.writeString(files.out().resolve(".mine"), "mine");
        Files.createDirectory(files.out().resolve("drawings"));
        Files.writeString(files.out().resolve("drawings/x"), "mine");
        Path record = files.out().resolve("run.json");
        String text = Files.readString(record);
        Files.writeString(record, text.replace("imbalance_l2.tif", hostile));
        Files.delete(files.out().resolve("imbalance_l2.tif"));
        succeeded(files.balance("--overwrite"));
        assertThat(folder.resolve("mine.txt")).hasContent("mine");
        assertThat(files.out().resolve(".mine")).hasContent("mine");
        assertThat(files.out().resolve("drawings/x")).hasContent("mine");
    }

    @ParameterizedTest
    @ValueSource(strings = {"{", "[]", "{\"outputs\": [{\"name\": \"mine.txt\"}]}", "{\"program\": \"other\"}"})
    void takesNothingElseForARunRecord(String text) throws IOException {
        AquiferFiles files = new AquiferFiles(folder);
        Files.createDirectory(files.out());
        Files.writeString(files.out().resolve("run.json"), text);
        Files.writeString(files.out().resolve("mine.txt"), "mine");
        refused(files.balance("--overwrite"), "no run record that can be read");
        assertThat(files.out().resolve("mine.txt")).hasContent("mine");
    }

    @Test
    void doesNotReplaceWhatAnotherCommandWrote() throws IOException {
        AquiferFiles files = new AquiferFiles(folder);
        succeeded(files.balance());
        Path record = files.out().resolve("run.json");
        String text = Files.readString(record);
        Files.writeString(record, text.replace("\"command\" : \"balance\"", "\"command\" : \"extract\""));
        refused(files.balance("--overwrite"), "holds what \"extract\" wrote");
        assertThat(files.out().resolve("budget.csv")).exists();
    }
}
