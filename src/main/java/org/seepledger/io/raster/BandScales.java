package org.seepledger.io.raster;

import java.io.StringReader;
import java.util.Arrays;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;

/**
 * The scale, offset and description of each band, from the XML of tag 42112: value = stored × scale + offset.
 */
final class BandScales {

    private final TiffFile file;
    private final double[] scales;
    private final double[] offsets;
    private final String[] descriptions;

    private BandScales(TiffFile file, int bands) {
        this.file = file;
        this.scales = new double[bands];
        this.offsets = new double[bands];
        this.descriptions = new String[bands];
        Arrays.fill(scales, 1);
        Arrays.fill(descriptions, "");
    }

    /**
     * Reads them.
     *
     * @throws org.seepledger.fault.DataFault if the XML or a number in it cannot be read
     */
    static BandScales of(TiffDirectory directory, int bands) {
        BandScales found = new BandScales(directory.file(), bands);
        String xml = directory.text(Tag.GDAL_METADATA).strip();
        if (!xml.isEmpty()) {
            found.read(xml);
        }
        return found;
    }

    private void read(String xml) {
        XMLInputFactory factory = XMLInputFactory.newDefaultFactory();
        factory.setProperty(XMLInputFactory.SUPPORT_DTD, false);
        factory.setProperty(XMLInputFactory.IS_SUPPORTING_EXTERNAL_ENTITIES, false);
        try {
            XMLStreamReader reader = factory.createXMLStreamReader(new StringReader(xml));
            while (reader.hasNext()) {
                if (reader.next() == XMLStreamReader.START_ELEMENT
                        && reader.getLocalName().equals("Item")) {
                    item(reader);
                }
            }
        } catch (XMLStreamException e) {
            throw file.fault(
                    Tag.GDAL_METADATA.toString(),
                    "XML that cannot be read",
                    "the metadata as GDAL writes them",
                    "Write the raster again, for instance with gdal_translate.");
        }
    }

    private void item(XMLStreamReader reader) throws XMLStreamException {
        String role = reader.getAttributeValue(null, "role");
        String sample = reader.getAttributeValue(null, "sample");
        boolean isScale = "scale".equals(role);
        if (sample != null && (isScale || "offset".equals(role))) {
            double[] target = isScale ? scales : offsets;
            int band = band(sample);
            target[band] = number(reader.getElementText().strip(), role, band);
        } else if (sample != null && "description".equals(role)) {
            descriptions[band(sample)] = reader.getElementText().strip();
        }
    }

    private int band(String sample) {
        if (sample.matches("\\d{1,6}") && Integer.parseInt(sample) < scales.length) {
            return Integer.parseInt(sample);
        }
        throw file.fault(
                Tag.GDAL_METADATA.toString(),
                "something of band index \"" + sample + "\"",
                "an index from 0 to " + (scales.length - 1),
                "Write the raster again, for instance with gdal_translate.");
    }

    private double number(String text, String role, int band) {
        try {
            double value = Double.parseDouble(text);
            if (Double.isFinite(value) && !(value == 0 && role.equals("scale"))) {
                return value;
            }
        } catch (NumberFormatException e) {
            // Falls through to the same fault as a number without sense.
        }
        throw file.fault(
                "band " + (band + 1),
                "the " + role + " \"" + text + "\"",
                "a finite number" + (role.equals("scale") ? " other than 0" : ""),
                "Set it anew, for instance with gdal_translate -a_scale 1 -a_offset 0.");
    }

    double scale(int band) {
        return scales[band];
    }

    double offset(int band) {
        return offsets[band];
    }

    /** What the file calls a band; empty where it does not say. */
    String description(int band) {
        return descriptions[band];
    }
}
