package org.seepledger.io;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.fault.DataFault;

class JsonFileTest {

    @TempDir
    Path folder;

    private void assertRefused(String text, String message) throws IOException {
        Path file = Files.writeString(folder.resolve("a.json"), text);
        assertThatThrownBy(() -> JsonFile.read(file, "a.json"))
                .isInstanceOf(DataFault.class)
                .hasMessageStartingWith("a.json")
                .hasMessageContaining(message);
    }

    @Test
    void readsWithAByteOrderMark() throws IOException {
        Path file = Files.writeString(folder.resolve("a.json"), "\uFEFF{\"a\": 1}");
        assertThat(JsonFile.read(file, "a.json").path("a").intValue()).isEqualTo(1);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "''; an empty file",
                "{\"a\": 1,}; line 1, column 9",
                "{\"a\": 1, \"a\": 2}; Duplicate field 'a'",
                "[1] [2]; fault in the JSON",
                "[NaN]; fault in the JSON",
                "[01]; fault in the JSON",
            })
    void saysWhereItIsNotJson(String text, String message) throws IOException {
        assertRefused(text, message);
    }

    @Test
    void refusesDepthLengthOfNumbersAndCountOfTokensBeforeTheyFillTheMemory() throws IOException {
        assertRefused("[".repeat(100_000), "levels");
        assertRefused("[" + "9".repeat(5_000) + "]", "fault in the JSON");
        assertRefused("[" + "0,".repeat(8_000_000) + "0]", "tokens");
    }

    @Test
    void refusesBytesThatAreNoText() throws IOException {
        Path file = Files.write(folder.resolve("a.json"), new byte[] {'"', (byte) 0xC3, (byte) 0x28, '"'});
        assertThatThrownBy(() -> JsonFile.read(file, "a.json")).isInstanceOf(DataFault.class);
    }

    @Test
    void refusesWhatIsNoFile() {
        assertThatThrownBy(() -> JsonFile.read(folder, "folder")).hasMessageContaining("not a plain file");
        assertThatThrownBy(() -> JsonFile.read(folder.resolve("b.json"), "b.json"))
                .hasMessage("b.json: found no such file; expected a JSON file. Correct the path.");
    }
}
