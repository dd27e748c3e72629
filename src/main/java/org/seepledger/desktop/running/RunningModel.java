package org.seepledger.desktop.running;

import java.time.Duration;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.seepledger.desktop.task.Running;
import org.seepledger.desktop.words.Words;

/** The work that has taken long enough to be worth showing. */
public final class RunningModel {

    /** What is done sooner is not spoken of. */
    private static final Duration PATIENCE = Duration.ofMillis(600);

    private final Supplier<List<Running>> running;
    private final Map<Running, Seen> seen = new HashMap<>();
    private final ObservableList<Line> lines = FXCollections.observableArrayList();

    /** When work was first seen, and how it goes on. */
    private record Seen(Duration first, TimeLeft left) {}

    /**
     * A piece of work, as it is shown.
     *
     * @param work the work
     * @param words what it is
     * @param share how far it is, from 0 to 1; NaN where that is not known
     * @param left how long it will still take, in words, once that can be told
     */
    public record Line(Running work, String words, double share, Optional<String> left) {

        /** {@return all of it in a line} */
        public String told() {
            List<String> parts = new ArrayList<>(List.of(words));
            if (!Double.isNaN(share)) {
                parts.add(Words.of("running.share", Math.round(100 * share)));
            }
            left.ifPresent(parts::add);
            return String.join(" · ", parts);
        }
    }

    /**
     * Makes the model.
     *
     * @param running tells what is being done now
     */
    public RunningModel(Supplier<List<Running>> running) {
        this.running = running;
    }

    /**
     * Looks at how things stand: called a few times a second.
     *
     * @param now the time since any fixed moment
     */
    public void look(Duration now) {
        List<Running> works = running.get();
        seen.keySet().retainAll(works);
        works.forEach(work -> {
            Seen known = seen.computeIfAbsent(work, first -> new Seen(now, new TimeLeft()));
            known.left.look(work.stretch(), work.share(), now);
        });
        List<Line> next = works.stream()
                .filter(work -> now.minus(seen.get(work).first()).compareTo(PATIENCE) >= 0)
                .sorted((one, other) ->
                        seen.get(one).first().compareTo(seen.get(other).first()))
                .map(this::line)
                .toList();
        if (!next.equals(lines)) {
            lines.setAll(next);
        }
    }

    private Line line(Running work) {
        return new Line(
                work, Words.of(work.name()), work.share(), seen.get(work).left().words());
    }

    /** {@return what runs, the longest first} */
    public ObservableList<Line> lines() {
        return lines;
    }

    /** {@return whether there is something that can be stopped} */
    public boolean canStop() {
        return lines.stream().anyMatch(line -> line.work().listens());
    }

    /** Stops the work that has run longest of those that can be stopped. */
    public void stop() {
        lines.stream().map(Line::work).filter(Running::listens).findFirst().ifPresent(Running::stop);
    }
}
