package org.seepledger.review.check;

import java.math.BigDecimal;
import java.util.List;
import org.seepledger.review.mapping.Figure;

/**
 * How far a table was rounded: beyond its last printed digit where all its figures are multiples of ten, or have no more
 * than a few significant digits.
 */
final class Rounding {

    private static final int FIGURES_NEEDED = 6;
    private static final int MOST_DIGITS = 7;

    private final double step;
    private final int digits;

    private Rounding(double step, int digits) {
        this.step = step;
        this.digits = digits;
    }

    static Rounding of(List<Figure> figures) {
        List<BigDecimal> printed = figures.stream()
                .filter(figure -> !Double.isNaN(figure.value())
                        && figure.value() != 0
                        && !figure.unit().equals("%"))
                .map(figure -> BigDecimal.valueOf(figure.value()).stripTrailingZeros())
                .toList();
        int digits = printed.stream().mapToInt(BigDecimal::precision).max().orElse(0);
        int scale = printed.stream().mapToInt(BigDecimal::scale).max().orElse(0);
        boolean enough = printed.size() >= FIGURES_NEEDED;
        return new Rounding(
                enough && scale < 0 ? Math.pow(10, -scale) : 0, enough && digits <= MOST_DIGITS ? digits : 0);
    }

    /** How far rounding may have moved a figure. */
    double half(Figure figure) {
        double half = Math.max(figure.half(), step / 2);
        double size = Math.abs(figure.value());
        if (digits == 0 || size == 0 || Double.isNaN(size)) {
            return half;
        }
        return Math.max(half, 0.5 * Math.pow(10, Math.floor(Math.log10(size)) + 1 - digits));
    }
}
