package org.seepledger.report.page;

import org.seepledger.picture.Picture;
import org.seepledger.plume.Crossing;

/**
 * What crosses a drawn transect, with its picture.
 *
 * @param crossing what crosses
 * @param picture what crosses along the line
 */
public record DrawnCrossing(Crossing crossing, Picture picture) {}
