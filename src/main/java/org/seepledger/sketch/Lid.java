package org.seepledger.sketch;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The top or the bottom of a prism, and what becomes of its reach when one is moved and the other stays. */
public enum Lid {
    /** The upper one. */
    TOP,
    /** The lower one. */
    BOTTOM;

    private static final Pattern LAYER = Pattern.compile("\\s*layer\\s+(\\d{1,6})\\s*");

    /** {@return what the budget calls it} */
    public String item() {
        return this == TOP ? "top" : "bottom";
    }

    /**
     * {@return the lid of an item}
     *
     * @param item as the budget calls it; another item is none
     */
    public static Optional<Lid> of(String item) {
        return item.equals("top") ? Optional.of(TOP) : item.equals("bottom") ? Optional.of(BOTTOM) : Optional.empty();
    }

    /**
     * {@return where the lid of a reach lies}
     *
     * @param reach the reach
     * @param layers how many layers the grid has
     */
    public Limit in(Reach reach, int layers) {
        Limit own = new Limit.Layer(this == TOP ? 0 : layers - 1);
        if (reach instanceof Reach.Layers stack) {
            return new Limit.Layer(this == TOP ? stack.first() : stack.last());
        }
        if (reach instanceof Reach.Between between) {
            return (this == TOP ? between.top() : between.bottom()).orElse(own);
        }
        return own;
    }

    /**
     * {@return the reach with this lid elsewhere; where both then lie on layers, a stack of layers}
     *
     * @param reach the reach before
     * @param to where the lid is to lie
     * @param layers how many layers the grid has
     * @throws Refusal if the top would not lie above the bottom, or the grid has no such layer
     */
    public Reach moved(Reach reach, Limit to, int layers) {
        if (to instanceof Limit.Layer layer && layer.index() >= layers) {
            throw new Refusal("The grid has " + layers + (layers == 1 ? " layer." : " layers."));
        }
        if (to.equals(in(reach, layers))) {
            return reach;
        }
        Limit top = this == TOP ? to : TOP.in(reach, layers);
        Limit bottom = this == BOTTOM ? to : BOTTOM.in(reach, layers);
        if (top instanceof Limit.Layer first && bottom instanceof Limit.Layer last) {
            if (first.index() > last.index()) {
                throw new Refusal("The top lies above the bottom.");
            }
            return new Reach.Layers(first.index(), last.index());
        }
        return new Reach.Between(named(top, 0), named(bottom, layers - 1));
    }

    /** A limit; none where it is the grid's own. */
    private static Optional<Limit> named(Limit limit, int outermost) {
        return Optional.of(limit).filter(given -> !given.equals(new Limit.Layer(outermost)));
    }

    /**
     * {@return what a person typed for a lid: an elevation as a number, or a layer as {@code layer 2}; empty for neither}
     *
     * @param text what was typed
     */
    public static Optional<Limit> typed(String text) {
        Matcher layer = LAYER.matcher(text);
        if (layer.matches() && Integer.parseInt(layer.group(1)) > 0) {
            return Optional.of(new Limit.Layer(Integer.parseInt(layer.group(1)) - 1));
        }
        try {
            double height = Double.parseDouble(text.strip().replace('−', '-'));
            return Double.isFinite(height) ? Optional.of(new Limit.Elevation(height)) : Optional.empty();
        } catch (NumberFormatException e) {
            return Optional.empty();
        }
    }

    /**
     * {@return a limit as it is typed: a number, {@code layer 2}, or the path of a surface}
     *
     * @param limit the limit
     */
    public static String text(Limit limit) {
        if (limit instanceof Limit.Elevation elevation) {
            return Double.toString(elevation.height()).replaceFirst("\\.0$", "");
        }
        return limit instanceof Limit.Layer layer ? "layer " + (layer.index() + 1) : ((Limit.Surface) limit).path();
    }
}
