package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.stream.Collectors;
import net.jqwik.api.Assume;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/** Random stars cut by random lines, and put together again. */
class SplitMergePropertyTest {

    private static final double NEAR = 1e-6;
    /** Coordinates near 5e6 are kept to 1e-9; an area of some 100 m girth then to 1e-6. */
    private static final double ROUNDING = 1e-5;

    @Property(tries = 300)
    void piecesHaveTheAreaAndShareTheirVertices(@ForAll @IntRange(max = 1_000_000) int seed) {
        Random random = new Random(seed);
        Shape whole = Drawn.starShape(random, "star");
        Drawing cut = cut(whole, random);
        assertThat(area(cut)).isEqualTo(whole.area(), within(ROUNDING));
        for (Shape piece : cut.shapes()) {
            assertThat(piece.flaw()).isEmpty();
            double common = OverlayNGRobust.overlay(
                            PlanShape.of(piece.parts()), PlanShape.of(whole.parts()), OverlayNG.INTERSECTION)
                    .getArea();
            assertThat(common).isEqualTo(piece.area(), within(ROUNDING));
        }
        assertNewVerticesAreShared(whole, cut);
    }

    /** A vertex that the cut made on a side is in exactly two pieces at least, to the last bit. */
    private static void assertNewVerticesAreShared(Shape whole, Drawing cut) {
        Set<Place> old = vertices(whole);
        for (Shape piece : cut.shapes()) {
            Set<Place> others = cut.shapes().stream()
                    .filter(other -> other != piece)
                    .flatMap(other -> vertices(other).stream())
                    .collect(Collectors.toSet());
            Set<Place> added = vertices(piece);
            added.removeAll(old);
            assertThat(others).containsAll(added);
        }
        assertThat(cut.shapes().stream()
                        .flatMap(piece -> vertices(piece).stream())
                        .collect(Collectors.toSet()))
                .containsAll(old);
    }

    @Property(tries = 300)
    void mergingThePiecesGivesTheWhole(@ForAll @IntRange(max = 1_000_000) int seed) {
        Random random = new Random(seed);
        Shape whole = Drawn.starShape(random, "star");
        Drawing merged = cut(whole, random);
        while (merged.shapes().size() > 1) {
            merged = mergeOne(merged);
        }
        Shape back = merged.shapes().get(0);
        assertThat(back.name()).isEqualTo("star");
        assertThat(back.area()).isEqualTo(whole.area(), within(ROUNDING));
        Geometry difference = OverlayNGRobust.overlay(
                PlanShape.of(whole.parts()), PlanShape.of(back.parts()), OverlayNG.SYMDIFFERENCE);
        assertThat(difference.getArea()).isLessThan(ROUNDING);
        assertThat(vertices(back)).containsAll(vertices(whole));
        assertThat(boundaryLength(back)).isEqualTo(boundaryLength(whole), within(ROUNDING));
    }

    private static Drawing mergeOne(Drawing drawing) {
        for (Shape other : drawing.shapes().subList(1, drawing.shapes().size())) {
            try {
                return drawing.merge("star", other.name(), NEAR);
            } catch (Refusal apart) {
                assertThat(apart).hasMessageContaining("do not touch");
            }
        }
        throw new AssertionError("no piece touches the first");
    }

    @Property(tries = 300)
    void unionsAgreeWithAnotherWay(@ForAll @IntRange(max = 1_000_000) int seed) {
        Random random = new Random(seed);
        Shape one = Drawn.starShape(random, "one");
        Shape other = Drawn.starShape(random, "other");
        Drawing both = Drawing.EMPTY.with(one).with(other);
        if (PlanShape.of(one.parts()).disjoint(PlanShape.of(other.parts()))) {
            assertThatThrownBy(() -> both.merge("one", "other", NEAR)).isInstanceOf(Refusal.class);
            return;
        }
        Shape merged = both.merge("one", "other", NEAR).shape("one");
        Geometry union =
                OverlayNGRobust.overlay(PlanShape.of(one.parts()), PlanShape.of(other.parts()), OverlayNG.UNION);
        assertThat(merged.area()).isEqualTo(union.getArea(), within(ROUNDING));
        assertThat(OverlayNGRobust.overlay(union, PlanShape.of(merged.parts()), OverlayNG.SYMDIFFERENCE)
                        .getArea())
                .isLessThan(ROUNDING);
    }

