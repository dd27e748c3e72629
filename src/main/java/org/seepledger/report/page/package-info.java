/**
 * The report on water or on solutes: one HTML page that can be handed over, with nothing to fetch. A class writes each
 * section; what both share takes a {@link org.seepledger.report.page.Cover} and a frame that says which amounts tables give.
 *
 * <p>Conventions: every number of a result stands in a {@code <data value="…">} that reads back to the double of {@code
 * budget.csv} or {@code plume.csv}, and shows four significant digits; a number that cannot be given is a dash, never zero. Rows say in {@code
 * data-} attributes which prism, solute, period, group, item and layer they are about. All text passes through the HTML
 * library's escaping; pictures come as elements of {@link org.seepledger.report.SvgWriter}. The page needs no script and
 * loads nothing.
 */
package org.seepledger.report.page;
