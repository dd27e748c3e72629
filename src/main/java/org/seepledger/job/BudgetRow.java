package org.seepledger.job;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.balance.Trace;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.NearestName;
import org.seepledger.io.table.CsvText;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.Total;
import org.seepledger.prism.Prism;

/**
 * A row of a budget, found by its name {@code PRISM/PERIOD/ITEM/LAYER}.
 *
 * <p>Names may hold slashes themselves: the text is held against the names that there are, not split. Where an item's
 * name stands in several groups, {@code PRISM/PERIOD/GROUP/ITEM/LAYER} tells them apart. An item over all its layers has
 * {@code *} for a layer, as totals have; where a total has that name, it is meant.
 *
 * @param prism the prism
 * @param period the period
 * @param item its item
 * @param accounts the accounts that it adds up, as their places among the prism's; none for a total
 */
record BudgetRow(Prism prism, Period period, Item item, List<Integer> accounts) {

    private static final int MOST_LISTED = 30;

    private static final String FORM = "Name it as PRISM/PERIOD/ITEM/LAYER, with the words of budget.csv.";

    /**
     * What a row is called within its prism and period.
     *
     * @param group its group
     * @param name the item
     * @param layer the layer, or {@code *}
     * @param total the total that it is; empty where it is an account
     */
    record Item(Group group, String name, String layer, Optional<Total> total) {

        static Item of(Account account) {
            String layer = String.valueOf(account.layer() + 1);
            return new Item(account.group(), account.item(), layer, Optional.empty());
        }

        static Item overAllLayers(Account account) {
            return new Item(account.group(), account.item(), "*", Optional.empty());
        }

        static Item of(Total total) {
            return new Item(Group.TOTAL, total.toString(), "*", Optional.of(total));
        }

        String shortName() {
            return name + "/" + layer;
        }

        String longName() {
            return group + "/" + shortName();
        }
    }

    /**
     * {@return the row of a name}
     *
     * @param name the name
     * @param aquifer the aquifer
     * @param prisms the prisms
     * @param periods the periods
     * @throws UsageFault if there is none or more than one; tells the nearest
     */
    static BudgetRow of(String name, Aquifer aquifer, List<Prism> prisms, List<Period> periods) {
        boolean storageKnown = aquifer.storageKnowledge() != StorageKnowledge.UNKNOWN;
        return of(name, prism -> Trace.accounts(aquifer, prism), storageKnown, prisms, periods);
    }

    /**
     * {@return the row of a name, in a budget of whatever}
     *
     * @param name the name
     * @param accountsOf the accounts of a prism, in the order of rows
     * @param storageKnown whether change in storage can be given
     * @param prisms the prisms
     * @param periods the periods
     * @throws UsageFault if there is none or more than one; tells the nearest
     */
    static BudgetRow of(
            String name,
            Function<Prism, List<Account>> accountsOf,
            boolean storageKnown,
            List<Prism> prisms,
            List<Period> periods) {
        List<Rest<Prism>> ofPrism = after(name, prisms, Prism::name);
        if (ofPrism.isEmpty()) {
            throw none(name, "prism", name, prisms.stream().map(Prism::name).toList());
        }
        List<BudgetRow> found = new ArrayList<>();
        UsageFault fault = null;
        for (Rest<Prism> prism : ofPrism) {
            List<Rest<Period>> ofPeriod = after(prism.text(), periods, Period::name);
            if (ofPeriod.isEmpty()) {
                List<String> names = periods.stream().map(Period::name).toList();
                fault = none(name, "period", prism.text(), names);
            }
            List<Account> accounts = accountsOf.apply(prism.named());
            Map<Item, List<Integer>> items = items(accounts, storageKnown);
            for (Rest<Period> period : ofPeriod) {
                List<Item> matching = matching(period.text(), items.keySet());
                matching.forEach(
                        item -> found.add(new BudgetRow(prism.named(), period.named(), item, items.get(item))));
                if (matching.isEmpty()) {
                    List<String> names =
                            items.keySet().stream().map(Item::shortName).toList();
                    fault = noItem(name, period.text(), names);
                }
            }
        }
        return only(name, found, fault);
    }

