package org.seepledger.job;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Layer;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Times;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WaterBalance;
import org.seepledger.balance.WellRule;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.NamedPeriod;
import org.seepledger.ledger.Period;
import org.seepledger.prism.Prism;
import org.seepledger.prism.PrismCut;
import org.seepledger.prism.WholeCells;
import org.seepledger.progress.Progress;
import org.seepledger.review.check.Recomputed;
import org.seepledger.review.check.Recomputed.Aspect;
import org.seepledger.review.check.Recomputed.Variant;
import org.seepledger.review.check.Recomputed.WellVolume;
import org.seepledger.review.check.Reference;
import org.seepledger.review.mapping.Catalogue;
import org.seepledger.review.mapping.Catalogue.Nature;
import org.seepledger.review.mapping.Days;
import org.seepledger.review.mapping.When;
import org.seepledger.unit.Measure;

/** Recomputes what a submission is held against: the prisms' budgets, and otherwise where something does not agree. */
final class Recomputation implements Reference {

    /** A period that the record covers for less than this share is not compared. */
    private static final double COVERED = 0.9;

    private static final double ROUNDING = 1e-6;

    private final Aquifer aquifer;
    private final List<Prism> prisms;
    private final int threads;
    private final Progress progress;
    private final Balance balance;
    private final double metres;
    private final double daysPerUnit;
    private final Map<String, Optional<Balance>> otherwise = new HashMap<>();
    private final Map<List<Object>, Optional<Recomputed>> known = new HashMap<>();

    /**
     * Recomputes.
     *
     * @param aquifer the aquifer
     * @param prisms the prisms
     * @param wholeCells whether cells along outlines are taken whole from the start
     * @param threads how many threads may work
     * @param progress told how far the work is
     */
    Recomputation(Aquifer aquifer, List<Prism> prisms, boolean wholeCells, int threads, Progress progress) {
        this.aquifer = aquifer;
        this.prisms = wholeCells ? whole(aquifer, prisms) : prisms;
        this.threads = threads;
        this.progress = progress;
        this.metres = aquifer.lengthUnit().in(Measure.of("m"));
        this.daysPerUnit = aquifer.timeUnit().in(Measure.of("d"));
        this.balance = balance(aquifer, this.prisms, WellRule.POINT);
    }

    Balance balance() {
        return balance;
    }

    private Balance balance(Aquifer of, List<Prism> over, WellRule wells) {
        return WaterBalance.of(of, over, wells, threads, progress);
    }

    private static List<Prism> whole(Aquifer aquifer, List<Prism> prisms) {
        return prisms.stream()
                .map(prism -> WholeCells.of(PrismCut.of(prism, aquifer.grid()), aquifer.grid())
                        .orElse(prism))
                .toList();
    }

    @Override
    public Catalogue catalogue() {
        Map<String, Nature> natures = new HashMap<>();
        for (Source source : aquifer.sources()) {
            if (source instanceof Source.Points points) {
                points.wells().forEach(well -> natures.put(well.category(), Nature.WELLS));
            } else {
                natures.put(source.category(), source instanceof Source.Areal ? Nature.AREAL : Nature.CELLS);
            }
        }
        List<Catalogue.Known> items = balance.ledgers().stream()
                .flatMap(ledger -> ledger.accounts().stream())
                .map(account -> new Catalogue.Known(account.group(), account.item(), nature(account, natures)))
                .distinct()
                .toList();
        return new Catalogue(prisms.stream().map(Prism::name).toList(), items);
    }

    private static Nature nature(Account account, Map<String, Nature> natures) {
        if (account.group() == Group.STORAGE) {
            return Nature.STORAGE;
        }
        return account.group() == Group.SOURCE ? natures.getOrDefault(account.item(), Nature.CELLS) : Nature.FACE;
    }

    @Override
    public double rateUnit() {
        return volumeUnit() / daysPerUnit;
    }

    @Override
    public double volumeUnit() {
        return metres * metres * metres;
    }

    @Override
    public Optional<Recomputed> of(String prism, When when) {
        return known.computeIfAbsent(
                List.of(prism, when), any -> period(when).map(period -> recomputed(prism, period)));
    }

    private Recomputed recomputed(String prism, Period period) {
        int index = IntStream.range(0, prisms.size())
                .filter(i -> prisms.get(i).name().equals(prism))
                .findFirst()
                .orElseThrow();
        Ledger ledger = balance.ledgers().get(index);
        Supplier<List<Variant>> variants = new Supplier<>() {
            private List<Variant> made;

            @Override
            public List<Variant> get() {
                made = made == null ? variants(index, period) : made;
                return made;
            }
        };
        double area = balance.cuts().get(index).area() * metres * metres;
        return new Recomputed(
                ledger.budget(period),
                volumeUnit(),
                period.duration() * daysPerUnit,
                area,
                variants,
                wells(index, period));
    }

    private List<WellVolume> wells(int prism, Period period) {
        PrismCut cut = balance.cuts().get(prism);
        List<WellVolume> wells = new ArrayList<>();
        for (PlacedWell well : aquifer.placedWells()) {
            double volume = well.well().meanRate(period.from(), period.to()) * period.duration() * volumeUnit();
            wells.add(new WellVolume(
                    well.well().name(), well.well().category(), cut.meet(well).inside(), volume));
        }
        return wells;
    }

