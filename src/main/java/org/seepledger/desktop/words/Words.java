package org.seepledger.desktop.words;

import java.util.ResourceBundle;

/** The window's words, by key. */
public final class Words {

    private static final ResourceBundle BUNDLE = ResourceBundle.getBundle("org.seepledger.desktop.words");

    private Words() {}

    /**
     * {@return the words of a key, with each {@code {n}} replaced by the n-th value}
     *
     * @param key the key
     * @param values the values, as they are to be read
     */
    public static String of(String key, Object... values) {
        String words = BUNDLE.getString(key);
        for (int n = 0; n < values.length; n++) {
            words = words.replace("{" + n + "}", String.valueOf(values[n]));
        }
        return words;
    }
}
