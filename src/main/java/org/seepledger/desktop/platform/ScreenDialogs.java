package org.seepledger.desktop.platform;

import java.io.File;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.stage.DirectoryChooser;
import javafx.stage.FileChooser;
import javafx.stage.Window;
import org.seepledger.desktop.port.FileDialogs;

/** The desktop's own file dialogs, which begin where the last one ended. */
public final class ScreenDialogs implements FileDialogs {

    private final Window owner;
    private Optional<File> last = Optional.empty();

    /**
     * Makes dialogs.
     *
     * @param owner the window that they belong to
     */
    public ScreenDialogs(Window owner) {
        this.owner = owner;
    }

    @Override
    public Optional<Path> folder(String title) {
        DirectoryChooser chooser = new DirectoryChooser();
        chooser.setTitle(title);
        last.ifPresent(chooser::setInitialDirectory);
        return kept(chooser.showDialog(owner));
    }

    @Override
    public Optional<Path> fileToRead(String title, Kind kind) {
        return kept(chooser(title, kind).showOpenDialog(owner));
    }

    @Override
    public List<Path> filesToRead(String title) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle(title);
        last.ifPresent(chooser::setInitialDirectory);
        List<File> chosen = chooser.showOpenMultipleDialog(owner);
        return chosen == null
                ? List.of()
                : chosen.stream().map(this::kept).flatMap(Optional::stream).toList();
    }

    @Override
    public Optional<Path> fileToWrite(String title, Kind kind, Path suggested) {
        FileChooser chooser = chooser(title, kind);
        File folder = suggested.toAbsolutePath().getParent().toFile();
        if (folder.isDirectory()) {
            chooser.setInitialDirectory(folder);
        }
        chooser.setInitialFileName(suggested.getFileName().toString());
        return kept(chooser.showSaveDialog(owner));
    }

    private FileChooser chooser(String title, Kind kind) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle(title);
        chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter(kind.words(), kind.pattern()));
        last.ifPresent(chooser::setInitialDirectory);
        return chooser;
    }

    private Optional<Path> kept(File chosen) {
        Optional<File> answer = Optional.ofNullable(chosen);
        answer.map(File::getAbsoluteFile).map(File::getParentFile).ifPresent(folder -> last = Optional.of(folder));
        return answer.map(File::toPath);
    }
}
