package org.seepledger.desktop.exchange;

import java.util.List;
import org.seepledger.desktop.words.Words;
import org.seepledger.io.table.CsvText;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.unit.Figures;

/** Flows by giver and receiver, in one unit. */
public final class Matrix {

    private final List<String> names;
    private final String unitShown;
    private final String unit;
    private final Double[][] flows;

    private Matrix(List<String> names, String unitShown, String unit) {
        this.names = List.copyOf(names);
        this.unitShown = unitShown;
        this.unit = unit;
        this.flows = new Double[names.size()][names.size()];
    }

    static Matrix of(List<String> names, String unitShown, String unit) {
        return new Matrix(names, unitShown, unit);
    }

    void put(int giver, int receiver, double flow) {
        flows[giver][receiver] = flow;
    }

    /** {@return the givers, who are the receivers too, the outside last} */
    public List<String> names() {
        return names;
    }

    /** {@return the unit as it is to be read} */
    public String unit() {
        return unitShown;
    }

    /**
     * {@return a flow as it is to be read; nothing where the two do not touch}
     *
     * @param giver the place of who gives
     * @param receiver the place of who receives
     */
    public String text(int giver, int receiver) {
        Double flow = flows[giver][receiver];
        return flow == null ? "" : Figures.tabular(flow);
    }

    private String exact(int giver, int receiver) {
        Double flow = flows[giver][receiver];
        return flow == null ? "" : CsvText.number(flow);
    }

    String tabSeparated(String title) {
        StringBuilder text = new StringBuilder(title).append('\n');
        text.append(Words.of("exchange.corner")).append(" [").append(unit).append(']');
        names.forEach(name -> text.append('\t').append(plain(name)));
        for (int giver = 0; giver < names.size(); giver++) {
            text.append('\n').append(plain(names.get(giver)));
            for (int receiver = 0; receiver < names.size(); receiver++) {
                text.append('\t').append(exact(giver, receiver));
            }
        }
        return text.append('\n').append(Disclaimer.text()).append('\n').toString();
    }

    private static String plain(String name) {
        return CsvText.text(name.replaceAll("[\\p{Cntrl}]+", " "));
    }

    String html(String title) {
        StringBuilder text = new StringBuilder("<table><caption>").append(escaped(title));
        text.append("</caption><tr><th>").append(Words.of("exchange.corner"));
        text.append(" [").append(escaped(unit)).append("]</th>");
        names.forEach(name -> text.append("<th>").append(escaped(name)).append("</th>"));
        text.append("</tr>");
        for (int giver = 0; giver < names.size(); giver++) {
            text.append("<tr><th>").append(escaped(names.get(giver))).append("</th>");
            for (int receiver = 0; receiver < names.size(); receiver++) {
                text.append("<td>").append(exact(giver, receiver)).append("</td>");
            }
            text.append("</tr>");
        }
        return text.append("</table><p>")
                .append(escaped(Disclaimer.text()))
                .append("</p>")
                .toString();
    }

    private static String escaped(String text) {
        return text.replace("&", "&amp;")
                .replace("<", "&lt;")
                .replace(">", "&gt;")
                .replace("\"", "&quot;");
    }
}
