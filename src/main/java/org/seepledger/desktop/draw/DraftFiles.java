package org.seepledger.desktop.draw;

import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.port.Questions;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.DrawingFile;
import org.seepledger.prism.Transect;
import org.seepledger.sketch.ControlLine;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Shape;

/**
 * The files of a drawing: what is drawn is kept beside the aquifer a second after the hand rests, so that nothing is lost
 * when the program ends without warning; saving puts it into the file that commands read.
 */
public final class DraftFiles {

    private static final Duration REST = Duration.ofSeconds(1);
    private static final FileDialogs.Kind GEOJSON = new FileDialogs.Kind("GeoJSON", "*.geojson");

    private final DraftModel model;
    private final FileDialogs dialogs;
    private final Questions questions;
    private final Lane keeping;
    private final Lane files;
    private Drawing lastKept = Drawing.EMPTY;

    /**
     * Makes the files.
     *
     * @param model the drawing
     * @param tasks reads and writes
     * @param dialogs asks for files
     * @param questions asks what to do with unsaved work
     */
    public DraftFiles(DraftModel model, Tasks tasks, FileDialogs dialogs, Questions questions) {
        this.model = model;
        this.dialogs = dialogs;
        this.questions = questions;
        this.keeping = tasks.latest("task.keeping");
        this.files = tasks.latest("task.files");
        model.version().addListener((version, before, after) -> keep());
    }

    /**
     * Takes what was opened; unsaved work of the last run is put back, and can be undone.
     *
     * @param opening what was opened
     */
    public void begin(Opening opening) {
        Map<Limit.Surface, GriddedValues> surfaces =
                new HashMap<>(opening.kept().surfaces());
        opening.unsaved().ifPresent(file -> surfaces.putAll(file.surfaces()));
        Drawing kept = opening.kept().drawing();
        Drawing current = opening.unsaved().map(DrawingFile::drawing).orElse(kept);
        lastKept = current;
        model.begin(kept, current, surfaces);
        if (!current.equals(kept)) {
            model.session().notices().warn(Words.of("restored"));
        }
    }

    private Optional<OpenSet> set() {
        return model.session().set().get();
    }

    private void keep() {
        Drawing drawing = model.settled();
        if (set().isEmpty() || drawing.equals(lastKept) || model.isGesturing()) {
            return;
        }
        OpenSet set = set().get();
        boolean unsaved = model.isUnsaved();
        keeping.runAfter(
                REST,
                progress -> {
                    EntryGuard.enter();
                    Path aside = set.path().resolve(Opening.UNSAVED);
                    Path linesAside = set.path().resolve(Opening.UNSAVED_TRANSECTS);
                    if (unsaved) {
                        set.workbench().drawings().write(aside, drawing);
                        writeLines(set, linesAside, drawing);
                    } else {
                        Files.deleteIfExists(aside);
                        Files.deleteIfExists(linesAside);
                    }
                    return drawing;
                },
                done -> lastKept = done,
                fault -> {
                    lastKept = drawing;
                    model.session().notices().warn(Words.of("kept.not", FaultWords.of(fault)));
                });
    }

    /** Saves the drawing beside the aquifer. */
    public void save() {
        set().ifPresent(set -> write(set, set.path().resolve(Opening.PRISMS), saved -> {}));
    }

    /** Saves the drawing in a file that is asked for. */
    public void export() {
        set().ifPresent(set -> dialogs.fileToWrite(
                        Words.of("export.title"), GEOJSON, set.path().resolve(Opening.PRISMS))
                .ifPresent(file -> write(set, file, saved -> {})));
    }

    private void write(OpenSet set, Path file, Consumer<Path> done) {
        Drawing drawing = model.settled();
        boolean own = file.equals(set.path().resolve(Opening.PRISMS));
        keeping.cancel();
        files.run(
                progress -> {
                    EntryGuard.enter();
                    set.workbench().drawings().write(file, drawing);
                    if (own) {
                        writeLines(set, set.path().resolve(Opening.TRANSECTS), drawing);
                        Files.deleteIfExists(set.path().resolve(Opening.UNSAVED));
                        Files.deleteIfExists(set.path().resolve(Opening.UNSAVED_TRANSECTS));
                    }
                    return file;
                },
                written -> {
                    if (own) {
                        lastKept = drawing;
                        model.kept(drawing);
                    }
                    model.session()
                            .notices()
                            .done(Words.of("saved", drawing.shapes().size(), written));
                    done.accept(written);
                },
                fault -> model.session().notices().refuse(FaultWords.of(fault)));
    }

