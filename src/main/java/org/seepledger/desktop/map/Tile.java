package org.seepledger.desktop.map;

/**
 * A square of texels of one level.
 *
 * @param level the level, 0 for all texels
 * @param row its row of tiles, 0 at the top
 * @param column its column of tiles
 */
record Tile(int level, int row, int column) {

    int firstColumn() {
        return column * Pyramid.TILE;
    }

    int firstRow() {
        return row * Pyramid.TILE;
    }

    /** The tile of the next coarser level that holds this one. */
    Tile coarser() {
        return new Tile(level + 1, row / 2, column / 2);
    }

    int columns(Pyramid pyramid) {
        return Math.min(Pyramid.TILE, pyramid.level(level).columns() - firstColumn());
    }

    int rows(Pyramid pyramid) {
        return Math.min(Pyramid.TILE, pyramid.level(level).rows() - firstRow());
    }
}
