package org.seepledger.job;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.review.check.Recomputed;
import org.seepledger.review.check.Recomputed.Aspect;
import org.seepledger.review.check.Recomputed.Variant;
import org.seepledger.review.check.Recomputed.WellVolume;
import org.seepledger.review.check.Reference;
import org.seepledger.review.mapping.Catalogue;
import org.seepledger.review.mapping.Catalogue.Nature;
import org.seepledger.review.mapping.When;

/** Recomputed budgets by chance: 24 months from October 2020 of one to three prisms, in m and d. */
final class InventedReference implements Reference {

    static final LocalDate FIRST = LocalDate.of(2020, 10, 1);
    static final int MONTHS = 24;

    private static final List<String> NAMES = List.of("north fields", "mill meadow", "gravel pit");

    private final Map<String, Ledger> base = new LinkedHashMap<>();
    private final Map<String, Ledger> whole = new LinkedHashMap<>();
    private final Map<String, Ledger> full = new LinkedHashMap<>();
    private final Map<String, List<double[]>> wells = new LinkedHashMap<>();
    private final Set<Catalogue.Known> items = new LinkedHashSet<>();
    private final Random random;
    private final double unclosed;

    InventedReference(long seed) {
        random = new Random(seed);
        int kind = random.nextInt(3);
        unclosed = kind == 0 ? 0 : kind == 1 ? 0.003 : 0.03 + 0.05 * random.nextDouble();
        int prisms = 1 + random.nextInt(NAMES.size());
        for (String prism : NAMES.subList(0, prisms)) {
            make(prism);
        }
    }

    private void make(String prism) {
        List<Account> accounts = new ArrayList<>();
        int layers = 1 + random.nextInt(2);
        List<String> sides = new ArrayList<>(List.of("river side", "hill side"));
        for (int side = 3; side < 5 + random.nextInt(4); side++) {
            sides.add("side " + side);
        }
        sides.forEach(side -> add(accounts, Group.SIDE, side, layers, Nature.FACE));
        add(accounts, Group.LID, "top", 1, Nature.FACE);
        add(accounts, Group.LID, "bottom", 1, Nature.FACE);
        add(accounts, Group.SOURCE, "recharge", 1, Nature.AREAL);
        add(accounts, Group.SOURCE, "public supply", 1, Nature.WELLS);
        if (random.nextBoolean()) {
            add(accounts, Group.SOURCE, "river exchange", 1, Nature.CELLS);
        }
        add(accounts, Group.STORAGE, "water-table storage", 1, Nature.STORAGE);
        add(accounts, Group.STORAGE, "elastic storage", 1, Nature.STORAGE);
        double[][] in = new double[MONTHS][accounts.size()];
        double[][] out = new double[MONTHS][accounts.size()];
        fill(prism, accounts, in, out);
        base.put(prism, ledger(prism, accounts, in, out));
        double[] off = random.doubles(accounts.size(), 0.94, 1.06).toArray();
        double thick = 1.2 + random.nextDouble();
        double coefficient = 0.01 + 0.04 * random.nextDouble();
        whole.put(
                prism,
                changed(prism, accounts, in, out, i -> accounts.get(i).group() == Group.SOURCE ? 1.0 : off[i], true));
        full.put(
                prism,
                changed(
                        prism,
                        accounts,
                        in,
                        out,
                        i -> switch (accounts.get(i).group()) {
                            case SIDE -> thick;
                            case STORAGE -> accounts.get(i).item().startsWith("water") ? 0 : coefficient * 20;
                            default -> 1;
                        },
                        false));
    }

    private void add(List<Account> accounts, Group group, String item, int layers, Nature nature) {
        items.add(new Catalogue.Known(group, item, nature));
        for (int layer = 0; layer < layers; layer++) {
            accounts.add(new Account(group, item, layer, true));
        }
    }

    private void fill(String prism, List<Account> accounts, double[][] in, double[][] out) {
        int last = accounts.size() - 1;
        double[] size = random.doubles(accounts.size(), 40, 500).toArray();
        double[] lean = random.doubles(accounts.size(), 0, 1).toArray();
        int count = 2 + random.nextInt(4);
        List<double[]> rates = new ArrayList<>();
        double[] wellSize = random.doubles(count + 1, 80, 400).toArray();
        double sign = random.nextBoolean() ? 1 : -1;
        for (int month = 0; month < MONTHS; month++) {
            double season = Math.cos(2 * Math.PI * (month + 2) / 12);
            double net = 0;
            double gross = 0;
            double[] well = new double[count + 1];
            for (int w = 0; w <= count; w++) {
                well[w] = wellSize[w] * (1 - 0.4 * season) * (0.9 + 0.2 * random.nextDouble());
            }
            rates.add(well);
            for (int i = 0; i < last - 1; i++) {
                double amount = size[i] * (0.8 + 0.4 * random.nextDouble());
                switch (accounts.get(i).item()) {
                    case "recharge" -> in[month][i] = amount * Math.max(0.02, 1 + season);
                    case "public supply" ->
                        out[month][i] = java.util.Arrays.stream(well, 0, count).sum();
                    case "top" -> in[month][i] = 0;
                    default -> {
                        in[month][i] = amount * (lean[i] > 0.4 ? 1 : lean[i] > 0.25 ? 0.1 : 0);
                        out[month][i] = amount * (lean[i] < 0.4 ? 1 : lean[i] < 0.55 ? 0.1 : 0);
                    }
                }
                net += in[month][i] - out[month][i];
                gross += Math.max(in[month][i], out[month][i]);
            }
            double stored = net - sign * unclosed * gross / 2;
            double share = 0.95;
            put(in[month], out[month], last - 1, -stored * share);
            put(in[month], out[month], last, -stored * (1 - share));
        }
        wells.put(prism, rates);
    }

