package org.seepledger.desktop.platform;

import java.io.File;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.stage.DirectoryChooser;
import javafx.stage.FileChooser;
import javafx.stage.Window;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.port.Settings;

/** The desktop's own file dialogs, which begin where the last one of their purpose ended. */
public final class ScreenDialogs implements FileDialogs {

    private final Window owner;
    private final LastFolders folders;

    /**
     * Makes dialogs.
     *
     * @param owner the window that they belong to
     * @param settings keep where a dialog of a purpose ended
     */
    public ScreenDialogs(Window owner, Settings settings) {
        this.owner = owner;
        this.folders = new LastFolders(settings);
    }

    @Override
    public Optional<Path> folder(String title) {
        DirectoryChooser chooser = new DirectoryChooser();
        chooser.setTitle(title);
        folders.of(title).ifPresent(chooser::setInitialDirectory);
        return kept(title, chooser.showDialog(owner));
    }

    @Override
    public Optional<Path> fileToRead(String title, Kind kind) {
        return kept(title, chooser(title, kind).showOpenDialog(owner));
    }

    @Override
    public List<Path> filesToRead(String title) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle(title);
        folders.of(title).ifPresent(chooser::setInitialDirectory);
        List<File> chosen = chooser.showOpenMultipleDialog(owner);
        return chosen == null
                ? List.of()
                : chosen.stream()
                        .map(file -> kept(title, file))
                        .flatMap(Optional::stream)
                        .toList();
    }

    @Override
    public Optional<Path> fileToWrite(String title, Kind kind, Path suggested) {
        FileChooser chooser = chooser(title, kind);
        File folder = suggested.toAbsolutePath().getParent().toFile();
        if (folder.isDirectory()) {
            chooser.setInitialDirectory(folder);
        }
        chooser.setInitialFileName(suggested.getFileName().toString());
        return kept(title, chooser.showSaveDialog(owner));
    }

    private FileChooser chooser(String title, Kind kind) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle(title);
        chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter(kind.words(), kind.pattern()));
        folders.of(title).ifPresent(chooser::setInitialDirectory);
        return chooser;
    }

    private Optional<Path> kept(String title, File chosen) {
        Optional<File> answer = Optional.ofNullable(chosen);
        answer.ifPresent(file -> folders.remember(title, file));
        return answer.map(File::toPath);
    }
}
