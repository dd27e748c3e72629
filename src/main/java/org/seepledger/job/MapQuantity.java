package org.seepledger.job;

/**
 * What a map can show of an aquifer, layer by layer.
 *
 * @param kind what kind of quantity it is
 * @param source the source's category, for {@link Kind#SOURCE}, or the solute's name, for its concentrations; else empty
 * @param unit its unit, as users write it
 */
public record MapQuantity(Kind kind, String source, String unit) {

    /** The kinds of quantities. */
    public enum Kind {
        /** Head at the interval's end; no value where a cell is dry. */
        HEAD,
        /** The magnitude of specific discharge at cell centres, all three components. */
        FLUX,
        /** Between a layer's two surfaces. */
        THICKNESS,
        /** Under water at the interval's end. */
        SATURATED_THICKNESS,
        /** What sources of one category add to a cell, over its plan area; wells left out. */
        SOURCE,
        /** What a cell gains in the interval that nothing accounts for. */
        IMBALANCE,
        /** Of a solute, at the interval's end. */
        CONCENTRATION,
        /** Of a solute, the mean of the interval's two ends: what flows carry. */
        MEAN_CONCENTRATION
    }

    /**
     * {@return what it is called}
     */
    public String label() {
        return switch (kind) {
            case HEAD -> "head";
            case FLUX -> "flux magnitude";
            case THICKNESS -> "thickness";
            case SATURATED_THICKNESS -> "saturated thickness";
            case SOURCE -> source;
            case IMBALANCE -> "imbalance";
            case CONCENTRATION -> source + ", interval's end";
            case MEAN_CONCENTRATION -> source + ", mean of both ends";
        };
    }

    /** {@return whether it is a concentration} */
    public boolean isConcentration() {
        return kind == Kind.CONCENTRATION || kind == Kind.MEAN_CONCENTRATION;
    }

    /**
     * {@return whether it may differ between intervals}
     */
    public boolean changes() {
        return kind != Kind.THICKNESS;
    }
}
