package org.seepledger.review.mapping;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Pattern;
import org.seepledger.ledger.Group;
import org.seepledger.review.sheet.UnitWords;

/** Ties the terms of a table by the words that the trade has for them. */
final class TermWords {

    private static final String IN = "(in-?flows?|inputs?|gains?|in|additions?)";
    private static final String OUT = "(out-?flows?|outputs?|loss(es)?|out|withdrawals?)";

    /** A pattern of a total and what it is; the first that is found wins. */
    private record Total(Pattern words, Kind kind) {

        static Total of(String words, Kind kind) {
            return new Total(Pattern.compile(words), kind);
        }
    }

    private static final List<Total> TOTALS = List.of(
            Total.of("^net closure error$|^(mean|average|median)$", Kind.IGNORED),
            Total.of(
                    "(closure|error|discrepanc|imbalance|residual|difference).*(%|per ?cent)|^%|per ?cent.*(error|discrepanc|residual|difference)|^closure error$",
                    Kind.PERCENT),
            Total.of(
                    "residual|imbalance|discrepanc|unaccounted|unexplained|closure|balance error|" + IN + " ?- ?" + OUT
                            + " ?- ?|^(error|difference|balance|rest|remainder)$",
                    Kind.RESIDUAL),
            Total.of("(opening|initial|start).*(stor|stock)|(stor|stock).*(start|begin|opening)", Kind.OPENING),
            Total.of("(closing|final|end).*(stor|stock)|(stor|stock).*\\b(end|closing)", Kind.CLOSING),
            Total.of(
                    "change (in|of) ([\\w-]+ )*stor|storage change|[δ∆Δ] ?s(torage)?\\b|delta s|^d ?s$|change in stock",
                    Kind.CHANGE),
            Total.of("sub-?total", Kind.SUBTOTAL),
            Total.of(
                    "^" + IN + " ?(minus|less|-) ?" + OUT
                            + "$|^net (total|balance|budget)$|^total net|^(total|sum)$|^net flow$|total \\(?in ?- ?out",
                    Kind.NET_TOTAL),
            Total.of(
                    "(total|sum|all)( of)?( ground-?water| water)? " + IN + "$|^" + IN
                            + "[,:]? (total|sum)$|^total (recharge|sources)$|^(in-?flows?|inputs?)$|^total in\\b|^sum in\\b",
                    Kind.TOTAL_IN),
            Total.of(
                    "(total|sum|all)( of)?( ground-?water| water)? " + OUT + "$|^" + OUT
                            + "[,:]? (total|sum)$|^total (discharge|sinks)$|^(out-?flows?|outputs?)$|^total out\\b|^sum out\\b",
                    Kind.TOTAL_OUT));

    /** What a category of sources is about, in the words of both sides, and which way it counts by itself. */
    private record Concept(Pattern words, Sense sense, Catalogue.Nature nature) {

        static Concept of(String words, Sense sense, Catalogue.Nature nature) {
            return new Concept(Pattern.compile(words), sense, nature);
        }
    }

    private static final List<Concept> CONCEPTS = List.of(
            Concept.of(
                    "inject|managed recharge|artificial recharge|aquifer recharge well",
                    Sense.IN,
                    Catalogue.Nature.WELLS),
            Concept.of("recharge|percolat|infiltrat|deep drainage", Sense.IN, Catalogue.Nature.AREAL),
            Concept.of(
                    "pump|abstract|extract|withdraw|\\bwells?\\b(?! field)|borehole|\\bbores?\\b|suppl(y|ies)|irrigation|production",
                    Sense.OUT,
                    Catalogue.Nature.WELLS),
            Concept.of("evapo|transpir|\\bet\\b", Sense.OUT, Catalogue.Nature.AREAL),
            Concept.of("\\bdrain", Sense.OUT, Catalogue.Nature.CELLS),
            Concept.of(
                    "river|stream|creek|canal|ditch|lake|pond|base-?flow|spring|wetland|leak",
                    null,
                    Catalogue.Nature.CELLS));

