package org.seepledger.intake;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import org.seepledger.intake.Wishes.Topic;
import org.seepledger.io.table.TableLook;

/** The sources of a set, in the order in which their files stand. */
final class SourceText {

    private final Plan plan;
    private final Binder binder;
    private final Shelf shelf;
    private final Consumer<Finding> findings;
    private final Carried carried;

    SourceText(Plan plan, Binder binder, Shelf shelf, Consumer<Finding> findings) {
        this.plan = plan;
        this.binder = binder;
        this.shelf = shelf;
        this.findings = findings;
        this.carried = new Carried(binder, findings);
    }

    List<Object> sources() {
        List<Object> sources = new ArrayList<>();
        String recharge = plan.wishes().of(Topic.RECHARGE);
        if (!recharge.isEmpty()) {
            typed(recharge).ifPresent(sources::add);
        }
        for (Role role : List.of(Role.AREAL, Role.POINTS, Role.CELLS)) {
            binder.parts(role).forEach(part -> add(sources, part));
        }
        return sources;
    }

    private void add(List<Object> sources, Part part) {
        Map<String, Object> source = new LinkedHashMap<>();
        source.put("category", part.use().name());
        if (part.use().name().isEmpty()) {
            findings.accept(Finding.fault(
                    part.item(),
                    "Give " + part.shown() + " a category: the word that stands for it in" + " the budget."));
        }
        source.put(
                "kind",
                switch (part.use().role()) {
                    case AREAL -> "areal";
                    case CELLS -> "cells";
                    default -> "points";
                });
        if (part.use().role() == Role.POINTS) {
            if (part.item() instanceof Item.Table table && table.arePoints()) {
                source.put("file", shelf.table(table, binder.times()));
                checkDates(table);
                sources.add(source);
            } else {
                findings.accept(Finding.fault(
                        part.item(), part.shown() + " has no points: wells need a table with x, y and" + " rate."));
            }
            return;
        }
        rate(part).ifPresent(rate -> {
            source.put("rate", rate);
            carried.by(part).ifPresent(concentrations -> source.put("concentration", concentrations));
            sources.add(source);
        });
    }

    /** Values that tell no layers apart enter the uppermost active cell; those of one layer are none in the others. */
    private Optional<Object> rate(Part part) {
        List<Optional<Bound>> bounds = binder.perLayer(List.of(part), Optional.empty());
        boolean some = bounds.stream().anyMatch(Optional::isPresent);
        boolean all = bounds.stream().allMatch(Optional::isPresent);
        if (some && !all) {
            bounds.replaceAll(bound -> bound.or(() -> Optional.of(Bound.number(0, ""))));
        }
        return binder.joined("rate of " + part.use().name(), Optional.empty(), bounds);
    }

    private void checkDates(Item.Table table) {
        int name = table.places().indexOf(Place.NAME);
        boolean open = table.places().contains(Place.FROM) && !table.places().contains(Place.TO);
        if (open && name >= 0) {
            TableLook look = table.file().look();
            if (look.columns().get(name).distinct().size() < look.lines()) {
                findings.accept(Finding.fault(
                        table,
                        table.id()
                                + " gives several rates of the same well and says from when each holds, not until when:"
                                + " they would add up. Add a column \"to\"."));
            }
        }
        boolean dates = false;
        for (int column = 0; column < table.places().size(); column++) {
            Place place = table.places().get(column);
            dates |= (place == Place.FROM || place == Place.TO)
                    && table.file().look().columns().get(column).texts() > 0;
        }
        if (dates && binder.times().start().isEmpty()) {
            findings.accept(Finding.fault(
                    Topic.START, table.id() + " has dates. Say the date of instant 0, so that they can be placed."));
        }
    }

    private Optional<Object> typed(String text) {
        int blank = text.indexOf(' ');
        String number = blank < 0 ? text : text.substring(0, blank);
        Optional<String> unit = blank < 0 ? Optional.of("") : UnitGuess.read(text.substring(blank), Role.Amount.RATE);
        List<Double> numbers = Numbers.of(number);
        if (numbers.size() != 1 || unit.isEmpty()) {
            findings.accept(Finding.fault(
                    Topic.RECHARGE, "\"" + text + "\" is no rate: type a number and its unit, as 120 mm/yr."));
            return Optional.empty();
        }
        Map<String, Object> source = new LinkedHashMap<>();
        source.put("category", "recharge");
        source.put("kind", "areal");
        source.put("rate", Bound.number(numbers.get(0), unit.get()).json());
        return Optional.of(source);
    }
}
