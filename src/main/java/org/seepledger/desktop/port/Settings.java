package org.seepledger.desktop.port;

import java.util.Optional;

/** Small values that are kept from run to run. */
public interface Settings {

    /**
     * {@return a value, if one is kept}
     *
     * @param key what it is called
     */
    Optional<String> get(String key);

    /**
     * Keeps a value.
     *
     * @param key what it is called
     * @param value the value
     */
    void put(String key, String value);
}
