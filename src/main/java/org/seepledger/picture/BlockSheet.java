package org.seepledger.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import org.seepledger.picture.Mark.Anchor;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;

/**
 * Draws blocks in three columns. Where there is room, the pieces' names and numbers stand beside them; on narrow pages keys
 * do, and a list below says what they stand for.
 */
final class BlockSheet {

    private static final double BESIDE_FROM = 600;
    private static final double MARGIN = 6;
    private static final double TOP = 46;
    private static final double NAME = 12;
    private static final double FIGURE = 11.5;
    private static final double LIST_LINE = 17;
    private static final double VISIBLE = 0.8;

    /** A piece as it is drawn: the middle of its right edge. */
    private record Drawn(Block piece, double x, double y) {}

    private final double width;
    private final boolean beside;
    private final double column;
    private final double block;
    private final double top;
    private final double base;
    private final double lowest;
    private final double scale;
    private final List<Mark> guides = new ArrayList<>();
    private final List<Mark> marks = new ArrayList<>();
    private final List<Mark> list = new ArrayList<>();
    private double listEnd;
    private int keys;

    BlockSheet(double width, double lowest, double highest) {
        this.width = width;
        this.beside = width >= BESIDE_FROM;
        this.column = (width - 2 * MARGIN) / 3;
        this.block = beside ? 0.34 * column : column - 34;
        this.top = TOP;
        double high = beside ? 270 : 200;
        this.lowest = lowest;
        this.scale = high / (highest - lowest);
        this.base = top + high;
        this.listEnd = base + 14;
    }

    /** {@return the y of a level} */
    private double y(double level) {
        return base - (level - lowest) * scale;
    }

    private double left(int index) {
        return MARGIN + index * column;
    }

    private void head(int index, String title, String figure) {
        double x = left(index);
        marks.add(Mark.Text.of(x, 16, title, 14, Anchor.START).strong());
        marks.add(Mark.Text.of(x, 34, figure, 13, Anchor.START));
    }

    void column(int index, String title, String figure, List<Block> pieces) {
        head(index, title, figure);
        double x = left(index);
        List<Drawn> drawn = pieces.stream().map(piece -> draw(piece, x, block)).toList();
        outline(x, block, y(0), pieces.isEmpty() ? y(0) : y(pieces.get(0).from()));
        label(index, title, drawn);
    }

    /** Draws what lies between the height of the losses and that of the gains. */
    void bridge(double gains, double losses, List<Block> pieces, boolean open) {
        double x = left(2);
        double storageWidth = open ? block : 0.62 * block;
        guide(left(0) + block, x + block, gains);
        guide(left(1) + block, x + storageWidth, losses);
        List<Drawn> drawn = new ArrayList<>();
        if (open) {
            head(2, "Storage", "–");
            drawn.add(openBlock(pieces.get(0), x));
        } else {
            head(2, capital(pieces.get(0).name()), pieces.get(0).figure());
            drawn.add(framed(pieces.get(0), x, storageWidth));
            drawn.add(framed(pieces.get(1), x + storageWidth + 3, block - storageWidth - 3));
        }
        drawn.sort(Comparator.comparingDouble(Drawn::y));
        label(2, "Storage and residual", drawn);
        marks.add(line(MARGIN, y(0), width - MARGIN, y(0), Stroke.of(Ink.Token.TEXT, 1)));
    }

    private static String capital(String words) {
        return words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }

    private Drawn framed(Block piece, double x, double wide) {
        Drawn drawn = draw(piece, x, wide);
        outline(x, wide, y(piece.from()), y(piece.to()));
        return drawn;
    }

    private void guide(double from, double to, double level) {
        guides.add(line(
                from, y(level), to, y(level), Stroke.of(Ink.Token.MUTED, 0.8).dashed(3.0, 3.0)));
    }

    private static Mark.Line line(double fromX, double fromY, double toX, double toY, Stroke stroke) {
        return new Mark.Line(new double[] {fromX, fromY, toX, toY}, stroke);
    }

    private Drawn draw(Block piece, double x, double wide) {
        double upper = Math.min(y(piece.from()), y(piece.to()));
        double high = Math.abs(y(piece.from()) - y(piece.to()));
        if (high < VISIBLE) {
            double middle = upper + high / 2;
            marks.add(line(x, middle, x + wide, middle, Stroke.of(piece.ink(), 2)));
            return new Drawn(piece, x + wide, middle);
        }
        marks.add(Mark.Area.of(new Box(x, upper, wide, high), new Fill(piece.ink(), 1, piece.texture())));
        if (high > 4) {
            marks.add(line(x, upper, x + wide, upper, Stroke.of(Ink.Token.PAPER, 1.4)));
        }
        return new Drawn(piece, x + wide, upper + high / 2);
    }

