package org.seepledger.prism;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;

/** Areas behind pieces in a unit cell against the intersection of a far-reaching wedge with it, made by JTS 1.20.0. */
class SectorTest {

    private static final GeometryFactory FACTORY = new GeometryFactory();
    private static final Geometry CELL = FACTORY.toGeometry(new Envelope(0, 1, 0, 1));

    @Property(tries = 500)
    void isTheAreaOfTheWedgeBehindThePiece(@ForAll long seed) {
        Random random = new Random(seed);
        double across = random.nextDouble();
        double up = random.nextDouble();
        double[] p = place(random);
        double[] q = place(random);
        double doubled = (p[0] - across) * (q[1] - up) - (p[1] - up) * (q[0] - across);
        double distance = Math.abs(doubled) / Math.hypot(q[0] - p[0], q[1] - p[1]);
        if (!(distance > 1e-4)) {
            return;
        }
        double far = 2 / distance;
        Geometry wedge = FACTORY.createPolygon(new Coordinate[] {
            new Coordinate(p[0], p[1]),
            new Coordinate(q[0], q[1]),
            new Coordinate(across + far * (q[0] - across), up + far * (q[1] - up)),
            new Coordinate(across + far * (p[0] - across), up + far * (p[1] - up)),
            new Coordinate(p[0], p[1])
        });
        double expected = Math.signum(doubled) * wedge.intersection(CELL).getArea();
        assertThat(new Sector(across, up).behind(p[0], p[1], q[0], q[1])).isEqualTo(expected, within(1e-9));
    }

    /** A place in the cell, often on its faces or corners. */
    private static double[] place(Random random) {
        double[] place = {random.nextDouble(), random.nextDouble()};
        for (int i = 0; i < 2; i++) {
            if (random.nextInt(3) == 0) {
                place[i] = random.nextInt(2);
            }
        }
        return place;
    }

    @Property(tries = 200)
    void theOtherWayRoundItIsTheExactOpposite(@ForAll long seed) {
        Random random = new Random(seed);
        Sector sector = new Sector(random.nextDouble(), random.nextDouble());
        double[] p = place(random);
        double[] q = place(random);
        assertThat(sector.behind(q[0], q[1], p[0], p[1])).isEqualTo(0 - sector.behind(p[0], p[1], q[0], q[1]));
    }

    @Property(tries = 200)
    void aRingRoundThePlaceLeavesWhatItDoesNotCover(@ForAll long seed) {
        Random random = new Random(seed);
        int corners = 3 + random.nextInt(6);
        double[] xs = new double[corners];
        double[] ys = new double[corners];
        double covered = 0;
        for (int i = 0; i < corners; i++) {
            double angle = 2 * Math.PI * (i + 0.5 * random.nextDouble()) / corners;
            double radius = 0.05 + 0.45 * random.nextDouble();
            xs[i] = 0.5 + radius * Math.cos(angle);
            ys[i] = 0.5 + radius * Math.sin(angle);
        }
        double behind = 0;
        for (int i = 0; i < corners; i++) {
            int next = (i + 1) % corners;
            behind += new Sector(0.5, 0.5).behind(xs[i], ys[i], xs[next], ys[next]);
            covered += 0.5 * ((xs[i] - 0.5) * (ys[next] - 0.5) - (ys[i] - 0.5) * (xs[next] - 0.5));
        }
        assertThat(behind).isEqualTo(1 - covered, within(1e-14));
    }

    @Property(tries = 5000)
    void aPieceAlongARayHidesNextToNothing(@ForAll long seed) {
        Random random = new Random(seed);
        double across = random.nextDouble();
        double up = random.nextDouble();
        double[] end = place(random);
        double near = 0.01 + 0.99 * random.nextDouble();
        double[] begin = {across + near * (end[0] - across), up + near * (end[1] - up)};
        assertThat(new Sector(across, up).behind(begin[0], begin[1], end[0], end[1]))
                .isEqualTo(0, within(1e-12));
        assertThat(new Sector(across, up).behind(end[0], end[1], begin[0], begin[1]))
                .isEqualTo(0, within(1e-12));
    }

    @Test
    void aPieceThatPointsAtThePlaceHidesNothing() {
        assertThat(new Sector(0.5, 0.5).behind(0.25, 0.25, 0, 0)).isZero();
        assertThat(new Sector(0.5, 0.5).behind(0.5, 0.75, 0.5, 1)).isZero();
        assertThat(new Sector(0.5, 0.5).behind(1, 0, 1, 1)).isZero();
    }

    @Test
    void aPieceAcrossTheCellHidesWhatIsBeyond() {
        Sector sector = new Sector(0.25, 0.5);
        assertThat(sector.behind(0.75, 0, 0.75, 1)).isEqualTo(0.25, within(1e-15));
        assertThat(sector.behind(0.75, 1, 0.75, 0)).isEqualTo(-0.25, within(1e-15));
    }
}
