/**
 * Coordinate reference systems: the one that an aquifer's plan coordinates are in, and the way into it from another.
 *
 * <p>Plan coordinates are x to the east and y to the north, in that order, whatever order the authority of a CRS
 * prefers; longitude comes before latitude. The EPSG database (GeoTools) takes more than a second to open, so it is
 * opened only where a code has to be looked up or coordinates have to be transformed.
 */
package org.seepledger.io.crs;
