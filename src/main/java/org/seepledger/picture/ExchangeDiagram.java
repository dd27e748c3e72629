package org.seepledger.picture;

import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Period;
import org.seepledger.unit.Figures;

/**
 * What prisms give to each other and to the outside: prisms one below the other, what passes between two of them as bands
 * that swing out to the right, what comes from and goes to the outside as arrows on the left. Widths are to scale; a flow
 * that cannot be given is a dashed line with a dash.
 */
public final class ExchangeDiagram {

    private static final double WIDEST = 26;
    private static final double ROW_GAP = 16;

    private final UnitShown unit;
    private final Period period;
    private final List<Flow> flows;
    private final List<String> prisms;

    /**
     * A flow to be drawn.
     *
     * @param giver the row that it leaves; −1 for the outside
     * @param receiver the row that it enters; −1 for the outside
     * @param amount in the unit shown; NaN where it cannot be given
     */
    record Flow(int giver, int receiver, double amount) {

        static final int OUTSIDE = -1;

        boolean known() {
            return !Double.isNaN(amount);
        }

        boolean outside() {
            return giver == OUTSIDE || receiver == OUTSIDE;
        }

        String figure() {
            return Figures.typeset(amount);
        }
    }

    private ExchangeDiagram(List<String> prisms, List<ExchangeFlow> flows, Period period, UnitShown unit) {
        this.prisms = List.copyOf(prisms);
        this.unit = unit;
        this.period = period;
        this.flows = flows.stream()
                .map(flow -> new Flow(
                        prisms.indexOf(flow.giver()),
                        prisms.indexOf(flow.receiver()),
                        unit.of(flow.volume(period), period)))
                .filter(flow -> flow.giver() != flow.receiver() && (flow.amount() > 0 || !flow.known()))
                .toList();
    }

    /**
     * {@return the diagram of a period}
     *
     * @param prisms the prisms' names, in the order to show
     * @param flows what they give to each other and to the outside
     * @param period the period
     * @param unit the unit to show
     * @param width in logical pixels, at least 340
     */
    public static Picture of(
            List<String> prisms, List<ExchangeFlow> flows, Period period, UnitShown unit, double width) {
        return new ExchangeDiagram(prisms, flows, period, unit).picture(width);
    }

    private Picture picture(double width) {
        double largest = flows.stream()
                .mapToDouble(Flow::amount)
                .filter(Double::isFinite)
                .max()
                .orElse(1);
        ExchangeSheet sheet = new ExchangeSheet(width, WIDEST / largest, unit.words(), flows);
        double y = sheet.top();
        for (int row = 0; row < prisms.size(); row++) {
            y = sheet.node(prisms.get(row), row, flows, y) + ROW_GAP;
        }
        flows.stream()
                .filter(flow -> !flow.outside())
                .sorted(Comparator.comparingInt(flow -> -Math.abs(flow.giver() - flow.receiver())))
                .forEach(sheet::band);
        return new Picture(
                width,
                sheet.finish(y - ROW_GAP),
                "Exchange between prisms and with the outside, " + period.name(),
                description(),
                sheet.marks());
    }

    private String description() {
        if (flows.isEmpty()) {
            return "Nothing flows between the prisms or from and to the outside.";
        }
        return "In " + unit.words() + ": "
                + flows.stream()
                        .sorted(Comparator.comparingDouble(flow -> flow.known() ? -flow.amount() : 0))
                        .limit(12)
                        .map(this::sentence)
                        .collect(Collectors.joining("; "))
                + (flows.size() > 12 ? "; and " + (flows.size() - 12) + " smaller flows." : ".");
    }

    private String sentence(Flow flow) {
        return name(flow.giver()) + " to " + name(flow.receiver()) + " "
                + (flow.known() ? flow.figure() : "cannot be given");
    }

    private String name(int row) {
        return row == Flow.OUTSIDE ? "outside" : prisms.get(row);
    }
}
