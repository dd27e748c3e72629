package org.seepledger.io;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

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
    void findsTheNearestOrNothing() {
        List<String> known = List.of("specific_yield", "storativity", "specific_storage");
        assertThat(NearestName.of("specific_yeild", known)).contains("specific_yield");
        assertThat(NearestName.of("conductivity", List.of("name", "crs"))).isEmpty();
    }
}
