package org.seepledger.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.picture.ExchangeDiagram.Flow;
import org.seepledger.picture.Mark.Anchor;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.picture.Mark.Texture;

/** An exchange diagram being drawn. */
final class ExchangeSheet {

    private static final double NAME = 12;
    private static final double FIGURE = 11;
    private static final double WORDS = 14;
    private static final double PAD = 5;
    private static final double TOP = 24;
    private static final double HEAD = 8;
    /** Bold letters are wider than others. */
    private static final double BOLD = 0.9;

    private static final double HAIRLINE = 1.2;
    private static final int CORNER = 16;
    private static final Stroke UNKNOWN = Stroke.of(Ink.Token.TEXT, 1.4).dashed(4.0, 3.0);

    private final double width;
    private final double scale;
    private final double nodeLeft;
    private final double nodeRight;
    private final double corridor;
    private final Map<Flow, Double> leaves = new HashMap<>();
    private final Map<Flow, Double> enters = new HashMap<>();
    private final List<Mark> bands = new ArrayList<>();
    private final List<Mark> marks = new ArrayList<>();

    /**
     * Begins a diagram.
     *
     * @param width in logical pixels
     * @param scale logical pixels for one of the unit shown
     * @param unit the unit as it is written
     * @param flows all flows
     */
    ExchangeSheet(double width, double scale, String unit, List<Flow> flows) {
        this.width = width;
        this.scale = scale;
        double widest = flows.stream()
                .mapToDouble(flow -> Lettering.width(flow.figure(), FIGURE))
                .max()
                .orElse(0);
        this.nodeLeft = Math.max(0.26 * width, widest + Lettering.width("out ", FIGURE) + 6);
        this.nodeRight = nodeLeft + Math.min(180, 0.28 * width);
        this.corridor = Math.max(0.09 * width, widest + 14);
        marks.add(head(4, "outside, " + unit, Anchor.START));
        marks.add(head(width - 4, "between prisms", Anchor.END));
    }

    private static Mark.Text head(double x, String words, Anchor anchor) {
        return Mark.Text.of(x, 13, words, NAME, anchor).in(Ink.Token.MUTED);
    }

    double top() {
        return TOP;
    }

    /** How wide a flow is drawn. */
    private double thickness(Flow flow) {
        return flow.known() ? Math.max(HAIRLINE, flow.amount() * scale) : UNKNOWN.width();
    }

    /**
     * Draws a prism and its flows from and to the outside, and gives those to other prisms their places on its right.
     *
     * @return where it ends
     */
    double node(String name, int row, List<Flow> flows, double y) {
        double left = y + PAD;
        for (boolean gain : new boolean[] {true, false}) {
            for (Flow flow : flows) {
                if (flow.outside() && (gain ? flow.receiver() : flow.giver()) == row) {
                    left = outside(flow, left) + PAD;
                }
            }
        }
        double right = y + PAD;
        for (Flow flow : inOrder(flows, row)) {
            right = attach(flow, row, right) + PAD;
        }
        Paragraph words = new Paragraph(name, NAME, BOLD * (nodeRight - nodeLeft - 14));
        double end = Math.max(Math.max(left, right), y + words.height() + 2 * PAD);
        Box box = new Box(nodeLeft, y, nodeRight - nodeLeft, end - y);
        marks.add(new Mark.Area(
                List.of(box.ring()),
                Optional.of(new Fill(Ink.Token.PRISM, 0.1, Texture.PLAIN)),
                Optional.of(Stroke.of(Ink.Token.PRISM, 1.6))));
        words.marks(nodeLeft + 7, box.middleY() - words.height() / 2, Ink.Token.TEXT).stream()
                .map(Mark.Text::strong)
                .forEach(marks::add);
        return end;
    }

    /**
     * Flows on the right of a prism: those upward first, the nearest uppermost; then those downward, the nearest lowest; of
     * two with the same partner the one given first, so that they do not cross.
     */
    private static List<Flow> inOrder(List<Flow> flows, int row) {
        Comparator<Flow> order = Comparator.comparingInt(flow -> {
            int steps = (flow.giver() == row ? flow.receiver() : flow.giver()) - row;
            return steps < 0 ? -1000 - steps : 1000 - steps;
        });
        Comparator<Flow> givenFirst = Comparator.comparing(flow -> flow.giver() != row);
        return flows.stream()
                .filter(flow -> !flow.outside() && (flow.giver() == row || flow.receiver() == row))
                .sorted(order.thenComparing(givenFirst))
                .toList();
    }

    private double outside(Flow flow, double y) {
        double thick = Math.max(HEAD, thickness(flow));
        double middle = y + WORDS + thick / 2;
        boolean gain = flow.receiver() != Flow.OUTSIDE;
        double far = nodeLeft - 6 - Math.min(90, 0.55 * nodeLeft);
        double near = nodeLeft - 2;
        String words = (gain ? "in " : "out ") + flow.figure();
        marks.add(Mark.Text.of(near, y + FIGURE, words, FIGURE, Anchor.END));
        if (flow.known()) {
            double from = gain ? far : near;
            arrow(from, gain ? near : far, middle, thickness(flow), gain ? Ink.Token.GAIN : Ink.Token.LOSS);
        } else {
            bands.add(new Mark.Line(new double[] {far, middle, near, middle}, UNKNOWN));
        }
        return y + WORDS + thick;
    }

