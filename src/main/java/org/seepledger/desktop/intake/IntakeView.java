package org.seepledger.desktop.intake;

import java.io.File;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.SplitPane;
import javafx.scene.input.DragEvent;
import javafx.scene.input.TransferMode;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.pane.StatePane;
import org.seepledger.desktop.words.Words;
import org.seepledger.intake.Finding;
import org.seepledger.intake.Item;
import org.seepledger.intake.LooseFile;

/** The page of the import assistant. */
public final class IntakeView extends BorderPane {

    private final IntakeModel model;
    private final ListView<ItemRow> list = new ListView<>();
    private final VBox centre = new VBox(14);
    private final Button addFolder;
    private final SetPane set;
    private final FindingsBox problems;
    private Optional<Object> built = Optional.empty();
    private boolean filling;

    /**
     * Builds the page.
     *
     * @param model the files and what they make
     * @param running shows how far work is, and stops it
     * @param back leaves the page
     */
    public IntakeView(IntakeModel model, Node running, Runnable back) {
        this.model = model;
        this.set = new SetPane(model);
        this.addFolder = button("intake-add-folder", "intake.add.folder", model::addFolder);
        this.problems = new FindingsBox(this::go);
        setId("intake");
        getStyleClass().add("sl-intake");
        setTop(bar(running, back));
        setCenter(new StatePane(panes(), model.state()).withAction(Words.of("intake.add.folder"), model::addFolder));
        setOnDragOver(IntakeView::onDragOver);
        setOnDragDropped(this::onDropped);
        model.plan().addListener((now, before, after) -> show());
        model.making().made().addListener((now, before, after) -> show());
        model.chosen().addListener((now, before, after) -> show());
        model.shown().addListener((now, before, after) -> {
            if (after) {
                (list.getItems().isEmpty() ? addFolder : list).requestFocus();
            }
        });
        show();
    }

    private Node bar(Node running, Runnable back) {
        Label title = new Label(Words.of("intake.title"));
        title.getStyleClass().add("sl-name");
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        HBox bar = new HBox(
                title,
                gap,
                running,
                button("intake-add-files", "intake.add.files", model::addFiles),
                addFolder,
                button("intake-clear", "intake.clear", model::clear),
                button("intake-back", "intake.back", back));
        bar.getStyleClass().add("sl-caption");
        return bar;
    }

    private static Button button(String id, String key, Runnable does) {
        Button button = new Button(Words.of(key));
        button.setId(id);
        button.setOnAction(pressed -> does.run());
        return button;
    }

    private Node panes() {
        list.setId("intake-items");
        list.setCellFactory(view -> new ItemCell());
        list.getSelectionModel().selectedItemProperty().addListener((now, before, after) -> {
            if (after != null && !filling) {
                model.chosen().set(after.index());
            }
        });
        ScrollPane scroll = new ScrollPane(centre);
        scroll.setFitToWidth(true);
        scroll.getStyleClass().add("sl-intake-item");
        SplitPane panes = new SplitPane(list, scroll, new OutcomePane(model, this::go));
        panes.setDividerPositions(0.22, 0.68);
        list.setMinWidth(230);
        return panes;
    }

    private void show() {
        filling = true;
        List<ItemRow> rows = model.rows();
        list.getItems().setAll(rows);
        rows.stream()
                .filter(row -> row.index() == model.chosen().get())
                .findFirst()
                .ifPresent(row -> list.getSelectionModel().select(row));
        filling = false;
        model.plan()
                .get()
                .ifPresent(plan -> set.show(plan, model.making().made().get()));
        Object wanted = model.item().map(IntakeView::structure).orElse("set");
        if (!built.equals(Optional.of(wanted))) {
            built = Optional.of(wanted);
            centre.getChildren()
                    .setAll(model.item()
                            .map(this::itemNodes)
                            .orElse(List.of(heading(Words.of("intake.set")), problems, set)));
        }
        problems.show(problems());
    }

    /** What decides which controls there are; a text that is typed into one of them does not. */
    private static Object structure(Item item) {
        return List.of(
                item.id(),
                item.files().size(),
                item.uses().stream()
                        .map(use -> List.of(use.role(), use.part(), use.guess()))
                        .toList(),
                item instanceof Item.Table table ? table.places() : List.of(),
                item instanceof Item.Rasters rasters ? List.of(rasters.fields(), rasters.bands()) : List.of());
    }

    private List<Node> itemNodes(Item item) {
        Node pane;
        if (item instanceof Item.Rasters rasters) {
            pane = new RastersPane(model, rasters);
        } else if (item instanceof Item.Table table) {
            pane = new TablePane(model, table);
        } else {
            pane = other((Item.Other) item);
        }
        return List.of(heading(item.id()), problems, pane);
    }

    private Node other(Item.Other item) {
        Label words = new Label(item.file().words());
        words.setWrapText(true);
        return item.file().kind() == LooseFile.Kind.SHAPES ? new UsePane(model, item, 0) : words;
    }

    private static Label heading(String text) {
        Label heading = new Label(text);
        heading.getStyleClass().add("sl-name");
        heading.setWrapText(true);
        return heading;
    }

    private List<Finding> problems() {
        Optional<String> id = model.item().map(Item::id);
        return model.making().made().get().map(now -> now.copied().findings()).orElse(List.of()).stream()
                .filter(finding -> finding.item().equals(id))
                .toList();
    }

    /** Goes to where a finding can be mended. */
    private void go(Finding finding) {
        List<Item> items = model.plan().get().orElseThrow().items();
        for (int index = 0; index < items.size(); index++) {
            if (finding.item().equals(Optional.of(items.get(index).id()))) {
                model.chosen().set(index);
                return;
            }
        }
        model.chosen().set(-1);
        finding.topic().ifPresent(set::focus);
    }

    private static void onDragOver(DragEvent drag) {
        if (drag.getDragboard().hasFiles()) {
            drag.acceptTransferModes(TransferMode.COPY, TransferMode.LINK);
        }
        drag.consume();
    }

    private void onDropped(DragEvent drag) {
        model.bring(drag.getDragboard().getFiles().stream().map(File::toPath).toList());
        drag.setDropCompleted(true);
        drag.consume();
    }
}
