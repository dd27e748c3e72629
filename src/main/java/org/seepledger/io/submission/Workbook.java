package org.seepledger.io.submission;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.zip.ZipException;
import java.util.zip.ZipFile;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;
import org.seepledger.fault.DataFault;
import org.seepledger.review.sheet.Sheet;

/**
 * Reads the sheets of a SpreadsheetML workbook (ISO/IEC 29500-1, 18): what stands in their cells, of formulas the last
 * result. Hidden sheets are left out.
 */
final class Workbook {

    private static final int MOST_SHEETS = 200;
    private static final int MOST_PARTS = 10_000;

    private final PackageParts parts;
    private final List<String> strings = new ArrayList<>();
    private final List<SheetPart> sheets = new ArrayList<>();
    private CellFormats formats = CellFormats.PLAIN;
    private boolean from1904;

    private Workbook(PackageParts parts) {
        this.parts = parts;
    }

    /**
     * A sheet's place in the workbook.
     *
     * @param name its name
     * @param relation what names its part
     */
    private record SheetPart(String name, String relation) {}

    static List<Sheet> read(Path file, String shownFile) throws IOException {
        try (ZipFile zip = new ZipFile(file.toFile())) {
            if (zip.size() > MOST_PARTS) {
                throw SubmissionFile.tooMuch(shownFile, "", zip.size() + " parts", MOST_PARTS + " parts");
            }
            return new Workbook(new PackageParts(zip, shownFile)).sheets();
        } catch (ZipException e) {
            throw new DataFault(
                    shownFile, "", "a damaged workbook", "XLSX", "Open and save it anew, or save it as CSV.");
        }
    }

    private List<Sheet> sheets() {
        if (!parts.has("xl/workbook.xml")) {
            throw new DataFault(
                    parts.shownFile(),
                    "",
                    "a packed file that is no XLSX workbook",
                    "a budget as CSV or XLSX",
                    "Save the table as XLSX or CSV.");
        }
        parts.read("xl/workbook.xml", this::readContents);
        Map<String, String> targets = new HashMap<>();
        parts.read("xl/_rels/workbook.xml.rels", xml -> readTargets(xml, targets));
        if (parts.has("xl/sharedStrings.xml")) {
            parts.read("xl/sharedStrings.xml", this::readStrings);
        }
        if (parts.has("xl/styles.xml")) {
            parts.read("xl/styles.xml", xml -> formats = CellFormats.read(xml));
        }
        List<Sheet> read = new ArrayList<>();
        int cells = 0;
        for (SheetPart sheet : sheets) {
            String target = targets.getOrDefault(sheet.relation(), "");
            if (parts.has(target)) {
                SheetRows rows = new SheetRows(
                        parts.shownFile(), sheet.name(), strings, formats, from1904, SubmissionFile.MOST_CELLS - cells);
                parts.read(target, rows::read);
                cells += rows.cells();
                read.add(new Sheet(sheet.name(), false, rows.rows()));
            }
        }
        if (read.isEmpty()) {
            throw new DataFault(
                    parts.shownFile(), "", "no sheet that can be seen", "a sheet with a budget", "Unhide it.");
        }
        return read;
    }

    private void readContents(XMLStreamReader xml) throws XMLStreamException {
        while (xml.hasNext()) {
            if (xml.next() == XMLStreamReader.START_ELEMENT) {
                if (xml.getLocalName().equals("workbookPr")) {
                    String flag = xml.getAttributeValue(null, "date1904");
                    from1904 = "1".equals(flag) || "true".equals(flag);
                } else if (xml.getLocalName().equals("sheet") && xml.getAttributeValue(null, "state") == null) {
                    addSheet(xml);
                }
            }
        }
    }

    private void addSheet(XMLStreamReader xml) {
        if (sheets.size() >= MOST_SHEETS) {
            throw SubmissionFile.tooMuch(parts.shownFile(), "", "more sheets", MOST_SHEETS + " sheets");
        }
        String relation = "";
        for (int i = 0; i < xml.getAttributeCount(); i++) {
            boolean named = xml.getAttributeLocalName(i).equals("id") && xml.getAttributeNamespace(i) != null;
            relation = named ? xml.getAttributeValue(i) : relation;
        }
        sheets.add(new SheetPart(String.valueOf(xml.getAttributeValue(null, "name")), relation));
    }

    /** Only parts of the workbook itself are followed. */
    private void readTargets(XMLStreamReader xml, Map<String, String> targets) throws XMLStreamException {
        while (xml.hasNext()) {
            if (xml.next() == XMLStreamReader.START_ELEMENT
                    && xml.getLocalName().equals("Relationship")) {
                String target = String.valueOf(xml.getAttributeValue(null, "Target"));
                boolean outside = "External".equals(xml.getAttributeValue(null, "TargetMode"));
                if (!outside) {
                    targets.put(
                            xml.getAttributeValue(null, "Id"),
                            target.startsWith("/") ? target.substring(1) : "xl/" + target);
                }
            }
        }
    }

    private void readStrings(XMLStreamReader xml) throws XMLStreamException {
        while (xml.hasNext()) {
            if (xml.next() == XMLStreamReader.START_ELEMENT
                    && xml.getLocalName().equals("si")) {
                if (strings.size() >= SubmissionFile.MOST_CELLS) {
                    throw SubmissionFile.tooMuch(
                            parts.shownFile(), "", "more texts", SubmissionFile.MOST_CELLS + " texts");
                }
                strings.add(RichText.read(xml, "si", parts.shownFile()));
            }
        }
    }
}
