package org.seepledger.report;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Period;

/** What a prism gives to other prisms and takes from them, in words. */
final class ExchangeWords {

    private final PrismResult result;
    private final Wording wording;

    ExchangeWords(PrismResult result, Wording wording) {
        this.result = result;
        this.wording = wording;
    }

    List<String> sentences() {
        Set<String> partners = new LinkedHashSet<>();
        for (ExchangeFlow flow : result.exchange()) {
            partners.add(flow.giver());
            partners.add(flow.receiver());
        }
        partners.remove(result.prism());
        partners.remove(ExchangeFlow.OUTSIDE);
        return partners.stream().map(this::with).filter(Objects::nonNull).toList();
    }

    private String with(String partner) {
        double given = volume(result.prism(), partner);
        double taken = volume(partner, result.prism());
        double time = result.record().period().duration();
        if (Double.isNaN(given + taken)) {
            return "What passes to and from " + wording.quoted(partner) + " cannot be told apart: the two overlap.";
        }
        return given == 0 && taken == 0
                ? null
                : "To " + wording.quoted(partner) + " it gives " + wording.rate(given, time) + ", and takes "
                        + wording.rate(taken, time) + " from it.";
    }

    private double volume(String giver, String receiver) {
        Period record = result.record().period();
        return result.exchange().stream()
                .filter(flow -> flow.giver().equals(giver) && flow.receiver().equals(receiver))
                .mapToDouble(flow -> flow.volume(record))
                .sum();
    }
}
