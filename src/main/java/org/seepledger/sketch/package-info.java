/**
 * Drawing as values: prisms as a person draws them, and each edit of them as a new value.
 *
 * <p>A {@link org.seepledger.sketch.Drawing} is a list of {@link org.seepledger.sketch.Shape}s; a shape is made of {@link
 * org.seepledger.sketch.Part}s, a part of {@link org.seepledger.sketch.Outline}s: an outer one and its islands. All are
 * immutable and share what an edit leaves alone. {@link org.seepledger.sketch.History} keeps the drawings that came
 * before, so that undoing restores the very same value.
 *
 * <p>Places are map coordinates, in the plan unit of the CRS. An outline keeps the direction and the first vertex that it
 * was drawn with; only when its sides are numbered is it made to run as {@link org.seepledger.prism.SideNumbering} says.
 * A boundary's name is kept with each side that it holds, so that it stays with the side through every edit.
 *
 * <p>A drawing may cross itself, since that happens while one draws: {@link org.seepledger.sketch.Crossings} tells where,
 * and {@link org.seepledger.sketch.PolygonCheck} what a budget would refuse. What cannot be done is a {@link
 * org.seepledger.sketch.Refusal} with a sentence. Tolerances are given by the caller, in map units.
 *
 * <p>Vertices are never moved by an edit that does not mean them: split and merge copy coordinates, and compute only
 * those where a line crosses a side.
 */
package org.seepledger.sketch;
