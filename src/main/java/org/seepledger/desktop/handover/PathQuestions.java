package org.seepledger.desktop.handover;

import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.words.Words;

/** Asks for the folder to hand over in and for the files that are handed over with the rest. */
final class PathQuestions {

    private static final FileDialogs.Kind CSV = new FileDialogs.Kind("CSV", "*.csv");
    private static final FileDialogs.Kind LINES = new FileDialogs.Kind("GeoJSON", "*.geojson");

    private final FileDialogs dialogs;
    private final HandoverChoices choices;

    PathQuestions(FileDialogs dialogs, HandoverChoices choices) {
        this.dialogs = dialogs;
        this.choices = choices;
    }

    /** Asks for the folder. */
    void folder() {
        dialogs.folder(Words.of("handover.folder.title"))
                .ifPresent(folder -> choices.out().text().set(folder.toString()));
    }

    /** Asks for a file of transects. */
    void transects() {
        dialogs.fileToRead(Words.of("handover.transects.title"), LINES)
                .ifPresent(file -> choices.solutes().transects().text().set(file.toString()));
    }

    /** Asks for a file of measured panels. */
    void panels() {
        dialogs.fileToRead(Words.of("handover.panels.title"), CSV)
                .ifPresent(file -> choices.solutes().panels().text().set(file.toString()));
    }

    /** Asks for a file of periods. */
    void periods() {
        dialogs.fileToRead(Words.of("handover.periods.title"), CSV)
                .ifPresent(file -> choices.budget().periods().text().set(file.toString()));
    }
}
