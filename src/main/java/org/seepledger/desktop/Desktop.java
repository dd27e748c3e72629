package org.seepledger.desktop;

import java.nio.file.Path;
import java.util.Optional;
import javafx.application.Application;
import org.seepledger.fault.UsageFault;

/** Opens the window. */
public final class Desktop {

    private Desktop() {}

    /**
     * Opens the window and returns when it is closed.
     *
     * @param folder the aquifer folder to open; empty for the welcome page
     * @throws UsageFault if there is no display to open it on
     */
    public static void open(Optional<Path> folder) {
        if (!Display.exists()) {
            throw noDisplay();
        }
        try {
            Application.launch(
                    WindowApplication.class, folder.map(Path::toString).stream().toArray(String[]::new));
        } catch (UnsupportedOperationException | UnsatisfiedLinkError e) {
            throw noDisplay();
        }
    }

    private static UsageFault noDisplay() {
        return new UsageFault("There is no display to open a window on. Run this where there is a screen, or use the"
                + " other commands, which need none: seepledger --help.");
    }
}
