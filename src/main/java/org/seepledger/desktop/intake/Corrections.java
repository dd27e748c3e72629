package org.seepledger.desktop.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.intake.Item;
import org.seepledger.intake.LooseFile;
import org.seepledger.intake.Plan;

/** Keeps what a person corrected when files are added. */
final class Corrections {

    private Corrections() {}

    /**
     * {@return a plan with the corrections of an earlier one}
     *
     * @param before the earlier one
     * @param looked the new one
     */
    static Plan kept(Plan before, Plan looked) {
        List<Item> items = new ArrayList<>();
        for (Item item : looked.items()) {
            items.add(same(before, item).orElse(item));
        }
        return new Plan(looked.root(), items, before.wishes());
    }

    /** An item of the same files as before; their names may be longer now, if they lie under another common folder. */
    private static Optional<Item> same(Plan before, Item item) {
        return before.items().stream()
                .filter(old -> old.id().equals(item.id()) && paths(old).equals(paths(item)))
                .findFirst();
    }

    private static List<Object> paths(Item item) {
        List<Object> paths = new ArrayList<>();
        for (LooseFile file : item.files()) {
            paths.add(file.path());
            paths.add(file.bytes());
        }
        return paths;
    }
}
