package org.seepledger.balance;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Group;
import org.seepledger.prism.Overlap;

/**
 * Draws up what prisms give to each other: gross flows through contacts; what is left of a prism's own faces goes to the
 * outside or comes from there. Prisms that overlap leave their exchange empty, since it cannot be told apart.
 */
final class ExchangeSheet {

    private final int intervals;
    private final Span span;
    private final List<PrismAccounts> prisms;
    private final List<Contact> contacts;
    private final List<Overlap> overlaps;
    private final BandResult total;

    ExchangeSheet(
            int intervals,
            Span span,
            List<PrismAccounts> prisms,
            List<Contact> contacts,
            List<Overlap> overlaps,
            BandResult total) {
        this.intervals = intervals;
        this.span = span;
        this.prisms = prisms;
        this.contacts = contacts;
        this.overlaps = overlaps;
        this.total = total;
    }

    /** The flows by giver and receiver, in the order of the prisms, the outside last. */
    List<ExchangeFlow> flows() {
        List<ExchangeFlow> flows = new ArrayList<>();
        for (int giver = 0; giver < prisms.size(); giver++) {
            for (int receiver = 0; receiver < prisms.size(); receiver++) {
                addBetween(flows, giver, receiver);
            }
            flows.add(new ExchangeFlow(name(giver), ExchangeFlow.OUTSIDE, left(giver, true)));
        }
        for (int receiver = 0; receiver < prisms.size(); receiver++) {
            flows.add(new ExchangeFlow(ExchangeFlow.OUTSIDE, name(receiver), left(receiver, false)));
        }
        return flows;
    }

    private void addBetween(List<ExchangeFlow> flows, int giver, int receiver) {
        for (int i = 0; i < contacts.size(); i++) {
            Contact contact = contacts.get(i);
            boolean onward = contact.one() == giver && contact.other() == receiver;
            boolean back = contact.one() == receiver && contact.other() == giver;
            if (onward || back) {
                int contacting = i;
                double[] rates = rates(interval -> exchanged(interval, contacting, onward));
                flows.add(new ExchangeFlow(name(giver), name(receiver), rates));
            }
        }
    }

    /** What flows through a contact, from its one to its other prism or back; NaN where the two overlap. */
    private double exchanged(int interval, int contact, boolean onward) {
        if (overlap(contacts.get(contact).one(), contacts.get(contact).other())) {
            return Double.NaN;
        }
        Tally tally = total.exchanged(interval, contact);
        return onward ? tally.outflow()[0] : tally.inflow()[0];
    }

    private boolean overlap(int one, int other) {
        return overlaps.stream()
                .anyMatch(overlap ->
                        overlap.first().equals(name(one)) && overlap.second().equals(name(other)));
    }

    /** What a prism gives to the outside, or takes from it. */
    private double[] left(int prism, boolean gives) {
        return rates(interval -> {
            Tally own = total.tally(interval, prism);
            double all = throughFaces(prism, gives ? own.outflow() : own.inflow());
            double shared = 0;
            for (int i = 0; i < contacts.size(); i++) {
                if (contacts.get(i).one() == prism || contacts.get(i).other() == prism) {
                    shared += exchanged(interval, i, (contacts.get(i).one() == prism) == gives);
                }
            }
            boolean rounding = Math.abs(all - shared) <= 1e-12 * all;
            return rounding ? 0 : all - shared;
        });
    }

    /** A rate for each interval; none for those that were not asked for. */
    private double[] rates(IntToDoubleFunction rate) {
        return IntStream.range(0, intervals)
                .mapToDouble(interval -> span.holds(interval) ? rate.applyAsDouble(interval) : Double.NaN)
                .toArray();
    }

    private double throughFaces(int prism, double[] byAccount) {
        List<Account> accounts = prisms.get(prism).chart().accounts();
        double sum = 0;
        for (int i = 0; i < byAccount.length; i++) {
            Group group = accounts.get(i).group();
            sum += group == Group.SIDE || group == Group.LID ? byAccount[i] : 0;
        }
        return sum;
    }

    private String name(int prism) {
        return prisms.get(prism).cut().prism().name();
    }
}
