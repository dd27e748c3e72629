package org.seepledger.io.result;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.seepledger.fault.DataFault;
import org.seepledger.io.JsonFile;
import org.seepledger.ledger.Disclaimer;

/** Writes and reads {@code run.json}: what was run, on what, with what result files, and what the reader must know. */
public final class RunJson {

    /** The file's name. */
    public static final String NAME = "run.json";

    private static final String PROGRAM = "seepledger";
    private static final String OUTPUTS = "outputs";

    private static final ObjectMapper MAPPER = new ObjectMapper();

    private RunJson() {}

    /**
     * A run.
     *
     * @param version the program's version
     * @param command the command
     * @param options its options as they took effect
     * @param statement inputs, origins and warnings
     * @param notes lesser remarks
     * @param checks measures of the run's own checks, by name
     * @param seconds how long each stage took, by name
     */
    public record Run(
            String version,
            String command,
            Map<String, String> options,
            Statement statement,
            List<String> notes,
            Map<String, Double> checks,
            Map<String, Double> seconds) {}

    /**
     * Writes the record.
     *
     * @param file the file
     * @param run the run
     * @param outputs the result files
     * @throws IOException if it cannot be written
     */
    public static void write(Path file, Run run, List<FileRecord> outputs) throws IOException {
        ObjectNode root = MAPPER.createObjectNode();
        root.put("program", PROGRAM).put("version", run.version()).put("command", run.command());
        root.set("options", MAPPER.valueToTree(run.options()));
        addFiles(root.putArray("inputs"), run.statement().inputs());
        root.set("origins", MAPPER.valueToTree(run.statement().origins()));
        root.set("warnings", MAPPER.valueToTree(run.statement().warnings()));
        root.set("notes", MAPPER.valueToTree(run.notes()));
        root.set("checks", MAPPER.valueToTree(run.checks()));
        root.set("seconds", MAPPER.valueToTree(run.seconds()));
        addFiles(root.putArray(OUTPUTS), outputs);
        root.put("disclaimer", Disclaimer.text());
        Files.writeString(file, MAPPER.writerWithDefaultPrettyPrinter().writeValueAsString(root) + "\n");
    }

    /**
     * {@return the result files that a run's record lists, as they stand there, whatever they are}
     *
     * @param file the record
     * @throws DataFault if it cannot be read or is not the record of a run of this program
     */
    public static List<FileRecord> outputs(Path file) {
        JsonNode root = read(file);
        List<FileRecord> outputs = new ArrayList<>();
        root.path(OUTPUTS)
                .forEach(output -> outputs.add(new FileRecord(
                        output.path("name").asText(),
                        output.path("bytes").asLong(),
                        output.path("sha256").asText())));
        return outputs;
    }

    /**
     * {@return the command that a run's record names}
     *
     * @param file the record
     * @throws DataFault if it cannot be read or is not the record of a run of this program
     */
    public static String command(Path file) {
        return read(file).path("command").asText();
    }

    private static JsonNode read(Path file) {
        if (!Files.exists(file) && file.getParent() != null) {
            Path folder = file.getParent();
            throw new DataFault(
                    folder.toString(),
                    "",
                    Files.isDirectory(folder) ? "no " + file.getFileName() : "no such folder",
                    "the output folder of an earlier run",
                    "Name the folder that its --out named.");
        }
        JsonNode root = JsonFile.read(file, file.toString());
        if (!root.path("program").asText().equals(PROGRAM)) {
            throw new DataFault(
                    file.toString(),
                    "",
                    "no \"program\": \"" + PROGRAM + "\"",
                    "the record of an earlier run",
                    "It was written by something else.");
        }
        return root;
    }

    private static void addFiles(ArrayNode array, List<FileRecord> files) {
        for (FileRecord input : files) {
            array.addObject()
                    .put("name", input.name())
                    .put("bytes", input.bytes())
                    .put("sha256", input.sha256());
        }
    }
}
