package org.seepledger.intake;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.seepledger.intake.Wishes.Topic;
import org.seepledger.io.table.StepKind;
import org.seepledger.unit.Measure;

/** Finds the instants of a set: what a person said, else dates or times of the files, else how many there are. */
final class TimesFinder {

    private static final Pattern EVERY = Pattern.compile("every\\s+([0-9.]+)");
    private static final double DAYS_OF_YEAR = 365;

    private final Plan plan;
    private final Consumer<Finding> findings;
    private final List<Told> told = new ArrayList<>();

    /** Steps that an item tells. */
    private record Told(Item item, StepKind kind, Steps steps) {

        boolean isInstants() {
            return kind == StepKind.INSTANT;
        }
    }

    TimesFinder(Plan plan, Consumer<Finding> findings) {
        this.plan = plan;
        this.findings = findings;
        for (Item item : plan.items()) {
            Optional<StepKind> kind = item.uses().stream()
                    .map(use -> use.role().steps())
                    .filter(steps -> steps != StepKind.NONE)
                    .findFirst();
            kind.ifPresent(steps -> Steps.of(item)
                    .filter(each -> each.count() > 1)
                    .ifPresent(each -> told.add(new Told(item, steps, each))));
        }
    }

    FoundTimes find() {
        int instants = most(StepKind.INSTANT);
        int intervals = most(StepKind.INTERVAL);
        boolean skip = plan.wishes().has(Topic.SKIP_FIRST) && instants == intervals && instants > 1;
        List<Double> listed = Numbers.of(plan.wishes().of(Topic.TIMES));
        int count = listed.size() > 1
                ? listed.size() - 1
                : skip ? intervals - 1 : intervals > 0 ? intervals : Math.max(1, instants - 1);
        checkCounts(count, instants, intervals, skip);
        FoundTimes found = listed.size() > 1
                ? new FoundTimes(listed, start(Optional.empty()), false, "You said so.")
                : spoken(count, skip)
                        .or(() -> dated(count, skip))
                        .or(() -> numbered(count))
                        .orElseGet(() -> counted(count));
        return new FoundTimes(found.instants(), found.start(), skip, found.reason());
    }

    private int most(StepKind kind) {
        return told.stream()
                .filter(each -> each.kind() == kind)
                .mapToInt(each -> each.steps().count())
                .max()
                .orElse(0);
    }

    private void checkCounts(int count, int instants, int intervals, boolean skip) {
        if (instants == intervals && instants > 1 && !skip) {
            findings.accept(Finding.fault(
                    Topic.SKIP_FIRST,
                    "There are " + instants
                            + " instants with heads or concentrations, and as many intervals with rates. "
                            + intervals + " intervals have " + (intervals + 1)
                            + " ends. If the heads are those at the ends of"
                            + " the intervals, what was at the beginning is missing: leave the first interval out. Or"
                            + " bring what is missing."));
            return;
        }
        for (Told each : told) {
            int wanted = count + (each.isInstants() ? 1 : 0) + (skip && !each.isInstants() ? 1 : 0);
            boolean sparse = each.steps().counted() && each.steps().count() <= wanted;
            if (each.steps().count() != wanted && !sparse) {
                findings.accept(Finding.fault(
                        each.item(),
                        each.item().id() + " tells "
                                + Wording.count(each.steps().count(), "step", "steps") + " apart; "
                                + Wording.count(count, "interval", "intervals") + " need " + wanted
                                + (each.isInstants() ? ", one for each end." : ".")));
            }
        }
    }

    private String start(Optional<LocalDate> first) {
        String said = plan.wishes().of(Topic.START);
        return said.isEmpty() ? first.map(LocalDate::toString).orElse("") : said;
    }

