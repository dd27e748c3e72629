#!/bin/sh
# Writes the sample rasters of org.seepledger.io.raster with GDAL's command-line programs, so that what reads them is tested
# against files that another program wrote. The samples are kept in the repository; run this only to add one.
#
#   sh src/test/gdal/make-samples.sh [FOLDER]     (made with GDAL 3.6.2; ZSTD and LERC need a libtiff that has them)
#
# All have 23 rows and 37 columns (neither is a multiple of a block) unless said otherwise. With row r and column c counted
# from 0 in the north-west, the values are
#
#   reals            100 r + c + 0.25           bands 2, 3: 10000, 20000 more (less 0.25 as int32)
#   int16, int32     100 r + c - 1000
#   uint16           60000 + 100 r + c          (beyond the range of int16)
#   uint32           4294960000 + 100 r + c     (beyond the range of int32)
#   uint8            (7 r + 3 c) mod 251
#   int8             (7 r + 3 c) mod 251 - 125
#
# The north-west corner is at (500000, 5200000); cells are 50 wide and 40 high; EPSG:32633.
set -eu

out=${1:-$(dirname "$0")/../resources/org/seepledger/io/raster}
mkdir -p "$out"
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
export AAIGRID_DATATYPE=Float64

ROWS=23
COLUMNS=37
PLACE="-a_srs EPSG:32633 -a_ullr 500000 5200000 501850 5199080"

