package org.seepledger.plume;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.assertj.core.data.Offset;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.balance.RandomCase;
import org.seepledger.balance.SplitCase;
import org.seepledger.ledger.Group;

/** A prism cut in two: masses add, what one gives the other takes, and nothing changes outside. */
class SplitMassTest {

    @Property(tries = 100)
    void massesAddAndExchangeCancels(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        Aquifer aquifer = random.aquifer(0.05, 0.1, 4);
        double[][] values = random.values(0);
        for (double[] layer : values) {
            for (int i = 0; i < layer.length; i++) {
                layer[i] = Math.abs(layer[i]);
            }
        }
        Solute solute = SoluteDraft.of("salt", ArrayValues.steady(random.grid.columns(), values))
                .retardation(2.5)
                .decay(0.1)
                .dispersion(5, 1, 0.1, 1e-3)
                .limit(0.5)
                .done();
        SplitCase split = new SplitCase(random);
        List<Plume> plumes = Luck.orPassOver(
                () -> SoluteDraft.balance(aquifer, true, List.of(split.whole, split.first, split.second), solute));
        MassReading whole = MassReading.of(plumes.get(0), aquifer.times());
        MassReading first = MassReading.of(plumes.get(1), aquifer.times());
        MassReading second = MassReading.of(plumes.get(2), aquifer.times());
        double scale = whole.budget().totals().throughput()
                + first.budget().totals().throughput()
                + second.budget().totals().throughput();
        Offset<Double> rounding = Offset.offset(1e-10 * scale + 1e-300);
        for (NonDetects choice : NonDetects.values()) {
            double mass = plumes.get(0).whole(1).total(choice);
            assertThat(plumes.get(1).whole(1).total(choice)
                            + plumes.get(2).whole(1).total(choice))
                    .isCloseTo(mass, Offset.offset(1e-12 * mass));
        }
        for (Group group : List.of(Group.SIDE, Group.DISPERSION)) {
            for (String cut : List.of("cut 1", "cut 2")) {
                assertThat(first.in(group, cut)).isCloseTo(second.out(group, cut), rounding);
                assertThat(first.out(group, cut)).isCloseTo(second.in(group, cut), rounding);
            }
            for (String outer : split.outer) {
                boolean inFirst = split.first.rings().get(0).sides().stream()
                        .anyMatch(side -> side.item().equals(outer));
                MassReading half = inFirst ? first : second;
                assertThat(half.in(group, outer)).isCloseTo(whole.in(group, outer), rounding);
                assertThat(half.out(group, outer)).isCloseTo(whole.out(group, outer), rounding);
            }
        }
        for (Group group : List.of(Group.DECAY, Group.SOURCE, Group.LID, Group.STORAGE)) {
            assertThat(first.net(group) + second.net(group)).isCloseTo(whole.net(group), rounding);
        }
    }
}
