package org.seepledger.desktop.origin;

import java.nio.file.Path;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;

/** Writes a whole trace, as the command does, to a file that is asked for. */
final class TraceExport {

    private static final FileDialogs.Kind CSV = new FileDialogs.Kind("CSV", "*.csv");

    private final Session session;
    private final FileDialogs dialogs;
    private final Lane writing;

    TraceExport(Session session, FileDialogs dialogs, Tasks tasks) {
        this.session = session;
        this.dialogs = dialogs;
        this.writing = tasks.latest("task.trace.writing");
    }

    /** Asks for the file, and writes what was asked of a number. */
    void ask(Question asked) {
        Path suggested = asked.set().path().resolve("trace.csv");
        dialogs.fileToWrite(Words.of("origin.export.title"), CSV, suggested).ifPresent(file -> write(asked, file));
    }

    private void write(Question asked, Path file) {
        var drawing = session.shapes().get().drawing();
        writing.run(
                progress -> {
                    EntryGuard.enter();
                    asked.set().workbench().drawings().mustHold(asked.prisms(), drawing);
                    asked.write(file, progress);
                    return file;
                },
                written -> session.notices().done(Words.of("origin.written", written)),
                fault -> session.notices().refuse(FaultWords.of(fault)));
    }
}
