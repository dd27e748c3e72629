package org.seepledger.picture;

import java.util.EnumMap;
import java.util.Map;

/** The colours that inks have on light and on dark paper; text has at least 4.5:1 contrast to the paper, areas 3:1. */
public enum Palette {
    /** Dark on light: screens by day, and print. */
    LIGHT(
            0xfffefb, 0x1c242b, 0x59646d, 0xd9dcdb, 0x115e9c, 0xc4602a, 0x77701c, 0x8a2f7a, 0x26343f, 0x2b5fae,
            0x8a134d, 0x00665c),
    /** Light on dark. */
    DARK(
            0x16191c, 0xe9e7e2, 0xa7afb6, 0x3b4248, 0x5aa9f0, 0xf0a468, 0xc6bd62, 0xd68fca, 0xd5dfe7, 0x7fa9ee,
            0xff9acb, 0x4fd3b8);

    private final Map<Ink.Token, Integer> colours = new EnumMap<>(Ink.Token.class);

    Palette(int... rgb) {
        for (Ink.Token token : Ink.Token.values()) {
            colours.put(token, rgb[token.ordinal()]);
        }
    }

    /**
     * {@return the colour of an ink: red, green and blue, eight bits each}
     *
     * @param ink the ink
     */
    public Ink.Rgb colour(Ink ink) {
        return ink instanceof Ink.Rgb fixed ? fixed : new Ink.Rgb(colours.get((Ink.Token) ink));
    }
}
