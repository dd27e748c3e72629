package org.seepledger.desktop.shell;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;

/**
 * What is put into the window's frame.
 *
 * @param welcome the first page
 * @param showing what chooses the values shown, in the caption
 * @param map the map
 * @param ledger the budget beside it
 * @param ribbon what runs along time, below
 */
public record Slots(Node welcome, Node showing, Node map, Optional<Node> ledger, Optional<Node> ribbon) {

    /** {@return the panes that the keyboard goes through} */
    List<Node> panes() {
        List<Node> panes = new ArrayList<>(List.of(map));
        ledger.ifPresent(panes::add);
        ribbon.ifPresent(panes::add);
        return panes;
    }
}
