package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.prism.Prism;

/** What prisms that share a side owe to each other. */
class NeighboursTest {

    /** Recharge and wells of a random case are of the order of 100, its face flows of 1 to 1e4. */
    private static final double ROUNDING = 1e-8;

    @Property(tries = 200)
    void aSharedSideTakesFromOneWhatItGivesTheOtherToTheLastBit(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        SplitCase split = new SplitCase(random);
        Aquifer aquifer = random.aquifer(0.05, 0.2, 0);
        List<BudgetReading> halves = BudgetReading.of(aquifer, WellRule.POINT, split.first, split.second);
        assertOpposite(halves, "cut 1", "cut 1");
        assertOpposite(halves, "cut 2", "cut 2");
    }

    @Property(tries = 200)
    void soDoesASideOnAGridLine(@ForAll long seed, @ForAll boolean alongX) {
        RandomCase random = new RandomCase(seed);
        List<Prism> boxes = SplitCase.boxes(random, alongX);
        Aquifer aquifer = random.aquifer(0.05, 0.2, 0);
        List<BudgetReading> readings = BudgetReading.of(aquifer, WellRule.POINT, boxes.toArray(Prism[]::new));
        assertOpposite(readings, alongX ? "side 3" : "side 2", alongX ? "side 1" : "side 4");
    }

    private static void assertOpposite(List<BudgetReading> readings, String item, String opposite) {
        List<Entry> one = readings.get(0).entries(item);
        List<Entry> other = readings.get(1).entries(opposite);
        assertThat(one).hasSameSizeAs(other);
        for (int i = 0; i < one.size(); i++) {
            assertThat(one.get(i).inflow()).isEqualTo(other.get(i).outflow());
            assertThat(one.get(i).outflow()).isEqualTo(other.get(i).inflow());
        }
    }

    @Property(tries = 200)
    void withWellsInCutCellsTheyAgreeToo(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        SplitCase split = new SplitCase(random);
        Aquifer aquifer = random.aquifer(0, 0, 12);
        List<BudgetReading> halves = BudgetReading.of(aquifer, WellRule.POINT, split.first, split.second);
        for (String item : List.of("cut 1", "cut 2")) {
            assertThat(halves.get(0).in(item)).isEqualTo(halves.get(1).out(item), within(ROUNDING));
            assertThat(halves.get(0).out(item)).isEqualTo(halves.get(1).in(item), within(ROUNDING));
        }
    }

    @Property(tries = 100)
    void theBudgetOfAUnionIsTheSumOfBudgets(@ForAll long seed, @ForAll WellRule rule) {
        RandomCase random = new RandomCase(seed);
        SplitCase split = new SplitCase(random);
        Aquifer aquifer = random.aquifer(0.05, 0.2, 0);
        assertUnion(aquifer, rule, split);
        assertUnion(random.aquifer(0, 0, 12), rule, split);
    }

    private static void assertUnion(Aquifer aquifer, WellRule rule, SplitCase split) {
        List<BudgetReading> readings = BudgetReading.of(aquifer, rule, split.whole, split.first, split.second);
        BudgetReading whole = readings.get(0);
        for (Entry entry : whole.budget().entries()) {
            String item = entry.account().item();
            if (entry.account().group() != Group.SIDE) {
                assertSum(entry, readings.get(1), readings.get(2), item);
            }
        }
        double residual =
                readings.get(1).totals().residual() + readings.get(2).totals().residual();
        assertThat(residual).isEqualTo(whole.totals().residual(), within(ROUNDING));
    }

    private static void assertSum(Entry whole, BudgetReading first, BudgetReading second, String item) {
        Entry one = first.entry(item, whole.account().layer());
        Entry other = second.entry(item, whole.account().layer());
        assertThat(one.inflow() + other.inflow()).isEqualTo(whole.inflow(), within(ROUNDING));
        assertThat(one.outflow() + other.outflow()).isEqualTo(whole.outflow(), within(ROUNDING));
    }

    @Property(tries = 100)
    void cuttingAPrismInTwoChangesNothingOutside(@ForAll long seed, @ForAll WellRule rule) {
        RandomCase random = new RandomCase(seed);
        SplitCase split = new SplitCase(random);
        Aquifer aquifer = random.aquifer(0, 0.2, 0);
        List<BudgetReading> readings = BudgetReading.of(aquifer, rule, split.whole, split.first, split.second);
        int turn = split.outer.size() / 2;
        for (int i = 0; i < split.outer.size(); i++) {
            List<Entry> before = readings.get(0).entries(split.outer.get(i));
            List<Entry> after = readings.get(i < turn ? 1 : 2).entries(split.outer.get(i));
            assertThat(after).isEqualTo(before);
        }
    }
}
