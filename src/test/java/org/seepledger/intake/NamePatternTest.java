package org.seepledger.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NamePatternTest {

    @ParameterizedTest
    @CsvSource({
        "head_l2_t03.tif, head_l#_t#.tif, 2 03",
        "top_1.tif, top_#.tif, 1",
        "recharge_2021-10.tif, recharge_#.tif, 2021-10",
        "recharge 20211001.tif, recharge #.tif, 20211001",
        "kx-layer-3, kx-layer-#, 3",
        "runs/7/Head_L1_T00.TIF, runs/#/Head_L#_T#.TIF, 7 1 00",
        "base.tif, base.tif, ''",
        "2021_10_31_head.tif, #_head.tif, 2021_10_31",
        "h20211345.tif, h#.tif, 20211345",
    })
    void takesNumbersAndDatesOut(String name, String pattern, String fields) {
        NamePattern taken = NamePattern.of(name);
        assertThat(taken.text()).isEqualTo(pattern);
        assertThat(taken.fields())
                .extracting(NameField::text)
                .isEqualTo(fields.isEmpty() ? List.of() : List.of(fields.split(" ")));
        assertThat(taken.with(taken.fields().stream().map(NameField::text).toList()))
                .isEqualTo(name);
    }

    @Test
    void tellsDatesFromNumbers() {
        assertThat(field("r_2021-10.tif").day()).contains(LocalDate.of(2021, 10, 1));
        assertThat(field("r_202110.tif").kind()).isEqualTo(NameField.Kind.MONTH);
        assertThat(field("r_20210230.tif").kind()).isEqualTo(NameField.Kind.NUMBER);
        assertThat(field("r_310.tif").day()).isEmpty();
        assertThat(field("head_2021.11.05.tif").day()).contains(LocalDate.of(2021, 11, 5));
    }

    @Test
    void knowsTheWordBeforeAField() {
        assertThat(field("Kx Layer 3.tif").before()).isEqualTo("layer");
        assertThat(field("7.tif").before()).isEmpty();
    }

    private static NameField field(String name) {
        return NamePattern.of(name).fields().get(0);
    }
}
