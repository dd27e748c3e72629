package org.seepledger.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.StringReader;
import java.util.Base64;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.seepledger.picture.Box;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;
import org.seepledger.picture.Picture;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;

class SvgWriterTest {

    private static final Mark.Stroke THIN = Mark.Stroke.of(Ink.Token.TEXT, 1);

    private static Picture picture(Mark... marks) {
        return new Picture(200, 100.5, "A & B", "what < is > there", List.of(marks));
    }

    private static Document parsed(String svg) throws Exception {
        return DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new InputSource(new StringReader(svg)));
    }

    private static List<Element> all(Document svg, String element) {
        NodeList found = svg.getElementsByTagName(element);
        return IntStream.range(0, found.getLength())
                .mapToObj(i -> (Element) found.item(i))
                .toList();
    }

    private static Element only(String element, Mark... marks) throws Exception {
        return all(parsed(SvgWriter.element(picture(marks), "m")), element).get(0);
    }

    @Test
    void saysWhatItShowsToThoseWhoCannotSeeIt() throws Exception {
        Document svg = parsed(SvgWriter.element(picture(), "m"));
        Element root = svg.getDocumentElement();
        assertThat(root.getAttribute("viewBox")).isEqualTo("0 0 200 100.5");
        assertThat(root.getAttribute("role")).isEqualTo("img");
        assertThat(root.getAttribute("aria-labelledby")).isEqualTo("m-title m-what");
        Element title = all(svg, "title").get(0);
        assertThat(title.getAttribute("id")).isEqualTo("m-title");
        assertThat(title.getTextContent()).isEqualTo("A & B");
        assertThat(all(svg, "desc").get(0).getTextContent()).isEqualTo("what < is > there");
    }

    @Test
    void drawsLinesWithoutFillingThem() throws Exception {
        Element path = only("path", new Mark.Line(new double[] {0, 1.001, 1e-9, 20}, THIN.dashed(3.0, 2.0)));
        assertThat(path.getAttribute("d")).isEqualTo("M0 1L0 20");
        assertThat(path.getAttribute("class")).isEqualTo("s-text");
        assertThat(path.getAttribute("style")).isEqualTo("fill:none;stroke-width:1;stroke-dasharray:3 2");
    }

    @Test
    void fillsAreasWithInkTextureOrAFixedColour() throws Exception {
        Box box = new Box(1, 2, 3, 4);
        Element token = only("path", Mark.Area.of(box, new Mark.Fill(Ink.Token.GAIN, 0.5, Mark.Texture.PLAIN)));
        assertThat(token.getAttribute("d")).isEqualTo("M1 2L4 2L4 6L1 6Z");
        assertThat(token.getAttribute("class")).isEqualTo("f-gain");
        assertThat(token.getAttribute("style")).isEqualTo("fill-opacity:0.5");
        Element fixed = only("path", Mark.Area.of(box, Mark.Fill.of(new Ink.Rgb(0x0a0b0c))));
        assertThat(fixed.getAttribute("style")).isEqualTo("fill:#0a0b0c");
        Element outline = only("path", new Mark.Area(List.of(box.ring()), Optional.empty(), Optional.of(THIN)));
        assertThat(outline.getAttribute("style")).isEqualTo("fill:none;stroke-width:1");
    }

    @Test
    void drawsATextureAsLinesOverAFaintGroundAndBelowTheOutline() throws Exception {
        Mark.Fill rising = new Mark.Fill(Ink.Token.LOSS, 0.5, Mark.Texture.RISING);
        List<double[]> ring = List.of(new Box(0, 0, 10, 10).ring());
        Mark area = new Mark.Area(ring, Optional.of(rising), Optional.of(THIN));
        List<Element> paths = all(parsed(SvgWriter.element(picture(area), "t")), "path");
        assertThat(paths).hasSize(3);
        assertThat(paths.get(0).getAttribute("style")).isEqualTo("fill-opacity:0.15");
        assertThat(paths.get(0).getAttribute("class")).isEqualTo("f-loss");
        assertThat(paths.get(1).getAttribute("d")).isEqualTo("M0 7L7 0M4 10L10 4");
        assertThat(paths.get(1).getAttribute("class")).isEqualTo("s-loss");
        assertThat(paths.get(1).getAttribute("stroke-opacity")).isEqualTo("0.5");
        assertThat(paths.get(2).getAttribute("style")).isEqualTo("fill:none;stroke-width:1");
    }

    @Test
    void writesWordsWhereTheyBelong() throws Exception {
        Element text = only(
                "text",
                Mark.Text.of(5, 6, "<out> & in", 11, Mark.Anchor.END)
                        .in(Ink.Token.LOSS)
                        .strong()
                        .haloed()
                        .turned(-90));
        assertThat(text.getTextContent()).isEqualTo("<out> & in");
        assertThat(text.getAttribute("text-anchor")).isEqualTo("end");
        assertThat(text.getAttribute("class")).isEqualTo("f-loss halo");
        assertThat(text.getAttribute("transform")).isEqualTo("rotate(-90 5 6)");
        assertThat(text.getAttribute("font-weight")).isEqualTo("600");
    }

    @Test
    void keepsEveryPixelOfAnImage() throws Exception {
        int[] argb = {0xff102030, 0, 0x80ffffff, 0xff000000, 0xffabcdef, 0xff000001};
        Element image = only("image", new Mark.Image(3, 2, argb, new double[] {2, 0, 0, 2, 7, 9}));
        assertThat(image.getAttribute("transform")).isEqualTo("matrix(2.0 0.0 0.0 2.0 7.0 9.0)");
        byte[] png = Base64.getDecoder().decode(image.getAttribute("href").split(",")[1]);
        assertThat(ImageIO.read(new ByteArrayInputStream(png)).getRGB(0, 0, 3, 2, null, 0, 3))
                .isEqualTo(argb);
    }

    @Test
    void clipsGroupsEachByItsOwnName() throws Exception {
        Mark inner = new Mark.Line(new double[] {0, 0, 9, 9}, THIN);
        Mark group = new Mark.Group(new Box(0, 0, 5, 5), List.of(inner));
        Document svg = parsed(SvgWriter.element(picture(group, group), "m"));
        assertThat(all(svg, "g").get(1).getAttribute("clip-path")).isEqualTo("url(#m-clip-1)");
        assertThat(all(svg, "clipPath").get(1).getAttribute("id")).isEqualTo("m-clip-1");
    }

    @Test
    void aFileStandsByItself() throws Exception {
        Document svg = parsed(SvgWriter.file(picture()));
        assertThat(svg.getDocumentElement().getAttribute("width")).isEqualTo("200");
        assertThat(all(svg, "style").get(0).getTextContent())
                .contains("--gain:")
                .contains(".f-gain{fill:var(--gain)}");
    }
}
