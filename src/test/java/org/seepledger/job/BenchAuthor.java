package org.seepledger.job;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
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

    private static final double TOLERANCE = 0.01;
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
        Slip made = new Slip(slip);
        if (!made.plant()) {
            return Optional.empty();
        }
        return Optional.of(table.write());
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

    private static When when(Days days) {
        return new When("", "", Optional.of(days), Double.NaN, Double.NaN, false);
    }

    private void periods() {
        PeriodWords words = new PeriodWords(10);
        int kind = months < 24 ? 2 * random.nextInt(2) : random.nextInt(3);
        int form = random.nextInt(3);
        List<String> labels = new ArrayList<>();
        if (kind == 0) {
            int count = 1 + random.nextInt(6);
            int from = random.nextInt(Math.max(1, months - count));
            for (int m = from; m < from + count; m++) {
                LocalDate month = first.plusMonths(m);
                labels.add(
                        switch (form) {
                            case 0 -> String.format(Locale.ROOT, "%d-%02d", month.getYear(), month.getMonthValue());
                            case 1 ->
                                month.getMonth().getDisplayName(java.time.format.TextStyle.SHORT, Locale.ENGLISH) + " "
                                        + month.getYear();
                            default -> String.format(Locale.ROOT, "%02d/%d", month.getMonthValue(), month.getYear());
                        });
            }
        } else {
            int start = kind == 1 ? 10 : 1;
            for (LocalDate day = first; !day.plusYears(1).isAfter(first.plusMonths(months)); day = day.plusMonths(1)) {
                if (day.getMonthValue() == start) {
                    int year = day.getYear();
                    labels.add(
                            kind == 2
                                    ? String.valueOf(year)
                                    : form == 0
                                            ? "WY" + (year + 1)
                                            : form == 1 ? year + "/" + (year + 1) % 100 : "water year " + (year + 1));
                }
            }
        }
        for (String label : labels) {
            table.periods.add(label);
            table.days.add(words.of(label).orElseThrow());
        }
    }

    private PeriodBudget budget(int prism, int period, Optional<Aspect> aspect) {
        Recomputed source = sources.get(prism).get(period);
        return aspect.flatMap(wanted -> source.otherwise().get().stream()
                        .filter(variant -> variant.aspect() == wanted)
                        .map(Recomputed.Variant::budget)
                        .findFirst())
                .orElse(source.budget());
    }

    private Area area(String prism, int index) {
        Area area = new Area(prism);
        Map<String, Predicate<Entry>> terms = terms(index);
        terms.forEach((label, filter) -> area.rows.add(row(label, filter, index, method, prism)));
        return area;
    }

    private Map<String, Predicate<Entry>> terms(int prism) {
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

    private Row row(String label, Predicate<Entry> filter, int prism, Optional<Aspect> aspect, String named) {
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

    /** One slip. */
    private final class Slip {

        private final Code code;
        private final Area area = table.areas.get(random.nextInt(table.areas.size()));
        private final int prism = table.areas.indexOf(area);

        Slip(Code code) {
            this.code = code;
        }

        boolean plant() {
            boolean before = switch (code) {
                case UNITS -> units();
                case UNIT -> scaled(pick(row -> true), factor());
                case SIGN -> turned(pick(row -> !row.storage));
                case STORAGE_TURNED -> storage();
                case STORAGE_COEFFICIENT -> coefficient();
                case TWICE -> scaled(pick(row -> !row.storage), 2);
                case MISSING -> missing();
                case WELL -> well();
                case THICKNESS -> thickness();
                case AREA -> otherArea();
                case PERIOD -> period();
                case RESIDUAL_BOOKED -> booked();
                case COMPENSATING -> compensating();
                case DIFFERENCE -> difference();
                default -> true;
            };
            if (!before) {
                return false;
            }
            if (code != Code.SUM && code != Code.BALANCE) {
                table.addUp();
                return true;
            }
            return total();
        }

        /** A row that is large in each period. */
        private Row pick(Predicate<Row> wanted) {
            List<Row> large = area.rows.stream()
                    .filter(row -> !(row.storage && table.storageAsChange))
                    .filter(wanted)
                    .filter(row -> share(row) > 0.06)
                    .toList();
            return large.isEmpty() ? null : large.get(random.nextInt(large.size()));
        }

        private double share(Row row) {
            double least = Double.POSITIVE_INFINITY;
            for (int p = 0; p < unit.length; p++) {
                least = Math.min(least, Math.abs(row.net(p)) / area.throughput(p));
            }
            return least;
        }

        private double factor() {
            double[] factors = {
                35.3147,
                0.0283168,
                1233.48,
                1 / 1233.48,
                264.172,
                365.25,
                1 / 365.25,
                365,
                1000,
                0.001,
                86_400,
                3.28084,
                25.4,
                10,
                0.1,
                30.4375,
                7.4805,
                12
            };
            return factors[random.nextInt(factors.length)];
        }

        private boolean scaled(Row row, double by) {
            if (row == null) {
                return false;
            }
            for (int p = 0; p < unit.length; p++) {
                row.in[p] *= by;
                row.out[p] *= by;
            }
            return visible(row);
        }

        /** What is left must not vanish in rounding. */
        private boolean visible(Row row) {
            for (int p = 0; p < unit.length; p++) {
                double size = Math.max(row.in[p], row.out[p]);
                if (size > 0 && table.digits == 0 && size < 200 * Math.pow(10, -table.decimals)) {
                    return false;
                }
            }
            return true;
        }

        private boolean units() {
            double factor = factor();
            boolean all = true;
            for (Area any : table.areas) {
                for (Row row : any.rows) {
                    scaled(row, factor);
                }
            }
            table.decimals += (int) Math.max(0, -Math.floor(Math.log10(factor)));
            return all;
        }

        private boolean turned(Row row) {
            if (row == null) {
                return false;
            }
            for (int p = 0; p < unit.length; p++) {
                double kept = row.in[p];
                row.in[p] = row.out[p];
                row.out[p] = kept;
            }
            return true;
        }

        private boolean storage() {
            List<Row> rows = area.rows.stream().filter(row -> row.storage).toList();
            boolean large = rows.stream().anyMatch(row -> share(row) > 0.04);
            if (!large || table.style == Style.SIGNED && !table.storageAsChange && !bySide) {
                return false;
            }
            rows.forEach(this::turned);
            return true;
        }

        private boolean coefficient() {
            for (Row row : area.rows) {
                if (row.storage) {
                    double full = 0;
                    double own = 0;
                    for (int p = 0; p < unit.length; p++) {
                        full += Math.abs(sum(budget(prism, p, Optional.of(Aspect.FULL_LAYERS))));
                        own += Math.abs(sum(budget(prism, p, Optional.empty())));
                    }
                    double ratio = full / own;
                    if (ratio <= 0 || ratio > 0.2 || share(row) < 0.03 && !row.label.startsWith("elastic")) {
                        return false;
                    }
                    if (!row.label.startsWith("elastic")) {
                        scaled(row, ratio * (0.8 + 0.4 * random.nextDouble()));
                        if (!visible(row)) {
                            return false;
                        }
                    }
                }
            }
            return area.rows.stream().anyMatch(row -> row.storage);
        }

        private double sum(PeriodBudget budget) {
            return budget.entries().stream()
                    .filter(entry -> entry.account().group() == Group.STORAGE)
                    .mapToDouble(Entry::net)
                    .sum();
        }

        private boolean missing() {
            Row row = pick(any -> !any.storage);
            if (row == null || area.rows.size() < 4) {
                return false;
            }
            area.rows.remove(row);
            return table.areas.size() == 1 || table.style != Style.SIGNED;
        }

        private boolean well() {
            List<Row> pumping = area.rows.stream()
                    .filter(row -> row.label.equals("Pumping") || row.label.equals("public supply"))
                    .toList();
            List<Recomputed.WellVolume> wells = sources.get(prism).get(0).wells();
            if (pumping.isEmpty() || wells.isEmpty()) {
                return false;
            }
            Row row = pumping.get(0);
            int index = random.nextInt(wells.size());
            if (row.label.equals("public supply")
                    && !wells.get(index).category().equals("public supply")) {
                return false;
            }
            for (int p = 0; p < unit.length; p++) {
                Recomputed.WellVolume well = sources.get(prism).get(p).wells().get(index);
                double taken = -well.volume() / unit[p];
                if (taken < 0.03 * area.throughput(p)) {
                    return false;
                }
                row.out[p] += well.inside() ? -taken : taken;
                if (row.out[p] < 0.01 * area.throughput(p)) {
                    return false;
                }
            }
            return true;
        }

        private boolean thickness() {
            boolean seen = false;
            Map<String, Predicate<Entry>> terms = terms(prism);
            for (int i = 0; i < area.rows.size(); i++) {
                Row row = area.rows.get(i);
                if (row.lateral) {
                    Row full = BenchAuthor.this.row(
                            row.label, terms.get(row.label), prism, Optional.of(Aspect.FULL_LAYERS), area.name);
                    for (int p = 0; p < unit.length; p++) {
                        seen |= Math.abs(full.net(p) - row.net(p)) > 0.03 * area.throughput(p);
                    }
                    area.rows.set(i, full);
                }
            }
            return seen;
        }

        private boolean otherArea() {
            if (random.nextBoolean()) {
                double by = random.nextBoolean() ? 1.2 + random.nextDouble() * 0.7 : 0.5 + 0.3 * random.nextDouble();
                Row row = pick(any -> any.label.equals("Recharge"));
                return row != null && share(row) * Math.abs(by - 1) > 0.02 && scaled(row, by);
            }
            List<String> all = reference.catalogue().prisms();
            String other = all.get(random.nextInt(all.size()));
            if (other.equals(area.name) || bySide || table.areas.size() > 1) {
                return false;
            }
            sources.set(
                    prism,
                    table.days.stream()
                            .map(days -> reference.of(other, when(days)).orElseThrow())
                            .toList());
            Area taken = BenchAuthor.this.area(area.name, prism);
            area.rows.clear();
            area.rows.addAll(taken.rows);
            return true;
        }

        private boolean period() {
            int by = List.of(-1, 1, -3, 3, 12, -12).get(random.nextInt(6));
            List<List<Recomputed>> moved = new ArrayList<>();
            for (Area any : table.areas) {
                List<Recomputed> shifted = new ArrayList<>();
                for (Days days : table.days) {
                    Optional<Recomputed> found = reference.of(
                            any.name,
                            when(new Days(days.from().plusMonths(by), days.to().plusMonths(by))));
                    boolean outside = days.from().plusMonths(by).isBefore(first)
                            || days.to().plusMonths(by).isAfter(first.plusMonths(months));
                    if (found.isEmpty() || outside) {
                        return false;
                    }
                    shifted.add(found.get());
                }
                moved.add(shifted);
            }
            boolean seen = false;
            for (int i = 0; i < table.areas.size(); i++) {
                sources.set(i, moved.get(i));
                List<Row> before = List.copyOf(table.areas.get(i).rows);
                Area after = BenchAuthor.this.area(table.areas.get(i).name, i);
                int different = 0;
                for (int r = 0; r < before.size(); r++) {
                    for (int p = 0; p < unit.length; p++) {
                        if (Math.abs(after.rows.get(r).net(p) - before.get(r).net(p)) > 0.02 * after.throughput(p)) {
                            different++;
                            break;
                        }
                    }
                }
                seen |= different >= 3;
                table.areas.get(i).rows.clear();
                table.areas.get(i).rows.addAll(after.rows);
            }
            return seen;
        }

        private boolean booked() {
            List<Row> rows = area.rows.stream()
                    .filter(row -> !(row.storage && table.storageAsChange))
                    .toList();
            Row row = rows.get(random.nextInt(rows.size()));
            if (row.storage) {
                return false;
            }
            for (int p = 0; p < unit.length; p++) {
                if (Math.abs(area.residual[p]) < 2.5 * TOLERANCE * area.throughput(p)) {
                    return false;
                }
                boolean out = row.out[p] > row.in[p];
                double moved = (out ? row.out[p] : row.in[p]) + (out ? area.residual[p] : -area.residual[p]);
                if (moved < 0) {
                    return false;
                }
                if (out) {
                    row.out[p] = moved;
                } else {
                    row.in[p] = moved;
                }
            }
            return true;
        }

        private boolean compensating() {
            Row one = pick(row -> !row.storage);
            Row other = pick(row -> !row.storage);
            if (one == null || one == other) {
                return false;
            }
            for (int p = 0; p < unit.length; p++) {
                double by = area.throughput(p) * (0.05 + 0.1 * random.nextDouble());
                add(one, p, by);
                add(other, p, -by);
            }
            return positive(one) && positive(other);
        }

        private void add(Row row, int p, double by) {
            if (row.in[p] >= row.out[p]) {
                row.in[p] += by;
            } else {
                row.out[p] -= by;
            }
        }

        private boolean positive(Row row) {
            for (int p = 0; p < unit.length; p++) {
                if (row.in[p] < 0 || row.out[p] < 0) {
                    return false;
                }
            }
            return true;
        }

        private boolean difference() {
            Row row = pick(any -> !any.storage && !any.label.equals("Recharge"));
            if (row == null) {
                return false;
            }
            for (int p = 0; p < unit.length; p++) {
                add(row, p, area.throughput(p) * (0.08 + 0.2 * random.nextDouble()));
            }
            return positive(row);
        }

        private boolean total() {
            if (!table.totals) {
                return false;
            }
            int p = random.nextInt(unit.length);
            double[] values =
                    code == Code.BALANCE ? area.residual : random.nextBoolean() ? area.totalIn : area.totalOut;
            values[p] += area.throughput(p) * (0.03 + 0.2 * random.nextDouble());
            return true;
        }
    }
}
