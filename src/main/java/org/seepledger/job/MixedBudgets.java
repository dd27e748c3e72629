package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Times;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WaterBalance;
import org.seepledger.balance.WellRule;
import org.seepledger.fault.DataFault;
import org.seepledger.io.result.FileRecord;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.io.submission.RunFolder;
import org.seepledger.io.table.CsvText;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.NamedPeriod;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Total;
import org.seepledger.progress.Progress;
import org.seepledger.review.change.RecordedRow;
import org.seepledger.review.change.Split;
import org.seepledger.unit.Measure;

/**
 * Two runs' budgets struck again, each run's inputs with each run's prisms and periods. Made only where all recorded
 * inputs are still there, with the recorded hashes.
 */
final class MixedBudgets implements AutoCloseable {

    private static final int RUNS = 2;
    private static final double ROUNDING = 1e-6;

    private final RunFolder[] runs;
    private final Subject[] subjects = new Subject[RUNS * RUNS];
    private final Balance[] balances = new Balance[RUNS * RUNS];
    private final Map<List<Object>, Optional<PeriodBudget>> budgets = new HashMap<>();

    private MixedBudgets(RunFolder first, RunFolder second) {
        this.runs = new RunFolder[] {first, second};
    }

    /**
     * Strikes them.
     *
     * @throws DataFault if an input is missing or was changed, or a run's prisms do not fit the other's grid
     */
    static MixedBudgets of(RunFolder first, RunFolder second, int threads, Progress progress) {
        MixedBudgets mixed = new MixedBudgets(first, second);
        mixed.checkInputs(first);
        mixed.checkInputs(second);
        try {
            for (int inputs = 0; inputs < RUNS; inputs++) {
                for (int area = 0; area < RUNS; area++) {
                    mixed.strike(inputs, area, threads, progress);
                }
            }
            return mixed;
        } catch (RuntimeException e) {
            mixed.close();
            throw e;
        }
    }

    private void checkInputs(RunFolder run) {
        Path aquifer = Path.of(run.options().getOrDefault("aquifer", ""));
        Path prisms = Path.of(run.options().getOrDefault("prisms", ""));
        for (FileRecord input : run.inputs()) {
            Path beside = prisms.toAbsolutePath().getParent().resolve(input.name());
            List<Path> places = List.of(aquifer.resolve(input.name()), Path.of(input.name()), beside);
            boolean there = places.stream().anyMatch(place -> is(input, place));
            if (!there) {
                throw new DataFault(
                        run.folder().toString(),
                        "input " + input.name(),
                        "no file with the recorded hash",
                        "the file as it was",
                        "Bring it back, or go by the differences alone.");
            }
        }
    }

    private static boolean is(FileRecord input, Path file) {
        try {
            return Files.isRegularFile(file)
                    && FileRecord.of(input.name(), file).equals(input);
        } catch (IOException e) {
            return false;
        }
    }

    private void strike(int inputs, int area, int threads, Progress progress) {
        Map<String, String> options = runs[inputs].options();
        boolean clip = Boolean.parseBoolean(options.get("clip"));
        int place = inputs * RUNS + area;
        subjects[place] = Subject.open(
                Path.of(options.get("aquifer")), Path.of(runs[area].options().get("prisms")), clip);
        WellRule wells = WellRule.valueOf(options.getOrDefault("wells", "point").toUpperCase(Locale.ROOT));
        balances[place] =
                WaterBalance.of(subjects[place].aquifer(), subjects[place].prisms(), wells, threads, progress);
    }

    /**
     * The eight numbers of a pair of rows, in the first row's unit; empty where one of them cannot be given.
     *
     * @param volumes whether volumes, rather than rates
     */
    Optional<double[]> values(RecordedRow first, RecordedRow second, boolean volumes) {
        double[] values = new double[8];
        RecordedRow[] rows = {first, second};
        for (int area = 0; area < RUNS; area++) {
            for (int period = 0; period < RUNS; period++) {
                for (int inputs = 0; inputs < RUNS; inputs++) {
                    int place = area * Split.AREA + period * Split.PERIOD + inputs * Split.INPUTS;
                    values[place] = value(inputs, rows[area].prism(), rows[period], period, area, first, volumes);
                    if (Double.isNaN(values[place])) {
                        return Optional.empty();
                    }
                }
            }
        }
        return Optional.of(values);
    }

    private double value(
            int inputs, String prism, RecordedRow when, int periodOf, int area, RecordedRow row, boolean volumes) {
        Optional<PeriodBudget> budget = budgets.computeIfAbsent(
                List.of(inputs, area, prism, periodOf, when.from(), when.to()),
                any -> budget(inputs, area, prism, when, periodOf));
        Aquifer aquifer = subjects[inputs * RUNS + area].aquifer();
        ResultUnits units = ResultUnits.of(
                aquifer.lengthUnit(), aquifer.timeUnit(), Measure.of(row.rateUnit()), Measure.of(row.volumeUnit()));
        return budget.map(found -> {
                    double volume = volume(found, row);
                    double rate = volume / found.period().duration();
                    return volumes ? volume * units.volumeFactor() : rate * units.rateFactor();
                })
                .orElse(Double.NaN);
    }

    private Optional<PeriodBudget> budget(int inputs, int area, String prism, RecordedRow when, int periodOf) {
        Balance balance = balances[inputs * RUNS + area];
        int index = IntStream.range(0, balance.ledgers().size())
                .filter(i -> CsvText.text(balance.ledgers().get(i).prism()).equals(prism))
                .findFirst()
                .orElse(-1);
        Times own = subjects[inputs * RUNS + area].aquifer().times();
        Times written = subjects[periodOf * RUNS + periodOf].aquifer().times();
        double from = time(when.from(), written, own);
        double to = time(when.to(), written, own);
        double slack = ROUNDING * (to - from);
        boolean covered = from >= own.instant(0) - slack && to <= own.instant(own.intervals()) + slack;
        if (index < 0 || !covered) {
            return Optional.empty();
        }
        return Optional.of(balance.ledgers()
                .get(index)
                .budget(new Periods(own)
                        .named(List.of(new NamedPeriod(when.period(), from, to)))
                        .get(0)));
    }

    /** A time of one record in another: by date where both have dates. */
    private static double time(double time, Times written, Times own) {
        Optional<LocalDateTime> date = written.date(time);
        return date.isPresent() && own.hasDates() && written != own ? own.time(date.get()) : time;
    }

    private static double volume(PeriodBudget budget, RecordedRow row) {
        if (row.group().equals(Group.TOTAL.toString())) {
            for (Total total : Total.values()) {
                if (total.toString().equals(row.item())) {
                    return budget.totals().get(total);
                }
            }
            return Double.NaN;
        }
        return budget.entries().stream()
                .filter(entry -> isOf(entry.account(), row))
                .mapToDouble(Entry::net)
                .findFirst()
                .orElse(Double.NaN);
    }

    private static boolean isOf(Account account, RecordedRow row) {
        return account.group().toString().equals(row.group())
                && CsvText.text(account.item()).equals(row.item())
                && String.valueOf(account.layer() + 1).equals(row.layer());
    }

    @Override
    public void close() {
        for (Subject subject : subjects) {
            if (subject != null) {
                subject.close();
            }
        }
    }
}
