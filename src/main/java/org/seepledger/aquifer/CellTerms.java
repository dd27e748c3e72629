package org.seepledger.aquifer;

import java.util.ArrayList;
import java.util.List;

/** Works out sources by area and by cell, and releases from storage, of one interval. */
final class CellTerms {

    private final Aquifer aquifer;
    private final int interval;
    private final CellGeometry geometry;
    private final Block block;
    private final Saturation saturation;
    private final boolean[] active;

    CellTerms(Aquifer aquifer, int interval, CellGeometry geometry, Saturation saturation, boolean[] active) {
        this.saturation = saturation;
        this.aquifer = aquifer;
        this.interval = interval;
        this.geometry = geometry;
        this.block = geometry.block();
        this.active = active;
    }

    List<GivenTerm> sources() {
        List<GivenTerm> terms = new ArrayList<>();
        for (Source source : aquifer.sources()) {
            if (source instanceof Source.Areal areal) {
                terms.add(new GivenTerm(areal.rate(), rate -> term(false, areal.category(), rate, true)));
            } else if (source instanceof Source.Cells cells) {
                terms.add(new GivenTerm(cells.rate(), rate -> term(false, cells.category(), rate, false)));
            }
        }
        return terms;
    }

    List<GivenTerm> suppliedStorage() {
        return aquifer.storage().supplied().stream()
                .map(supplied -> new GivenTerm(supplied.rate(), rate -> term(true, supplied.item(), rate, false)))
                .toList();
    }

    List<GivenTerm> storageFromHeads() {
        StorageRelease release =
                new StorageRelease(geometry, saturation, aquifer.times().length(interval));
        List<GivenTerm> terms = new ArrayList<>();
        aquifer.storage()
                .specificYield()
                .ifPresent(yield -> terms.add(new GivenTerm(yield, values -> {
                    double[] rates = release.waterTable(values, active);
                    return released(Aquifer.WATER_TABLE_STORAGE, CellTerm.Entry.WHERE_IT_PASSES, rates);
                })));
        boolean perLength = aquifer.storage().specificStorage().isPresent();
        terms.add(new GivenTerm(aquifer.storage().elastic(), values -> {
            double[] rates = release.elastic(values, perLength, active);
            return released(Aquifer.ELASTIC_STORAGE, CellTerm.Entry.THROUGHOUT, rates);
        }));
        return terms;
    }

    private static CellTerm released(String item, CellTerm.Entry entry, double[] rates) {
        return new CellTerm(true, item, entry, rates, 0, 0);
    }

    private CellTerm term(boolean storage, String item, GriddedValues values, boolean perArea) {
        double[] rates = new double[block.size()];
        int missing = 0;
        double lost = 0;
        Window window = block.window();
        double[] given = new double[window.size()];
        int layers = values.layered() ? block.layers() : 1;
        for (int layer = 0; layer < layers; layer++) {
            values.read(layer, interval, window, given, 0);
            for (int i = 0; i < given.length; i++) {
                int row = window.row() + i / window.columns();
                int column = window.column() + i % window.columns();
                int cell = values.layered() ? block.cell(layer, row, column) : uppermost(row, column);
                boolean counted = geometry.inner().contains(row, column);
                double rate = perArea ? given[i] * geometry.grid().area(row, column) : given[i];
                if (cell >= 0 && active[cell] && !Double.isNaN(rate)) {
                    rates[cell] = rate;
                } else if (counted && Double.isNaN(rate)) {
                    missing++;
                } else if (counted) {
                    lost += Math.abs(rate);
                }
            }
        }
        CellTerm.Entry entry = perArea ? CellTerm.Entry.AT_WATER_TABLE : CellTerm.Entry.THROUGHOUT;
        return new CellTerm(storage, item, entry, rates, missing, lost);
    }

    private int uppermost(int row, int column) {
        for (int layer = 0; layer < block.layers(); layer++) {
            int cell = block.cell(layer, row, column);
            if (active[cell]) {
                return cell;
            }
        }
        return -1;
    }
}
