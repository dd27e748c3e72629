package org.seepledger.io.aquifer;

import org.seepledger.io.table.StepKind;

/** Names of rasters with placeholders: {@code {layer}} and {@code {interval}} count from 1, {@code {instant}} from 0. */
final class FileName {

    private static final String LAYER = "{layer}";
    private static final String INTERVAL = "{interval}";
    private static final String INSTANT = "{instant}";

    private FileName() {}

    static String of(String name, int layer, int step) {
        return name.replace(LAYER, String.valueOf(layer + 1))
                .replace(INTERVAL, String.valueOf(step + 1))
                .replace(INSTANT, String.valueOf(step));
    }

    static boolean layered(String name) {
        return name.contains(LAYER);
    }

    static boolean changes(String name) {
        return name.contains(INTERVAL) || name.contains(INSTANT);
    }

    /** A placeholder that has no meaning for a quantity of these steps; empty if there is none. */
    static String misplaced(String name, StepKind steps) {
        String rest = name.replace(LAYER, "");
        rest = steps == StepKind.INTERVAL ? rest.replace(INTERVAL, "") : rest;
        rest = steps == StepKind.INSTANT ? rest.replace(INSTANT, "") : rest;
        int from = rest.indexOf('{');
        int to = rest.indexOf('}', from + 1);
        return from < 0 ? "" : rest.substring(from, to < 0 ? rest.length() : to + 1);
    }
}
