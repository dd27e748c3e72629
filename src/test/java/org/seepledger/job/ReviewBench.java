package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.SplittableRandom;
import java.util.TreeMap;
import org.seepledger.fault.DataFault;
import org.seepledger.progress.Progress;
import org.seepledger.review.check.Code;
import org.seepledger.review.check.Finding;
import org.seepledger.review.check.Reference;
import org.seepledger.review.check.Review;
import org.seepledger.review.check.Severity;

/**
 * How well reviews find slips: submissions by chance, each with one slip or none, and what was found in them. Half rest on
 * the sample aquifers, half on invented budgets.
 *
 * <p>Arguments: how many tables with a slip, how many without, the first seed. Seeds below 1,000,000 were used to tune the
 * checks; the default ones were not.
 */
public final class ReviewBench {

    static final long HELD_OUT = 5_000_000;

    private static final List<Code> SLIPS = List.of(
            Code.UNITS,
            Code.UNIT,
            Code.SIGN,
            Code.STORAGE_TURNED,
            Code.STORAGE_COEFFICIENT,
            Code.TWICE,
            Code.MISSING,
            Code.WELL,
            Code.THICKNESS,
            Code.AREA,
            Code.PERIOD,
            Code.RESIDUAL_BOOKED,
            Code.COMPENSATING,
            Code.DIFFERENCE,
            Code.SUM,
            Code.BALANCE);
    private static final int TRIES = 400;

    private final Path folder;
    private final List<Case> samples = new ArrayList<>();

    /** An aquifer, when its record begins and how many months it has. */
    private record Case(Reference reference, LocalDate first, int months) {}

    /**
     * What came of a submission.
     *
     * @param planted the slip in it; empty for none
     * @param findings what was found
     * @param text the submission
     */
    record Reviewed(Optional<Code> planted, List<Finding> findings, String text) {

        /** The first finding that is no note. */
        Optional<Code> first() {
            return findings.stream()
                    .filter(one -> one.severity() != Severity.NOTE)
                    .map(Finding::code)
                    .findFirst();
        }

        boolean found() {
            return findings.stream()
                    .anyMatch(one -> one.severity() != Severity.NOTE && one.code() == planted.orElseThrow());
        }

        boolean fault() {
            return findings.stream().anyMatch(one -> one.severity() == Severity.FAULT);
        }
    }

    ReviewBench(Path folder) {
        this.folder = folder;
        samples.add(sample("valley", LocalDate.of(2021, 10, 1), 24));
        samples.add(sample("terrace", LocalDate.of(2023, 1, 1), 12));
    }

    private static Case sample(String name, LocalDate first, int months) {
        Path set = Path.of("sample-aquifers", name);
        Subject subject = Subject.open(set, set.resolve("prisms.geojson"), false);
        return new Case(new Recomputation(subject.aquifer(), subject.prisms(), false, 2, Progress.NONE), first, months);
    }

    /** A submission with a slip, reviewed; chance is asked until the slip can be planted. */
    Reviewed with(Code slip, long seed) throws IOException {
        for (int attempt = 0; attempt < TRIES; attempt++) {
            Random random = random(seed * 1_000 + attempt);
            Case of = of(random);
            Optional<String> text = new BenchAuthor(of.reference(), of.first(), of.months(), random).with(slip);
            if (text.isPresent()) {
                return review(Optional.of(slip), of, text.get());
            }
        }
        throw new IllegalStateException(slip + " cannot be planted with seed " + seed);
    }

    Reviewed sound(long seed) throws IOException {
        Random random = random(seed * 1_000 + 999);
        Case of = of(random);
        return review(
                Optional.empty(),
                of,
                new BenchAuthor(of.reference(), of.first(), of.months(), random)
                        .sound()
                        .orElseThrow());
    }

    /** Neighbouring seeds must not begin alike. */
    private static Random random(long seed) {
        return new Random(new SplittableRandom(seed).nextLong());
    }

    private Case of(Random random) {
        int which = random.nextInt(4);
        return which < samples.size()
                ? samples.get(which)
                : new Case(new InventedReference(random.nextLong()), InventedReference.FIRST, InventedReference.MONTHS);
    }

    private Reviewed review(Optional<Code> planted, Case of, String text) throws IOException {
        Path file = folder.resolve("submitted.csv");
        Files.writeString(file, text);
        try {
            Reading.of(file, Optional.empty(), Optional.of(of.reference()), 10);
        } catch (DataFault unread) {
            return new Reviewed(planted, List.of(), text);
        }
        Review.Result result = Review.of(
                Reading.of(file, Optional.empty(), Optional.of(of.reference()), 10), Optional.of(of.reference()), 1);
        return new Reviewed(planted, result.findings(), text);
    }

    static Code slip(long number) {
        return SLIPS.get((int) (number % SLIPS.size()));
    }

    /**
     * Runs the bench and prints the confusion matrix.
     *
     * @param arguments how many with a slip, how many without, the first seed; and a number of misses to print in full
     * @throws IOException if nothing can be written
     */
    public static void main(String[] arguments) throws IOException {
        int slips = arguments.length > 0 ? Integer.parseInt(arguments[0]) : 320;
        int sound = arguments.length > 1 ? Integer.parseInt(arguments[1]) : 320;
        long seed = arguments.length > 2 ? Long.parseLong(arguments[2]) : HELD_OUT;
        int shown = arguments.length > 3 ? Integer.parseInt(arguments[3]) : 0;
        ReviewBench bench = new ReviewBench(Files.createTempDirectory("review-bench"));
        Map<Code, Map<String, Integer>> matrix = new EnumMap<>(Code.class);
        int found = 0;
        int leading = 0;
        for (int i = 0; i < slips; i++) {
            Reviewed one = bench.with(slip(i), seed + i);
            found += one.found() ? 1 : 0;
            String first = one.first().map(Code::toString).orElse("nothing");
            leading += one.first().equals(one.planted()) ? 1 : 0;
            matrix.computeIfAbsent(slip(i), any -> new TreeMap<>()).merge(first, 1, Integer::sum);
            shown -= show(one, !one.found(), shown);
        }
        int faults = 0;
        int doubts = 0;
        for (int i = 0; i < sound; i++) {
            Reviewed one = bench.sound(seed + i);
            faults += one.fault() ? 1 : 0;
            doubts += !one.fault() && one.first().isPresent() ? 1 : 0;
            shown -= show(one, one.first().isPresent(), shown);
        }
        matrix.forEach((code, counts) -> System.out.println(code + ": " + counts));
        System.out.printf("found with the right code: %d of %d, as the first finding: %d%n", found, slips, leading);
        System.out.printf(
                "sound ones with a false fault: %d of %d, with a false doubt alone: %d%n", faults, sound, doubts);
    }

    private static int show(Reviewed one, boolean miss, int shown) {
        if (miss && shown > 0) {
            System.out.println("=== " + one.planted() + "\n" + one.text());
            one.findings().forEach(finding -> System.out.println("    " + finding));
        }
        return miss && shown > 0 ? 1 : 0;
    }
}
