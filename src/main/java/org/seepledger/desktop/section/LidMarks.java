package org.seepledger.desktop.section;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.words.Words;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Lettering;
import org.seepledger.picture.Mark;
import org.seepledger.picture.Section;
import org.seepledger.picture.SectionFrame;
import org.seepledger.sketch.Lid;

/** The handles of the selected prism's lids, and beside one that moves where it is and whether a layer holds it. */
final class LidMarks {

    private static final double RADIUS = 5.5;
    private static final double GLYPH = 11;
    private static final double SIZE = 12;

    private LidMarks() {}

    static List<Mark> of(Section section, SectionFrame frame, LidHand hand) {
        List<Mark> marks = new ArrayList<>();
        section.body().flatMap(body -> body.spot(frame, LidHand.HANDLE)).ifPresent(spot -> {
            for (Lid lid : Lid.values()) {
                double x = frame.x(spot.along());
                double y =
                        frame.y(lid == Lid.TOP ? spot.slab().top() : spot.slab().bottom());
                boolean apart =
                        frame.y(spot.slab().bottom()) - frame.y(spot.slab().top()) > 2 * RADIUS;
                double shown = apart ? y : y + (lid == Lid.TOP ? -RADIUS : RADIUS);
                if (y >= frame.box().y() && y <= frame.box().bottom()) {
                    handle(x, shown, hand.chosen().equals(Optional.of(lid)), marks);
                }
                if (hand.moving().equals(Optional.of(lid))) {
                    moving(section, lid, hand, x, y, frame.box().x(), marks);
                }
            }
        });
        return marks;
    }

    /** A round grip with a head up and one down, since that is how it moves. */
    private static void handle(double x, double y, boolean chosen, List<Mark> marks) {
        double radius = chosen ? RADIUS + 1.5 : RADIUS;
        Ink fill = chosen ? Ink.Token.ACCENT : Ink.Token.PAPER;
        Ink line = chosen ? Ink.Token.PAPER : Ink.Token.PRISM;
        marks.add(area(round(x, y, radius), fill, Optional.of(Mark.Stroke.of(line, 1.6))));
        for (int way : new int[] {-1, 1}) {
            double[] head = {x - 2.5, y + 1.2 * way, x + 2.5, y + 1.2 * way, x, y + 4 * way};
            marks.add(area(head, line, Optional.empty()));
        }
    }

    private static Mark area(double[] ring, Ink fill, Optional<Mark.Stroke> line) {
        return new Mark.Area(List.of(ring), Optional.of(Mark.Fill.of(fill)), line);
    }

    private static double[] round(double x, double y, double radius) {
        double[] ring = new double[48];
        for (int i = 0; i < 24; i++) {
            ring[2 * i] = x + radius * Math.cos(Math.PI * i / 12);
            ring[2 * i + 1] = y + radius * Math.sin(Math.PI * i / 12);
        }
        return ring;
    }

    /**
     * Where a lid is: its elevation or, between two uprights, the layer that holds it; to the left, where there is room,
     * since the flow stands to the right.
     */
    private static void moving(
            Section section, Lid lid, LidHand hand, double x, double y, double left, List<Mark> marks) {
        String words = hand.text(lid);
        if (hand.isHeld()) {
            for (Mark.Stroke stroke :
                    List.of(Mark.Stroke.of(Ink.Token.PAPER, 5), Mark.Stroke.of(Ink.Token.ACCENT, 2))) {
                for (int way : new int[] {-1, 1}) {
                    double[] upright = {x + way * GLYPH, y - 7, x + way * GLYPH, y + 7};
                    marks.add(new Mark.Line(upright, stroke));
                }
            }
            words = Words.of("section.lid.held." + lid.item(), words);
        } else {
            words = words + " " + section.lengthUnit();
        }
        double below = lid == Lid.TOP ? -10 : 20;
        double room = Lettering.width(words, SIZE) + GLYPH + 8;
        boolean leftward = x - room > left;
        Mark.Text text = leftward
                ? Mark.Text.of(x - GLYPH - 8, y + below, words, SIZE, Mark.Anchor.END)
                : Mark.Text.of(x + GLYPH + 8, y + below, words, SIZE, Mark.Anchor.START);
        marks.add(text.strong().haloed().in(Ink.Token.ACCENT));
    }
}
