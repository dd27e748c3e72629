package org.seepledger.desktop.running;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class TimeLeftTest {

    private final TimeLeft left = new TimeLeft();

    private String at(double seconds, double share) {
        left.look(0, share, Duration.ofNanos((long) (seconds * 1e9)));
        return left.words().orElse("");
    }

    @Test
    void nothingIsSaidBeforeTheSpeedMeansSomething() {
        assertThat(at(0, 0)).isEmpty();
        assertThat(at(1, 0.5)).isEmpty();
        TimeLeft slow = new TimeLeft();
        slow.look(0, 0, Duration.ZERO);
        slow.look(0, 0.001, Duration.ofSeconds(60));
        assertThat(slow.words()).isEmpty();
        slow.look(0, Double.NaN, Duration.ofSeconds(90));
        assertThat(slow.words()).isEmpty();
    }

    @Test
    void steadyWorkCountsDownInRoundNumbers() {
        List<String> told = new ArrayList<>();
        for (int second = 0; second <= 200; second += 20) {
            told.add(at(second, second / 200.0));
        }
        assertThat(told)
                .containsExactly(
                        "",
                        "about 3 min left",
                        "about 3 min left",
                        "about 3 min left",
                        "about 2 min left",
                        "about 2 min left",
                        "about 2 min left",
                        "about 60 s left",
                        "about 40 s left",
                        "about 20 s left",
                        "a few seconds left");
    }

    /** Work that goes by fits and starts: the estimate itself swings by a third, what is shown does not rise. */
    @Test
    void unsteadyWorkIsShownSteadily() {
        List<Integer> seconds = new ArrayList<>();
        for (int look = 0; look <= 48; look++) {
            double share = (look / 8 + (look % 8 > 5 ? 1 : 0)) / 10.0;
            String words = at(look / 4.0 * 3, share);
            if (words.contains(" s left")) {
                seconds.add(Integer.parseInt(words.replaceAll("\\D", "")));
            }
        }
        assertThat(seconds).hasSizeGreaterThan(10);
        for (int i = 1; i < seconds.size(); i++) {
            assertThat(seconds.get(i)).isLessThanOrEqualTo(seconds.get(i - 1) + 5);
        }
    }

    @Test
    void anotherStretchBeginsAnew() {
        at(0, 0);
        assertThat(at(10, 0.5)).isEqualTo("about 10 s left");
        left.look(1, 0, Duration.ofSeconds(11));
        assertThat(left.words()).isEmpty();
    }
}
