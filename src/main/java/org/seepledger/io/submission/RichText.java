package org.seepledger.io.submission;

import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;

/** Reads a text whose runs may look different (ISO/IEC 29500-1, 18.4); how it is to be pronounced is passed over. */
final class RichText {

    private RichText() {}

    /** The text of the element that the reader stands at the start of, up to its end. */
    static String read(XMLStreamReader xml, String element, String shownFile) throws XMLStreamException {
        StringBuilder text = new StringBuilder();
        boolean inText = element.equals("v");
        int spoken = 0;
        while (xml.hasNext()) {
            int event = xml.next();
            if (event == XMLStreamReader.START_ELEMENT) {
                inText = xml.getLocalName().equals("t");
                spoken += xml.getLocalName().equals("rPh") ? 1 : 0;
            } else if (event == XMLStreamReader.END_ELEMENT) {
                inText = false;
                spoken -= xml.getLocalName().equals("rPh") ? 1 : 0;
                if (xml.getLocalName().equals(element)) {
                    return text.toString();
                }
            } else if (inText && spoken == 0 && xml.hasText()) {
                text.append(xml.getText());
                if (text.length() > SubmissionFile.LONGEST_CELL) {
                    throw SubmissionFile.tooMuch(
                            shownFile, "", "a cell of more characters", SubmissionFile.LONGEST_CELL + " characters");
                }
            }
        }
        return text.toString();
    }
}
