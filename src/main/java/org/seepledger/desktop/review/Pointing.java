package org.seepledger.desktop.review;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.seepledger.desktop.session.RowAsked;
import org.seepledger.desktop.session.Session;
import org.seepledger.job.ReviewAnswer;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Line;
import org.seepledger.review.check.Finding;
import org.seepledger.review.mapping.Catalogue;
import org.seepledger.review.mapping.Tie;

/** Selects in the window what a finding is about. */
final class Pointing {

    private static final Pattern QUOTED = Pattern.compile("\"([^\"]+)\"");

    private final Session session;
    private final ReviewAnswer answer;

    Pointing(Session session, ReviewAnswer answer) {
        this.session = session;
        this.answer = answer;
    }

    /** Selects its prism, the interval that its period begins in, and its row; lights its face up. */
    void at(Finding finding) {
        if (session.drawing().get().prism(finding.prism()).isEmpty()) {
            return;
        }
        session.lit().set("");
        session.pointed().set(Optional.empty());
        session.selected().set(finding.prism());
        interval(finding).ifPresent(session.interval()::set);
        Optional<RowAsked> row = row(finding);
        row.filter(Pointing::isFace).map(RowAsked::item).ifPresent(session.lit()::set);
        session.pointed().set(row);
    }

    /** A finding in several periods says in its sentence which of them its numbers are of. */
    private Optional<Integer> interval(Finding finding) {
        Optional<String> said = answer.intervals().keySet().stream()
                .filter(label -> !label.isEmpty() && finding.message().endsWith(" " + label + "."))
                .max(Comparator.comparingInt(String::length));
        return Optional.ofNullable(answer.intervals().get(finding.period()))
                .or(() -> said.map(answer.intervals()::get));
    }

    private static boolean isFace(RowAsked row) {
        return !row.item().isEmpty() && (row.group() == Group.SIDE || row.group() == Group.LID);
    }

    /** The row of an item of ours that the finding's sentence names, else of the first that its term is tied to. */
    private Optional<RowAsked> row(Finding finding) {
        List<String> ties = answer.tables().stream()
                .map(table -> table.mapping().terms().get(finding.item()))
                .flatMap(Stream::ofNullable)
                .map(Tie::items)
                .flatMap(List::stream)
                .toList();
        Stream<String> named = QUOTED.matcher(finding.message())
                .results()
                .map((MatchResult quoted) -> quoted.group(1))
                .flatMap(this::keys);
        Stream<String> itself = Stream.of(finding.item().split(", ")).flatMap(this::keys);
        return Stream.of(named.filter(key -> within(key, ties)), ties.stream(), itself)
                .flatMap(keys -> keys)
                .findFirst()
                .map(Pointing::asked);
    }

    /** An item of the same name as the term is no part of it; one that the term is not tied to is another matter. */
    private static boolean within(String key, List<String> ties) {
        return ties.isEmpty() || ties.stream().anyMatch(tie -> key.equals(tie) || key.startsWith(tie + "/"));
    }

    private Stream<String> keys(String name) {
        return answer.catalogue().items().stream()
                .filter(item -> item.name().equals(name) || item.key().equals(name))
                .map(Catalogue.Known::key);
    }

    private static RowAsked asked(String key) {
        int slash = key.indexOf('/');
        String group = slash < 0 ? key : key.substring(0, slash);
        Group of = Stream.of(Group.values())
                .filter(each -> each.toString().equals(group.toLowerCase(Locale.ROOT)))
                .findFirst()
                .orElse(Group.TOTAL);
        return new RowAsked(of, slash < 0 ? "" : key.substring(slash + 1), Line.ALL_LAYERS);
    }
}
