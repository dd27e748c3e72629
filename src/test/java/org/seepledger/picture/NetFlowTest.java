package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.picture.Mark.Texture;

class NetFlowTest {

    private static Mark.Area arrow(double amount, double width) {
        return new NetFlow(amount).arrow(0, 0, 10, 0, width);
    }

    @Test
    void isReadWithItsDirection() {
        assertThat(new NetFlow(2).words()).isEqualTo("in 2");
        assertThat(new NetFlow(-2).words()).isEqualTo("out 2");
        assertThat(new NetFlow(0).words()).isEqualTo("0");
        assertThat(new NetFlow(Double.NaN).words()).isEqualTo("–");
    }

    @Test
    void aThinArrowIsNotCoveredByItsRim() {
        assertThat(arrow(2, 1.2).stroke()).contains(Stroke.of(Ink.Token.GAIN, 1));
        assertThat(arrow(2, 12).stroke()).contains(Stroke.of(Ink.Token.PAPER, 1));
    }

    @Test
    void aLossHasTheTextureThatItHasInCharts() {
        assertThat(arrow(-2, 5).fill())
                .hasValueSatisfying(fill -> assertThat(fill.texture()).isEqualTo(Texture.FALLING));
        assertThat(arrow(2, 5).fill())
                .hasValueSatisfying(fill -> assertThat(fill.texture()).isEqualTo(Texture.PLAIN));
    }
}
