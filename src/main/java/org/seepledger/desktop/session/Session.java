package org.seepledger.desktop.session;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleIntegerProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableMap;
import org.seepledger.desktop.notice.Notices;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.job.ShownPicture;
import org.seepledger.job.TracedNumber;
import org.seepledger.job.WellPlace;
import org.seepledger.picture.Section;
import org.seepledger.picture.SectionLine;
import org.seepledger.prism.Prism;
import org.seepledger.report.CellPlace;

/** What the window looks at. Used on the window's own thread alone. */
public final class Session {

    private final ReadOnlyObjectWrapper<Optional<OpenSet>> set = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ObjectProperty<Drawing> drawing = new SimpleObjectProperty<>(Drawing.NONE);
    private final ObjectProperty<Transects> transects = new SimpleObjectProperty<>(Transects.NONE);
    private final StringProperty transect = new SimpleStringProperty("");
    private final ObjectProperty<DrawnShapes> shapes = new SimpleObjectProperty<>(DrawnShapes.NONE);
    private final ObservableMap<String, ShownPicture> pictures = FXCollections.observableMap(new TreeMap<>());
    private final ObjectProperty<Optional<String>> transectName = new SimpleObjectProperty<>(Optional.empty());
    private final IntegerProperty interval = new SimpleIntegerProperty();
    private final IntegerProperty layer = new SimpleIntegerProperty();
    private final StringProperty selected = new SimpleStringProperty("");
    private final StringProperty lit = new SimpleStringProperty("");
    private final ObjectProperty<List<TracedNumber.Cell>> marked = new SimpleObjectProperty<>(List.of());
    private final ObjectProperty<Optional<RowAsked>> asked = new SimpleObjectProperty<>(Optional.empty());
    private final ObjectProperty<Optional<RowAsked>> pointed = new SimpleObjectProperty<>(Optional.empty());
    private final StringProperty solute = new SimpleStringProperty("");
    private final StringProperty status = new SimpleStringProperty("");
    private final ObjectProperty<NumberForm> numbers = new SimpleObjectProperty<>(NumberForm.SPACE_POINT);
    private final Notices notices = new Notices();
    private final ObjectProperty<List<WellPlace>> wells = new SimpleObjectProperty<>(List.of());
    private final ObjectProperty<FaceFlows> faceFlows = new SimpleObjectProperty<>(FaceFlows.NONE);
    private final ObjectProperty<Optional<CellPlace>> target = new SimpleObjectProperty<>(Optional.empty());
    private final ObjectProperty<Optional<Draped>> draped = new SimpleObjectProperty<>(Optional.empty());
    private final ObjectProperty<Optional<SectionLine>> sectionLine = new SimpleObjectProperty<>(Optional.empty());
    private final ObjectProperty<Optional<Section>> section = new SimpleObjectProperty<>(Optional.empty());
    private final ObjectProperty<OptionalDouble> along = new SimpleObjectProperty<>(OptionalDouble.empty());
    private final ObjectProperty<Demand> demand = new SimpleObjectProperty<>(Demand.NONE);

    /** What one pane asks of the map. */
    public enum Demand {
        /** Nothing. */
        NONE,
        /** To show where the selected prism does not close. */
        SHOW_IMBALANCE,
        /** To begin to draw a prism. */
        DRAW_PRISM,
        /** To begin to draw a transect. */
        DRAW_TRANSECT,
        /** To begin to draw the line of a section. */
        DRAW_SECTION
    }

    /**
     * Puts another set before the user, with nothing drawn on it.
     *
     * @param opened the set; empty for none
     */
    public void show(Optional<OpenSet> opened) {
        lit.set("");
        pointed.set(Optional.empty());
        draped.set(Optional.empty());
        sectionLine.set(Optional.empty());
        marked.set(List.of());
        faceFlows.set(FaceFlows.NONE);
        solute.set("");
        transect.set("");
        transects.set(Transects.NONE);
        selected.set("");
        interval.set(0);
        layer.set(0);
        drawing.set(new Drawing(drawing.get().revision() + 1, Drawing.NONE.prisms(), true));
        set.set(opened);
    }

