package org.seepledger.io.result;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FileRecordTest {

    @TempDir
    Path folder;

    /** The one-block example of FIPS 180, appendix on SHA-256. */
    @Test
    void hashesAsPublished() throws IOException {
        FileRecord record = FileRecord.of("abc.txt", Files.writeString(folder.resolve("abc.txt"), "abc"));
        assertThat(record)
                .isEqualTo(new FileRecord(
                        "abc.txt", 3, "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad"));
    }
}
