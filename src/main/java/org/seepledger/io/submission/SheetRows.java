package org.seepledger.io.submission;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;
import org.seepledger.fault.DataFault;

/** The rows of one sheet (ISO/IEC 29500-1, 18.3.1): cells as text, dates as ISO 8601 has them. */
final class SheetRows {

    private static final Pattern REFERENCE = Pattern.compile("([A-Z]{1,3})([0-9]{1,7})");
    private static final LocalDate DAY_ZERO = LocalDate.of(1899, 12, 30);
    private static final LocalDate DAY_ZERO_1904 = LocalDate.of(1904, 1, 1);
    private static final double LAST_DAY = 2_958_465;

    private final String shownFile;
    private final String sheet;
    private final List<String> strings;
    private final CellFormats formats;
    private final LocalDate dayZero;
    private final int mostCells;
    private final List<List<String>> rows = new ArrayList<>();
    private int cells;

    SheetRows(
            String shownFile,
            String sheet,
            List<String> strings,
            CellFormats formats,
            boolean from1904,
            int mostCells) {
        this.shownFile = shownFile;
        this.sheet = sheet;
        this.strings = strings;
        this.formats = formats;
        this.dayZero = from1904 ? DAY_ZERO_1904 : DAY_ZERO;
        this.mostCells = mostCells;
    }

    List<List<String>> rows() {
        return rows;
    }

    int cells() {
        return cells;
    }

    void read(XMLStreamReader xml) throws XMLStreamException {
        int row = -1;
        int column = -1;
        while (xml.hasNext()) {
            if (xml.next() != XMLStreamReader.START_ELEMENT) {
                continue;
            }
            if (xml.getLocalName().equals("row")) {
                row = row(xml.getAttributeValue(null, "r"), row + 1);
                column = -1;
            } else if (xml.getLocalName().equals("c")) {
                Matcher place = REFERENCE.matcher(String.valueOf(xml.getAttributeValue(null, "r")));
                column = place.matches() ? column(place.group(1)) : column + 1;
                put(row, column, cell(xml));
            }
        }
    }

    private int row(String named, int next) {
        int row = named != null && named.matches("[0-9]{1,7}") ? Integer.parseInt(named) - 1 : next;
        if (row >= SubmissionFile.MOST_ROWS) {
            throw tooMuch("row " + (row + 1), SubmissionFile.MOST_ROWS + " rows");
        }
        if (row < next) {
            throw new DataFault(
                    shownFile,
                    "sheet \"" + sheet + "\"",
                    "rows that are not in order",
                    "rows from the top down",
                    "Open and save it anew.");
        }
        return row;
    }

    private static int column(String letters) {
        int column = 0;
        for (int i = 0; i < letters.length(); i++) {
            column = column * 26 + letters.charAt(i) - 'A' + 1;
        }
        return column - 1;
    }

    private void put(int row, int column, String text) {
        if (row < 0 || text.isEmpty()) {
            return;
        }
        cells++;
        if (column >= SubmissionFile.MOST_COLUMNS) {
            throw tooMuch("column " + (column + 1), SubmissionFile.MOST_COLUMNS + " columns");
        }
        if (cells > mostCells) {
            throw tooMuch("more cells", SubmissionFile.MOST_CELLS + " cells in the workbook");
        }
        while (rows.size() <= row) {
            rows.add(new ArrayList<>());
        }
        List<String> line = rows.get(row);
        while (line.size() <= column) {
            line.add("");
        }
        line.set(column, text);
    }

    private DataFault tooMuch(String found, String most) {
        return SubmissionFile.tooMuch(shownFile, "sheet \"" + sheet + "\"", found, most);
    }

    /** What stands in the cell whose start the reader is at. */
    private String cell(XMLStreamReader xml) throws XMLStreamException {
        String type = String.valueOf(xml.getAttributeValue(null, "t"));
        String style = xml.getAttributeValue(null, "s");
        String value = "";
        while (xml.hasNext()) {
            int event = xml.next();
            if (event == XMLStreamReader.END_ELEMENT && xml.getLocalName().equals("c")) {
                break;
            }
            if (event == XMLStreamReader.START_ELEMENT && xml.getLocalName().equals("v")) {
                value = RichText.read(xml, "v", shownFile);
            } else if (event == XMLStreamReader.START_ELEMENT
                    && xml.getLocalName().equals("is")) {
                value = RichText.read(xml, "is", shownFile);
            }
        }
        return switch (type) {
            case "s" -> shared(value);
            case "str", "inlineStr", "b", "e", "d" -> value;
            default -> number(value, style);
        };
    }

    private String shared(String index) {
        int number = index.matches("[0-9]{1,7}") ? Integer.parseInt(index) : -1;
        return number >= 0 && number < strings.size() ? strings.get(number) : "";
    }

    private String number(String value, String style) {
        if (value.isEmpty()) {
            return "";
        }
        double number;
        try {
            number = Double.parseDouble(value);
        } catch (NumberFormatException e) {
            return value;
        }
        if (formats.isDate(style) && number >= 0 && number <= LAST_DAY) {
            return dayZero.plusDays((long) number).toString();
        }
        if (formats.isPercent(style) && Double.isFinite(number)) {
            return BigDecimal.valueOf(number)
                            .movePointRight(2)
                            .stripTrailingZeros()
                            .toPlainString() + "%";
        }
        return value;
    }
}
