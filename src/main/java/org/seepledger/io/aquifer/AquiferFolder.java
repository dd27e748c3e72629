package org.seepledger.io.aquifer;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Solute;
import org.seepledger.io.crs.PlanCrs;
import org.seepledger.io.result.Provenance;

/**
 * An aquifer folder, open: its files stay readable until it is closed.
 *
 * @param aquifer the aquifer
 * @param solutes what the water carries
 * @param crs the plan coordinate system
 * @param verticalDatum what elevations refer to; empty if not said
 * @param quantities all quantities given, for surveys
 * @param origins where terms come from
 * @param inputs the files read, by the name that the set gives them
 * @param warnings what the reader of any result must know
 * @param notes lesser remarks
 * @param files keeps the files open
 */
public record AquiferFolder(
        Aquifer aquifer,
        List<Solute> solutes,
        PlanCrs crs,
        String verticalDatum,
        List<Quantity> quantities,
        List<Provenance> origins,
        Map<String, Path> inputs,
        List<String> warnings,
        List<String> notes,
        DataFiles files)
        implements AutoCloseable {

    @Override
    public void close() {
        files.close();
    }
}
