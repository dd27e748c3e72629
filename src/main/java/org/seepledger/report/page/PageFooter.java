package org.seepledger.report.page;

import java.util.Locale;
import java.util.stream.Collectors;

/** The foot of each printed page, which only a style sheet can give (W3C CSS Paged Media, margin boxes). */
final class PageFooter {

    private PageFooter() {}

    static String css(String title) {
        return "@page{@bottom-left{content:\"" + escaped(title) + "\"}"
                + "@bottom-right{content:counter(page) \" / \" counter(pages)}}\n";
    }

    /** A text as a CSS string that can end neither the string nor the style element. */
    private static String escaped(String text) {
        return text.codePoints()
                .mapToObj(letter -> Character.isLetterOrDigit(letter) || letter == ' '
                        ? Character.toString(letter)
                        : String.format(Locale.ROOT, "\\%x ", letter))
                .collect(Collectors.joining());
    }
}
