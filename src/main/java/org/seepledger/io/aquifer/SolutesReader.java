package org.seepledger.io.aquifer;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.fault.DataFault;
import org.seepledger.io.table.StepKind;
import org.seepledger.unit.Measure;

/** Reads what {@code aquifer.json} says of solutes: their names and porosities. The schema has seen to the other keys. */
final class SolutesReader {

    private final Bindings bindings;

    SolutesReader(Bindings bindings) {
        this.bindings = bindings;
    }

    List<Solute> read(JsonNode nodes) {
        List<Solute> solutes = new ArrayList<>();
        Map<String, Integer> names = new HashMap<>();
        for (int i = 0; i < nodes.size(); i++) {
            JsonNode node = nodes.get(i);
            String place = "solutes[" + i + "]";
            String name = node.get("name").textValue();
            Integer other = names.putIfAbsent(name, i);
            if (other != null) {
                throw new DataFault(
                        AquiferReader.FILE,
                        place + ".name",
                        "\"" + name + "\", which solutes[" + other + "] has already",
                        "names that differ",
                        "Rename one.");
            }
            solutes.add(new Solute(
                    name, share("porosity", node, name, place), share("effective_porosity", node, name, place)));
        }
        return solutes;
    }

    private Optional<GriddedValues> share(String key, JsonNode solute, String name, String place) {
        return Optional.ofNullable(solute.get(key))
                .map(node -> bindings.values(
                        key.replace('_', ' ') + " of " + name,
                        node,
                        place + "." + key,
                        Measure.number(),
                        StepKind.NONE));
    }
}
