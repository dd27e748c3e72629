package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;

class StorageCurveTest {

    private static final List<Account> ACCOUNTS = List.of(
            RandomLedger.account(Group.SIDE, "river side"), RandomLedger.account(Group.STORAGE, "water-table storage"));

    private static List<PeriodBudget> budgets(boolean known, double[][] inflow, double[][] outflow) {
        Ledger ledger = new Ledger("p", ACCOUNTS.subList(0, known ? 2 : 1), known, inflow, outflow);
        List<PeriodBudget> budgets = new ArrayList<>();
        for (int i = 0; i < inflow.length; i++) {
            budgets.add(ledger.budget(new Period("period " + i, 10 * i, 10 * i + 10, List.of(new Period.Part(i, 10)))));
        }
        return budgets;
    }

    private static Picture curve(List<PeriodBudget> budgets) {
        return StorageCurve.of("p", budgets, RandomLedger.times(false), RandomLedger.VOLUME, 760);
    }

    private static double[] line(Picture picture, Ink ink) {
        List<double[]> lines = Drawn.of(Mark.Line.class, picture.marks()).stream()
                .filter(line -> line.stroke().ink() == ink)
                .map(Mark.Line::xy)
                .toList();
        return lines.get(lines.size() - 1);
    }

    @Test
    void addsUpWhatStorageTakesAndWhatIsNotExplained() {
        Picture picture = curve(budgets(
                true, new double[][] {{50, 0}, {10, 30}, {0, 5}}, new double[][] {{20, 20}, {40, 0}, {5, 0}}));
        double[] storage = line(picture, Ink.Token.STORAGE);
        double[] residual = line(picture, Ink.Token.RESIDUAL);
        double zero = storage[1];
        double perUnit = (zero - storage[3]) / 200;
        assertThat(storage).hasSize(12);
        assertThat(zero - storage[7]).isCloseTo(-100 * perUnit, within(1e-9));
        assertThat(zero - storage[11]).isCloseTo(-150 * perUnit, within(1e-9));
        assertThat(zero - residual[11]).isCloseTo(100 * perUnit, within(1e-9));
        assertThat(Drawn.words(picture))
                .contains("taken by storage, in the end −150 m³", "residual, in the end 100 m³");
        assertThat(picture.description()).contains("from −150 to 200");
    }

    @Test
    void endsWhereNumbersEnd() {
        Picture picture = curve(budgets(true, new double[][] {{50, 0}, {Double.NaN, 30}, {0, 5}}, new double[][] {
            {20, 20}, {40, 0}, {5, 0}
        }));
        assertThat(line(picture, Ink.Token.STORAGE)).hasSize(4);
        assertThat(picture.description()).contains("ends after 1 of 3 periods");
        Picture none = curve(budgets(true, new double[][] {{Double.NaN, 0}}, new double[][] {{0, 0}}));
        Drawn.isLegible(none);
    }

    @Test
    void withoutStorageTheGapIsShown() {
        Picture picture = curve(budgets(false, new double[][] {{50}}, new double[][] {{20}}));
        assertThat(Drawn.words(picture)).contains("gains − losses, in the end 300 m³");
        assertThat(Drawn.filled(picture, Ink.Token.STORAGE)).isEmpty();
    }

    @Test
    void ratesAreRefused() {
        List<PeriodBudget> budgets = budgets(true, new double[][] {{50, 0}}, new double[][] {{20, 20}});
        assertThatIllegalArgumentException()
                .isThrownBy(() -> StorageCurve.of("p", budgets, RandomLedger.times(false), RandomLedger.RATE, 760));
    }
}
