package org.seepledger.desktop.task;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.fail;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicBoolean;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.seepledger.progress.Cancelled;

class BackgroundTasksTest {

    private final BlockingQueue<Runnable> window = new LinkedBlockingQueue<>();
    private final BackgroundTasks tasks = new BackgroundTasks(window::add);
    private final List<Object> heard = new ArrayList<>();

    @AfterEach
    void close() {
        tasks.close();
    }

    private void answer() throws InterruptedException {
        window.poll(10, TimeUnit.SECONDS).run();
    }

    @Test
    void answersOnTheWindowsThreadFromADaemon() throws InterruptedException {
        tasks.latest("a lane")
                .run(
                        progress -> Thread.currentThread().getName()
                                + Thread.currentThread().isDaemon(),
                        heard::add,
                        heard::add);
        answer();
        assertThat(heard).containsExactly("a lanetrue");
    }

    @Test
    void newerWorkCancelsOlderAndOnlyTheNewerIsHeardOf() throws InterruptedException {
        Lane lane = tasks.latest("a lane");
        CountDownLatch begun = new CountDownLatch(1);
        CountDownLatch replaced = new CountDownLatch(1);
        AtomicBoolean cancelled = new AtomicBoolean();
        lane.run(
                progress -> {
                    begun.countDown();
                    replaced.await();
                    try {
                        progress.step();
                    } catch (Cancelled e) {
                        cancelled.set(true);
                        throw e;
                    }
                    return "old";
                },
                heard::add,
                heard::add);
        begun.await();
        lane.run(progress -> "new", heard::add, heard::add);
        replaced.countDown();
        answer();
        answer();
        assertThat(heard).containsExactly("new");
        assertThat(cancelled).isTrue();
    }

    @Test
    void workThatFinishedButWasNotYetHeardOfIsStaleToo() throws InterruptedException {
        Lane lane = tasks.latest("a lane");
        lane.run(progress -> "old", heard::add, heard::add);
        Runnable late = window.poll(10, TimeUnit.SECONDS);
        lane.run(progress -> "new", heard::add, heard::add);
        answer();
        late.run();
        assertThat(heard).containsExactly("new");
    }

    @Test
    void delayedWorkIsDroppedWhenNewerComesFirst() throws InterruptedException {
        Lane lane = tasks.latest("a lane");
        lane.runAfter(Duration.ofHours(1), progress -> "old", heard::add, heard::add);
        lane.runAfter(Duration.ofMillis(1), progress -> "new", heard::add, heard::add);
        answer();
        assertThat(heard).containsExactly("new");
    }

    @Test
    void eachPieceOfWorkCountsInAnOrdinaryLaneUntilItIsCancelled() throws InterruptedException {
        Lane lane = tasks.each("a lane", 2);
        lane.run(progress -> 1, heard::add, heard::add);
        lane.run(progress -> 2, heard::add, heard::add);
        answer();
        answer();
        assertThat(heard).containsExactlyInAnyOrder(1, 2);
        lane.run(progress -> 3, heard::add, heard::add);
        lane.cancel();
        Runnable late = window.poll(200, TimeUnit.MILLISECONDS);
        if (late != null) {
            late.run();
        }
        assertThat(heard).hasSize(2);
    }

    @Test
    void whatIsAskedForAfterTheEndIsNotDone() {
        Lane lane = tasks.each("test", 1);
        tasks.close();
        lane.run(progress -> fail("done after the end"), done -> {}, failed -> fail("told after the end"));
        assertThat(tasks.running()).isEmpty();
    }

    @Test
    void errorsAreToldToo() throws InterruptedException {
        OutOfMemoryError full = new OutOfMemoryError("full");
        tasks.latest("a lane")
                .run(
                        progress -> {
                            throw full;
                        },
                        heard::add,
                        heard::add);
        answer();
        assertThat(heard).containsExactly(full);
    }

    private Running awaitRunning(CountDownLatch begun) throws InterruptedException {
        assertThat(begun.await(10, TimeUnit.SECONDS)).isTrue();
        return tasks.running().get(0);
    }

    @Test
    void whatRunsSaysWhatItIsAndHowFar() throws InterruptedException {
        CountDownLatch begun = new CountDownLatch(1);
        CountDownLatch enough = new CountDownLatch(1);
        tasks.latest("task.opening")
                .run(
                        progress -> {
                            progress.begin("reading", 4);
                            progress.step();
                            begun.countDown();
                            return enough.await(10, TimeUnit.SECONDS);
                        },
                        heard::add,
                        heard::add);
        Running running = awaitRunning(begun);
        assertThat(running.name()).isEqualTo("task.opening");
        assertThat(running.share()).isEqualTo(0.25);
        assertThat(running.listens()).isTrue();
        assertThat(tasks.running()).containsExactly(running);
        enough.countDown();
        answer();
        assertThat(tasks.running()).isEmpty();
    }

    @Test
    void workThatIsStoppedIsToldAtOnceAndEndsAtItsNextStep() throws InterruptedException {
        CountDownLatch begun = new CountDownLatch(1);
        CountDownLatch ended = new CountDownLatch(1);
        tasks.latest("a lane")
                .run(
                        progress -> {
                            progress.begin("counting", Long.MAX_VALUE);
                            begun.countDown();
                            try {
                                while (true) {
                                    progress.step();
                                }
                            } finally {
                                ended.countDown();
                            }
                        },
                        heard::add,
                        heard::add);
        Running running = awaitRunning(begun);
        running.stop();
        assertThat(heard).hasSize(1).first().isInstanceOf(Cancelled.class);
        assertThat(ended.await(10, TimeUnit.SECONDS)).isTrue();
        answer();
        running.stop();
        assertThat(heard).hasSize(1);
    }

    @Test
    void whatStoppedWorkHadOpenedIsClosed() throws InterruptedException {
        CountDownLatch begun = new CountDownLatch(1);
        CountDownLatch stopped = new CountDownLatch(1);
        CountDownLatch closed = new CountDownLatch(1);
        tasks.latest("a lane")
                .<AutoCloseable>run(
                        progress -> {
                            begun.countDown();
                            stopped.await();
                            return closed::countDown;
                        },
                        heard::add,
                        heard::add);
        awaitRunning(begun).stop();
        stopped.countDown();
        answer();
        assertThat(closed.await(10, TimeUnit.SECONDS)).isTrue();
    }
}
