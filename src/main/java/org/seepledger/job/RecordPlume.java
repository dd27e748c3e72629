package org.seepledger.job;

import java.util.List;
import java.util.stream.IntStream;
import org.seepledger.plume.Plume;
import org.seepledger.prism.Prism;

/**
 * What prisms hold of each solute over the whole record, and which geometry they belong to.
 *
 * @param prisms the prisms that were asked about, as they were drawn
 * @param areas their plan areas on the grid, length²
 * @param plumes by prism and solute, as many solutes for each prism
 * @param warnings what may make a number wrong or missing
 * @param notes lesser remarks
 */
public record RecordPlume(
        List<Prism> prisms, List<Double> areas, List<Plume> plumes, List<String> warnings, List<String> notes) {

    /** Copies the lists. */
    public RecordPlume {
        prisms = List.copyOf(prisms);
        areas = List.copyOf(areas);
        plumes = List.copyOf(plumes);
        warnings = List.copyOf(warnings);
        notes = List.copyOf(notes);
    }

    /**
     * {@return the plumes of a prism, by solute}
     *
     * @param prism its place among the prisms
     */
    public List<Plume> of(int prism) {
        int solutes = plumes.size() / prisms.size();
        return plumes.subList(prism * solutes, (prism + 1) * solutes);
    }

    /**
     * {@return the place of a prism, -1 where there is none of the name}
     *
     * @param name its name
     */
    public int place(String name) {
        return IntStream.range(0, prisms.size())
                .filter(i -> prisms.get(i).name().equals(name))
                .findFirst()
                .orElse(-1);
    }
}
