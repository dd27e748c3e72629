package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.StreamSupport;
import nu.validator.client.EmbeddedValidator;
import nu.validator.htmlparser.common.XmlViolationPolicy;
import nu.validator.htmlparser.dom.HtmlDocumentBuilder;
import org.seepledger.unit.Figures;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;
import org.xml.sax.SAXException;

/** A {@code report.html}, read as the HTML standard says a browser reads it. */
record ReportHtml(Path file, Document page) {

    static ReportHtml of(Path folder) {
        Path file = folder.resolve("report.html");
        try (InputStream bytes = Files.newInputStream(file)) {
            InputSource source = new InputSource(bytes);
            source.setEncoding("UTF-8");
            return new ReportHtml(file, new HtmlDocumentBuilder(XmlViolationPolicy.ALLOW).parse(source));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (SAXException e) {
            throw new AssertionError(e);
        }
    }

    /** All elements of a name within another. */
    static List<Element> within(Element root, String name) {
        NodeList found = root.getElementsByTagName(name);
        List<Element> elements = new ArrayList<>();
        for (int i = 0; i < found.getLength(); i++) {
            elements.add((Element) found.item(i));
        }
        return elements;
    }

    List<Element> all(String name) {
        return within(page.getDocumentElement(), name);
    }

    /** All elements that have a class. */
    List<Element> ofClass(String name) {
        return all("*").stream()
                .filter(element ->
                        List.of(element.getAttribute("class").split(" ")).contains(name))
                .toList();
    }

    Element byId(String id) {
        return all("*").stream()
                .filter(element -> element.getAttribute("id").equals(id))
                .findFirst()
                .orElseThrow(() -> new AssertionError("nothing has the id " + id));
    }

    /** The table of all rows of a prism and period; the second one holds the smaller sides. */
    List<Element> budgets(String prism, String period) {
        return ofClass("budget").stream()
                .filter(table -> table.getAttribute("data-prism").equals(prism)
                        && table.getAttribute("data-period").equals(period))
                .toList();
    }

    /** The cells of a table's row, without its name. */
    static List<Element> cells(Element row) {
        return within(row, "td");
    }

    /** The number that a cell holds; NaN where it holds a dash. */
    static double number(Element cell) {
        List<Element> data = within(cell, "data");
        return data.isEmpty() ? Double.NaN : Double.parseDouble(data.get(0).getAttribute("value"));
    }

    /** The text that a reader sees, blanks as one blank. */
    static String text(Node node) {
        return node.getTextContent().replaceAll("\\s+", " ").strip();
    }

    /** Checks that a cell holds the number of a CSV to the last bit, and shows it as it rounds. */
    static void assertCell(Element cell, String csv, boolean percent) {
        double value = csv.isEmpty() ? Double.NaN : Double.parseDouble(csv);
        assertThat(number(cell)).isEqualTo(value);
        assertThat(cell.getTextContent()).isEqualTo(percent ? Figures.typesetPercent(value) : Figures.tabular(value));
    }

    /** What a validator of the HTML standard has against the page. */
    List<String> faults() throws Exception {
        EmbeddedValidator validator = new EmbeddedValidator();
        validator.setOutputFormat(EmbeddedValidator.OutputFormat.JSON);
        JsonNode messages =
                new ObjectMapper().readTree(validator.validate(file)).get("messages");
        return StreamSupport.stream(messages.spliterator(), false)
                .filter(message -> !message.path("subType").asText().equals("warning")
                        || message.path("message").asText().contains("heading"))
                .map(message -> message.path("message").asText())
                // The validator knows the CSS of 2020; browsers pass over what they do not know.
                .filter(message -> !message.startsWith("CSS: "))
                .toList();
    }
}
