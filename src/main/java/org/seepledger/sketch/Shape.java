package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.SideNumbering;

/**
 * A prism as it was drawn and typed.
 *
 * @param name its name
 * @param note what the user has to say about it, perhaps nothing
 * @param parts its polygons, at least one
 * @param byPart whether the names of its sides tell the part, as they must where there are several
 * @param reach how far it reaches up and down
 * @param others properties of other programs that came with an imported file, as JSON texts by name; kept for the way back
 */
public record Shape(
        String name, String note, List<Part> parts, boolean byPart, Reach reach, Map<String, String> others) {

    /** Refuses a name that no prism may have. */
    public Shape {
        Names.checkPrism(name);
        parts = List.copyOf(parts);
        if (parts.isEmpty()) {
            throw new Refusal("A prism keeps at least one ring; delete the prism itself.");
        }
        byPart |= parts.size() > 1;
        others = Collections.unmodifiableMap(new LinkedHashMap<>(others));
    }

    /**
     * {@return a new shape through all layers}
     *
     * @param name its name
     * @param outer its outer ring
     */
    public static Shape of(String name, Outline outer) {
        return new Shape(name, "", List.of(Part.of(outer)), false, new Reach.Whole(), Map.of());
    }

    /**
     * {@return the shape that numbered rings are drawn as}
     *
     * @param name its name
     * @param rings the outer ring of each part, each followed by its islands; sides that clipping made become sides like
     *     others
     * @param byPart whether the sides' names tell the part
     * @param reach how far it reaches up and down
     */
    public static Shape of(String name, List<Ring> rings, boolean byPart, Reach reach) {
        List<Part> parts = new ArrayList<>();
        for (Ring ring : rings) {
            Outline outline = Outline.of(ring);
            if (ring.island() == 0) {
                parts.add(Part.of(outline));
            } else {
                parts.set(parts.size() - 1, parts.get(parts.size() - 1).with(outline));
            }
        }
        return new Shape(name, "", parts, byPart, reach, Map.of());
    }

    /**
     * {@return the prism as a budget takes it}
     *
     * @param layers how many layers the grid has
     * @param surfaces gives the surfaces that the shape names
     * @throws Refusal if the grid has no such layer
     */
    public Prism prism(int layers, Surfaces surfaces) {
        return new Prism(name, rings(), reach.on(layers, surfaces));
    }

    /**
     * {@return the rings as prisms have them, with the names of sides that a budget shows}
     */
    public List<Ring> rings() {
        SideNumbering numbering = new SideNumbering(byPart);
        List<Ring> rings = new ArrayList<>();
        for (int part = 1; part <= parts.size(); part++) {
            List<Outline> outlines = parts.get(part - 1).outlines();
            for (int island = 0; island < outlines.size(); island++) {
                rings.add(outlines.get(island).ring(part, island, numbering));
            }
        }
        return rings;
    }

    /**
     * {@return the rings, each with where it belongs, in the order of parts and islands}
     */
    public Map<RingAt, Outline> outlines() {
        Map<RingAt, Outline> outlines = new LinkedHashMap<>();
        for (int part = 1; part <= parts.size(); part++) {
            List<Outline> rings = parts.get(part - 1).outlines();
            for (int island = 0; island < rings.size(); island++) {
                outlines.put(new RingAt(name, part, island), rings.get(island));
            }
        }
        return outlines;
    }

    /**
     * {@return the shape under another name}
     *
     * @param other the name
     * @throws Refusal if no prism may have it
     */
    public Shape named(String other) {
        return new Shape(other, note, parts, byPart, reach, others);
    }

    /**
     * {@return the shape with another note}
     *
     * @param other the note
     */
    public Shape noted(String other) {
        return new Shape(name, other, parts, byPart, reach, others);
    }

    /**
     * {@return the shape that reaches elsewhere up and down}
     *
     * @param other how far
     */
    public Shape reaching(Reach other) {
        return new Shape(name, note, parts, byPart, other, others);
    }

    /**
     * {@return the shape with properties of other programs}
     *
     * @param other JSON texts by name
     */
    public Shape keeping(Map<String, String> other) {
        return new Shape(name, note, parts, byPart, reach, other);
    }

    /**
     * {@return the shape made of other polygons}
     *
     * @param other the polygons, at least one
     */
    public Shape madeOf(List<Part> other) {
        return new Shape(name, note, other, byPart, reach, others);
    }

    /**
     * {@return the shape moved as a whole}
     *
     * @param dx how far along x, in plan units
     * @param dy how far along y
     */
    public Shape moved(double dx, double dy) {
        return map(outline -> outline.moved(dx, dy));
    }

    /**
     * {@return the shape with one part moved, its islands too}
     *
     * @param part the number of the part, from 1
     * @param dx how far along x, in plan units
     * @param dy how far along y
     */
    public Shape moved(int part, double dx, double dy) {
        return edit(part, polygon -> polygon.map(outline -> outline.moved(dx, dy)));
    }

    /**
     * {@return the shape with another polygon}
     *
     * @param polygon the polygon, which becomes its last part
     */
    public Shape with(Part polygon) {
        List<Part> more = new ArrayList<>(parts);
        more.add(polygon);
        return madeOf(more);
    }

    /**
     * {@return the shape with an island in the part that it lies in}
     *
     * @param island the ring to be left out
     * @throws Refusal if no part holds it whole, or either crosses itself
     */
    public Shape with(Outline island) {
        sound();
        Shape.of(name, island).sound();
        for (int part = 1; part <= parts.size(); part++) {
            if (PlanShape.polygon(parts.get(part - 1)).covers(PlanShape.polygon(Part.of(island)))) {
                return edit(part, polygon -> polygon.with(island));
            }
        }
        throw new Refusal("An island lies inside the prism.");
    }

    /**
     * {@return the shape without a ring: an island, or a part with its islands}
     *
     * @param ring the ring
     * @throws Refusal if it is all that there is
     */
    public Shape without(RingAt ring) {
        if (ring.island() > 0) {
            return edit(ring.part(), polygon -> polygon.without(ring.island()));
        }
        List<Part> fewer = new ArrayList<>(parts);
        fewer.remove(ring.part() - 1);
        return madeOf(fewer);
    }

    /**
     * {@return the shape with a boundary under another name, or dissolved}
     *
     * @param boundary the boundary's name
     * @param other the other name; empty to let its sides count under their own
     */
    public Shape boundary(String boundary, Optional<String> other) {
        return map(outline -> outline.renamed(boundary, other));
    }

    /**
     * {@return what a budget would refuse about its polygons, the first thing found}
     */
    public Optional<Flaw> flaw() {
        return PolygonCheck.first(parts.stream()
                .map(part -> part.outlines().stream().map(Outline::closed).toList())
                .toList());
    }

    /** Refuses what is no polygon. */
    Shape sound() {
        flaw().ifPresent(flaw -> {
            throw new Refusal(flaw.sentence());
        });
        return this;
    }

    /**
     * {@return the plan area in plan units squared, islands taken out}
     */
    public double area() {
        return parts.stream()
                .mapToDouble(part -> PlanShape.polygon(part).getArea())
                .sum();
    }

    /** {@return whether a vertex lies at a place} */
    boolean touches(Place place) {
        return outlines().values().stream()
                .flatMap(outline -> outline.corners().stream())
                .anyMatch(corner -> corner.place().equals(place));
    }

    /** {@return the shape with one ring changed} */
    Shape edit(RingAt ring, UnaryOperator<Outline> change) {
        return edit(ring.part(), polygon -> polygon.edit(ring.island(), change));
    }

    /** {@return the shape with every ring changed} */
    Shape map(UnaryOperator<Outline> change) {
        return madeOf(parts.stream().map(part -> part.map(change)).toList());
    }

    private Shape edit(int part, UnaryOperator<Part> change) {
        List<Part> changed = new ArrayList<>(parts);
        changed.set(part - 1, change.apply(changed.get(part - 1)));
        return madeOf(changed);
    }
}
