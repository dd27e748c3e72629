package org.seepledger.io;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.fault.UsageFault;

class WholeFileTest {

    @TempDir
    Path folder;

    private static void write(Path file, String text) {
        WholeFile.write(file, writer -> writer.write(text));
    }

    private Stream<String> names() throws IOException {
        return Files.list(folder).map(file -> file.getFileName().toString());
    }

    @Test
    void writesAndReplaces() throws IOException {
        Path file = folder.resolve("a.txt");
        write(file, "höher");
        assertThat(file).hasContent("höher");
        write(file, "short");
        assertThat(file).hasContent("short");
        assertThat(names()).containsExactly("a.txt");
    }

    @Test
    void leavesTheOldFileWhenWritingFails() throws IOException {
        Path file = folder.resolve("a.txt");
        write(file, "old");
        assertThatThrownBy(() -> WholeFile.write(file, writer -> {
                    writer.write("half");
                    throw new IOException("the disk is full");
                }))
                .isInstanceOf(UsageFault.class)
                .hasMessage(
                        "The file " + file + " cannot be written (the disk is full). Name a file where you may write.");
        assertThatThrownBy(() -> WholeFile.write(file, writer -> {
                    throw new IllegalStateException("a fault of the program");
                }))
                .isInstanceOf(IllegalStateException.class);
        assertThat(file).hasContent("old");
        assertThat(names()).containsExactly("a.txt");
    }

    @Test
    void writesTheFileThatALinkLeadsTo() throws IOException {
        Path file = folder.resolve("a.txt");
        write(file, "old");
        Path link = Files.createSymbolicLink(folder.resolve("link.txt"), file);
        write(link, "new");
        assertThat(file).hasContent("new");
        assertThat(link).isSymbolicLink();
    }

    @Test
    void saysWhyItCannot() {
        assertThatThrownBy(() -> write(folder.resolve("none/a.txt"), ""))
                .isInstanceOf(UsageFault.class)
                .hasMessageContaining("(no such file)");
        assertThatThrownBy(() -> write(folder, "")).isInstanceOf(UsageFault.class);
    }
}
