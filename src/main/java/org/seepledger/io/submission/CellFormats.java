package org.seepledger.io.submission;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;

/** Which cell styles of a workbook show a number as a date or a percentage (ISO/IEC 29500-1, 18.8.30 and 18.8.31). */
final class CellFormats {

    static final CellFormats PLAIN = new CellFormats(List.of(), Map.of());

    private static final int FIRST_OF_ITS_OWN = 164;

    private final List<Integer> numberFormats;
    private final Map<Integer, String> codes;

    private CellFormats(List<Integer> numberFormats, Map<Integer, String> codes) {
        this.numberFormats = numberFormats;
        this.codes = codes;
    }

    static CellFormats read(XMLStreamReader xml) throws XMLStreamException {
        List<Integer> formats = new ArrayList<>();
        Map<Integer, String> codes = new HashMap<>();
        boolean inCells = false;
        while (xml.hasNext()) {
            int event = xml.next();
            if (event == XMLStreamReader.START_ELEMENT) {
                String name = xml.getLocalName();
                inCells |= name.equals("cellXfs");
                if (name.equals("xf") && inCells) {
                    formats.add(number(xml.getAttributeValue(null, "numFmtId")));
                } else if (name.equals("numFmt")) {
                    codes.put(
                            number(xml.getAttributeValue(null, "numFmtId")),
                            String.valueOf(xml.getAttributeValue(null, "formatCode")));
                }
            } else if (event == XMLStreamReader.END_ELEMENT
                    && xml.getLocalName().equals("cellXfs")) {
                inCells = false;
            }
        }
        return new CellFormats(formats, codes);
    }

    private static int number(String text) {
        return text != null && text.matches("\\d{1,6}") ? Integer.parseInt(text) : 0;
    }

    private int format(String style) {
        int index = number(style);
        return index < numberFormats.size() ? numberFormats.get(index) : 0;
    }

    boolean isDate(String style) {
        int format = format(style);
        if (format < FIRST_OF_ITS_OWN) {
            return format >= 14 && format <= 22 || format >= 27 && format <= 36 || format >= 50 && format <= 58;
        }
        String code = codes.getOrDefault(format, "")
                .replaceAll("\"[^\"]*\"|\\[[^\\]]*\\]|\\\\.|_.", "")
                .toLowerCase(Locale.ROOT);
        return code.matches(".*(yy|d|mmm).*") && !code.contains("#") && !code.contains("0");
    }

    boolean isPercent(String style) {
        int format = format(style);
        return format == 9 || format == 10 || codes.getOrDefault(format, "").contains("%");
    }
}
