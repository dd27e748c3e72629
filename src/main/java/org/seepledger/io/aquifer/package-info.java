/**
 * Reads an aquifer folder: {@code aquifer.json}, checked against the schema in {@code docs/aquifer.schema.json}, and the
 * data files that it names.
 *
 * <p>A <i>binding</i> says how a quantity is given: a number, a raster, a column of a table, or one of these for each
 * layer. It becomes {@link org.seepledger.aquifer.GriddedValues} in the set's units: stored value × the binding's scale +
 * its offset, then from its unit to the set's. Every file is found, opened and matched to the grid before any balance
 * begins.
 */
package org.seepledger.io.aquifer;