    /** Where there are none and no file has any, there is nothing to write. */
    private static void writeLines(OpenSet set, Path file, Drawing drawing) {
        if (!set.solutes().isEmpty()
                && (!drawing.lines().isEmpty()
                        || Files.exists(file)
                        || Files.exists(set.path().resolve(Opening.TRANSECTS)))) {
            set.workbench().drawings().write(file, transects(drawing));
        }
    }

    private static List<Transect> transects(Drawing drawing) {
        return drawing.lines().stream().map(ControlLine::transect).toList();
    }

    /** Saves the transects in a file that is asked for. */
    public void exportTransects() {
        set().ifPresent(set -> dialogs.fileToWrite(
                        Words.of("transect.export"), GEOJSON, set.path().resolve(Opening.TRANSECTS))
                .ifPresent(file -> {
                    Drawing drawing = model.settled();
                    files.run(
                            progress -> {
                                EntryGuard.enter();
                                set.workbench().drawings().write(file, transects(drawing));
                                return file;
                            },
                            written -> model.session()
                                    .status()
                                    .set(Words.of(
                                            "transect.saved", drawing.lines().size(), written)),
                            fault -> model.session().notices().refuse(FaultWords.of(fault)));
                }));
    }

    /** Adds the transects of a file that is asked for; a name that is taken gets a number. */
    public void importTransects() {
        set().ifPresent(set -> dialogs.fileToRead(Words.of("transect.import"), GEOJSON)
                .ifPresent(file -> files.run(
                        progress -> {
                            EntryGuard.enter();
                            return set.workbench().drawings().transects(file);
                        },
                        this::add,
                        fault -> model.session().notices().refuse(FaultWords.of(fault)))));
    }

    private void add(List<Transect> transects) {
        boolean added = model.step("step.transect.import", before -> {
            Drawing drawing = before;
            for (Transect transect : transects) {
                drawing = drawing.with(ControlLine.of(transect));
            }
            return drawing;
        });
        if (added) {
            model.session().notices().done(Words.of("transect.imported", transects.size()));
        }
    }

    /** Adds the prisms of a file that is asked for; a name that is taken gets a number. */
    public void importFile() {
        set().ifPresent(set -> dialogs.fileToRead(Words.of("import.title"), GEOJSON)
                .ifPresent(file -> files.run(
                        progress -> {
                            EntryGuard.enter();
                            return set.workbench().drawings().drawing(file);
                        },
                        this::add,
                        fault -> model.session().notices().refuse(FaultWords.of(fault)))));
    }

    private void add(DrawingFile file) {
        model.solids().know(file.surfaces());
        List<Shape> shapes = file.drawing().shapes();
        boolean added = model.step("step.import", before -> {
            Drawing drawing = before;
            for (Shape shape : shapes) {
                drawing = drawing.with(shape.named(drawing.freeName(shape.name())));
            }
            return drawing;
        });
        if (added) {
            String notes = String.join(" ", file.notes());
            model.session()
                    .notices()
                    .done(Words.of("imported", shapes.size(), notes).strip(), Words.of("action.undo"), model::undo);
        }
    }

    /**
     * Goes on once no work can be lost: saved, or given up by a clear answer.
     *
     * @param go goes on
     */
    public void whenSafe(Runnable go) {
        if (set().isEmpty() || !model.isUnsaved()) {
            go.run();
            return;
        }
        List<String> answers = List.of(Words.of("unsaved.save"), Words.of("unsaved.discard"), Words.of("unsaved.stay"));
        Optional<Integer> answer = questions.ask(
                Words.of("unsaved.title"),
                Words.of("unsaved.question", set().get().aquifer().name()),
                answers);
        if (answer.equals(Optional.of(0))) {
            OpenSet set = set().get();
            write(set, set.path().resolve(Opening.PRISMS), saved -> go.run());
        } else if (answer.equals(Optional.of(1))) {
            discard(go);
        }
    }

    private void discard(Runnable go) {
        OpenSet set = set().orElseThrow();
        keeping.cancel();
        files.run(
                progress -> {
                    EntryGuard.enter();
                    Files.deleteIfExists(set.path().resolve(Opening.UNSAVED_TRANSECTS));
                    return Files.deleteIfExists(set.path().resolve(Opening.UNSAVED));
                },
                gone -> go.run(),
                fault -> go.run());
    }
}
