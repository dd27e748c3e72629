package org.seepledger.io.aquifer;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.Flow;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Layer;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Storage;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.fault.DataFault;
import org.seepledger.io.DataFolder;
import org.seepledger.io.JsonFile;
import org.seepledger.io.NearestName;
import org.seepledger.io.crs.PlanCrs;
import org.seepledger.io.result.Provenance;
import org.seepledger.io.table.Frame;
import org.seepledger.io.table.StepKind;
import org.seepledger.unit.Measure;

/** Reads an aquifer folder. */
public final class AquiferReader {

    /** The file that describes the set. */
    public static final String FILE = "aquifer.json";

    private final JsonNode root;
    private final String folderName;
    private final DataFiles files;
    private final List<String> warnings = new ArrayList<>();
    private final List<String> notes = new ArrayList<>();
    private Measure length;
    private Measure time;

    private AquiferReader(JsonNode root, String folderName, DataFiles files) {
        this.root = root;
        this.folderName = folderName;
        this.files = files;
    }

    /**
     * Opens an aquifer folder: everything is found and checked, values are read when asked for.
     *
     * @param folder the folder that holds {@code aquifer.json}
     * @return the set, to be closed
     * @throws DataFault if something is wrong with it
     */
    public static AquiferFolder open(Path folder) {
        Path file = folder.resolve(FILE);
        if (!Files.isRegularFile(file)) {
            throw noSet(folder);
        }
        Path absolute = folder.toAbsolutePath().normalize();
        return open(file, String.valueOf(absolute.getFileName()), DataFolder.holding(file, FILE));
    }

    /**
     * Opens an aquifer folder that is yet to be made.
     *
     * @param description its {@code aquifer.json}
     * @param files where its data files lie, by the names that the description gives them
     * @return the set, to be closed
     * @throws DataFault if something is wrong with it
     */
    public static AquiferFolder open(Path description, Map<String, Path> files) {
        return open(description, "aquifer", DataFolder.of(files, FILE));
    }

    /**
     * Opens an aquifer folder with another description than the one that lies in it.
     *
     * @param description what could stand in its place
     * @param folder the folder that holds the data files
     * @return the set, to be closed
     * @throws DataFault if something is wrong with it
     */
    public static AquiferFolder open(Path description, Path folder) {
        Path absolute = folder.toAbsolutePath().normalize();
        String name = String.valueOf(absolute.getFileName());
        return open(description, name, DataFolder.holding(absolute.resolve(FILE), FILE));
    }

    private static AquiferFolder open(Path file, String folderName, DataFolder folder) {
        JsonNode root = JsonFile.read(file, FILE);
        SchemaCheck.check(root);
        DataFiles files = new DataFiles(folder);
        try {
            return new AquiferReader(root, folderName, files).read(file);
        } catch (RuntimeException e) {
            files.close();
            throw e;
        }
    }

    private static DataFault noSet(Path folder) {
        boolean exists = Files.isDirectory(folder);
        boolean file = Files.isRegularFile(folder) && folder.toAbsolutePath().getParent() != null;
        Optional<String> near = exists
                ? Optional.empty()
                : file
                        ? Optional.of(String.valueOf(Objects.requireNonNullElse(folder.getParent(), Path.of("."))))
                        : NearestName.besides(folder);
        return new DataFault(
                folder.toString(),
                "",
                exists ? "no " + FILE : file ? "a file" : "no such folder",
                "an aquifer folder with " + FILE,
                near.map(name -> "Did you mean \"" + name + "\"?")
                        .orElse("Name the folder that holds it; docs/formats.md says how it is made."));
    }

    private AquiferFolder read(Path file) {
        length = measure("length_unit", "m");
        time = measure("time_unit", "d");
        PlanCrs crs =
                root.path("crs").isTextual() ? PlanCrs.of(root.get("crs").textValue(), FILE, "crs") : PlanCrs.local();
        Grid grid = GridReader.read(root.get("grid"), crs.planUnit(length), files);
        JsonNode layerNodes = root.get("layers");
        Frame frame = new Frame(grid, layerNodes.size(), TimesReader.read(root, time));
        Bindings bindings = new Bindings(files, frame);
        List<Layer> layers = layers(layerNodes, bindings);
        Flow flow = new FlowReader(root.get("flow"), root.has("head"), bindings, length, time, warnings).read();
        Optional<GriddedValues> head = root.has("head")
                ? Optional.of(bindings.values("head", root.get("head"), "head", length, StepKind.INSTANT))
                : Optional.empty();
        Storage storage = storage(root.path("storage"), bindings);
        List<Source> sources = new SourcesReader(bindings, length, time, warnings).read(root.path("sources"));
        List<Solute> solutes =
                new SolutesReader(bindings, root.path("sources"), length, time).read(root.path("solutes"));
        String name = root.has("name") ? root.get("name").textValue() : folderName;
        Aquifer aquifer = new Aquifer(name, grid, layers, frame.times(), flow, head, storage, sources, length, time);
        warnOfChoices(aquifer);
        files.shapeNote().ifPresent(notes::add);
        crs.code().ifPresent(this::warnOfOtherSystems);
        Map<String, Path> inputs = new LinkedHashMap<>();
        inputs.put(FILE, file);
        inputs.putAll(files.inputs());
        String datum = root.path("vertical_datum").asText();
        return new AquiferFolder(
                aquifer,
                solutes,
                crs,
                datum,
                List.copyOf(bindings.quantities()),
                origins(),
                inputs,
                warnings,
                notes,
                files);
    }

