package org.seepledger.io;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;

/** Finds the name that was probably meant, to put it in a message. */
public final class NearestName {

    private static final int LONGEST = 256;

    /** A folder may hold millions of files; more than so many names are not looked at. */
    private static final int NAMES_LOOKED_AT = 10_000;

    private NearestName() {}

    /**
     * {@return the known name that a written one resembles most, or nothing when none is close: more than a third of
     * its letters would have to change}
     *
     * @param written what stands in the file; upper and lower case are the same
     * @param known what could stand there
     */
    public static Optional<String> of(String written, Collection<String> known) {
        int limit = Math.max(1, written.length() / 3);
        return known.stream()
                .filter(name -> distance(written, name) <= limit)
                .min(Comparator.comparingInt((String name) -> distance(written, name))
                        .thenComparing(Comparator.naturalOrder()));
    }

    /**
     * {@return the name beside a path that does not exist that it resembles most}
     *
     * @param missing the path
     */
    public static Optional<String> besides(Path missing) {
        Path absolute = missing.toAbsolutePath().normalize();
        if (absolute.getFileName() == null || !Files.isDirectory(absolute.getParent())) {
            return Optional.empty();
        }
        try (Stream<Path> files = Files.list(absolute.getParent())) {
            List<String> names = files.limit(NAMES_LOOKED_AT)
                    .map(file -> file.getFileName().toString())
                    .toList();
            return of(absolute.getFileName().toString(), names);
        } catch (IOException e) {
            return Optional.empty();
        }
    }

    /**
     * {@return how many letters must be changed, added or taken away to turn one name into the other (Levenshtein
     * 1966), whatever their case; at least the longer one's length when either is too long to be a name}
     *
     * @param one a name
     * @param other another
     */
    public static int distance(String one, String other) {
        if (Math.max(one.length(), other.length()) > LONGEST) {
            return Math.max(one.length(), other.length());
        }
        String across = one.toLowerCase(Locale.ROOT);
        String down = other.toLowerCase(Locale.ROOT);
        int[] row = new int[across.length() + 1];
        for (int j = 0; j < row.length; j++) {
            row[j] = j;
        }
        for (int i = 1; i <= down.length(); i++) {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j < row.length; j++) {
                int replaced = diagonal + (down.charAt(i - 1) == across.charAt(j - 1) ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.min(replaced, 1 + Math.min(row[j], row[j - 1]));
            }
        }
        return row[across.length()];
    }
}
