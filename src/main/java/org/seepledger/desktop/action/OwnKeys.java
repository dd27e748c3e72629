package org.seepledger.desktop.action;

import javafx.scene.input.KeyEvent;

/** A node that does some keys itself while the keyboard is on it; shortcuts of those keys then wait. */
@FunctionalInterface
public interface OwnKeys {

    /**
     * {@return whether the node does a key itself now}
     *
     * @param key the key
     */
    boolean keeps(KeyEvent key);
}
