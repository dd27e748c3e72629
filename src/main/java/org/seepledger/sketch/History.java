package org.seepledger.sketch;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;

/**
 * The steps by which a drawing came to be, all of them, to be undone and done again.
 *
 * <p>A step is a name and a drawing. A gesture, such as a drag, shows any number of drawings and is one step in the end,
 * or none. Undoing, doing again and giving up a gesture put back the very same drawing that was there. Drawings share
 * what they have in common, so that a step costs little more than what it changed. For one thread.
 */
public final class History {

    private final Deque<Step> done = new ArrayDeque<>();
    private final Deque<Step> undone = new ArrayDeque<>();
    private Drawing current;
    private Optional<Step> gesture = Optional.empty();

    /** A step by its name, and the drawing on its other side. */
    private record Step(String name, Drawing drawing) {}

    /**
     * Begins with a drawing.
     *
     * @param first the drawing
     */
    public History(Drawing first) {
        this.current = first;
    }

    /**
     * {@return the drawing as it is shown, by a gesture perhaps}
     */
    public Drawing current() {
        return current;
    }

    /**
     * {@return the drawing as it is without the gesture that goes on; previews are made from it}
     */
    public Drawing settled() {
        return gesture.map(Step::drawing).orElse(current);
    }

    /**
     * Takes a step at once. A drawing that is the current one is no step.
     *
     * @param name what the step is called, as {@code Rename prism}
     * @param next the drawing that it leads to
     * @throws IllegalStateException if a gesture goes on
     */
    public void step(String name, Drawing next) {
        begin(name);
        preview(next);
        commit();
    }

    /**
     * Begins a gesture.
     *
     * @param name what the step will be called
     * @throws IllegalStateException if another goes on
     */
    public void begin(String name) {
        if (gesture.isPresent()) {
            throw new IllegalStateException("a gesture goes on");
        }
        gesture = Optional.of(new Step(name, current));
    }

    /**
     * Shows what the gesture would do.
     *
     * @param preview the drawing, made from {@link #settled()}
     * @throws IllegalStateException if no gesture goes on
     */
    public void preview(Drawing preview) {
        going();
        current = preview;
    }

    /**
     * Ends the gesture, which becomes one step; none if it leads to an equal drawing.
     *
     * @throws IllegalStateException if no gesture goes on
     */
    public void commit() {
        Step step = going();
        gesture = Optional.empty();
        if (current.equals(step.drawing())) {
            current = step.drawing();
            return;
        }
        done.push(step);
        undone.clear();
    }

    /** Gives the gesture up, if one goes on: the drawing is again what it was. */
    public void cancel() {
        current = settled();
        gesture = Optional.empty();
    }

    /**
     * {@return whether a gesture goes on}
     */
    public boolean isGesturing() {
        return gesture.isPresent();
    }

    /**
     * {@return the name of the step that can be undone; nothing during a gesture}
     */
    public Optional<String> undoable() {
        return next(done);
    }

    /**
     * {@return the name of the step that can be done again; nothing during a gesture}
     */
    public Optional<String> redoable() {
        return next(undone);
    }

    /** Undoes a step, if one can be. */
    public void undo() {
        exchange(done, undone);
    }

    /** Does a step again, if one can be. */
    public void redo() {
        exchange(undone, done);
    }

    private Optional<String> next(Deque<Step> steps) {
        return isGesturing()
                ? Optional.empty()
                : Optional.ofNullable(steps.peek()).map(Step::name);
    }

    private void exchange(Deque<Step> from, Deque<Step> to) {
        if (next(from).isPresent()) {
            Step step = from.pop();
            to.push(new Step(step.name(), current));
            current = step.drawing();
        }
    }

    private Step going() {
        return gesture.orElseThrow(() -> new IllegalStateException("no gesture goes on"));
    }
}
