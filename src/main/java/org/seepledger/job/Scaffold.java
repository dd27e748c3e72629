package org.seepledger.job;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.UUID;
import java.util.stream.Stream;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;
import org.seepledger.intake.Copy;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.io.aquifer.AquiferText;
import org.seepledger.io.raster.GeoTiff;
import org.seepledger.io.raster.GeoTiffWriter;
import org.seepledger.io.raster.Georeference;
import org.seepledger.io.table.TableCopy;
import org.seepledger.progress.Progress;

/** A folder in which an aquifer folder is built; gone when it is closed, unless it was published. */
final class Scaffold implements AutoCloseable {

    private static final int AT_ONCE = 1 << 20;

    private final Path folder;

    private Scaffold(Path folder) {
        this.folder = folder;
    }

    static Scaffold inTemporaryFolder() throws IOException {
        return new Scaffold(Files.createTempDirectory("seepledger-intake-"));
    }

    /** Beside where it is to be, so that it can be moved there in one step. */
    static Scaffold beside(Path target) throws IOException {
        String name = "." + target.getFileName() + "-building-" + UUID.randomUUID();
        return new Scaffold(Files.createDirectory(target.resolveSibling(name)));
    }

    Path folder() {
        return folder;
    }

    /** {@return the file, as it is in the folder now} */
    Path take(Copy copy, Progress progress) throws IOException {
        Path to = folder.resolve(copy.to());
        Files.createDirectories(to.getParent());
        if (copy instanceof Copy.Mended mended) {
            progress.begin("copying " + copy.to(), 1);
            TableCopy.write(mended.from(), mended.shownName(), mended.columns(), to);
            progress.step();
        } else if (copy instanceof Copy.Masked masked) {
            mask(masked, to, progress);
        } else {
            copy(copy, to, progress);
        }
        return to;
    }

    private static void copy(Copy copy, Path to, Progress progress) throws IOException {
        progress.begin("copying " + copy.to(), Files.size(copy.from()) / AT_ONCE + 1);
        try (InputStream in = Files.newInputStream(copy.from());
                OutputStream out = Files.newOutputStream(to)) {
            byte[] bytes = in.readNBytes(AT_ONCE);
            while (bytes.length > 0) {
                out.write(bytes);
                progress.step();
                bytes = in.readNBytes(AT_ONCE);
            }
        }
    }

    private static void mask(Copy.Masked copy, Path to, Progress progress) throws IOException {
        try (GeoTiff values = GeoTiff.open(copy.from(), copy.shownName());
                GeoTiff marks =
                        GeoTiff.open(copy.mask(), copy.mask().getFileName().toString())) {
            progress.begin("copying " + copy.to(), values.rows());
            Grid grid = values.grid(1);
            double[] line = new double[values.columns()];
            GeoTiffWriter.write(to, grid, grid.window(), values.georeference().flatMap(Georeference::crs), row -> {
                Window window = new Window(row, 0, 1, line.length);
                double[] kept = new double[line.length];
                values.read(0, window, kept, 0);
                marks.read(copy.band(), window, line, 0);
                for (int column = 0; column < line.length; column++) {
                    boolean active = line[column] != 0 && !Double.isNaN(line[column]);
                    kept[column] = active ? kept[column] : Double.NaN;
                }
                progress.step();
                return kept;
            });
        }
    }

    /** {@return the description, written} */
    Path describe(Map<String, Object> set) throws IOException {
        return Files.writeString(folder.resolve(AquiferReader.FILE), AquiferText.of(set));
    }

    /** Moves the folder to its place, which is free or an empty folder. */
    void publish(Path target) throws IOException {
        Files.deleteIfExists(target);
        Files.move(folder, target);
    }

    @Override
    public void close() throws IOException {
        if (!Files.exists(folder)) {
            return;
        }
        List<Path> left;
        try (Stream<Path> files = Files.walk(folder)) {
            left = files.sorted(Comparator.reverseOrder()).toList();
        }
        for (Path file : left) {
            Files.deleteIfExists(file);
        }
    }
}
