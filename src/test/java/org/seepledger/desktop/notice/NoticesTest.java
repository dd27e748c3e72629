package org.seepledger.desktop.notice;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class NoticesTest {

    private final Notices notices = new Notices();

    @Test
    void theLatestIsShownAndAllAreKept() {
        notices.done("saved");
        notices.refuse("not read");
        assertThat(notices.latest().get().orElseThrow().words()).isEqualTo("not read");
        notices.pass();
        assertThat(notices.latest().get()).isEmpty();
        assertThat(notices.all()).extracting(Notice::words).containsExactly("not read", "saved");
    }

    @Test
    void warningsStayUntilTheyHaveBeenRead() {
        notices.warn("a");
        notices.warn("b");
        notices.done("saved");
        notices.pass();
        assertThat(notices.unread().get()).isEqualTo(2);
        notices.read();
        assertThat(notices.unread().get()).isZero();
        assertThat(notices.all()).hasSize(3);
    }

    @Test
    void theOldestGoWhenThereAreManyOfThem() {
        for (int i = 0; i < 300; i++) {
            notices.done("no " + i);
        }
        assertThat(notices.all()).hasSize(200).first().extracting(Notice::words).isEqualTo("no 299");
    }
}
