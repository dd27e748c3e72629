package org.seepledger.intake;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RoleGuessTest {

    @ParameterizedTest
    @CsvSource({
        "head_l2_t03, HEAD",
        "WaterTable_2021, HEAD",
        "groundwater level, HEAD",
        "h_1, HEAD",
        "top_1, TOP",
        "ground_surface, TOP",
        "dem, TOP",
        "clay_base, BOTTOM",
        "layer_bottom_3, BOTTOM",
        "bedrock, BOTTOM",
        "kx-layer-3, CONDUCTIVITY",
        "K, CONDUCTIVITY",
        "HydraulicConductivity, CONDUCTIVITY",
        "vertical_conductivity, VERTICAL_CONDUCTIVITY",
        "kz_2, VERTICAL_CONDUCTIVITY",
        "ky, CONDUCTIVITY_Y",
        "qx_l1_i3, FLUX_X",
        "flux/y_l1, FLUX_Y",
        "Darcy_flux_z, FLUX_Z",
        "flow_east, FLOW_EAST",
        "north face flow, FLOW_NORTH",
        "SY, SPECIFIC_YIELD",
        "specific yield, SPECIFIC_YIELD",
        "ss_1, SPECIFIC_STORAGE",
        "storativity, STORATIVITY",
        "recharge_2021-10, AREAL",
        "evapotranspiration, AREAL",
        "river exchange, CELLS",
        "stream_leakage, CELLS",
        "abstraction wells, POINTS",
        "active_cells, ACTIVE",
        "mask, ACTIVE",
        "chloride_0, CONCENTRATION",
        "porosity, POROSITY",
        "effective porosity, EFFECTIVE_POROSITY",
        "bulk_density, BULK_DENSITY",
        "storage change, SUPPLIED",
        "final version, NONE",
        "x, NONE",
    })
    void wordsSayWhatValuesAre(String name, Role role) {
        assertThat(RoleGuess.of(name, 0.1, 0.4).role()).isEqualTo(role);
    }

    @Test
    void theReasonQuotesTheWordAndTheRange() {
        Guess guess = RoleGuess.of("qx_l1", -0.2, 0.4);
        assertThat(guess.reason()).isEqualTo("The name says \"qx\"; values go from -0.2000 to 0.4000.");
        assertThat(guess.confidence()).isEqualTo(Guess.Confidence.FAIR);
    }

    @Test
    void aRangeThatSpeaksAgainstItMakesAGuessWeak() {
        Guess guess = RoleGuess.of("specific yield", 0.05, 25);
        assertThat(guess.role()).isEqualTo(Role.SPECIFIC_YIELD);
        assertThat(guess.confidence()).isEqualTo(Guess.Confidence.LOW);
        assertThat(guess.reason()).contains("no share of a volume");
    }

    @Test
    void whatNothingSpeaksForIsLeftOut() {
        Guess guess = RoleGuess.of("grid 17", 2, 3);
        assertThat(guess.role()).isEqualTo(Role.NONE);
        assertThat(guess.reason()).contains("says nothing that is known");
    }

    @Test
    void aRasterWithoutValuesIsDoubted() {
        assertThat(RoleGuess.of("head", Double.NaN, Double.NaN).confidence()).isEqualTo(Guess.Confidence.LOW);
    }
}
