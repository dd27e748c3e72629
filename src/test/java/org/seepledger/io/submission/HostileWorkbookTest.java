package org.seepledger.io.submission;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.fault.DataFault;
import org.seepledger.review.sheet.Sheet;

/** Workbooks, plain ones and ones that somebody made to do harm: each is read, or refused with a sentence. */
@Timeout(30)
class HostileWorkbookTest {

    private static final String MAIN = "xmlns=\"http://schemas.openxmlformats.org/spreadsheetml/2006/main\"";
    private static final String CONTENTS = "<workbook " + MAIN
            + " xmlns:r=\"http://schemas.openxmlformats.org/officeDocument/2006/relationships\"><sheets>"
            + "<sheet name=\"Budget\" sheetId=\"1\" r:id=\"rId1\"/><sheet name=\"Old\" sheetId=\"2\" state=\"hidden\" r:id=\"rId2\"/>"
            + "</sheets></workbook>";
    private static final String RELATIONS =
            "<Relationships xmlns=\"http://schemas.openxmlformats.org/package/2006/relationships\">"
                    + "<Relationship Id=\"rId1\" Target=\"worksheets/sheet1.xml\"/></Relationships>";

    @TempDir
    private Path folder;

    private interface Content {
        void write(OutputStream out) throws IOException;
    }

    private Path workbook(String contents, String relations, String strings, String styles, Content sheet)
            throws IOException {
        Path file = folder.resolve("submitted.xlsx");
        try (ZipOutputStream zip = new ZipOutputStream(Files.newOutputStream(file))) {
            add(zip, "xl/workbook.xml", out -> out.write(contents.getBytes(StandardCharsets.UTF_8)));
            add(zip, "xl/_rels/workbook.xml.rels", out -> out.write(relations.getBytes(StandardCharsets.UTF_8)));
            if (!strings.isEmpty()) {
                add(zip, "xl/sharedStrings.xml", out -> out.write(strings.getBytes(StandardCharsets.UTF_8)));
            }
            if (!styles.isEmpty()) {
                add(zip, "xl/styles.xml", out -> out.write(styles.getBytes(StandardCharsets.UTF_8)));
            }
            add(zip, "xl/worksheets/sheet1.xml", sheet);
        }
        return file;
    }

    private static void add(ZipOutputStream zip, String name, Content content) throws IOException {
        zip.putNextEntry(new ZipEntry(name));
        content.write(zip);
        zip.closeEntry();
    }

    private static Content text(String text) {
        return out -> out.write(text.getBytes(StandardCharsets.UTF_8));
    }

    private static String rows(String rows) {
        return "<worksheet " + MAIN + "><sheetData>" + rows + "</sheetData></worksheet>";
    }

    private static void assertRefused(Path file, String words) {
        assertThatThrownBy(() -> SubmissionFile.read(file, "submitted.xlsx"))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining(words)
                .hasMessageNotContaining("Exception");
    }

    @Test
    void readsTextsNumbersDatesAndPercentagesAsTheyAreMeant() throws IOException {
        String strings = "<sst " + MAIN
                + "><si><t>Item</t></si><si><r><t>Re</t></r><r><t>charge</t></r><rPh><t>x</t></rPh></si></sst>";
        String styles =
                "<styleSheet " + MAIN + "><numFmts><numFmt numFmtId=\"164\" formatCode=\"yyyy\\-mm\"/></numFmts>"
                        + "<cellStyleXfs><xf numFmtId=\"14\"/></cellStyleXfs>"
                        + "<cellXfs><xf numFmtId=\"0\"/><xf numFmtId=\"164\"/><xf numFmtId=\"10\"/></cellXfs></styleSheet>";
        String sheet = rows("<row r=\"2\"><c r=\"A2\" t=\"s\"><v>0</v></c><c r=\"B2\" s=\"1\"><v>44470</v></c></row>"
                + "<row r=\"3\"><c r=\"A3\" t=\"s\"><v>1</v></c><c r=\"B3\"><f>1+1</f><v>12.5</v></c>"
                + "<c r=\"D3\" s=\"2\"><v>0.0033</v></c><c r=\"E3\" t=\"inlineStr\"><is><t>m3/d</t></is></c></row>");
        List<Sheet> sheets =
                SubmissionFile.read(workbook(CONTENTS, RELATIONS, strings, styles, text(sheet)), "submitted.xlsx");
        assertThat(sheets).hasSize(1);
        Sheet read = sheets.get(0);
        assertThat(read.cell(1, 0)).isEqualTo("Item");
        assertThat(read.cell(1, 1)).isEqualTo("2021-10-01");
        assertThat(read.cell(2, 0)).isEqualTo("Recharge");
        assertThat(read.cell(2, 1)).isEqualTo("12.5");
        assertThat(read.cell(2, 3)).isEqualTo("0.33%");
        assertThat(read.cell(2, 4)).isEqualTo("m3/d");
        assertThat(read.place(2, 1)).isEqualTo("sheet \"Budget\", cell B3");
    }

    @Test
    void refusesWhatUnpacksToFarMoreThanItsSize() throws IOException {
        Path file = workbook(CONTENTS, RELATIONS, "", "", out -> {
            out.write(("<worksheet " + MAIN + "><sheetData>").getBytes(StandardCharsets.UTF_8));
            byte[] blanks = " ".repeat(1 << 20).getBytes(StandardCharsets.UTF_8);
            for (int i = 0; i < 300; i++) {
                out.write(blanks);
            }
            out.write("</sheetData></worksheet>".getBytes(StandardCharsets.UTF_8));
        });
        assertThat(Files.size(file)).isLessThan(1 << 20);
        assertRefused(file, "unpacks to far more than its size");
    }

