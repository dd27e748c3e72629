package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;
import org.seepledger.picture.Profile.Column;
import org.seepledger.picture.Profile.Stretch;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.VerticalRange;
import org.seepledger.sketch.Place;

/**
 * What a section cuts out of a prism: slabs that each lie in one cell.
 *
 * @param name the prism's name
 * @param slabs from the line's beginning to its end
 */
public record Body(String name, List<Slab> slabs) {

    /** Copies the list. */
    public Body {
        slabs = List.copyOf(slabs);
    }

    /**
     * A part of the body.
     *
     * @param from how far along the line it begins, in length units
     * @param to where it ends
     * @param top its upper elevation
     * @param bottom its lower elevation; the same where all layers of the prism's range have no thickness
     */
    public record Slab(double from, double to, double top, double bottom) {}

    /**
     * A place on the body.
     *
     * @param along how far along the line it is, in length units
     * @param slab what the body is there
     */
    public record Spot(double along, Slab slab) {}

    /**
     * {@return a place in what is seen of the body, if any of it is}
     *
     * @param frame which part of the section is seen
     * @param share how far from its beginning to its end, from 0 to 1
     */
    public Optional<Spot> spot(SectionFrame frame, double share) {
        List<Slab> seen = slabs.stream()
                .filter(slab -> slab.to() > frame.from() && slab.from() < frame.to())
                .toList();
        if (seen.isEmpty()) {
            return Optional.empty();
        }
        double from = Math.max(seen.get(0).from(), frame.from());
        double to = Math.min(seen.get(seen.size() - 1).to(), frame.to());
        double wanted = from + share * (to - from);
        Slab slab =
                seen.stream().filter(each -> each.to() >= wanted).findFirst().orElseThrow();
        return Optional.of(new Spot(Math.max(slab.from(), wanted), slab));
    }

    /**
     * {@return what a section cuts out of a prism}
     *
     * @param prism the prism
     * @param profile the aquifer along the section's line
     */
    public static Body of(Prism prism, Profile profile) {
        List<Slab> slabs = new ArrayList<>();
        List<double[]> spans = spans(prism, profile);
        int first = 0;
        for (Stretch stretch : profile.stretches()) {
            while (first < spans.size() && spans.get(first)[1] <= stretch.from()) {
                first++;
            }
            for (int i = first; i < spans.size() && spans.get(i)[0] < stretch.to(); i++) {
                double from = Math.max(stretch.from(), spans.get(i)[0]);
                double to = Math.min(stretch.to(), spans.get(i)[1]);
                slab(prism.range(), stretch.column(), from, to).ifPresent(slabs::add);
            }
        }
        return new Body(prism.name(), slabs);
    }

    private static Optional<Slab> slab(VerticalRange range, Column column, double from, double to) {
        double[] surfaces = column.surfaces();
        if (range instanceof VerticalRange.Layers layers) {
            double top = surfaces[layers.first()];
            double bottom = surfaces[layers.last() + 1];
            return top >= bottom ? Optional.of(new Slab(from, to, top, bottom)) : Optional.empty();
        }
        VerticalRange.Elevations between = (VerticalRange.Elevations) range;
        double top = Math.min(read(between.top(), column, surfaces[0]), surfaces[0]);
        double lowest = surfaces[surfaces.length - 1];
        double bottom = Math.max(read(between.bottom(), column, lowest), lowest);
        return top > bottom ? Optional.of(new Slab(from, to, top, bottom)) : Optional.empty();
    }

    private static double read(Optional<GriddedValues> surface, Column column, double without) {
        double[] target = {without};
        surface.ifPresent(values -> values.read(0, 0, new Window(column.row(), column.column(), 1, 1), target, 0));
        return target[0];
    }

    /** Where the line runs inside the prism: from and to, in length units. */
    private static List<double[]> spans(Prism prism, Profile profile) {
        TreeSet<Double> ends = new TreeSet<>();
        for (SectionLine.Leg leg : profile.line().legs()) {
            for (Ring ring : prism.rings()) {
                for (int i = 0; i < ring.sides().size(); i++) {
                    addCrossing(ends, leg, ring.sides().get(i), ring.after(i));
                }
            }
            ends.add(leg.begin() + leg.length());
        }
        List<double[]> spans = new ArrayList<>();
        double from = 0;
        for (double to : ends) {
            Place middle = profile.line().at((from + to) / 2);
            if (isInside(prism, middle.x(), middle.y())) {
                spans.add(new double[] {from * profile.planUnit(), to * profile.planUnit()});
            }
            from = to;
        }
        return spans;
    }

    private static void addCrossing(TreeSet<Double> ends, SectionLine.Leg leg, Side from, Side to) {
        double wayX = leg.to().x() - leg.from().x();
        double wayY = leg.to().y() - leg.from().y();
        double before = wayX * (from.y() - leg.from().y())
                - wayY * (from.x() - leg.from().x());
        double after =
                wayX * (to.y() - leg.from().y()) - wayY * (to.x() - leg.from().x());
        if (before > 0 != after > 0) {
            double part = before / (before - after);
            double x = from.x() + part * (to.x() - from.x()) - leg.from().x();
            double y = from.y() + part * (to.y() - from.y()) - leg.from().y();
            double share = (x * wayX + y * wayY) / (wayX * wayX + wayY * wayY);
            if (share > 0 && share < 1) {
                ends.add(leg.begin() + share * leg.length());
            }
        }
    }

    /** Whether a ray to the east crosses the rings an odd number of times. */
    private static boolean isInside(Prism prism, double x, double y) {
        boolean inside = false;
        for (Ring ring : prism.rings()) {
            for (int i = 0; i < ring.sides().size(); i++) {
                Side from = ring.sides().get(i);
                Side to = ring.after(i);
                boolean spans = from.y() > y != to.y() > y;
                inside ^= spans && x < from.x() + (y - from.y()) / (to.y() - from.y()) * (to.x() - from.x());
            }
        }
        return inside;
    }
}
