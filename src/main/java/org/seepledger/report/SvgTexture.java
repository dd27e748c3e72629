package org.seepledger.report;

import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamWriter;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;

/** Textures as SVG patterns: lines or dots of an ink over a faint ground of it. */
final class SvgTexture {

    private static final int SIZE = 7;

    private SvgTexture() {}

    static String name(Ink.Token token, Mark.Texture texture) {
        return "t-" + InkStyle.name(token) + "-" + texture.ordinal();
    }

    static void write(XMLStreamWriter xml, Ink.Token token, Mark.Texture texture) throws XMLStreamException {
        xml.writeStartElement("pattern");
        xml.writeAttribute("id", name(token, texture));
        xml.writeAttribute("width", String.valueOf(SIZE));
        xml.writeAttribute("height", String.valueOf(SIZE));
        xml.writeAttribute("patternUnits", "userSpaceOnUse");
        xml.writeEmptyElement("path");
        xml.writeAttribute("d", "M0 0H7V7H0Z");
        xml.writeAttribute("class", InkStyle.fill(token));
        xml.writeAttribute("fill-opacity", "0.3");
        xml.writeEmptyElement("path");
        if (texture == Mark.Texture.DOTS) {
            xml.writeAttribute("d", "M2 2h2.6v2.6h-2.6Z");
            xml.writeAttribute("class", InkStyle.fill(token));
        } else {
            xml.writeAttribute("d", lines(texture));
            xml.writeAttribute("class", InkStyle.stroke(token));
            xml.writeAttribute("stroke-width", "1.8");
        }
        xml.writeEndElement();
    }

    private static String lines(Mark.Texture texture) {
        String rising = "M-1 8L8 -1M-1 1L1 -1M6 8L8 6";
        String falling = "M-1 -1L8 8M-1 6L1 8M6 -1L8 1";
        return switch (texture) {
            case RISING -> rising;
            case FALLING -> falling;
            default -> rising + falling;
        };
    }
}
