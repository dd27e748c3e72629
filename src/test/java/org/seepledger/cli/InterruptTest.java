package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A run that is stopped ends with status 130 and leaves nothing. */
class InterruptTest {

    private static final int SIGINT = 2;

    @TempDir
    Path folder;

    /** Asks for a stop as soon as a stretch of work is announced, and only then lets the work go on. */
    private static final class StopAt extends OutputStream {

        private final ByteArrayOutputStream text = new ByteArrayOutputStream();
        private final String words;
        private final Interrupt interrupt;
        private boolean asked;

        StopAt(String words, Interrupt interrupt) {
            this.words = words;
            this.interrupt = interrupt;
        }

        @Override
        public void write(int letter) {
            text.write(letter);
            if (!asked && text().contains(words)) {
                asked = true;
                Thread control = new Thread(interrupt::stopAndWait);
                control.setDaemon(true);
                control.start();
                while (!interrupt.isAsked()) {
                    Thread.onSpinWait();
                }
            }
        }

        String text() {
            return text.toString(StandardCharsets.UTF_8);
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"balancing", "fingerprinting inputs"})
    void leavesNothing(String stage) throws IOException {
        AquiferFiles files = new AquiferFiles(folder).write();
        Interrupt interrupt = new Interrupt();
        StopAt err = new StopAt(stage, interrupt);
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        int status = Seepledger.run(
                new PrintStream(out, true, StandardCharsets.UTF_8),
                new PrintStream(err, true, StandardCharsets.UTF_8),
                interrupt,
                Clock.systemUTC(),
                "balance",
                files.aquifer().toString(),
                "--prisms",
                files.prisms().toString(),
                "--out",
                files.out().toString(),
                "--progress");
        interrupt.finished();
        assertThat(status).isEqualTo(130);
        assertThat(err.text().lines()).endsWith("Stopped; nothing was written.");
        assertThat(out.size()).isZero();
        assertThat(files.left()).containsExactly("aquifer", "prisms.geojson");
    }

    @Test
    void ctrlCStopsARealRun() throws IOException, InterruptedException {
        assumeTrue(takesInterrupts(), "this process was started with SIGINT ignored, or knows no signals");
        String times = IntStream.rangeClosed(0, 3_000).mapToObj(String::valueOf).collect(Collectors.joining(","));
        AquiferFiles files = new AquiferFiles(folder)
                .with("grid", "{'x': {'from': 0, 'step': 1, 'count': 300}, 'y': {'from': 0, 'step': 1, 'count': 300}}")
                .with("times", "[" + times + "]")
                .prism("p", "", "'type': 'Polygon', 'coordinates': [[[9,9],[290,9],[290,290],[9,290],[9,9]]]")
                .write();
        Path printed = Files.createDirectory(folder.resolve("printed"));
        ChildJvm child = new ChildJvm(
                printed,
                List.of(),
                List.of(
                        "balance",
                        files.aquifer().toString(),
                        "--prisms",
                        files.prisms().toString(),
                        "--out",
                        files.out().toString(),
                        "--progress"));
        while (child.isAlive() && !child.printedErr().contains("balancing:")) {
            Thread.sleep(20);
        }
        assertThat(new ProcessBuilder("kill", "-INT", String.valueOf(child.pid()))
                        .start()
                        .waitFor())
                .isZero();
        Ran ran = child.ended();
        assertThat(ran.status()).isEqualTo(130);
        assertThat(ran.err().lines()).endsWith("Stopped; nothing was written.");
        assertThat(ran.out()).isEmpty();
        assertThat(files.left()).containsExactly("aquifer", "printed", "prisms.geojson");
    }

    /** A program started in the background by a plain shell ignores SIGINT, and so do those that it starts. */
    private static boolean takesInterrupts() throws IOException {
        Path status = Path.of("/proc/self/status");
        if (!Files.isReadable(status)) {
            return false;
        }
        String ignored = Files.readAllLines(status).stream()
                .filter(line -> line.startsWith("SigIgn:"))
                .findFirst()
                .orElse("SigIgn: 0");
        long mask = Long.parseUnsignedLong(ignored.split("\\s+")[1], 16);
        return (mask >> (SIGINT - 1) & 1) == 0;
    }
}