    private Measure measure(String key, String like) {
        String text = root.get(key).textValue();
        String expected = "a unit as \"" + like + "\"";
        try {
            Measure measure = Measure.of(text);
            if (measure.isCompatible(Measure.of(like))) {
                return measure;
            }
        } catch (IllegalArgumentException e) {
            String remedy = "Known are " + Measure.choices() + ".";
            throw new DataFault(FILE, key, "the unknown unit \"" + text + "\"", expected, remedy);
        }
        throw new DataFault(FILE, key, "\"" + text + "\", the unit of something else", expected, "Correct the unit.");
    }

    private List<Layer> layers(JsonNode nodes, Bindings bindings) {
        List<Layer> layers = new ArrayList<>();
        for (int i = 0; i < nodes.size(); i++) {
            JsonNode node = nodes.get(i);
            String place = KeyPlace.entry("layers", i);
            if (i == 0 && !node.has("top")) {
                throw new DataFault(
                        FILE,
                        place,
                        "no \"top\"",
                        "the top of the uppermost layer",
                        "Add it; the others may go without.");
            }
            String name = node.has("name") ? node.get("name").textValue() : "layer " + (i + 1);
            layers.add(new Layer(
                    name,
                    node.has("top")
                            ? Optional.of(surface(
                                    bindings, "top of layer " + (i + 1), node.get("top"), KeyPlace.key(place, "top")))
                            : Optional.empty(),
                    surface(bindings, "bottom of layer " + (i + 1), node.get("bottom"), KeyPlace.key(place, "bottom")),
                    node.has("water_table") ? node.get("water_table").booleanValue() : i == 0));
        }
        return layers;
    }

    private GriddedValues surface(Bindings bindings, String name, JsonNode node, String place) {
        return bindings.values(name, node, place, length, StepKind.NONE);
    }

    private Storage storage(JsonNode node, Bindings bindings) {
        List<Storage.Supplied> supplied = new ArrayList<>();
        for (int i = 0; i < node.path("supplied").size(); i++) {
            JsonNode entry = node.get("supplied").get(i);
            String item = entry.get("item").textValue();
            Measure rate = Measure.power(length, 3).per(time);
            String place = KeyPlace.key(KeyPlace.entry("storage.supplied", i), "rate");
            supplied.add(new Storage.Supplied(
                    item, bindings.values(item, entry.get("rate"), place, rate, StepKind.INTERVAL)));
        }
        Measure none = Measure.number();
        return new Storage(
                coefficient(node, "specific_yield", bindings, none),
                coefficient(node, "specific_storage", bindings, none.per(length)),
                coefficient(node, "storativity", bindings, none),
                supplied);
    }

    private static Optional<GriddedValues> coefficient(JsonNode node, String key, Bindings bindings, Measure unit) {
        return node.has(key)
                ? Optional.of(
                        bindings.values(key.replace('_', ' '), node.get(key), "storage." + key, unit, StepKind.NONE))
                : Optional.empty();
    }

    private void warnOfChoices(Aquifer aquifer) {
        if (!root.has("crs")) {
            notes.add("No crs is given; coordinates are taken as local ones in " + length + ".");
        }
        boolean yieldAlone = aquifer.storage().specificYield().isPresent()
                && aquifer.storage().specificStorage().isEmpty()
                && aquifer.storage().storativity().isEmpty();
        if (yieldAlone && aquifer.storageKnowledge() == StorageKnowledge.KNOWN) {
            warnings.add("Neither specific_storage nor storativity is given: elastic storage is taken as 0.");
        }
        if (aquifer.flow() instanceof DarcyFlux flux) {
            boolean areal = aquifer.sources().stream().anyMatch(Source.Areal.class::isInstance);
            if (flux.outerFaces().top() && areal) {
                warnings.add(
                        "The top is open to the given flux and there are areal sources too: recharge may be counted"
                                + " twice.");
            }
            if (aquifer.head().isEmpty() && aquifer.layers().stream().anyMatch(Layer::waterTable)) {
                warnings.add("No heads are given: the full thickness of water-table layers is taken as saturated, which"
                        + " overstates flow where the water table is lower.");
            }
        }
    }

    private void warnOfOtherSystems(String own) {
        files.systems().forEach((crs, rasters) -> {
            if (crs.startsWith("EPSG:") && !crs.equals(own)) {
                String more = rasters.count() == 1 ? "" : " (so do " + (rasters.count() - 1) + " more)";
                warnings.add("\"" + rasters.first() + "\" says that it is in " + crs + more + ", but the set's crs is "
                        + own + "; it is taken to be in the set's.");
            }
        });
    }

    private List<Provenance> origins() {
        List<Provenance> origins = new ArrayList<>();
        addOrigin(origins, "flow", root.get("flow"));
        addOrigin(origins, "storage", root.path("storage"));
        root.path("sources")
                .forEach(source -> addOrigin(origins, source.get("category").textValue(), source));
        return origins;
    }

    private static void addOrigin(List<Provenance> origins, String term, JsonNode node) {
        if (node.isObject()) {
            JsonNode percent = node.path("uncertainty").path("percent");
            JsonNode absolute = node.path("uncertainty").path("absolute");
            String uncertainty = percent.isNumber() ? percent.asText() + " %" : absolute.asText();
            origins.add(new Provenance(
                    term, node.path("origin").asText(), node.path("reference").asText(), uncertainty));
        }
    }
}
