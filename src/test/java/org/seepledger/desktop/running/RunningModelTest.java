package org.seepledger.desktop.running;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.seepledger.desktop.task.Running;

class RunningModelTest {

    private final List<Running> works = new ArrayList<>();
    private final RunningModel model = new RunningModel(() -> works);

    private final class Job implements Running {

        private final String name;
        private final boolean listens;
        private double share;

        Job(String name, boolean listens) {
            this.name = name;
            this.listens = listens;
        }

        @Override
        public String name() {
            return name;
        }

        @Override
        public double share() {
            return share;
        }

        @Override
        public int stretch() {
            return 1;
        }

        @Override
        public boolean listens() {
            return listens;
        }

        @Override
        public void stop() {
            works.remove(this);
        }
    }

    private List<String> told(long millis) {
        model.look(Duration.ofMillis(millis));
        return model.lines().stream().map(RunningModel.Line::told).toList();
    }

    @Test
    void whatIsDoneSoonIsNotSpokenOf() {
        works.add(new Job("task.opening", true));
        assertThat(told(0)).isEmpty();
        assertThat(told(500)).isEmpty();
        works.set(0, new Job("task.opening", true));
        assertThat(told(1000)).isEmpty();
        assertThat(told(1600)).containsExactly("Opening · 0 %");
        works.clear();
        assertThat(told(1700)).isEmpty();
    }

    @Test
    void severalAreListedTheLongestFirstWithShareAndTimeLeft() {
        Job first = new Job("task.budget.record", true);
        works.add(first);
        told(0);
        Job second = new Job("task.opening", true);
        second.share = Double.NaN;
        works.add(0, second);
        told(2000);
        first.share = 0.25;
        assertThat(told(4000)).containsExactly("Budget of the record · 25 % · about 15 s left", "Opening");
    }

    @Test
    void onlyWhatListensIsStopped() {
        works.add(new Job("task.closing", false));
        told(0);
        told(1000);
        assertThat(model.canStop()).isFalse();
        works.add(new Job("task.opening", true));
        told(1000);
        told(2000);
        assertThat(model.canStop()).isTrue();
        model.stop();
        assertThat(told(2250)).containsExactly("Closing · 0 %");
    }
}
