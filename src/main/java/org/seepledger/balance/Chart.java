package org.seepledger.balance;

import java.util.ArrayList;
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
    private final int lids;
    private final int sources;
    private final int storage;

    Chart(Aquifer aquifer, PrismCut cut) {
        VerticalRange.Layers range = layersOf(cut.prism().range(), aquifer);
        this.first = range.first();
        this.layers = range.last() - range.first() + 1;
        this.categories = aquifer.categories();
        this.storageItems = aquifer.storageItems();
        boolean[] onEdge = cut.itemsOnEdge();
        for (int item = 0; item < cut.items().size(); item++) {
            boolean quantified = !(onEdge[item] && aquifer.flow().closedSides());
            addLayers(Group.SIDE, cut.items().get(item), quantified);
        }
        this.lids = accounts.size();
        accounts.add(new Account(Group.LID, "top", first, true));
        accounts.add(new Account(Group.LID, "bottom", range.last(), true));
        this.sources = accounts.size();
        categories.forEach(category -> addLayers(Group.SOURCE, category, true));
        this.storage = accounts.size();
        boolean known = aquifer.storageKnowledge() != StorageKnowledge.UNKNOWN;
        storageItems.forEach(item -> addLayers(Group.STORAGE, item, known));
    }

    private static VerticalRange.Layers layersOf(VerticalRange range, Aquifer aquifer) {
        return range instanceof VerticalRange.Layers given
                ? given
                : new VerticalRange.Layers(0, aquifer.layers().size() - 1);
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

    int top() {
        return lids;
    }

    int bottom() {
        return lids + 1;
    }

    int source(String category, int layer) {
        return sources + categories.indexOf(category) * layers + layer - first;
    }

    int storage(String item, int layer) {
        return storage + storageItems.indexOf(item) * layers + layer - first;
    }
}
