package org.seepledger.desktop.platform;

import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import org.seepledger.desktop.port.CopyBoard;

/** The desktop's clipboard. */
public final class ScreenCopyBoard implements CopyBoard {

    @Override
    public void table(String tabSeparated, String html) {
        ClipboardContent content = new ClipboardContent();
        content.putString(tabSeparated);
        content.putHtml(html);
        Clipboard.getSystemClipboard().setContent(content);
    }

    @Override
    public void text(String text) {
        ClipboardContent content = new ClipboardContent();
        content.putString(text);
        Clipboard.getSystemClipboard().setContent(content);
    }
}
