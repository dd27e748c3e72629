package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PlaceTest {

    @ParameterizedTest
    @ValueSource(
            strings = {
                "500120.5, 5200340",
                "500120.5 5200340",
                " 500120.5;5200340. ",
                "500120,5; 5200340",
                "+5.001205e5\t5200340",
            })
    void readsWhatIsTyped(String text) {
        assertThat(Place.typed(text)).isEqualTo(new Place(500120.5, 5200340));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "12", "1,5, 2,5", "east 3", "1 2 3", "NaN 3", "1;2;3", "0x10 2"})
    void refusesWhatIsNoPlace(String text) {
        assertThatThrownBy(() -> Place.typed(text))
                .isInstanceOf(Refusal.class)
                .hasMessage("Type x and y as two numbers, such as 500120.5, 5200340.");
    }

    @Test
    void refusesWhatNoFileCouldHold() {
        assertThatThrownBy(() -> Place.typed("1e13 0")).hasMessage("Coordinates lie within ±1e12.");
        assertThatThrownBy(() -> new Place(0, Double.NaN)).isInstanceOf(Refusal.class);
    }

    @Test
    void hasOneZero() {
        assertThat(new Place(-0.0, 0.0)).isEqualTo(new Place(0.0, -0.0));
    }

    @Test
    void isShownWithoutNeedlessDigits() {
        assertThat(Place.shown(500000, 5200000.5)).isEqualTo("x 500000, y 5200000.5");
        assertThat(Place.shown(1e-7, 0)).isEqualTo("x 1.0E-7, y 0");
    }

    @Test
    void findsTheNearestPlaceOnASide() {
        Place from = new Place(1, 1);
        Place to = new Place(5, 4);
        assertThat(new Place(0, 0).nearestOn(from, to)).isSameAs(from);
        assertThat(new Place(9, 9).nearestOn(from, to)).isSameAs(to);
        assertThat(new Place(3 - 3, 2.5 + 4).nearestOn(from, to)).isEqualTo(new Place(3, 2.5));
        assertThat(new Place(9.1, 0.3).nearestOn(new Place(0.1, 1), new Place(0.1, -1)))
                .isEqualTo(new Place(0.1, 0.3));
        assertThat(new Place(0.3, 7).nearestOn(new Place(1, 0.1), new Place(-1, 0.1)))
                .isEqualTo(new Place(0.3, 0.1));
        assertThat(new Place(3, 7).nearestOn(new Place(1, 0.1), new Place(-1, 0.1)))
                .isEqualTo(new Place(1, 0.1));
    }
}
