package org.seepledger.desktop.section;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import javafx.beans.value.ObservableValue;
import javafx.scene.AccessibleRole;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Region;
import org.seepledger.desktop.action.OwnKeys;
import org.seepledger.desktop.paint.MarkPainter;
import org.seepledger.desktop.paint.SharpCanvas;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.picture.Box;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;
import org.seepledger.picture.Picture;
import org.seepledger.picture.Section;
import org.seepledger.picture.SectionFrame;
import org.seepledger.picture.SectionPicture;

/** Paints the section, once per frame at most: the picture on one canvas, what follows the cursor on another over it. */
final class SectionCanvas extends Region implements OwnKeys {

    private final SectionModel model;
    private final ObservableValue<Theme> theme;
    private final SharpCanvas picture = new SharpCanvas(this::repaintAll);
    private final SharpCanvas above = new SharpCanvas(this::repaint);
    private boolean stale = true;

    SectionCanvas(SectionModel model, ObservableValue<Theme> theme) {
        this.model = model;
        this.theme = theme;
        setId("section-canvas");
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        setFocusTraversable(true);
        getChildren().addAll(picture, above);
        model.section().addListener((section, before, after) -> repaintAll());
        model.frame().addListener((frame, before, after) -> repaintAll());
        theme.addListener((lit, before, after) -> repaintAll());
        model.session().numbers().addListener((form, before, after) -> repaintAll());
        model.session().along().addListener((along, before, after) -> repaint());
    }

    /** Arrows move the chosen lid, or what is seen; Esc gives a drag up. */
    @Override
    public boolean keeps(KeyEvent key) {
        return switch (key.getCode()) {
            case UP, DOWN, LEFT, RIGHT -> !key.isShortcutDown() && !key.isAltDown();
            case ESCAPE -> model.lids().isHolding();
            default -> false;
        };
    }

    private void repaintAll() {
        stale = true;
        repaint();
    }

    /** Paints what follows the cursor in the next frame. */
    void repaint() {
        requestLayout();
    }

    @Override
    protected void layoutChildren() {
        double width = Math.floor(getWidth());
        double height = Math.floor(getHeight());
        if (width != picture.getWidth() || height != picture.getHeight()) {
            picture.size(width, height);
            above.size(width, height);
            model.resize(width, height);
            stale = true;
        }
        Optional<Section> section = model.section().get();
        Optional<SectionFrame> frame = model.frame().get();
        if (stale) {
            stale = false;
            paint(picture, section.isPresent() && frame.isPresent() ? drawn(section.get(), frame.get()) : List.of());
        }
        paint(above, frame.isPresent() ? overlay(frame.get()) : List.of());
    }

    private List<Mark> drawn(Section section, SectionFrame frame) {
        Picture drawn = SectionPicture.of(section, frame)
                .written(model.session().numbers().get()::label);
        setAccessibleText(drawn.title() + ". " + drawn.description());
        return drawn.marks();
    }

    private List<Mark> overlay(SectionFrame frame) {
        List<Mark> marks = new ArrayList<>();
        model.section().get().ifPresent(section -> marks.addAll(LidMarks.of(section, frame, model.lids())));
        Box box = frame.box();
        OptionalDouble along = model.session().along().get();
        if (along.isPresent() && model.section().get().isPresent()) {
            double unit = model.section().get().get().profile().planUnit();
            double x = frame.x(along.getAsDouble() * unit);
            double[] hair = {x, box.y(), x, box.bottom()};
            marks.add(new Mark.Group(
                    box,
                    List.of(
                            new Mark.Line(hair, Mark.Stroke.of(Ink.Token.PAPER, 3)),
                            new Mark.Line(hair, Mark.Stroke.of(Ink.Token.ACCENT, 1)))));
        }
        return marks;
    }

    private void paint(SharpCanvas canvas, List<Mark> marks) {
        GraphicsContext context = canvas.context();
        context.clearRect(0, 0, canvas.getWidth(), canvas.getHeight());
        new MarkPainter(context, theme.getValue()).paint(marks);
    }
}
