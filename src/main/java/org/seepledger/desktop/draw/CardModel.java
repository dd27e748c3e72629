package org.seepledger.desktop.draw;

import java.util.Optional;
import java.util.function.Function;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.seepledger.desktop.words.Words;
import org.seepledger.sketch.Lid;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Reach;
import org.seepledger.sketch.Refusal;
import org.seepledger.sketch.Shape;

/** Turns what is typed of the selected prism into steps. */
final class CardModel {

    private static final Pattern LAYERS = Pattern.compile("\\s*(\\d{1,6})\\s*(?:(?:-|–|to)\\s*(\\d{1,6}))?\\s*");

    private final DraftModel model;

    CardModel(DraftModel model) {
        this.model = model;
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

    /** Elevations or layers of top and bottom; nothing for the grid's own. */
    void lids(String top, String bottom) {
        if (top.isBlank() && bottom.isBlank()) {
            change(
                    "step.reach",
                    shape -> shape.reach() instanceof Reach.Between ? shape.reaching(new Reach.Whole()) : shape);
        } else {
            change("step.reach", shape -> shape.reaching(new Reach.Between(lid(top), lid(bottom))));
        }
    }

    /** A surface can be named only where a file has brought it, since its raster must be open. */
    private Optional<Limit> lid(String text) {
        if (text.isBlank()) {
            return Optional.empty();
        }
        Optional<Limit> typed = Lid.typed(text);
        if (typed.isPresent()) {
            if (typed.get() instanceof Limit.Layer layer && layer.index() >= count()) {
                throw new Refusal(Words.of("card.layers.range", count()));
            }
            return typed;
        }
        Limit.Surface surface = new Limit.Surface(text.strip());
        if (!model.knows(surface)) {
            throw new Refusal(Words.of("card.lid.form"));
        }
        return Optional.of(surface);
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
