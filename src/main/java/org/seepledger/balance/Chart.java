package org.seepledger.balance;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Group;
import org.seepledger.prism.PrismCut;
import org.seepledger.prism.VerticalRange;

/** The accounts of one prism, and where each stands among them. */
final class Chart {

    private final int first;
    private final int layers;
    private final List<Account> accounts = new ArrayList<>();
    private final List<String> categories;
    private final List<String> storageItems;
    private final int[] tops;
    private final int[] bottoms;
    private final int sources;
    private final int storage;

    Chart(Aquifer aquifer, PrismCut cut) {
        VerticalRange.Layers range = cut.prism().range() instanceof VerticalRange.Elevations elevations
                ? TouchedLayers.of(aquifer, cut, elevations)
                : (VerticalRange.Layers) cut.prism().range();
        this.first = range.first();
        this.layers = range.last() - range.first() + 1;
        this.categories = aquifer.categories();
        this.storageItems = aquifer.storageItems();
        boolean[] onEdge = cut.itemsOnEdge();
        for (int item = 0; item < cut.items().size(); item++) {
            boolean quantified = !(onEdge[item] && aquifer.flow().closedSides());
            addLayers(Group.SIDE, cut.items().get(item), quantified);
        }
        boolean[] stepped = stepped(cut.prism().range());
        this.tops = addLids("top", stepped[0], range.first());
        this.bottoms = addLids("bottom", stepped[1], range.last());
        this.sources = accounts.size();
        categories.forEach(category -> addLayers(Group.SOURCE, category, true));
        this.storage = accounts.size();
        boolean known = aquifer.storageKnowledge() != StorageKnowledge.UNKNOWN;
        storageItems.forEach(item -> addLayers(Group.STORAGE, item, known));
    }

    /** Whether the top and the bottom may lie in any layer of the range. */
    private static boolean[] stepped(VerticalRange range) {
        return range instanceof VerticalRange.Elevations elevations
                ? new boolean[] {
                    elevations.top().isPresent(), elevations.bottom().isPresent()
                }
                : new boolean[2];
    }

    /** Adds a lid: one account, or one for each layer that it may lie in; tells which account a layer's is. */
    private int[] addLids(String item, boolean stepped, int onlyLayer) {
        int[] byLayer = new int[layers];
        Arrays.fill(byLayer, accounts.size());
        if (!stepped) {
            accounts.add(new Account(Group.LID, item, onlyLayer, true));
            return byLayer;
        }
        for (int layer = 0; layer < layers; layer++) {
            byLayer[layer] = accounts.size();
            accounts.add(new Account(Group.LID, item, first + layer, true));
        }
        return byLayer;
    }

    private void addLayers(Group group, String item, boolean quantified) {
        for (int layer = first; layer < first + layers; layer++) {
            accounts.add(new Account(group, item, layer, quantified));
        }
    }

    List<Account> accounts() {
        return accounts;
    }

    int first() {
        return first;
    }

    int last() {
        return first + layers - 1;
    }

    int layers() {
        return layers;
    }

    boolean holds(int layer) {
        return layer >= first && layer < first + layers;
    }

    int side(int item, int layer) {
        return item * layers + layer - first;
    }

    int top(int layer) {
        return tops[layer - first];
    }

    int bottom(int layer) {
        return bottoms[layer - first];
    }

    int source(String category, int layer) {
        return sources + categories.indexOf(category) * layers + layer - first;
    }

    int storage(String item, int layer) {
        return storage + storageItems.indexOf(item) * layers + layer - first;
    }
}
