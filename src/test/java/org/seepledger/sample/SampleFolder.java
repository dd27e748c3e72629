package org.seepledger.sample;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;

/** A folder that a sample is written into, over what is there. */
record SampleFolder(Path path) {

    /** {@return the folder that a command's only argument names, made if need be} */
    static SampleFolder named(String[] args) throws IOException {
        if (args.length != 1) {
            throw new IllegalArgumentException("name the folder to write the sample into");
        }
        return new SampleFolder(Files.createDirectories(Path.of(args[0])));
    }

    /** Writes text files, given by name. */
    void write(Map<String, String> files) throws IOException {
        for (Map.Entry<String, String> file : files.entrySet()) {
            Files.writeString(path.resolve(file.getKey()), file.getValue());
        }
    }
}
