package org.seepledger.desktop;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.layout.StackPane;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.desktop.action.Action;
import org.seepledger.desktop.action.Actions;
import org.seepledger.desktop.draw.DraftActions;
import org.seepledger.desktop.draw.DraftFiles;
import org.seepledger.desktop.draw.DraftHand;
import org.seepledger.desktop.draw.DraftModel;
import org.seepledger.desktop.draw.LidSurfaces;
import org.seepledger.desktop.draw.Tray;
import org.seepledger.desktop.folio.Folio;
import org.seepledger.desktop.folio.Shelf;
import org.seepledger.desktop.handover.HandoverModel;
import org.seepledger.desktop.handover.HandoverPage;
import org.seepledger.desktop.intake.IntakeActions;
import org.seepledger.desktop.intake.IntakeModel;
import org.seepledger.desktop.intake.IntakeView;
import org.seepledger.desktop.intake.MendModel;
import org.seepledger.desktop.intake.MendView;
import org.seepledger.desktop.map.GroundModel;
import org.seepledger.desktop.map.MapModel;
import org.seepledger.desktop.map.MapView;
import org.seepledger.desktop.map.ShowingBar;
import org.seepledger.desktop.paint.PicturePng;
import org.seepledger.desktop.port.CopyBoard;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.port.Opener;
import org.seepledger.desktop.port.Questions;
import org.seepledger.desktop.port.RecentFolders;
import org.seepledger.desktop.port.Settings;
import org.seepledger.desktop.preferences.PreferencesModel;
import org.seepledger.desktop.review.ReviewModel;
import org.seepledger.desktop.review.ReviewPlaces;
import org.seepledger.desktop.review.WritingModel;
import org.seepledger.desktop.running.RunningModel;
import org.seepledger.desktop.running.RunningStrip;
import org.seepledger.desktop.section.SectionModel;
import org.seepledger.desktop.section.SectionView;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.shell.ShellModel;
import org.seepledger.desktop.shell.ShellView;
import org.seepledger.desktop.shell.Slots;
import org.seepledger.desktop.size.Magnifier;
import org.seepledger.desktop.solute.KeptLook;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.theme.Dress;
import org.seepledger.desktop.welcome.FolderDrop;
import org.seepledger.desktop.welcome.WelcomeModel;
import org.seepledger.desktop.welcome.WelcomeView;
import org.seepledger.desktop.words.Words;

/** Puts the window together. */
final class Assembly {

    private final Outside outside;
    private final Session session = new Session();
    private final PreferencesModel preferences;
    private final ShellModel shell;
    private final WelcomeModel welcome;
    private final IntakeModel intake;
    private final MendModel mend;
    private final MapModel map;
    private final DraftModel draft;
    private final DraftHand hand;
    private final DraftFiles files;
    private final Tray tray;
    private final Folio folio;
    private final RunningModel running;
    private final MapView mapView;
    private final SectionModel section;
    private final Shelf shelf;
    private final ReviewModel review;
    private final ReviewPlaces reviewPlaces;
    private final ShellView view;
    private final Scene scene;

    /** What the window asks of the machine. */
    record Outside(
            Tasks tasks,
            FileDialogs dialogs,
            Questions questions,
            CopyBoard copies,
            RecentFolders folders,
            Settings settings,
            Opener opener) {}

