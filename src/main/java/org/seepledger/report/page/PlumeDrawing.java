package org.seepledger.report.page;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.Concentration;
import org.seepledger.aquifer.Window;
import org.seepledger.io.result.MassUnits;
import org.seepledger.picture.BudgetBlocks;
import org.seepledger.picture.BudgetSeries;
import org.seepledger.picture.CrossingProfile;
import org.seepledger.picture.Drape;
import org.seepledger.picture.MapPicture;
import org.seepledger.picture.MapPicture.Ground;
import org.seepledger.picture.MapRoom;
import org.seepledger.picture.MassCurve;
import org.seepledger.picture.Picture;
import org.seepledger.picture.PlumeTrack;
import org.seepledger.picture.SectionLine;
import org.seepledger.picture.SectionPicture;
import org.seepledger.picture.ThresholdOutline;
import org.seepledger.picture.UnitShown;
import org.seepledger.picture.ValueScale;
import org.seepledger.plume.Course;
import org.seepledger.plume.Crossing;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Plume;
import org.seepledger.prism.Prism;
import org.seepledger.report.PlumeResult;
import org.seepledger.report.Wording;

/** Draws the pictures of a report on solutes. */
public final class PlumeDrawing {

    private static final double WIDTH = ReportPictures.WIDTH;

    private final Aquifer aquifer;
    private final List<Prism> prisms;
    private final MassUnits units;
    private final Wording wording;
    private final UnitShown rate;

    /**
     * Prepares to draw.
     *
     * @param aquifer the aquifer
     * @param prisms the prisms
     * @param units the units to give
     */
    public PlumeDrawing(Aquifer aquifer, List<Prism> prisms, MassUnits units) {
        this.aquifer = aquifer;
        this.prisms = List.copyOf(prisms);
        this.units = units;
        this.wording = Wording.typeset(units.ofBudget());
        this.rate = new UnitShown(wording.unit(units.rate()), units.rateFactor(), true);
    }

    /**
     * {@return the pictures of a prism and solute}
     *
     * @param result what the run came to
     */
    public PlumePictures of(PlumeResult result) {
        Prism prism = prisms.stream()
                .filter(other -> other.name().equals(result.prism()))
                .findFirst()
                .orElseThrow();
        SectionLine line = SectionLine.through(prism, aquifer.grid());
        Concentrations cells =
                new Concentrations(result, MapRoom.of(prism, WIDTH).window(aquifer.grid()));
        Optional<Picture> section = SectionPicture.of(
                aquifer,
                prism,
                line,
                result.budget().record(),
                rate,
                Optional.of(new SectionPicture.Shade(cells::of, cells.scale, cells.words())),
                WIDTH);
        boolean severalPeriods = result.budget().periods().size() > 1;
        return new PlumePictures(
                map(prism, section.map(drawn -> line), result, cells),
                section,
                MassCurve.of(result.plume(), aquifer.times(), wording.unit(units.mass()), units.massFactor(), WIDTH),
                BudgetBlocks.of(result.name(), result.budget().record(), BudgetBlocks.Flows.GROSS, rate, WIDTH),
                severalPeriods
                        ? Optional.of(BudgetSeries.of(
                                        result.name(),
                                        result.budget().periods(),
                                        aquifer.times(),
                                        rate,
                                        OptionalInt.empty(),
                                        WIDTH)
                                .picture())
                        : Optional.empty());
    }

    /**
     * {@return what crosses a transect over the record, along its line}
     *
     * @param crossing what crosses
     * @param result any result of the run, for its record
     */
    public DrawnCrossing of(Crossing crossing, PlumeResult result) {
        Picture picture = CrossingProfile.of(
                crossing,
                result.budget().record().period(),
                aquifer.grid(),
                aquifer.layers().stream().map(layer -> layer.name()).toList(),
                wording.unit(aquifer.lengthUnit()),
                wording.unit(units.rate()),
                units.rateFactor(),
                WIDTH);
        return new DrawnCrossing(crossing, picture);
    }

