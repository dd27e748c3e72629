package org.seepledger.cli;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;

/** The program in a Java of its own, as a user starts it. */
final class ChildJvm {

    private static final int MOST_SECONDS = 120;

    private final Path folder;
    private final Process process;

    /** Starts it with options for Java and arguments; what it prints goes to files. */
    ChildJvm(Path folder, List<String> forJava, List<String> arguments) {
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.addAll(forJava);
        command.addAll(List.of("-cp", System.getProperty("java.class.path"), Seepledger.class.getName()));
        command.addAll(arguments);
        this.folder = folder;
        try {
            this.process = new ProcessBuilder(command)
                    .redirectOutput(folder.resolve("printed.out").toFile())
                    .redirectError(folder.resolve("printed.err").toFile())
                    .start();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    long pid() {
        return process.pid();
    }

    boolean isAlive() {
        return process.isAlive();
    }

    String printedErr() {
        return read("printed.err");
    }

    private String read(String name) {
        try {
            return Files.readString(folder.resolve(name), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Waits for the end. */
    Ran ended() throws InterruptedException {
        if (!process.waitFor(MOST_SECONDS, TimeUnit.SECONDS)) {
            process.destroyForcibly();
            throw new AssertionError("still running after " + MOST_SECONDS + " s: " + printedErr());
        }
        return new Ran(process.exitValue(), read("printed.out"), printedErr());
    }
}
