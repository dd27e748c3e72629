package org.seepledger.plume;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.balance.PrismWalk;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Group;

/**
 * The accounts of one prism for a solute: sides, lids and sources as the water's walk numbers them; dispersion by face;
 * decay, production and storage by layer.
 */
final class SoluteChart {

    static final String MASS_CHANGE = "mass change";
    static final String HELD = "held above the water table";
    static final String ELASTIC = "elastic storage";

    private final List<Account> accounts = new ArrayList<>();
    private final int layers;
    private final int faces;
    private final int dispersion;
    private final int decay;
    private final int production;
    private final int storage;

    /**
     * Draws the chart up.
     *
     * @param walk the prism's walk
     * @param disperses whether dispersion is asked for and known
     * @param produced whether the solute is a product of another
     * @param storageKnown whether the water's storage is known
     */
    SoluteChart(PrismWalk walk, boolean disperses, boolean produced, boolean storageKnown) {
        layers = walk.layers();
        walk.accounts().stream()
                .filter(account -> account.group() != Group.STORAGE)
                .forEach(accounts::add);
        faces = (int) accounts.stream()
                .filter(account -> account.group() != Group.SOURCE)
                .count();
        dispersion = accounts.size();
        if (disperses) {
            addDispersion(walk);
        }
        decay = accounts.size();
        add(walk, Group.DECAY, "decay", true);
        production = accounts.size();
        if (produced) {
            add(walk, Group.PRODUCTION, "production", true);
        }
        storage = accounts.size();
        add(walk, Group.STORAGE, MASS_CHANGE, true);
        add(walk, Group.STORAGE, HELD, storageKnown);
        add(walk, Group.STORAGE, ELASTIC, storageKnown);
    }

    /** What disperses through the grid's outer sides cannot be known. */
    private void addDispersion(PrismWalk walk) {
        boolean[] onEdge = walk.cut().itemsOnEdge();
        for (Account face : List.copyOf(accounts.subList(0, faces))) {
            int item = face.group() == Group.SIDE ? walk.cut().items().indexOf(face.item()) : -1;
            accounts.add(new Account(Group.DISPERSION, face.item(), face.layer(), item < 0 || !onEdge[item]));
        }
    }

    private void add(PrismWalk walk, Group group, String item, boolean quantified) {
        for (int layer = 0; layer < layers; layer++) {
            accounts.add(new Account(group, item, walk.firstLayer() + layer, quantified));
        }
    }

    List<Account> accounts() {
        return accounts;
    }

    /** The account of what disperses through a face. */
    int dispersion(int face) {
        return dispersion + face;
    }

    /** The account of what decays in a layer, counted from the prism's first. */
    int decay(int layer) {
        return decay + layer;
    }

    int production(int layer) {
        return production + layer;
    }

    int massChange(int layer) {
        return storage + layer;
    }

    int held(int layer) {
        return storage + layers + layer;
    }

    int elastic(int layer) {
        return storage + 2 * layers + layer;
    }
}
