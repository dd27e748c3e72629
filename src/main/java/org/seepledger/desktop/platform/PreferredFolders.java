package org.seepledger.desktop.platform;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.prefs.Preferences;
import org.seepledger.desktop.port.RecentFolders;

/** Recent folders in the user's preferences; one that cannot be written only forgets. */
public final class PreferredFolders implements RecentFolders {

    private static final int KEPT = 8;
    private static final String KEY = "recent.";

    private final Preferences preferences;

    /**
     * Makes the list.
     *
     * @param preferences where it is kept
     */
    public PreferredFolders(Preferences preferences) {
        this.preferences = preferences;
    }

    @Override
    public List<Path> list() {
        List<Path> folders = new ArrayList<>();
        for (int place = 0; place < KEPT; place++) {
            path(preferences.get(KEY + place, "")).ifPresent(folders::add);
        }
        return folders;
    }

    @Override
    public void remember(Path folder) {
        List<Path> folders = without(folder);
        folders.add(0, folder.toAbsolutePath().normalize());
        write(folders);
    }

    @Override
    public void forget(Path folder) {
        write(without(folder));
    }

    private List<Path> without(Path folder) {
        List<Path> folders = list();
        folders.remove(folder.toAbsolutePath().normalize());
        return folders;
    }

    private void write(List<Path> folders) {
        for (int place = 0; place < KEPT; place++) {
            String path = place < folders.size() ? folders.get(place).toString() : "";
            if (path.length() <= Preferences.MAX_VALUE_LENGTH) {
                preferences.put(KEY + place, path);
            }
        }
    }

    private static Optional<Path> path(String text) {
        try {
            return text.isEmpty() ? Optional.empty() : Optional.of(Path.of(text));
        } catch (InvalidPathException e) {
            return Optional.empty();
        }
    }
}
