package org.seepledger.desktop.session;

import java.util.List;
import java.util.Optional;
import org.seepledger.sketch.ControlLine;

/**
 * The transects as they are drawn at a moment.
 *
 * @param lines in their order
 * @param settled whether the hand rests; false while something is dragged
 */
public record Transects(List<ControlLine> lines, boolean settled) {

    /** Nothing drawn. */
    public static final Transects NONE = new Transects(List.of(), true);

    /** Copies the list. */
    public Transects {
        lines = List.copyOf(lines);
    }

    /**
     * {@return a transect}
     *
     * @param name its name
     */
    public Optional<ControlLine> line(String name) {
        return lines.stream().filter(line -> line.name().equals(name)).findFirst();
    }
}
