package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.picture.BudgetBlocks.Flows;

class BudgetBlocksTest {

    private static final List<Account> FEW = List.of(
            RandomLedger.account(Group.SIDE, "river side"),
            RandomLedger.account(Group.SOURCE, "recharge"),
            RandomLedger.account(Group.STORAGE, "water-table storage"));

    private static Picture few(double[] inflow, double[] outflow, Flows flows) {
        PeriodBudget budget = RandomLedger.day(true, FEW, inflow, outflow);
        return BudgetBlocks.of("p", budget, flows, RandomLedger.RATE, 760);
    }

    private static double high(Picture picture, Ink.Token ink) {
        return Drawn.filled(picture, ink).stream().mapToDouble(Box::height).sum();
    }

    private static double upper(Picture picture, Ink.Token ink) {
        return Drawn.filled(picture, ink).stream().mapToDouble(Box::y).min().orElseThrow();
    }

    @Property(tries = 60)
    void nothingIsCutOrCovered(
            @ForAll long seed,
            @ForAll boolean known,
            @ForAll Flows flows,
            @ForAll @IntRange(min = 0, max = 30) int items) {
        RandomLedger random = new RandomLedger(seed, 1);
        PeriodBudget budget =
                random.ledger(known, items).budget(random.periods().get(0));
        for (double width : new double[] {340, 360, 760, 1200}) {
            Drawn.isLegible(BudgetBlocks.of("p", budget, flows, RandomLedger.RATE, width));
        }
    }

    @Test
    void heightsAreInProportion() {
        Picture picture = few(new double[] {10, 90, 0}, new double[] {40, 0, 20}, Flows.GROSS);
        double scale = high(picture, Ink.Token.GAIN) / 100;
        assertThat(high(picture, Ink.Token.LOSS)).isCloseTo(40 * scale, within(1e-9));
        assertThat(high(picture, Ink.Token.STORAGE)).isCloseTo(20 * scale, within(1e-9));
        assertThat(high(picture, Ink.Token.RESIDUAL)).isCloseTo(40 * scale, within(1e-9));
        assertThat(Drawn.filled(picture, Ink.Token.GAIN).stream().map(Box::height))
                .satisfiesExactly(
                        recharge -> assertThat(recharge).isCloseTo(90 * scale, within(1e-9)),
                        river -> assertThat(river).isCloseTo(10 * scale, within(1e-9)));
    }

    @Test
    void storageAndResidualCloseTheGapWhateverTheirSigns() {
        double[][][] budgets = {
            {{10, 90, 0}, {40, 0, 20}},
            {{10, 90, 0}, {40, 0, 120}},
            {{10, 30, 60}, {80, 0, 0}},
            {{10, 30, 20}, {80, 0, 0}}
        };
        for (double[][] budget : budgets) {
            Picture picture = few(budget[0], budget[1], Flows.GROSS);
            Box storage = Drawn.filled(picture, Ink.Token.STORAGE).get(0);
            Box residual = Drawn.filled(picture, Ink.Token.RESIDUAL).get(0);
            double losses = upper(picture, Ink.Token.LOSS);
            double gains = upper(picture, Ink.Token.GAIN);
            double joint = Math.abs(storage.y() - losses) < 1e-9 ? storage.bottom() : storage.y();
            assertThat(storage.y() + storage.bottom()).isCloseTo(losses + joint, within(1e-9));
            assertThat(residual.y() + residual.bottom()).isCloseTo(gains + joint, within(1e-9));
            assertThat(Math.min(Math.abs(residual.y() - gains), Math.abs(residual.bottom() - gains)))
                    .isCloseTo(0, within(1e-9));
        }
    }

    @Test
    void anItemIsShownGrossOrNet() {
        double[] inflow = {10, 90, 0};
        double[] outflow = {40, 0, 20};
        assertThat(few(inflow, outflow, Flows.GROSS).description()).startsWith("Gains 100 = losses 40 + ");
        Picture net = few(inflow, outflow, Flows.NET);
        assertThat(net.description()).startsWith("Gains 90 = losses 30 + change in storage 20 + residual 40,");
        assertThat(high(net, Ink.Token.LOSS) / high(net, Ink.Token.GAIN)).isCloseTo(1.0 / 3, within(1e-9));
    }

