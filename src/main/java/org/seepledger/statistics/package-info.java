/**
 * What a short series of numbers shows, and how surely: trend by ranks (Mann 1945, Kendall 1975), Sen's slope, first-order
 * rate, serial correlation.
 *
 * <p>Times increase strictly, in any unit; slopes and rates are per that unit. A number that the series is too short for
 * is empty. None of the methods knows why a series rises or falls.
 */
package org.seepledger.statistics;
