package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;

/** What must not matter: where the map's origin is, which way it is turned or seen, where a ring begins. */
class SymmetryTest {

    private static final double ROUNDING = 1e-10;

    @Property(tries = 60)
    void translationByDyadicDistancesChangesNotOneBit(
            @ForAll long seed, @ForAll @IntRange(max = 2) int which, @ForAll boolean turned) {
        PlanCase plan = PlanCase.random(seed, turned ? 90 : 0);
        double shift = new double[] {8_388_608, 1e7, -8_388_608}[which];
        assertThat(plan.shifted(shift, -shift).budget()).isEqualTo(plan.budget());
    }

    @Property(tries = 60)
    void turningGridAndPolygonTogetherByAQuarterChangesNotOneBit(@ForAll long seed) {
        PlanCase plan = PlanCase.random(seed, 0);
        assertThat(plan.inTurnedGrid().budget()).isEqualTo(plan.budget());
    }

    @Property(tries = 60)
    void aMirrorImageHasTheSameBudget(@ForAll long seed) {
        PlanCase plan = PlanCase.random(seed, 0);
        assertSame(plan.mirrored(), plan);
    }

    @Property(tries = 60)
    void soHasAQuarterTurnOfTheField(@ForAll long seed) {
        PlanCase plan = PlanCase.random(seed, 0);
        assertSame(plan.quarterTurned(), plan);
    }

    @Property(tries = 60)
    void whereARingBeginsDoesNotMatter(@ForAll long seed, @ForAll @IntRange(min = 1, max = 3) int by) {
        PlanCase plan = PlanCase.random(seed, 0);
        PlanCase renumbered = plan.renumbered(by);
        assertSame(renumbered, plan);
        for (String item : plan.items()) {
            assertThat(renumbered.reading().entries(item))
                    .isEqualTo(plan.reading().entries(item));
        }
    }

    private static void assertSame(PlanCase one, PlanCase other) {
        BudgetReading expected = other.reading();
        for (Entry entry : one.reading().budget().entries()) {
            Entry same = expected.entry(entry.account().item(), entry.account().layer());
            assertThat(entry.inflow()).isEqualTo(same.inflow(), within(ROUNDING));
            assertThat(entry.outflow()).isEqualTo(same.outflow(), within(ROUNDING));
        }
        assertThat(one.reading().totals().residual())
                .isEqualTo(expected.totals().residual(), within(ROUNDING));
    }

    @Property(tries = 60)
    void reversingTheFlowSwapsInAndOut(@ForAll long seed) {
        PlanCase plan = PlanCase.random(seed, 0);
        List<Entry> forth = plan.budget();
        List<Entry> back = plan.reversed().budget();
        for (int i = 0; i < forth.size(); i++) {
            if (forth.get(i).account().group() != Group.SOURCE) {
                assertThat(back.get(i).inflow()).isEqualTo(forth.get(i).outflow());
                assertThat(back.get(i).outflow()).isEqualTo(forth.get(i).inflow());
            }
        }
    }
}
