package org.seepledger.desktop;

import java.nio.file.Path;
import java.util.Arrays;
import org.seepledger.job.MapQuantity;

/** Measures how long a frame takes while a large layer is panned and zoomed: the folder is the argument. */
public final class PanSpeed {

    private static final int FRAMES = 120;

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
        window.await(() -> window.assembly().map().values().state().get().words().isEmpty());
        System.out.printf("%s in %.0f ms%n", kind, (System.nanoTime() - begin) / 1e6);
    }

    private static void frames(OpenWindow window, String what, double factor) {
        double[] times = new double[FRAMES];
        for (int i = 0; i < FRAMES; i++) {
            double way = i < FRAMES / 2 ? 9 : -9;
            long begin = System.nanoTime();
            window.robot.interact(() -> {
                window.assembly().map().drag(way, way / 2);
                window.assembly().map().zoom(500, 300, factor);
                window.assembly().scene().getRoot().layout();
            });
            times[i] = (System.nanoTime() - begin) / 1e6;
        }
        Arrays.sort(times);
        System.out.printf(
                "%s: median %.1f ms, 95 %% %.1f ms, worst %.1f ms on the window's thread%n",
                what, times[FRAMES / 2], times[FRAMES * 95 / 100], times[FRAMES - 1]);
    }
}