    private static final Pattern OUTSIDE = Pattern.compile(
            "precipitation|rainfall|\\brain\\b|snow|run-?off|interception|sewer|soil (moisture|water)|overland|interflow|surface[- ]water|imported water|water use");
    private static final Pattern VERTICAL = Pattern.compile(
            "vertical|overlying|underlying|from above|to above|from below|to below|upward|downward|deeper|shallower|aquitard|\\blids?\\b|through the (top|bottom|base)");
    private static final Pattern TOP = Pattern.compile("\\btop\\b|overlying|above|upper (face|boundary)|shallower");
    private static final Pattern BOTTOM =
            Pattern.compile("\\bbottom\\b|underlying|below|\\bbase\\b|lower (face|boundary)|deeper");
    private static final Pattern LATERAL = Pattern.compile(
            "lateral|\\bsides?\\b|boundar|under-?flow|through-?flow|subsurface (in|out)?-?flow|ground-?water (in|out)?-?flow|neighbou?r|adjacent|horizontal");
    private static final Pattern STORAGE = Pattern.compile("stor(age|ed)\\b");

    private final Catalogue catalogue;

    TermWords(Catalogue catalogue) {
        this.catalogue = catalogue;
    }

    static String plain(String label) {
        return UnitWords.without(label)
                .toLowerCase(Locale.ROOT)
                .replace('\u2013', '-')
                .replace('\u2212', '-')
                .replace('_', ' ')
                .replaceAll("[*:†]+$", "")
                .replaceAll("^'", "")
                .replaceAll("\\s+", " ")
                .strip();
    }

    /**
     * What a label is tied to.
     *
     * @param label the label
     * @param group what stands in the row's column of groups; empty if nothing
     */
    Tie of(String label, String group) {
        String words = plain(label);
        String kind = plain(group);
        if (words.isEmpty()) {
            return Tie.of(Kind.UNTIED);
        }
        boolean total = kind.matches("totals?");
        Optional<Tie> ours = total ? Optional.empty() : named(words, kind);
        if (ours.isPresent()
                && words.equals(
                        ours.get().items().get(0).replaceFirst("^[a-z]+/", "").toLowerCase(Locale.ROOT))) {
            return ours.get();
        }
        boolean percent = UnitWords.in(label).filter("%"::equals).isPresent();
        for (Total known : TOTALS) {
            if (known.words().matcher(percent ? words + " %" : words).find()) {
                return new Tie(known.kind(), List.of(), Optional.empty());
            }
        }
        return ours.orElseGet(() -> byConcept(words, kind));
    }

    /** The item whose name a label is or holds; the longest name wins. */
    private Optional<Tie> named(String words, String kind) {
        return catalogue.items().stream()
                .filter(known -> kind.isEmpty()
                        || !isGroup(kind)
                        || known.group().toString().equals(kind))
                .filter(known -> holds(words, known.name().toLowerCase(Locale.ROOT)))
                .max(Comparator.comparingInt(known -> known.name().length()))
                .map(known -> Tie.item(List.of(known.key()), sense(words, known)));
    }

    private static boolean isGroup(String kind) {
        for (Group group : Group.values()) {
            if (group.toString().equals(kind)) {
                return true;
            }
        }
        return false;
    }

    private static boolean holds(String words, String name) {
        return Pattern.compile("(?<![\\p{L}\\d])" + Pattern.quote(name) + "(?![\\p{L}\\d])")
                .matcher(words)
                .find();
    }

    private static Sense sense(String words, Catalogue.Known known) {
        Sense said = direction(words, known.group() == Group.STORAGE);
        if (said != null || known.group() != Group.SOURCE) {
            return said;
        }
        return CONCEPTS.stream()
                .filter(concept -> concept.words().matcher(words).find())
                .findFirst()
                .map(Concept::sense)
                .orElse(null);
    }

