package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;

/**
 * The prisms that a person has drawn, in their order. Every edit is a new drawing; what it leaves alone is shared.
 *
 * @param shapes the shapes, whose names differ; later ones lie on top
 */
public record Drawing(List<Shape> shapes) {

    /** A drawing without shapes. */
    public static final Drawing EMPTY = new Drawing(List.of());

    /** Refuses two shapes of one name. */
    public Drawing {
        shapes = List.copyOf(shapes);
        Set<String> names = new HashSet<>();
        for (Shape shape : shapes) {
            if (!names.add(shape.name())) {
                throw new Refusal("There is a prism \"" + shape.name() + "\" already.");
            }
        }
    }

    /** {@return the surfaces that its shapes name, each once} */
    public Set<Limit.Surface> surfaces() {
        return shapes.stream()
                .flatMap(shape -> shape.reach().surfaces().stream())
                .collect(Collectors.toCollection(LinkedHashSet::new));
    }

    /**
     * {@return the shape of a name, if there is one}
     *
     * @param name the name
     */
    public Optional<Shape> find(String name) {
        return shapes.stream().filter(shape -> shape.name().equals(name)).findFirst();
    }

    /**
     * {@return the shape of a name}
     *
     * @param name the name
     * @throws Refusal if there is none
     */
    public Shape shape(String name) {
        return find(name).orElseThrow(() -> new Refusal("There is no prism \"" + name + "\"."));
    }

    /**
     * {@return a ring}
     *
     * @param ring which one
     * @throws Refusal if there is no such shape
     * @throws IndexOutOfBoundsException if the shape has no such ring
     */
    public Outline outline(RingAt ring) {
        return shape(ring.shape()).parts().get(ring.part() - 1).outline(ring.island());
    }

    /**
     * {@return all rings, each with where it belongs, in the order of the shapes}
     */
    public Map<RingAt, Outline> outlines() {
        Map<RingAt, Outline> outlines = new LinkedHashMap<>();
        shapes.forEach(shape -> outlines.putAll(shape.outlines()));
        return outlines;
    }

    /**
     * {@return the name itself where no shape has it, else the name with the first free number from 2}
     *
     * @param name the name
     */
    public String freeName(String name) {
        String free = name;
        for (int number = 2; find(free).isPresent(); number++) {
            free = name + " " + number;
        }
        return free;
    }

    /**
     * {@return the drawing with another shape on top}
     *
     * @param shape the shape
     * @throws Refusal if its name is taken
     */
    public Drawing with(Shape shape) {
        return changed(list -> list.add(shape));
    }

    /**
     * {@return the drawing without a shape}
     *
     * @param name its name
     * @throws Refusal if there is none
     */
    public Drawing without(String name) {
        Shape gone = shape(name);
        return changed(list -> list.remove(gone));
    }

    /**
     * {@return the drawing with a shape under another name}
     *
     * @param name its name
     * @param other the other
     * @throws Refusal if the other is taken, or no prism may have it
     */
    public Drawing rename(String name, String other) {
        return edit(name, shape -> shape.named(other));
    }

    /**
     * {@return the drawing with a shape at another place in the order}
     *
     * @param name its name
     * @param index the place, from 0
     * @throws Refusal if there is no such shape
     */
    public Drawing reorder(String name, int index) {
        Shape moved = shape(name);
        return changed(list -> {
            list.remove(moved);
            list.add(index, moved);
        });
    }

    /**
     * {@return the drawing with one shape changed}
     *
     * @param name its name
     * @param change gives the shape that takes its place
     * @throws Refusal if there is no such shape, or the change is refused
     */
    public Drawing edit(String name, UnaryOperator<Shape> change) {
        Shape before = shape(name);
        return changed(list -> list.set(list.indexOf(before), change.apply(before)));
    }

    /**
     * {@return the drawing with one ring changed}
     *
     * @param ring the ring
     * @param change gives the outline that takes its place
     * @throws Refusal if there is no such shape, or the change is refused
     */
    public Drawing edit(RingAt ring, UnaryOperator<Outline> change) {
        return edit(ring.shape(), shape -> shape.edit(ring, change));
    }

    /**
     * {@return the drawing with every vertex that lies at a place moved to another, so that what prisms share stays
     * shared}
     *
     * @param from the place
     * @param to the other
     * @throws Refusal if a ring would keep fewer than three vertices
     */
    public Drawing move(Place from, Place to) {
        return changed(list ->
                list.replaceAll(shape -> shape.touches(from) ? shape.map(outline -> outline.moved(from, to)) : shape));
    }

    /**
     * {@return the drawing with a shape cut along a line, as {@link Split} says: the largest piece keeps the name and
     * place, the others follow it under its name with a number}
     *
     * @param name the shape's name
     * @param line the line, at least two places
     * @param near how near a side or vertex the line counts as on it, in plan units
     * @throws Refusal if the line does not cut it in two
     */
    public Drawing split(String name, List<Place> line, double near) {
        Shape before = shape(name);
        List<List<Part>> pieces = new Split(line, near).of(before);
        Drawing drawing = edit(name, shape -> shape.madeOf(pieces.get(0)));
        int index = shapes.indexOf(before);
        for (List<Part> piece : pieces.subList(1, pieces.size())) {
            Shape next = before.madeOf(piece).named(drawing.freeName(name));
            index++;
            drawing = drawing.with(next).reorder(next.name(), index);
        }
        return drawing;
    }

    /**
     * {@return the drawing with two shapes made one, as {@link Merge} says, which has the name and place of the first}
     *
     * @param name the first shape's name
     * @param other the name of the one that goes into it
     * @param near how near two sides or vertices count as one, in plan units
     * @throws Refusal if they do not touch along a side, or reach differently up and down
     */
    public Drawing merge(String name, String other, double near) {
        Shape merged = new Merge(near).of(shape(name), shape(other));
        return edit(name, shape -> merged).without(other);
    }

    private Drawing changed(Consumer<List<Shape>> change) {
        List<Shape> list = new ArrayList<>(shapes);
        change.accept(list);
        return new Drawing(list);
    }
}
