package org.seepledger.picture;

import java.util.Locale;

/**
 * A colour by what it is for, so that page and window can give it in light and dark; or, with {@link Rgb}, one that is
 * the same in both, as a ramp's.
 */
public sealed interface Ink permits Ink.Token, Ink.Rgb {

    /** What a colour is for. */
    enum Token implements Ink {
        /** Behind everything. */
        PAPER,
        /** Text, axes, outlines. */
        TEXT,
        /** Lesser text and ticks. */
        MUTED,
        /** Lines that only guide the eye. */
        GUIDE,
        /** What adds water. */
        GAIN,
        /** What takes water. */
        LOSS,
        /** What storage gives or takes. */
        STORAGE,
        /** What is not explained. */
        RESIDUAL,
        /** A prism's outline and body. */
        PRISM,
        /** The water table and other water levels. */
        WATER,
        /** What is selected or pointed at. */
        ACCENT,
        /** A plume's outline, and the track of its centre. */
        PLUME
    }

    /**
     * A fixed colour.
     *
     * @param value red, green and blue, eight bits each, red highest
     */
    record Rgb(int value) implements Ink {

        /** Refuses more than 24 bits. */
        public Rgb {
            if ((value & 0xff000000) != 0) {
                throw new IllegalArgumentException("more than 24 bits: " + value);
            }
        }

        /** {@return as {@code #rrggbb}} */
        @Override
        public String toString() {
            return String.format(Locale.ROOT, "#%06x", value);
        }
    }
}
