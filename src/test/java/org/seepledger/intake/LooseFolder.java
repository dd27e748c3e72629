package org.seepledger.intake;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleBinaryOperator;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.intake.Wishes.Topic;
import org.seepledger.io.raster.GeoTiffWriter;
import org.seepledger.progress.Progress;

/** A folder of loose files that a test writes. */
public final class LooseFolder {

    /** The grid of its rasters: five columns of 10 from 1000, four rows of 10 from 2000. */
    public static final Grid GRID = new Grid(Axis.even(1000, 10, 5), Axis.even(2000, 10, 4), 0, 1);

    private final Path folder;

    /** Begins with a folder. */
    public LooseFolder(Path folder) {
        this.folder = folder;
    }

    /** Writes a raster of one value. */
    public LooseFolder raster(String name, double value) {
        return raster(name, (row, column) -> value);
    }

    /** Writes a raster of values by row and column. */
    public LooseFolder raster(String name, DoubleBinaryOperator values) {
        return raster(name, GRID, values);
    }

    /** Writes a raster on a grid. */
    public LooseFolder raster(String name, Grid grid, DoubleBinaryOperator values) {
        try {
            Path file = folder.resolve(name);
            Files.createDirectories(file.getParent());
            GeoTiffWriter.write(file, grid, grid.window(), Optional.of("EPSG:32633"), row -> {
                double[] line = new double[grid.columns()];
                for (int column = 0; column < line.length; column++) {
                    line[column] = values.applyAsDouble(row, column);
                }
                return line;
            });
            return this;
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    /** Writes a text. */
    public LooseFolder text(String name, String... lines) {
        try {
            Path file = folder.resolve(name);
            Files.createDirectories(file.getParent());
            Files.writeString(file, String.join("\n", lines) + "\n");
            return this;
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    /** What is guessed of it. */
    public Plan plan() {
        return Proposal.of(LooseFiles.at(List.of(folder), Progress.NONE));
    }

    /** The plan with something said. */
    public static Plan said(Plan plan, Topic topic, String text) {
        return plan.with(plan.wishes().with(topic, text));
    }

    /** The item whose id contains a text. */
    public static Item item(Plan plan, String part) {
        return plan.items().stream()
                .filter(item -> item.id().contains(part))
                .findFirst()
                .orElseThrow();
    }
}
