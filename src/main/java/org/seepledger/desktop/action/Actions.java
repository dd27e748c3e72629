package org.seepledger.desktop.action;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;

/** All actions, in the order in which they are listed. */
public final class Actions {

    private final List<Action> actions = new ArrayList<>();

    /**
     * Adds actions.
     *
     * @param added the actions; no two may share a shortcut
     * @throws IllegalArgumentException if two do
     */
    public void add(List<Action> added) {
        for (Action action : added) {
            if (actions.stream().anyMatch(other -> other.keys().equals(action.keys()))) {
                throw new IllegalArgumentException("two actions share " + action.keys());
            }
            actions.add(action);
        }
    }

    /**
     * Does an action, if it can be done.
     *
     * @param name the key of its words
     */
    public void perform(String name) {
        actions.stream().filter(action -> action.name().equals(name)).forEach(Action::perform);
    }

    /** {@return all of them} */
    public List<Action> all() {
        return Collections.unmodifiableList(actions);
    }

    /**
     * {@return those whose words hold each of some words}
     *
     * @param sought the words; none for all actions
     */
    public List<Action> matching(String sought) {
        String[] words = sought.strip().toLowerCase(Locale.ROOT).split("\\s+");
        return actions.stream().filter(action -> holds(action, words)).toList();
    }

    private static boolean holds(Action action, String[] words) {
        String text = (action.groupWords() + " " + action.words()).toLowerCase(Locale.ROOT);
        for (String word : words) {
            if (!text.contains(word)) {
                return false;
            }
        }
        return true;
    }
}