    /** The period of ours that a submitted one is, as far as the record covers it. */
    Optional<Period> period(When when) {
        Times times = aquifer.times();
        double first = times.instant(0);
        double last = times.instant(times.intervals());
        double slack = ROUNDING * (last - first);
        if (when.from() >= first - slack && when.to() <= last + slack && when.from() < when.to()) {
            return named(when.name(), when.from(), when.to());
        }
        if (when.days().isPresent() && times.hasDates()) {
            Days days = when.days().get();
            return named(when.name(), time(days.from()), time(days.to()));
        }
        List<Period> all = new ArrayList<>(new Periods(times).every(Periods.Every.INTERVAL, 1));
        all.add(new Periods(times).record());
        Optional<Period> ours = all.stream()
                .filter(period -> period.name().equalsIgnoreCase(when.name()))
                .findFirst();
        boolean only = when.name().isEmpty() || when.whole();
        return ours.or(() -> only ? Optional.of(new Periods(times).record()) : Optional.empty());
    }

    private double time(LocalDate day) {
        return aquifer.times().time(day.atStartOfDay());
    }

    private Optional<Period> named(String name, double from, double to) {
        Times times = aquifer.times();
        double begin = Math.max(from, times.instant(0));
        double end = Math.min(to, times.instant(times.intervals()));
        return end - begin < COVERED * (to - from)
                ? Optional.empty()
                : Optional.of(new Periods(times)
                        .named(List.of(new NamedPeriod(name, begin, end)))
                        .get(0));
    }

    private List<Variant> variants(int prism, Period period) {
        List<Variant> variants = new ArrayList<>();
        add(variants, Aspect.WHOLE_CELLS, "cells along the outline are taken whole", prism, period);
        add(variants, Aspect.WELLS_SPREAD, "wells in cells that the outline cuts are counted by area", prism, period);
        add(variants, Aspect.FULL_LAYERS, "full layers", prism, period);
        addPeriods(variants, prism, period);
        for (int other = 0; other < prisms.size(); other++) {
            if (other != prism) {
                variants.add(new Variant(
                        Aspect.AREA,
                        "\"" + prisms.get(other).name() + "\"",
                        balance.ledgers().get(other).budget(period)));
            }
        }
        return variants;
    }

    private void add(List<Variant> variants, Aspect aspect, String words, int prism, Period period) {
        otherwise
                .computeIfAbsent(aspect.name(), any -> otherwise(aspect))
                .ifPresent(other -> variants.add(
                        new Variant(aspect, words, other.ledgers().get(prism).budget(period))));
    }

    private Optional<Balance> otherwise(Aspect aspect) {
        return switch (aspect) {
            case WHOLE_CELLS -> Optional.of(balance(aquifer, whole(aquifer, prisms), WellRule.POINT));
            case WELLS_SPREAD ->
                aquifer.placedWells().isEmpty()
                        ? Optional.empty()
                        : Optional.of(balance(aquifer, prisms, WellRule.SPREAD));
            case FULL_LAYERS -> full().map(full -> balance(full, prisms, WellRule.POINT));
            default -> throw new IllegalArgumentException(aspect + " needs no other balance");
        };
    }

    /** The aquifer with no water table in any layer; empty where that changes nothing. */
    private Optional<Aquifer> full() {
        boolean waterTable = aquifer.layers().stream().anyMatch(Layer::waterTable);
        if (!waterTable || aquifer.head().isEmpty()) {
            return Optional.empty();
        }
        List<Layer> layers = aquifer.layers().stream()
                .map(layer -> new Layer(layer.name(), layer.top(), layer.bottom(), false))
                .toList();
        return Optional.of(new Aquifer(
                aquifer.name(),
                aquifer.grid(),
                layers,
                aquifer.times(),
                aquifer.flow(),
                aquifer.head(),
                aquifer.storage(),
                aquifer.sources(),
                aquifer.lengthUnit(),
                aquifer.timeUnit()));
    }

    /** The periods just before and after, and a year that begins in another month. */
    private void addPeriods(List<Variant> variants, int prism, Period period) {
        double length = period.duration();
        Times times = aquifer.times();
        addPeriod(variants, "the period before", prism, period.from() - length, period.from());
        addPeriod(variants, "the period after", prism, period.to(), period.to() + length);
        if (times.hasDates()) {
            Optional<LocalDate> begin = times.date(period.from()).map(date -> date.toLocalDate());
            Optional<LocalDate> end = times.date(period.to()).map(date -> date.toLocalDate());
            for (int months : new int[] {-12, -9, -6, -3, -1, 1, 3, 6, 9, 12}) {
                addPeriod(
                        variants,
                        "the same stretch " + Math.abs(months) + (Math.abs(months) == 1 ? " month " : " months ")
                                + (months < 0 ? "earlier" : "later"),
                        prism,
                        time(begin.orElseThrow().plusMonths(months)),
                        time(end.orElseThrow().plusMonths(months)));
            }
        }
    }

    private void addPeriod(List<Variant> variants, String words, int prism, double from, double to) {
        double slack = ROUNDING * (to - from);
        Times times = aquifer.times();
        if (from >= times.instant(0) - slack && to <= times.instant(times.intervals()) + slack) {
            named(words, from, to)
                    .ifPresent(period -> variants.add(new Variant(
                            Aspect.PERIOD, words, balance.ledgers().get(prism).budget(period))));
        }
    }
}
