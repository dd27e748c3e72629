package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LidTest {

    private static final Reach UPPER = new Reach.Layers(0, 0);
    private static final Limit HIGH = new Limit.Elevation(95);
    private static final Limit LOW = new Limit.Elevation(80);

    @Test
    void theOtherLidStaysOnItsLayer() {
        Reach moved = Lid.TOP.moved(UPPER, HIGH, 3);
        assertThat(moved).isEqualTo(new Reach.Between(Optional.of(HIGH), Optional.of(new Limit.Layer(0))));
        assertThat(Lid.BOTTOM.moved(new Reach.Layers(1, 2), LOW, 3))
                .isEqualTo(new Reach.Between(Optional.of(new Limit.Layer(1)), Optional.of(LOW)));
    }

    @Test
    void theGridsOwnLidsAreNotNamed() {
        assertThat(Lid.TOP.moved(new Reach.Whole(), HIGH, 3))
                .isEqualTo(new Reach.Between(Optional.of(HIGH), Optional.empty()));
        assertThat(Lid.BOTTOM.moved(new Reach.Layers(0, 1), LOW, 3))
                .isEqualTo(new Reach.Between(Optional.empty(), Optional.of(LOW)));
    }

    @Test
    void onLayersBothMakeAStack() {
        Reach between = new Reach.Between(Optional.of(HIGH), Optional.of(new Limit.Layer(1)));
        assertThat(Lid.TOP.moved(between, new Limit.Layer(1), 3)).isEqualTo(new Reach.Layers(1, 1));
        Reach open = new Reach.Between(Optional.of(HIGH), Optional.empty());
        assertThat(Lid.TOP.moved(open, new Limit.Layer(0), 3)).isEqualTo(new Reach.Layers(0, 2));
    }

    @Test
    void aLidThatStaysWhereItIsChangesNothing() {
        Reach whole = new Reach.Whole();
        assertThat(Lid.TOP.moved(whole, new Limit.Layer(0), 3)).isSameAs(whole);
        assertThat(Lid.BOTTOM.moved(whole, new Limit.Layer(2), 3)).isSameAs(whole);
        assertThat(Lid.TOP.moved(UPPER, new Limit.Layer(0), 3)).isSameAs(UPPER);
    }

    @Test
    void theTopLiesAboveTheBottom() {
        assertThatThrownBy(() -> Lid.TOP.moved(UPPER, new Limit.Layer(1), 3)).isInstanceOf(Refusal.class);
        Reach between = new Reach.Between(Optional.of(HIGH), Optional.of(LOW));
        assertThatThrownBy(() -> Lid.TOP.moved(between, LOW, 3)).isInstanceOf(Refusal.class);
        assertThatThrownBy(() -> new Reach.Between(Optional.of(new Limit.Layer(2)), Optional.of(new Limit.Layer(1))))
                .isInstanceOf(Refusal.class);
        assertThatThrownBy(() -> Lid.BOTTOM.moved(between, new Limit.Layer(3), 3))
                .hasMessage("The grid has 3 layers.");
        assertThatThrownBy(() -> new Limit.Layer(-1)).isInstanceOf(Refusal.class);
    }

    @Test
    void whatIsTypedIsReadBack() {
        assertThat(Lid.typed(" 93.50 ")).contains(new Limit.Elevation(93.5));
        assertThat(Lid.typed("−3")).contains(new Limit.Elevation(-3));
        assertThat(Lid.typed("layer 2")).contains(new Limit.Layer(1));
        for (Limit limit : new Limit[] {HIGH, new Limit.Elevation(-0.25), new Limit.Layer(4)}) {
            assertThat(Lid.typed(Lid.text(limit))).contains(limit);
        }
        assertThat(Lid.text(new Limit.Surface("s/base.tif"))).isEqualTo("s/base.tif");
        assertThat(Lid.of("top")).contains(Lid.TOP);
        assertThat(Lid.of("side 1")).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "high", "layer", "layer 0", "layer -1", "layer 1 to 2", "NaN", "Infinity", "1e999"})
    void whatIsNoLimitIsRefused(String text) {
        assertThat(Lid.typed(text)).isEmpty();
    }
}
