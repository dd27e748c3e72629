package org.seepledger.intake;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * The aquifer folder that a plan makes.
 *
 * @param set what {@code aquifer.json} is to hold
 * @param grid the grid
 * @param times the instants
 * @param layers how many layers there are
 * @param flow the kind of flow; empty if nothing gives any
 * @param copies which file goes where
 * @param findings what is wrong, missing or doubtful, the worst first
 * @param obstacles why {@code aquifer.json} cannot name the files where they lie; empty if it can, or if they are copied
 */
public record Composition(
        Map<String, Object> set,
        FoundGrid grid,
        FoundTimes times,
        int layers,
        String flow,
        List<Copy> copies,
        List<Finding> findings,
        List<String> obstacles) {

    /** Copies the lists. */
    public Composition {
        copies = List.copyOf(copies);
        findings = List.copyOf(findings);
        obstacles = List.copyOf(obstacles);
    }

    /**
     * {@return the aquifer folder that a plan makes}
     *
     * @param plan the plan
     * @param inPlace whether the files stay where they lie, rather than being copied
     */
    public static Composition of(Plan plan, boolean inPlace) {
        Set<Finding> findings = new LinkedHashSet<>();
        FoundGrid grid = new GridFinder(plan, findings::add).find();
        FoundTimes times = new TimesFinder(plan, findings::add).find();
        int layers = Math.max(1, LayerWishes.of(plan));
        Shelf shelf = new Shelf(inPlace, times.skipFirst(), findings::add);
        Binder binder = new Binder(plan, layers, times, shelf, findings::add);
        SetText text = new SetText(plan, grid, binder, shelf, findings::add);
        Map<String, Object> set = text.set();
        List<Finding> sorted = new ArrayList<>(findings);
        sorted.sort(Comparator.comparing(Finding::level));
        return new Composition(set, grid, times, layers, text.flowKind(), shelf.copies(), sorted, shelf.obstacles());
    }

    /** {@return whether nothing stands in the way of writing it} */
    public boolean isSound() {
        return obstacles.isEmpty() && findings.stream().noneMatch(finding -> finding.level() == Finding.Level.FAULT);
    }
}