    Assembly(Outside outside, List<Path> samplePlaces) {
        this.outside = outside;
        this.preferences = new PreferencesModel(outside.settings());
        this.shell = new ShellModel(session, preferences.theme());
        this.map = new MapModel(session, outside.tasks());
        this.welcome = new WelcomeModel(
                outside.tasks(), outside.dialogs(), outside.folders(), this::show, go -> files().whenSafe(go));
        this.intake = new IntakeModel(outside.tasks(), outside.dialogs(), welcome::open);
        this.mend = new MendModel(outside.tasks(), welcome::open);
        welcome.whenLoose(this::bring);
        welcome.whenWrong(mend::mend);
        Actions actions = new Actions();
        this.draft = new DraftModel(session);
        this.hand = new DraftHand(draft);
        this.files = new DraftFiles(draft, outside.tasks(), outside.dialogs(), outside.questions());
        this.tray = new Tray(draft, hand, new LidSurfaces(draft, outside.tasks(), outside.dialogs()));
        GroundModel ground = new GroundModel(session, outside.tasks(), outside.dialogs());
        this.mapView = new MapView(map, ground, outside.tasks(), shell.theme(), hand, tray);
        draft.version().addListener((version, before, after) -> mapView.repaint());
        draft.tool().addListener((tool, before, after) -> mapView.repaint());
        tray.whenLeft(mapView::focus);
        tray.whenTaken(mapView::repaint);
        this.running = new RunningModel(outside.tasks()::running);
        this.folio = new Folio(session, outside.tasks(), outside.dialogs(), outside.copies(), shell.theme());
        KeptLook.of(folio.look(), outside.settings());
        mapView.lay(folio.plumeMap()::marks);
        folio.plumeMap().changes().addListener((changes, before, after) -> mapView.repaint());
        this.section = new SectionModel(session, outside.tasks(), draft);
        SectionView sectionView = new SectionView(section, shell.theme());
        this.review = new ReviewModel(session, outside.tasks(), outside.dialogs());
        WritingModel writing =
                new WritingModel(review, outside.tasks(), outside.dialogs(), outside.copies(), outside.opener());
        this.reviewPlaces = new ReviewPlaces(review, writing, this::liftPage);
        this.shelf = new Shelf(List.of(
                folio.ribbon(),
                new Shelf.Page("shelf.section", sectionView.bar(), sectionView),
                new Shelf.Page("shelf.review", reviewPlaces.barBelow(), reviewPlaces.below())));
        Slots slots =
                new Slots(firstPages(), new ShowingBar(map), mapView, Optional.of(folio.pages()), Optional.of(shelf));
        this.view = new ShellView(shell, slots, actions, running, preferences, outside.settings());
        FolderDrop.on(view, welcome, over -> session.status().set(over ? Words.of("drop.open") : ""));
        actions.add(actionsOfWindow());
        actions.add(mapView.actions());
        actions.add(new DraftActions(draft, hand, files, tray, mapView::repaint).all(map));
        actions.add(folio.actions());
        actions.add(IntakeActions.of(intake, mend));
        actions.add(sectionView.actions());
        actions.add(List.of(new Action("actions.group.section", "action.section.show", "F12", shelf::turn)));
        session.sectionLine()
                .addListener((line, before, after) -> after.ifPresent(drawn -> {
                    shelf.open(1);
                    view.showBelow();
                }));
        view.spreadBelow(shelf.page());
        HandoverModel handover = new HandoverModel(
                session, outside.tasks(), outside.dialogs(), outside.copies(), outside.opener(), new PicturePng());
        HandoverPage handoverPage = new HandoverPage(handover, view::lift);
        actions.add(List.of(new Action("actions.group.file", "action.handover", "Shortcut+E", () -> {
            view.lower(handoverPage);
            handoverPage.open();
        })));
        actions.add(reviewPlaces.actions(this::turnToReview));
        welcome.whenReview(this::turnToReview);
        shell.atWelcome().addListener((welcoming, before, after) -> {
            if (!after) {
                reviewPlaces.settleBelow();
            }
        });
        Magnifier magnifier = new Magnifier(view, view.veil());
        this.scene = new Scene(magnifier, 1280, 800);
        Dress.put(scene, shell.theme(), preferences.size());
        session.numbers().bind(preferences.numbers());
        magnifier.factor().bind(preferences.size().map(percent -> percent / 100.0));
        ground.cover().bind(preferences.cover().map(percent -> percent / 100.0));
        Stream.of(preferences.rateUnit(), preferences.volumeUnit())
                .forEach(unit -> unit.addListener(wanted -> wantUnits()));
        wantUnits();
        welcome.look(samplePlaces);
    }

