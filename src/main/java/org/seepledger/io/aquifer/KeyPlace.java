package org.seepledger.io.aquifer;

import java.util.regex.Pattern;

/**
 * Where something stands in {@code aquifer.json}, as people count: {@code layers, entry 1, top} is the key {@code top} of
 * the first entry of {@code layers}.
 */
final class KeyPlace {

    private static final Pattern INDEX = Pattern.compile("\\[(\\d+)]");
    private static final Pattern KEY_OF_ENTRY = Pattern.compile("(entry \\d+)\\.");

    private KeyPlace() {}

    /**
     * {@return an entry of a list}
     *
     * @param list where the list stands
     * @param index which, from 0
     */
    static String entry(String list, int index) {
        return list + ", entry " + (index + 1);
    }

    /**
     * {@return a key of an object}
     *
     * @param object where the object stands
     * @param key the key
     */
    static String key(String object, String key) {
        return KEY_OF_ENTRY.matcher(object + "." + key).replaceAll("$1, ");
    }

    /**
     * {@return a place that the schema's validator names}
     *
     * @param path keys joined by points, entries counted from 0 in brackets, from the root <code>$</code>
     */
    static String of(String path) {
        String plain = path.replaceFirst("^\\$\\.?", "");
        String counted = INDEX.matcher(plain).replaceAll(index -> ", entry " + (Long.parseLong(index.group(1)) + 1));
        return KEY_OF_ENTRY.matcher(counted).replaceAll("$1, ");
    }
}
