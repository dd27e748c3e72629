package org.seepledger.job;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import org.seepledger.review.mapping.Days;

/** A budget that an invented author writes down: terms by area and period, in one of many layouts. */
final class SubmittedTable {

    /** How flow both ways is written. */
    enum Style {
        SIGNED,
        COLUMNS,
        SECTIONS
    }

    /** One term of one area: what comes in and goes out in each period, in the table's unit. */
    static final class Row {

        final String label;
        final boolean storage;
        final boolean lateral;
        final double[] in;
        final double[] out;

        Row(String label, boolean storage, boolean lateral, double[] in, double[] out) {
            this.label = label;
            this.storage = storage;
            this.lateral = lateral;
            this.in = in;
            this.out = out;
        }

        double net(int period) {
            return in[period] - out[period];
        }

        Row copy() {
            return new Row(label, storage, lateral, in.clone(), out.clone());
        }
    }

    /** The terms of an area. */
    static final class Area {

        final String name;
        final List<Row> rows = new ArrayList<>();
        double[] totalIn;
        double[] totalOut;
        double[] change;
        double[] residual;

        Area(String name) {
            this.name = name;
        }

        void addUp(int periods) {
            totalIn = new double[periods];
            totalOut = new double[periods];
            change = new double[periods];
            residual = new double[periods];
            for (int p = 0; p < periods; p++) {
                for (Row row : rows) {
                    if (row.storage) {
                        change[p] -= row.net(p);
                    } else {
                        totalIn[p] += row.in[p];
                        totalOut[p] += row.out[p];
                    }
                }
                residual[p] = totalIn[p] - totalOut[p] - change[p];
            }
        }

        double throughput(int period) {
            double gains = 0;
            double losses = 0;
            for (Row row : rows) {
                gains += row.in[period];
                losses += row.out[period];
            }
            return Math.max(gains, losses);
        }
    }

    final List<Area> areas = new ArrayList<>();
    final List<String> periods = new ArrayList<>();
    final List<Days> days = new ArrayList<>();
    String unit;
    Style style;
    boolean totals;
    boolean storageAsChange;
    int decimals;
    int digits;

    private final Random random;
    private final String separator;
    private final boolean comma;
    private final boolean thousands;
    private final boolean brackets;
    private final StringBuilder text = new StringBuilder();

    SubmittedTable(Random random) {
        this.random = random;
        this.separator = List.of(",", ";", "\t").get(random.nextInt(3));
        this.comma = separator.equals(";") && random.nextBoolean();
        this.thousands = random.nextInt(3) == 0;
        this.brackets = random.nextInt(4) == 0;
    }

    void addUp() {
        areas.forEach(area -> area.addUp(periods.size()));
    }

    private void line(List<String> cells) {
        text.append(String.join(separator, cells.stream().map(this::quoted).toList()))
                .append(random.nextBoolean() ? "\n" : "\r\n");
    }

    private void line(String... cells) {
        line(List.of(cells));
    }

    private String quoted(String cell) {
        return cell.contains(separator) || cell.contains("\"") ? '"' + cell.replace("\"", "\"\"") + '"' : cell;
    }

    String number(double value) {
        if (value == 0 && random.nextInt(3) == 0) {
            return "0";
        }
        double rounded = value;
        if (digits > 0 && value != 0) {
            rounded = new java.math.BigDecimal(value)
                    .round(new java.math.MathContext(digits))
                    .doubleValue();
        }
        int shown = digits > 0
                ? Math.max(0, digits - 1 - (int) Math.floor(Math.log10(Math.max(1e-9, Math.abs(value)))))
                : decimals;
        String plain =
                String.format(Locale.ROOT, thousands ? "%,." + shown + "f" : "%." + shown + "f", Math.abs(rounded));
        if (comma) {
            plain = plain.replace(',', ' ').replace('.', ',');
        }
        boolean negative = rounded < 0 && !plain.matches("[0.,]*");
        return negative ? brackets ? "(" + plain + ")" : "-" + plain : plain;
    }

    /** Writes the table in a layout by chance. */
    String write() {
        if (random.nextBoolean()) {
            line("Groundwater budget, draft " + random.nextInt(9));
            line("");
        }
        switch (style) {
            case SIGNED -> {
                int layout = random.nextInt(3);
                if (layout == 0) {
                    tidy();
                } else if (layout == 1) {
                    termsDown();
                } else {
                    termsAcross();
                }
            }
            case COLUMNS -> columns();
            default -> sections();
        }
        if (random.nextBoolean()) {
            line("");
            line("Figures are means of the authors' own computation.");
        }
        return text.toString();
    }

