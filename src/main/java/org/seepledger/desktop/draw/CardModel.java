package org.seepledger.desktop.draw;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.seepledger.desktop.words.Words;
import org.seepledger.sketch.Buffer;
import org.seepledger.sketch.Lid;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Reach;
import org.seepledger.sketch.Refusal;
import org.seepledger.sketch.Shape;

/** Turns what is typed of the selected prism into steps. */
final class CardModel {

    private static final Pattern LAYERS = Pattern.compile("\\s*(\\d{1,6})\\s*(?:(?:-|–|to)\\s*(\\d{1,6}))?\\s*");

    private final DraftModel model;
    private final LidSurfaces surfaces;

    CardModel(DraftModel model, LidSurfaces surfaces) {
        this.model = model;
        this.surfaces = surfaces;
    }

    void rename(String name) {
        String next = name.strip();
        model.selected().filter(shape -> !shape.name().equals(next)).ifPresent(shape -> {
            model.session().selected().set(next);
            if (!model.step("step.rename", drawing -> drawing.rename(shape.name(), next))) {
                model.session().selected().set(shape.name());
            }
        });
    }

    void note(String note) {
        change("step.note", shape -> shape.noted(note.strip()));
    }

    /** Layers as {@code 2} or {@code 1 to 3}; nothing for all. */
    void layers(String text) {
        change("step.reach", shape -> shape.reaching(reach(text)));
    }

    private Reach reach(String text) {
        if (text.isBlank()) {
            return new Reach.Whole();
        }
        Matcher typed = LAYERS.matcher(text);
        if (!typed.matches()) {
            throw new Refusal(Words.of("card.layers.form"));
        }
        int first = Integer.parseInt(typed.group(1));
        int last = typed.group(2) == null ? first : Integer.parseInt(typed.group(2));
        int count = count();
        if (first < 1 || last < first || last > count) {
            throw new Refusal(Words.of("card.layers.range", count));
        }
        return new Reach.Layers(first - 1, last - 1);
    }

    private int count() {
        return model.session()
                .set()
                .get()
                .map(set -> set.aquifer().layers().size())
                .orElse(1);
    }

    /**
     * Elevations, layers or surfaces of top and bottom; nothing for the grid's own. A surface that is not known yet is
     * read first.
     */
    void lids(String top, String bottom) {
        Optional<Limit> upper = lid(top);
        Optional<Limit> lower = lid(bottom);
        Optional<Limit.Surface> unread = Stream.of(upper, lower)
                .flatMap(Optional::stream)
                .filter(Limit.Surface.class::isInstance)
                .map(Limit.Surface.class::cast)
                .filter(surface -> !model.solids().knows(surface))
                .findFirst();
        if (unread.isPresent()) {
            surfaces.read(unread.get(), () -> lids(top, bottom));
        } else if (upper.isEmpty() && lower.isEmpty()) {
            change(
                    "step.reach",
                    shape -> shape.reach() instanceof Reach.Between ? shape.reaching(new Reach.Whole()) : shape);
        } else {
            change("step.reach", shape -> shape.reaching(new Reach.Between(upper, lower)));
        }
    }

    private Optional<Limit> lid(String text) {
        if (text.isBlank()) {
            return Optional.empty();
        }
        Optional<Limit> typed = Lid.typed(text);
        if (typed.isPresent() && typed.get() instanceof Limit.Layer layer && layer.index() >= count()) {
            throw new Refusal(Words.of("card.layers.range", count()));
        }
        return typed.or(() -> Optional.of(new Limit.Surface(text.strip())));
    }

    private static OptionalDouble number(String text) {
        try {
            return OptionalDouble.of(Double.parseDouble(text.strip().replace('−', '-')));
        } catch (NumberFormatException e) {
            return OptionalDouble.empty();
        }
    }

    void chooseTop(String bottom) {
        surfaces.choose(path -> lids(path, bottom));
    }

    void chooseBottom(String top) {
        surfaces.choose(path -> lids(top, path));
    }

    /** Makes a new prism of all within a distance of the selected one, or of what is farther than that from its sides. */
    boolean buffer(String text) {
        Optional<Shape> shape = model.selected();
        OptionalDouble distance = number(text);
        if (shape.isEmpty() || distance.isEmpty()) {
            model.refuse(Words.of(shape.isEmpty() ? "tool.needs" : "buffer.number"));
            return false;
        }
        String name =
                model.drawing().freeName(Words.of("buffer.name", shape.get().name()));
        boolean made = model.step(
                "step.buffer",
                drawing ->
                        drawing.with(shape.get().named(name).madeOf(Buffer.of(shape.get(), distance.getAsDouble()))));
        if (made) {
            model.session().selected().set(name);
        }
        return made;
    }

    void reorder(int by) {
        model.selected().ifPresent(shape -> {
            int place = model.drawing().shapes().indexOf(shape) + by;
            if (place >= 0 && place < model.drawing().shapes().size()) {
                model.step("step.order", drawing -> drawing.reorder(shape.name(), place));
            }
        });
    }

    void delete() {
        model.selected().ifPresent(shape -> model.step("step.delete", drawing -> drawing.without(shape.name())));
    }

    private void change(String step, Function<Shape, Shape> change) {
        model.selected().ifPresent(shape -> model.step(step, drawing -> drawing.edit(shape.name(), change::apply)));
    }

    String layersText() {
        return model.selected()
                .map(Shape::reach)
                .filter(Reach.Layers.class::isInstance)
                .map(Reach.Layers.class::cast)
                .map(stack -> stack.first() == stack.last()
                        ? Integer.toString(stack.first() + 1)
                        : stack.first() + 1 + " to " + (stack.last() + 1))
                .orElse("");
    }

    String topText() {
        return lidText(Reach.Between::top);
    }

    String bottomText() {
        return lidText(Reach.Between::bottom);
    }

    private String lidText(Function<Reach.Between, Optional<Limit>> lid) {
        return model.selected()
                .map(Shape::reach)
                .filter(Reach.Between.class::isInstance)
                .map(Reach.Between.class::cast)
                .flatMap(lid)
                .map(Lid::text)
                .orElse("");
    }
}
