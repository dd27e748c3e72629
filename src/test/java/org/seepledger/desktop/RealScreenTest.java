package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;

/** The window under X, as a user starts it, on a virtual screen where there is Xvfb. */
class RealScreenTest {

    @TempDir
    private Path folder;

    private static boolean isThere(String program) {
        return List.of(System.getenv("PATH").split(java.io.File.pathSeparator)).stream()
                .anyMatch(place -> Files.isExecutable(Path.of(place, program)));
    }

    @Test
    @Timeout(150)
    void theWindowOpensShowsTheMapAndEnds() throws IOException, InterruptedException {
        assumeTrue(isThere("xvfb-run"), "there is no Xvfb");
        List<String> command = new ArrayList<>(List.of("xvfb-run", "-a", "-s", "-screen 0 1280x800x24"));
        command.addAll(OtherProcess.command(
                ShownOnce.class,
                List.of("-Dprism.order=sw", "-Dseepledger.guard=true", "-Djava.util.prefs.userRoot=" + folder),
                Path.of("sample-aquifers/valley").toAbsolutePath().toString()));
        Path log = folder.resolve("log.txt");
        Process window = OtherProcess.start(command, log);
        boolean ended = window.waitFor(120, TimeUnit.SECONDS);
        window.destroyForcibly();
        String said = Files.readString(log);
        assumeTrue(!said.contains("libgtk") && !said.contains("no suitable pipeline"), "there is no GTK");
        assertThat(ended).as(said).isTrue();
        assertThat(window.exitValue()).as(said).isZero();
        assertThat(said).doesNotContain("Exception");
    }
}