    @Test
    void refusesAMillionRows() throws IOException {
        assertRefused(
                workbook(
                        CONTENTS,
                        RELATIONS,
                        "",
                        "",
                        text(rows("<row r=\"1000000\"><c r=\"A1000000\"><v>1</v></c></row>"))),
                "row 1000000");
    }

    @Test
    void refusesTooManyColumnsAndRowsOutOfOrder() throws IOException {
        assertRefused(
                workbook(CONTENTS, RELATIONS, "", "", text(rows("<row r=\"1\"><c r=\"XFD1\"><v>1</v></c></row>"))),
                "column 16384");
        assertRefused(
                workbook(
                        CONTENTS,
                        RELATIONS,
                        "",
                        "",
                        text(rows("<row r=\"5\"><c r=\"A5\"><v>1</v></c></row><row r=\"2\"/>"))),
                "rows that are not in order");
    }

    @Test
    void refusesEntitiesOfOtherFiles() throws IOException {
        Path secret = folder.resolve("secret.txt");
        Files.writeString(secret, "secret words");
        String sheet = "<!DOCTYPE x [<!ENTITY e SYSTEM \"" + secret.toUri() + "\">]>"
                + rows("<row r=\"1\"><c r=\"A1\" t=\"inlineStr\"><is><t>&e;</t></is></c></row>");
        assertRefused(workbook(CONTENTS, RELATIONS, "", "", text(sheet)), "document type");
    }

    @Test
    void refusesEntitiesThatGrow() throws IOException {
        StringBuilder type = new StringBuilder("<!DOCTYPE x [<!ENTITY a0 \"ha\">");
        for (int i = 1; i < 30; i++) {
            type.append("<!ENTITY a")
                    .append(i)
                    .append(" \"&a")
                    .append(i - 1)
                    .append(";&a")
                    .append(i - 1)
                    .append(";\">");
        }
        String sheet = type + "]>" + rows("<row r=\"1\"><c r=\"A1\" t=\"inlineStr\"><is><t>&a29;</t></is></c></row>");
        assertRefused(workbook(CONTENTS, RELATIONS, "", "", text(sheet)), "document type");
    }

    @Test
    void followsNoPartOutsideTheWorkbook() throws IOException {
        String relations = RELATIONS.replace(
                "Target=\"worksheets/sheet1.xml\"", "Target=\"file:///etc/passwd\" TargetMode=\"External\"");
        assertRefused(workbook(CONTENTS, relations, "", "", text(rows(""))), "no sheet that can be seen");
    }

    @Test
    void refusesDamagedAndForeignFiles() throws IOException {
        Path whole = workbook(CONTENTS, RELATIONS, "", "", text(rows("<row r=\"1\"><c r=\"A1\"><v>1</v></c></row>")));
        byte[] bytes = Files.readAllBytes(whole);
        Path cut = folder.resolve("cut.xlsx");
        Files.write(cut, java.util.Arrays.copyOf(bytes, bytes.length / 2));
        assertRefused(cut, "a damaged workbook");
        assertRefused(
                workbook(CONTENTS, RELATIONS, "", "", text("<worksheet><sheetData><row></worksheet>")), "damaged");
        Path old = folder.resolve("old.xls");
        Files.write(old, new byte[] {(byte) 0xD0, (byte) 0xCF, 0x11, (byte) 0xE0, 0, 0});
        assertRefused(old, "password");
        Path packed = folder.resolve("other.zip");
        try (ZipOutputStream zip = new ZipOutputStream(Files.newOutputStream(packed))) {
            add(zip, "mimetype", text("something"));
        }
        assertRefused(packed, "no XLSX workbook");
    }

    @Test
    void refusesTextBeyondLimits() throws IOException {
        Path file = folder.resolve("long.csv");
        Files.writeString(file, "a,b\n".repeat(SubmissionFile.MOST_ROWS + 1));
        assertRefused(file, "more lines");
        Files.writeString(file, "a,\"" + "x".repeat(40_000) + "\"\n");
        assertRefused(file, "a cell of 40000 characters");
        Files.write(file, new byte[] {'a', 0, 'b'});
        assertRefused(file, "bytes that are no text");
        Files.writeString(file, "a,\"b\n");
        assertRefused(file, "a quotation mark that is not closed");
    }

    @Test
    void readsOldCodePagesAndByteOrderMarks() throws IOException {
        Path file = folder.resolve("western.csv");
        Files.write(
                file,
                "Term;m³\nPumping;−3\n".replace('−', '-').getBytes(java.nio.charset.Charset.forName("windows-1252")));
        assertThat(SubmissionFile.read(file, "f").get(0).cell(0, 1)).isEqualTo("m³");
        Files.writeString(file, "\uFEFFTerm;m³\n\n# a note\nPumping;3\n");
        Sheet sheet = SubmissionFile.read(file, "f").get(0);
        assertThat(sheet.cell(0, 0)).isEqualTo("Term");
        assertThat(sheet.cell(3, 1))
                .as("blank lines and notes keep their place")
                .isEqualTo("3");
    }
}