    private void outline(double x, double wide, double one, double other) {
        if (Math.abs(one - other) >= VISIBLE) {
            Box box = new Box(x, Math.min(one, other), wide, Math.abs(one - other));
            marks.add(Mark.Area.of(box, Stroke.of(Ink.Token.TEXT, 1)));
        }
    }

    private Drawn openBlock(Block gap, double x) {
        double upper = Math.min(y(gap.from()), y(gap.to()));
        double high = Math.max(2, Math.abs(y(gap.from()) - y(gap.to())));
        marks.add(Mark.Area.of(
                new Box(x, upper, block, high), Stroke.of(gap.ink(), 1.6).dashed(5.0, 4.0)));
        return new Drawn(gap, x + block, upper + high / 2);
    }

    private void label(int index, String title, List<Drawn> drawn) {
        double half = beside ? 14 : 7;
        double[] wanted = drawn.stream().mapToDouble(Drawn::y).toArray();
        double x = left(index) + block;
        double[] places = Spread.out(wanted, 2 * half, top + half - 4, base - half);
        if (!beside && !drawn.isEmpty()) {
            listTitle(title);
        }
        for (int i = 0; i < places.length; i++) {
            Drawn one = drawn.get(i);
            double from = one.x() < x - 1 ? dot(one) : one.x() + 1;
            double[] leader = {from, one.y(), x + 5, one.y(), x + 11, places[i], x + 14, places[i]};
            marks.add(new Mark.Line(leader, Stroke.of(Ink.Token.MUTED, 0.8)));
            if (beside) {
                writeBeside(one.piece(), x + 17, places[i], left(index) + column - 4);
            } else {
                writeKey(one.piece(), x + 16, places[i]);
            }
        }
    }

    /** Marks where a leader begins that passes over another piece. */
    private double dot(Drawn one) {
        if (Math.abs(y(one.piece().from()) - y(one.piece().to())) < 8) {
            return one.x() + 1;
        }
        double x = one.x() - 6;
        Box dot = new Box(x - 2, one.y() - 2, 4, 4);
        marks.add(Mark.Area.of(dot, Fill.of(Ink.Token.TEXT)));
        return x;
    }

    private void writeBeside(Block piece, double x, double middle, double right) {
        String name = Lettering.fitted(piece.name(), NAME, right - x);
        marks.add(Mark.Text.of(x, middle - 2, name, NAME, Anchor.START).haloed());
        String both = piece.figure() + " · " + piece.share();
        boolean room = !piece.share().isEmpty() && Lettering.width(both, FIGURE) <= right - x;
        marks.add(Mark.Text.of(x, middle + 11, room ? both : piece.figure(), FIGURE, Anchor.START)
                .haloed()
                .in(Ink.Token.MUTED));
    }

    private void listTitle(String title) {
        listEnd += LIST_LINE + 2;
        list.add(Mark.Text.of(MARGIN, listEnd, title, NAME, Anchor.START).strong());
    }

    private void writeKey(Block piece, double x, double middle) {
        String key = String.valueOf(++keys);
        marks.add(Mark.Text.of(x, middle + 4, key, NAME, Anchor.START).haloed());
        listEnd += LIST_LINE;
        double right = width - MARGIN;
        list.add(Mark.Text.of(MARGIN + 18, listEnd, key, NAME, Anchor.END).in(Ink.Token.MUTED));
        list.add(Mark.Text.of(right, listEnd, piece.share(), NAME, Anchor.END).in(Ink.Token.MUTED));
        list.add(Mark.Text.of(right - 54, listEnd, piece.figure(), NAME, Anchor.END));
        double room = right - 60 - Lettering.width(piece.figure(), NAME) - MARGIN - 26;
        list.add(Mark.Text.of(MARGIN + 26, listEnd, Lettering.fitted(piece.name(), NAME, room), NAME, Anchor.START));
    }

    /** Adds a paragraph below all else. */
    void words(String words) {
        Paragraph paragraph = new Paragraph(words, NAME, width - 2 * MARGIN);
        list.addAll(paragraph.marks(MARGIN, listEnd + 8, Ink.Token.TEXT));
        listEnd += 8 + paragraph.height();
    }

    double height() {
        return Math.ceil(listEnd + 6);
    }

    List<Mark> marks() {
        List<Mark> all = new ArrayList<>(guides);
        all.addAll(marks);
        all.addAll(list);
        return all;
    }
}
