package org.seepledger.desktop.draw;

import java.util.List;
import java.util.Set;
import java.util.function.Supplier;
import java.util.stream.Collectors;
import org.seepledger.desktop.words.Words;
import org.seepledger.sketch.ControlLine;
import org.seepledger.sketch.Outline;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.Shape;

/** New prisms and transects, with the first free name; they become the selected ones. */
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

    static boolean transect(DraftModel model, List<Place> places) {
        Set<String> before =
                model.drawing().lines().stream().map(ControlLine::name).collect(Collectors.toSet());
        boolean drawn =
                model.step("step.transect", drawing -> drawing.with(new ControlLine(Words.of("transect.new"), places)));
        model.drawing().lines().stream()
                .map(ControlLine::name)
                .filter(name -> !before.contains(name))
                .forEach(model.session().transect()::set);
        return drawn;
    }
}
