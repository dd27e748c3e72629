package org.seepledger.desktop.platform;

import java.nio.file.Path;
import javafx.application.HostServices;
import org.seepledger.desktop.port.Opener;

/** Opens with the desktop's own programs. */
public final class HostOpener implements Opener {

    private final HostServices host;

    /**
     * Makes an opener.
     *
     * @param host the desktop
     */
    public HostOpener(HostServices host) {
        this.host = host;
    }

    @Override
    public void open(Path path) {
        host.showDocument(path.toUri().toString());
    }
}
