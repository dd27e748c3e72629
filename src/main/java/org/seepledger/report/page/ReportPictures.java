package org.seepledger.report.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.aquifer.Window;
import org.seepledger.balance.Balance;
import org.seepledger.balance.HotSpot;
import org.seepledger.balance.Imbalance;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Period;
import org.seepledger.picture.BudgetBlocks;
import org.seepledger.picture.BudgetSeries;
import org.seepledger.picture.Drape;
import org.seepledger.picture.ExchangeDiagram;
import org.seepledger.picture.MapPicture;
import org.seepledger.picture.MapPicture.Ground;
import org.seepledger.picture.MapRoom;
import org.seepledger.picture.Picture;
import org.seepledger.picture.SectionLine;
import org.seepledger.picture.SectionPicture;
import org.seepledger.picture.StorageCurve;
import org.seepledger.picture.UnitShown;
import org.seepledger.picture.ValueScale;
import org.seepledger.prism.Prism;
import org.seepledger.prism.VerticalRange;
import org.seepledger.report.PrismResult;
import org.seepledger.report.Wording;

/** Draws the pictures of a report. */
public final class ReportPictures {

    /** How wide pictures are, in logical pixels: the measure of the page. */
    static final double WIDTH = 760;

    /** More rows or columns than this are thinned out: they could not be told apart. */
    static final int MOST_CELLS = 300;

    private final Aquifer aquifer;
    private final List<Prism> prisms;
    private final Balance balance;
    private final UnitShown rate;
    private final UnitShown volume;
    private final String length;

    /**
     * Prepares to draw.
     *
     * @param aquifer the aquifer
     * @param prisms the prisms
     * @param balance what the run came to
     * @param units the units of rates and volumes
     */
    public ReportPictures(Aquifer aquifer, List<Prism> prisms, Balance balance, ResultUnits units) {
        Wording wording = Wording.typeset(units);
        this.aquifer = aquifer;
        this.prisms = List.copyOf(prisms);
        this.balance = balance;
        this.rate = new UnitShown(wording.unit(units.rate()), units.rateFactor(), true);
        this.volume = new UnitShown(wording.unit(units.volume()), units.volumeFactor(), false);
        this.length = wording.unit(aquifer.lengthUnit());
    }

    /**
     * {@return the pictures of a prism}
     *
     * @param index which, from 0
     * @param result what the run came to for it
     */
    public PrismPictures of(int index, PrismResult result) {
        Prism prism = prisms.get(index);
        SectionLine line = SectionLine.through(prism, aquifer.grid());
        Optional<Picture> section = SectionPicture.of(aquifer, prism, line, result.record(), rate, WIDTH);
        return new PrismPictures(
                Optional.of(map(prism, section.map(drawn -> line), result)),
                section,
                Optional.of(BudgetBlocks.of(prism.name(), result.record(), BudgetBlocks.Flows.GROSS, rate, WIDTH)),
                isTransient(result) ? Optional.of(series(prism, result)) : Optional.empty(),
                isTransient(result) && result.storage() == StorageKnowledge.KNOWN
                        ? Optional.of(stored(prism, result))
                        : Optional.empty(),
                result.isWorthLocating() ? Optional.of(imbalance(prism, result)) : Optional.empty());
    }

    /**
     * {@return what prisms give to each other over the record; none where there is but one}
     *
     * @param record the record
     */
    public Optional<Picture> exchange(Period record) {
        List<String> names = prisms.stream().map(Prism::name).toList();
        return names.size() < 2
                ? Optional.empty()
                : Optional.of(ExchangeDiagram.of(names, balance.exchange(), record, rate, WIDTH));
    }

    private static boolean isTransient(PrismResult result) {
        return result.periods().size() > 1;
    }

    private Picture series(Prism prism, PrismResult result) {
        return BudgetSeries.of(prism.name(), result.periods(), aquifer.times(), rate, OptionalInt.empty(), WIDTH)
                .picture();
    }

    private Picture stored(Prism prism, PrismResult result) {
        return StorageCurve.of(prism.name(), result.periods(), aquifer.times(), volume, WIDTH);
    }

    private Picture map(Prism prism, Optional<SectionLine> line, PrismResult result) {
        List<Prism> others = new ArrayList<>(prisms);
        others.remove(prism);
        return MapPicture.ofFaces(
                aquifer, prism, others, Optional.of(ground(prism)), line, result.record(), rate, WIDTH);
    }

    /** The head in the range's first layer at the record's end or, where none is known, that layer's top. */
    private Ground ground(Prism prism) {
        int layer = prism.range() instanceof VerticalRange.Layers layers ? layers.first() : 0;
        Optional<GriddedValues> head = aquifer.head();
        int step = head.isPresent() && head.get().changes() ? aquifer.times().intervals() : 0;
        Grid grid = aquifer.grid();
        Window window = MapRoom.of(prism, WIDTH).window(grid);
        Drape drape = Drape.of(head.orElseGet(() -> aquifer.surface(layer)), layer, step, grid, window, MOST_CELLS);
        String what = head.isEmpty() ? "top" : step > 0 ? "head at the end of the record" : "head";
        return new Ground(drape, ValueScale.over(drape.values()), what, length, name(layer), true);
    }

    private String name(int layer) {
        return aquifer.layers().get(layer).name();
    }

    private Picture imbalance(Prism prism, PrismResult result) {
        List<HotSpot> spots = result.whereabouts().largest();
        int layer = spots.get(0).layer();
        Imbalance imbalance = balance.imbalance();
        Drape drape =
                Drape.of(aquifer.grid(), imbalance.window(), MOST_CELLS, row -> scaled(imbalance.row(layer, row)));
        ValueScale scale = ValueScale.aboutZero(drape.values());
        Ground ground = new Ground(drape, scale, "imbalance of cells", rate.words(), name(layer), false);
        List<HotSpot> inLayer =
                spots.stream().filter(spot -> spot.layer() == layer).toList();
        return MapPicture.ofImbalance(aquifer, prism, ground, inLayer, WIDTH);
    }

    private double[] scaled(double[] row) {
        for (int i = 0; i < row.length; i++) {
            row[i] *= rate.factor();
        }
        return row;
    }
}
