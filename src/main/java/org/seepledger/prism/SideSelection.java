package org.seepledger.prism;

import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;

/**
 * Sides as a boundary names them: {@code side 1-14}, {@code island 1}, {@code part 2}, {@code part 2 island 1 side 3}.
 *
 * <p>A part without more means its islands too. Outside a shape of parts, no part may be named.
 *
 * @param part the number of the part, if one is named
 * @param island the number of the island, if one is named
 * @param first the first side, if sides are named
 * @param last the last side, the same as the first for one
 */
public record SideSelection(
        Optional<Integer> part, Optional<Integer> island, Optional<Integer> first, Optional<Integer> last) {

    private static final String NUMBER = "([1-9]\\d{0,8})";
    private static final Pattern WRITTEN = Pattern.compile("(?=.)(?:part " + NUMBER + ")?(?: ?\\bisland " + NUMBER
            + ")?(?: ?\\bside " + NUMBER + "(?:-" + NUMBER + ")?)?");

    /**
     * {@return the selection that a text is, or nothing if it is none}
     *
     * @param text the text
     */
    public static Optional<SideSelection> of(String text) {
        Matcher written = WRITTEN.matcher(text);
        if (!written.matches() || text.startsWith(" ")) {
            return Optional.empty();
        }
        Optional<Integer> first = number(written, 3);
        return Optional.of(new SideSelection(
                number(written, 1),
                number(written, 2),
                first,
                number(written, 4).or(() -> first)));
    }

    private static Optional<Integer> number(Matcher written, int group) {
        return Optional.ofNullable(written.group(group)).map(Integer::valueOf);
    }

    /**
     * {@return whether a text is written as the name of one side, there or not}
     *
     * @param text the text
     */
    public static boolean isSideName(String text) {
        return of(text).filter(selection -> selection.first.isPresent() && !text.contains("-"))
                .isPresent();
    }

    /**
     * {@return the rings that it speaks of}
     *
     * @param rings the rings of a shape
     * @param parts whether the shape is made of parts
     */
    public List<Ring> rings(List<Ring> rings, boolean parts) {
        boolean wholePart = part.isPresent() && island.isEmpty() && first.isEmpty();
        Predicate<Ring> inPart =
                ring -> parts ? part.filter(p -> p == ring.part()).isPresent() : part.isEmpty();
        return rings.stream()
                .filter(inPart)
                .filter(ring -> wholePart || ring.island() == island.orElse(0))
                .toList();
    }

    /**
     * {@return the places of the selected sides in a ring, from 0; not all of them need be there}
     *
     * @param ring the ring
     */
    public IntStream sides(Ring ring) {
        int end = last.orElse(ring.sides().size());
        return IntStream.range(first.orElse(1) - 1, end);
    }
}
