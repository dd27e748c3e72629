package org.seepledger.desktop.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.SplitPane;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.ReviewAnswer;
import org.seepledger.review.check.Finding;
import org.seepledger.review.check.Severity;
import org.seepledger.unit.Figures;

/** What was found: the verdict, the findings by weight, and of the one that is chosen all that can be said. */
final class FindingsPane extends BorderPane {

    private static final double LEAST_ROOM = 124;

    private final ReviewModel model;
    private final TableView<Finding> table = new TableView<>();
    private final Label verdict = new Label();
    private final List<ToggleButton> filters = new ArrayList<>();

    FindingsPane(ReviewModel model) {
        this.model = model;
        verdict.setId("review-verdict");
        verdict.setWrapText(true);
        verdict.setMinHeight(USE_PREF_SIZE);
        verdict.getStyleClass().add("sl-strong");
        HBox.setHgrow(verdict, Priority.ALWAYS);
        verdict.setMaxWidth(Double.MAX_VALUE);
        HBox head = new HBox(16, verdict, filters());
        head.getStyleClass().add("sl-review-head");
        buildTable();
        BorderPane left = new BorderPane(table);
        left.setTop(head);
        SplitPane both = new SplitPane(left, new FindingDetail(model));
        both.setDividerPositions(0.7);
        setCenter(both);
        model.answer().addListener((answer, before, after) -> show(after));
        model.filter().addListener((chosen, before, after) -> list());
        model.session().numbers().addListener((form, before, after) -> table.refresh());
        show(model.answer().get());
    }

    private Node filters() {
        ToggleGroup group = new ToggleGroup();
        HBox box = new HBox(4);
        box.setMinWidth(USE_PREF_SIZE);
        box.getChildren().add(filter(group, Optional.empty()));
        for (Severity severity : Severity.values()) {
            box.getChildren().add(filter(group, Optional.of(severity)));
        }
        group.selectToggle(filters.get(0));
        group.selectedToggleProperty().addListener((toggle, before, after) -> {
            if (after == null) {
                group.selectToggle(before);
            }
        });
        return box;
    }

    private ToggleButton filter(ToggleGroup group, Optional<Severity> severity) {
        ToggleButton button = new ToggleButton();
        button.setId("review-only-" + severity.map(Severity::toString).orElse("all"));
        button.getStyleClass().add("small");
        button.setToggleGroup(group);
        button.setUserData(severity);
        button.selectedProperty().addListener((selected, before, after) -> {
            if (after) {
                model.filter().set(severity);
            }
        });
        filters.add(button);
        return button;
    }

    private void show(Optional<ReviewAnswer> answer) {
        verdict.setText(answer.map(ReviewAnswer::verdict).orElse(""));
        filters.get(0).setText(Words.of("review.only.all"));
        for (Severity severity : Severity.values()) {
            filters.get(1 + severity.ordinal()).setText(Words.of("review.only." + severity, model.count(severity)));
        }
        list();
    }

    private void list() {
        table.getItems().setAll(model.findings());
    }

    private void buildTable() {
        table.setId("review-findings");
        table.setPlaceholder(new Label(Words.of("review.nothing")));
        table.setColumnResizePolicy(TableView.CONSTRAINED_RESIZE_POLICY_FLEX_LAST_COLUMN);
        TableColumn<Finding, Finding> severity = column("review.severity", 76, finding -> "");
        severity.setCellFactory(made -> new SeverityCell());
        table.getColumns().add(severity);
        table.getColumns()
                .add(column("review.code", 124, finding -> finding.code().toString()));
        table.getColumns().add(column("review.where", 160, FindingsPane::where));
        table.getColumns().add(number("review.submitted", 98, Finding::submitted));
        table.getColumns().add(number("review.recomputed", 112, Finding::recomputed));
        table.getColumns().add(column("review.unit", 70, Finding::unit));
        table.getColumns().add(number("review.ratio", 72, Finding::ratio));
        table.getColumns().add(column("review.sentence", 300, Finding::message));
        table.getSelectionModel().selectedItemProperty().addListener((finding, before, after) -> {
            if (after != null) {
                model.look(after);
            }
        });
    }

    /** {@return where a finding is: its term, prism and period, as far as it is about one} */
    static String where(Finding finding) {
        return List.of(finding.item(), finding.prism(), finding.period()).stream()
                .filter(part -> !part.equals(Finding.SEVERAL) && !part.isEmpty())
                .reduce((one, other) -> one + ", " + other)
                .orElse(Words.of("review.everywhere"));
    }

    private TableColumn<Finding, Finding> number(String key, double width, Function<Finding, Double> number) {
        TableColumn<Finding, Finding> column = column(key, width, finding -> text(number.apply(finding)));
        column.getStyleClass().add("sl-numbers");
        return column;
    }

    private String text(double number) {
        return Double.isNaN(number) ? "" : model.session().numbers().get().of(Figures.typeset(number));
    }

    private static TableColumn<Finding, Finding> column(String key, double width, Function<Finding, String> words) {
        TableColumn<Finding, Finding> column = new TableColumn<>(Words.of(key));
        column.setSortable(false);
        column.setReorderable(false);
        column.setPrefWidth(width);
        column.setMinWidth(Math.min(width, LEAST_ROOM));
        column.setCellValueFactory(row -> new SimpleObjectProperty<>(row.getValue()));
        column.setCellFactory(made -> new TableCell<>() {
            @Override
            protected void updateItem(Finding finding, boolean empty) {
                super.updateItem(finding, empty);
                setText(empty || finding == null ? null : words.apply(finding));
            }
        });
        return column;
    }

    /** The severity as a word on its colour. */
    private static final class SeverityCell extends TableCell<Finding, Finding> {

        private final Label mark = new Label();

        @Override
        protected void updateItem(Finding finding, boolean empty) {
            super.updateItem(finding, empty);
            boolean none = empty || finding == null;
            setGraphic(none ? null : mark);
            if (!none) {
                mark.setText(Words.of("review.severity." + finding.severity()));
                mark.getStyleClass().setAll("label", "sl-mark-sign", style(finding.severity()));
            }
        }
    }

    static String style(Severity severity) {
        return severity == Severity.NOTE ? "unused" : severity.toString();
    }
}
