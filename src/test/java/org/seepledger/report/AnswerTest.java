package org.seepledger.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Storage;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.aquifer.Well;
import org.seepledger.balance.Whereabouts;
import org.seepledger.io.result.Provenance;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.report.Answer.Topic;
import org.seepledger.unit.Measure;

/** What is said of budgets whose numbers are plain to see; rates are per day, and intervals last ten days. */
class AnswerTest {

    private static final ResultUnits UNITS = ResultUnits.of(Measure.of("m"), Measure.of("d"), null, null);

    private final List<Account> accounts = new ArrayList<>();
    private final List<double[]> inflow = new ArrayList<>();
    private final List<double[]> outflow = new ArrayList<>();
    private final List<Provenance> origins = new ArrayList<>(List.of(new Provenance("flow", "simulated", "", "")));
    private final List<ExchangeFlow> exchange = new ArrayList<>();
    private final List<Source> sources = new ArrayList<>();
    private StorageKnowledge storage = StorageKnowledge.KNOWN;

    /** An account with what comes in and goes out in each interval: in, out, in, out, … */
    private AnswerTest row(Group group, String item, boolean quantified, double... rates) {
        accounts.add(new Account(group, item, 0, quantified));
        double[] in = new double[rates.length / 2];
        double[] out = new double[rates.length / 2];
        for (int i = 0; i < in.length; i++) {
            in[i] = rates[2 * i];
            out[i] = rates[2 * i + 1];
        }
        inflow.add(in);
        outflow.add(out);
        return this;
    }

    private AnswerTest row(Group group, String item, double... rates) {
        return row(group, item, true, rates);
    }

    private static double[][] byInterval(List<double[]> byAccount) {
        double[][] rates = new double[byAccount.get(0).length][byAccount.size()];
        for (int account = 0; account < byAccount.size(); account++) {
            for (int interval = 0; interval < rates.length; interval++) {
                rates[interval][account] = byAccount.get(account)[interval];
            }
        }
        return rates;
    }

    private List<String> says(Topic topic) {
        Ledger ledger = new Ledger(
                "meadow", accounts, storage != StorageKnowledge.UNKNOWN, byInterval(inflow), byInterval(outflow));
        int intervals = inflow.get(0).length;
        List<Period.Part> parts = new ArrayList<>();
        List<PeriodBudget> periods = new ArrayList<>();
        for (int i = 0; i < intervals; i++) {
            parts.add(new Period.Part(i, 10));
            periods.add(ledger.budget(
                    new Period("interval " + (i + 1), 10 * i, 10 * i + 10, List.of(new Period.Part(i, 10)))));
        }
        PrismResult result = new PrismResult(
                "meadow",
                storage,
                ledger.budget(new Period("record", 0, 10 * intervals, parts)),
                periods,
                exchange,
                new Whereabouts("meadow", 0, List.of()));
        Aquifer aquifer =
                new Aquifer("test", null, List.of(), null, null, Optional.empty(), Storage.NONE, sources, null, null);
        return Answer.of(result, StatedOrigins.of(aquifer, origins), Wording.plain(UNITS))
                .on(topic)
                .toList();
    }

    @Test
    void aResidualIsAShareOfThroughputAndOfNetFlow() {
        row(Group.SIDE, "side 1", 100, 60).row(Group.SIDE, "side 2", 0, 35);
        assertThat(says(Topic.CLOSURE))
                .containsExactly(
                        "Closure error 5.00 % of throughput (12.50 % of net flow): 5 m3/d of 100 m3/d is unexplained.",
                        "Of that throughput, 60.00 % goes in and out again through the same items, at other places or"
                                + " times; for sides, how much depends on how they are drawn. The closure error set against"
                                + " net flow leaves it out.");
        assertThat(says(Topic.LIMITS)).last().asString().startsWith("A small closure error would not prove");
    }

    @Test
    void theWorstPeriodIsTheOneFurthestFromClosing() {
        row(Group.SIDE, "side 1", 100, 0, 100, 0).row(Group.SIDE, "side 2", 0, 110, 0, 92);
        assertThat(says(Topic.CLOSURE)).contains("Worst period: interval 1, -9.09 %.");
    }

    @Test
    void closingToRoundingProvesArithmeticAlone() {
        row(Group.SIDE, "side 1", 0.1 + 0.2, 0).row(Group.SIDE, "side 2", 0, 0.3);
        assertThat(says(Topic.CLOSURE))
                .first()
                .isEqualTo("Closes to rounding: less than 1e-09 % of a throughput of 0.3000 m3/d is unexplained.");
        assertThat(says(Topic.LIMITS))
                .last()
                .asString()
                .contains("proves the arithmetic", "does not prove that any of them is right");
    }

