/**
 * A table as somebody else wrote it: cells of text by row and column, and the numbers that are printed in them.
 *
 * <p>Rows and columns count from 0 in code and from 1 in words. A number knows how far it was rounded when it was
 * printed, and the unit that stands beside it in its cell.
 */
package org.seepledger.review.sheet;
