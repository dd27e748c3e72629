package org.seepledger.intake;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.Stream;

/**
 * What sources carry: concentrations in the table of a source, and those that a table gives for intervals, since what the
 * aquifer's water carries is given at instants.
 */
final class Carried {

    private final Binder binder;
    private final Consumer<Finding> findings;

    Carried(Binder binder, Consumer<Finding> findings) {
        this.binder = binder;
        this.findings = findings;
    }

    /** {@return whether concentrations are of a source, not of the aquifer's water} */
    static boolean is(Part concentration) {
        boolean beside =
                concentration.item().uses().stream().anyMatch(use -> use.role().isSource());
        boolean forIntervals = concentration.item() instanceof Item.Table table
                && table.places().contains(Place.INTERVAL);
        return beside || forIntervals;
    }

    /** {@return what a source carries, by solute; empty if nothing tells} */
    Optional<Object> by(Part source) {
        Map<String, Object> carried = new LinkedHashMap<>();
        for (Part part : binder.parts(Role.CONCENTRATION)) {
            if (is(part) && source(part).filter(source::equals).isPresent()) {
                binder.joined(
                                "concentration of " + part.use().name(),
                                Optional.empty(),
                                binder.perLayer(List.of(part), Optional.empty()))
                        .ifPresent(json -> carried.put(part.use().name(), json));
            }
        }
        return carried.isEmpty() ? Optional.empty() : Optional.of(carried);
    }

    /** The source whose table it stands in; else the only one there is. */
    private Optional<Part> source(Part concentration) {
        List<Part> sources = Stream.of(Role.AREAL, Role.CELLS)
                .flatMap(role -> binder.parts(role).stream())
                .toList();
        Optional<Part> beside = sources.stream()
                .filter(source -> source.item().equals(concentration.item()))
                .findFirst();
        if (beside.isEmpty() && sources.size() > 1) {
            findings.accept(Finding.fault(
                    concentration.item(),
                    concentration.shown()
                            + " gives concentrations for intervals, as sources carry them, and there are several"
                            + " sources. Put them into the table of their source, or leave them out."));
        }
        return beside.or(() -> sources.size() == 1 ? Optional.of(sources.get(0)) : Optional.empty());
    }
}
