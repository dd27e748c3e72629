package org.seepledger.desktop;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** A Java of its own with the class path of the tests. */
final class OtherProcess {

    private static final List<String> SHARED = List.of(
            "testfx.robot",
            "testfx.headless",
            "prism.order",
            "headless.geometry",
            "java.awt.headless",
            "java.io.tmpdir");

    private OtherProcess() {}

    /** The command that runs a class on the screen in memory. */
    static List<String> inMemory(Class<?> main, String... arguments) {
        List<String> properties = SHARED.stream()
                .filter(key -> System.getProperty(key) != null)
                .map(key -> "-D" + key + "=" + System.getProperty(key))
                .toList();
        return command(main, properties, arguments);
    }

    /** The command that runs a class with some options. */
    static List<String> command(Class<?> main, List<String> options, String... arguments) {
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.addAll(options);
        command.add("-cp");
        command.add(System.getProperty("java.class.path"));
        command.add(main.getName());
        command.addAll(List.of(arguments));
        return command;
    }

    static Process start(List<String> command, Path log) throws IOException {
        return new ProcessBuilder(command)
                .redirectErrorStream(true)
                .redirectOutput(log.toFile())
                .start();
    }
}
