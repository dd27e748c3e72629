package org.seepledger.desktop.platform;

import java.util.Optional;
import java.util.prefs.Preferences;
import org.seepledger.desktop.port.Settings;

/** Values in the user's preferences; one that cannot be written is only forgotten. */
public final class PreferredSettings implements Settings {

    private final Preferences preferences;

    /**
     * Makes the settings.
     *
     * @param preferences where they are kept
     */
    public PreferredSettings(Preferences preferences) {
        this.preferences = preferences;
    }

    @Override
    public Optional<String> get(String key) {
        return Optional.ofNullable(preferences.get(key, null));
    }

    @Override
    public void put(String key, String value) {
        if (value.length() <= Preferences.MAX_VALUE_LENGTH && value.indexOf('\0') < 0) {
            preferences.put(key, value);
        }
    }
}
