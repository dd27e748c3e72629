package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import org.junit.jupiter.api.Test;

class DisplayTest {

    @Test
    void aScreenIsNamedByTheEnvironmentUnlessTheSystemAlwaysHasOne() {
        assertThat(Display.exists("Linux", Map.of())).isFalse();
        assertThat(Display.exists("Linux", Map.of("DISPLAY", " "))).isFalse();
        assertThat(Display.exists("Linux", Map.of("DISPLAY", ":0"))).isTrue();
        assertThat(Display.exists("Linux", Map.of("WAYLAND_DISPLAY", "wayland-0")))
                .isTrue();
        assertThat(Display.exists("Windows 11", Map.of())).isTrue();
        assertThat(Display.exists("Mac OS X", Map.of())).isTrue();
    }
}
