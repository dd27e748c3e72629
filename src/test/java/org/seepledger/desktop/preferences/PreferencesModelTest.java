package org.seepledger.desktop.preferences;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.desktop.port.GivenAnswers;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.NumberForm;

class PreferencesModelTest {

    private final GivenAnswers machine = new GivenAnswers();

    @Test
    void whatIsChosenIsThereInTheNextRun() {
        PreferencesModel model = new PreferencesModel(machine);
        model.theme().set(Theme.DARK);
        model.size().set(150);
        model.numbers().set(NumberForm.POINT_COMMA);
        model.rateUnit().set("L/s");
        model.volumeUnit().set("acre-ft");
        model.cover().set(40);
        PreferencesModel next = new PreferencesModel(machine);
        assertThat(next.theme().get()).isEqualTo(Theme.DARK);
        assertThat(next.size().get()).isEqualTo(150);
        assertThat(next.numbers().get()).isEqualTo(NumberForm.POINT_COMMA);
        assertThat(next.rateUnit().get()).isEqualTo("L/s");
        assertThat(next.volumeUnit().get()).isEqualTo("acre-ft");
        assertThat(next.cover().get()).isEqualTo(40);
    }

    @ParameterizedTest
    @CsvSource({
        "theme, plaid",
        "theme, ''",
        "size, 99999999999",
        "size, -100",
        "size, 110",
        "size, NaN",
        "numbers, comma",
        "unit.rate, furlong3/d",
        "unit.rate, 'm3/d; rm'",
        "unit.volume, m3/d",
        "cover, 0"
    })
    void whatIsKeptAndNotKnownCountsAsNotKept(String key, String value) {
        machine.put("preference." + key, value);
        PreferencesModel model = new PreferencesModel(machine);
        assertThat(model.theme().get()).isEqualTo(Theme.LIGHT);
        assertThat(model.size().get()).isEqualTo(100);
        assertThat(model.numbers().get()).isEqualTo(NumberForm.SPACE_POINT);
        assertThat(model.rateUnit().get()).isEmpty();
        assertThat(model.volumeUnit().get()).isEmpty();
        assertThat(model.cover().get()).isEqualTo(60);
    }

    @Test
    void theSizeGoesUpAndDownAndStopsAtTheEnds() {
        PreferencesModel model = new PreferencesModel(machine);
        model.resize(-1);
        assertThat(model.size().get()).isEqualTo(100);
        for (int i = 0; i < 9; i++) {
            model.resize(1);
        }
        assertThat(model.size().get()).isEqualTo(200);
    }
}
