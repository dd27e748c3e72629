package org.seepledger.job;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.function.Predicate;
import org.seepledger.job.SubmittedTable.Area;
import org.seepledger.job.SubmittedTable.Row;
import org.seepledger.job.SubmittedTable.Style;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.review.check.Code;
import org.seepledger.review.check.Recomputed;
import org.seepledger.review.check.Recomputed.Aspect;
import org.seepledger.review.check.Reference;
import org.seepledger.review.mapping.Days;
import org.seepledger.review.mapping.PeriodWords;
import org.seepledger.review.mapping.When;
import org.seepledger.unit.Measure;

/** Writes submissions by chance: sound ones with honest differences of method, and ones with one slip. */
final class BenchAuthor {

    static final double TOLERANCE = 0.01;
    private static final List<String> UNITS =
            List.of("m3", "ML", "acre-ft", "m3/d", "L/s", "ft3/d", "m3/yr", "acre-ft/yr");

    private final Reference reference;
    private final LocalDate first;
    private final int months;
    private final Random random;
    private final SubmittedTable table;
    private final List<List<Recomputed>> sources = new ArrayList<>();
    private final List<String> prisms = new ArrayList<>();
    private double throughput;
    private double[] unit;
    private Optional<Aspect> method = Optional.empty();
    private boolean bySide;
    private boolean pumpingGrouped;
    private boolean netted;

    BenchAuthor(Reference reference, LocalDate first, int months, Random random) {
        this.reference = reference;
        this.first = first;
        this.months = months;
        this.random = random;
        this.table = new SubmittedTable(random);
    }

    /** A submission without a slip; empty where chance made one that is of no use. */
    Optional<String> sound() {
        compose(true);
        rounded();
        table.addUp();
        return Optional.of(table.write());
    }

    /** A submission with one slip; empty where it cannot be made, or would not be seen. */
    Optional<String> with(Code slip) {
        compose(false);
        rounded();
        table.addUp();
        return new PlantedSlip(this, random, slip).plant() ? Optional.of(table.write()) : Optional.empty();
    }

    private void compose(boolean honest) {
        periods();
        List<String> all = reference.catalogue().prisms();
        prisms.addAll(random.nextBoolean() ? all : List.of(all.get(random.nextInt(all.size()))));
        table.unit = UNITS.get(random.nextInt(UNITS.size()));
        table.style = Style.values()[random.nextInt(3)];
        table.totals = table.style != Style.COLUMNS && random.nextInt(3) > 0;
        table.storageAsChange = table.style != Style.COLUMNS && (table.style == Style.SECTIONS || random.nextBoolean());
        bySide = random.nextBoolean();
        pumpingGrouped = random.nextBoolean();
        netted = honest && random.nextInt(3) == 0;
        method = honest && random.nextInt(4) == 0 ? Optional.of(Aspect.WHOLE_CELLS) : Optional.empty();
        boolean rate = table.unit.contains("/");
        unit = new double[table.days.size()];
        double year = honest && random.nextBoolean() ? 365 : 365.25;
        for (int p = 0; p < unit.length; p++) {
            double perDay = Measure.of(table.unit).in(Measure.of(rate ? "m3/d" : "m3"));
            double odd = table.unit.endsWith("/yr") ? 365.25 / year : 1;
            unit[p] = rate ? perDay * odd * table.days.get(p).count() : perDay;
        }
        for (String prism : prisms) {
            sources.add(table.days.stream()
                    .map(days -> reference.of(prism, when(days)).orElseThrow())
                    .toList());
            table.areas.add(area(prism, sources.size() - 1));
        }
    }

    static When when(Days days) {
        return new When("", "", Optional.of(days), Double.NaN, Double.NaN, false);
    }

    private void periods() {
        PeriodWords words = new PeriodWords(10);
        for (String label : new LabelledPeriods(first, months, random).labels()) {
            table.periods.add(label);
            table.days.add(words.of(label).orElseThrow());
        }
    }

