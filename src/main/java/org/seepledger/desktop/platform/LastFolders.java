package org.seepledger.desktop.platform;

import java.io.File;
import java.util.Optional;
import java.util.prefs.Preferences;
import org.seepledger.desktop.port.Settings;

/** The folder that a dialog ended in, for each purpose of its own, kept from run to run. */
final class LastFolders {

    private final Settings settings;

    LastFolders(Settings settings) {
        this.settings = settings;
    }

    private static String key(String purpose) {
        String key = "folder." + purpose;
        return key.substring(0, Math.min(key.length(), Preferences.MAX_KEY_LENGTH));
    }

    /** The folder, if it is still there. */
    Optional<File> of(String purpose) {
        return settings.get(key(purpose)).map(File::new).filter(File::isDirectory);
    }

    void remember(String purpose, File chosen) {
        Optional.ofNullable(chosen.getAbsoluteFile().getParentFile())
                .ifPresent(folder -> settings.put(key(purpose), folder.getPath()));
    }
}
