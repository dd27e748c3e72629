/**
 * What the words of somebody else's table mean: which of its columns holds what, which of its terms are which items of
 * ours, which of its areas and periods are which of ours; and the figures that come out when the table is read so.
 *
 * <p>The guess goes by words of the trade and, for what words do not tell, by value. A person corrects it by a mapping
 * that is laid over the guess: whatever the mapping does not name stays guessed. What cannot be tied is kept and listed.
 */
package org.seepledger.review.mapping;
