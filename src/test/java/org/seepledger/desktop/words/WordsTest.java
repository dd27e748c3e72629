package org.seepledger.desktop.words;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.MissingResourceException;
import java.util.ResourceBundle;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.seepledger.fault.DataFault;

class WordsTest {

    private static final ResourceBundle BUNDLE = ResourceBundle.getBundle("org.seepledger.desktop.words");
    private static final Pattern KEY = Pattern.compile("(?:Words\\.of|\\.latest|\\.each)\\(\\s*\"([^\"]+)\"\\s*[,)]");

    private static String sources() throws IOException {
        StringBuilder text = new StringBuilder();
        try (Stream<Path> files = Files.walk(Path.of("src/main/java/org/seepledger/desktop"))) {
            for (Path file : files.filter(Files::isRegularFile).toList()) {
                text.append(Files.readString(file));
            }
        }
        return text.toString();
    }

    @Test
    void everyKeyInUseHasWordsAlsoThoseOfLanes() throws IOException {
        Matcher keys = KEY.matcher(sources());
        while (keys.find()) {
            String key = keys.group(1);
            boolean known = key.endsWith(".")
                    ? BUNDLE.keySet().stream().anyMatch(other -> other.startsWith(key))
                    : BUNDLE.containsKey(key);
            assertThat(known).as(key).isTrue();
        }
    }

    @Test
    void everyKeyIsInUse() throws IOException {
        String sources = sources();
        for (String key : BUNDLE.keySet()) {
            boolean used = sources.contains('"' + key + '"');
            for (int dot = key.indexOf('.'); dot >= 0 && !used; dot = key.indexOf('.', dot + 1)) {
                used = sources.contains('"' + key.substring(0, dot + 1) + '"');
            }
            assertThat(used).as(key).isTrue();
        }
    }

    /** Sentences for people; keys, patterns of dates, tags, what a file is searched for, and faults of the program are none. */
    @Test
    void noSentenceStandsOutsideTheBundle() throws IOException {
        String code = sources()
                .replaceAll("(?s)/\\*.*?\\*/", "")
                .replaceAll("//.*", "")
                .replaceAll("(?:throw|return) new \\w+(?:Fault|Exception)\\b[^;]*;", "");
        Matcher literal = Pattern.compile("\"((?:[^\"\\\\]|\\\\.)*)\"").matcher(code);
        while (literal.find()) {
            String text = literal.group(1);
            boolean technical = text.matches("(?:Shift\\+)?Page (?:Up|Down)|yyyy.*|<.*|## .*");
            assertThat(technical || !text.matches(".*\\p{L}{2,} \\p{L}.*"))
                    .as(text)
                    .isTrue();
        }
    }

    @Test
    void valuesAreFilledIn() {
        assertThat(Words.of("open.working", "valley")).isEqualTo("Reading valley");
        assertThatThrownBy(() -> Words.of("no such key")).isInstanceOf(MissingResourceException.class);
    }

    @Test
    void faultsAreSentences() {
        DataFault fault = new DataFault("a.csv", "line 3", "x", "y", "Do z.");
        assertThat(FaultWords.of(fault)).isEqualTo(fault.getMessage());
        assertThat(FaultWords.of(new OutOfMemoryError())).contains("memory");
        assertThat(FaultWords.of(new IOException("disk\nfull."))).contains("(disk full)");
        assertThat(FaultWords.of(new IllegalStateException())).contains("fault of the program");
    }
}
