package org.seepledger.report;

import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Base64;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import javax.imageio.ImageIO;
import javax.xml.stream.XMLOutputFactory;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamWriter;
import org.seepledger.picture.Hatch;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;
import org.seepledger.picture.Picture;

/**
 * Writes a picture as SVG 1.1 (W3C 2011): as an element of a page that has {@link InkStyle#css}, or
 * as a file of its own. Coordinates are written to a hundredth of a pixel.
 */
public final class SvgWriter {

    /** How strong the ground below a texture is. */
    private static final double GROUND = 0.3;

    private static final double LINE = 1.6;
    private static final double DOT = 3;
    private static final String SVG = "http://www.w3.org/2000/svg";

    private final XMLStreamWriter xml;
    private final String id;
    private int clips;

    private SvgWriter(XMLStreamWriter xml, String id) {
        this.xml = xml;
        this.id = id;
    }

    /** What writes into XML. */
    private interface Writing {
        void to(SvgWriter writer) throws XMLStreamException;
    }

    /**
     * {@return the picture as an element for a page}
     *
     * @param picture the picture
     * @param id begins the names within it; no two pictures of a page may have the same
     */
    public static String element(Picture picture, String id) {
        return text(id, writer -> {
            writer.open(picture);
            writer.close(picture);
        });
    }

    /**
     * {@return the picture as the text of a file of its own}
     *
     * @param picture the picture
     */
    public static String file(Picture picture) {
        return "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n"
                + text("picture", writer -> {
                    writer.open(picture);
                    writer.xml.writeAttribute("width", number(picture.width()));
                    writer.xml.writeAttribute("height", number(picture.height()));
                    writer.words("style", "style", InkStyle.css());
                    writer.xml.writeEmptyElement("rect");
                    writer.xml.writeAttribute("width", "100%");
                    writer.xml.writeAttribute("height", "100%");
                    writer.xml.writeAttribute("class", InkStyle.fill(Ink.Token.PAPER));
                    writer.close(picture);
                });
    }

    private static String text(String id, Writing writing) {
        StringWriter text = new StringWriter();
        try {
            XMLStreamWriter xml = XMLOutputFactory.newDefaultFactory().createXMLStreamWriter(text);
            writing.to(new SvgWriter(xml, id));
            xml.flush();
        } catch (XMLStreamException e) {
            throw new IllegalStateException("a picture could not be written to memory", e);
        }
        return text.toString();
    }

    private void open(Picture picture) throws XMLStreamException {
        xml.writeStartElement("svg");
        xml.writeAttribute("xmlns", SVG);
        xml.writeAttribute("viewBox", "0 0 " + number(picture.width()) + " " + number(picture.height()));
        xml.writeAttribute("class", "picture");
        xml.writeAttribute("role", "img");
        xml.writeAttribute("aria-labelledby", id + "-title " + id + "-what");
    }

    private void close(Picture picture) throws XMLStreamException {
        words("title", "title", picture.title());
        words("desc", "what", picture.description());
        for (Mark mark : picture.marks()) {
            write(mark);
        }
        xml.writeEndElement();
    }

    private void words(String element, String name, String words) throws XMLStreamException {
        xml.writeStartElement(element);
        xml.writeAttribute("id", id + "-" + name);
        xml.writeCharacters(words);
        xml.writeEndElement();
    }

    private void write(Mark mark) throws XMLStreamException {
        if (mark instanceof Mark.Line line) {
            xml.writeEmptyElement("path");
            xml.writeAttribute("d", path(line.xy(), ""));
            new Paint().empty().outline(line.stroke()).write();
        } else if (mark instanceof Mark.Area area) {
            write(area);
        } else if (mark instanceof Mark.Text text) {
            write(text);
        } else if (mark instanceof Mark.Image image) {
            write(image);
        } else if (mark instanceof Mark.Group group) {
            write(group);
        }
    }

    private void write(Mark.Area area) throws XMLStreamException {
        Optional<Mark.Fill> textured = area.fill().filter(fill -> fill.texture() != Mark.Texture.PLAIN);
        writeRings(
                area,
                textured.map(SvgWriter::ground).or(area::fill),
                textured.isPresent() ? Optional.empty() : area.stroke());
        if (textured.isPresent()) {
            writeHatch(area, textured.get());
            if (area.stroke().isPresent()) {
                writeRings(area, Optional.empty(), area.stroke());
            }
        }
    }

    /** What lies faintly below a texture. */
    private static Mark.Fill ground(Mark.Fill fill) {
        return new Mark.Fill(fill.ink(), GROUND * fill.opacity(), Mark.Texture.PLAIN);
    }

    private void writeRings(Mark.Area area, Optional<Mark.Fill> fill, Optional<Mark.Stroke> stroke)
            throws XMLStreamException {
        xml.writeEmptyElement("path");
        xml.writeAttribute(
                "d", area.rings().stream().map(ring -> path(ring, "Z")).collect(Collectors.joining()));
        xml.writeAttribute("fill-rule", "evenodd");
        Paint paint = new Paint();
        fill.ifPresentOrElse(paint::fill, paint::empty);
        stroke.ifPresent(paint::outline);
        paint.write();
    }

