package org.seepledger.desktop;

import java.nio.file.Files;
import java.nio.file.Path;
import org.seepledger.desktop.session.Opening;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Figure;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.Shape;

/** A window that draws and then waits to be killed. */
public final class KilledWindow {

    private KilledWindow() {}

    /** What it draws: places that no short decimal writes, a prism less, and a boundary's new name. */
    static Drawing drawnOver(Drawing drawing) {
        Place centre = new Place(501_234 + 1 / 3.0, 5_201_000 + Math.PI);
        return drawing.with(Shape.of("cut short", Figure.circle(centre, 1000 / 7.0, 33)))
                .without("river meadow")
                .edit(
                        "well field",
                        shape -> shape.noted("moved \u2212 in \"haste\"").moved(1 / 7.0, -1e-7));
    }

    /**
     * Draws over the prisms of a folder, and stays open.
     *
     * @param arguments the folder
     * @throws InterruptedException never
     */
    public static void main(String[] arguments) throws InterruptedException {
        Path folder = Path.of(arguments[0]);
        OpenWindow window = new OpenWindow(900, 600);
        window.openSet(folder);
        window.robot.interact(() -> window.assembly().draft().step("step.move", KilledWindow::drawnOver));
        window.await(() -> Files.exists(folder.resolve(Opening.UNSAVED)));
        System.out.println("drawn and not saved");
        Thread.sleep(Long.MAX_VALUE);
    }
}
