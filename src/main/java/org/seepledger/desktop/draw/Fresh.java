package org.seepledger.desktop.draw;

import java.util.function.Supplier;
import org.seepledger.desktop.words.Words;
import org.seepledger.sketch.Outline;
import org.seepledger.sketch.Shape;

/** A new prism of an outline, with the first free name; it becomes the selected one. */
final class Fresh {

    private Fresh() {}

    static boolean prism(DraftModel model, String step, Supplier<Outline> outline) {
        String name = model.drawing().freeName(Words.of("prism.new"));
        boolean drawn = model.step(step, drawing -> drawing.with(Shape.of(name, outline.get())));
        if (drawn) {
            model.session().selected().set(name);
        }
        return drawn;
    }
}
