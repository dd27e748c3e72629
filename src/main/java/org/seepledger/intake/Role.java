package org.seepledger.intake;

import org.seepledger.io.table.StepKind;

/** What values can be in an aquifer folder. */
public enum Role {
    /** Not used. */
    NONE(Amount.NOTHING, StepKind.NONE),
    /** Top of a layer. */
    TOP(Amount.LENGTH, StepKind.NONE),
    /** Bottom of a layer. */
    BOTTOM(Amount.LENGTH, StepKind.NONE),
    /** Head. */
    HEAD(Amount.LENGTH, StepKind.INSTANT),
    /** Hydraulic conductivity along x, or in plan. */
    CONDUCTIVITY(Amount.RATE, StepKind.INTERVAL),
    /** Hydraulic conductivity along y. */
    CONDUCTIVITY_Y(Amount.RATE, StepKind.INTERVAL),
    /** Vertical hydraulic conductivity. */
    VERTICAL_CONDUCTIVITY(Amount.RATE, StepKind.INTERVAL),
    /** Specific discharge along x. */
    FLUX_X(Amount.RATE, StepKind.INTERVAL),
    /** Specific discharge along y. */
    FLUX_Y(Amount.RATE, StepKind.INTERVAL),
    /** Specific discharge upward. */
    FLUX_Z(Amount.RATE, StepKind.INTERVAL),
    /** Flow through the east face. */
    FLOW_EAST(Amount.FLOW, StepKind.INTERVAL),
    /** Flow through the north face. */
    FLOW_NORTH(Amount.FLOW, StepKind.INTERVAL),
    /** Flow through the upper face. */
    FLOW_UP(Amount.FLOW, StepKind.INTERVAL),
    /** Flow through the west face. */
    FLOW_WEST(Amount.FLOW, StepKind.INTERVAL),
    /** Flow through the south face. */
    FLOW_SOUTH(Amount.FLOW, StepKind.INTERVAL),
    /** Flow through the lower face. */
    FLOW_DOWN(Amount.FLOW, StepKind.INTERVAL),
    /** Specific yield. */
    SPECIFIC_YIELD(Amount.SHARE, StepKind.NONE),
    /** Specific storage. */
    SPECIFIC_STORAGE(Amount.PER_LENGTH, StepKind.NONE),
    /** Storativity. */
    STORATIVITY(Amount.SHARE, StepKind.NONE),
    /** Release from storage, supplied. */
    SUPPLIED(Amount.FLOW, StepKind.INTERVAL),
    /** A source as a rate over the plan area. */
    AREAL(Amount.RATE, StepKind.INTERVAL),
    /** A source as a flow into cells. */
    CELLS(Amount.FLOW, StepKind.INTERVAL),
    /** Wells. */
    POINTS(Amount.FLOW, StepKind.INTERVAL),
    /** Where the aquifer is: 0 or no value elsewhere. */
    ACTIVE(Amount.NOTHING, StepKind.NONE),
    /** Concentration of a solute. */
    CONCENTRATION(Amount.CONCENTRATION, StepKind.INSTANT),
    /** Total porosity. */
    POROSITY(Amount.SHARE, StepKind.NONE),
    /** Effective porosity. */
    EFFECTIVE_POROSITY(Amount.SHARE, StepKind.NONE),
    /** Dry bulk density. */
    BULK_DENSITY(Amount.DENSITY, StepKind.NONE),
    /** Prisms. */
    PRISMS(Amount.NOTHING, StepKind.NONE);

    /** What a value measures. */
    public enum Amount {
        /** Nothing that has a unit. */
        NOTHING(""),
        /** A length. */
        LENGTH("m"),
        /** A length over a time. */
        RATE("m/d"),
        /** A volume over a time. */
        FLOW("m3/d"),
        /** A share. */
        SHARE("1"),
        /** One over a length. */
        PER_LENGTH("1/m"),
        /** A mass over a volume. */
        CONCENTRATION("mg/L"),
        /** A mass over a volume of rock. */
        DENSITY("kg/m3");

        private final String like;

        Amount(String like) {
            this.like = like;
        }

        /** {@return a unit of it; empty if it has none} */
        public String like() {
            return like;
        }
    }

    private final Amount amount;
    private final StepKind steps;

    Role(Amount amount, StepKind steps) {
        this.amount = amount;
        this.steps = steps;
    }

    /** {@return what its values measure} */
    public Amount amount() {
        return amount;
    }

    /** {@return when its values hold} */
    public StepKind steps() {
        return steps;
    }

    /** {@return whether it is a surface between layers} */
    public boolean isSurface() {
        return this == TOP || this == BOTTOM;
    }

    /** {@return whether it is a source of water} */
    public boolean isSource() {
        return this == AREAL || this == CELLS || this == POINTS;
    }

    /** {@return whether it is named by the user: a source, a solute, an item of storage} */
    public boolean isNamed() {
        return isSource() || this == CONCENTRATION || this == SUPPLIED;
    }
}
