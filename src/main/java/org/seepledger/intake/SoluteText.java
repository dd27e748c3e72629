package org.seepledger.intake;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import org.seepledger.intake.Wishes.Topic;

/** The solutes of a set: one for each name that concentrations have. */
final class SoluteText {

    private final Binder binder;
    private final Consumer<Finding> findings;

    SoluteText(Binder binder, Consumer<Finding> findings) {
        this.binder = binder;
        this.findings = findings;
    }

    List<Object> solutes() {
        Map<String, List<Part>> byName = new LinkedHashMap<>();
        for (Part part : binder.parts(Role.CONCENTRATION)) {
            byName.computeIfAbsent(part.use().name(), name -> new ArrayList<>());
            if (!Carried.is(part)) {
                byName.get(part.use().name()).add(part);
            }
        }
        List<Object> solutes = new ArrayList<>();
        byName.forEach((name, parts) -> solutes.add(solute(name, parts)));
        return solutes;
    }

    private Map<String, Object> solute(String name, List<Part> parts) {
        Map<String, Object> solute = new LinkedHashMap<>();
        solute.put("name", name.isEmpty() ? "solute" : name);
        List<Part> plain = parts.stream()
                .map(part -> new Part(part.item(), part.use().withUnit("")))
                .toList();
        binder.joined("concentration of " + name, Optional.empty(), binder.perLayer(plain, Optional.empty()))
                .ifPresent(json -> solute.put("concentration", json));
        String unit = parts.isEmpty() ? "mg/L" : parts.get(0).use().unit();
        if (unit.isEmpty()) {
            findings.accept(Finding.doubt(
                    parts.get(0).item(),
                    "Nothing tells the unit of the concentrations in "
                            + parts.get(0).shown() + "; mg/L is taken. Check it."));
        }
        solute.put("unit", unit.isEmpty() ? "mg/L" : unit);
        share(solute, "porosity", Role.POROSITY, Optional.of(Topic.POROSITY));
        share(solute, "effective_porosity", Role.EFFECTIVE_POROSITY, Optional.empty());
        share(solute, "bulk_density", Role.BULK_DENSITY, Optional.empty());
        if (!solute.containsKey("porosity")) {
            findings.accept(Finding.doubt(
                    Topic.POROSITY,
                    "There are concentrations and no porosity: mass in place stays unknown. Type it, as 0.25."));
        }
        return solute;
    }

    private void share(Map<String, Object> solute, String key, Role role, Optional<Topic> topic) {
        binder.joined(Binder.word(role), topic, binder.perLayer(role, topic)).ifPresent(json -> solute.put(key, json));
    }
}
