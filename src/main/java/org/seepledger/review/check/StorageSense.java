package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Kind;
import org.seepledger.review.mapping.Sense;

/** Whether a term that is just called storage is release or uptake: what makes the table close better. */
final class StorageSense {

    private StorageSense() {}

    static List<Figure> settled(List<Figure> figures) {
        double released = 0;
        double takenUp = 0;
        for (Table table : Table.of(figures)) {
            List<Figure> parts = table.parts();
            double flow = parts.stream()
                    .filter(figure -> !figure.tie().storage())
                    .mapToDouble(Figure::net)
                    .sum();
            double storage = parts.stream()
                    .filter(StorageSense::open)
                    .mapToDouble(Figure::value)
                    .sum();
            released += Math.abs(flow + storage);
            takenUp += Math.abs(flow - storage);
        }
        if (takenUp >= 0.5 * released) {
            return figures;
        }
        List<Figure> settled = new ArrayList<>();
        figures.forEach(figure -> settled.add(open(figure) ? figure.counting(Sense.LOSS) : figure));
        return settled;
    }

    private static boolean open(Figure figure) {
        Optional<Sense> said = figure.tie().sense();
        return figure.tie().kind() == Kind.ITEM
                && figure.tie().storage()
                && figure.sense() == Sense.NET
                && said.isEmpty();
    }
}
