package org.seepledger.desktop.handover;

import java.nio.file.Path;
import java.util.List;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.value.ObservableValue;
import org.seepledger.desktop.command.CommandText;
import org.seepledger.job.PlumeRequest;
import org.seepledger.unit.Measure;

/** What is chosen of solutes. */
final class SoluteChoices {

    private final Entry<Measure> rateUnit = new Entry<>(Meaning.unit("kg/d"));
    private final Entry<Measure> massUnit = new Entry<>(Meaning.unit("kg"));
    private final Entry<PlumeRequest.Threshold> above = new Entry<>(Meaning::concentration);
    private final Entry<Path> transects = new Entry<>(Meaning::path);
    private final Entry<Path> panels = new Entry<>(Meaning::path);
    private final BooleanProperty dispersion = new SimpleBooleanProperty();

    SoluteChoices() {}

    /** {@return the unit of mass rates} */
    Entry<Measure> rateUnit() {
        return rateUnit;
    }

    /** {@return the unit of masses} */
    Entry<Measure> massUnit() {
        return massUnit;
    }

    /** {@return the concentration above which volume and area are counted} */
    Entry<PlumeRequest.Threshold> above() {
        return above;
    }

    /** {@return a file of lines; what crosses them is counted} */
    Entry<Path> transects() {
        return transects;
    }

    /** {@return a file of measured panels of transects} */
    Entry<Path> panels() {
        return panels;
    }

    /** {@return whether dispersion is booked} */
    BooleanProperty dispersion() {
        return dispersion;
    }

    List<ObservableValue<?>> observables() {
        return List.of(rateUnit.text(), massUnit.text(), above.text(), transects.text(), panels.text(), dispersion);
    }

    List<Entry<?>> entries() {
        return List.of(rateUnit, massUnit, above, transects, panels);
    }

    CommandText into(CommandText command) {
        return command.with("--rate-unit", rateUnit.value())
                .with("--mass-unit", massUnit.value())
                .flag("--dispersion", dispersion.get())
                .with("--above", above.value().map(limit -> limit.value() + " " + limit.unit()))
                .with("--transects", transects.value())
                .with("--panels", panels.value());
    }
}
