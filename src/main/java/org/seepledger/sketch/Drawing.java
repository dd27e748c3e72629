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
import java.util.function.Predicate;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;

/**
 * The prisms that a person has drawn, in their order, and the transects. Every edit is a new drawing; what it leaves alone is
 * shared.
 *
 * @param shapes the shapes, whose names differ; later ones lie on top
 * @param lines the transects, whose names differ
 */
public record Drawing(List<Shape> shapes, List<ControlLine> lines) {

    /** A drawing without shapes. */
    public static final Drawing EMPTY = new Drawing(List.of());

    /** Refuses two shapes or two transects of one name. */
    public Drawing {
        shapes = List.copyOf(shapes);
        lines = List.copyOf(lines);
        Set<String> names = new HashSet<>();
        for (Shape shape : shapes) {
            if (!names.add(shape.name())) {
                throw new Refusal("There is a prism \"" + shape.name() + "\" already.");
            }
        }
        Set<String> lineNames = new HashSet<>();
        for (ControlLine line : lines) {
            if (!lineNames.add(line.name())) {
                throw new Refusal("There is a transect \"" + line.name() + "\" already.");
            }
        }
    }

    /**
     * Makes a drawing of prisms alone.
     *
     * @param shapes the shapes, whose names differ; later ones lie on top
     */
    public Drawing(List<Shape> shapes) {
        this(shapes, List.of());
    }

    /**
     * {@return the transect of a name, if there is one}
     *
     * @param name the name
     */
    public Optional<ControlLine> line(String name) {
        return lines.stream().filter(line -> line.name().equals(name)).findFirst();
    }

    /**
     * {@return the drawing with other transects}
     *
     * @param others the transects
     * @throws Refusal if two have one name
     */
    public Drawing withLines(List<ControlLine> others) {
        return new Drawing(shapes, others);
    }

    /**
     * {@return the drawing with one more transect}
     *
     * @param line the transect; a name that is taken gets a number
     */
    public Drawing with(ControlLine line) {
        List<ControlLine> more = new ArrayList<>(lines);
        more.add(line.named(free(line.name(), name -> line(name).isPresent())));
        return withLines(more);
    }

    /**
     * {@return the drawing without a transect}
     *
     * @param name its name
     */
    public Drawing withoutLine(String name) {
        return withLines(
                lines.stream().filter(line -> !line.name().equals(name)).toList());
    }

    /**
     * {@return the drawing with one transect changed}
     *
     * @param name its name
     * @param change gives the transect that takes its place
     * @throws Refusal if the change is refused
     */
    public Drawing editLine(String name, UnaryOperator<ControlLine> change) {
        return withLines(lines.stream()
                .map(line -> line.name().equals(name) ? change.apply(line) : line)
                .toList());
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
        return free(name, taken -> find(taken).isPresent());
    }

    private static String free(String name, Predicate<String> taken) {
        String free = name;
        for (int number = 2; taken.test(free); number++) {
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
        return new Drawing(list, lines);
    }
}
