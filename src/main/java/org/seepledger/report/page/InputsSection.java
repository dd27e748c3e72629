package org.seepledger.report.page;

import static j2html.TagCreator.code;
import static j2html.TagCreator.details;
import static j2html.TagCreator.each;
import static j2html.TagCreator.h2;
import static j2html.TagCreator.p;
import static j2html.TagCreator.section;
import static j2html.TagCreator.summary;
import static j2html.TagCreator.table;
import static j2html.TagCreator.tbody;
import static j2html.TagCreator.td;
import static j2html.TagCreator.thead;
import static j2html.TagCreator.tr;

import j2html.tags.DomContent;
import java.util.List;
import org.seepledger.io.result.FileRecord;
import org.seepledger.io.result.Provenance;

/** What the budget rests on: files with their hashes, and where terms come from. */
final class InputsSection {

    /** More files than these are folded away on a screen. */
    private static final int FILES_SHOWN = 12;

    private InputsSection() {}

    static DomContent files(Cover cover) {
        List<FileRecord> inputs = cover.statement().inputs();
        String title = "Input files, their sizes and SHA-256";
        DomContent files = Cells.scrolling(
                title,
                table(
                                Cells.caption(title),
                                thead(tr(Cells.column("File"), Cells.numberColumn("Bytes"), Cells.column("SHA-256"))),
                                tbody(each(inputs, InputsSection::row)))
                        .withClass("files"));
        return section(
                        h2("Inputs"),
                        p(
                                "Whoever has files with these hashes, and the same version of the program and options, gets the"
                                        + " same digits."),
                        inputs.size() > FILES_SHOWN ? details(summary(inputs.size() + " input files"), files) : files)
                .withId("inputs");
    }

    private static DomContent row(FileRecord file) {
        return tr(
                Cells.row("").with(code(file.name())),
                td(String.valueOf(file.bytes())).withClass("num"),
                td(code(file.sha256()).withClass("hash")));
    }

    static DomContent origins(Cover cover) {
        String title = "Where terms come from, as the set states";
        return section(
                        h2("Origins and uncertainties"),
                        p(
                                "What is stated of flow holds for all sides and lids. A standard deviation in percent is taken of"
                                        + " the larger of a term's gross inflow and outflow; an absolute one is in the unit of the"
                                        + " data, and is not set against a term."),
                        Cells.scrolling(
                                title,
                                table(
                                        Cells.caption(title),
                                        thead(tr(
                                                Cells.column("Term"),
                                                Cells.column("Origin"),
                                                Cells.column("Reference"),
                                                Cells.column("Standard deviation"))),
                                        tbody(each(cover.statement().origins(), InputsSection::row)))))
                .withId("origins");
    }

    private static DomContent row(Provenance origin) {
        return tr(
                Cells.row(origin.term()),
                td(stated(origin.origin())),
                td(stated(origin.reference())),
                td(stated(origin.uncertainty())));
    }

    private static String stated(String text) {
        return text.isEmpty() ? "not stated" : text;
    }
}
