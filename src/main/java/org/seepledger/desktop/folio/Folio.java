package org.seepledger.desktop.folio;

import java.util.List;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import org.seepledger.desktop.action.Action;
import org.seepledger.desktop.budget.FaceFeed;
import org.seepledger.desktop.budget.LiveBudget;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.chart.ChartModel;
import org.seepledger.desktop.chart.ChartView;
import org.seepledger.desktop.closure.ClosureModel;
import org.seepledger.desktop.closure.ClosureView;
import org.seepledger.desktop.exchange.ExchangeModel;
import org.seepledger.desktop.exchange.ExchangeView;
import org.seepledger.desktop.ledger.LedgerModel;
import org.seepledger.desktop.ledger.LedgerView;
import org.seepledger.desktop.origin.OriginModel;
import org.seepledger.desktop.origin.OriginView;
import org.seepledger.desktop.port.CopyBoard;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.solute.LivePlume;
import org.seepledger.desktop.solute.MassReading;
import org.seepledger.desktop.solute.SoluteLook;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.Words;

/** All panes of the budget, on one live budget and one reading of figures. */
public final class Folio {

    private static final int ORIGIN = 3;

    private final BorderPane pages = new BorderPane();
    private final ToggleGroup chosen = new ToggleGroup();
    private final HBox marks = new HBox();
    private final Reading reading;
    private final LiveBudget live;
    private final LivePlume plumes;
    private final Session session;
    private final LedgerModel ledger;
    private final ChartView ribbon;

    /**
     * Builds the panes.
     *
     * @param session what the window looks at
     * @param tasks where work is done
     * @param dialogs asks for files
     * @param copies where copies go
     * @param theme light or dark
     */
    public Folio(Session session, Tasks tasks, FileDialogs dialogs, CopyBoard copies, ObservableValue<Theme> theme) {
        this.session = session;
        this.reading = new Reading(session);
        this.live = new LiveBudget(session, tasks);
        new FaceFeed(session, live, reading).begin();
        SoluteLook look = new SoluteLook(session);
        this.plumes = new LivePlume(session, look, tasks);
        MassReading masses = new MassReading(session, reading);
        this.ledger = new LedgerModel(session, live, reading, plumes, masses, copies);
        pages.setId("folio");
        pages.getStyleClass().add("sl-folio");
        marks.getStyleClass().add("sl-marks");
        marks.setId("folio-marks");
        add("folio.ledger", new LedgerView(ledger));
        add("folio.answers", new ClosureView(new ClosureModel(session, live, reading, tasks), theme));
        add("folio.exchange", new ExchangeView(new ExchangeModel(session, live, reading, copies), theme));
        // Before the model, which takes the question away.
        session.asked().addListener((asked, before, after) -> after.ifPresent(row -> open(ORIGIN)));
        add("folio.origin", new OriginView(new OriginModel(session, reading, masses, look, tasks, dialogs, copies)));
        marks.getChildren().add(new SubjectBox(session));
        pages.setTop(marks);
        chosen.selectToggle(chosen.getToggles().get(0));
        this.ribbon = new ChartView(new ChartModel(session, live, reading), theme);
    }

    private void add(String words, Node page) {
        ToggleButton mark = new ToggleButton(Words.of(words));
        mark.setId(words.replace('.', '-'));
        mark.getStyleClass().add("sl-mark-page");
        mark.setToggleGroup(chosen);
        mark.selectedProperty().addListener((selected, before, after) -> {
            if (after) {
                pages.setCenter(page);
            }
        });
        // A page is always open: a second press on its mark does not close it.
        mark.addEventFilter(javafx.scene.input.MouseEvent.MOUSE_RELEASED, release -> {
            if (mark.isSelected()) {
                release.consume();
                mark.disarm();
            }
        });
        marks.getChildren().add(mark);
    }

    /** {@return the pages beside the map} */
    public Node pages() {
        return pages;
    }

    /** {@return the ribbon of time} */
    public Shelf.Page ribbon() {
        return new Shelf.Page("shelf.time", ribbon.bar(), ribbon);
    }

    /** {@return how figures are read} */
    public Reading reading() {
        return reading;
    }

    /** Works out again what was stopped or failed. */
    public void again() {
        live.again();
        plumes.again();
    }

    /** {@return what can be done here} */
    public List<Action> actions() {
        String group = "actions.group.budget";
        return List.of(
                new Action(group, "action.page.ledger", "Shortcut+1", () -> open(0)),
                new Action(group, "action.page.answers", "Shortcut+2", () -> open(1)),
                new Action(group, "action.page.exchange", "Shortcut+3", () -> open(2)),
                new Action(group, "action.page.origin", "Shortcut+4", () -> open(ORIGIN)),
                new Action(group, "action.ledger.origin", "Shortcut+T", ledger::askOrigin),
                new Action(group, "action.subject", "Shortcut+Shift+U", () -> SubjectBox.next(session)),
                new Action(group, "action.ledger.copy", "Shortcut+Shift+C", ledger::copy),
                new Action(
                        group,
                        "action.ledger.volumes",
                        "Shortcut+Shift+V",
                        () -> ledger.reading()
                                .volumes()
                                .set(!ledger.reading().volumes().get())));
    }

    private void open(int page) {
        chosen.selectToggle(chosen.getToggles().get(page));
    }
}
