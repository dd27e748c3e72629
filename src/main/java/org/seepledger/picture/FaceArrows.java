package org.seepledger.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;

/**
 * The net flow through each lateral face as an arrow across its longest side: inward for a gain, outward for a loss, its
 * width in proportion to the flow. Faces that carry less than a hundredth of the largest get a dot.
 */
final class FaceArrows {

    private static final double LENGTH = 38;
    private static final double WIDEST = 15;
    private static final double LEAST_SHARE = 0.01;
    private static final double SMALL = 10.5;

    private final Map<String, Face> faces = new LinkedHashMap<>();

    /** A face of one or more sides, and where its arrow stands. */
    private static final class Face {

        private final String item;
        private double net = Double.NaN;
        private double length;
        private double x;
        private double y;
        private double outwardX;
        private double outwardY;

        Face(String item) {
            this.item = item;
        }

        void reach(Side from, Side to) {
            double across = to.x() - from.x();
            double up = to.y() - from.y();
            double side = Math.hypot(across, up);
            if (side > length) {
                length = side;
                x = (from.x() + to.x()) / 2;
                y = (from.y() + to.y()) / 2;
                outwardX = up / side;
                outwardY = -across / side;
            }
        }

        void add(double flow) {
            net = Double.isNaN(net) ? flow : net + flow;
        }

        NetFlow flow() {
            return new NetFlow(net);
        }

        double size() {
            return flow().size();
        }
    }

    /**
     * Gathers the flows.
     *
     * @param prism the prism
     * @param budget its budget
     * @param unit the unit to show
     */
    FaceArrows(Prism prism, PeriodBudget budget, UnitShown unit) {
        for (Ring ring : prism.rings()) {
            for (int i = 0; i < ring.sides().size(); i++) {
                Side side = ring.sides().get(i);
                faces.computeIfAbsent(side.item(), Face::new).reach(side, ring.after(i));
            }
        }
        for (Entry entry : budget.entries()) {
            Face face = faces.get(entry.account().item());
            if (entry.account().group() == Group.SIDE
                    && face != null
                    && entry.account().quantified()) {
                face.add(unit.of(entry.net(), budget.period()));
            }
        }
    }

    /** Draws the arrows, and as many labels as there is room for, the largest flows first. */
    void draw(MapSheet sheet) {
        double largest = faces.values().stream().mapToDouble(Face::size).max().orElse(0);
        List<Face> sorted = new ArrayList<>(faces.values());
        sorted.sort(Comparator.comparingDouble(Face::size).reversed());
        for (Face face : sorted) {
            arrow(sheet, face, largest);
        }
        for (Face face : sorted) {
            label(sheet, face, largest);
        }
    }

    private static boolean isSmall(Face face, double largest) {
        return !(face.size() >= LEAST_SHARE * largest) || largest == 0;
    }

    private static void arrow(MapSheet sheet, Face face, double largest) {
        double x = sheet.frame().x(face.x);
        double y = sheet.frame().y(face.y);
        if (isSmall(face, largest)) {
            sheet.above(new Mark.Area(
                    List.of(MapSheet.round(x, y, 2)),
                    Optional.of(Fill.of(Ink.Token.PRISM)),
                    Optional.of(Stroke.of(Ink.Token.PAPER, 1))));
            sheet.labels().keepFree(new Box(x - 2, y - 2, 4, 4));
            return;
        }
        double width = Math.max(1.2, WIDEST * face.size() / largest);
        double outX = face.outwardX * LENGTH / 2;
        double outY = -face.outwardY * LENGTH / 2;
        sheet.above(face.flow().arrow(x, y, outX, outY, width));
        double half = Math.max(Math.abs(outX), Math.abs(outY));
        double room = 0.6 * half + width / 2;
        sheet.labels().keepFree(new Box(x - room, y - room, 2 * room, 2 * room));
    }

    private static void label(MapSheet sheet, Face face, double largest) {
        String words = face.item + ": " + face.flow().words();
        double x = sheet.frame().x(face.x);
        double y = sheet.frame().y(face.y);
        boolean small = isSmall(face, largest);
        Ink ink = small ? Ink.Token.MUTED : face.flow().ink();
        List<Mark.Text> choices = new ArrayList<>();
        for (double gap : small ? new double[] {6} : new double[] {LENGTH / 2 + 4, LENGTH / 2 + 16}) {
            double outX = x + face.outwardX * gap;
            double outY = y - face.outwardY * gap;
            choices.add(beside(outX, outY, face.outwardX, words));
            choices.addAll(Labels.around(x, y, gap, words, SMALL));
        }
        List<Mark.Text> styled = choices.stream()
                .map(text -> (small ? text : text.strong()).in(ink).haloed())
                .toList();
        List<Mark> placed = new ArrayList<>();
        sheet.labels().place(styled, placed);
        placed.forEach(sheet::above);
    }

    private static Mark.Text beside(double x, double y, double outwardX, String words) {
        Mark.Anchor anchor =
                outwardX > 0.3 ? Mark.Anchor.START : outwardX < -0.3 ? Mark.Anchor.END : Mark.Anchor.MIDDLE;
        return Mark.Text.of(x, y + 0.35 * SMALL, words, SMALL, anchor);
    }
}
