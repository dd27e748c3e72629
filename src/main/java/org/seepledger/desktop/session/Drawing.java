package org.seepledger.desktop.session;

import java.util.List;
import java.util.Optional;
import org.seepledger.prism.Prism;

/**
 * The prisms as they are drawn at a moment.
 *
 * @param revision grows with each change, so that a result can say which geometry it belongs to
 * @param prisms in their order
 * @param settled whether the hand rests; false while something is dragged
 */
public record Drawing(long revision, List<Prism> prisms, boolean settled) {

    /** Nothing drawn. */
    public static final Drawing NONE = new Drawing(0, List.of(), true);

    /** Copies the list. */
    public Drawing {
        prisms = List.copyOf(prisms);
    }

    /**
     * {@return a prism}
     *
     * @param name its name
     */
    public Optional<Prism> prism(String name) {
        return prisms.stream().filter(prism -> prism.name().equals(name)).findFirst();
    }
}
