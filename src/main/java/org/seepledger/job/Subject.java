package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.balance.Periods;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.Unreadable;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.io.prisms.PrismsReader;
import org.seepledger.io.prisms.SurfaceRasters;
import org.seepledger.io.result.FileRecord;
import org.seepledger.io.result.MassUnits;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.io.result.Statement;
import org.seepledger.io.table.PeriodsTable;
import org.seepledger.ledger.Period;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;
import org.seepledger.unit.Measure;

/** What a job about prisms works on: an aquifer folder and the prisms in it, open until closed. */
final class Subject implements AutoCloseable {

    private final AquiferFolder folder;
    private final SurfaceRasters surfaces;
    private final Path prismsFile;
    private final List<Prism> prisms;
    private final List<String> warnings = new ArrayList<>();
    private final List<String> notes = new ArrayList<>();
    private final List<Path> more = new ArrayList<>();
    private Optional<Path> periodsFile = Optional.empty();

    private Subject(AquiferFolder folder, Path prismsFile, boolean clip) {
        Aquifer aquifer = folder.aquifer();
        this.folder = folder;
        this.prismsFile = prismsFile;
        this.surfaces = new SurfaceRasters(aquifer.grid(), notes::add);
        warnings.addAll(folder.warnings());
        notes.addAll(folder.notes());
        PrismsReader reader = new PrismsReader(
                folder.crs(), aquifer.grid(), aquifer.layers(), clip, surfaces, warnings::add, notes::add);
        try {
            this.prisms = reader.read(prismsFile, prismsFile.toString());
        } catch (RuntimeException e) {
            surfaces.close();
            throw e;
        }
    }

    /**
     * Opens a set and reads its prisms.
     *
     * @param aquifer the aquifer folder
     * @param prisms the GeoJSON file of prisms
     * @param clip whether prisms are cut at the grid's edge
     * @throws org.seepledger.fault.DataFault if the data are wrong
     */
    static Subject open(Path aquifer, Path prisms, boolean clip) {
        AquiferFolder folder = AquiferReader.open(aquifer);
        try {
            return new Subject(folder, prisms, clip);
        } catch (RuntimeException e) {
            folder.close();
            throw e;
        }
    }

    AquiferFolder folder() {
        return folder;
    }

    Aquifer aquifer() {
        return folder.aquifer();
    }

    List<Prism> prisms() {
        return prisms;
    }

    /** The rasters that prisms name as surfaces, by the name that they give them. */
    Map<String, Path> surfaces() {
        return surfaces.inputs();
    }

    /** What may make a number wrong; grows as more is found out. */
    List<String> warnings() {
        return warnings;
    }

    /** Lesser remarks; grows as more is found out. */
    List<String> notes() {
        return notes;
    }

    /** The periods that a budget is struck for. */
    List<Period> periods(Periods.Every every, Optional<Path> file, int waterYearStart) {
        Periods periods = new Periods(aquifer().times());
        periodsFile = file;
        return file.map(named -> periods.named(
                        PeriodsTable.read(named, named.toString(), aquifer().times(), warnings::add)))
                .orElseGet(() -> periods.every(every, waterYearStart));
    }

    /** A file of the request that is read beside set and prisms, and counts among the inputs. */
    Path alsoReads(Path file) {
        more.add(file);
        return file;
    }

    /** The units of results. */
    ResultUnits units(Optional<Measure> rate, Optional<Measure> volume) {
        return units(aquifer(), rate, volume);
    }

    static ResultUnits units(Aquifer aquifer, Optional<Measure> rate, Optional<Measure> volume) {
        try {
            return ResultUnits.of(aquifer.lengthUnit(), aquifer.timeUnit(), rate.orElse(null), volume.orElse(null));
        } catch (IllegalArgumentException e) {
            throw new UsageFault(
                    "The unit asked for does not fit: " + e.getMessage() + ". Give a rate as m3/d and a volume as m3.");
        }
    }

    /** The units of results about solutes. */
    MassUnits massUnits(Optional<Measure> rate, Optional<Measure> mass, Optional<Measure> volume) {
        try {
            return MassUnits.of(
                    aquifer().lengthUnit(),
                    aquifer().timeUnit(),
                    rate.orElse(null),
                    mass.orElse(null),
                    volume.orElse(null));
        } catch (IllegalArgumentException e) {
            throw new UsageFault("The unit asked for does not fit: " + e.getMessage()
                    + ". Give a rate as kg/yr, a mass as kg and a volume as m3.");
        }
    }

    /** The coordinate system as files name it; empty for local coordinates. */
    Optional<String> crs() {
        return folder.crs().name();
    }

    /** What a result says of itself: its title, and the files, origins and warnings known by now. */
    Statement statement(String title, Progress progress) {
        String made = title + " by seepledger " + Version.text();
        return new Statement(made, inputs(progress), folder.origins(), warnings);
    }

    /** All files read, with their fingerprints; a file of the request may have the name of one of the set's. */
    private List<FileRecord> inputs(Progress progress) {
        List<Map.Entry<String, Path>> files = new ArrayList<>(folder.inputs().entrySet());
        files.add(Map.entry(prismsFile.toString(), prismsFile));
        files.addAll(surfaces.inputs().entrySet());
        periodsFile.ifPresent(file -> files.add(Map.entry(file.toString(), file)));
        more.forEach(file -> files.add(Map.entry(file.toString(), file)));
        progress.begin("fingerprinting inputs", files.size());
        List<FileRecord> records = new ArrayList<>();
        for (Map.Entry<String, Path> file : files) {
            records.add(fingerprint(file.getKey(), file.getValue()));
            progress.step();
        }
        return records;
    }

    private static FileRecord fingerprint(String name, Path file) {
        try {
            return FileRecord.of(name, file);
        } catch (IOException e) {
            throw Unreadable.file(name, e);
        }
    }

    @Override
    public void close() {
        surfaces.close();
        folder.close();
    }
}
