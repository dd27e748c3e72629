package org.seepledger.io.aquifer;

import org.seepledger.aquifer.GriddedValues;
import org.seepledger.io.table.StepKind;
import org.seepledger.unit.Measure;

/**
 * One quantity that a set gives.
 *
 * @param name what it is, in the words of {@code aquifer.json}, as {@code flow x}
 * @param unit the unit that its values are in
 * @param steps whether they hold for intervals, at instants or throughout
 * @param values its values
 */
public record Quantity(String name, Measure unit, StepKind steps, GriddedValues values) {}
