package org.seepledger.intake;

import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import org.seepledger.intake.Wishes.Topic;

/** What is weakly guessed or cannot be read, and what a set can do without but a person may have forgotten. */
final class SetDoubts {

    private final Plan plan;
    private final Binder binder;
    private final Consumer<Finding> findings;

    SetDoubts(Plan plan, Binder binder, Consumer<Finding> findings) {
        this.plan = plan;
        this.binder = binder;
        this.findings = findings;
    }

    void on(Map<String, Object> set) {
        plan.items().forEach(this::on);
        boolean steady = binder.times().intervals() == 1;
        if (!steady) {
            storage(set.get("storage"));
        }
        boolean headless = !set.containsKey("head") && binder.parts(Role.HEAD).isEmpty();
        if (headless && waterTables().contains(true)) {
            doubt(
                    Topic.HEAD,
                    "There are no heads: water-table layers are taken as saturated to their top, and storage is unknown"
                            + (steady ? " unless the set is steady." : "."));
        }
        if (!set.containsKey("sources")) {
            doubt(Topic.RECHARGE, "There is no recharge, well or other source. Is nothing added and nothing taken?");
        }
    }

    private void on(Item item) {
        for (Use use : item.uses()) {
            if (use.role() != Role.NONE && use.guess().confidence() == Guess.Confidence.LOW) {
                String shown = new Part(item, use).shown();
                findings.accept(Finding.doubt(item, shown + ": " + use.guess().reason()));
            }
        }
        if (item instanceof Item.Table table && isUnseparated(table)) {
            String heading = table.file().look().columns().get(0).heading();
            findings.accept(Finding.doubt(
                    item,
                    item.id() + " has a single column, \"" + heading
                            + "\". Separate columns by commas, semicolons or tabs."));
        }
        if (item instanceof Item.Other other && other.file().kind() == LooseFile.Kind.BROKEN) {
            findings.accept(Finding.doubt(item, other.file().words() + " Until then it is left out."));
        }
    }

    private static boolean isUnseparated(Item.Table table) {
        return table.file().look().columns().size() == 1
                && table.file().look().columns().get(0).heading().matches(".*[\\s|].*");
    }

    private void storage(Object given) {
        if (given instanceof Map<?, ?> storage) {
            if (!storage.containsKey("supplied")) {
                coefficients(storage);
            }
        } else {
            doubt(
                    Topic.SPECIFIC_YIELD,
                    "There is more than one interval and no storage: change in storage, residual and closure error stay"
                            + " unknown. Bring specific yield and specific storage, or type them.");
        }
    }

    private void coefficients(Map<?, ?> storage) {
        boolean elastic = storage.containsKey("specific_storage") || storage.containsKey("storativity");
        if (waterTables().contains(true) && !storage.containsKey("specific_yield")) {
            doubt(
                    Topic.SPECIFIC_YIELD,
                    "No specific yield is given, which layers with a water table need: change in storage stays"
                            + " unknown.");
        }
        if (waterTables().contains(false) && !elastic) {
            doubt(
                    Topic.SPECIFIC_STORAGE,
                    "No specific storage is given, which layers without a water table need: change in storage stays"
                            + " unknown.");
        }
    }

    private List<Boolean> waterTables() {
        return LayerWishes.waterTables(plan, binder.layers());
    }

    private void doubt(Topic topic, String words) {
        findings.accept(Finding.doubt(topic, words));
    }
}
