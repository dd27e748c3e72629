package org.seepledger.desktop.map;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class CameraTest {

    private static final Camera.Limits FREE = new Camera.Limits(1e-6, 1e6);

    @Property(tries = 300)
    void whatLiesUnderTheCursorStaysThere(
            @ForAll @DoubleRange(min = 0, max = 1900) double x,
            @ForAll @DoubleRange(min = 0, max = 1000) double y,
            @ForAll @DoubleRange(min = 0.01, max = 100) double factor,
            @ForAll @DoubleRange(min = -1e7, max = 1e7) double middle) {
        Camera camera = new Camera(1900, 1000, middle, 5e6, 0.4);
        double mapX = camera.mapX(x);
        double mapY = camera.mapY(y);
        Camera nearer = camera.zoomedAbout(x, y, factor, FREE);
        assertThat(nearer.scale()).isCloseTo(0.4 * factor, within(1e-12 * factor));
        assertThat(nearer.x(mapX)).isCloseTo(x, within(0.01));
        assertThat(nearer.y(mapY)).isCloseTo(y, within(0.01));
    }

    @Test
    void aHundredNotchesInAndOutLeadBackToHalfAPixel() {
        Camera camera = new Camera(1280, 800, 501500, 5201200, 0.25);
        double mapX = camera.mapX(333);
        double mapY = camera.mapY(777);
        for (int i = 0; i < 100; i++) {
            camera = camera.zoomedAbout(333, 777, i % 10 < 5 ? 1.2 : 1 / 1.2, FREE);
        }
        assertThat(camera.x(mapX)).isCloseTo(333, within(0.5));
        assertThat(camera.y(mapY)).isCloseTo(777, within(0.5));
    }

    @Test
    void atTheLimitNothingMoves() {
        Camera camera = new Camera(1280, 800, 501500, 5201200, 0.25);
        assertThat(camera.zoomedAbout(10, 10, 2, new Camera.Limits(0.1, 0.25))).isEqualTo(camera);
    }

    @Test
    void draggingMovesTheMapWithTheHand() {
        Camera camera = new Camera(1280, 800, 501500, 5201200, 0.25);
        double mapX = camera.mapX(100);
        double mapY = camera.mapY(100);
        Camera dragged = camera.dragged(30, -12);
        assertThat(dragged.x(mapX)).isCloseTo(130, within(1e-6));
        assertThat(dragged.y(mapY)).isCloseTo(88, within(1e-6));
    }

    @Test
    void aPartIsShownWholeWithItsMargin() {
        Extent extent = new Extent(0, 0, 400, 100);
        Camera camera = new Camera(1000, 500, 9, 9, 1).showing(extent, 50, FREE);
        assertThat(camera.x(0)).isCloseTo(50, within(1e-9));
        assertThat(camera.x(400)).isCloseTo(950, within(1e-9));
        assertThat(camera.y(50)).isCloseTo(250, within(1e-9));
        assertThat(camera.frame().x(123)).isCloseTo(camera.x(123), within(1e-9));
        assertThat(camera.frame().y(77)).isCloseTo(camera.y(77), within(1e-9));
    }
}
