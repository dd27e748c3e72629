package org.seepledger.desktop;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.image.Image;
import javafx.scene.image.PixelFormat;
import javafx.scene.input.KeyCode;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.intake.LooseValley;
import org.seepledger.job.MapQuantity;
import org.seepledger.picture.SectionLine;
import org.seepledger.sketch.Place;

/** Writes small pictures of each view, light and dark, in two sizes, into the folder given. */
public final class Screenshots {

    private Screenshots() {}

    /**
     * Writes the pictures.
     *
     * @param arguments the folder
     * @throws IOException if a picture cannot be written
     */
    public static void main(String[] arguments) throws IOException {
        Path folder = Files.createDirectories(Path.of(arguments[0]));
        for (int[] size : new int[][] {{1280, 800}, {1920, 1080}}) {
            try (OpenWindow window = new OpenWindow(size[0], size[1])) {
                String suffix = "-" + size[0] + "x" + size[1] + ".png";
                window.await(() -> !window.assembly().welcome().samples().isEmpty());
                both(window, folder, "welcome", suffix);
                looseFiles(window, folder, suffix);
                window.openSet(Path.of("sample-aquifers/valley"));
                window.settle();
                window.settle();
                both(window, folder, "map", suffix);
                for (String page : new String[] {"answers", "exchange", "ledger"}) {
                    window.robot.clickOn("#folio-" + page);
                    both(window, folder, page, suffix);
                }
                section(window, folder, suffix);
                window.robot.clickOn("side 3").clickOn("#ledger-origin");
                window.await(() -> isFilled(window, "#origin-table"));
                window.robot.interact(() -> window.robot
                        .lookup("#origin-table")
                        .queryTableView()
                        .getSelectionModel()
                        .selectRange(0, 8));
                both(window, folder, "origin", suffix);
                window.robot.clickOn("#folio-ledger").clickOn("#hand-over");
                window.settle();
                both(window, folder, "handover", suffix);
                press(window, KeyCode.ESCAPE);
                window.robot.interact(() -> {
                    window.assembly().map().showPrism();
                    window.assembly().tray().flipCard();
                });
                press(window, KeyCode.TAB);
                window.settle();
                both(window, folder, "draw", suffix);
                window.robot.interact(() -> window.assembly().tray().flipCard());
                window.robot.press(KeyCode.SHIFT, KeyCode.F6).release(KeyCode.F6, KeyCode.SHIFT);
                window.robot.clickOn("#fold-below").clickOn("#legend-title");
                window.settle();
                both(window, folder, "wide", suffix);
                window.robot.clickOn("#legend-title").clickOn("#fold-side").clickOn("#fold-below");
                press(window, KeyCode.F1);
                window.settle();
                both(window, folder, "actions", suffix);
                window.robot.press(KeyCode.ESCAPE).release(KeyCode.ESCAPE);
                window.robot.interact(window.assembly().view()::showPreferences);
                both(window, folder, "preferences", suffix);
                window.robot.interact(window.assembly().view()::showNotices);
                both(window, folder, "messages", suffix);
                press(window, javafx.scene.input.KeyCode.ESCAPE);
                review(window, folder, suffix);
                solutes(window, folder, suffix);
            }
        }
        System.exit(0);
    }

    private static void review(OpenWindow window, Path folder, String suffix) throws IOException {
        Path terrace = Path.of("sample-aquifers/terrace");
        window.openSet(terrace);
        window.settle();
        window.robot.clickOn("#shelf-review");
        window.robot.interact(() -> window.assembly().review().bring(terrace.resolve("submitted.csv")));
        window.await(() -> isFilled(window, "#review-findings"));
        window.robot.interact(() -> window.robot
                .lookup("#review-findings")
                .queryTableView()
                .getSelectionModel()
                .select(1));
        window.settle();
        for (String part : new String[] {"findings", "mapping", "write"}) {
            window.robot.clickOn("#review-part-" + part);
            window.settle();
            both(window, folder, "review-" + part, suffix);
        }
        window.robot.interact(() -> window.assembly().shelf().open(0));
    }

    private static void solutes(OpenWindow window, Path folder, String suffix) throws IOException {
        window.openSet(Path.of("sample-aquifers/depot"));
        window.settle();
        window.robot.interact(() -> {
            window.assembly().session().solute().set("solvent");
            window.assembly().session().interval().set(5);
            window.assembly()
                    .map()
                    .values()
                    .quantity()
                    .set(window.assembly().map().values().quantities().stream()
                            .filter(each -> each.kind() == MapQuantity.Kind.CONCENTRATION)
                            .findFirst());
        });
        window.settle();
        window.robot.clickOn("#solute-threshold").write("0.1 mg/L").type(javafx.scene.input.KeyCode.ENTER);
        for (String page : new String[] {"ledger", "answers", "transects"}) {
            window.robot.clickOn("#folio-" + page);
            window.settle();
            both(window, folder, "solute-" + page, suffix);
        }
    }

    private static void section(OpenWindow window, Path folder, String suffix) throws IOException {
        SectionLine line = new SectionLine(
                List.of(new Place(500150, 5201350), new Place(501250, 5201500), new Place(502900, 5200950)));
        window.robot.interact(() -> {
            window.assembly().session().sectionLine().set(Optional.of(line));
            window.assembly().session().selected().set("river meadow");
            window.assembly().session().lit().set("bottom");
        });
        window.settle();
        window.robot.moveTo("#section-canvas");
        both(window, folder, "section", suffix);
        window.robot.interact(() -> {
            window.assembly().session().sectionLine().set(Optional.empty());
            window.assembly().session().selected().set("well field");
            window.assembly().shelf().open(0);
        });
        window.settle();
    }

    private static void press(OpenWindow window, KeyCode key) {
        window.robot.press(key).release(key);
    }

    private static boolean isFilled(OpenWindow window, String table) {
        return !window.robot.lookup(table).queryTableView().getItems().isEmpty();
    }

    /** The import assistant with the valley's files as a stranger would have them. */
    private static void looseFiles(OpenWindow window, Path folder, String suffix) throws IOException {
        Path loose = Files.createTempDirectory("loose").resolve("valley");
        LooseValley.scatter(loose);
        window.robot.interact(() -> window.assembly().intake().bring(List.of(loose)));
        window.await(() -> window.robot
                .lookup("#intake-verdict")
                .queryAs(Label.class)
                .getText()
                .contains("way"));
        ListView<?> items = window.robot.lookup("#intake-items").queryAs(ListView.class);
        window.robot.interact(() -> items.getSelectionModel().select(8));
        window.settle();
        both(window, folder, "loose-files", suffix);
        window.robot.interact(() -> window.assembly().intake().shown().set(false));
    }

    private static void both(OpenWindow window, Path folder, String name, String suffix) throws IOException {
        for (Theme theme : Theme.values()) {
            window.robot.interact(() -> window.assembly().shell().theme().set(theme));
            window.settle();
            String lit = theme.name().toLowerCase(java.util.Locale.ROOT);
            write(window, folder.resolve(name + "-" + lit + suffix));
        }
    }

    private static void write(OpenWindow window, Path file) throws IOException {
        Image[] taken = new Image[1];
        window.robot.interact(() -> taken[0] = window.stage().getScene().snapshot(null));
        int width = (int) taken[0].getWidth();
        int height = (int) taken[0].getHeight();
        int[] pixels = new int[width * height];
        taken[0].getPixelReader().getPixels(0, 0, width, height, PixelFormat.getIntArgbInstance(), pixels, 0, width);
        IndexedPng.write(pixels, width, height, file);
    }
}
