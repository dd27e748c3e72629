package org.seepledger.job;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.DataFolder;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.io.prisms.DrawingReader;
import org.seepledger.io.prisms.DrawingWriter;
import org.seepledger.io.prisms.PrismsReader;
import org.seepledger.io.prisms.SurfaceRasters;
import org.seepledger.io.prisms.TransectsReader;
import org.seepledger.io.prisms.TransectsWriter;
import org.seepledger.prism.Transect;
import org.seepledger.progress.Progress;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Limit;

/**
 * The part of a {@link Workbench} that reads and writes what is drawn: prisms, the surfaces that they end at, transects.
 * Rasters that prisms name stay open as long as the workbench.
 */
public final class DrawingBench {

    private final AquiferFolder folder;
    private final SurfaceRasters surfaces;
    private final Gate gate;

    DrawingBench(AquiferFolder folder, Gate gate) {
        this.folder = folder;
        this.surfaces = new SurfaceRasters(folder.aquifer().grid(), note -> {});
        this.gate = gate;
    }

    /**
     * {@return the prisms of a file as they stand there, even beyond the grid; the rasters that they name stay open as long as the workbench}
     *
     * @param file a GeoJSON file
     * @throws org.seepledger.fault.DataFault if anything in it is wrong
     */
    public PrismsFile prisms(Path file) {
        return gate.ask(Progress.NONE, progress -> {
            List<String> notes = new ArrayList<>();
            synchronized (surfaces) {
                return new PrismsFile(reader(notes::add).asDrawn(file, file.toString()), notes);
            }
        });
    }

    /**
     * {@return the drawing that a file holds, to go on with it, and the surfaces that it names; their rasters stay open as
     * long as the workbench}
     *
     * @param file a GeoJSON file
     * @throws org.seepledger.fault.DataFault if it is damaged, or a surface cannot be read
     */
    public DrawingFile drawing(Path file) {
        return gate.ask(Progress.NONE, progress -> {
            List<String> notes = new ArrayList<>();
            String shown = file.toString();
            Drawing drawing =
                    new DrawingReader(folder.crs(), folder.aquifer().layers().size(), notes::add).read(file, shown);
            synchronized (surfaces) {
                return DrawingFile.of(drawing, DataFolder.holding(file, shown), surfaces, notes);
            }
        });
    }

    /**
     * {@return the elevations of a surface raster, which prisms may then name as their top or bottom; it stays open as long as
     * the workbench}
     *
     * @param file the file that the prisms are kept in, from whose folder the surface is named
     * @param surface the surface
     * @throws org.seepledger.fault.DataFault if it is not there, leads out of the folder, or does not match the grid
     */
    public GriddedValues surface(Path file, Limit.Surface surface) {
        return gate.ask(Progress.NONE, progress -> {
            DataFolder beside = DataFolder.holding(file, file.toString());
            synchronized (surfaces) {
                return surfaces.read(beside.resolve(surface.path(), "a top or bottom"), surface.path());
            }
        });
    }

    /**
     * Writes a drawing; the file appears whole or not at all.
     *
     * @param file the file, which is replaced if it exists
     * @param drawing the drawing
     * @throws UsageFault if it cannot be written
     */
    public void write(Path file, Drawing drawing) {
        DrawingWriter.write(file, folder.crs().name(), drawing);
    }

    /**
     * Makes sure that a file holds the prisms of a drawing and no others.
     *
     * @param file the file
     * @param drawing the drawing
     * @throws UsageFault if it does not
     */
    public void mustHold(Path file, Drawing drawing) {
        if (!drawing(file).drawing().shapes().equals(drawing.shapes())) {
            throw new UsageFault("The file " + file + " holds other prisms than are drawn: it was changed meanwhile."
                    + " Save the drawing, then go on.");
        }
    }

    /**
     * {@return the transects of a file; none where it has none}
     *
     * @param file a GeoJSON file of LineStrings
     * @throws org.seepledger.fault.DataFault if anything in it is wrong
     */
    public List<Transect> transects(Path file) {
        return gate.ask(
                Progress.NONE,
                until -> new TransectsReader(folder.crs(), folder.aquifer().grid(), note -> {})
                        .asDrawn(file, file.toString()));
    }

    /**
     * Writes transects as the command reads them; the file appears whole or not at all.
     *
     * @param file the file, which is replaced if it exists
     * @param transects the transects
     * @throws org.seepledger.fault.UsageFault if it cannot be written
     */
    public void write(Path file, List<Transect> transects) {
        TransectsWriter.write(file, folder.crs().name(), transects);
    }

    PrismsReader reader(Consumer<String> notes) {
        return new PrismsReader(
                folder.crs(), folder.aquifer().grid(), folder.aquifer().layers(), true, surfaces, notes, notes);
    }

    void close() {
        surfaces.close();
    }
}
