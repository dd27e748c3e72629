package org.seepledger.desktop.shell;

import java.util.Optional;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleBooleanProperty;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.theme.Theme;

/** Which page and which theme the window shows, and how to go from one interval and layer to the next. */
public final class ShellModel {

    private final Session session;
    private final BooleanProperty atWelcome = new SimpleBooleanProperty(true);
    private final ObjectProperty<Theme> theme;

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param theme light or dark
     */
    public ShellModel(Session session, ObjectProperty<Theme> theme) {
        this.session = session;
        this.theme = theme;
        session.set().addListener((set, before, after) -> atWelcome.set(after.isEmpty()));
    }

    /** {@return what the window looks at} */
    public Session session() {
        return session;
    }

    /** {@return whether the welcome page is shown, rather than the open set} */
    public BooleanProperty atWelcome() {
        return atWelcome;
    }

    /** Goes to the welcome page and back. */
    public void turnPage() {
        atWelcome.set(!atWelcome.get() || session.set().get().isEmpty());
    }

    /** {@return the theme} */
    public ObjectProperty<Theme> theme() {
        return theme;
    }

    /** Switches between light and dark. */
    public void switchTheme() {
        theme.set(theme.get().other());
    }

    /**
     * Goes forward or back in time.
     *
     * @param intervals by how many intervals
     */
    public void move(int intervals) {
        session.set().get().ifPresent(set -> {
            int last = set.aquifer().times().intervals() - 1;
            session.interval().set(Math.max(0, Math.min(last, session.interval().get() + intervals)));
        });
    }

    /**
     * Goes down or up.
     *
     * @param layers by how many layers, down positive
     */
    public void sink(int layers) {
        session.set().get().ifPresent(set -> {
            int last = set.aquifer().layers().size() - 1;
            session.layer().set(Math.max(0, Math.min(last, session.layer().get() + layers)));
        });
    }

    /** {@return the open set's name, if one is open} */
    public Optional<String> name() {
        return session.set().get().map(OpenSet::aquifer).map(aquifer -> aquifer.name());
    }
}
