package org.seepledger.job;

import java.nio.file.Path;

/**
 * What an extract is asked for.
 *
 * @param aquifer the aquifer folder
 * @param prisms the GeoJSON file of prisms
 * @param out the output folder
 * @param clip whether prisms are cut at the grid's edge
 * @param overwrite whether an earlier run's files may be replaced
 */
public record ExtractRequest(Path aquifer, Path prisms, Path out, boolean clip, boolean overwrite) {

    /** The same request with its results in another folder. */
    ExtractRequest into(Path folder) {
        return new ExtractRequest(aquifer, prisms, folder, clip, overwrite);
    }
}
