package org.seepledger.job;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Source;
import org.seepledger.balance.Periods;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.plume.Doubts;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Plume;
import org.seepledger.plume.Stock;
import org.seepledger.unit.Figures;

/** Puts into words what the reader of a solute balance must know. */
final class PlumeWarnings {

    /** From this decay within an interval on, the mean of its two ends is too coarse. */
    private static final double TOO_FAST = 0.5;

    private static final Pattern TAKES_PURE_WATER = Pattern.compile(".*(evapo|transpir).*", Pattern.CASE_INSENSITIVE);

    private final Aquifer aquifer;
    private final boolean dispersion;

    PlumeWarnings(Aquifer aquifer, boolean dispersion) {
        this.aquifer = aquifer;
        this.dispersion = dispersion;
    }

    /** What may make a number of solute budgets wrong. */
    List<String> warnings(List<Plume> plumes) {
        List<String> warnings = new ArrayList<>();
        for (Plume plume : plumes) {
            if (!dispersion && plume.solute().dispersion().isPresent()) {
                warnings.add(
                        "Dispersion is given for " + plume.solute().name()
                                + " and left out, and is then in the residual; --dispersion books what disperses through faces.");
            }
            addNonDetects(warnings, plume);
            addDecay(warnings, plume);
            addSpreading(warnings, plume);
            addEvaporation(warnings, plume);
            if (plume.doubts().drainsMoreThanPores() > 0) {
                warnings.add(
                        name(plume) + ": specific yield is greater than porosity in places, so that more water drains"
                                + " than the pores hold; \"held above the water table\" is not to be trusted.");
            }
        }
        return warnings.stream().distinct().toList();
    }

    private static String name(Plume plume) {
        return plume.solute().name() + " in \"" + plume.prism() + "\"";
    }

    private void addNonDetects(List<String> warnings, Plume plume) {
        int worst = 0;
        long detects = 0;
        long nonDetects = 0;
        for (int instant = 0; instant < plume.stocks().size(); instant++) {
            Stock stock = plume.whole(instant);
            worst = stock.undetectedShare() > plume.whole(worst).undetectedShare() ? instant : worst;
            detects += stock.detects();
            nonDetects += stock.nonDetects();
        }
        Stock stock = plume.whole(worst);
        if (detects == 0 && nonDetects > 0) {
            warnings.add(
                    name(plume) + ": every concentration is below its detection limit. Check the limit and its unit;"
                            + " whether any of it is there is not known.");
        } else if (stock.undetectedShare() > NonDetects.TOO_MUCH) {
            warnings.add(name(plume) + ": " + Figures.percent(100 * stock.undetectedShare())
                    + " of the mass rests on non-detects at time "
                    + Figures.shown(aquifer.times().instant(worst)) + " "
                    + aquifer.timeUnit() + "; it is from " + Figures.shown(stock.total(NonDetects.ZERO)) + " to "
                    + Figures.shown(stock.total(NonDetects.LIMIT)) + " kg: a bracket, not an estimate.");
        }
        double ratio = plume.limitsRatio();
        if (ratio > 1 + 1e-9) {
            warnings.add(name(plume) + ": detection limits differ (the greatest is " + Figures.shown(ratio)
                    + " times the least); a trend may be the limits' alone.");
        }
    }

    private void addDecay(List<String> warnings, Plume plume) {
        Doubts doubts = plume.doubts();
        if (doubts.fastestDecay() > TOO_FAST) {
            warnings.add(
                    plume.solute().name() + ": decay rate times the longest interval is "
                            + Figures.shown(doubts.fastestDecay())
                            + ", more than 0.5: the mean of an interval's two ends overstates decay. Give instants closer together.");
        }
    }

    /** The upstream rule spreads like a dispersivity of half a cell. */
    private void addSpreading(List<String> warnings, Plume plume) {
        Doubts doubts = plume.doubts();
        if (doubts.widestHalfCell() > doubts.shortestDispersivity()) {
            warnings.add(plume.solute().name()
                    + ": a concentration taken from the cell upstream spreads like a longitudinal"
                    + " dispersivity of half a cell, here up to " + length(doubts.widestHalfCell()) + ", more than the "
                    + length(doubts.shortestDispersivity()) + " given; flows through faces are as coarse as that.");
        }
    }

    private String length(double value) {
        return Figures.shown(value) + " " + aquifer.lengthUnit();
    }

    private void addEvaporation(List<String> warnings, Plume plume) {
        for (Entry entry :
                plume.ledger().budget(new Periods(aquifer.times()).record()).entries()) {
            String item = entry.account().item();
            boolean takes = entry.account().group() == Group.SOURCE && entry.outflow() > 0;
            if (takes && TAKES_PURE_WATER.matcher(item).matches()) {
                warnings.add("\"" + item + "\" takes " + plume.solute().name()
                        + " along with the cell's concentration; what evaporates leaves most solutes behind.");
            }
        }
    }

    /** Lesser remarks. */
    List<String> remarks(List<Solute> solutes, List<Plume> plumes) {
        List<String> remarks = new ArrayList<>();
        for (Plume plume : plumes) {
            if (Double.isFinite(plume.doubts().shortestDispersivity())) {
                remarks.add("The upstream rule spreads " + plume.solute().name()
                        + " in \"" + plume.prism() + "\" like a longitudinal dispersivity of up to "
                        + length(plume.doubts().widestHalfCell()) + " (half a cell); given is "
                        + length(plume.doubts().shortestDispersivity()) + " or more.");
            }
        }
        for (Solute solute : solutes) {
            if (dispersion && solute.dispersion().isEmpty()) {
                remarks.add("No dispersion is given for " + solute.name() + ": it is advected alone.");
            }
            for (int i = 0; i < aquifer.sources().size(); i++) {
                Source source = aquifer.sources().get(i);
                if (!solute.ofSources().containsKey(i)) {
                    remarks.add("What \"" + source.category() + "\" adds is taken to carry no " + solute.name() + ".");
                }
            }
        }
        return remarks.stream().distinct().toList();
    }
}
