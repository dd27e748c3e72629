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
        clip();
        int level = pyramid.levelFor(camera.scale() * outputScale);
        Span seen = seen(level);
        for (int row = seen.firstRow; row <= seen.lastRow; row++) {
            for (int column = seen.firstColumn; column <= seen.lastColumn; column++) {
                paint(new Tile(level, row, column));
            }
        }
        canvas.restore();
    }

    /** The texels of coarse levels may reach beyond the grid. */
    private void clip() {
        double right = grid.x().edge(grid.columns());
        double top = grid.y().edge(grid.rows());
        double[][] corners = {{0, 0}, {right, 0}, {right, top}, {0, top}};
        canvas.beginPath();
        for (int i = 0; i < corners.length; i++) {
            double x = snapped(screenX(corners[i][0], corners[i][1]));
            double y = snapped(screenY(corners[i][0], corners[i][1]));
            if (i == 0) {
                canvas.moveTo(x, y);
            } else {
                canvas.lineTo(x, y);
            }
        }
        canvas.closePath();
        canvas.clip();
    }

    /** Which tiles can be seen. */
    private record Span(int firstRow, int lastRow, int firstColumn, int lastColumn) {}

    private Span seen(int level) {
        double west = Double.POSITIVE_INFINITY;
        double east = Double.NEGATIVE_INFINITY;
        double south = Double.POSITIVE_INFINITY;
        double north = Double.NEGATIVE_INFINITY;
        for (double x : new double[] {0, camera.width()}) {
            for (double y : new double[] {0, camera.height()}) {
                double localX = grid.localX(camera.mapX(x), camera.mapY(y));
                double localY = grid.localY(camera.mapX(x), camera.mapY(y));
                west = Math.min(west, localX);
                east = Math.max(east, localX);
                south = Math.min(south, localY);
                north = Math.max(north, localY);
            }
        }
        double tileX = tileX(level);
        double tileY = tileY(level);
        double top = grid.y().edge(grid.rows());
        int lastRow = (pyramid.level(level).rows() - 1) / Pyramid.TILE;
        int lastColumn = (pyramid.level(level).columns() - 1) / Pyramid.TILE;
        return new Span(
                clamped((top - north) / tileY, lastRow),
                clamped((top - south) / tileY, lastRow),
                clamped(west / tileX, lastColumn),
                clamped(east / tileX, lastColumn));
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
        double across = Math.min(wanted.columns(pyramid) / texels, image.getWidth() - fromX);
        double down = Math.min(wanted.rows(pyramid) / texels, image.getHeight() - fromY);
        double stepX = pyramid.lattice().stepX() * (1 << tile.level());
        double stepY = pyramid.lattice().stepY() * (1 << tile.level());
        double top = grid.y().edge(grid.rows());
        double localX = (tile.firstColumn() + fromX) * stepX;
        double localY = top - (tile.firstRow() + fromY) * stepY;
        if (grid.sine() == 0 && grid.cosine() == 1) {
            double x = snapped(screenX(localX, localY));
            double y = snapped(screenY(localX, localY));
            double right = snapped(screenX(localX + across * stepX, localY));
            double bottom = snapped(screenY(localX, localY - down * stepY));
            canvas.drawImage(image, fromX, fromY, across, down, x, y, right - x, bottom - y);
        } else {
            turned(image, localX, localY, stepX, stepY, new double[] {fromX, fromY, across, down});
        }
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
