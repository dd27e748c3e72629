/**
 * Reads an aquifer folder: {@code aquifer.json}, checked against the schema in {@code docs/aquifer.schema.json}, and the
 * data files that it names.
 *
 * <p>A <i>binding</i> says how a quantity is given: a number, a raster, a column of a table, or one of these for each
 * layer. It becomes {@link org.seepledger.aquifer.GriddedValues} in the set's units: stored value × the binding's scale +
 * its offset, then from its unit to the set's. Every file is found, opened and matched to the grid before any balance
 * begins.
 *
 * <p>Bound values tell what they are made of ({@link org.seepledger.aquifer.Stored}): file, place and number as it stands
 * there, before scale, offset and unit, and the factor. An offset, of the binding or of a raster's band, is a part of its
 * own.
 */
package org.seepledger.io.aquifer;
