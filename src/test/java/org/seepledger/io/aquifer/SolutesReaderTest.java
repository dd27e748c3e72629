package org.seepledger.io.aquifer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.Concentration;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Sorption;
import org.seepledger.aquifer.Window;
import org.seepledger.fault.DataFault;

class SolutesReaderTest {

    private static final String SET = """
            {"length_unit": "%s", "time_unit": "d",
             "grid": {"x": {"from": 0, "step": 1, "count": 2}, "y": {"from": 0, "step": 1, "count": 1}},
             "layers": [{"top": 1, "bottom": 0}], "times": [0, 10], "flow": {"kind": "darcy_flux", "x": 0, "y": 0},
             "sources": [{"category": "rain", "kind": "areal", "rate": 1}, {"category": "leach", "kind": "areal", "rate": 1,
                          "concentration": {"salt": {"value": 2, "unit": "g/m3"}}}],
             "solutes": [{"name": "salt", "unit": "%s", %s}]}
            """;
    private static final Block BLOCK = new Block(new Window(0, 0, 1, 2), 1);

    @TempDir
    Path folder;

    private Solute salt(String length, String unit, String keys) {
        try {
            Files.writeString(folder.resolve("aquifer.json"), SET.formatted(length, unit, keys.replace('\'', '"')));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        try (AquiferFolder set = AquiferReader.open(folder)) {
            Solute solute = set.solutes().get(0);
            solute.concentration().ifPresent(given -> given.at(0, BLOCK));
            return solute;
        }
    }

    private static double first(GriddedValues values) {
        return BLOCK.read(values, 0)[0];
    }

    /** 1 mg/L is 1e-3 kg/m³; a cubic foot is 0.3048³ m³ (NIST Handbook 44, Appendix C). */
    @ParameterizedTest
    @CsvSource({
        "m, mg/L, 1e-3",
        "m, ug/L, 1e-6",
        "m, µg/L, 1e-6",
        "m, ng/L, 1e-9",
        "m, g/m3, 1e-3",
        "ft, mg/L, 2.8316846592e-5"
    })
    void turnsConcentrationsIntoKilograms(String length, String unit, double factor) {
        Solute salt = salt(length, unit, "'concentration': 5, 'boundary_concentration': 7");
        assertThat(first(salt.concentration().orElseThrow().values())).isCloseTo(5 * factor, within(1e-15 * factor));
        assertThat(first(salt.boundary().orElseThrow())).isCloseTo(7 * factor, within(1e-14 * factor));
        assertThat(salt.ofSources()).containsOnlyKeys(1);
    }

    private Concentration.AtInstant read(String keys, String... lines) throws IOException {
        Files.writeString(folder.resolve("c.csv"), "row,col,instant,c\n" + String.join("\n", lines) + "\n");
        Files.writeString(
                folder.resolve("aquifer.json"),
                SET.formatted("m", "g/m3", ("'concentration': {'file': 'c.csv'}" + keys).replace('\'', '"')));
        try (AquiferFolder set = AquiferReader.open(folder)) {
            return set.solutes().get(0).concentration().orElseThrow().at(1, BLOCK);
        }
    }

    @Test
    void tellsNonDetectsFromValues() throws IOException {
        Concentration.AtInstant marked = read("", "1,1,1,<0.5", "1,2,1,0.25", "1,1,0,3", "1,2,0,3");
        assertThat(marked.values()).containsExactly(0.5e-3, 0.25e-3);
        assertThat(marked.limits()).containsExactly(0.5e-3, Double.NaN);
        Concentration.AtInstant limited = read(", 'detection_limit': 0.3", "1,1,1,<0.5", "1,2,1,0.25");
        assertThat(limited.limits()).containsExactly(0.5e-3, 0.3e-3);
        Concentration.AtInstant simulated =
                read(", 'detection_limit': 0.3, 'censored': false", "1,1,1,0.5", "1,2,1,0.25");
        assertThat(simulated.limits()).containsOnly(Double.NaN);
    }

    @Test
    void saysWhereAConcentrationCannotBe() {
        assertThatThrownBy(() -> read("", "1,1,1,2", "1,2,1,-2"))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("solutes, entry 1, concentration, layer 1, row 1, column 2: found -2.0");
        assertThatThrownBy(() -> read("", "1,1,1,<x"))
                .hasMessageContaining("line 2")
                .hasMessageContaining("after <");
        assertThatThrownBy(() -> read("", "1,1,1,<"))
                .hasMessageContaining("line 2")
                .hasMessageContaining("after <");
    }

    /** ρb Kd C with ρb 1,600 kg/m³, Kd = Koc × foc = 100 × 0.002 L/kg, C 3 g/m³: 0.96 g/m³ of rock. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "{'isotherm': 'linear', 'kd': 0.2} | 0.96e-3",
                "{'isotherm': 'linear', 'kd': 0.2e-3, 'unit': 'm3/kg'} | 0.96e-3",
                "{'isotherm': 'linear', 'koc': 100, 'foc': 0.002} | 0.96e-3",
                "{'isotherm': 'freundlich', 'kf': 0.2, 'n': 1} | 0.96e-3",
                "{'isotherm': 'freundlich', 'kf': 0.2, 'n': 2} | 2.88e-3",
                "{'isotherm': 'langmuir', 'capacity': 10, 'affinity': 0.5} | 9.6e-3",
                "{'isotherm': 'langmuir', 'capacity': {'value': 1e-5, 'unit': 'kg/kg'}, 'affinity': {'value': 0.5, 'unit': 'm3/g'}} | 9.6e-3",
            })
    void sorbsByIsotherms(String sorption, double sorbed) {
        Sorption read = salt("m", "mg/L", "'bulk_density': {'value': 1.6, 'unit': 't/m3'}, 'sorption': " + sorption)
                .sorption()
                .orElseThrow();
        assertThat(read.in(BLOCK).sorbed(0, 3e-3)).isCloseTo(sorbed, within(1e-15));
    }

    @Test
    void readsDecayOfBothPhases() {
        double half = Math.log(2) / 20;
        Solute.Decay both =
                salt("m", "mg/L", "'half_life': {'value': 480, 'unit': 'h'}").decay();
        assertThat(first(both.dissolved().orElseThrow())).isCloseTo(half, within(1e-16));
        assertThat(first(both.sorbed().orElseThrow())).isCloseTo(half, within(1e-16));
        Solute.Decay dissolved =
                salt("m", "mg/L", "'decay_rate': 0.1, 'sorbed_half_life': null").decay();
        assertThat(first(dissolved.dissolved().orElseThrow())).isEqualTo(0.1);
        assertThat(dissolved.sorbed()).isEmpty();
        assertThat(salt("m", "mg/L", "'half_life': null").decay()).isEqualTo(Solute.Decay.NONE);
    }

    @Test
    void readsDispersion() {
        Solute.Dispersion given = salt(
                        "m", "mg/L", "'dispersion': {'longitudinal': {'value': 10, 'unit': 'ft'}, 'diffusion': 1e-4}")
                .dispersion()
                .orElseThrow();
        assertThat(first(given.longitudinal())).isCloseTo(3.048, within(1e-15));
        assertThat(first(given.transverse())).isZero();
        assertThat(first(given.tortuosity())).isEqualTo(1);
    }
}
