package org.seepledger.desktop.task;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.seepledger.desktop.task.PaneState.Phase;

class InquiryTest {

    private final HeldTasks tasks = new HeldTasks();
    private final List<Integer> worked = new ArrayList<>();
    private final Inquiry<Integer, String> inquiry =
            new Inquiry<>(tasks.latest("numbers"), (question, progress) -> answer(question));

    private String answer(int question) {
        worked.add(question);
        if (question < 0) {
            throw new IllegalArgumentException("below 0");
        }
        return "number " + question;
    }

    private String last() {
        return inquiry.last().get().orElseThrow().answer();
    }

    @Test
    void ofQuestionsThatComeMeanwhileOnlyTheNewestIsAskedNext() {
        inquiry.want(1);
        inquiry.want(2);
        inquiry.want(3);
        assertThat(tasks.waiting()).isEqualTo(1);
        tasks.next();
        assertThat(last()).isEqualTo("number 1");
        assertThat(inquiry.state().get().phase()).isEqualTo(Phase.WORKING);
        tasks.next();
        assertThat(last()).isEqualTo("number 3");
        assertThat(inquiry.state().get()).isEqualTo(PaneState.READY);
        assertThat(worked).containsExactly(1, 3);
    }

    @Test
    void atRestAnOlderQuestionIsGivenUp() {
        inquiry.wantAtRest(1);
        inquiry.wantAtRest(2);
        tasks.all();
        assertThat(worked).containsExactly(2);
        inquiry.outdate();
        assertThat(inquiry.state().get().words()).contains("geometry before");
        assertThat(last()).isEqualTo("number 2");
        inquiry.wantAtRest(2);
        assertThat(inquiry.state().get()).isEqualTo(PaneState.READY);
    }

    @Test
    void whatCannotBeAnsweredIsToldAndNotAskedAgainUntilItChanges() {
        inquiry.want(-1);
        tasks.all();
        assertThat(inquiry.state().get().phase()).isEqualTo(Phase.FAILED);
        inquiry.want(-1);
        assertThat(tasks.waiting()).isZero();
        inquiry.want(4);
        tasks.all();
        assertThat(last()).isEqualTo("number 4");
        assertThat(worked).containsExactly(-1, 4);
    }

    @Test
    void whatIsNoLongerWantedIsNotHeardOf() {
        inquiry.want(1);
        inquiry.rest(PaneState.READY);
        tasks.all();
        assertThat(inquiry.last().get()).isEmpty();
        inquiry.want(1);
        tasks.all();
        inquiry.forget(PaneState.empty("nothing"));
        assertThat(inquiry.answers(1)).isFalse();
        assertThat(inquiry.state().get().phase()).isEqualTo(Phase.EMPTY);
    }
}