    @Test
    void layersOfAnItemAreOneSlice() {
        List<Account> layers =
                List.of(new Account(Group.SIDE, "river side", 0, true), new Account(Group.SIDE, "river side", 1, true));
        PeriodBudget budget = RandomLedger.day(true, layers, new double[] {1, 2}, new double[] {3, 0});
        Picture picture = BudgetBlocks.of("p", budget, Flows.GROSS, RandomLedger.RATE, 760);
        assertThat(Drawn.filled(picture, Ink.Token.GAIN)).hasSize(1);
        assertThat(Drawn.words(picture)).contains("river side", "3 · 100\u202f%");
    }

    @Test
    void smallSlicesAreMerged() {
        List<Account> hundred = IntStream.range(0, 100)
                .mapToObj(i -> RandomLedger.account(Group.SIDE, "side " + i))
                .toList();
        double[] inflow = IntStream.range(0, 100).mapToDouble(i -> 1 + i % 7).toArray();
        PeriodBudget budget = RandomLedger.day(true, hundred, inflow, new double[100]);
        for (double width : new double[] {360, 760}) {
            Picture picture = BudgetBlocks.of("p", budget, Flows.GROSS, RandomLedger.RATE, width);
            assertThat(Drawn.filled(picture, Ink.Token.GAIN)).hasSize(8);
            assertThat(Drawn.words(picture)).contains("93 smaller terms");
            Drawn.isLegible(picture);
        }
    }

    @Test
    void unknownStorageIsAnOpenOutlineWithASentence() {
        PeriodBudget budget = RandomLedger.day(false, FEW.subList(0, 2), new double[] {10, 90}, new double[] {40, 0});
        Picture picture = BudgetBlocks.of("p", budget, Flows.GROSS, RandomLedger.RATE, 760);
        assertThat(Drawn.filled(picture, Ink.Token.STORAGE)).isEmpty();
        assertThat(Drawn.filled(picture, Ink.Token.RESIDUAL)).isEmpty();
        assertThat(Drawn.of(Mark.Area.class, picture.marks()))
                .filteredOn(area ->
                        area.stroke().filter(line -> !line.dash().isEmpty()).isPresent())
                .singleElement()
                .satisfies(open -> assertThat(Drawn.box(open).height() / high(picture, Ink.Token.GAIN))
                        .isCloseTo(0.6, within(1e-9)));
        assertThat(sentences(picture)).contains("not explained 60").contains("Storage is not known");
    }

    @Test
    void whatCannotBeGivenHasADashAndNoZero() {
        List<Account> accounts = List.of(FEW.get(0), new Account(Group.LID, "bottom", 1, false));
        PeriodBudget budget = RandomLedger.day(false, accounts, new double[] {10, 7}, new double[] {40, 7});
        Picture picture = BudgetBlocks.of("p", budget, Flows.GROSS, RandomLedger.RATE, 760);
        assertThat(sentences(picture)).contains("no number can be given: bottom lid\u00a0–.");
        assertThat(Drawn.words(picture)).doesNotContain("bottom lid");
    }

    @Test
    void nothingAtAllIsDrawnToo() {
        Picture picture = few(new double[3], new double[3], Flows.GROSS);
        assertThat(picture.description()).startsWith("Gains 0 = losses 0 + change in storage 0 + residual 0");
        Drawn.isLegible(picture);
        PeriodBudget none =
                RandomLedger.day(true, FEW, new double[] {Double.NaN, Double.NaN, Double.NaN}, new double[] {0, 0, 0});
        Drawn.isLegible(BudgetBlocks.of("p", none, Flows.NET, RandomLedger.RATE, 360));
    }

    private static String sentences(Picture picture) {
        return Drawn.words(picture).stream().collect(Collectors.joining(" "));
    }
}
