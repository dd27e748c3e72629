package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.seepledger.review.mapping.Catalogue;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Kind;
import org.seepledger.review.mapping.Submission;

/** Reviews a submitted budget. */
public final class Review {

    private static final int NAMES_TOLD = 8;

    private final List<Submission> submissions;
    private final List<Figure> figures;
    private final double tolerance;
    private final List<Finding> findings = new ArrayList<>();
    private final List<Beside> beside = new ArrayList<>();

    private Review(List<Submission> submissions, double tolerance) {
        this.submissions = submissions;
        this.tolerance = tolerance;
        this.figures =
                submissions.stream().flatMap(one -> one.figures().stream()).toList();
    }

    /**
     * What a review comes to.
     *
     * @param findings the findings, the heaviest first
     * @param beside what was submitted beside what was recomputed
     */
    public record Result(List<Finding> findings, List<Beside> beside) {

        /** Copies the lists. */
        public Result {
            findings = List.copyOf(findings);
            beside = List.copyOf(beside);
        }

        /**
         * {@return whether a finding has a severity}
         *
         * @param severity the severity
         */
        public boolean has(Severity severity) {
            return findings.stream().anyMatch(finding -> finding.severity() == severity);
        }
    }

    /**
     * {@return the review of a submission}
     *
     * @param submissions its tables
     * @param reference what it is held against; empty for the tables alone
     * @param percent the tolerance, in percent of throughput
     */
    public static Result of(List<Submission> submissions, Optional<Reference> reference, double percent) {
        Review review = new Review(submissions, percent / 100);
        review.findings.addAll(Arithmetic.of(review.figures, review.tolerance));
        review.untied();
        reference.ifPresent(review::compare);
        List<Finding> sorted = Merging.of(review.findings);
        return new Result(sorted, review.beside);
    }

    private void compare(Reference reference) {
        Map<String, String> areas = areas(reference.catalogue());
        List<Figure> settled = StorageSense.settled(figures);
        List<Series> all = Pairing.of(settled, areas, reference, Rounding.of(figures), tolerance);
        Map<List<Object>, List<Series>> budgets = all.stream()
                .collect(Collectors.groupingBy(
                        one -> List.of(one.prism(), one.amount()), LinkedHashMap::new, Collectors.toList()));
        budgets.values().forEach(series -> {
            Diagnosis.Result result = Diagnosis.of(series.get(0).prism(), series, tolerance, reference.catalogue());
            findings.addAll(result.findings());
            result.series().forEach(one -> one.points().forEach(point -> beside.add(Beside.of(one, point, tolerance))));
        });
        tellUntiedAreas(areas);
        tellUntiedPeriods(reference, areas);
        tellUnits();
    }

    private Map<String, String> areas(Catalogue catalogue) {
        return areas(submissions, catalogue);
    }

    /**
     * {@return which prisms the areas of a submission are, by label; a lone area is the lone prism}
     *
     * @param submissions its tables
     * @param catalogue what there is to tie to
     */
    public static Map<String, String> areas(List<Submission> submissions, Catalogue catalogue) {
        Map<String, String> areas = new LinkedHashMap<>();
        for (Submission submission : submissions) {
            areas.putAll(submission.mapping().areas());
        }
        Set<String> labels = submissions.stream()
                .flatMap(one -> one.figures().stream())
                .map(Figure::area)
                .collect(Collectors.toCollection(LinkedHashSet::new));
        for (String label : labels) {
            catalogue.prisms().stream()
                    .filter(label::equalsIgnoreCase)
                    .findFirst()
                    .ifPresent(prism -> areas.putIfAbsent(label, prism));
        }
        if (labels.size() == 1 && catalogue.prisms().size() == 1) {
            areas.putIfAbsent(labels.iterator().next(), catalogue.prisms().get(0));
        }
        areas.values().removeIf(prism -> !catalogue.prisms().contains(prism));
        return areas;
    }

    private void untied() {
        Map<String, Kind> terms = new LinkedHashMap<>();
        figures.forEach(figure -> terms.putIfAbsent(figure.term(), figure.tie().kind()));
        List<String> unknown = terms.keySet().stream()
                .filter(term -> terms.get(term) == Kind.UNTIED)
                .toList();
        List<String> outside = terms.keySet().stream()
                .filter(term -> terms.get(term) == Kind.OUTSIDE)
                .toList();
        if (!unknown.isEmpty()) {
            tell(
                    unknown.size() == terms.size() ? Severity.DOUBT : Severity.NOTE,
                    Code.NOT_TIED,
                    "Terms that are tied to none of ours: " + listed(unknown)
                            + ". Correct mapping.json and review again.");
        }
        if (!outside.isEmpty()) {
            note(Code.NOT_RECOMPUTED, "Terms outside the aquifer were not recomputed: " + listed(outside) + ".");
        }
        List<String> unread =
                submissions.stream().flatMap(one -> one.unread().stream()).toList();
        if (!unread.isEmpty()) {
            note(Code.NOT_TIED, "Not read as figures: " + listed(unread) + ".");
        }
        long notGiven =
                figures.stream().filter(figure -> Double.isNaN(figure.value())).count();
        if (notGiven > 0) {
            note(
                    Code.NOT_TIED,
                    notGiven + (notGiven == 1 ? " figure is" : " figures are")
                            + " marked as not known, and count as nothing.");
        }
    }

    private void tellUntiedAreas(Map<String, String> areas) {
        List<String> unknown = figures.stream()
                .map(Figure::area)
                .distinct()
                .filter(area -> !areas.containsKey(area))
                .toList();
        if (!unknown.isEmpty()) {
            note(
                    Code.NOT_TIED,
                    "Areas that are tied to no prism: " + listed(unknown) + ". Correct mapping.json and review again.");
        }
    }

    private void tellUntiedPeriods(Reference reference, Map<String, String> areas) {
        List<String> unknown = figures.stream()
                .filter(figure -> areas.containsKey(figure.area()))
                .filter(figure ->
                        reference.of(areas.get(figure.area()), figure.when()).isEmpty())
                .map(figure -> figure.when().label())
                .distinct()
                .toList();
        if (!unknown.isEmpty()) {
            note(
                    Code.NOT_TIED,
                    "Periods that the record does not cover, or that nobody understands: " + listed(unknown) + ".");
        }
    }

    private void tellUnits() {
        if (figures.stream().anyMatch(figure -> figure.unit().isEmpty())) {
            note(Code.UNIT_ASSUMED, "Some figures have no unit; they were taken to be in the aquifer's own.");
        }
    }

    private void note(Code code, String message) {
        tell(Severity.NOTE, code, message);
    }

    private void tell(Severity severity, Code code, String message) {
        findings.add(Finding.of(severity, code, Finding.SEVERAL, Finding.SEVERAL, Finding.SEVERAL, message));
    }

    private static String listed(List<String> names) {
        String told = names.stream()
                .limit(NAMES_TOLD)
                .map(name -> name.isEmpty() ? "(no name)" : "\"" + name + "\"")
                .collect(Collectors.joining(", "));
        return names.size() > NAMES_TOLD ? told + " and " + (names.size() - NAMES_TOLD) + " more" : told;
    }
}
