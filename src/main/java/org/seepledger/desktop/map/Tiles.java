package org.seepledger.desktop.map;

import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import javafx.scene.image.Image;
import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;
import org.seepledger.desktop.task.Lane;
import org.seepledger.picture.ValueScale;

/** Coloured tiles of what lies over the map, made beside the window's own thread and kept while there is room. */
final class Tiles {

    private static final int KEPT = 320;

    private final Lane colouring;
    private final Runnable arrived;
    private final Map<Tile, Image> images = new LinkedHashMap<>(16, 0.75f, true);
    private final Set<Tile> asked = new HashSet<>();
    private Optional<Coat> coat = Optional.empty();

    /** What is coloured, and how. */
    private record Coat(Pyramid pyramid, ValueScale scale, double opacity) {}

    Tiles(Lane colouring, Runnable arrived) {
        this.colouring = colouring;
        this.arrived = arrived;
    }

    /** Takes other values or colours; the coarsest level is there at once. */
    void wear(Optional<LayerView> view, Optional<ValueScale> scale, double opacity) {
        Optional<Coat> next = view.flatMap(shown -> scale.map(colours -> new Coat(shown.pyramid(), colours, opacity)));
        if (next.equals(coat)) {
            return;
        }
        coat = next;
        colouring.cancel();
        images.clear();
        asked.clear();
        next.ifPresent(worn -> {
            Tile coarsest = new Tile(worn.pyramid().levels() - 1, 0, 0);
            images.put(coarsest, colour(coarsest, worn));
        });
    }

    Optional<Pyramid> pyramid() {
        return coat.map(Coat::pyramid);
    }

    /** A tile, or nothing yet: then it will come. */
    Optional<Image> image(Tile tile) {
        Image image = images.get(tile);
        if (image == null && asked.add(tile)) {
            Coat worn = coat.orElseThrow();
            colouring.run(progress -> colour(tile, worn), made -> keep(tile, made), fault -> asked.remove(tile));
        }
        return Optional.ofNullable(image);
    }

    private void keep(Tile tile, Image image) {
        images.put(tile, image);
        if (images.size() > KEPT) {
            Tile oldest = images.keySet().iterator().next();
            images.remove(oldest);
            asked.remove(oldest);
        }
        arrived.run();
    }

    private static Image colour(Tile tile, Coat coat) {
        Pyramid.Level level = coat.pyramid().level(tile.level());
        int columns = tile.columns(coat.pyramid());
        int rows = tile.rows(coat.pyramid());
        int[] argb = new int[columns * rows];
        for (int row = 0; row < rows; row++) {
            for (int column = 0; column < columns; column++) {
                float value = level.at(tile.firstRow() + row, tile.firstColumn() + column);
                argb[row * columns + column] = coat.scale().argb(value, coat.opacity());
            }
        }
        WritableImage image = new WritableImage(columns, rows);
        image.getPixelWriter().setPixels(0, 0, columns, rows, PixelFormat.getIntArgbInstance(), argb, 0, columns);
        return image;
    }
}