    private Picture map(Prism prism, Optional<SectionLine> line, PlumeResult result, Concentrations cells) {
        List<Prism> others = new ArrayList<>(prisms);
        others.remove(prism);
        Drape drape = cells.drape;
        String name = aquifer.layers().get(cells.layer).name();
        Ground ground = new Ground(
                drape, cells.scale, "concentration at the end", wording.unit(result.concentrationUnit()), name, false);
        Optional<ThresholdOutline> outline = result.above().isPresent()
                ? Optional.of(ThresholdOutline.of(drape, result.above().getAsDouble() * result.concentrationFactor()))
                : Optional.empty();
        String threshold = wording.quantity(
                result.above().orElse(0) * result.concentrationFactor(), wording.unit(result.concentrationUnit()));
        return MapPicture.ofPlume(
                aquifer,
                prism,
                others,
                ground,
                new MapPicture.Trail(outline, threshold, track(result)),
                line,
                result.budget().record(),
                rate,
                "Map of " + result.name() + ": concentration in " + name + ", flow through faces",
                WIDTH);
    }

    /** The layer that holds most at an instant. */
    private static int fullest(Plume plume, int instant) {
        int fullest = 0;
        for (int layer = 1; layer < plume.layers(); layer++) {
            double held = plume.stocks().get(instant).get(layer).total(NonDetects.HALF);
            fullest = held > plume.stocks().get(instant).get(fullest).total(NonDetects.HALF) ? layer : fullest;
        }
        return plume.firstLayer() + fullest;
    }

    private PlumeTrack track(PlumeResult result) {
        double unit = aquifer.grid().planUnit();
        List<PlumeTrack.Stop> stops = new ArrayList<>();
        int[] located = IntStream.rangeClosed(0, result.end())
                .filter(result.course()::isLocated)
                .toArray();
        for (int instant : located) {
            Course.Place at = result.course().at(instant);
            double time = aquifer.times().instant(instant);
            String name = instant == located[0] || instant == located[located.length - 1]
                    ? aquifer.times().isoDate(time).orElseGet(() -> wording.number(time) + " " + aquifer.timeUnit())
                    : "";
            stops.add(PlumeTrack.Stop.of(at, unit, name));
        }
        return new PlumeTrack(stops);
    }

    /** Concentrations at the record's end, in the solute's unit: read row by row, or in small windows along a section. */
    private final class Concentrations {

        private final PlumeResult result;
        private final Concentration given;
        private final int layer;
        private final Drape drape;
        private final ValueScale scale;

        Concentrations(PlumeResult result, Window around) {
            this.result = result;
            this.given = result.plume().solute().concentration().orElseThrow();
            this.layer = fullest(result.plume(), result.end());
            this.drape = Drape.of(aquifer.grid(), around, ReportPictures.MOST_CELLS, row -> {
                Window line = new Window(row, around.column(), 1, around.columns());
                return of(layer, line);
            });
            double greatest = result.plume().whole(result.end()).maximum() * result.concentrationFactor();
            this.scale = ValueScale.ofConcentrations(
                    DoubleStream.concat(Arrays.stream(drape.values()), DoubleStream.of(greatest))
                            .toArray());
        }

        private double[] read(Window window) {
            Block block = new Block(window, aquifer.layers().size());
            Concentration.AtInstant found = given.at(result.end(), block);
            double[] values = found.values();
            for (int cell = 0; cell < values.length; cell++) {
                double limit = found.limits()[cell];
                double value = Double.isNaN(limit) ? values[cell] : NonDetects.HALF.of(limit);
                values[cell] = value * result.concentrationFactor();
            }
            return values;
        }

        double[] of(int ofLayer, Window window) {
            return Arrays.copyOfRange(read(window), ofLayer * window.size(), (ofLayer + 1) * window.size());
        }

        String words() {
            return "concentration at the end, " + wording.unit(result.concentrationUnit())
                    + "; non-detects as half their limit";
        }
    }
}
