package org.seepledger.io.aquifer;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Iterator;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.fault.DataFault;

/** Reads the {@code grid} of a set. */
final class GridReader {

    private GridReader() {}

    static Grid read(JsonNode node, double planUnit, DataFiles files) {
        if (node.has("like")) {
            return files.grid(node.get("like").textValue(), "grid.like", planUnit);
        }
        double rotation = node.has("rotation") ? node.get("rotation").doubleValue() : 0;
        return new Grid(axis(node.get("x"), "grid.x"), axis(node.get("y"), "grid.y"), rotation, planUnit);
    }

    private static Axis axis(JsonNode node, String place) {
        try {
            return node.has("edges")
                    ? Axis.of(numbers(node.get("edges")))
                    : Axis.even(
                            node.get("from").doubleValue(),
                            node.get("step").doubleValue(),
                            node.get("count").intValue());
        } catch (IllegalArgumentException e) {
            throw new DataFault(
                    AquiferReader.FILE,
                    place,
                    "edges that cannot be (" + e.getMessage() + ")",
                    "strictly increasing edges",
                    "Correct the list; y edges run from south to north.");
        }
    }

    static double[] numbers(JsonNode array) {
        double[] numbers = new double[array.size()];
        Iterator<JsonNode> entries = array.elements();
        for (int i = 0; i < numbers.length; i++) {
            numbers[i] = entries.next().doubleValue();
        }
        return numbers;
    }
}
