package org.seepledger.io.table;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/** Finds what somebody may have meant, by edit distance (Levenshtein 1966), case aside. */
final class NearestName {

    private NearestName() {}

    /**
     * {@return the first of the nearest names}
     *
     * @param name what was written
     * @param names at least one name
     */
    static String to(String name, List<String> names) {
        return names.stream()
                .min(Comparator.comparingInt(other -> distance(folded(name), folded(other))))
                .orElseThrow();
    }

    private static String folded(String name) {
        return name.toLowerCase(Locale.ROOT);
    }

    static int distance(String from, String to) {
        int[] above = new int[from.length() + 1];
        for (int i = 0; i < above.length; i++) {
            above[i] = i;
        }
        for (int j = 1; j <= to.length(); j++) {
            int[] row = new int[above.length];
            row[0] = j;
            for (int i = 1; i < row.length; i++) {
                int changed = above[i - 1] + (from.charAt(i - 1) == to.charAt(j - 1) ? 0 : 1);
                row[i] = Math.min(changed, 1 + Math.min(above[i], row[i - 1]));
            }
            above = row;
        }
        return above[from.length()];
    }
}
