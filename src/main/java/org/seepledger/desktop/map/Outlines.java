package org.seepledger.desktop.map;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.session.Session;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;

/** Prisms as marks: the selected one filled and with a strong outline, the face that is lit up over it. */
final class Outlines {

    private final Camera camera;
    private final List<Mark> marks = new ArrayList<>();

    private Outlines(Camera camera) {
        this.camera = camera;
    }

    static List<Mark> of(Session session, Camera camera) {
        Outlines outlines = new Outlines(camera);
        String selected = session.selected().get();
        List<Prism> prisms = session.drawing().get().prisms();
        prisms.stream().filter(prism -> !prism.name().equals(selected)).forEach(prism -> outlines.draw(prism, false));
        session.selectedPrism().ifPresent(prism -> {
            outlines.draw(prism, true);
            outlines.light(prism, session.lit().get());
        });
        return outlines.marks;
    }

    private void draw(Prism prism, boolean selected) {
        List<double[]> rings = prism.rings().stream().map(ring -> ring(ring)).toList();
        Optional<Mark.Fill> fill =
                selected ? Optional.of(new Mark.Fill(Ink.Token.PAPER, 0.18, Mark.Texture.PLAIN)) : Optional.empty();
        marks.add(new Mark.Area(rings, fill, Optional.of(Mark.Stroke.of(Ink.Token.PAPER, selected ? 5 : 3.6))));
        Mark.Stroke line = Mark.Stroke.of(Ink.Token.PRISM, selected ? 2.4 : 1.4);
        marks.add(new Mark.Area(rings, Optional.empty(), Optional.of(selected ? line : line.dashed(7.0, 4.0))));
    }

    private double[] ring(Ring ring) {
        double[] xy = new double[2 * ring.sides().size()];
        for (int i = 0; i < ring.sides().size(); i++) {
            xy[2 * i] = camera.x(ring.sides().get(i).x());
            xy[2 * i + 1] = camera.y(ring.sides().get(i).y());
        }
        return xy;
    }

    private void light(Prism prism, String item) {
        for (Ring ring : prism.rings()) {
            for (int i = 0; i < ring.sides().size(); i++) {
                Side side = ring.sides().get(i);
                if (side.item().equals(item)) {
                    Side after = ring.after(i);
                    double[] xy = {camera.x(side.x()), camera.y(side.y()), camera.x(after.x()), camera.y(after.y())};
                    marks.add(new Mark.Line(xy, Mark.Stroke.of(Ink.Token.PAPER, 9)));
                    marks.add(new Mark.Line(xy, Mark.Stroke.of(Ink.Token.ACCENT, 5)));
                }
            }
        }
    }
}
