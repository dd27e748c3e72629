package org.seepledger.desktop.shell;

import javafx.scene.Node;
import javafx.scene.Parent;

/** Which part of the window has the keyboard, and where in a part it begins. */
final class Focus {

    private Focus() {}

    static void in(Node pane) {
        Node target = firstFocusable(pane);
        (target == null ? pane : target).requestFocus();
    }

    private static Node firstFocusable(Node node) {
        if (!node.isVisible()) {
            return null;
        }
        if (node.isFocusTraversable() && !node.isDisabled()) {
            return node;
        }
        if (node instanceof Parent parent) {
            for (Node child : parent.getChildrenUnmodifiable()) {
                Node found = firstFocusable(child);
                if (found != null) {
                    return found;
                }
            }
        }
        return null;
    }

    static boolean isIn(Node pane, Node node) {
        for (Node up = node; up != null; up = up.getParent()) {
            if (up == pane) {
                return true;
            }
        }
        return false;
    }
}
