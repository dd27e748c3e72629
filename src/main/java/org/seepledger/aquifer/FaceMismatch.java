package org.seepledger.aquifer;

/**
 * Two given values of one face that should be the same and are not.
 *
 * @param difference the difference's magnitude, length³/time
 * @param face which face, in the user's words
 * @param layer the cell's layer, from 0
 * @param row the cell's row
 * @param column the cell's column
 */
public record FaceMismatch(double difference, String face, int layer, int row, int column) {}
