package org.seepledger.desktop.notice;

import java.util.Optional;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.seepledger.desktop.notice.Notice.Kind;
import org.seepledger.desktop.notice.Notice.Offer;

/** All notices of a run of the program. Used on the window's own thread alone. */
public final class Notices {

    private static final int KEPT = 200;

    private final ObservableList<Notice> all = FXCollections.observableArrayList();
    private final ObservableList<Notice> readOnly = FXCollections.unmodifiableObservableList(all);
    private final ReadOnlyObjectWrapper<Optional<Notice>> latest = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyIntegerWrapper unread = new ReadOnlyIntegerWrapper();

    /**
     * Says that something has been done.
     *
     * @param words what
     */
    public void done(String words) {
        add(new Notice(Kind.DONE, words, Optional.empty()));
    }

    /**
     * Says that something has been done, and what can be done next.
     *
     * @param words what
     * @param offer what can be done next, in words
     * @param run does it
     */
    public void done(String words, String offer, Runnable run) {
        add(new Notice(Kind.DONE, words, Optional.of(new Offer(offer, run))));
    }

    /**
     * Warns.
     *
     * @param words of what
     */
    public void warn(String words) {
        unread.set(unread.get() + 1);
        add(new Notice(Kind.WARNING, words, Optional.empty()));
    }

    /**
     * Says that something could not be done.
     *
     * @param words why, and what to do
     */
    public void refuse(String words) {
        add(new Notice(Kind.REFUSED, words, Optional.empty()));
    }

    private void add(Notice notice) {
        all.add(0, notice);
        if (all.size() > KEPT) {
            all.remove(KEPT, all.size());
        }
        latest.set(Optional.of(notice));
    }

    /** {@return all that are kept, the latest first} */
    public ObservableList<Notice> all() {
        return readOnly;
    }

    /** {@return the one that is shown by itself, if there is one} */
    public ReadOnlyObjectProperty<Optional<Notice>> latest() {
        return latest.getReadOnlyProperty();
    }

    /** {@return how many warnings have not been read} */
    public ReadOnlyIntegerProperty unread() {
        return unread.getReadOnlyProperty();
    }

    /** The one that is shown by itself goes; it stays in the list. */
    public void pass() {
        latest.set(Optional.empty());
    }

    /** The list has been opened: no warning is unread any more. */
    public void read() {
        unread.set(0);
        pass();
    }
}
