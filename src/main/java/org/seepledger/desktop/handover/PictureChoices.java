package org.seepledger.desktop.handover;

import java.util.ArrayList;
import java.util.List;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.value.ObservableValue;
import javafx.collections.ObservableMap;
import org.seepledger.job.HandoverRequest;
import org.seepledger.job.ShownPicture;

/** Which pictures are chosen. */
final class PictureChoices {

    private final ObservableMap<String, ShownPicture> offered;
    private final BooleanProperty maps = new SimpleBooleanProperty(true);
    private final BooleanProperty sections = new SimpleBooleanProperty();
    private final BooleanProperty shown = new SimpleBooleanProperty();
    private final BooleanProperty svg = new SimpleBooleanProperty(true);
    private final BooleanProperty png = new SimpleBooleanProperty(true);

    /**
     * Begins with the report's maps.
     *
     * @param offered what views offer
     */
    PictureChoices(ObservableMap<String, ShownPicture> offered) {
        this.offered = offered;
    }

    /** {@return whether the report's map of each prism is wanted} */
    BooleanProperty maps() {
        return maps;
    }

    /** {@return whether the report's section through each prism is wanted} */
    BooleanProperty sections() {
        return sections;
    }

    /** {@return whether what views show is wanted} */
    BooleanProperty shown() {
        return shown;
    }

    /** {@return whether pictures are written as SVG} */
    BooleanProperty svg() {
        return svg;
    }

    /** {@return whether pictures are written as PNG} */
    BooleanProperty png() {
        return png;
    }

    /** {@return what views offer, by what it is called} */
    ObservableMap<String, ShownPicture> offered() {
        return offered;
    }

    List<ObservableValue<?>> observables() {
        return List.of(maps, sections, shown, svg, png);
    }

    /** Which are wanted; the report's only where there is a report. */
    HandoverRequest.Pictures wanted(boolean withReport) {
        if (!svg.get() && !png.get()) {
            return HandoverRequest.Pictures.NONE;
        }
        List<ShownPicture> views = shown.get() ? new ArrayList<>(offered.values()) : List.of();
        return new HandoverRequest.Pictures(
                withReport && maps.get(), withReport && sections.get(), views, svg.get(), png.get());
    }
}
