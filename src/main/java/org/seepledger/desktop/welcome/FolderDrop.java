package org.seepledger.desktop.welcome;

import java.io.File;
import java.util.function.Consumer;
import javafx.scene.Node;
import javafx.scene.input.DragEvent;
import javafx.scene.input.TransferMode;

/** Opens a folder that is dropped on something. */
public final class FolderDrop {

    private final WelcomeModel model;
    private final Consumer<Boolean> over;

    private FolderDrop(WelcomeModel model, Consumer<Boolean> over) {
        this.model = model;
        this.over = over;
    }

    /**
     * Lets a folder be dropped.
     *
     * @param target where
     * @param model opens it
     * @param over told whether something that can be dropped is held over it
     */
    public static void on(Node target, WelcomeModel model, Consumer<Boolean> over) {
        FolderDrop drop = new FolderDrop(model, over);
        target.setOnDragOver(drop::hold);
        target.setOnDragExited(drag -> over.accept(false));
        target.setOnDragDropped(drop::take);
    }

    private void hold(DragEvent drag) {
        if (drag.getDragboard().hasFiles()) {
            drag.acceptTransferModes(TransferMode.COPY, TransferMode.LINK);
            over.accept(true);
        }
        drag.consume();
    }

    private void take(DragEvent drag) {
        over.accept(false);
        model.drop(drag.getDragboard().getFiles().stream().map(File::toPath).toList());
        drag.setDropCompleted(true);
        drag.consume();
    }
}
