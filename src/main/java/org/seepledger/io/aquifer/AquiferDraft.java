package org.seepledger.io.aquifer;

import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.seepledger.fault.DataFault;
import org.seepledger.io.JsonFile;

/**
 * The text of an {@code aquifer.json} that may be wrong: its faults, and where in the text each of them is.
 *
 * @param text the text
 */
public record AquiferDraft(String text) {

    private static final ObjectMapper MAPPER = new ObjectMapper();
    private static final Pattern LINE_AND_COLUMN = Pattern.compile("line (\\d+), column (\\d+)");

    /**
     * A stretch of the text.
     *
     * @param from its first character, from 0
     * @param to behind its last character
     */
    public record Stretch(int from, int to) {}

    /**
     * {@return all that is wrong with the text itself, before any data file is looked at}
     *
     * @param file where the text is kept, for the reader
     */
    public List<DataFault> faults(Path file) {
        try {
            return SchemaCheck.faults(JsonFile.read(file, AquiferReader.FILE));
        } catch (DataFault e) {
            return List.of(e);
        }
    }

    /**
     * {@return where a fault is: at its line and column, its entry, or the entry that names its file; empty if it is nowhere}
     *
     * @param fault the fault
     */
    public Optional<Stretch> of(DataFault fault) {
        Map<String, Stretch> places = places();
        if (!fault.file().equals(AquiferReader.FILE)) {
            return naming(fault.file());
        }
        Matcher line = LINE_AND_COLUMN.matcher(fault.place());
        if (line.matches()) {
            return Optional.of(line(Integer.parseInt(line.group(1)), Integer.parseInt(line.group(2))));
        }
        String place = fault.place();
        while (!places.containsKey(place) && !place.isEmpty()) {
            int end = Math.max(place.lastIndexOf('.'), place.lastIndexOf(", "));
            place = end < 0 ? "" : place.substring(0, end);
        }
        return Optional.ofNullable(places.get(place));
    }

    private Stretch line(int line, int column) {
        int from = 0;
        for (int passed = 1; passed < line && from >= 0; passed++) {
            from = text.indexOf('\n', from) + 1;
        }
        int at = Math.min(text.length(), from + column - 1);
        int begin = Math.min(from, at);
        return new Stretch(begin, Math.max(at, begin));
    }

    /** The first text that names a file, by itself or with placeholders. */
    private Optional<Stretch> naming(String file) {
        Matcher texts = Pattern.compile("\"((?:[^\"\\\\]|\\\\.)*)\"").matcher(text);
        while (texts.find()) {
            String pattern =
                    Pattern.quote(texts.group(1)).replaceAll("\\{(layer|interval|instant)}", "\\\\E\\\\d+\\\\Q");
            if (file.matches(pattern)) {
                return Optional.of(new Stretch(texts.start(1), texts.end(1)));
            }
        }
        return Optional.empty();
    }

    /** Where each entry stands, by its place as messages name it; as far as the text can be read. */
    private Map<String, Stretch> places() {
        Map<String, Stretch> places = new LinkedHashMap<>();
        try (JsonParser parser = MAPPER.createParser(text)) {
            List<Stretch> open = new ArrayList<>();
            for (JsonToken token = parser.nextToken(); token != null; token = parser.nextToken()) {
                parser.finishToken();
                int from = (int) parser.currentTokenLocation().getCharOffset();
                int to = (int) parser.currentLocation().getCharOffset();
                if (token.isStructStart()) {
                    open.add(new Stretch(from, to));
                } else if (token.isStructEnd()) {
                    Stretch whole = new Stretch(open.remove(open.size() - 1).from(), to);
                    places.put(KeyPlace.of("$" + path(parser)), whole);
                } else if (token != JsonToken.FIELD_NAME) {
                    places.put(KeyPlace.of("$" + path(parser)), new Stretch(from, to));
                }
            }
        } catch (IOException e) {
            return places;
        }
        return places;
    }

    /** Keys joined by points and entries in brackets, as the schema's validator writes them. */
    private static String path(JsonParser parser) {
        String pointer = parser.getParsingContext().pathAsPointer().toString();
        StringBuilder path = new StringBuilder();
        for (String step :
                pointer.isEmpty() ? new String[0] : pointer.substring(1).split("/")) {
            path.append(step.matches("\\d+") ? "[" + step + "]" : "." + step);
        }
        return path.toString();
    }
}