# grid NAME FORMULA: an ASCII grid of an awk formula in r and c
grid() {
    {
        printf 'ncols %s\nnrows %s\nxllcorner 0\nyllcorner 0\ncellsize 1\n' $COLUMNS $ROWS
        awk -v rows=$ROWS -v columns=$COLUMNS "BEGIN { for (r = 0; r < rows; r++) { line = \"\";
            for (c = 0; c < columns; c++) line = line sprintf(\"%.17g \", $2); print line } }"
    } >"$work/$1.asc"
}

# sample FILE SOURCE OPTIONS...: one GeoTIFF
sample() {
    file=$1
    source=$2
    shift 2
    # shellcheck disable=SC2086
    gdal_translate -q -of GTiff -a_nodata none $PLACE "$@" "$work/$source" "$out/$file.tif"
}

grid real '100 * r + c + 0.25'
grid real2 '100 * r + c + 10000.25'
grid real3 '100 * r + c + 20000.25'
grid signed '100 * r + c - 1000'
grid uint16 '60000 + 100 * r + c'
grid uint32 '4294960000 + 100 * r + c'
grid uint8 '(7 * r + 3 * c) % 251'
grid twos-complement '((7 * r + 3 * c) % 251 - 125 + 256) % 256'
gdalbuildvrt -q -separate "$work/bands.vrt" "$work/real.asc" "$work/real2.asc" "$work/real3.asc"

# Sample types, in strips of a few rows
sample uint8 uint8.asc -ot Byte -co BLOCKYSIZE=5
# GDAL 3.6 knows signed bytes as bytes with a flag: write them as such, with two's complement worked out beforehand
sample int8 twos-complement.asc -ot Byte -co PIXELTYPE=SIGNEDBYTE
sample int16 signed.asc -ot Int16
sample uint16 uint16.asc -ot UInt16
sample int32 signed.asc -ot Int32
sample uint32 uint32.asc -ot UInt32
sample float32 real.asc -ot Float32
sample float64 real.asc -ot Float64

# Compressions and predictors, strips and tiles
for packing in LZW DEFLATE PACKBITS ZSTD; do
    sample "float32-$packing-strips" real.asc -ot Float32 -co COMPRESS=$packing -co BLOCKYSIZE=5
    sample "float64-$packing-tiles" real.asc -ot Float64 -co COMPRESS=$packing -co TILED=YES -co BLOCKXSIZE=16 -co BLOCKYSIZE=16
done
for packing in LZW DEFLATE ZSTD; do
    sample "int16-$packing-predictor2" signed.asc -ot Int16 -co COMPRESS=$packing -co PREDICTOR=2
    sample "float32-$packing-predictor2" real.asc -ot Float32 -co COMPRESS=$packing -co PREDICTOR=2
    sample "float32-$packing-predictor3" real.asc -ot Float32 -co COMPRESS=$packing -co PREDICTOR=3
    sample "float64-$packing-predictor3" real.asc -ot Float64 -co COMPRESS=$packing -co PREDICTOR=3 -co TILED=YES -co BLOCKXSIZE=16 -co BLOCKYSIZE=16
done
sample uint8-LZW-predictor2 uint8.asc -ot Byte -co COMPRESS=LZW -co PREDICTOR=2
sample uint32-DEFLATE-predictor2 uint32.asc -ot UInt32 -co COMPRESS=DEFLATE -co PREDICTOR=2
sample float64-DEFLATE-predictor2 real.asc -ot Float64 -co COMPRESS=DEFLATE -co PREDICTOR=2
sample float64-tiles real.asc -ot Float64 -co TILED=YES -co BLOCKXSIZE=16 -co BLOCKYSIZE=16

# Byte order and BigTIFF (not with predictor 3: GDAL 3.6.2 cannot read back what it writes then)
sample float64-big-endian real.asc -ot Float64 -co ENDIANNESS=BIG
sample int16-big-endian-predictor2 signed.asc -ot Int16 -co ENDIANNESS=BIG -co COMPRESS=LZW -co PREDICTOR=2
sample float64-bigtiff real.asc -ot Float64 -co BIGTIFF=YES -co COMPRESS=DEFLATE
sample float64-bigtiff-big-endian real.asc -ot Float64 -co BIGTIFF=YES -co ENDIANNESS=BIG

# Three bands
sample bands-pixel bands.vrt -ot Float64 -co INTERLEAVE=PIXEL -co COMPRESS=DEFLATE
sample bands-band bands.vrt -ot Float64 -co INTERLEAVE=BAND -co COMPRESS=DEFLATE
sample bands-pixel-tiles-predictor2 bands.vrt -ot Int32 -co INTERLEAVE=PIXEL -co COMPRESS=LZW -co PREDICTOR=2 -co TILED=YES -co BLOCKXSIZE=16 -co BLOCKYSIZE=16
sample bands-pixel-predictor3 bands.vrt -ot Float32 -co INTERLEAVE=PIXEL -co COMPRESS=DEFLATE -co PREDICTOR=3
sample bands-band-tiles bands.vrt -ot Float32 -co INTERLEAVE=BAND -co COMPRESS=LZW -co TILED=YES -co BLOCKXSIZE=16 -co BLOCKYSIZE=16

# 200 x 200 cells of the reals: a cloud-optimised file, with overviews; and overviews after the image
ROWS=200 COLUMNS=200 grid large '100 * r + c + 0.25'
gdal_translate -q -of COG -ot Float32 -a_nodata none -co BLOCKSIZE=128 -co COMPRESS=DEFLATE -a_srs EPSG:32633 \
    -a_ullr 500000 5200000 510000 5192000 "$work/large.asc" "$out/cog.tif"
# A single strip of many codes fills the table of LZW several times
gdal_translate -q -of GTiff -ot Float32 -a_nodata none -co COMPRESS=LZW -co BLOCKYSIZE=200 "$work/large.asc" "$out/large-LZW.tif"
sample overviews real.asc -ot Float64 -co COMPRESS=DEFLATE
gdaladdo -q "$out/overviews.tif" 2 4

# No value: cells with (r + c) divisible by 7 are nodata
grid holes '((r + c) % 7 ? 100 * r + c + 0.25 : -9999)'
grid lowest '((r + c) % 7 ? 100 * r + c + 0.25 : -3.4028234663852886e+38)'
grid zeros '((r + c) % 7 ? (7 * r + 3 * c) % 250 + 1 : 0)'
grid sparse '(r < 16 && c >= 16 ? 100 * r + c + 0.25 : -9999)'
sample nodata-float64 holes.asc -ot Float64 -a_nodata -9999
sample nodata-int16 holes.asc -ot Int16 -a_nodata -9999
sample nodata-lowest lowest.asc -ot Float32 -a_nodata -3.4028234663852886e+38
sample nodata-uint8 zeros.asc -ot Byte -a_nodata 0
gdalwarp -q -ot Float64 -te 500000 5199080 501850 5200000 -tr 50 40 -srcnodata -9999 -dstnodata nan \
    "$out/nodata-float64.tif" "$out/nodata-nan.tif"
# 0.1 has no exact float32: the declared double must match the stored float
grid tenth '((r + c) % 7 ? 100 * r + c + 0.25 : 0.1)'
sample nodata-rounded tenth.asc -ot Float32 -a_nodata 0.1
gdal_translate -q -of GTiff -a_nodata -9999 "$work/sparse.asc" "$work/sparse.tif" -ot Float64
sample sparse sparse.tif -ot Float64 -a_nodata -9999 -co SPARSE_OK=TRUE -co TILED=YES -co BLOCKXSIZE=16 -co BLOCKYSIZE=16 -co COMPRESS=DEFLATE
gdal_create -q -of GTiff -ot Float64 -outsize 37 23 -bands 1 -co SPARSE_OK=TRUE -a_srs EPSG:32633 \
    -a_ullr 500000 5200000 501850 5199080 "$out/sparse-zero.tif"

# Scale and offset: value = stored x 0.01 + 5
sample scaled signed.asc -ot Int16 -a_scale 0.01 -a_offset 5
sample scaled-nodata holes.asc -ot Int16 -a_scale 0.01 -a_offset 5 -a_nodata -9999

# An internal mask that hides the cells with (r + c) divisible by 7
gdal_translate -q -of GTiff -ot Byte $PLACE "$work/zeros.asc" "$work/mask.tif"
gdalbuildvrt -q -separate "$work/pair.vrt" "$out/float64.tif" "$work/mask.tif"
gdal_translate -q -of GTiff --config GDAL_TIFF_INTERNAL_MASK YES -b 1 -mask 2 -ot Float64 -co COMPRESS=DEFLATE \
    "$work/pair.vrt" "$out/masked.tif"

# Georeference: cell centres; rows from the south; turned; mirrored; none; other coordinate systems
sample pixel-is-point real.asc -ot Float64 -mo AREA_OR_POINT=Point
place() {
    file=$1
    affine=$2
    shift 2
    gdal_translate -q -of VRT "$work/real.asc" "$work/$file.vrt"
    sed -i "s|<GeoTransform>.*</GeoTransform>|<GeoTransform>$affine</GeoTransform>|" "$work/$file.vrt"
    gdal_translate -q -of GTiff -a_nodata none -ot Float64 -a_srs EPSG:32633 "$@" "$work/$file.vrt" "$out/$file.tif"
}
place south-up '500000, 50, 0, 5199080, 0, 40'
place mirrored '501850, -50, 0, 5200000, 0, -40'
# 30 degrees counter-clockwise about the south-west corner (500000, 5199080)
place turned '499540, 43.30127018922193, 20, 5199876.743371481685, 25, -34.64101615137755'
place turned-south-up '500000, 43.30127018922193, -20, 5199080, 25, 34.64101615137755'
place turned-point '499540, 43.30127018922193, 20, 5199876.743371481685, 25, -34.64101615137755' -mo AREA_OR_POINT=Point
place half-turn '501850, -50, 0, 5199080, 0, 40'
place sheared '500000, 50, 10, 5200000, 0, -40'
gdal_translate -q -of GTiff -a_nodata none -ot Float64 -co PROFILE=BASELINE "$work/real.asc" "$out/no-georeference.tif"
gdal_translate -q -of GTiff -a_nodata none -ot Float64 -a_srs EPSG:4326 -a_ullr 10 50 13.7 47.7 "$work/real.asc" "$out/geographic.tif"
gdal_translate -q -of GTiff -a_nodata none -ot Float64 -a_srs '+proj=tmerc +lat_0=0 +lon_0=11 +k=1 +x_0=5000 +y_0=0 +ellps=bessel' \
    -a_ullr 0 920 1850 0 "$work/real.asc" "$out/user-defined.tif"
gdal_translate -q -of GTiff -a_nodata none -ot Float64 -gcp 0 0 500000 5200000 -gcp 37 0 501850 5200000 \
    -gcp 0 23 500000 5199080 -a_srs EPSG:32633 "$work/real.asc" "$out/control-points.tif"

# What is refused
gdal_translate -q -of GTiff -a_nodata none -ot CFloat64 "$work/real.asc" "$out/refused-complex.tif"
gdal_translate -q -of GTiff -a_nodata none -ot Float32 -co COMPRESS=LERC "$work/real.asc" "$out/refused-lerc.tif"
gdal_translate -q -of GTiff -a_nodata none -ot Byte -co COMPRESS=JPEG "$work/uint8.asc" "$out/refused-jpeg.tif"
gdal_translate -q -of GTiff -a_nodata none -ot Byte -co NBITS=4 -scale 0 250 0 15 "$work/uint8.asc" "$out/refused-4-bit.tif"
gdal_translate -q -of GTiff -a_nodata none -ot Float32 -co NBITS=16 "$work/real.asc" "$out/refused-float16.tif"
gdal_translate -q -of GTiff -a_nodata none -ot Int64 "$work/real.asc" "$out/refused-int64.tif"

rm -f "$out"/*.aux.xml
