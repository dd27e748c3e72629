/**
 * GeoTIFF: read by window from many files and threads, matched to the grid, and written.
 *
 * <p>Conventions:
 *
 * <ul>
 *   <li><b>Order</b>: row-major, row 0 northernmost, column 0 first along x. A file stored from south to north is turned
 *       when it is read; one that is mirrored along x is refused. On a turned grid north is the grid's own y.
 *   <li><b>Counting</b>: bands, rows and columns from 0 in code, from 1 in messages.
 *   <li><b>No value</b> is {@code NaN}: the declared nodata value, NaN as stored, cells under an internal mask, and blocks
 *       left out of a sparse file that declares a nodata value (without one they are 0, as their writers mean them).
 *   <li><b>Stored values</b> are those in the file; <b>values</b> are stored × scale + offset of the band.
 *   <li><b>Map coordinates</b> are of cell edges, whether the file ties them to edges or to centres.
 * </ul>
 *
 * <p>Specification: TIFF 6.0 (Adobe 1992) with its BigTIFF extension; OGC 19-008r4, GeoTIFF 1.1; the nodata and metadata
 * tags 42113 and 42112 as GDAL documents them. Understood: integers of 8, 16 and 32 bits, signed or not, and floats of 32
 * and 64; strips and tiles; both byte orders; both planar configurations; no compression, LZW, DEFLATE, PackBits and ZSTD;
 * predictors 2 and 3. Only the first image is read: overviews are not used.
 *
 * <p>Files are not trusted. What they declare is checked against limits and against the file's length before anything of
 * that size is allocated, and a block that does not decode to its full length is an error. The blocks are decoded here and
 * not by an imaging library because the ones at hand hand out zeros for a damaged DEFLATE or LZW block without a word, and a
 * zero flux looks like a value.
 *
 * <p>Nothing here touches a database of coordinate systems.
 */
package org.seepledger.io.raster;
