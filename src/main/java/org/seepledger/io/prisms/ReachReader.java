package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Optional;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Reach;

/** Reads how far a prism reaches: {@code layers}, or {@code top} and {@code bottom}, or neither for all layers. */
final class ReachReader {

    private final int layers;

    /**
     * Reads ranges.
     *
     * @param layers the number of layers of the grid
     */
    ReachReader(int layers) {
        this.layers = layers;
    }

    Reach read(JsonNode properties, Spot spot) {
        JsonNode stack = properties.path("layers");
        JsonNode top = properties.path("top");
        JsonNode bottom = properties.path("bottom");
        boolean elevations = isGiven(top) || isGiven(bottom);
        if (isGiven(stack) && elevations) {
            throw spot.fault(
                    "layers together with top or bottom",
                    "one way to say how far the prism reaches",
                    "Take out layers, or top and bottom.");
        }
        if (!elevations) {
            return isGiven(stack) ? stack(stack, spot.in("layers")) : new Reach.Whole();
        }
        if (top.isNumber() && bottom.isNumber() && !(top.doubleValue() > bottom.doubleValue())) {
            throw spot.fault(
                    "top " + Spot.shown(top) + " and bottom " + Spot.shown(bottom),
                    "a top above the bottom",
                    "Correct the elevations.");
        }
        if (top.isObject() && bottom.isObject() && layer(top, spot.in("top")) > layer(bottom, spot.in("bottom"))) {
            throw spot.fault(
                    "top " + Spot.shown(top) + " and bottom " + Spot.shown(bottom),
                    "a top above the bottom",
                    "Layers count from the top down.");
        }
        return new Reach.Between(limit(top, spot.in("top")), limit(bottom, spot.in("bottom")));
    }

    /** Geographic information systems write null for a field that a feature lacks. */
    private static boolean isGiven(JsonNode value) {
        return !value.isMissingNode() && !value.isNull();
    }

    private Reach stack(JsonNode stack, Spot spot) {
        boolean pair = stack.isArray() && stack.size() == 2 && isLayer(stack.get(0)) && isLayer(stack.get(1));
        if (!pair || stack.get(0).intValue() > stack.get(1).intValue()) {
            throw spot.fault(
                    Spot.shown(stack),
                    "[first, last], two whole numbers from 1 to " + layers + " counted from the top down",
                    "Write, for instance, [1, " + layers + "].");
        }
        return new Reach.Layers(stack.get(0).intValue() - 1, stack.get(1).intValue() - 1);
    }

    private boolean isLayer(JsonNode number) {
        return number.isNumber()
                && number.doubleValue() == Math.rint(number.doubleValue())
                && number.doubleValue() >= 1
                && number.doubleValue() <= layers;
    }

    private int layer(JsonNode value, Spot spot) {
        if (value.size() != 1 || !isLayer(value.path("layer"))) {
            throw spot.fault(
                    Spot.shown(value),
                    "{\"layer\": n}, a whole number from 1 to " + layers + " counted from the top down",
                    "Write, for instance, {\"layer\": " + layers + "}.");
        }
        return value.path("layer").intValue() - 1;
    }

    private Optional<Limit> limit(JsonNode value, Spot spot) {
        if (!isGiven(value)) {
            return Optional.empty();
        }
        if (value.isNumber() && Double.isFinite(value.doubleValue())) {
            return Optional.of(new Limit.Elevation(value.doubleValue()));
        }
        if (value.isObject()) {
            return Optional.of(new Limit.Layer(layer(value, spot)));
        }
        if (!value.isTextual()) {
            throw spot.fault(
                    Spot.shown(value),
                    "an elevation, a layer, or the path of a surface raster",
                    "Write a number, {\"layer\": n}, a path, or leave it out for the grid's own.");
        }
        return Optional.of(new Limit.Surface(value.textValue()));
    }
}
