package org.seepledger.desktop;

import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;

/** Whether there is a screen. */
final class Display {

    private Display() {}

    /** Asks the environment, since the toolkit's own answer is a stack trace from a thread of its own. */
    static boolean exists() {
        return System.getProperty("glass.platform") != null
                || exists(System.getProperty("os.name", ""), System.getenv());
    }

    static boolean exists(String system, Map<String, String> environment) {
        String name = system.toLowerCase(Locale.ROOT);
        return name.contains("windows")
                || name.contains("mac")
                || Stream.of("DISPLAY", "WAYLAND_DISPLAY")
                        .anyMatch(
                                screen -> !environment.getOrDefault(screen, "").isBlank());
    }
}
