package org.seepledger.job;

import java.util.ArrayList;
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
import org.seepledger.review.mapping.Days;

/** One slip in a table that is sound otherwise, planted by chance. */
final class PlantedSlip {

    private final BenchAuthor author;
    private final SubmittedTable table;
    private final List<List<Recomputed>> sources;
    private final double[] unit;
    private final Random random;
    private final Code code;
    private final Area area;
    private final int prism;

    PlantedSlip(BenchAuthor author, Random random, Code code) {
        this.author = author;
        this.table = author.table();
        this.sources = author.sources();
        this.unit = author.unit();
        this.random = random;
        this.code = code;
        this.area = table.areas.get(random.nextInt(table.areas.size()));
        this.prism = table.areas.indexOf(area);
    }

    /** Plants it; not where it cannot be made, or would not be seen. */
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
        if (!large || table.style == Style.SIGNED && !table.storageAsChange && !author.bySide()) {
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
                    full += Math.abs(sum(author.budget(prism, p, Optional.of(Aspect.FULL_LAYERS))));
                    own += Math.abs(sum(author.budget(prism, p, Optional.empty())));
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
        if (row.label.equals("public supply") && !wells.get(index).category().equals("public supply")) {
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
        Map<String, Predicate<Entry>> terms = author.terms(prism);
        for (int i = 0; i < area.rows.size(); i++) {
            Row row = area.rows.get(i);
            if (row.lateral) {
                Row full =
                        author.row(row.label, terms.get(row.label), prism, Optional.of(Aspect.FULL_LAYERS), area.name);
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
        List<String> all = author.reference().catalogue().prisms();
        String other = all.get(random.nextInt(all.size()));
        if (other.equals(area.name) || author.bySide() || table.areas.size() > 1) {
            return false;
        }
        sources.set(
                prism,
                table.days.stream()
                        .map(days -> author.reference()
                                .of(other, BenchAuthor.when(days))
                                .orElseThrow())
                        .toList());
        Area taken = author.area(area.name, prism);
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
                Optional<Recomputed> found = author.reference()
                        .of(
                                any.name,
                                BenchAuthor.when(new Days(
                                        days.from().plusMonths(by), days.to().plusMonths(by))));
                boolean outside = days.from().plusMonths(by).isBefore(author.first())
                        || days.to().plusMonths(by).isAfter(author.first().plusMonths(author.months()));
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
            Area after = author.area(table.areas.get(i).name, i);
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
            if (Math.abs(area.residual[p]) < 2.5 * BenchAuthor.TOLERANCE * area.throughput(p)) {
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
        double[] values = code == Code.BALANCE ? area.residual : random.nextBoolean() ? area.totalIn : area.totalOut;
        values[p] += area.throughput(p) * (0.03 + 0.2 * random.nextDouble());
        return true;
    }
}
