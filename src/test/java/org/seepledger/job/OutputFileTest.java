package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assumptions.assumeThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class OutputFileTest {

    @Test
    void whoMayReadOtherFilesOfTheUserMayReadThisOne(@TempDir Path folder) throws IOException {
        assumeThat(folder.getFileSystem().supportedFileAttributeViews()).contains("posix");
        Path plain = Files.createFile(folder.resolve("plain"));
        Path target = folder.resolve("trace.csv");
        try (OutputFile out = OutputFile.at(target, false, "# ")) {
            Files.writeString(out.path(), "# done");
            out.publish();
        }
        assertThat(Files.getPosixFilePermissions(target)).isEqualTo(Files.getPosixFilePermissions(plain));
    }
}
