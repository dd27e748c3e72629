package org.seepledger.desktop.map;

import java.nio.file.Path;
import java.util.Optional;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleDoubleProperty;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.GroundPicture;

/** The picture that lies under the map, if one was asked for. */
public final class GroundModel {

    private static final FileDialogs.Kind GEOTIFF = new FileDialogs.Kind("GeoTIFF", "*.tif");

    private static final double USUAL_COVER = 0.6;

    private final Session session;
    private final FileDialogs dialogs;
    private final Lane reading;
    private final DoubleProperty cover = new SimpleDoubleProperty(USUAL_COVER);
    private final ReadOnlyObjectWrapper<Optional<GroundPicture>> picture =
            new ReadOnlyObjectWrapper<>(Optional.empty());

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param tasks reads pictures
     * @param dialogs asks for a file
     */
    public GroundModel(Session session, Tasks tasks, FileDialogs dialogs) {
        this.session = session;
        this.dialogs = dialogs;
        this.reading = tasks.latest("task.ground");
        session.set().addListener((set, before, after) -> clear());
    }

    /** Asks for a picture and lays it under the map; the values over it let it show through. */
    public void choose() {
        session.set()
                .get()
                .ifPresent(set ->
                        dialogs.fileToRead(Words.of("ground.title"), GEOTIFF).ifPresent(file -> read(set, file)));
    }

    private void read(OpenSet set, Path file) {
        reading.run(
                progress -> {
                    EntryGuard.enter();
                    return set.workbench().views().ground(file, progress);
                },
                read -> {
                    picture.set(Optional.of(read));
                    session.notices().done(Words.of("ground.laid", file.getFileName()));
                },
                fault -> session.notices().refuse(FaultWords.of(fault)));
    }

    /** Takes the picture away. */
    public void clear() {
        reading.cancel();
        picture.set(Optional.empty());
    }

    /** {@return how much of the picture the values over it cover, from 0 to 1} */
    public DoubleProperty cover() {
        return cover;
    }

    /** {@return the picture} */
    public ReadOnlyObjectProperty<Optional<GroundPicture>> picture() {
        return picture.getReadOnlyProperty();
    }
}