    @Test
    void whereNothingFlowsNothingIsProved() {
        row(Group.SIDE, "side 1", 0, 0).row(Group.SIDE, "side 2", false, 0, 0);
        assertThat(says(Topic.CLOSURE)).containsExactly("Nothing flows: there is nothing to close.");
        assertThat(says(Topic.LIMITS)).containsExactly("No flow can be given for side 2; totals count it as 0.");
    }

    @Test
    void withoutStorageClosureIsNotJudged() {
        storage = StorageKnowledge.UNKNOWN;
        row(Group.SIDE, "side 1", 100, 0)
                .row(Group.SIDE, "side 2", 0, 70)
                .row(Group.STORAGE, "water-table storage", false, 0, 0);
        assertThat(says(Topic.CLOSURE))
                .containsExactly(
                        "Closure cannot be judged: change in storage is not known. Inflow less outflow, storage"
                                + " included, is 30 m3/d.");
        assertThat(says(Topic.STORAGE)).containsExactly("It is not known: heads or storage coefficients are missing.");
        assertThat(says(Topic.LIMITS)).noneMatch(sentence -> sentence.contains("clos"));
    }

    @Test
    void theLargestGainsAndLossesHaveTheirShares() {
        row(Group.SIDE, "side 1", 50, 0)
                .row(Group.LID, "top", 30, 10)
                .row(Group.SOURCE, "rain", 20, 0)
                .row(Group.SOURCE, "well", 0, 90);
        assertThat(says(Topic.DOMINANT))
                .containsExactly(
                        "Of all gains, 100 m3/d gross, the largest are side 1 (50 m3/d, 50.00 %), top lid (30 m3/d, 30.00 %)"
                                + " and rain (20 m3/d, 20.00 %).",
                        "Of all losses, 100 m3/d gross, the largest are well (90 m3/d, 90.00 %) and top lid (10 m3/d, 10.00"
                                + " %).");
    }

    @Test
    void storageSaysWhenItGaveAndTook() {
        row(Group.SOURCE, "well", 0, 10, 0, 30, 8, 0).row(Group.STORAGE, "elastic storage", 10, 0, 30, 0, 0, 8);
        assertThat(says(Topic.STORAGE))
                .containsExactly(
                        "Over the record storage released 320 m3, which is 10.67 m3/d on average.",
                        "By period: released 400 m3 (interval 1 to interval 2) and took up 80 m3 (interval 3).");
    }

    @Test
    void aSteadySetHasNoChangeInStorage() {
        storage = StorageKnowledge.STEADY;
        row(Group.SIDE, "side 1", 1, 1).row(Group.STORAGE, "elastic storage", 0, 0);
        assertThat(says(Topic.STORAGE)).singleElement().asString().startsWith("Nothing, because the set is steady");
    }

    @Test
    void exchangeNamesOtherPrismsButNotTheOutside() {
        row(Group.SIDE, "side 1", 1, 1);
        exchange.add(new ExchangeFlow("meadow", "wood", new double[] {3}));
        exchange.add(new ExchangeFlow("wood", "meadow", new double[] {2}));
        exchange.add(new ExchangeFlow("outside", "meadow", new double[] {7}));
        exchange.add(new ExchangeFlow("meadow", "hill", new double[] {Double.NaN}));
        assertThat(says(Topic.EXCHANGE))
                .containsExactly(
                        "To \"wood\" it gives 3 m3/d, and takes 2 m3/d from it.",
                        "What passes to and from \"hill\" cannot be told apart: the two overlap.");
    }

    @Test
    void termsBelowTheResidualAreNamedWithTheirNumbers() {
        row(Group.SIDE, "side 1", 100, 0)
                .row(Group.SIDE, "side 2", 0, 93)
                .row(Group.LID, "bottom", 0, 2)
                .row(Group.SIDE, "side 3", 0, 0);
        assertThat(says(Topic.LIMITS))
                .contains(
                        "Smaller than what is unexplained (5 m3/d), so that the budget neither supports nor contradicts"
                                + " them: bottom lid (2 m3/d).");
    }

