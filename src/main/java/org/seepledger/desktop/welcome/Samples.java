package org.seepledger.desktop.welcome;

import java.io.IOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.io.aquifer.AquiferReader;

/** Finds the sample aquifers that came with the program. */
public final class Samples {

    private static final String FOLDER = "sample-aquifers";

    private Samples() {}

    /** {@return where they may lie: where the program was started, and beside its own files} */
    public static List<Path> usualPlaces() {
        List<Path> places = new ArrayList<>();
        places.add(Path.of(""));
        try {
            Path program = Path.of(Samples.class
                    .getProtectionDomain()
                    .getCodeSource()
                    .getLocation()
                    .toURI());
            for (Path above = program.getParent(); above != null && places.size() < 4; above = above.getParent()) {
                places.add(above);
            }
        } catch (URISyntaxException | IllegalArgumentException e) {
            return places;
        }
        return places;
    }

    /**
     * {@return the samples in some places, by name, each once}
     *
     * @param places folders in which the folder of samples may lie
     * @throws IOException if a folder cannot be listed
     */
    static List<Place> in(List<Path> places) throws IOException {
        EntryGuard.enter();
        Set<Path> folders = new LinkedHashSet<>();
        for (Path place : places) {
            Path samples = place.toAbsolutePath().normalize().resolve(FOLDER);
            if (Files.isDirectory(samples)) {
                try (Stream<Path> inside = Files.list(samples)) {
                    inside.filter(folder -> Files.isRegularFile(folder.resolve(AquiferReader.FILE)))
                            .sorted()
                            .forEach(folders::add);
                }
            }
        }
        return folders.stream().map(Place::of).toList();
    }
}
