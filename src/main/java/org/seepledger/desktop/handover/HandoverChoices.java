package org.seepledger.desktop.handover;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.value.ObservableValue;
import javafx.collections.ObservableMap;
import org.seepledger.job.HandoverRequest;
import org.seepledger.job.ShownPicture;

/** All that is chosen of what is handed over. */
final class HandoverChoices {

    private final BooleanProperty water = new SimpleBooleanProperty(true);
    private final BooleanProperty plume = new SimpleBooleanProperty();
    private final BooleanProperty extract = new SimpleBooleanProperty();
    private final BooleanProperty overwrite = new SimpleBooleanProperty();
    private final Entry<Path> out = new Entry<>(Meaning::path);
    private final BudgetChoices budget = new BudgetChoices();
    private final ReportChoices report = new ReportChoices();
    private final SoluteChoices solutes = new SoluteChoices();
    private final PictureChoices pictures;

    /**
     * Begins with the water budget.
     *
     * @param offered the pictures that views offer
     */
    HandoverChoices(ObservableMap<String, ShownPicture> offered) {
        this.pictures = new PictureChoices(offered);
    }

    /** {@return whether the water budget is wanted} */
    BooleanProperty water() {
        return water;
    }

    /** {@return whether the solute budget is wanted; never where the set has no solutes} */
    BooleanProperty plume() {
        return plume;
    }

    /** {@return whether an extract of the aquifer is wanted} */
    BooleanProperty extract() {
        return extract;
    }

    /** {@return whether an earlier handing over may be replaced} */
    BooleanProperty overwrite() {
        return overwrite;
    }

    /** {@return the folder that all goes to} */
    Entry<Path> out() {
        return out;
    }

    /** {@return what is chosen of budgets} */
    BudgetChoices budget() {
        return budget;
    }

    /** {@return what is chosen of the report} */
    ReportChoices report() {
        return report;
    }

    /** {@return what is chosen of solutes} */
    SoluteChoices solutes() {
        return solutes;
    }

    /** {@return which pictures are chosen} */
    PictureChoices pictures() {
        return pictures;
    }

    HandoverRequest.Pictures picturesWanted() {
        return pictures.wanted(water.get());
    }

    boolean isEmpty() {
        return !water.get()
                && !plume.get()
                && !extract.get()
                && picturesWanted().shown().isEmpty();
    }

    /** Whether nothing that is typed has anything wrong with it. */
    boolean isSound() {
        return Stream.of(budget.entries(), report.entries(), solutes.entries())
                .flatMap(List::stream)
                .allMatch(Entry::isSound);
    }

    List<ObservableValue<?>> observables() {
        List<ObservableValue<?>> all = new ArrayList<>(List.of(water, plume, extract, overwrite, out.text()));
        all.addAll(budget.observables());
        all.addAll(report.observables());
        all.addAll(solutes.observables());
        all.addAll(pictures.observables());
        return all;
    }
}
