package org.seepledger.desktop.folio;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.geometry.Pos;
import javafx.scene.control.ChoiceBox;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.util.StringConverter;
import org.seepledger.aquifer.Solute;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.words.Words;

/** Whose budget all pages show: the water's, or a solute's. Not there where the set has no solutes. */
final class SubjectBox extends HBox {

    private static final double WIDTH = 136;

    private final Session session;
    private final ChoiceBox<String> subjects = new ChoiceBox<>();

    SubjectBox(Session session) {
        this.session = session;
        subjects.setId("subject");
        subjects.setPrefWidth(WIDTH);
        subjects.setMinWidth(USE_PREF_SIZE);
        subjects.setConverter(new StringConverter<>() {
            @Override
            public String toString(String solute) {
                return solute == null || solute.isEmpty()
                        ? Words.of("subject.water")
                        : Words.of("subject.solute", solute);
            }

            @Override
            public String fromString(String text) {
                throw new UnsupportedOperationException();
            }
        });
        subjects.valueProperty().addListener((value, before, after) -> {
            if (after != null) {
                session.solute().set(after);
            }
        });
        session.solute().addListener((solute, before, after) -> subjects.setValue(after));
        session.set().addListener((set, before, after) -> fill(after));
        setAlignment(Pos.CENTER_RIGHT);
        setHgrow(this, Priority.ALWAYS);
        getChildren().add(subjects);
        managedProperty().bind(visibleProperty());
        fill(session.set().get());
    }

    private void fill(Optional<OpenSet> set) {
        List<String> all = new ArrayList<>(List.of(""));
        set.ifPresent(open -> open.solutes().stream().map(Solute::name).forEach(all::add));
        subjects.getItems().setAll(all);
        subjects.setValue(session.solute().get());
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
