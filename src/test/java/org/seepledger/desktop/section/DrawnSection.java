package org.seepledger.desktop.section;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.desktop.draw.DraftModel;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.picture.Section;
import org.seepledger.picture.SectionFrame;
import org.seepledger.picture.SectionLine;
import org.seepledger.sketch.Place;

/** A set with its prisms, drawn and ready to be cut, as view models see it. */
final class DrawnSection implements AutoCloseable {

    final Session session = new Session();
    final DraftModel draft = new DraftModel(session);
    final SectionModel model = new SectionModel(session, new DirectTasks(), draft);
    private final Opening opening;

    DrawnSection(Path folder) {
        opening = Opening.of(folder);
        session.show(Optional.of(opening.set()));
        draft.begin(
                opening.kept().drawing(),
                opening.kept().drawing(),
                Map.copyOf(opening.kept().surfaces()));
        model.resize(1000, 300);
    }

    static DrawnSection valley() {
        return new DrawnSection(Path.of("sample-aquifers/valley"));
    }

    /** Lays the line; x and y in turn. */
    void line(double... xy) {
        List<Place> places = java.util.stream.IntStream.range(0, xy.length / 2)
                .mapToObj(i -> new Place(xy[2 * i], xy[2 * i + 1]))
                .toList();
        session.sectionLine().set(Optional.of(new SectionLine(places)));
    }

    Section section() {
        return session.section().get().orElseThrow();
    }

    SectionFrame frame() {
        return model.frame().get().orElseThrow();
    }

    @Override
    public void close() {
        opening.set().close();
    }
}
