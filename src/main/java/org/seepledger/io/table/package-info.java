/**
 * Tables as CSV (RFC 4180): values on the grid, points, periods; and how cells are written.
 *
 * <p><b>Dialect.</b> One header line, the first that is neither blank nor a note; a line that begins with {@code #} is
 * a note, wherever it stands. The separator is the one of comma, {@code ;} and tab that the header has most of. The
 * decimal sign is a point, or a comma where the separator is not a comma, and one and the same in the whole file, so
 * that a thousands separator is not taken for it. UTF-8, with or without a byte-order mark. A line has as many cells
 * as the header; lines of empty cells are passed over, and so are columns without a name.
 *
 * <p><b>Header.</b> A name may be followed by a unit in brackets: {@code qx [m/d]}. Names differ by more than case.
 * The names that place a line ({@code x y row col layer interval instant}, {@code from}, {@code to}, …) are known in
 * any case; the names of value columns are asked for as they are written.
 *
 * <p><b>No value.</b> An empty cell or {@code NaN} has no value. Anything else that is not a finite number is a fault
 * with its line and column.
 *
 * <p><b>Place.</b> {@code x,y} must lie within a hundredth of a cell's size of its centre, along both axes of the
 * grid; {@code row} 1 is the northernmost, {@code col} 1 the first along x. In a table with a {@code layer},
 * {@code interval} or {@code instant} column an empty cell there means all of them; a line for all layers and one for
 * a single layer of the same cell give it twice. Where lines add ({@link org.seepledger.io.table.Repeats#ADDED}), such
 * an empty cell is a fault, for the rate would count once per layer or step. A line without its place is a fault.
 *
 * <p><b>Limits.</b> A line may have 1,048,576 characters (so that a quotation mark that is never closed ends there) and
 * 10,000 columns. Values go to a scratch file as they are read; on the heap is one line.
 *
 * <p>Lines are counted from 1, notes and blank lines too.
 */
package org.seepledger.io.table;
