package org.seepledger.desktop.map;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.beans.Observable;
import javafx.beans.value.ObservableValue;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.layout.Region;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.desktop.paint.MarkPainter;
import org.seepledger.desktop.paint.SharpCanvas;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.job.GroundPicture;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;
import org.seepledger.picture.ScaleBar;

/** Paints the map, once per frame at most: the ground on one canvas, prisms and letters on another over it. */
final class MapCanvas extends Region {

    private static final double CORNER = 18;
    private static final double LONGEST_BAR = 170;

    private final MapModel model;
    private final GroundModel under;
    private final GroundPainter groundPainter = new GroundPainter();
    private final ObservableValue<Theme> theme;
    private final SharpCanvas ground = new SharpCanvas(this::repaintGround);
    private final SharpCanvas above = new SharpCanvas(this::repaint);
    private final Tiles tiles;
    private final List<MarkSource> guests = new ArrayList<>();
    private boolean groundStale = true;

    /** What else draws over the map. */
    interface MarkSource {
        List<Mark> marks(Camera camera);
    }

    MapCanvas(MapModel model, GroundModel under, Tasks tasks, ObservableValue<Theme> theme) {
        this.model = model;
        this.under = under;
        this.theme = theme;
        this.tiles = new Tiles(tasks.each("task.colouring", 1), this::repaintGround);
        getChildren().addAll(ground, above);
        Session session = model.session();
        Observable[] causes = {
            under.picture(),
            under.cover(),
            model.camera(),
            model.values().view(),
            model.values().scale(),
            model.contours().lines(),
            model.flux().flux(),
            model.overlays().lines(),
            model.overlays().arrows(),
            theme
        };
        Observable[] over = {
            session.drawing(),
            session.selected(),
            session.lit(),
            session.marked(),
            session.faceFlows(),
            session.wells(),
            session.sectionLine(),
            session.along(),
            model.overlays().wells(),
            session.numbers()
        };
        for (Observable cause : causes) {
            cause.addListener(changed -> repaintGround());
        }
        for (Observable cause : over) {
            cause.addListener(changed -> repaint());
        }
    }

    /** Lets something else draw over the map. */
    void invite(MarkSource guest) {
        guests.add(guest);
    }

    /** Lets something else draw over the map, below what was invited before. */
    void layBelow(MarkSource guest) {
        guests.add(0, guest);
    }

    private void repaintGround() {
        groundStale = true;
        repaint();
    }

    /** Paints what lies over the ground in the next frame. */
    void repaint() {
        requestLayout();
    }

    @Override
    protected void layoutChildren() {
        double width = Math.floor(getWidth());
        double height = Math.floor(getHeight());
        if (width != ground.getWidth() || height != ground.getHeight()) {
            ground.size(width, height);
            above.size(width, height);
            model.resize(width, height);
            groundStale = true;
        }
        if (groundStale) {
            groundStale = false;
            paintGround();
        }
        paintAbove();
    }

    private double outputScale() {
        double screen = getScene() == null || getScene().getWindow() == null
                ? 1
                : getScene().getWindow().getOutputScaleX();
        return screen * ground.sharpness();
    }

    private void paintGround() {
        GraphicsContext canvas = ground.context();
        canvas.clearRect(0, 0, ground.getWidth(), ground.getHeight());
        if (model.session().set().get().isEmpty()) {
            return;
        }
        Aquifer aquifer = model.session().set().get().map(OpenSet::aquifer).orElseThrow();
        Camera camera = model.camera().get();
        Optional<GroundPicture> picture = under.picture().get();
        groundPainter.paint(canvas, camera, picture);
        double opacity = picture.isPresent() ? under.cover().get() : 1;
        tiles.wear(model.values().view().get(), model.values().scale().get(), opacity);
        tiles.pyramid().ifPresent(pyramid -> new TilePainter(canvas, camera, outputScale(), tiles, pyramid).paint());
        MarkPainter painter = new MarkPainter(canvas, theme.getValue());
        model.values()
                .view()
                .get()
                .flatMap(LayerView::limits)
                .ifPresent(limits -> painter.paint(NonDetectHatch.of(limits, camera)));
        if (model.overlays().lines().get()) {
            painter.paint(GridLines.of(aquifer.grid(), camera, outputScale()));
        }
        painter.paint(contours(camera));
        if (model.overlays().arrows().get()) {
            model.flux().flux().get().ifPresent(flux -> painter.paint(FluxArrows.of(flux, aquifer.grid(), camera)));
        }
    }

    private List<Mark> contours(Camera camera) {
        List<Mark> marks = new ArrayList<>();
        for (ContourModel.Contour contour : model.contours().lines().get()) {
            for (double[] line : contour.lines()) {
                double[] xy = OnScreen.thinned(line, camera);
                if (xy.length > 2) {
                    marks.add(new Mark.Line(xy, Mark.Stroke.of(Ink.Token.PAPER, 2.2)));
                    marks.add(new Mark.Line(xy, Mark.Stroke.of(Ink.Token.TEXT, 0.9)));
                }
            }
        }
        return marks;
    }

    private void paintAbove() {
        GraphicsContext canvas = above.context();
        canvas.clearRect(0, 0, above.getWidth(), above.getHeight());
        if (model.session().set().get().isEmpty()) {
            return;
        }
        Camera camera = model.camera().get();
        Aquifer aquifer = model.session().set().get().orElseThrow().aquifer();
        MarkPainter painter = new MarkPainter(canvas, theme.getValue());
        painter.paint(Outlines.of(model.session(), camera));
        painter.paint(MarkedCells.of(model.session().marked().get(), aquifer.grid(), camera));
        painter.paint(written(Lettering.of(model)));
        painter.paint(SectionTrace.of(model.session(), camera));
        guests.forEach(guest -> painter.paint(guest.marks(camera)));
        double scale = camera.scale() / aquifer.grid().planUnit();
        painter.paint(written(ScaleBar.within(scale, aquifer.lengthUnit().toString(), LONGEST_BAR)
                .marks(CORNER, camera.height() - CORNER - ScaleBar.HEIGHT)));
    }

    private List<Mark> written(List<? extends Mark> marks) {
        NumberForm form = model.session().numbers().get();
        return marks.stream().map(mark -> mark.written(form::label)).toList();
    }
}
