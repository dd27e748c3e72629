package org.seepledger.report.page;

import java.util.Optional;
import org.seepledger.picture.Picture;

/**
 * The pictures of a prism.
 *
 * @param map where it lies, with the flow through its faces
 * @param section a vertical section through it
 * @param blocks gains, losses and storage to scale
 * @param series rates by period
 * @param storage cumulative change in storage
 * @param imbalance what does not balance, cell by cell
 */
public record PrismPictures(
        Optional<Picture> map,
        Optional<Picture> section,
        Optional<Picture> blocks,
        Optional<Picture> series,
        Optional<Picture> storage,
        Optional<Picture> imbalance) {}
