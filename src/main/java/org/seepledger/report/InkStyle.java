package org.seepledger.report;

import java.util.Locale;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Palette;

/** The style sheet of inks: each has a variable, which a dark page sets anew, and classes for filling and outline. */
public final class InkStyle {

    private InkStyle() {}

    /** {@return the style sheet that a page with pictures needs} */
    public static String css() {
        StringBuilder css = new StringBuilder();
        css.append(":root{color-scheme:light dark;")
                .append(variables(Palette.LIGHT))
                .append("}\n");
        css.append("@media screen and (prefers-color-scheme:dark){:root{")
                .append(variables(Palette.DARK))
                .append("}}\n");
        for (Ink.Token token : Ink.Token.values()) {
            css.append(String.format(
                    Locale.ROOT, ".%s{fill:%s}.%s{stroke:%2$s}\n", fill(token), variable(token), stroke(token)));
        }
        return css.append(".halo{stroke:var(--paper);stroke-width:3px;stroke-linejoin:round;paint-order:stroke}\n")
                .append(".picture{font-family:system-ui,\"Segoe UI\",\"Noto Sans\",\"DejaVu Sans\",sans-serif;")
                .append("font-variant-numeric:tabular-nums}\n")
                .toString();
    }

    private static String variables(Palette palette) {
        StringBuilder variables = new StringBuilder();
        for (Ink.Token token : Ink.Token.values()) {
            variables
                    .append("--")
                    .append(name(token))
                    .append(':')
                    .append(palette.colour(token))
                    .append(';');
        }
        return variables.toString();
    }

    static String variable(Ink.Token token) {
        return "var(--" + name(token) + ")";
    }

    static String fill(Ink.Token token) {
        return "f-" + name(token);
    }

    static String stroke(Ink.Token token) {
        return "s-" + name(token);
    }

    static String name(Ink.Token token) {
        return token.name().toLowerCase(Locale.ROOT);
    }
}