    /** {@return the open set, if any} */
    public ReadOnlyObjectProperty<Optional<OpenSet>> set() {
        return set.getReadOnlyProperty();
    }

    /** {@return what is drawn} */
    public ObjectProperty<Drawing> drawing() {
        return drawing;
    }

    /** {@return the transects that are drawn} */
    public ObjectProperty<Transects> transects() {
        return transects;
    }

    /** {@return the name of the transect that is chosen; empty for none} */
    public StringProperty transect() {
        return transect;
    }

    /** {@return what is drawn as shapes, for what writes it to a file} */
    public ObjectProperty<DrawnShapes> shapes() {
        return shapes;
    }

    /** {@return the pictures that views offer for handing over, by what they are called there; a view keeps its own up} */
    public ObservableMap<String, ShownPicture> pictures() {
        return pictures;
    }

    /** {@return the name that a pane asks for the chosen transect; whoever gives it empties it} */
    public ObjectProperty<Optional<String>> transectName() {
        return transectName;
    }

    /** {@return the interval looked at, from 0} */
    public IntegerProperty interval() {
        return interval;
    }

    /** {@return the layer looked at, from 0} */
    public IntegerProperty layer() {
        return layer;
    }

    /** {@return the selected prism's name; empty for none} */
    public StringProperty selected() {
        return selected;
    }

    /** {@return the selected prism as it is drawn now, if there is one} */
    public Optional<Prism> selectedPrism() {
        return drawing.get().prism(selected.get());
    }

    /** {@return the item of the selected prism's face that is lit up, as {@code side 3}; empty for none} */
    public StringProperty lit() {
        return lit;
    }

    /** {@return how numbers are written in the window} */
    public ObjectProperty<NumberForm> numbers() {
        return numbers;
    }

    /** {@return the cells that are lit up, since a number rests on values in them} */
    public ObjectProperty<List<TracedNumber.Cell>> marked() {
        return marked;
    }

    /** {@return the row of the selected prism's budget whose origin is asked for; whoever answers empties it} */
    public ObjectProperty<Optional<RowAsked>> asked() {
        return asked;
    }

    /** {@return the row of the selected prism's budget that a pane points at; the hand that chooses another empties it} */
    public ObjectProperty<Optional<RowAsked>> pointed() {
        return pointed;
    }

    /** {@return what has been done, what to know, what was refused} */
    public Notices notices() {
        return notices;
    }

    /** {@return the name of the solute whose budget is looked at; empty for water's} */
    public StringProperty solute() {
        return solute;
    }

    /** {@return what the status line says can be done now} */
    public StringProperty status() {
        return status;
    }

    /** {@return the wells with their rates in the interval looked at} */
    public ObjectProperty<List<WellPlace>> wells() {
        return wells;
    }

    /** {@return what flows through the selected prism's faces, for arrows on the map} */
    public ObjectProperty<FaceFlows> faceFlows() {
        return faceFlows;
    }

    /** {@return the place that a pane asks the map to go to; whoever goes there empties it} */
    public ObjectProperty<Optional<CellPlace>> target() {
        return target;
    }

    /** {@return what lies over the map, and in which colours} */
    public ObjectProperty<Optional<Draped>> draped() {
        return draped;
    }

    /** {@return the line that the section follows, if one is drawn} */
    public ObjectProperty<Optional<SectionLine>> sectionLine() {
        return sectionLine;
    }

    /** {@return the section as it was last worked out, to be drawn by {@link org.seepledger.picture.SectionPicture}} */
    public ObjectProperty<Optional<Section>> section() {
        return section;
    }

    /** {@return how far along the section's line somebody points, on the map or in the section, in plan units} */
    public ObjectProperty<OptionalDouble> along() {
        return along;
    }

    /** {@return what a pane asks of the map; whoever meets it sets it back to none} */
    public ObjectProperty<Demand> demand() {
        return demand;
    }
}
