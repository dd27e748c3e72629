package org.seepledger.desktop.platform;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.HashMap;
import java.util.Map;
import java.util.prefs.AbstractPreferences;
import org.junit.jupiter.api.Test;

class PreferredFoldersTest {

    /** Preferences in memory. */
    private static final class Kept extends AbstractPreferences {

        private final Map<String, String> values = new HashMap<>();

        Kept() {
            super(null, "");
        }

        @Override
        protected void putSpi(String key, String value) {
            values.put(key, value);
        }

        @Override
        protected String getSpi(String key) {
            return values.get(key);
        }

        @Override
        protected void removeSpi(String key) {
            values.remove(key);
        }

        @Override
        protected void removeNodeSpi() {}

        @Override
        protected String[] keysSpi() {
            return values.keySet().toArray(String[]::new);
        }

        @Override
        protected String[] childrenNamesSpi() {
            return new String[0];
        }

        @Override
        protected AbstractPreferences childSpi(String name) {
            throw new UnsupportedOperationException();
        }

        @Override
        protected void syncSpi() {}

        @Override
        protected void flushSpi() {}
    }

    private static Path place(String name) {
        return Path.of(name).toAbsolutePath();
    }

    @Test
    void theLatestComesFirstEachOnceAndNoMoreThanEight() {
        Kept kept = new Kept();
        PreferredFolders folders = new PreferredFolders(kept);
        for (int i = 0; i < 10; i++) {
            folders.remember(Path.of("f" + i));
        }
        folders.remember(Path.of("f5"));
        folders.forget(Path.of("f9"));
        assertThat(new PreferredFolders(kept).list())
                .containsExactly(
                        place("f5"), place("f8"), place("f7"), place("f6"), place("f4"), place("f3"), place("f2"));
    }
}
