package org.seepledger.job;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.regex.Pattern;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.FaceMismatch;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.balance.RunNotes;
import org.seepledger.balance.Uncounted;
import org.seepledger.balance.WellRule;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Overlap;
import org.seepledger.unit.Figures;

/** Puts into words what the reader of a balance must know. */
final class RunWarnings {

    private static final Pattern TAKES_WATER =
            Pattern.compile(".*(pump|abstract|extract|withdraw|evapo|transpir|drain).*", Pattern.CASE_INSENSITIVE);

    private final Aquifer aquifer;
    private final RunNotes notes;

    /**
     * Prepares what there is to say of a balance.
     *
     * @param aquifer the aquifer
     * @param notes what its balance noted
     */
    RunWarnings(Aquifer aquifer, RunNotes notes) {
        this.aquifer = aquifer;
        this.notes = notes;
    }

    /** What may make a number of the prisms' budgets wrong or missing. */
    List<String> warnings(List<PeriodBudget> records) {
        List<String> warnings = ofStorage();
        warnings.addAll(ofPrisms());
        warnings.addAll(ofData(records));
        return warnings.stream().distinct().toList();
    }

    /** What may make a number wrong or missing wherever prisms are drawn; the records are of the whole grid. */
    List<String> warningsOfSet(List<PeriodBudget> records) {
        List<String> warnings = ofStorage();
        warnings.addAll(ofData(records));
        return warnings.stream().distinct().toList();
    }

    private List<String> ofStorage() {
        List<String> warnings = new ArrayList<>();
        if (aquifer.storageKnowledge() == StorageKnowledge.UNKNOWN) {
            warnings.add(
                    "Change in storage is not known (heads or storage coefficients are missing): storage, residual and"
                            + " closure errors are left empty.");
        }
        return warnings;
    }

    private List<String> ofPrisms() {
        List<String> warnings = new ArrayList<>();
        for (Overlap overlap : notes.overlaps()) {
            warnings.add("\"" + overlap.first() + "\" and \"" + overlap.second() + "\" overlap over "
                    + Figures.shown(overlap.area()) + " " + aquifer.lengthUnit()
                    + "2: what lies in both counts in both, and their exchange is left empty.");
        }
        notes.closedSides().forEach(side -> warnings.add(closed(side)));
        return warnings;
    }

    private List<String> ofData(List<PeriodBudget> records) {
        List<String> warnings = new ArrayList<>();
        for (int interval : notes.still()) {
            warnings.add("No cell is active in interval " + (interval + 1)
                    + ": flow or heads have no value there. Its rows are 0 for want of data, not for want of flow.");
        }
        notes.mismatch().ifPresent(mismatch -> warnings.add(differing(mismatch)));
        notes.uncounted().forEach((item, uncounted) -> addLost(warnings, item, uncounted));
        records.forEach(record -> addSigns(warnings, record));
        return warnings;
    }

    private static String closed(RunNotes.ClosedSide side) {
        String which = side.side().equals(side.item()) ? "" : ", part of \"" + side.item() + "\",";
        String what = side.empty()
                ? "its flow is left empty and counts as 0 in totals."
                : "it counts as 0 in what it is part of.";
        return "\"" + side.side() + "\" of \"" + side.prism() + "\"" + which
                + " lies on a closed outer face of the grid: " + what;
    }

    private String differing(FaceMismatch mismatch) {
        return String.format(
                Locale.ROOT,
                "Two values are given for some faces and differ; the greatest difference is %s at the %s face of layer %d,"
                        + " row %d, column %d. The east, north and up values are used.",
                rate(mismatch.difference()),
                mismatch.face(),
                mismatch.layer() + 1,
                mismatch.row() + 1,
                mismatch.column() + 1);
    }

    private void addLost(List<String> warnings, String item, Uncounted uncounted) {
        if (uncounted.lost() > 0) {
            warnings.add("Of \"" + item + "\", up to " + rate(uncounted.lost())
                    + " is given where no cell is active, and is not counted.");
        }
    }

    private static void addSigns(List<String> warnings, PeriodBudget record) {
        for (Entry entry : record.entries()) {
            Account account = entry.account();
            boolean adds = account.group() == Group.SOURCE && entry.inflow() > 0;
            if (adds && TAKES_WATER.matcher(account.item()).matches()) {
                warnings.add(
                        "\"" + account.item() + "\" adds water in places, though its name says that it takes water:"
                                + " check the sign (negative takes water out).");
            }
        }
    }

    /** Lesser remarks. */
    List<String> remarks(WellRule rule) {
        List<String> remarks = new ArrayList<>();
        for (RunNotes.InactiveArea area : notes.inactive()) {
            remarks.add("In \"" + area.prism() + "\", layer " + (area.layer() + 1) + ", cells over "
                    + Figures.shown(area.area()) + " " + aquifer.lengthUnit()
                    + "2 are inactive or without thickness and take no part.");
        }
        notes.cutWells().forEach(well -> remarks.add(counted(well, rule)));
        for (Map.Entry<String, Uncounted> source : notes.uncounted().entrySet()) {
            if (source.getValue().missing() > 0) {
                remarks.add("\"" + source.getKey() + "\" has no value in up to "
                        + source.getValue().missing() + " of the cells looked at, and adds nothing there.");
            }
        }
        return remarks;
    }

    private static String counted(RunNotes.CutWell well, WellRule rule) {
        String between = "the part of its screened cells' water that lies between the prism's lids";
        String place = "Well \"" + well.well() + "\" stands in ";
        if (!well.bySides()) {
            return place + "\"" + well.prism() + "\", whose lids lie at elevations; it counts for " + between + ".";
        }
        String share =
                rule == WellRule.SPREAD ? "by the share of its cell inside" : well.inside() ? "in full" : "not at all";
        boolean lids = well.byLids() && (well.inside() || rule == WellRule.SPREAD);
        return place + "a cell that \"" + well.prism() + "\" cuts; it counts " + share
                + (lids ? ", but only for " + between : "") + ".";
    }

    private String rate(double value) {
        return Figures.shown(value) + " " + aquifer.lengthUnit() + "3/" + aquifer.timeUnit();
    }
}
