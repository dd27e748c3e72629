package org.seepledger.picture;

import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;

/**
 * What a picture is made of. Places are in logical pixels from the picture's upper left corner, x to the right and y down;
 * later marks cover earlier ones.
 */
public sealed interface Mark permits Mark.Line, Mark.Area, Mark.Text, Mark.Image, Mark.Group {

    /**
     * {@return the same with its letters written otherwise, where it has any}
     *
     * @param form turns words into what is written
     */
    default Mark written(UnaryOperator<String> form) {
        return this;
    }

    /**
     * How a line is drawn.
     *
     * @param ink its colour
     * @param width in logical pixels
     * @param dash lengths of dashes and gaps in turn, in logical pixels; empty for a solid line
     */
    record Stroke(Ink ink, double width, List<Double> dash) {

        /** Copies the list. */
        public Stroke {
            dash = List.copyOf(dash);
        }

        /**
         * {@return a solid line}
         *
         * @param ink its colour
         * @param width in logical pixels
         */
        public static Stroke of(Ink ink, double width) {
            return new Stroke(ink, width, List.of());
        }

        /**
         * {@return the same, dashed}
         *
         * @param lengths of dashes and gaps in turn
         */
        public Stroke dashed(Double... lengths) {
            return new Stroke(ink, width, List.of(lengths));
        }
    }

    /** What tells one filling from another without colour. */
    enum Texture {
        /** All over. */
        PLAIN,
        /** Lines that rise to the right. */
        RISING,
        /** Lines that fall to the right. */
        FALLING,
        /** Dots. */
        DOTS,
        /** Lines both ways. */
        CROSSED
    }

    /**
     * How an area is filled.
     *
     * @param ink its colour
     * @param opacity from 0 to 1
     * @param texture drawn in the ink over a faint ground of it, or plain
     */
    record Fill(Ink ink, double opacity, Texture texture) {

        /**
         * {@return a plain, opaque filling}
         *
         * @param ink its colour
         */
        public static Fill of(Ink ink) {
            return new Fill(ink, 1, Texture.PLAIN);
        }
    }

    /**
     * A line through places.
     *
     * @param xy x and y in turn
     * @param stroke how it is drawn
     */
    record Line(double[] xy, Stroke stroke) implements Mark {}

    /**
     * Rings, filled by the even-odd rule.
     *
     * @param rings x and y in turn, each closed without repeating its first place
     * @param fill how it is filled; empty for an outline alone
     * @param stroke its outline; empty for none
     */
    record Area(List<double[]> rings, Optional<Fill> fill, Optional<Stroke> stroke) implements Mark {

        /** Copies the list. */
        public Area {
            rings = List.copyOf(rings);
        }

        /**
         * {@return a rectangle without outline}
         *
         * @param box where it is
         * @param fill how it is filled
         */
        public static Area of(Box box, Fill fill) {
            return new Area(List.of(box.ring()), Optional.of(fill), Optional.empty());
        }

        /**
         * {@return the outline of a rectangle}
         *
         * @param box where it is
         * @param stroke how it is drawn
         */
        public static Area of(Box box, Stroke stroke) {
            return new Area(List.of(box.ring()), Optional.empty(), Optional.of(stroke));
        }
    }

    /** Which part of a text stands at its place. */
    enum Anchor {
        /** Its beginning. */
        START,
        /** Its middle. */
        MIDDLE,
        /** Its end. */
        END
    }

    /**
     * A line of text.
     *
     * @param x where its anchor is
     * @param y its base line
     * @param words what it says
     * @param size of the letters, in logical pixels
     * @param anchor which part of it stands at x
     * @param ink its colour
     * @param bold whether it is bold
     * @param halo whether it has a rim of the paper's colour, to be read over whatever lies below
     * @param angle by how many degrees it is turned about its place, clockwise
     */
    record Text(
            double x,
            double y,
            String words,
            double size,
            Anchor anchor,
            Ink ink,
            boolean bold,
            boolean halo,
            double angle)
            implements Mark {

        @Override
        public Text written(UnaryOperator<String> form) {
            return new Text(x, y, form.apply(words), size, anchor, ink, bold, halo, angle);
        }

        /**
         * {@return a level text of the usual colour}
         *
         * @param x where its anchor is
         * @param y its base line
         * @param words what it says
         * @param size of the letters
         * @param anchor which part of it stands at x
         */
        public static Text of(double x, double y, String words, double size, Anchor anchor) {
            return new Text(x, y, words, size, anchor, Ink.Token.TEXT, false, false, 0);
        }

        /**
         * {@return the same in another colour}
         *
         * @param other the colour
         */
        public Text in(Ink other) {
            return new Text(x, y, words, size, anchor, other, bold, halo, angle);
        }

        /** {@return the same, bold} */
        public Text strong() {
            return new Text(x, y, words, size, anchor, ink, true, halo, angle);
        }

        /** {@return the same with a rim} */
        public Text haloed() {
            return new Text(x, y, words, size, anchor, ink, bold, true, angle);
        }

        /**
         * {@return the same, turned about its place}
         *
         * @param degrees clockwise
         */
        public Text turned(double degrees) {
            return new Text(x, y, words, size, anchor, ink, bold, halo, degrees);
        }
    }

    /**
     * Pixels, stretched over a parallelogram without smoothing.
     *
     * @param columns how many pixels a row has
     * @param rows how many rows there are
     * @param argb alpha, red, green, blue, eight bits each; row-major, the uppermost row first
     * @param placement six numbers a, b, c, d, e, f: the pixel edge (column, row) comes to (a·column + c·row + e,
     *     b·column + d·row + f)
     */
    record Image(int columns, int rows, int[] argb, double[] placement) implements Mark {

        /** Checks that there are as many pixels as there should be. */
        public Image {
            if (argb.length != columns * rows || placement.length != 6) {
                throw new IllegalArgumentException("the pixels or the placement do not fit");
            }
        }
    }

    /**
     * Marks of which nothing shows outside a rectangle.
     *
     * @param clip the rectangle
     * @param marks the marks
     */
    record Group(Box clip, List<Mark> marks) implements Mark {

        @Override
        public Group written(UnaryOperator<String> form) {
            return new Group(
                    clip, marks.stream().map(mark -> mark.written(form)).toList());
        }

        /** Copies the list. */
        public Group {
            marks = List.copyOf(marks);
        }
    }
}
