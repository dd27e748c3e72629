package org.seepledger.prism;

import java.util.ArrayList;
import java.util.List;

/** Prisms for tests, from plain coordinates. */
public final class Prisms {

    private Prisms() {}

    /** A prism of one ring, counter-clockwise. */
    public static Prism of(String name, int first, int last, double... coordinates) {
        return new Prism(name, List.of(ring(1, 0, coordinates)), new VerticalRange.Layers(first, last));
    }

    /** A prism of several rings: outer ones counter-clockwise, islands clockwise. */
    public static Prism of(String name, int first, int last, List<Ring> rings) {
        return new Prism(name, rings, new VerticalRange.Layers(first, last));
    }

    public static Ring ring(int part, int island, double... coordinates) {
        String prefix = (part > 1 ? "part " + part + " " : "") + (island > 0 ? "island " + island + " " : "");
        List<Side> sides = new ArrayList<>();
        for (int i = 0; i < coordinates.length; i += 2) {
            String side = prefix + "side " + (i / 2 + 1);
            sides.add(new Side(side, side, coordinates[i], coordinates[i + 1]));
        }
        return new Ring(part, island, sides);
    }
}
