package org.seepledger.desktop.folio;

import java.util.List;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.scene.Node;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import org.seepledger.desktop.words.Words;

/** What runs below map and ledger, as wide as the window: one page at a time, each with a bar of its own beside the marks. */
public final class Shelf extends BorderPane {

    private final ToggleGroup chosen = new ToggleGroup();
    private final HBox head = new HBox();
    private final HBox marks = new HBox();
    private final ReadOnlyIntegerWrapper page = new ReadOnlyIntegerWrapper();
    private final List<Page> pages;

    /**
     * A page.
     *
     * @param words the key of what its mark says
     * @param bar what stands beside the marks while it is open
     * @param content the page itself
     */
    public record Page(String words, Node bar, Node content) {}

    /**
     * Builds the shelf, with its first page open.
     *
     * @param pages the pages
     */
    public Shelf(List<Page> pages) {
        this.pages = List.copyOf(pages);
        setId("shelf");
        getStyleClass().add("sl-pane");
        head.getStyleClass().add("sl-shelf");
        marks.getStyleClass().add("sl-marks");
        for (int i = 0; i < pages.size(); i++) {
            marks.getChildren().add(mark(i));
            HBox.setHgrow(pages.get(i).bar(), Priority.ALWAYS);
        }
        setTop(head);
        open(0);
    }

    private ToggleButton mark(int number) {
        Page marked = pages.get(number);
        ToggleButton mark = new ToggleButton(Words.of(marked.words()));
        mark.setId(marked.words().replace('.', '-'));
        mark.getStyleClass().add("sl-mark-page");
        mark.setToggleGroup(chosen);
        mark.setOnAction(pressed -> open(number));
        return mark;
    }

    /**
     * Opens a page.
     *
     * @param number which, from 0
     */
    public void open(int number) {
        chosen.selectToggle(chosen.getToggles().get(number));
        head.getChildren().setAll(marks, pages.get(number).bar());
        setCenter(pages.get(number).content());
        page.set(number);
    }

    /** {@return which page is open, from 0} */
    public ReadOnlyIntegerProperty page() {
        return page.getReadOnlyProperty();
    }

    /** Opens the next page, after the last the first. */
    public void turn() {
        open((page.get() + 1) % pages.size());
    }
}
