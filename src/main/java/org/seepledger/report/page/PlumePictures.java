package org.seepledger.report.page;

import java.util.Optional;
import org.seepledger.picture.Picture;

/**
 * The pictures of a prism and solute.
 *
 * @param map concentrations, the outline of what lies above the threshold, the way of the centre, flow through faces
 * @param section a vertical section with concentrations
 * @param mass what the prism holds through time
 * @param blocks gains, losses and storage to scale: discharge by face among them
 * @param series rates by period
 */
public record PlumePictures(
        Picture map, Optional<Picture> section, Picture mass, Picture blocks, Optional<Picture> series) {}
