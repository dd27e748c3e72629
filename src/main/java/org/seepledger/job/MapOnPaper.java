package org.seepledger.job;

import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Window;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.picture.Drape;
import org.seepledger.picture.MapFrame;
import org.seepledger.picture.MapPicture;
import org.seepledger.picture.MapRoom;
import org.seepledger.picture.Picture;
import org.seepledger.picture.UnitShown;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;
import org.seepledger.report.Wording;

/** Draws a map of what a view shows. */
final class MapOnPaper {

    private static final double WIDTH = 760;

    /** Values finer than this are not told apart on paper. */
    private static final int MOST_CELLS = 400;

    private final Workbench set;
    private final MapAsked asked;
    private final Progress progress;

    MapOnPaper(Workbench set, MapAsked asked, Progress progress) {
        this.set = set;
        this.asked = asked;
        this.progress = progress;
    }

    Picture drawn() {
        Aquifer aquifer = set.aquifer();
        MapAsked.Part part = asked.part();
        MapFrame frame = MapRoom.of(part.west(), part.south(), part.east(), part.north(), WIDTH);
        Optional<Prism> selected = asked.prisms().stream()
                .filter(prism -> prism.name().equals(asked.selected()))
                .findFirst();
        List<Prism> others = asked.prisms().stream()
                .filter(prism -> !prism.name().equals(asked.selected()))
                .toList();
        return MapPicture.ofView(
                aquifer,
                frame,
                selected,
                others,
                ground(frame.window(aquifer.grid())),
                selected.map(this::flows),
                asked.wells(),
                asked.title(),
                WIDTH);
    }

    private MapPicture.Ground ground(Window window) {
        GridLayer layer = set.views().layer(asked.quantity(), asked.layer(), asked.interval(), window, 1, progress);
        Drape drape = Drape.of(set.aquifer().grid(), window, MOST_CELLS, row -> {
            double[] values = new double[window.columns()];
            System.arraycopy(layer.values(), (row - window.row()) * window.columns(), values, 0, window.columns());
            return values;
        });
        return new MapPicture.Ground(
                drape,
                asked.scale(),
                asked.quantity().label(),
                asked.quantity().unit(),
                set.aquifer().layers().get(asked.layer()).name(),
                asked.contoured());
    }

    private MapPicture.Flows flows(Prism prism) {
        ResultUnits units = set.units(asked.rateUnit(), Optional.empty());
        Wording wording = Wording.typeset(units);
        return new MapPicture.Flows(
                set.budgets(List.of(prism), asked.interval(), progress).get(0).budget(),
                new UnitShown(wording.unit(units.rate()), units.rateFactor(), true));
    }
}
