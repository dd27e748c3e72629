package org.seepledger.intake;

import java.util.ArrayList;
import java.util.List;

/** Files that belong together, and what is made of them. */
public sealed interface Item {

    /** {@return what it is called: a file's name, with {@code #} where those of several differ} */
    String id();

    /** {@return what is made of it} */
    List<Use> uses();

    /** {@return its files} */
    List<? extends LooseFile> files();

    /**
     * {@return the same, with something else made of it}
     *
     * @param index which use, from 0
     * @param use the other
     */
    Item with(int index, Use use);

    /** {@return whether anything is made of it} */
    default boolean isUsed() {
        return uses().stream().anyMatch(use -> use.role() != Role.NONE);
    }

    /**
     * Rasters whose names differ in numbers or dates alone.
     *
     * @param id what it is called
     * @param files the rasters, by name
     * @param names their names, taken apart
     * @param fields what each field of the names means
     * @param bands what the bands count
     * @param uses what is made of it: one of all bands, or one of each
     */
    record Rasters(
            String id,
            List<LooseFile.Raster> files,
            List<NamePattern> names,
            List<Means> fields,
            Means bands,
            List<Use> uses)
            implements Item {

        /** Copies the lists. */
        public Rasters {
            files = List.copyOf(files);
            names = List.copyOf(names);
            fields = List.copyOf(fields);
            uses = List.copyOf(uses);
        }

        @Override
        public Rasters with(int index, Use use) {
            return new Rasters(id, files, names, fields, bands, replaced(uses, index, use));
        }

        /** {@return the same with another meaning of a field} */
        public Rasters withField(int field, Means means) {
            return new Rasters(id, files, names, replaced(fields, field, means), bands, uses);
        }

        /** {@return the same with another meaning of the bands} */
        public Rasters withBands(Means means) {
            return new Rasters(id, files, names, fields, means, uses);
        }

        Rasters called(String name) {
            return new Rasters(name, files, names, fields, bands, uses);
        }

        /** {@return the same without one of its files} */
        public Rasters without(int file) {
            return new Rasters(id, except(files, file), except(names, file), fields, bands, uses);
        }

        /** {@return how many bands each of the rasters has at least} */
        public int bandCount() {
            return files.stream().mapToInt(file -> file.bands().size()).min().orElse(0);
        }
    }

    /**
     * A table.
     *
     * @param file the file
     * @param places what each column is for
     * @param uses what is made of each column of values, or of all points
     */
    record Table(LooseFile.Table file, List<Place> places, List<Use> uses) implements Item {

        /** Copies the lists. */
        public Table {
            places = List.copyOf(places);
            uses = List.copyOf(uses);
        }

        @Override
        public String id() {
            return file.shownName();
        }

        @Override
        public List<LooseFile.Table> files() {
            return List.of(file);
        }

        @Override
        public Table with(int index, Use use) {
            return new Table(file, places, replaced(uses, index, use));
        }

        /** {@return the same with a column that is for something else} */
        public Table withPlace(int column, Place place) {
            return TableGuess.with(this, replaced(places, column, place));
        }

        /** {@return whether its lines are points} */
        public boolean arePoints() {
            return uses.size() == 1 && uses.get(0).column() < 0;
        }
    }

    /**
     * Any other file.
     *
     * @param file the file
     * @param uses what is made of it
     */
    record Other(LooseFile.Other file, List<Use> uses) implements Item {

        /** Copies the list. */
        public Other {
            uses = List.copyOf(uses);
        }

        @Override
        public String id() {
            return file.shownName();
        }

        @Override
        public List<LooseFile.Other> files() {
            return List.of(file);
        }

        @Override
        public Other with(int index, Use use) {
            return new Other(file, replaced(uses, index, use));
        }
    }

    private static <T> List<T> except(List<T> list, int index) {
        List<T> copy = new ArrayList<>(list);
        copy.remove(index);
        return copy;
    }

    private static <T> List<T> replaced(List<T> list, int index, T other) {
        List<T> copy = new ArrayList<>(list);
        copy.set(index, other);
        return copy;
    }
}
