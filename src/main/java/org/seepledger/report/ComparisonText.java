package org.seepledger.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import org.seepledger.review.change.Difference;
import org.seepledger.review.change.Split;
import org.seepledger.unit.Figures;

/**
 * What a comparison of two runs says.
 *
 * @param firstInputs hashes of the first run's inputs, by name
 * @param secondInputs hashes of the second run's inputs, by name
 * @param firstOptions the first run's options
 * @param secondOptions the second run's options
 * @param differences the differences
 * @param notSplit why no parts of differences can be told; empty where they can
 */
public record ComparisonText(
        Map<String, String> firstInputs,
        Map<String, String> secondInputs,
        Map<String, String> firstOptions,
        Map<String, String> secondOptions,
        List<Difference> differences,
        Optional<String> notSplit) {

    private static final double ROUNDING = 1e-9;
    private static final int TOLD = 6;
    private static final String EVERY_LAYER = "*";

    /** {@return the inputs that are not the same, by name: changed, only first or only second} */
    public Map<String, String> changedInputs() {
        Map<String, String> changed = new TreeMap<>();
        Set<String> names = new LinkedHashSet<>(firstInputs.keySet());
        names.addAll(secondInputs.keySet());
        for (String name : names) {
            if (!secondInputs.containsKey(name)) {
                changed.put(name, "only in the first run");
            } else if (!firstInputs.containsKey(name)) {
                changed.put(name, "only in the second run");
            } else if (!firstInputs.get(name).equals(secondInputs.get(name))) {
                changed.put(name, "changed");
            }
        }
        return changed;
    }

    /** {@return the options that are not the same: first → second} */
    public Map<String, String> changedOptions() {
        Map<String, String> changed = new TreeMap<>();
        Set<String> names = new LinkedHashSet<>(firstOptions.keySet());
        names.addAll(secondOptions.keySet());
        for (String name : names) {
            String one = firstOptions.getOrDefault(name, "not given");
            String other = secondOptions.getOrDefault(name, "not given");
            if (!one.equals(other) && !name.startsWith("report-") && !name.equals("threads")) {
                changed.put(name, one + " → " + other);
            }
        }
        return changed;
    }

    /** {@return the differences that are more than rounding, the largest rate first} */
    public List<Difference> large() {
        return differences.stream()
                .filter(one -> !one.any().isPercentage())
                .filter(ComparisonText::differs)
                .sorted(Comparator.comparingDouble(one -> -size(one)))
                .toList();
    }

    private static double size(Difference one) {
        double off = one.off(false);
        return Double.isNaN(off) ? 0 : Math.abs(off);
    }

    private static boolean differs(Difference one) {
        double scale = Math.max(
                Math.abs(Difference.value(one.first(), false)), Math.abs(Difference.value(one.second(), false)));
        boolean missing = one.first().isEmpty() || one.second().isEmpty();
        return missing || size(one) > ROUNDING * scale;
    }

    /** {@return what is to be said, a sentence each} */
    public List<String> sentences() {
        List<String> sentences = new ArrayList<>();
        Map<String, String> inputs = changedInputs();
        sentences.add(
                inputs.isEmpty()
                        ? "Both runs read the same inputs."
                        : Wording.counted(inputs.size(), "input") + (inputs.size() == 1 ? " differs: " : " differ: ")
                                + shortened(inputs) + ".");
        changedOptions().forEach((name, change) -> sentences.add("Option " + name + ": " + change + "."));
        List<Difference> large = large();
        long alone = large.stream()
                .filter(one -> one.first().isEmpty() || one.second().isEmpty())
                .count();
        sentences.add(
                large.isEmpty()
                        ? "All " + differences.size() + " rows are the same to rounding."
                        : large.size() + " of " + differences.size() + " rows differ"
                                + (alone == 0 ? "." : ", " + alone + " of them because one run has no such row."));
        notSplit.ifPresent(reason -> sentences.add(
                "What made the differences cannot be told, since the budgets cannot be struck again: " + reason));
        large.stream()
                .filter(one -> one.first().isPresent() && one.second().isPresent())
                .limit(TOLD)
                .forEach(one -> sentences.add(sentence(one)));
        return sentences;
    }

    private static String shortened(Map<String, String> inputs) {
        List<String> told = inputs.entrySet().stream()
                .limit(TOLD)
                .map(entry -> entry.getKey() + " (" + entry.getValue() + ")")
                .toList();
        return String.join(", ", told) + (inputs.size() > TOLD ? " and " + (inputs.size() - TOLD) + " more" : "");
    }

    private static String sentence(Difference one) {
        String unit = Difference.unit(one.first(), false);
        String other = Difference.unit(one.second(), false);
        String words = "  " + one.any().prism() + ", " + one.any().period() + ", "
                + one.any().item()
                + (one.any().layer().equals(EVERY_LAYER)
                        ? ": "
                        : " (layer " + one.any().layer() + "): ")
                + Figures.shown(Difference.value(one.first(), false)) + " " + unit + " → "
                + Figures.shown(Difference.value(one.second(), false)) + " " + other;
        return words + one.rate().map(split -> "; " + parts(split)).orElse("") + ".";
    }

    /**
     * {@return what the parts of a difference are, in words}
     *
     * @param split the parts
     */
    public static String parts(Split split) {
        double scale =
                Math.abs(split.area()) + Math.abs(split.period()) + Math.abs(split.inputs()) + Math.abs(split.unit());
        List<String> parts = new ArrayList<>();
        add(parts, split.area(), scale, "by area");
        add(parts, split.period(), scale, "by period");
        add(parts, split.inputs(), scale, "by inputs");
        add(parts, split.unit(), scale, "by unit");
        return parts.isEmpty() ? "no part" : String.join(", ", parts);
    }

    private static void add(List<String> parts, double part, double scale, String words) {
        if (Math.abs(part) > ROUNDING * scale) {
            parts.add((part > 0 ? "+" : "") + Figures.shown(part) + " " + words);
        }
    }
}
