package org.seepledger.picture;

import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Layer;

/**
 * All that a vertical section shows.
 *
 * @param profile the aquifer along the line
 * @param layers its layers
 * @param lengthUnit the unit of distances and elevations
 * @param span what water levels are those of the begin and end of, as {@code record}; empty where they do not change
 * @param bodies what it cuts out of prisms
 * @param wells the wells beside the line
 * @param within how far from the line wells are shown, in length units
 * @param colours values as colour, if any
 * @param light what stands out
 */
public record Section(
        Profile profile,
        List<Layer> layers,
        String lengthUnit,
        Optional<String> span,
        List<Body> bodies,
        List<NearbyWell> wells,
        double within,
        Optional<Colours> colours,
        Light light) {

    /** Copies the lists. */
    public Section {
        layers = List.copyOf(layers);
        bodies = List.copyOf(bodies);
        wells = List.copyOf(wells);
    }

    /**
     * Which colour a value has.
     *
     * @param scale the colours
     * @param words what the values are, with their unit
     */
    public record Colours(ValueScale scale, String words) {}

    /**
     * What stands out: one prism, the net flow through its lids, and one of them.
     *
     * @param prism its name; empty for none
     * @param lid {@code top}, {@code bottom}, or empty for neither
     * @param top the net flow through its top, in; NaN where none can be given
     * @param bottom the net flow through its bottom
     * @param unit the unit of flow, as it is read; empty where no flow is known
     */
    public record Light(String prism, String lid, double top, double bottom, String unit) {

        /** Nothing stands out. */
        public static final Light NONE = new Light("", "", Double.NaN, Double.NaN, "");
    }

    /** {@return what it cuts out of the prism that stands out, if it meets it} */
    public Optional<Body> body() {
        return bodies.stream()
                .filter(body -> body.name().equals(light.prism()))
                .filter(body -> !body.slabs().isEmpty())
                .findFirst();
    }

    /** {@return whether the line meets any layer} */
    public boolean isThere() {
        return SectionFrame.elevations(profile).findAny().isPresent();
    }

    /**
     * {@return the same with something else standing out}
     *
     * @param other what
     */
    public Section in(Light other) {
        return new Section(profile, layers, lengthUnit, span, bodies, wells, within, colours, other);
    }

    /**
     * {@return the same in other colours}
     *
     * @param other which colour a value has, if any
     */
    public Section in(Optional<Colours> other) {
        return new Section(profile, layers, lengthUnit, span, bodies, wells, within, other, light);
    }

    /** The water level in a layer where the water table can lie in it and its head is known; else above all. */
    double level(Profile.Column column, int layer) {
        double head = column.heads().length == 0 ? Double.NaN : column.heads()[layer];
        return layers.get(layer).waterTable() && !Double.isNaN(head) ? head : Double.POSITIVE_INFINITY;
    }

    /** Whether a layer is dry in a column of cells at the end: its head below its bottom, or none for want of water. */
    boolean isDry(Profile.Column column, int layer) {
        double head = column.heads().length == 0 ? Double.NaN : column.heads()[layer];
        return head == Double.NEGATIVE_INFINITY
                || layers.get(layer).waterTable() && head <= column.surfaces()[layer + 1];
    }
}