    /** Sides that lie on each other, vertices on sides and rings that touch at places, straight and turned. */
    @Property(tries = 150)
    void shapesOfWholeCells(@ForAll @IntRange(max = 1_000_000) int seed) {
        Random random = new Random(seed);
        double degrees = seed % 2 == 0 ? 0 : 360 * random.nextDouble();
        Drawing cells = Drawing.EMPTY;
        double area = 0;
        for (int i = 0; i < 5; i++) {
            for (int j = 0; j < 5; j++) {
                if (random.nextInt(100) < 65) {
                    String name = cells.freeName("cell");
                    cells = cells.with(Shape.of(name, turned(Drawn.box(i, j, i + 1, j + 1), degrees)));
                    area++;
                }
            }
        }
        Drawing merged = cells;
        for (Shape cell : cells.shapes()) {
            merged = mergeAny(merged, cell.name());
        }
        assertThat(area(merged)).isEqualTo(area, within(ROUNDING));
        for (Shape shape : merged.shapes()) {
            assertThat(shape.flaw()).isEmpty();
            List<Place> line = turned(Drawn.outline(-1, random.nextInt(6), 2.5, random.nextInt(6), 7, -1), degrees)
                    .places();
            assertThat(area(splitOrNot(Drawing.EMPTY.with(shape), line))).isEqualTo(shape.area(), within(ROUNDING));
        }
    }

    private static Outline turned(Outline outline, double degrees) {
        Grid frame = new Grid(Axis.even(500_000, 1, 1), Axis.even(5_200_000, 1, 1), degrees, 1);
        return Outline.through(outline.places().stream()
                .map(place -> new Place(frame.mapX(place.x(), place.y()), frame.mapY(place.x(), place.y())))
                .toList());
    }

    private static Drawing mergeAny(Drawing drawing, String name) {
        for (Shape other : drawing.shapes()) {
            if (drawing.find(name).isPresent() && !other.name().equals(name)) {
                try {
                    return mergeAny(drawing.merge(other.name(), name, NEAR), other.name());
                } catch (Refusal apart) {
                    assertThat(apart).hasMessageContaining("do not touch");
                }
            }
        }
        return drawing;
    }

    private static Drawing splitOrNot(Drawing drawing, List<Place> line) {
        try {
            return drawing.split(drawing.shapes().get(0).name(), line, NEAR);
        } catch (Refusal uncut) {
            assertThat(uncut).hasMessageContaining("does not cut");
            return drawing;
        }
    }

    private static Drawing cut(Shape whole, Random random) {
        List<Place> line = new ArrayList<>();
        double y = 5_200_050 + 60 * (random.nextDouble() - 0.5);
        for (double x = 499_800; x <= 500_320; x += 20 + 200 * random.nextDouble()) {
            line.add(new Place(x, y + 40 * (random.nextDouble() - 0.5)));
        }
        line.add(new Place(500_400, y));
        LineString drawn = PlanShape.FACTORY.createLineString(
                line.stream().map(Place::coordinate).toArray(Coordinate[]::new));
        Assume.that(drawn.intersects(PlanShape.of(whole.parts())));
        return Drawing.EMPTY.with(whole).split("star", line, NEAR);
    }

    private static double area(Drawing drawing) {
        return drawing.shapes().stream().mapToDouble(Shape::area).sum();
    }

    private static double boundaryLength(Shape shape) {
        double length = 0;
        for (Outline outline : shape.outlines().values()) {
            for (int i = 0; i < outline.size(); i++) {
                if (outline.corners().get(i).boundary().isPresent()) {
                    length += outline.place(i).distance(outline.place(i + 1));
                }
            }
        }
        return length;
    }

    private static Set<Place> vertices(Shape shape) {
        return shape.outlines().values().stream()
                .flatMap(outline -> outline.places().stream())
                .collect(Collectors.toCollection(HashSet::new));
    }
}
