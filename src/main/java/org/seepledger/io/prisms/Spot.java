package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import org.seepledger.fault.DataFault;

/**
 * A spot in the file that a message speaks of.
 *
 * @param file the file as the user named it
 * @param place where in it, empty for the whole
 */
record Spot(String file, String place) {

    private static final int LONGEST = 60;

    /** {@return a spot within this one} */
    Spot in(String closer) {
        return new Spot(file, place.isEmpty() || closer.isEmpty() ? place + closer : place + ", " + closer);
    }

    DataFault fault(String found, String expected, String remedy) {
        return new DataFault(file, place, found, expected, remedy);
    }

    /** {@return file and place, to begin a note with} */
    @Override
    public String toString() {
        return place.isEmpty() ? file : file + ", " + place;
    }

    /** {@return a text in quotes, cut short when it is long} */
    static String quoted(String text) {
        return "\"" + (text.length() > LONGEST ? text.substring(0, LONGEST) + "…" : text) + "\"";
    }

    /** {@return a value as it stands in the file, cut short when it is long} */
    static String shown(JsonNode value) {
        if (value.isMissingNode() || value.isNull()) {
            return value.isNull() ? "null" : "nothing";
        }
        if (value.isContainerNode() && value.size() > 4) {
            return value.isArray() ? "an array of " + value.size() : "an object";
        }
        String text = value.toString();
        return text.length() > LONGEST ? text.substring(0, LONGEST) + "…" : text;
    }
}