    PeriodBudget budget(int prism, int period, Optional<Aspect> aspect) {
        Recomputed source = sources.get(prism).get(period);
        return aspect.flatMap(wanted -> source.otherwise().get().stream()
                        .filter(variant -> variant.aspect() == wanted)
                        .map(Recomputed.Variant::budget)
                        .findFirst())
                .orElse(source.budget());
    }

    Area area(String prism, int index) {
        Area area = new Area(prism);
        Map<String, Predicate<Entry>> terms = terms(index);
        terms.forEach((label, filter) -> area.rows.add(row(label, filter, index, method, prism)));
        return area;
    }

    Map<String, Predicate<Entry>> terms(int prism) {
        Map<String, Predicate<Entry>> terms = new LinkedHashMap<>();
        PeriodBudget budget = sources.get(prism).get(0).budget();
        List<String> wells = reference.catalogue().items().stream()
                .filter(known -> known.nature() == org.seepledger.review.mapping.Catalogue.Nature.WELLS)
                .map(known -> known.name())
                .toList();
        for (Entry entry : budget.entries()) {
            Group group = entry.account().group();
            String item = entry.account().item();
            Predicate<Entry> same = other ->
                    other.account().group() == group && other.account().item().equals(item);
            switch (group) {
                case SIDE -> {
                    if (bySide) {
                        terms.putIfAbsent(item, same);
                    } else {
                        terms.putIfAbsent(
                                "Lateral flow", other -> other.account().group() == Group.SIDE);
                    }
                }
                case LID -> {
                    if (bySide) {
                        terms.putIfAbsent(
                                item.equals("top") ? "Flow through the top" : "Flow through the bottom", same);
                    } else {
                        terms.putIfAbsent(
                                "Vertical flow", other -> other.account().group() == Group.LID);
                    }
                }
                case SOURCE -> {
                    if (pumpingGrouped && wells.contains(item)) {
                        terms.putIfAbsent(
                                "Pumping",
                                other -> other.account().group() == Group.SOURCE
                                        && wells.contains(other.account().item()));
                    } else {
                        terms.putIfAbsent(item.equals("recharge") ? "Recharge" : item, same);
                    }
                }
                default ->
                    terms.putIfAbsent(
                            bySide ? item : "Storage",
                            other -> other.account().group() == Group.STORAGE
                                    && (!bySide || other.account().item().equals(item)));
            }
        }
        return terms;
    }

    Row row(String label, Predicate<Entry> filter, int prism, Optional<Aspect> aspect, String named) {
        double[] in = new double[unit.length];
        double[] out = new double[unit.length];
        boolean storage = false;
        boolean lateral = false;
        for (int p = 0; p < unit.length; p++) {
            double scale = sources.get(prism).get(p).cubicMetres() / unit[p];
            for (Entry entry : budget(prism, p, aspect).entries()) {
                if (filter.test(entry)) {
                    storage |= entry.account().group() == Group.STORAGE;
                    lateral |= entry.account().group() == Group.SIDE;
                    double net = entry.net();
                    in[p] += scale * (netted ? Math.max(0, net) : entry.inflow());
                    out[p] += scale * (netted ? Math.max(0, -net) : entry.outflow());
                }
            }
        }
        return new Row(label, storage, lateral, in, out);
    }

    /** Rounds so that the largest figures keep at least four digits, mostly. */
    private void rounded() {
        throughput = table.areas.stream()
                .mapToDouble(area -> area.throughput(0))
                .max()
                .orElse(1);
        if (random.nextInt(3) == 0) {
            table.digits = 3 + random.nextInt(3);
        } else {
            int size = (int) Math.floor(Math.log10(throughput));
            table.decimals = Math.max(0, 3 + random.nextInt(3) - size);
        }
    }

    SubmittedTable table() {
        return table;
    }

    List<List<Recomputed>> sources() {
        return sources;
    }

    double[] unit() {
        return unit;
    }

    Reference reference() {
        return reference;
    }

    LocalDate first() {
        return first;
    }

    int months() {
        return months;
    }

    boolean bySide() {
        return bySide;
    }
}
