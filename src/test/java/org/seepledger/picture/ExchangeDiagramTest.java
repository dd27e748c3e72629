package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Period;

class ExchangeDiagramTest {

    private static final Period DAY = new Period("a day", 0, 1, List.of(new Period.Part(0, 1)));
    private static final List<String> NAMES = List.of(
            "north", "well field", "a river meadow with a long name", "terrace", "pit", "east", "upper", "lower");

    private static ExchangeFlow flow(String giver, String receiver, double rate) {
        return new ExchangeFlow(giver, receiver, new double[] {rate});
    }

    private static Picture diagram(List<String> names, List<ExchangeFlow> flows, double width) {
        return ExchangeDiagram.of(names, flows, DAY, RandomLedger.RATE, width);
    }

    @Property(tries = 60)
    void nothingIsCutOrCovered(@ForAll long seed, @ForAll @IntRange(min = 1, max = 8) int count) {
        Random random = new Random(seed);
        List<String> names = NAMES.subList(0, count);
        List<String> partners = new ArrayList<>(names);
        partners.add(ExchangeFlow.OUTSIDE);
        List<ExchangeFlow> flows = new ArrayList<>();
        for (String giver : partners) {
            for (String receiver : partners) {
                if (!giver.equals(receiver) && random.nextInt(3) > 0) {
                    double rate = random.nextInt(9) == 0 ? Double.NaN : Math.pow(10, 10 * random.nextDouble() - 4);
                    flows.add(flow(giver, receiver, rate));
                }
            }
        }
        for (double width : new double[] {340, 360, 760}) {
            Picture picture = diagram(names, flows, width);
            Drawn.isLegible(picture);
            assertThat(Drawn.words(picture)).noneMatch(words -> words.matches(".*\\d…"));
        }
    }

    @Test
    void widthsAreInProportion() {
        Picture picture = diagram(
                NAMES.subList(0, 2),
                List.of(flow("outside", "north", 60), flow("north", "outside", 30), flow("north", "well field", 45)),
                760);
        double gain = shaft(picture, Ink.Token.GAIN);
        assertThat(shaft(picture, Ink.Token.LOSS)).isCloseTo(gain / 2, within(1e-9));
        assertThat(shaft(picture, Ink.Token.WATER)).isCloseTo(0.75 * gain, within(1e-9));
    }

    /** How thick an arrow or band is where it begins: its first and its last corner are the two sides. */
    private static double shaft(Picture picture, Ink.Token ink) {
        double[] ring = Drawn.of(Mark.Area.class, picture.marks()).stream()
                .filter(area -> area.fill().orElseThrow().ink() == ink)
                .findFirst()
                .orElseThrow()
                .rings()
                .get(0);
        return Math.abs(ring[1] - ring[ring.length - 1]);
    }

    @Test
    void bandsAreEvenlyThickAllAlong() {
        Picture picture = diagram(NAMES, List.of(flow("north", "lower", 5), flow("pit", "well field", 2)), 760);
        double[] ring = Drawn.of(Mark.Area.class, picture.marks()).stream()
                .filter(area -> area.fill().orElseThrow().ink() == Ink.Token.WATER)
                .findFirst()
                .orElseThrow()
                .rings()
                .get(0);
        double thick = Math.abs(ring[1] - ring[ring.length - 1]);
        for (int i = 1; i < 30; i++) {
            int other = ring.length / 2 - 1 - i;
            assertThat(Math.hypot(ring[2 * i] - ring[2 * other], ring[2 * i + 1] - ring[2 * other + 1]))
                    .isCloseTo(thick, within(1e-6));
        }
    }

    @Test
    void whatCannotBeGivenIsDashedWithADash() {
        Picture picture = diagram(
                NAMES.subList(0, 2),
                List.of(flow("north", "well field", Double.NaN), flow("outside", "north", 3)),
                760);
        assertThat(Drawn.of(Mark.Line.class, picture.marks()))
                .filteredOn(line -> !line.stroke().dash().isEmpty())
                .hasSize(1);
        assertThat(Drawn.words(picture)).contains("–");
        assertThat(picture.description()).contains("north to well field cannot be given", "outside to north 3");
    }

    @Test
    void whatIsZeroIsNotDrawn() {
        Picture picture = diagram(NAMES.subList(0, 2), List.of(flow("north", "well field", 0)), 360);
        assertThat(Drawn.filled(picture, Ink.Token.WATER)).isEmpty();
        assertThat(picture.description()).startsWith("Nothing flows");
    }
}