    /** {@code monthly}, {@code yearly}, {@code daily}, {@code every 10}. */
    private Optional<FoundTimes> spoken(int count, boolean skip) {
        String said = plan.wishes().of(Topic.TIMES).toLowerCase(Locale.ROOT);
        Matcher every = EVERY.matcher(said);
        List<Double> instants = new ArrayList<>();
        if (every.matches()) {
            double step = Double.parseDouble(every.group(1));
            for (int i = 0; i <= count; i++) {
                instants.add(i * step);
            }
            return Optional.of(new FoundTimes(instants, start(Optional.empty()), skip, "You said so."));
        }
        Optional<ChronoUnit> unit = switch (said) {
            case "daily" -> Optional.of(ChronoUnit.DAYS);
            case "monthly" -> Optional.of(ChronoUnit.MONTHS);
            case "yearly" -> Optional.of(ChronoUnit.YEARS);
            default -> Optional.empty();
        };
        if (unit.isEmpty()) {
            if (!said.isEmpty()) {
                findings.accept(Finding.fault(
                        Topic.TIMES,
                        "\"" + said + "\" is neither a list of instants, nor daily,"
                                + " monthly, yearly or every with a number."));
            }
            return Optional.empty();
        }
        Optional<LocalDate> first = DateText.read(plan.wishes().of(Topic.START)).map(date -> date.toLocalDate());
        if (first.isEmpty()) {
            findings.accept(Finding.fault(Topic.START, "Say the date of instant 0, from which to count."));
            return Optional.empty();
        }
        for (int i = 0; i <= count; i++) {
            LocalDate day = first.get().plus(i, unit.get());
            instants.add(inUnit(ChronoUnit.DAYS.between(first.get(), day)));
        }
        return Optional.of(new FoundTimes(instants, first.get().toString(), skip, "You said so."));
    }

    private Optional<FoundTimes> dated(int count, boolean skip) {
        for (StepKind kind : List.of(StepKind.INSTANT, StepKind.INTERVAL)) {
            for (Told each : told) {
                boolean instants = each.isInstants();
                int wanted = count + (instants ? 1 : skip ? 1 : 0);
                if (each.kind() == kind
                        && !each.steps().days().isEmpty()
                        && each.steps().count() == wanted) {
                    return Optional.of(dated(each, !instants && skip));
                }
            }
        }
        return Optional.empty();
    }

    private FoundTimes dated(Told each, boolean withoutFirst) {
        List<LocalDate> days = each.steps().days();
        Steps from = withoutFirst
                ? new Steps(
                        each.steps().texts().subList(1, days.size()),
                        days.subList(1, days.size()),
                        each.steps().months(),
                        List.of(),
                        false)
                : each.steps();
        if (!each.isInstants() && !from.months()) {
            findings.accept(Finding.doubt(
                    Topic.TIMES,
                    "The dates of " + each.item().id() + " are taken as the beginnings of"
                            + " intervals, the last one as long as the one before."));
        }
        List<Double> instants =
                from.sinceFirst(!each.isInstants()).stream().map(this::inUnit).toList();
        return new FoundTimes(
                instants,
                start(Optional.of(from.days().get(0))),
                false,
                "The dates of " + each.item().id() + " tell them.");
    }

    private Optional<FoundTimes> numbered(int count) {
        return told.stream()
                .filter(each -> each.isInstants() && each.steps().numbers().size() == count + 1)
                .findFirst()
                .map(each -> new FoundTimes(
                        each.steps().numbers(),
                        start(Optional.empty()),
                        false,
                        "The times in " + each.item().id() + " tell them."));
    }

    private FoundTimes counted(int count) {
        if (count == 1) {
            double length = inUnit(DAYS_OF_YEAR);
            findings.accept(Finding.note(
                    Topic.TIMES,
                    "There is one interval, taken to be a year of 365 days: rates do not depend on it, volumes do."));
            return new FoundTimes(
                    List.of(0.0, length), start(Optional.empty()), false, "Nothing tells how long it is.");
        }
        findings.accept(Finding.fault(
                Topic.TIMES,
                "There are " + count + " intervals, and nothing tells how long they are. Say"
                        + " monthly or yearly with the date of instant 0, or every 10 where each lasts 10 " + unit()
                        + ", or list the "
                        + (count + 1) + " instants."));
        List<Double> instants = new ArrayList<>();
        for (int i = 0; i <= count; i++) {
            instants.add((double) i);
        }
        return new FoundTimes(
                instants, start(Optional.empty()), false, "They are counted; nothing tells how long they are.");
    }

    private String unit() {
        String said = plan.wishes().of(Topic.TIME_UNIT);
        return said.isEmpty() ? "d" : said;
    }

    private double inUnit(double days) {
        try {
            double factor = Measure.of("d").in(Measure.of(unit()));
            return factor == 1 ? days : Numbers.clean(days * factor);
        } catch (IllegalArgumentException e) {
            return days;
        }
    }
}