    private List<Action> actionsOfWindow() {
        String window = "actions.group.window";
        String time = "actions.group.time";
        return List.of(
                new Action(window, "action.list", "F1", view::showActions),
                new Action(window, "action.open", "Shortcut+O", welcome::choose),
                new Action(window, "action.intake", "Shortcut+Shift+O", this::turnToIntake),
                new Action(window, "action.welcome", "Shortcut+Home", shell::turnPage),
                new Action(window, "action.theme", "F9", shell::switchTheme),
                new Action(window, "action.pane", "F6", view::nextPane),
                new Action(window, "action.fold.side", "Shift+F6", view::turnSide),
                new Action(window, "action.fold.below", "Shortcut+F6", view::turnBelow),
                new Action(window, "action.caution", "Shift+F1", view::showCaution),
                new Action(window, "action.notices", "F7", view::showNotices),
                new Action(window, "action.running", "F10", view::showRunning),
                new Action(window, "action.stop", "Shift+Esc", running::canStop, running::stop),
                new Action(window, "action.preferences", "Shortcut+Comma", view::showPreferences),
                new Action(window, "action.larger", "Shortcut+Equals", () -> preferences.resize(1)),
                new Action(window, "action.smaller", "Shortcut+Minus", () -> preferences.resize(-1)),
                new Action(window, "action.again", "Shortcut+R", this::again),
                new Action(time, "action.later", "Period", () -> shell.move(1)),
                new Action(time, "action.earlier", "Comma", () -> shell.move(-1)),
                new Action(time, "action.deeper", "Page Down", () -> shell.sink(1)),
                new Action(time, "action.higher", "Page Up", () -> shell.sink(-1)));
    }

    private void wantUnits() {
        folio.reading()
                .want(preferences.rateUnit().get(), preferences.volumeUnit().get());
    }

    /** One behind the other; what is behind is hidden from the keyboard too. */
    private Node firstPages() {
        WelcomeView first = new WelcomeView(welcome);
        IntakeView loose = new IntakeView(intake, new RunningStrip(running, this::listRunning), this::leaveIntake);
        MendView wrong = new MendView(mend);
        BooleanBinding mending =
                Bindings.createBooleanBinding(() -> mend.folder().get().isPresent(), mend.folder());
        first.visibleProperty().bind(intake.shown().or(mending).not());
        loose.visibleProperty().bind(intake.shown().and(mending.not()));
        wrong.visibleProperty().bind(mending);
        return new StackPane(first, loose, wrong);
    }

    private void listRunning() {
        view.showRunning();
    }

    private void turnToIntake() {
        if (intake.shown().get() && shell.atWelcome().get()) {
            leaveIntake();
        } else {
            bring(List.of());
        }
    }

    /** Shows the import assistant, with more files. */
    private void bring(List<Path> paths) {
        shell.atWelcome().set(true);
        intake.bring(paths);
    }

    /** With an open aquifer the review stands below its map; else the table is looked at by itself, on a page. */
    private void turnToReview() {
        if (session.set().get().isEmpty()) {
            view.lower(reviewPlaces.page());
        } else {
            shell.atWelcome().set(false);
            shelf.open(2);
            view.showBelow();
        }
        reviewPlaces.focus();
    }

    private void liftPage() {
        view.lift();
    }

    private void leaveIntake() {
        intake.shown().set(false);
        shell.atWelcome().set(session.set().get().isEmpty());
    }

    private void again() {
        folio.again();
        review.again();
        map.values().again();
    }

    private void show(Opening opening) {
        Optional<OpenSet> before = session.set().get();
        session.show(Optional.of(opening.set()));
        opening.set().workbench().warnings().forEach(session.notices()::warn);
        session.notices().done(opened(opening.set().aquifer()));
        files.begin(opening);
        mapView.focus();
        before.ifPresent(this::putAway);
    }

    private void putAway(OpenSet set) {
        outside.tasks()
                .each("task.closing", 1)
                .run(
                        progress -> {
                            set.close();
                            return set;
                        },
                        closed -> {},
                        fault -> {});
    }

    private static String opened(Aquifer aquifer) {
        return Words.of(
                "opened",
                aquifer.name(),
                aquifer.grid().rows(),
                aquifer.grid().columns(),
                aquifer.layers().size(),
                aquifer.times().intervals());
    }

    ShellView view() {
        return view;
    }

    PreferencesModel preferences() {
        return preferences;
    }

    Scene scene() {
        return scene;
    }

    Session session() {
        return session;
    }

    ReviewModel review() {
        return review;
    }

    ShellModel shell() {
        return shell;
    }

    DraftFiles files() {
        return files;
    }

    Tray tray() {
        return tray;
    }

    DraftModel draft() {
        return draft;
    }

    SectionModel section() {
        return section;
    }

    Shelf shelf() {
        return shelf;
    }

    MapModel map() {
        return map;
    }

    WelcomeModel welcome() {
        return welcome;
    }

    MendModel mend() {
        return mend;
    }

    IntakeModel intake() {
        return intake;
    }
}
