package org.seepledger.desktop.map;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.desktop.session.FaceFlows;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;
import org.seepledger.picture.Ramp;

/** What is drawn over the map stands out from every colour that may lie under it. */
class ContrastTest {

    private static final double LEAST = 3;

    /** What lies directly on the map, each with a halo of paper. */
    private static final Set<Ink.Token> ON_THE_MAP = EnumSet.of(Ink.Token.TEXT, Ink.Token.PRISM, Ink.Token.ACCENT);

    @ParameterizedTest
    @EnumSource(Theme.class)
    void everyInkOrItsHaloStandsOutFromEveryColourOfEveryRamp(Theme theme) {
        int paper = theme.palette().colour(Ink.Token.PAPER).value();
        for (Ink.Token ink : ON_THE_MAP) {
            int colour = theme.palette().colour(ink).value();
            assertThat(contrast(colour, paper)).as("%s on paper", ink).isGreaterThanOrEqualTo(LEAST);
            for (Ramp ramp : Ramp.values()) {
                for (int step = 0; step <= 255; step++) {
                    int stop = ramp.rgb(step / 255.0);
                    assertThat(Math.max(contrast(colour, stop), contrast(paper, stop)))
                            .as("%s on %s at %d", ink, ramp, step)
                            .isGreaterThanOrEqualTo(LEAST);
                }
            }
        }
    }

    @Test
    void theMapDrawsWithNoOtherInksThanThese() {
        Set<Ink> outermost = new HashSet<>();
        for (Mark mark : drawn()) {
            if (mark instanceof Mark.Text text) {
                assertThat(text.halo()).as(text.words()).isTrue();
                outermost.add(text.ink());
            } else if (mark instanceof Mark.Line line) {
                outermost.add(line.stroke().ink());
            } else if (mark instanceof Mark.Area area) {
                area.stroke().ifPresent(stroke -> outermost.add(stroke.ink()));
            }
        }
        outermost.remove(Ink.Token.PAPER);
        assertThat(outermost).contains(Ink.Token.TEXT, Ink.Token.PRISM, Ink.Token.ACCENT);
        assertThat(ON_THE_MAP)
                .containsAll(outermost.stream().map(Ink.Token.class::cast).toList());
    }

    private static List<Mark> drawn() {
        Session session = new Session();
        MapModel model = new MapModel(session, new DirectTasks());
        model.resize(1000, 700);
        try (var set = Opening.of(Path.of("sample-aquifers/valley")).set()) {
            session.show(Optional.of(set));
            var prisms = set.workbench()
                    .drawings()
                    .prisms(Path.of("sample-aquifers/valley/prisms.geojson"))
                    .prisms();
            session.drawing().set(new Drawing(1, prisms, true));
            session.selected().set("well field");
            session.lit().set("side 3");
            Map<String, Double> net = new HashMap<>(Map.of("side 3", -110.5, "side 4", 71.5));
            session.faceFlows().set(new FaceFlows(1, "well field", "m3/d", net, Map.of()));
            Camera camera = model.camera().get();
            List<Mark> marks = new ArrayList<>(Outlines.of(session, camera));
            marks.addAll(Lettering.of(model));
            marks.addAll(FluxArrows.of(
                    model.flux().flux().get().orElseThrow(), set.aquifer().grid(), camera));
            return marks;
        }
    }

    /** Contrast as WCAG 2.1 (W3C 2018) defines it. */
    private static double contrast(int one, int other) {
        double a = luminance(one);
        double b = luminance(other);
        return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
    }

    private static double luminance(int rgb) {
        return 0.2126 * linear(rgb >> 16 & 255) + 0.7152 * linear(rgb >> 8 & 255) + 0.0722 * linear(rgb & 255);
    }

    private static double linear(int channel) {
        double share = channel / 255.0;
        return share <= 0.04045 ? share / 12.92 : Math.pow((share + 0.055) / 1.055, 2.4);
    }
}
