package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Puts findings that say the same of several periods or areas together, and sorts them by weight. */
final class Merging {

    private Merging() {}

    static List<Finding> of(List<Finding> findings) {
        Map<List<Object>, List<Finding>> alike = new LinkedHashMap<>();
        for (Finding finding : findings) {
            List<Object> key = List.of(finding.severity(), finding.code(), finding.prism(), finding.item());
            alike.computeIfAbsent(key, any -> new ArrayList<>()).add(finding);
        }
        List<Finding> merged = new ArrayList<>();
        alike.values().forEach(list -> merged.addAll(periods(list)));
        List<Finding> areas = areas(merged);
        areas.sort(Finding.BY_WEIGHT);
        return areas;
    }

    /** Findings of several periods become one, with the numbers of the first; those of rates and volumes, too. */
    private static List<Finding> periods(List<Finding> list) {
        Finding first = list.get(0);
        if (first.code() == Code.NOT_TIED) {
            return list;
        }
        Map<String, Finding> byPeriod = new LinkedHashMap<>();
        list.forEach(finding -> byPeriod.putIfAbsent(finding.period(), finding));
        if (byPeriod.size() < 3) {
            return List.copyOf(byPeriod.values());
        }
        return List.of(new Finding(
                first.severity(),
                first.code(),
                first.prism(),
                Finding.SEVERAL,
                first.item(),
                first.submitted(),
                first.recomputed(),
                first.unit(),
                first.message() + " The same in " + (byPeriod.size() - 1) + " more periods."));
    }

    /** The same sentence without numbers of several areas becomes one. */
    private static List<Finding> areas(List<Finding> findings) {
        Map<List<Object>, List<Finding>> alike = new LinkedHashMap<>();
        for (Finding finding : findings) {
            boolean whole = finding.code() == Code.UNITS || Double.isNaN(finding.submitted());
            Object area = whole && finding.code() != Code.MISSING ? "" : finding.prism();
            String sentence = finding.message().replaceAll(" The numbers are those of .*", "");
            List<Object> key =
                    List.of(finding.severity(), finding.code(), finding.item(), finding.period(), sentence, area);
            alike.computeIfAbsent(key, any -> new ArrayList<>()).add(finding);
        }
        List<Finding> merged = new ArrayList<>();
        for (List<Finding> list : alike.values()) {
            Finding first = list.get(0);
            merged.add(
                    list.size() == 1
                            ? first
                            : new Finding(
                                    first.severity(),
                                    first.code(),
                                    Finding.SEVERAL,
                                    first.period(),
                                    first.item(),
                                    first.submitted(),
                                    first.recomputed(),
                                    first.unit(),
                                    first.message()));
        }
        return merged;
    }
}