    private Tie byConcept(String words, String kind) {
        Sense said = direction(words, STORAGE.matcher(words).find());
        if (STORAGE.matcher(words).find() || kind.equals("storage")) {
            return Tie.item(storage(words), said);
        }
        if (LATERAL.matcher(words).find() || kind.equals("side")) {
            return Tie.item(List.of("side"), said);
        }
        if (VERTICAL.matcher(words).find() || kind.equals("lid")) {
            return Tie.item(lids(words), said);
        }
        for (Concept concept : CONCEPTS) {
            if (concept.words().matcher(words).find()) {
                List<String> items = sources(concept);
                if (!items.isEmpty() || catalogue.items().isEmpty()) {
                    List<String> tied = items.isEmpty() ? List.of("source/" + words) : items;
                    return Tie.item(tied, said == null ? concept.sense() : said);
                }
                if (concept.nature() == Catalogue.Nature.AREAL) {
                    return Tie.of(Kind.OUTSIDE);
                }
            }
        }
        if (OUTSIDE.matcher(words).find()) {
            return Tie.of(Kind.OUTSIDE);
        }
        return new Tie(Kind.UNTIED, List.of(), Optional.ofNullable(said));
    }

    /** Our categories of the same words; else those that are given in the same way. */
    private List<String> sources(Concept concept) {
        List<Catalogue.Known> sources = catalogue.items().stream()
                .filter(known -> known.group() == Group.SOURCE)
                .toList();
        List<String> alike = sources.stream()
                .filter(known -> concept.words()
                        .matcher(known.name().toLowerCase(Locale.ROOT))
                        .find())
                .filter(known -> CONCEPTS.stream()
                        .filter(other -> other.words()
                                .matcher(known.name().toLowerCase(Locale.ROOT))
                                .find())
                        .findFirst()
                        .filter(concept::equals)
                        .isPresent())
                .map(Catalogue.Known::key)
                .toList();
        if (concept.nature() == Catalogue.Nature.WELLS && concept.sense() == Sense.OUT) {
            List<String> wells = new ArrayList<>(alike);
            sources.stream()
                    .filter(known -> known.nature() == Catalogue.Nature.WELLS)
                    .filter(known -> !wells.contains(known.key()))
                    .filter(known -> CONCEPTS.stream()
                            .noneMatch(other -> other.words()
                                    .matcher(known.name().toLowerCase(Locale.ROOT))
                                    .find()))
                    .forEach(known -> wells.add(known.key()));
            return wells;
        }
        return alike;
    }

    private static List<String> storage(String words) {
        if (words.matches(".*(elastic|confined|compress|specific storage).*") && !words.contains("unconfined")) {
            return List.of("storage/elastic storage");
        }
        return words.matches(".*(water[- ]table|specific yield|unconfined|drainable|phreatic).*")
                ? List.of("storage/water-table storage")
                : List.of("storage");
    }

    private static List<String> lids(String words) {
        boolean top = TOP.matcher(words).find();
        boolean bottom = BOTTOM.matcher(words).find();
        if (top == bottom) {
            return List.of("lid");
        }
        return List.of(top ? "lid/top" : "lid/bottom");
    }

    /** Which way the words themselves say that a figure counts. */
    static Sense direction(String words, boolean storage) {
        if (storage) {
            if (words.matches(".*(releas|from|deplet|decreas|\\bloss|drawn|taken from).*")) {
                return Sense.IN;
            }
            if (words.matches(".*(uptake|\\bto\\b|into|increas|gain|accretion|replenish|change).*")) {
                return words.contains("change") ? Sense.LOSS : Sense.OUT;
            }
        }
        if (words.matches(".*\\bnet (out|loss|discharge).*")) {
            return Sense.LOSS;
        }
        if (words.matches(".*\\bnet\\b.*")) {
            return Sense.NET;
        }
        boolean in =
                words.matches(".*(in-?flow|\\bin$|\\bin\\b ?\\(|^from |\\bgain|\\bfrom\\b(?!.*\\bto\\b)|\\binput).*")
                        || words.matches("in|into|source|sources|inflow|credit");
        boolean out =
                words.matches(".*(out-?flow|\\bout\\b|^to |\\bloss|discharge|\\bto\\b(?!.*\\bfrom\\b)|\\boutput).*")
                        || words.matches("out|sink|sinks|outflow|debit");
        return in == out ? null : in ? Sense.IN : Sense.OUT;
    }
}
