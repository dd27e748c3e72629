package org.seepledger.desktop.map;

import java.util.Optional;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.image.Image;
import javafx.scene.transform.Affine;
import org.seepledger.aquifer.Grid;

/** Lays tiles over the map. Pixels of neighbouring tiles meet on device pixels. */
final class TilePainter {

    private final GraphicsContext canvas;
    private final Camera camera;
    private final double outputScale;
    private final Tiles tiles;
    private final Pyramid pyramid;
    private final Grid grid;

    TilePainter(GraphicsContext canvas, Camera camera, double outputScale, Tiles tiles, Pyramid pyramid) {
        this.canvas = canvas;
        this.camera = camera;
        this.outputScale = outputScale;
        this.tiles = tiles;
        this.pyramid = pyramid;
        this.grid = pyramid.lattice().grid();
    }

    void paint() {
        canvas.save();
        canvas.setImageSmoothing(false);
        int level = pyramid.levelFor(camera.scale() * outputScale);
        Span seen = seen(level);
        for (int row = seen.firstRow; row <= seen.lastRow; row++) {
            for (int column = seen.firstColumn; column <= seen.lastColumn; column++) {
                paint(new Tile(level, row, column));
            }
        }
        canvas.restore();
    }

    /** Which tiles can be seen. */
    private record Span(int firstRow, int lastRow, int firstColumn, int lastColumn) {}

    private Span seen(int level) {
        Extent local = Extent.inGrid(grid, camera);
        double tileX = tileX(level);
        double tileY = tileY(level);
        double top = grid.y().edge(grid.rows());
        int lastRow = (pyramid.level(level).rows() - 1) / Pyramid.TILE;
        int lastColumn = (pyramid.level(level).columns() - 1) / Pyramid.TILE;
        return new Span(
                clamped((top - local.north()) / tileY, lastRow),
                clamped((top - local.south()) / tileY, lastRow),
                clamped(local.west() / tileX, lastColumn),
                clamped(local.east() / tileX, lastColumn));
    }

    private static int clamped(double place, int last) {
        return (int) Math.max(0, Math.min(last, Math.floor(place)));
    }

    private double tileX(int level) {
        return pyramid.lattice().stepX() * Pyramid.TILE * (1 << level);
    }

    private double tileY(int level) {
        return pyramid.lattice().stepY() * Pyramid.TILE * (1 << level);
    }

    /** Paints a tile, or what there is of the coarser ones that hold it. */
    private void paint(Tile wanted) {
        Tile tile = wanted;
        Optional<Image> image = tiles.image(tile);
        while (image.isEmpty() && tile.level() + 1 < pyramid.levels()) {
            tile = tile.coarser();
            image = tiles.image(tile);
        }
        if (image.isPresent()) {
            paint(wanted, tile, image.get());
        }
    }

    private void paint(Tile wanted, Tile tile, Image image) {
        int shift = tile.level() - wanted.level();
        double texels = 1 << shift;
        double fromX = wanted.firstColumn() / texels - tile.firstColumn();
        double fromY = wanted.firstRow() / texels - tile.firstRow();
        double stepX = pyramid.lattice().stepX() * (1 << tile.level());
        double stepY = pyramid.lattice().stepY() * (1 << tile.level());
        double right = grid.x().edge(grid.columns());
        double top = grid.y().edge(grid.rows());
        double localX = (tile.firstColumn() + fromX) * stepX;
        double localY = top - (tile.firstRow() + fromY) * stepY;
        double across =
                Math.min(wanted.columns(pyramid) / texels, within(image.getWidth() - fromX, right - localX, stepX));
        double down = Math.min(wanted.rows(pyramid) / texels, within(image.getHeight() - fromY, localY, stepY));
        if (grid.sine() == 0 && grid.cosine() == 1) {
            double x = snapped(screenX(localX, localY));
            double y = snapped(screenY(localX, localY));
            double width = snapped(screenX(localX + across * stepX, localY)) - x;
            double height = snapped(screenY(localX, localY - down * stepY)) - y;
            canvas.drawImage(image, fromX, fromY, across, down, x, y, width, height);
        } else {
            turned(image, localX, localY, stepX, stepY, new double[] {fromX, fromY, across, down});
        }
    }

    /** The texels of coarse levels may reach beyond the grid; a clip would cost more than all tiles together. */
    private static double within(double texels, double length, double step) {
        return Math.min(texels, length / step);
    }

    private void turned(Image image, double localX, double localY, double stepX, double stepY, double[] part) {
        double scale = camera.scale();
        canvas.save();
        canvas.transform(new Affine(
                stepX * grid.cosine() * scale,
                stepY * grid.sine() * scale,
                screenX(localX, localY),
                -stepX * grid.sine() * scale,
                stepY * grid.cosine() * scale,
                screenY(localX, localY)));
        canvas.drawImage(image, part[0], part[1], part[2], part[3], 0, 0, part[2], part[3]);
        canvas.restore();
    }

    private double screenX(double localX, double localY) {
        return camera.x(grid.mapX(localX, localY));
    }

    private double screenY(double localX, double localY) {
        return camera.y(grid.mapY(localX, localY));
    }

    private double snapped(double place) {
        return Math.round(place * outputScale) / outputScale;
    }
}