    private static void put(double[] in, double[] out, int place, double net) {
        in[place] = Math.max(0, net);
        out[place] = Math.max(0, -net);
    }

    private static Ledger ledger(String prism, List<Account> accounts, double[][] in, double[][] out) {
        return new Ledger(prism, accounts, true, in, out);
    }

    private static Ledger changed(
            String prism,
            List<Account> accounts,
            double[][] in,
            double[][] out,
            java.util.function.IntToDoubleFunction factor,
            boolean close) {
        double[][] ins = new double[MONTHS][];
        double[][] outs = new double[MONTHS][];
        for (int month = 0; month < MONTHS; month++) {
            ins[month] = in[month].clone();
            outs[month] = out[month].clone();
            double net = 0;
            for (int i = 0; i < accounts.size(); i++) {
                ins[month][i] *= factor.applyAsDouble(i);
                outs[month][i] *= factor.applyAsDouble(i);
                boolean storage = accounts.get(i).group() == Group.STORAGE;
                net += storage ? 0 : ins[month][i] - outs[month][i];
            }
            int last = accounts.size() - 1;
            double residual = 0;
            for (int i = 0; i < accounts.size(); i++) {
                residual += in[month][i] - out[month][i];
            }
            if (close) {
                put(ins[month], outs[month], last - 1, 0.95 * (residual - net));
                put(ins[month], outs[month], last, 0.05 * (residual - net));
            }
        }
        return ledger(prism, accounts, ins, outs);
    }

    @Override
    public Catalogue catalogue() {
        return new Catalogue(List.copyOf(base.keySet()), List.copyOf(items));
    }

    @Override
    public double rateUnit() {
        return 1;
    }

    @Override
    public double volumeUnit() {
        return 1;
    }

    @Override
    public Optional<Recomputed> of(String prism, When when) {
        if (when.days().isEmpty()) {
            return Optional.empty();
        }
        return period(when.days().get().from(), when.days().get().to())
                .map(period -> new Recomputed(
                        base.get(prism).budget(period),
                        1,
                        period.duration(),
                        50_000,
                        () -> variants(
                                prism,
                                when.days().get().from(),
                                when.days().get().to()),
                        wells(prism, period)));
    }

    private static Optional<Period> period(LocalDate from, LocalDate to) {
        List<Period.Part> parts = new ArrayList<>();
        for (int month = 0; month < MONTHS; month++) {
            LocalDate begin = FIRST.plusMonths(month);
            LocalDate end = begin.plusMonths(1);
            if (!begin.isBefore(from) && !end.isAfter(to)) {
                parts.add(new Period.Part(month, begin.lengthOfMonth()));
            }
        }
        double days = parts.stream().mapToDouble(Period.Part::duration).sum();
        boolean covered = days == java.time.temporal.ChronoUnit.DAYS.between(from, to);
        return covered ? Optional.of(new Period("p", 0, days, parts)) : Optional.empty();
    }

    private List<Variant> variants(String prism, LocalDate from, LocalDate to) {
        Period period = period(from, to).orElseThrow();
        List<Variant> variants = new ArrayList<>();
        variants.add(new Variant(
                Aspect.WHOLE_CELLS,
                "cells along the outline are taken whole",
                whole.get(prism).budget(period)));
        variants.add(
                new Variant(Aspect.FULL_LAYERS, "full layers", full.get(prism).budget(period)));
        for (int months : new int[] {-12, -9, -3, -1, 1, 3, 9, 12}) {
            PeriodBudget budget = period(from.plusMonths(months), to.plusMonths(months))
                    .map(base.get(prism)::budget)
                    .orElse(null);
            if (budget != null) {
                variants.add(new Variant(Aspect.PERIOD, months + " months", budget));
            }
        }
        base.keySet().stream()
                .filter(other -> !other.equals(prism))
                .forEach(other -> variants.add(
                        new Variant(Aspect.AREA, other, base.get(other).budget(period))));
        return variants;
    }

    private List<WellVolume> wells(String prism, Period period) {
        List<WellVolume> all = new ArrayList<>();
        int count = wells.get(prism).get(0).length;
        for (int well = 0; well < count; well++) {
            double volume = 0;
            for (Period.Part part : period.parts()) {
                volume += wells.get(prism).get(part.interval())[well] * part.duration();
            }
            all.add(new WellVolume("W" + (well + 1), "public supply", well < count - 1, -volume));
        }
        return all;
    }
}
