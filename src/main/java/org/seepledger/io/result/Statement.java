package org.seepledger.io.result;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.ledger.Disclaimer;

/**
 * What every table says of itself before its rows: what it is, from what, by which method and conventions, and the
 * disclaimer.
 *
 * @param title what it is
 * @param inputs the files that it rests on
 * @param origins where its terms come from
 * @param warnings what the reader must know
 */
public record Statement(String title, List<FileRecord> inputs, List<Provenance> origins, List<String> warnings) {

    /** How it was worked out, in a sentence. */
    public static final String METHOD = "Method: face flows of each cell as a lowest-order Raviart-Thomas field,"
            + " integrated exactly along the polygon's sides and lids; gross in and out are kept per boundary piece,"
            + " cell, well and interval.";

    /** What signs and totals mean. */
    public static final String SIGNS = "Signs: inflow and outflow are never negative; net = inflow - outflow; release"
            + " from storage counts as inflow, uptake as outflow; storage change = uptake - release;"
            + " residual = inflow - outflow - storage change; closure error = 100 x residual / throughput.";

    /** Copies the lists. */
    public Statement {
        inputs = List.copyOf(inputs);
        origins = List.copyOf(origins);
        warnings = List.copyOf(warnings);
    }

    /**
     * {@return the statement line by line, without line breaks in a line}
     */
    public List<String> lines() {
        List<String> lines = new ArrayList<>();
        lines.add(title);
        inputs.forEach(input -> lines.add("Input: " + input.name() + ", SHA-256 " + input.sha256()));
        origins.forEach(origin -> lines.add("Origin: " + origin));
        warnings.forEach(warning -> lines.add("Warning: " + warning));
        lines.add(METHOD);
        lines.add(SIGNS);
        Disclaimer.sentences().forEach(sentence -> lines.add("Disclaimer: " + sentence));
        return lines.stream().map(line -> line.replaceAll("\\p{Cntrl}+", " ")).toList();
    }
}
