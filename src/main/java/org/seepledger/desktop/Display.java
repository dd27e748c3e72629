package org.seepledger.desktop;

import java.util.Locale;
import java.util.stream.Stream;

/** Whether there is a screen. */
final class Display {

    private Display() {}

    /** Asks the environment, since the toolkit's own answer is a stack trace from a thread of its own. */
    static boolean exists() {
        boolean named = Stream.of("DISPLAY", "WAYLAND_DISPLAY")
                .map(System::getenv)
                .anyMatch(screen -> screen != null && !screen.isBlank());
        return named || hasScreenAnyway();
    }

    private static boolean hasScreenAnyway() {
        String system = System.getProperty("os.name", "").toLowerCase(Locale.ROOT);
        return system.contains("windows") || system.contains("mac") || System.getProperty("glass.platform") != null;
    }
}
