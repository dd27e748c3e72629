package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.SideNumbering;

/** Whatever vertices come and go on the sides of a ring, each stretch of it stays in its boundary. */
class BoundariesPropertyTest {

    @Property(tries = 200)
    void insertingAndDeletingKeepsBoundaries(@ForAll @IntRange(max = 1_000_000) int seed) {
        Random random = new Random(seed);
        Outline before = Drawn.star(random, new Place(500_000, 5_200_000), 40, 100);
        Outline outline = before;
        for (int edit = 0; edit < 30; edit++) {
            int vertex = random.nextInt(outline.size());
            boolean added = !before.places().contains(outline.place(vertex));
            outline = added && random.nextBoolean()
                    ? outline.delete(vertex)
                    : outline.insert(vertex, on(outline, vertex, random.nextDouble()));
        }
        boolean island = random.nextBoolean();
        assertStays(before, outline.beginningAt(random.nextInt(outline.size())).ring(1, island ? 1 : 0, numbering()));
    }

    private static SideNumbering numbering() {
        return new SideNumbering(false);
    }

    private static Place on(Outline outline, int side, double share) {
        Place from = outline.place(side);
        Place to = outline.place(side + 1);
        return from.moved(share * (to.x() - from.x()), share * (to.y() - from.y()));
    }

    private static void assertStays(Outline before, Ring ring) {
        for (int i = 0; i < ring.sides().size(); i++) {
            Side side = ring.sides().get(i);
            Side next = ring.after(i);
            Place middle = new Place((side.x() + next.x()) / 2, (side.y() + next.y()) / 2);
            Optional<String> expected =
                    before.corners().get(sideAt(before, middle)).boundary();
            assertThat(side.item()).isEqualTo(expected.orElse(side.name()));
        }
    }

    private static int sideAt(Outline outline, Place place) {
        int nearest = 0;
        for (int i = 1; i < outline.size(); i++) {
            nearest = distance(outline, i, place) < distance(outline, nearest, place) ? i : nearest;
        }
        assertThat(distance(outline, nearest, place)).isLessThan(1e-7);
        return nearest;
    }

    private static double distance(Outline outline, int side, Place place) {
        return place.distance(place.nearestOn(outline.place(side), outline.place(side + 1)));
    }
}
