package org.seepledger.io;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class NearestNameTest {

    @Test
    void countsLettersToChange() {
        // The textbook pair of Levenshtein's distance.
        assertThat(NearestName.distance("kitten", "sitting")).isEqualTo(3);
        assertThat(NearestName.distance("Layers", "layers")).isZero();
        assertThat(NearestName.distance("", "abc")).isEqualTo(3);
        assertThat(NearestName.distance("a".repeat(1_000_000), "b")).isEqualTo(1_000_000);
    }

    @Test
    void findsTheFileBesideAPath(@TempDir Path folder) throws IOException {
        Files.writeString(folder.resolve("prisms.geojson"), "");
        assertThat(NearestName.besides(folder.resolve("prism.geojson"))).contains("prisms.geojson");
        assertThat(NearestName.besides(folder.resolve("other.csv"))).isEmpty();
        assertThat(NearestName.besides(folder.resolve("none/prism.geojson"))).isEmpty();
    }

    @Test
    void findsTheNearestOrNothing() {
        List<String> known = List.of("specific_yield", "storativity", "specific_storage");
        assertThat(NearestName.of("specific_yeild", known)).contains("specific_yield");
        assertThat(NearestName.of("conductivity", List.of("name", "crs"))).isEmpty();
    }
}
