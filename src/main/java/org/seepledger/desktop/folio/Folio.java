package org.seepledger.desktop.folio;

import java.util.List;
import javafx.beans.property.BooleanProperty;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
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
import org.seepledger.desktop.solute.MassFeed;
import org.seepledger.desktop.solute.MassReading;
import org.seepledger.desktop.solute.PlumeMapModel;
import org.seepledger.desktop.solute.SoluteAnswersModel;
import org.seepledger.desktop.solute.SoluteAnswersView;
import org.seepledger.desktop.solute.SoluteLook;
import org.seepledger.desktop.solute.SolutePanel;
import org.seepledger.desktop.solute.SolutePanelModel;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.transect.TransectModel;
import org.seepledger.desktop.transect.TransectView;
import org.seepledger.desktop.words.Words;

/** All panes of the budget, on one live budget and one reading of figures. */
public final class Folio {

    private static final int ORIGIN = 3;

    private final BorderPane pages = new BorderPane();
    private final ToggleGroup chosen = new ToggleGroup();
    private final HBox marks = new HBox();
    private final Reading reading;
    private final LiveBudget live;
    private final SoluteLook look;
    private final LivePlume plumes;
    private final Session session;
    private final PlumeMapModel plumeMap;
    private final ToggleButton transectsMark;
    private final LedgerModel ledger;
    private final TransectModel transects;
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
        this.look = new SoluteLook(session);
        this.plumes = new LivePlume(session, look, tasks);
        this.plumeMap = new PlumeMapModel(session, look, plumes, tasks);
        MassReading masses = new MassReading(session, reading);
        new MassFeed(session, plumes, masses);
        SoluteAnswersModel answers = new SoluteAnswersModel(session, live, reading, plumes, masses, look);
        this.ledger = new LedgerModel(session, live, reading, plumes, masses, copies);
        this.transects = new TransectModel(session, tasks, reading, masses, copies, dialogs);
        pages.setId("folio");
        pages.getStyleClass().add("sl-folio");
        marks.getStyleClass().add("sl-marks");
        marks.setId("folio-marks");
        add("folio.ledger", new LedgerView(ledger));
        add(
                "folio.answers",
                ofSubject(
                        new ClosureView(new ClosureModel(session, live, reading, tasks), theme),
                        new SoluteAnswersView(answers)));
        add("folio.exchange", new ExchangeView(new ExchangeModel(session, live, reading, copies), theme));
        // Before the model, which takes the question away.
        session.asked().addListener((asked, before, after) -> after.ifPresent(row -> open(ORIGIN)));
        add("folio.origin", new OriginView(new OriginModel(session, reading, masses, look, tasks, dialogs, copies)));
        this.transectsMark = add("folio.transects", new TransectView(transects));
        ofSolutes(transectsMark, transects.open());
        SolutePanelModel panel = new SolutePanelModel(session, look, plumes);
        pages.setTop(new VBox(marks, new SolutePanel(panel, new SubjectBox(session), () -> open(1))));
        chosen.selectToggle(chosen.getToggles().get(0));
        this.ribbon = new ChartView(new ChartModel(session, live, reading, plumes, masses, answers), theme);
    }

    private ToggleButton add(String words, Node page) {
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
        return mark;
    }

    /** One page for the water, and another for a solute. */
    private Node ofSubject(Node water, Node solute) {
        solute.visibleProperty().bind(session.solute().isNotEmpty());
        water.visibleProperty().bind(solute.visibleProperty().not());
        return new StackPane(water, solute);
    }

    /** {@return how solutes are looked at} */
    public SoluteLook look() {
        return look;
    }

    /** {@return what the map shows of the solute looked at} */
    public PlumeMapModel plumeMap() {
        return plumeMap;
    }

    /** A page that is there only where the set has solutes. */
    private void ofSolutes(ToggleButton mark, BooleanProperty open) {
        mark.visibleProperty().bind(session.set().map(set -> hasSolutes()));
        mark.managedProperty().bind(mark.visibleProperty());
        mark.visibleProperty().addListener((visible, before, after) -> {
            if (mark.isSelected()) {
                open(0);
            }
        });
        open.bind(mark.selectedProperty());
    }

    private boolean hasSolutes() {
        return session.set().get().filter(set -> !set.solutes().isEmpty()).isPresent();
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
        transects.again();
    }

    /** {@return what can be done here} */
    public List<Action> actions() {
        String group = "actions.group.budget";
        return List.of(
                new Action(group, "action.page.ledger", "Shortcut+1", () -> open(0)),
                new Action(group, "action.page.answers", "Shortcut+2", () -> open(1)),
                new Action(group, "action.page.exchange", "Shortcut+3", () -> open(2)),
                new Action(
                        group,
                        "action.page.transects",
                        "Shortcut+7",
                        this::hasSolutes,
                        () -> chosen.selectToggle(transectsMark)),
                new Action(group, "action.panels", "Shortcut+Shift+P", this::hasSolutes, this::openPanels),
                new Action(
                        group, "action.subject", "Shortcut+Shift+U", this::hasSolutes, () -> SubjectBox.next(session)),
                new Action(group, "action.page.origin", "Shortcut+4", () -> open(ORIGIN)),
                new Action(group, "action.ledger.origin", "Shortcut+T", ledger::askOrigin),
                new Action(group, "action.ledger.copy", "Shortcut+Shift+C", ledger::copy),
                new Action(
                        group,
                        "action.ledger.volumes",
                        "Shortcut+Shift+V",
                        () -> ledger.reading()
                                .volumes()
                                .set(!ledger.reading().volumes().get())));
    }

    private void openPanels() {
        chosen.selectToggle(transectsMark);
        transects.openPanels();
    }

    private void open(int page) {
        chosen.selectToggle(chosen.getToggles().get(page));
    }
}