    private static BudgetRow only(String name, List<BudgetRow> found, UsageFault fault) {
        if (found.isEmpty()) {
            throw fault;
        }
        if (found.size() > 1) {
            List<String> names = found.stream().map(BudgetRow::longName).toList();
            throw new UsageFault("--row \"" + name + "\" names several rows; name one of them as \""
                    + String.join("\" or \"", names) + "\".");
        }
        return found.get(0);
    }

    String longName() {
        return prism.name() + "/" + period.name() + "/" + item.longName();
    }

    String shortName() {
        return prism.name() + "/" + period.name() + "/" + item.shortName();
    }

    /** All rows of a period with the accounts that they add up: the accounts, the totals, items over all layers. */
    private static Map<Item, List<Integer>> items(List<Account> accounts, boolean storageKnown) {
        Map<Item, List<Integer>> items = new LinkedHashMap<>();
        Map<Item, List<Integer>> sums = new LinkedHashMap<>();
        for (int i = 0; i < accounts.size(); i++) {
            items.put(Item.of(accounts.get(i)), List.of(i));
            List<Integer> sum = sums.computeIfAbsent(Item.overAllLayers(accounts.get(i)), item -> new ArrayList<>());
            if (accounts.get(i).quantified()) {
                sum.add(i);
            }
        }
        Total.rows(storageKnown).forEach(total -> items.put(Item.of(total), List.of()));
        items.putAll(sums);
        return items;
    }

    private static List<Item> matching(String text, Collection<Item> items) {
        List<Item> matching = items.stream()
                .filter(item -> text.equals(item.shortName())
                        || text.equals(CsvText.text(item.name()) + "/" + item.layer())
                        || text.equals(item.longName()))
                .toList();
        List<Item> totals =
                matching.stream().filter(item -> item.total().isPresent()).toList();
        return totals.isEmpty() ? matching : totals;
    }

    /** What follows a name in a text. */
    private record Rest<T>(T named, String text) {}

    private static <T> List<Rest<T>> after(String text, Collection<T> all, Function<T, String> name) {
        List<Rest<T>> rests = new ArrayList<>();
        for (T named : all) {
            Stream.of(name.apply(named), CsvText.text(name.apply(named)))
                    .distinct()
                    .filter(written -> text.startsWith(written + "/"))
                    .forEach(written -> rests.add(new Rest<>(named, text.substring(written.length() + 1))));
        }
        return rests;
    }

    /** As many words between slashes as a name has, from the beginning of a text. */
    private static String head(String text, String name) {
        String[] words = text.split("/", -1);
        long count = 1 + name.chars().filter(letter -> letter == '/').count();
        return Stream.of(words).limit(count).collect(Collectors.joining("/"));
    }

    /** There is no prism or period that a text begins with. */
    private static UsageFault none(String name, String what, String text, List<String> known) {
        String head = head(text, "");
        if (known.contains(text)) {
            return new UsageFault("--row \"" + name + "\": nothing follows the " + what + " \"" + text + "\". " + FORM);
        }
        Optional<String> near = known.stream()
                .filter(one -> NearestName.of(head(text, one), List.of(one)).isPresent())
                .min(Comparator.comparingInt(one -> NearestName.distance(head(text, one), one)));
        return fault(name, what, near.map(one -> head(text, one)).orElse(head), near, known);
    }

    private static UsageFault noItem(String name, String text, List<String> known) {
        Optional<String> near = NearestName.of(text, known);
        List<String> items = known.stream()
                .map(item -> item.substring(0, item.lastIndexOf('/')))
                .distinct()
                .toList();
        return fault(name, "item and layer", text, near, items);
    }

    private static UsageFault fault(
            String name, String what, String written, Optional<String> near, List<String> known) {
        String remedy = near.map(nearest -> " The nearest is \"" + nearest + "\".")
                .orElse(known.size() > MOST_LISTED ? "" : " There are \"" + String.join("\", \"", known) + "\".");
        String choice = what.equals("period") ? " Which periods there are is for --every or --periods to say." : "";
        return new UsageFault(
                "--row \"" + name + "\": there is no " + what + " \"" + written + "\"." + remedy + choice + " " + FORM);
    }
}
