package org.seepledger.sketch;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.prism.VerticalRange;

/** How far a prism reaches up and down, as it was typed. */
public sealed interface Reach {

    /** Nothing was typed: all layers. */
    record Whole() implements Reach {}

    /**
     * A stack of whole layers.
     *
     * @param first the uppermost, from 0
     * @param last the lowest
     */
    record Layers(int first, int last) implements Reach {

        /** Refuses a stack that is upside down. */
        public Layers {
            if (first < 0 || last < first) {
                throw new Refusal("Layers count from 1 downward, the upper one first.");
            }
        }
    }

    /**
     * Between two elevations or surfaces.
     *
     * @param top the upper one; empty for the grid's own
     * @param bottom the lower one; empty for the grid's own
     */
    record Between(Optional<Limit> top, Optional<Limit> bottom) implements Reach {

        /** Refuses two elevations the wrong way round, and neither. */
        public Between {
            if (top.isEmpty() && bottom.isEmpty()) {
                throw new Refusal("Give a top or a bottom, or layers.");
            }
            if (top.orElse(null) instanceof Limit.Elevation upper
                    && bottom.orElse(null) instanceof Limit.Elevation lower
                    && !(upper.height() > lower.height())) {
                throw new Refusal("The top lies above the bottom.");
            }
            if (top.orElse(null) instanceof Limit.Layer upper
                    && bottom.orElse(null) instanceof Limit.Layer lower
                    && upper.index() > lower.index()) {
                throw new Refusal("The top lies above the bottom.");
            }
        }
    }

    /**
     * {@return the range of a prism on a grid}
     *
     * @param layers how many layers the grid has
     * @param surfaces gives the surfaces that are named
     * @throws Refusal if the grid has no such layer
     */
    default VerticalRange on(int layers, Surfaces surfaces) {
        if (this instanceof Between between) {
            return new VerticalRange.Elevations(
                    between.top().map(limit -> values(limit, "top", layers, surfaces)),
                    between.bottom().map(limit -> values(limit, "bottom", layers, surfaces)));
        }
        if (this instanceof Layers stack) {
            check(stack.last(), layers);
            return new VerticalRange.Layers(stack.first(), stack.last());
        }
        return new VerticalRange.Layers(0, layers - 1);
    }

    /** {@return the surfaces that it names} */
    default List<Limit.Surface> surfaces() {
        return this instanceof Between between
                ? Stream.of(between.top(), between.bottom())
                        .flatMap(Optional::stream)
                        .filter(Limit.Surface.class::isInstance)
                        .map(Limit.Surface.class::cast)
                        .toList()
                : List.of();
    }

    private static GriddedValues values(Limit limit, String lid, int layers, Surfaces surfaces) {
        if (limit instanceof Limit.Layer layer) {
            check(layer.index(), layers);
        }
        return limit instanceof Limit.Elevation elevation
                ? GriddedValues.constant(elevation.height())
                : surfaces.read(limit, lid);
    }

    private static void check(int layer, int layers) {
        if (layer >= layers) {
            throw new Refusal("The grid has " + layers + (layers == 1 ? " layer." : " layers."));
        }
    }
}
