package org.seepledger.ledger;

import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * The totals of a prism and period, length³.
 *
 * @param inflow all inflow but release from storage
 * @param outflow all outflow but uptake into storage
 * @param storageChange uptake − release; NaN where storage is unknown
 * @param residual inflow − outflow − storage change; NaN where storage is unknown
 * @param throughput the larger of all gains and all losses, gross, storage among them
 * @param netThroughput the larger of the items' net gains and net losses, an item's net taken over its layers
 */
public record Totals(
        double inflow, double outflow, double storageChange, double residual, double throughput, double netThroughput) {

    static Totals of(List<Entry> entries, boolean storageKnown) {
        double[] sums = new double[4];
        Map<String, Double> nets = new LinkedHashMap<>();
        for (Entry entry : entries) {
            Account account = entry.account();
            if (!account.quantified()) {
                continue;
            }
            int first = account.group() == Group.STORAGE ? 2 : 0;
            sums[first] += entry.inflow();
            sums[first + 1] += entry.outflow();
            nets.merge(account.group() + "/" + account.item(), entry.net(), Double::sum);
        }
        double change = storageKnown ? sums[3] - sums[2] : Double.NaN;
        return new Totals(
                sums[0],
                sums[1],
                change,
                sums[0] - sums[1] - change,
                Math.max(sums[0] + sums[2], sums[1] + sums[3]),
                larger(nets.values()));
    }

    private static double larger(Collection<Double> nets) {
        double gains = nets.stream().mapToDouble(net -> Math.max(net, 0)).sum();
        double losses = nets.stream().mapToDouble(net -> Math.max(-net, 0)).sum();
        return Math.max(gains, losses);
    }

    /**
     * {@return one of them: length³, or percent; NaN where it cannot be given}
     *
     * @param total which
     */
    public double get(Total total) {
        return switch (total) {
            case INFLOW -> inflow;
            case OUTFLOW -> outflow;
            case STORAGE_CHANGE -> storageChange;
            case RESIDUAL -> residual;
            case UNEXPLAINED -> inflow - outflow;
            case CLOSURE_ERROR -> closureError();
            case NET_CLOSURE_ERROR -> netClosureError();
        };
    }

    /**
     * {@return 100 × residual ÷ throughput; NaN where storage is unknown or nothing flows}
     */
    public double closureError() {
        return throughput == 0 ? Double.NaN : 100 * residual / throughput;
    }

    /**
     * {@return 100 × residual ÷ net throughput, which wiggly sides do not dilute; NaN where storage is unknown or
     * nothing flows}
     */
    public double netClosureError() {
        return netThroughput == 0 ? Double.NaN : 100 * residual / netThroughput;
    }
}
