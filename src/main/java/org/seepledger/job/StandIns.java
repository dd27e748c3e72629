package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.UUID;

/**
 * Copies of files at the place where they will stand in the end, for work that reads them there and writes down that name.
 * When closed, all is as it was before: what stood there stands there again.
 */
final class StandIns implements AutoCloseable {

    private final List<Path> placed = new ArrayList<>();
    private final List<Path> made = new ArrayList<>();
    private final Map<Path, Path> before = new LinkedHashMap<>();

    /**
     * Puts a copy of a file at a place.
     *
     * @param file the file
     * @param place the place
     * @throws IOException if it cannot be put there
     */
    void put(Path file, Path place) throws IOException {
        made.addAll(0, OutputFolder.missing(place.getParent()));
        Files.createDirectories(place.getParent());
        if (Files.exists(place)) {
            Path old = place.resolveSibling("." + place.getFileName() + "-before-" + UUID.randomUUID());
            Files.move(place, old);
            before.put(place, old);
        }
        placed.add(place);
        Files.copy(file, place);
    }

    @Override
    public void close() throws IOException {
        for (Path place : placed) {
            Files.deleteIfExists(place);
        }
        for (Map.Entry<Path, Path> old : before.entrySet()) {
            Files.move(old.getValue(), old.getKey(), StandardCopyOption.REPLACE_EXISTING);
        }
        OutputFolder.removeEmpty(made);
        placed.clear();
        before.clear();
        made.clear();
    }
}