    @Test
    void termsBelowTheirOwnUncertaintyAreNamedWithTheirNumbers() {
        origins.set(0, new Provenance("flow", "simulated", "", "20 %"));
        origins.add(new Provenance("rain", "estimated", "", "10 %"));
        row(Group.SIDE, "side 1", 100, 90).row(Group.SIDE, "side 2", 0, 60).row(Group.SOURCE, "rain", 50, 0);
        assertThat(says(Topic.LIMITS))
                .contains(
                        "Net flow smaller than one stated standard deviation of the gross flow, so that not even its"
                                + " direction is certain: side 1 (net 10 m3/d, standard deviation 20 m3/d).",
                        // √((20 % of 150)² + 5²)
                        "Stated uncertainties, all faces taken as one term and all storage as one, then added as squares as"
                                + " if they were independent, come to 30.41 m3/d, 20.28 % of throughput; a difference smaller"
                                + " than that tells nothing.");
    }

    @Test
    void howManySidesAreDrawnDoesNotMatterToWhatIsUncertain() {
        origins.set(0, new Provenance("flow", "simulated", "", "20 %"));
        row(Group.SIDE, "north", 40, 0).row(Group.SIDE, "east", 60, 0).row(Group.SIDE, "south", 0, 100);
        assertThat(says(Topic.LIMITS))
                .anyMatch(sentence -> sentence.contains("come to 20 m3/d, 20.00 % of throughput"));
    }

    @Test
    void manyFacesAreSummedWhereEachIsSmall() {
        row(Group.SIDE, "a", 10, 0)
                .row(Group.SIDE, "b", 9, 0)
                .row(Group.SIDE, "c", 8, 0)
                .row(Group.SIDE, "d", 13, 0);
        row(Group.SOURCE, "rain", 20, 0).row(Group.SOURCE, "wells", 0, 60);
        assertThat(says(Topic.DOMINANT)).first().asString().endsWith("All 4 faces together have 40 m3/d (66.67 %).");
    }

    @Test
    void roundingIsNotAskedForItsDirection() {
        origins.set(0, new Provenance("flow", "simulated", "", "20 %"));
        row(Group.SIDE, "side 1", 100, 0).row(Group.SIDE, "side 2", 0, 100).row(Group.LID, "top", 1e-15, 1e-15);
        assertThat(says(Topic.LIMITS)).noneMatch(sentence -> sentence.contains("direction"));
    }

    @Test
    void theResidualIsSetAgainstWhatIsStated() {
        origins.set(0, new Provenance("flow", "", "", "1 %"));
        row(Group.SIDE, "side 1", 100, 0).row(Group.SIDE, "side 2", 0, 80);
        assertThat(says(Topic.LIMITS))
                .anyMatch(
                        sentence -> sentence.endsWith(
                                "What is unexplained is more than that: errors are larger than stated, or something is missing."));
    }

    @Test
    void anAbsoluteOrMissingUncertaintyIsNotGuessedAt() {
        origins.add(new Provenance("rain", "", "", "3"));
        row(Group.SIDE, "side 1", 0, 50).row(Group.SOURCE, "rain", 50, 0);
        assertThat(says(Topic.LIMITS))
                .contains("No uncertainty is stated in percent for any of its terms, so that none can be weighed.");
    }

    @Test
    void aTermByDifferenceIsNoEvidence() {
        origins.add(new Provenance("leakage", "by difference", "", "30 %"));
        row(Group.SIDE, "side 1", 0, 50).row(Group.SOURCE, "leakage", 50, 0);
        assertThat(says(Topic.LIMITS))
                .contains("Computed by difference, so that closure is no evidence for it: leakage.")
                .anyMatch(sentence -> sentence.endsWith("It leaves out what states none in percent: side 1."));
    }

    @Test
    void wellsHaveTheOriginOfTheSourceThatListsThem() {
        sources.add(new Source.Points("supply", List.of(new Well("W", "irrigation", 0, 0, null, List.of()))));
        origins.add(new Provenance("supply", "measured", "", "10 %"));
        row(Group.SIDE, "side 1", 0, 40).row(Group.SOURCE, "irrigation", 50, 0);
        assertThat(says(Topic.LIMITS)).anyMatch(sentence -> sentence.contains("come to 5 m3/d, 10.00 % of throughput"));
    }

    @Test
    void whatCannotBeGivenIsSaid() {
        row(Group.SIDE, "side 1", 50, 0).row(Group.SIDE, "side 2", false, 0, 0).row(Group.SOURCE, "well", 0, 50);
        assertThat(says(Topic.LIMITS)).contains("No flow can be given for side 2; totals count it as 0.");
    }
}
