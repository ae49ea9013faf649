package org.soakwright.recipes.parsing;

import static java.util.Map.entry;

import java.util.List;
import java.util.Map;

/**
 * Which keys may stand where. The JSON Schema has a definition of the same name for each, with the same keys; a test
 * holds the two together.
 */
enum Section {
    RECIPE(
            "a recipe",
            List.of(
                    "language",
                    "title",
                    "product",
                    "lot",
                    "species",
                    "between",
                    "steps",
                    "targets",
                    "minimise",
                    "prices"),
            List.of("measured", "confidence")),
    LOT(
            "a lot",
            List.of("mass", "volume", "count", "containers", "density", "temperature", "pieces", "spread"),
            List.of("moisture")),
    CONTAINERS("containers", List.of("count", "each"), List.of()),
    GRADE(
            "a grade",
            List.of(
                    "name",
                    "shape",
                    "thickness",
                    "width",
                    "length",
                    "diameter",
                    "proportions",
                    "measured",
                    "weight",
                    "spread",
                    "faces",
                    "share"),
            List.of("moisture")),
    MEASURED("a measured list", List.of("file", "grades"), List.of()),
    FACES("faces", List.of("thickness", "width", "length"), List.of()),
    ONE_SPECIES(
            "a species",
            List.of("start", "diffusivity", "partition", "exchanges-with"),
            List.of("skin", "moisture", "gain", "per", "measured")),
    START("a start", List.of("value", "varies"), List.of("give-or-take")),
    PROFILE("a start", List.of("profile"), Later.OF_VALUES),
    DIFFUSIVITY(
            "a diffusivity",
            List.of("value", "at", "activation-energy", "varies"),
            List.of("give-or-take", "from", "measured")),
    GRAIN(
            "a diffusivity by direction",
            List.of("along", "across", "thickness", "width", "length", "varies"),
            List.of("give-or-take")),
    DIRECTION(
            "the diffusivity in a direction",
            List.of("value", "at", "activation-energy"),
            List.of("give-or-take", "from", "measured")),
    STEP_GRAIN(
            "a diffusivity by direction in a step",
            List.of("along", "across", "thickness", "width", "length"),
            List.of("give-or-take")),
    VALUE("a value", List.of("value"), Later.OF_VALUES),
    TIME_BETWEEN("a free time", List.of("from", "to", "grain", "planned"), Later.OF_VALUES),
    TIME_ANY_OF("a free time", List.of("any-of", "planned"), Later.OF_VALUES),
    SOAK(
            "a soak",
            List.of("soak", "liquor", "temperature", "film", "drag-out", "time", "diffusivity", "partition", "prices"),
            Later.OF_STEPS),
    RINSE(
            "a rinse",
            List.of(
                    "rinse",
                    "liquor",
                    "fills",
                    "temperature",
                    "film",
                    "drag-out",
                    "time",
                    "diffusivity",
                    "partition",
                    "prices"),
            Later.OF_STEPS),
    REST("a rest", List.of("rest", "temperature", "time", "diffusivity"), Later.OF_STEPS),
    DRY("a dry step", List.of("dry", "air", "film", "temperature", "time", "diffusivity"), Later.OF_STEPS),
    SOAK_LIQUOR(
            "the liquor of a soak",
            List.of("volume", "ratio", "density", "others"),
            List.of("gain", "moisture", "measured")),
    RINSE_LIQUOR(
            "the liquor of a rinse",
            List.of("volume", "ratio", "flow", "density", "others"),
            List.of("gain", "moisture", "measured")),
    AIR("air", List.of("equilibrium"), List.of("temperature", "humidity", "speed", "moisture")),
    FILM("a film", List.of("coefficient"), List.of("still", "speed", "stirred", "packed", "skin")),
    BY_SPECIES("this list of species", List.of(), List.of()),
    PIECE_TARGET(
            "a target",
            List.of("species", "reading", "at-most", "at-least", "of", "grade", "after", "share"),
            List.of("confidence", "phase", "gain", "per", "moisture", "measured")),
    LIQUOR_TARGET(
            "a liquor target",
            List.of("liquor", "species", "reading", "at-most", "at-least"),
            List.of("confidence", "phase")),
    TOTAL_TARGET("a target on a total", List.of("total", "at-most"), List.of("confidence")),
    PRICES("prices", List.of("time", "liquor"), List.of()),
    STEP_PRICES("the prices of a step", List.of("liquor", "supply", "disposal"), List.of()),
    LIQUOR_PRICE("a liquor price", List.of("supply", "disposal"), List.of());

    /** Keys of a right name in the wrong place, and where they belong. */
    private static final Map<String, String> HOMES = Map.ofEntries(
            entry("fills", "the rinse itself, beside its liquor"),
            entry("flow", "the liquor of a rinse"),
            entry("liquor", "a soak or a rinse"),
            entry("film", "a soak, a rinse or a dry step"),
            entry("drag-out", "a soak or a rinse"),
            entry("partition", "a soak, a rinse or a species"),
            entry("prices", "the recipe, a soak or a rinse"),
            entry("air", "a dry step"),
            entry("density", "the lot or a liquor"),
            entry("share", "a grade or a target on pieces"),
            entry("spread", "the lot or a grade"),
            entry("weight", "a grade"),
            entry("measured", "a grade"),
            entry("varies", "a start of one content or a species' diffusivity as a whole"),
            entry("soak", "a step of its own"),
            entry("rinse", "a step of its own"),
            entry("rest", "a step of its own"),
            entry("dry", "a step of its own"));

    private final String label;

    @SuppressWarnings("ImmutableEnumChecker") // only ever a List.of
    private final List<String> keys;

    @SuppressWarnings("ImmutableEnumChecker") // only ever a List.of
    private final List<String> later;

    Section(String label, List<String> keys, List<String> later) {
        this.label = label;
        this.keys = keys;
        this.later = later;
    }

    /** With its article, for messages. */
    String label() {
        return label;
    }

    /** Every key that means something here. */
    List<String> keys() {
        return keys;
    }

    /** Keys of the language that this version cannot compute here. */
    List<String> later() {
        return later;
    }

    /** Where a key that is unknown here belongs; empty for one that is unknown everywhere. */
    static String home(String key) {
        return HOMES.getOrDefault(key, "");
    }

    private static final class Later {
        static final List<String> OF_VALUES = List.of("give-or-take", "varies");
        static final List<String> OF_STEPS = List.of(
                "stays", "changeover", "attended", "hold-at-most", "skin", "humidity", "speed", "gain", "measured");

        private Later() {}
    }
}
