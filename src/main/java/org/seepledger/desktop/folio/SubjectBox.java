package org.seepledger.desktop.folio;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.control.ChoiceBox;
import org.seepledger.aquifer.Solute;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.words.ChoiceWords;
import org.seepledger.desktop.words.Words;

/** Whose budget all pages show: the water's, or a solute's. Not there where the set has no solutes. */
final class SubjectBox extends ChoiceBox<String> {

    private static final double WIDTH = 136;

    private final Session session;

    SubjectBox(Session session) {
        this.session = session;
        setId("subject");
        setPrefWidth(WIDTH);
        setMinWidth(USE_PREF_SIZE);
        setConverter(new ChoiceWords<>(
                solute -> solute.isEmpty() ? Words.of("subject.water") : Words.of("subject.solute", solute)));
        valueProperty().addListener((value, before, after) -> {
            if (after != null) {
                session.solute().set(after);
            }
        });
        session.solute().addListener((solute, before, after) -> setValue(after));
        session.set().addListener((set, before, after) -> fill(after));
        managedProperty().bind(visibleProperty());
        fill(session.set().get());
    }

    private void fill(Optional<OpenSet> set) {
        List<String> all = new ArrayList<>(List.of(""));
        set.ifPresent(open -> open.solutes().stream().map(Solute::name).forEach(all::add));
        getItems().setAll(all);
        setValue(session.solute().get());
        setVisible(all.size() > 1);
    }

    /** Goes to the next subject. */
    static void next(Session session) {
        session.set().get().ifPresent(set -> {
            List<String> all = new ArrayList<>(List.of(""));
            set.solutes().stream().map(Solute::name).forEach(all::add);
            int next = (all.indexOf(session.solute().get()) + 1) % all.size();
            session.solute().set(all.get(next));
        });
    }
}