    private void arrow(double from, double to, double y, double thick, Ink.Token ink) {
        double neck = to - Math.signum(to - from) * HEAD;
        double half = thick / 2;
        double wing = Math.max(half, HEAD / 2);
        double[] ring = {
            from, y - half, neck, y - half, neck, y - wing, to, y, neck, y + wing, neck, y + half, from, y + half
        };
        Texture texture = ink == Ink.Token.GAIN ? Texture.RISING : Texture.FALLING;
        bands.add(
                new Mark.Area(List.of(ring), Optional.of(new Fill(ink, 1, texture)), Optional.of(Stroke.of(ink, 0.8))));
    }

    private double attach(Flow flow, int row, double y) {
        boolean gives = flow.giver() == row;
        double thick = Math.max(HEAD, thickness(flow));
        double begin = gives ? y + WORDS : y;
        (gives ? leaves : enters).put(flow, begin + thick / 2);
        if (gives) {
            marks.add(Mark.Text.of(nodeRight + 5, y + FIGURE, flow.figure(), FIGURE, Anchor.START)
                    .haloed());
        }
        return begin + thick;
    }

    /** Draws a flow from one prism to another. */
    void band(Flow flow) {
        double from = leaves.get(flow);
        double to = enters.get(flow);
        int span = Math.abs(flow.giver() - flow.receiver());
        double half = thickness(flow) / 2;
        double x = nodeRight + corridor;
        double room = width - 8 - half - x;
        double middling = Math.min(room * (1 - Math.pow(0.55, span)), 30 + 40 * span);
        double reach = Math.min(room, flow.giver() < flow.receiver() ? middling + half + 5 : middling - half);
        double[] middle = swing(x, from, to, reach);
        if (!flow.known()) {
            double[] whole = new double[middle.length + 4];
            System.arraycopy(middle, 0, whole, 2, middle.length);
            whole[0] = nodeRight;
            whole[1] = from;
            whole[whole.length - 2] = nodeRight;
            whole[whole.length - 1] = to;
            bands.add(new Mark.Line(whole, UNKNOWN));
            return;
        }
        bands.add(new Mark.Area(
                List.of(outline(middle, from, to, half)),
                Optional.of(new Fill(Ink.Token.WATER, half > 2 ? 0.55 : 0.85, Texture.PLAIN)),
                half > 2 ? Optional.of(Stroke.of(Ink.Token.PAPER, 0.8)) : Optional.empty()));
    }

    /** {@return a way out to the right, along and back, its corners round} */
    private static double[] swing(double x, double from, double to, double reach) {
        double down = Math.signum(to - from);
        double radius = Math.min(reach, Math.abs(to - from) / 2);
        double[] xy = new double[4 * (CORNER + 1)];
        for (int i = 0; i <= CORNER; i++) {
            double angle = Math.PI / 2 * i / CORNER;
            double out = x + reach - radius * (1 - Math.sin(angle));
            double along = down * radius * (1 - Math.cos(angle));
            int back = 4 * CORNER + 2 - 2 * i;
            xy[2 * i] = out;
            xy[2 * i + 1] = from + along;
            xy[back] = out;
            xy[back + 1] = to - along;
        }
        return xy;
    }

    /** {@return a band of even width along a line, with a head where it enters a prism} */
    private double[] outline(double[] middle, double from, double to, double half) {
        int count = middle.length / 2;
        double down = Math.signum(to - from);
        double wing = Math.max(half, HEAD / 2);
        List<double[]> outer = new ArrayList<>();
        List<double[]> inner = new ArrayList<>();
        outer.add(new double[] {nodeRight + 1, from - down * half});
        inner.add(new double[] {nodeRight + 1, from + down * half});
        for (int i = 0; i < count; i++) {
            int before = Math.max(0, i - 1);
            int after = Math.min(count - 1, i + 1);
            double dx = middle[2 * after] - middle[2 * before];
            double dy = middle[2 * after + 1] - middle[2 * before + 1];
            double length = Math.hypot(dx, dy);
            boolean end = i == 0 || i == count - 1;
            double normalX = end ? 0 : dy / length * down;
            double normalY = end ? (i == 0 ? -down : down) : -dx / length * down;
            outer.add(new double[] {middle[2 * i] + half * normalX, middle[2 * i + 1] + half * normalY});
            inner.add(new double[] {middle[2 * i] - half * normalX, middle[2 * i + 1] - half * normalY});
        }
        double neck = nodeRight + HEAD + 1;
        outer.add(new double[] {neck, to + down * half});
        outer.add(new double[] {neck, to + down * wing});
        outer.add(new double[] {nodeRight + 1, to});
        outer.add(new double[] {neck, to - down * wing});
        inner.add(new double[] {neck, to - down * half});
        for (int i = inner.size() - 1; i >= 0; i--) {
            outer.add(inner.get(i));
        }
        double[] ring = new double[2 * outer.size()];
        for (int i = 0; i < outer.size(); i++) {
            ring[2 * i] = outer.get(i)[0];
            ring[2 * i + 1] = outer.get(i)[1];
        }
        return ring;
    }

    /** {@return the height of the picture, with a line on how to read it} */
    double finish(double y) {
        Paragraph words = new Paragraph(
                "Widths are to scale, but none is drawn thinner than a hairline. A dashed line with a dash stands for a"
                        + " flow that cannot be given.",
                FIGURE,
                width - 8);
        marks.addAll(words.marks(4, y + 8, Ink.Token.MUTED));
        return Math.ceil(y + 8 + words.height() + 4);
    }

    List<Mark> marks() {
        List<Mark> all = new ArrayList<>(bands);
        all.addAll(marks);
        return all;
    }
}
