package org.seepledger.desktop.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import org.seepledger.desktop.intake.ItemRow.Mark;
import org.seepledger.desktop.words.Words;
import org.seepledger.intake.Finding;
import org.seepledger.intake.Item;
import org.seepledger.intake.Plan;
import org.seepledger.intake.Role;
import org.seepledger.intake.Use;

/** The lines of the list of items: the set first, then what is used, then what is not. */
final class ItemRows {

    private ItemRows() {}

    static List<ItemRow> of(Optional<Plan> plan, Optional<Made> made) {
        List<ItemRow> rows = new ArrayList<>();
        List<ItemRow> unused = new ArrayList<>();
        if (plan.isEmpty()) {
            return rows;
        }
        List<Finding> findings = made.map(now -> now.copied().findings()).orElse(List.of());
        rows.add(new ItemRow(-1, Words.of("intake.set"), set(made), ofSet(findings)));
        List<Item> items = plan.get().items();
        for (int index = 0; index < items.size(); index++) {
            Item item = items.get(index);
            Mark mark = of(item, findings);
            (mark == Mark.UNUSED ? unused : rows).add(new ItemRow(index, item.id(), lead(item), mark));
        }
        rows.addAll(unused);
        return rows;
    }

    private static String set(Optional<Made> made) {
        return made.map(now -> Words.of(
                        "intake.set.lead",
                        now.copied()
                                .grid()
                                .grid()
                                .map(grid -> Words.of("intake.set.grid", grid.rows(), grid.columns()))
                                .orElse(Words.of("intake.set.nogrid")),
                        now.copied().layers(),
                        now.copied().times().intervals()))
                .orElse("");
    }

    private static Mark ofSet(List<Finding> findings) {
        return worst(
                findings.stream().filter(finding -> finding.item().isEmpty()).toList());
    }

    static Mark worst(List<Finding> findings) {
        return findings.stream()
                .map(Finding::level)
                .filter(level -> level != Finding.Level.NOTE)
                .sorted()
                .findFirst()
                .map(level -> level == Finding.Level.FAULT ? Mark.FAULT : Mark.DOUBT)
                .orElse(Mark.FINE);
    }

    private static Mark of(Item item, List<Finding> findings) {
        Mark worst = worst(findings.stream()
                .filter(finding -> finding.item().equals(Optional.of(item.id())))
                .toList());
        if (!item.isUsed()) {
            return worst == Mark.FINE ? Mark.UNUSED : worst;
        }
        return worst;
    }

    private static String lead(Item item) {
        String roles = item.uses().stream()
                .filter(use -> use.role() != Role.NONE)
                .map(ItemRows::words)
                .distinct()
                .collect(Collectors.joining(", "));
        String what = roles.isEmpty() ? Words.of("intake.unused") : roles;
        return item.files().size() == 1
                ? what
                : Words.of("intake.item.files", what, item.files().size());
    }

    private static String words(Use use) {
        String role = role(use.role());
        return use.role().isSurface() && use.layer() > 0 ? Words.of("intake.item.layer", role, use.layer()) : role;
    }

    static String role(Role role) {
        return Words.of("intake.role." + role.name().toLowerCase(Locale.ROOT).replace('_', '.'));
    }
}
