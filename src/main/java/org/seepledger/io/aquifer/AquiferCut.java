package org.seepledger.io.aquifer;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.io.JsonFile;
import org.seepledger.io.raster.GeoTiff;
import org.seepledger.io.raster.RasterCut;
import org.seepledger.io.table.Frame;
import org.seepledger.io.table.TableCut;
import org.seepledger.prism.Surroundings;

/**
 * Copies an aquifer folder with the values of some cells alone.
 *
 * <p>The grid stays whole, and cells outside have no value. Were it cut, each distance from its first edge would be
 * another subtraction of rounded numbers, and a budget of the copy would differ from the original's in its last digits;
 * as it is, they are the same. Tables lose the lines of other cells; rasters keep their shape, and pack well. So
 * {@code aquifer.json} stays as it is, but that a grid like a raster's is written out in numbers.
 */
public final class AquiferCut {

    private static final ObjectMapper MAPPER = new ObjectMapper();

    private final AquiferFolder folder;
    private final Optional<String> crs;
    private final Surroundings cells;
    private final Frame frame;
    private final JsonNode root;

    /** Where a file of the copy goes. */
    public interface Target {

        /**
         * {@return the path to write to, whose folder exists}
         *
         * @param name the file as the set names it
         * @throws IOException if it cannot be made
         */
        Path file(String name) throws IOException;
    }

    private AquiferCut(AquiferFolder folder, Optional<String> crs, Surroundings cells) {
        this.folder = folder;
        this.crs = crs;
        this.cells = cells;
        this.frame = new Frame(
                folder.aquifer().grid(),
                folder.aquifer().layers().size(),
                folder.aquifer().times());
        this.root = JsonFile.read(folder.inputs().get(AquiferReader.FILE), AquiferReader.FILE);
    }

    /**
     * Copies a folder.
     *
     * @param folder the folder, open
     * @param crs the grid's coordinate system; empty for local coordinates
     * @param cells the cells whose values stay
     * @param target where its files go
     * @throws IOException if a file cannot be read or written
     */
    public static void write(AquiferFolder folder, Optional<String> crs, Surroundings cells, Target target)
            throws IOException {
        AquiferCut cut = new AquiferCut(folder, crs, cells);
        cut.writeDescription(target.file(AquiferReader.FILE));
        Set<String> points = cut.pointsFiles();
        for (Map.Entry<String, Path> input : folder.inputs().entrySet()) {
            if (!input.getKey().equals(AquiferReader.FILE)) {
                cut.copy(input.getKey(), input.getValue(), points, target.file(input.getKey()));
            }
        }
    }

    private void copy(String name, Path from, Set<String> points, Path to) throws IOException {
        if (points.contains(name)) {
            TableCut.ofPoints(from, name, frame, cells, to);
        } else if (folder.files().isRaster(name, "")) {
            try (GeoTiff raster = folder.files().raster(name)) {
                RasterCut.write(raster, frame.grid(), crs, cells, to);
            }
        } else {
            TableCut.ofCells(from, name, frame, cells, to);
        }
    }

    private Set<String> pointsFiles() {
        Set<String> files = new HashSet<>();
        root.path("sources").forEach(source -> {
            if (source.get("kind").textValue().equals("points")) {
                files.add(source.get("file").textValue());
            }
        });
        return files;
    }

    private void writeDescription(Path file) throws IOException {
        if (!root.get("grid").has("like")) {
            Files.copy(folder.inputs().get(AquiferReader.FILE), file);
            return;
        }
        ObjectNode copy = root.deepCopy();
        copy.set("grid", grid(frame.grid()));
        Files.writeString(file, MAPPER.writerWithDefaultPrettyPrinter().writeValueAsString(copy) + "\n");
    }

    private static ObjectNode grid(Grid grid) {
        ObjectNode node = MAPPER.createObjectNode();
        node.set("x", axis(grid.x()));
        node.set("y", axis(grid.y()));
        node.put("rotation", grid.rotation());
        return node;
    }

    /** The grid of a raster is evenly spaced; its first edge's distance is the step itself. */
    private static ObjectNode axis(Axis axis) {
        return MAPPER.createObjectNode()
                .put("from", axis.origin())
                .put("step", axis.edge(1))
                .put("count", axis.count());
    }
}
