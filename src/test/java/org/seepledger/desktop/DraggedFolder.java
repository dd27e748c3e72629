package org.seepledger.desktop;

import com.sun.javafx.tk.TKClipboard;
import java.lang.reflect.Constructor;
import java.lang.reflect.Proxy;
import java.nio.file.Path;
import java.util.List;
import javafx.event.Event;
import javafx.event.EventType;
import javafx.scene.Node;
import javafx.scene.input.DataFormat;
import javafx.scene.input.DragEvent;
import javafx.scene.input.Dragboard;
import javafx.scene.input.PickResult;
import javafx.scene.input.TransferMode;

/**
 * What the toolkit tells a pane when a file manager drags a folder over it and drops it: the screen in memory itself has
 * no other programs.
 */
final class DraggedFolder {

    private DraggedFolder() {}

    /** Drags the folder over a node and drops it there. */
    static void dropOn(Node target, Path folder) {
        Dragboard board = board(folder);
        for (EventType<DragEvent> type : List.of(DragEvent.DRAG_OVER, DragEvent.DRAG_DROPPED)) {
            Event.fireEvent(
                    target,
                    new DragEvent(
                            type, board, 9, 9, 9, 9, TransferMode.COPY, null, target, new PickResult(target, 9, 9)));
        }
    }

    private static Dragboard board(Path folder) {
        Object files = List.of(folder.toAbsolutePath().toFile());
        TKClipboard clipboard = (TKClipboard) Proxy.newProxyInstance(
                DraggedFolder.class.getClassLoader(),
                new Class<?>[] {TKClipboard.class},
                (proxy, method, arguments) -> switch (method.getName()) {
                    case "hasContent" -> DataFormat.FILES.equals(arguments[0]);
                    case "getContent" -> DataFormat.FILES.equals(arguments[0]) ? files : null;
                    default -> null;
                });
        try {
            Constructor<Dragboard> made = Dragboard.class.getDeclaredConstructor(TKClipboard.class);
            made.setAccessible(true);
            return made.newInstance(clipboard);
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException(e);
        }
    }
}
