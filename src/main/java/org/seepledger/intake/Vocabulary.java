package org.seepledger.intake;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Words of the trade, and what they say values are. */
final class Vocabulary {

    /** Longer phrases first, since they say more than the words in them. */
    private static final Map<String, Role> PHRASES = phrases();

    private static final Set<String> SURFACES =
            Set.of("surface", "surfaces", "interface", "interfaces", "horizons", "elevation", "elevations", "elev");

    private Vocabulary() {}

    /**
     * What words say.
     *
     * @param role the role
     * @param phrase the words that say it
     */
    record Said(Role role, String phrase) {}

    private static Map<String, Role> phrases() {
        Map<String, Role> phrases = new LinkedHashMap<>();
        put(phrases, Role.ACTIVE, "active cells", "active", "inactive", "mask", "domain", "extent");
        put(phrases, Role.EFFECTIVE_POROSITY, "effective porosity", "porosity effective", "ne");
        put(phrases, Role.POROSITY, "total porosity", "porosity", "poro", "por");
        put(phrases, Role.BULK_DENSITY, "bulk density", "dry density", "density", "rhob");
        put(phrases, Role.SPECIFIC_YIELD, "specific yield", "drainable porosity", "sy");
        put(phrases, Role.SPECIFIC_STORAGE, "specific storage", "spec storage", "ss");
        put(phrases, Role.STORATIVITY, "storage coefficient", "storativity");
        put(phrases, Role.SUPPLIED, "storage change", "change in storage", "storage release", "release");
        put(
                phrases,
                Role.VERTICAL_CONDUCTIVITY,
                "vertical hydraulic conductivity",
                "vertical conductivity",
                "conductivity vertical",
                "conductivity z",
                "k vertical",
                "kvert",
                "kv",
                "kz");
        put(phrases, Role.CONDUCTIVITY_Y, "conductivity y", "ky");
        put(
                phrases,
                Role.CONDUCTIVITY,
                "hydraulic conductivity",
                "horizontal conductivity",
                "conductivity",
                "permeability",
                "hydcond",
                "kf",
                "kh",
                "kx",
                "kxy",
                "k");
        put(
                phrases,
                Role.FLUX_X,
                "specific discharge x",
                "darcy flux x",
                "flux x",
                "darcy x",
                "discharge x",
                "x flux",
                "qx",
                "ux");
        put(
                phrases,
                Role.FLUX_Y,
                "specific discharge y",
                "darcy flux y",
                "flux y",
                "darcy y",
                "discharge y",
                "y flux",
                "qy",
                "uy");
        put(
                phrases,
                Role.FLUX_Z,
                "specific discharge z",
                "darcy flux z",
                "flux z",
                "darcy z",
                "discharge z",
                "z flux",
                "qz",
                "uz");
        put(phrases, Role.FLOW_EAST, "flow east", "east face", "east", "flow right", "qeast");
        put(phrases, Role.FLOW_NORTH, "flow north", "north face", "north", "qnorth");
        put(phrases, Role.FLOW_WEST, "flow west", "west face", "west", "qwest");
        put(phrases, Role.FLOW_SOUTH, "flow south", "south face", "south", "qsouth");
        put(phrases, Role.FLOW_UP, "flow up", "upper face", "up", "qup");
        put(phrases, Role.FLOW_DOWN, "flow down", "lower face", "down", "qdown");
        put(
                phrases,
                Role.POINTS,
                "wells",
                "well",
                "boreholes",
                "borehole",
                "bores",
                "pumping",
                "abstraction",
                "abstractions",
                "extraction",
                "withdrawal",
                "withdrawals",
                "injection",
                "pumpage",
                "waterworks");
        put(
                phrases,
                Role.AREAL,
                "recharge",
                "rech",
                "infiltration",
                "percolation",
                "evapotranspiration",
                "evaporation",
                "transpiration",
                "et",
                "irrigation",
                "precipitation",
                "rainfall");
        put(
                phrases,
                Role.CELLS,
                "river",
                "rivers",
                "stream",
                "streams",
                "lake",
                "drain",
                "drains",
                "drainage",
                "exchange",
                "seepage",
                "leakage",
                "spring",
                "springs",
                "leak",
                "canal",
                "ditch",
                "ditches",
                "inflow",
                "outflow");
        put(
                phrases,
                Role.CONCENTRATION,
                "concentration",
                "concentrations",
                "conc",
                "chloride",
                "nitrate",
                "sulfate",
                "sulphate",
                "solvent",
                "solute",
                "tracer",
                "salinity",
                "tds",
                "ammonium",
                "sodium");
        put(
                phrases,
                Role.HEAD,
                "hydraulic head",
                "water table",
                "watertable",
                "water level",
                "groundwater level",
                "piezometric head",
                "potentiometric",
                "piezometric",
                "heads",
                "head",
                "waterlevel",
                "gwl",
                "hydhead",
                "h");
        put(
                phrases,
                Role.TOP,
                "ground surface",
                "land surface",
                "ground level",
                "ground",
                "terrain",
                "topography",
                "dem",
                "dtm",
                "surface",
                "surfaces",
                "interfaces",
                "interface",
                "horizons",
                "elevation",
                "elevations",
                "elev",
                "tops",
                "top");
        put(phrases, Role.BOTTOM, "bottoms", "bottom", "base", "bedrock", "basement", "floor", "bot", "botm", "rock");
        return phrases;
    }

    private static void put(Map<String, Role> phrases, Role role, String... said) {
        for (String phrase : said) {
            phrases.put(phrase, role);
        }
    }

    /** {@return whether a name speaks of surfaces between layers without saying which} */
    static boolean saysSurfaces(String name) {
        List<String> words = words(name);
        return words.stream().anyMatch(SURFACES::contains)
                && words.stream().noneMatch(Set.of("ground", "land")::contains);
    }

    /** {@return a heading without what stands in brackets at its end} */
    static String withoutUnit(String heading) {
        return heading.replaceAll("\\s*[\\[(][^\\[(]*[\\])]\\s*$", "");
    }

    /** {@return the words of a name, in lower case: letters apart from digits, and {@code bigWords} apart} */
    static List<String> words(String name) {
        String apart = name.replaceAll("(\\p{Lower})(\\p{Upper})", "$1 $2").toLowerCase(Locale.ROOT);
        List<String> words = new ArrayList<>();
        for (String word : apart.split("[^\\p{L}]+")) {
            if (!word.isEmpty()) {
                words.add(word);
            }
        }
        return words;
    }

    /** {@return what a name says, if it says anything; the longest phrase, and of two as long the later one in the name} */
    static Optional<Said> of(String name) {
        String text = " " + String.join(" ", words(name)) + " ";
        Said best = null;
        int length = 0;
        int at = 0;
        for (Map.Entry<String, Role> entry : PHRASES.entrySet()) {
            int found = text.lastIndexOf(" " + entry.getKey() + " ");
            int words = (int) Arrays.stream(entry.getKey().split(" ")).count();
            boolean clear = entry.getKey().length() > 2;
            int weight = 2 * words + (clear ? 1 : 0);
            if (found >= 0 && (weight > length || weight == length && found > at)) {
                best = new Said(entry.getValue(), entry.getKey());
                length = weight;
                at = found;
            }
        }
        return Optional.ofNullable(best);
    }
}