    private void tidy() {
        List<String> head = new ArrayList<>(List.of("Area", "Period", "Component", "Net flow", "Unit"));
        line(head);
        for (Area area : areas) {
            for (int p = 0; p < periods.size(); p++) {
                for (Row row : signed(area)) {
                    line(area.name, periods.get(p), row.label, number(row.net(p)), unit);
                }
            }
        }
    }

    /** The rows with storage as a change, and with totals. */
    private List<Row> signed(Area area) {
        List<Row> rows = new ArrayList<>();
        double[] none = new double[periods.size()];
        area.rows.stream().filter(row -> !row.storage || !storageAsChange).forEach(rows::add);
        if (storageAsChange) {
            rows.add(new Row("Change in storage", true, false, area.change, none));
        }
        if (totals) {
            rows.add(new Row("Total inflow", false, false, area.totalIn, none));
            rows.add(new Row("Total outflow", false, false, area.totalOut, none));
            rows.add(new Row("Residual", false, false, area.residual, none));
        }
        return rows;
    }

    private void termsDown() {
        for (Area area : areas) {
            line(area.name);
            List<String> head = new ArrayList<>(List.of("Term (" + unit + ")"));
            head.addAll(periods);
            line(head);
            for (Row row : signed(area)) {
                List<String> cells = new ArrayList<>(List.of(row.label));
                for (int p = 0; p < periods.size(); p++) {
                    cells.add(number(row.net(p)));
                }
                line(cells);
            }
            line("");
        }
    }

    private void termsAcross() {
        List<String> head = new ArrayList<>(List.of("Zone", "Period"));
        List<Row> first = new ArrayList<>();
        for (Area area : areas) {
            signed(area).stream()
                    .filter(row -> first.stream().noneMatch(other -> other.label.equals(row.label)))
                    .forEach(first::add);
        }
        first.forEach(row -> head.add(row.label + " [" + unit + "]"));
        line(head);
        for (Area area : areas) {
            for (int p = 0; p < periods.size(); p++) {
                List<String> cells = new ArrayList<>(
                        List.of(p == 0 ? area.name : random.nextBoolean() ? area.name : "", periods.get(p)));
                if (!cells.get(0).isEmpty() || p > 0) {
                    for (Row like : first) {
                        int period = p;
                        cells.add(signed(area).stream()
                                .filter(row -> row.label.equals(like.label))
                                .findFirst()
                                .map(row -> number(row.net(period)))
                                .orElse("-"));
                    }
                }
                line(cells);
            }
        }
    }

    private void columns() {
        boolean net = random.nextBoolean();
        List<String> head =
                new ArrayList<>(List.of("Prism", "Period", "Item", "Inflow (" + unit + ")", "Outflow (" + unit + ")"));
        if (net) {
            head.add("Net (" + unit + ")");
        }
        line(head);
        for (Area area : areas) {
            for (int p = 0; p < periods.size(); p++) {
                for (Row row : area.rows) {
                    List<String> cells = new ArrayList<>(
                            List.of(area.name, periods.get(p), row.label, number(row.in[p]), number(row.out[p])));
                    if (net) {
                        cells.add(number(row.net(p)));
                    }
                    line(cells);
                }
            }
        }
    }

    private void sections() {
        for (Area area : areas) {
            line("Budget of " + area.name + ", all figures in " + unit);
            List<String> head = new ArrayList<>(List.of("Component"));
            head.addAll(periods);
            line(head);
            line("Inflows");
            section(area, 1);
            if (totals) {
                values("Total inflow", area.totalIn);
            }
            line("");
            line("Outflows");
            section(area, -1);
            if (totals) {
                values("Total outflow", area.totalOut);
            }
            line("");
            line("Balance");
            values("Change in storage", area.change);
            if (totals) {
                values("Residual", area.residual);
            }
            line("");
        }
    }

    private void section(Area area, int sign) {
        for (Row row : area.rows) {
            double[] values = sign > 0 ? row.in : row.out;
            boolean any = false;
            for (double value : values) {
                any |= value != 0;
            }
            if (!row.storage && any) {
                values(row.label, values);
            }
        }
    }

    private void values(String label, double[] values) {
        List<String> cells = new ArrayList<>(List.of(label));
        for (double value : values) {
            cells.add(number(value));
        }
        line(cells);
    }
}
