package org.seepledger.desktop.map;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.job.MapQuantity;
import org.seepledger.picture.Mark;
import org.seepledger.picture.ValueScale;

/** Concentrations laid over the map. */
class ConcentrationModelTest {

    private final Session session = new Session();
    private final MapModel model = new MapModel(session, new DirectTasks());
    private Opening opening;

    @BeforeEach
    void open() {
        opening = Opening.of(Path.of("sample-aquifers/depot"));
        session.show(Optional.of(opening.set()));
        model.resize(960, 640);
        session.interval().set(3);
        model.values()
                .quantity()
                .set(model.values().quantities().stream()
                        .filter(each -> each.kind() == MapQuantity.Kind.CONCENTRATION
                                && each.source().equals("solvent"))
                        .findFirst());
    }

    @AfterEach
    void close() {
        opening.close();
    }

    private ValueScale scale() {
        return model.values().scale().get().orElseThrow();
    }

    private String readout(double x, double y) {
        Camera camera = model.camera().get();
        model.point(camera.x(x), camera.y(y));
        return model.readout().get().orElseThrow().value();
    }

    @Test
    void aNonDetectReadsAsBelowItsLimitAndNotAsZero() {
        assertThat(readout(5, 5)).isEqualTo("solvent, interval's end <0.002000 mg/L, a non-detect");
        assertThat(readout(65, 65)).startsWith("solvent, interval's end ").doesNotContain("non-detect");
    }

    @Test
    void nonDetectsAreHatchedAndHaveNoColour() {
        LayerView shown = model.values().view().get().orElseThrow();
        assertThat(shown.pyramid().at(5, 5)).isNaN();
        Camera camera = model.camera().get();
        assertThat(NonDetectHatch.of(shown.limits().orElseThrow(), camera))
                .hasSizeGreaterThan(20)
                .allSatisfy(mark -> {
                    double[] xy = ((Mark.Line) mark).xy();
                    double x = camera.mapX((xy[0] + xy[2]) / 2);
                    double y = camera.mapY((xy[1] + xy[3]) / 2);
                    assertThat(shown.limits().get().at(x, y)).isNotNaN();
                });
    }

    @Test
    void theRangeIsLinearOrLogarithmicByChoiceAndStaysSoInTime() {
        assertThat(scale().from()).isZero();
        model.values().logarithmic(true);
        assertThat(scale().logarithmic()).isTrue();
        double from = scale().from();
        assertThat(from).isPositive();
        session.interval().set(4);
        assertThat(scale().from()).isEqualTo(from);
        assertThat(model.values().range(0, 1)).isFalse();
        assertThat(session.status().get()).contains("above 0");
        assertThat(model.values().range(0.01, 1)).isTrue();
        assertThat(scale()).isEqualTo(new ValueScale(scale().ramp(), 0.01, 1, true));
        model.values().fitRange();
        assertThat(scale().logarithmic()).isTrue();
        model.values().logarithmic(false);
        assertThat(scale().from()).isZero();
    }
}
