package org.seepledger.desktop;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import javafx.animation.AnimationTimer;
import org.seepledger.job.MapQuantity;
import org.testfx.util.WaitForAsyncUtils;

/**
 * Measures what a frame costs while a large layer is panned and zoomed: the folder is the argument. Frames in a second
 * depend on what else the machine does, so the time that the window's own thread and the painting thread work on each is
 * printed beside them.
 */
public final class PanSpeed {

    private static final int SECONDS = 3;

    private PanSpeed() {}

    /**
     * Prints milliseconds.
     *
     * @param arguments the aquifer folder
     */
    public static void main(String[] arguments) {
        try (OpenWindow window = new OpenWindow(1920, 1080)) {
            long begin = System.nanoTime();
            window.openSet(Path.of(arguments[0]));
            window.await(() -> window.assembly().map().values().scale().get().isPresent());
            System.out.printf("opened and read in %.0f ms%n", (System.nanoTime() - begin) / 1e6);
            window.settle();
            window.settle();
            frames(window, "pan, all seen", 1);
            for (int i = 0; i < 12; i++) {
                window.robot.interact(() -> window.assembly().map().step(1));
            }
            window.settle();
            frames(window, "pan, near", 1);
            frames(window, "zoom", 1.01);
            quantity(window, MapQuantity.Kind.FLUX);
            quantity(window, MapQuantity.Kind.IMBALANCE);
        }
        Runtime.getRuntime().halt(0);
    }

    private static void quantity(OpenWindow window, MapQuantity.Kind kind) {
        long begin = System.nanoTime();
        window.robot.interact(() -> window.assembly()
                .map()
                .values()
                .quantity()
                .set(window.assembly().map().values().quantities().stream()
                        .filter(each -> each.kind() == kind)
                        .findFirst()));
        window.await(
                () -> window.assembly().map().values().state().get().words().isEmpty());
        System.out.printf("%s in %.0f ms%n", kind, (System.nanoTime() - begin) / 1e6);
    }

    /** Moves the map in every frame that the toolkit gives, and counts them. */
    private static void frames(OpenWindow window, String what, double factor) {
        int[] frames = new int[1];
        AnimationTimer timer = new AnimationTimer() {
            @Override
            public void handle(long now) {
                double way = frames[0]++ % 60 < 30 ? 9 : -9;
                window.assembly().map().drag(way, way / 2);
                window.assembly().map().zoom(500, 300, way > 0 ? factor : 1 / factor);
            }
        };
        long begin = System.nanoTime();
        double thinking = work("JavaFX Application Thread") + work("Event Thread");
        double painting = work("QuantumRenderer-0");
        window.robot.interact(timer::start);
        WaitForAsyncUtils.sleep(SECONDS, TimeUnit.SECONDS);
        window.robot.interact(timer::stop);
        double seconds = (System.nanoTime() - begin) / 1e9;
        thinking = work("JavaFX Application Thread") + work("Event Thread") - thinking;
        painting = work("QuantumRenderer-0") - painting;
        System.out.printf(
                "%s: %.0f frames a second, each %.1f ms of the window's thread and %.1f ms of painting%n",
                what, frames[0] / seconds, thinking / frames[0], painting / frames[0]);
    }

    /** The milliseconds that a thread has worked. */
    private static double work(String name) {
        ThreadMXBean threads = ManagementFactory.getThreadMXBean();
        return Thread.getAllStackTraces().keySet().stream()
                .filter(thread -> thread.getName().equals(name))
                .mapToDouble(thread -> threads.getThreadCpuTime(thread.getId()) / 1e6)
                .sum();
    }
}