    /** A texture as lines, which print sharp; a pattern would be made an image for each area that it fills. */
    private void writeHatch(Mark.Area area, Mark.Fill fill) throws XMLStreamException {
        String lines = Hatch.of(area.rings(), fill.texture()).stream()
                .map(segment -> path(segment, ""))
                .collect(Collectors.joining());
        if (!lines.isEmpty()) {
            boolean dots = fill.texture() == Mark.Texture.DOTS;
            xml.writeEmptyElement("path");
            xml.writeAttribute("d", lines);
            xml.writeAttribute("stroke-linecap", dots ? "round" : "butt");
            if (fill.opacity() < 1) {
                xml.writeAttribute("stroke-opacity", number(fill.opacity()));
            }
            new Paint()
                    .empty()
                    .outline(Mark.Stroke.of(fill.ink(), dots ? DOT : LINE))
                    .write();
        }
    }

    private void write(Mark.Text text) throws XMLStreamException {
        xml.writeStartElement("text");
        xml.writeAttribute("x", number(text.x()));
        xml.writeAttribute("y", number(text.y()));
        xml.writeAttribute("font-size", number(text.size()));
        if (text.anchor() != Mark.Anchor.START) {
            xml.writeAttribute("text-anchor", text.anchor().name().toLowerCase(Locale.ROOT));
        }
        if (text.bold()) {
            xml.writeAttribute("font-weight", "600");
        }
        if (text.angle() != 0) {
            xml.writeAttribute(
                    "transform",
                    "rotate(" + number(text.angle()) + " " + number(text.x()) + " " + number(text.y()) + ")");
        }
        Paint paint = new Paint().fill(Mark.Fill.of(text.ink()));
        if (text.halo()) {
            paint.in("halo");
        }
        paint.write();
        xml.writeCharacters(text.words());
        xml.writeEndElement();
    }

    private void write(Mark.Image image) throws XMLStreamException {
        double[] place = image.placement();
        xml.writeEmptyElement("image");
        xml.writeAttribute("width", String.valueOf(image.columns()));
        xml.writeAttribute("height", String.valueOf(image.rows()));
        xml.writeAttribute("preserveAspectRatio", "none");
        xml.writeAttribute("style", "image-rendering:pixelated");
        StringBuilder matrix = new StringBuilder("matrix(");
        for (int i = 0; i < place.length; i++) {
            matrix.append(i == 0 ? "" : " ").append(place[i]);
        }
        xml.writeAttribute("transform", matrix.append(')').toString());
        xml.writeAttribute("href", "data:image/png;base64," + png(image));
    }

    private static String png(Mark.Image image) {
        BufferedImage pixels = new BufferedImage(image.columns(), image.rows(), BufferedImage.TYPE_INT_ARGB);
        pixels.setRGB(0, 0, image.columns(), image.rows(), image.argb(), 0, image.columns());
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try {
            ImageIO.write(pixels, "png", bytes);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return Base64.getEncoder().encodeToString(bytes.toByteArray());
    }

    private void write(Mark.Group group) throws XMLStreamException {
        String clip = id + "-clip-" + clips++;
        xml.writeStartElement("clipPath");
        xml.writeAttribute("id", clip);
        xml.writeEmptyElement("path");
        xml.writeAttribute("d", path(group.clip().ring(), "Z"));
        xml.writeEndElement();
        xml.writeStartElement("g");
        xml.writeAttribute("clip-path", "url(#" + clip + ")");
        for (Mark mark : group.marks()) {
            write(mark);
        }
        xml.writeEndElement();
    }

    private static String path(double[] xy, String end) {
        StringBuilder path = new StringBuilder();
        for (int i = 0; i < xy.length; i += 2) {
            path.append(i == 0 ? 'M' : 'L').append(number(xy[i])).append(' ').append(number(xy[i + 1]));
        }
        return path.append(end).toString();
    }

    /** A number to a hundredth, as short as it goes. */
    static String number(double value) {
        return BigDecimal.valueOf(value)
                .setScale(2, RoundingMode.HALF_EVEN)
                .stripTrailingZeros()
                .toPlainString();
    }

    /** How the element being written is filled and outlined. */
    private final class Paint {

        private final StringBuilder classes = new StringBuilder();
        private final StringBuilder style = new StringBuilder();

        Paint in(String name) {
            classes.append(classes.isEmpty() ? "" : " ").append(name);
            return this;
        }

        Paint empty() {
            style.append("fill:none;");
            return this;
        }

        Paint fill(Mark.Fill fill) {
            if (fill.ink() instanceof Ink.Token token) {
                in(InkStyle.fill(token));
            } else {
                style.append("fill:").append(fill.ink()).append(';');
            }
            if (fill.opacity() < 1) {
                style.append("fill-opacity:").append(number(fill.opacity())).append(';');
            }
            return this;
        }

        Paint outline(Mark.Stroke stroke) {
            if (stroke.ink() instanceof Ink.Token token) {
                in(InkStyle.stroke(token));
            } else {
                style.append("stroke:").append(stroke.ink()).append(';');
            }
            style.append("stroke-width:").append(number(stroke.width())).append(';');
            if (!stroke.dash().isEmpty()) {
                style.append("stroke-dasharray:")
                        .append(stroke.dash().stream().map(SvgWriter::number).collect(Collectors.joining(" ")))
                        .append(';');
            }
            return this;
        }

        void write() throws XMLStreamException {
            if (!classes.isEmpty()) {
                xml.writeAttribute("class", classes.toString());
            }
            if (!style.isEmpty()) {
                xml.writeAttribute("style", style.substring(0, style.length() - 1));
            }
        }
    }
}
