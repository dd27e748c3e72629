package org.seepledger.desktop.draw;

import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.sketch.Limit;

/** Surface rasters in the aquifer's folder, chosen or typed as the top or bottom of a prism. */
public final class LidSurfaces {

    private static final FileDialogs.Kind GEOTIFF = new FileDialogs.Kind("GeoTIFF", "*.tif");

    private final DraftModel model;
    private final FileDialogs dialogs;
    private final Lane reading;

    /**
     * Makes the choice.
     *
     * @param model learns of surfaces
     * @param tasks reads them
     * @param dialogs asks for files
     */
    public LidSurfaces(DraftModel model, Tasks tasks, FileDialogs dialogs) {
        this.model = model;
        this.dialogs = dialogs;
        this.reading = tasks.latest("task.surface");
    }

    /** Asks for a raster; prisms name it from the folder that they are saved in, so it must lie there. */
    void choose(Consumer<String> then) {
        model.session()
                .set()
                .get()
                .ifPresent(set -> dialogs.fileToRead(Words.of("surface.title"), GEOTIFF)
                        .ifPresent(file -> inside(set, file)
                                .ifPresentOrElse(
                                        then,
                                        () -> model.session()
                                                .notices()
                                                .refuse(Words.of("surface.outside", set.path())))));
    }

    private static Optional<String> inside(OpenSet set, Path file) {
        Path folder = set.path().toAbsolutePath().normalize();
        Path raster = file.toAbsolutePath().normalize();
        return raster.startsWith(folder)
                ? Optional.of(folder.relativize(raster).toString().replace('\\', '/'))
                : Optional.empty();
    }

    /** Reads a surface and goes on once it is known; what is wrong with it is said as a notice. */
    void read(Limit.Surface surface, Runnable then) {
        model.session()
                .set()
                .get()
                .ifPresent(set -> reading.run(
                        progress -> {
                            EntryGuard.enter();
                            return set.workbench().drawings().surface(set.path().resolve(Opening.PRISMS), surface);
                        },
                        values -> {
                            model.solids().know(Map.of(surface, values));
                            then.run();
                        },
                        fault -> model.session().notices().refuse(FaultWords.of(fault))));
    }
}
