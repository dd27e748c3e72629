package org.seepledger.intake;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/**
 * What is to become of loose files: guesses and what a person said.
 *
 * @param root the folder that all files lie under
 * @param items the files, those that belong together as one
 * @param wishes what a person said of the set as a whole
 */
public record Plan(Path root, List<Item> items, Wishes wishes) {

    /** Copies the list. */
    public Plan {
        items = List.copyOf(items);
    }

    /** {@return the same with another item in the place of one} */
    public Plan with(int index, Item item) {
        List<Item> changed = new ArrayList<>(items);
        changed.set(index, item);
        return new Plan(root, changed, wishes);
    }

    /** {@return the same with other wishes} */
    public Plan with(Wishes changed) {
        return new Plan(root, items, changed);
    }

    /** {@return how many bytes the files have that are used} */
    public long bytes() {
        return items.stream()
                .filter(Item::isUsed)
                .flatMap(item -> item.files().stream())
                .mapToLong(LooseFile::bytes)
                .sum();
    }
}
