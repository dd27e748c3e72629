package org.seepledger.job;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.seepledger.sketch.Drawing;

/**
 * What is to be handed over in one folder.
 *
 * @param drawing the prisms as they are shown
 * @param prisms the file that the jobs read them from: one that holds them already, or {@link #ownPrisms} of the folder,
 *     which is then written
 * @param out the folder
 * @param overwrite whether the files of an earlier handing over may be replaced
 * @param balance the water budget, if it is wanted; where it goes is for the handing over to say, as for the others
 * @param plume the solute budget, if it is wanted
 * @param extract the extract, if it is wanted
 * @param pictures which pictures are wanted
 */
public record HandoverRequest(
        Drawing drawing,
        Path prisms,
        Path out,
        boolean overwrite,
        Optional<BalanceRequest> balance,
        Optional<PlumeRequest> plume,
        Optional<ExtractRequest> extract,
        Pictures pictures) {

    /** The folder of the water budget within the one handed over. */
    public static final String BUDGET = "budget";

    /** The folder of the solute budget. */
    public static final String SOLUTES = "solutes";

    /** The folder of the extract. */
    public static final String EXTRACT = "extract";

    /** The folder of the pictures. */
    public static final String PICTURES = "pictures";

    /** What the prisms are called in it. */
    public static final String PRISMS = "prisms.geojson";

    /**
     * Which pictures are wanted.
     *
     * @param maps whether the report's map of each prism is
     * @param sections whether the report's section through each prism is
     * @param shown pictures as views show them
     * @param svg whether each is written as SVG
     * @param png whether each is written as PNG
     */
    public record Pictures(boolean maps, boolean sections, List<ShownPicture> shown, boolean svg, boolean png) {

        /** None. */
        public static final Pictures NONE = new Pictures(false, false, List.of(), false, false);

        /** Copies the list. */
        public Pictures {
            shown = List.copyOf(shown);
        }

        /** Whether any of the report's is wanted. */
        boolean ofReport() {
            return maps || sections;
        }
    }

    /**
     * {@return where the prisms lie in a folder that holds them itself}
     *
     * @param out the folder
     */
    public static Path ownPrisms(Path out) {
        return out.resolve(PRISMS);
    }

    /** Whether the folder's own prisms are the ones that the jobs read. */
    boolean readsOwnPrisms() {
        return prisms.equals(ownPrisms(out));
    }
}
