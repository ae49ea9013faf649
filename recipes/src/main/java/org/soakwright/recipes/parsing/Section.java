package org.soakwright.recipes.parsing;

import static java.util.Map.entry;

import java.util.List;
import java.util.Map;

/**
 * Which keys may stand where. The JSON Schema has a definition of the same name for each, with the same keys; a test
 * holds the two together.
 */
enum Section implements Keys {
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
                    "prices",
                    "confidence",
                    "allowed-by"),
            List.of("measured")),
    LOT(
            "a lot",
            List.of(
                    "mass",
                    "volume",
                    "count",
                    "containers",
                    "density",
                    "temperature",
                    "thermal-diffusivity",
                    "moisture",
                    "pieces",
                    "spread"),
            List.of()),
    MOISTURE("a moisture", List.of("start", "end"), List.of()),
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
            List.of()),
    MEASURED("a measured list", List.of("file", "grades"), List.of()),
    FACES("faces", List.of("thickness", "width", "length"), List.of()),
    ONE_SPECIES(
            "a species",
            List.of(
                    "start",
                    "diffusivity",
                    "partition",
                    "exchanges-with",
                    "substance",
                    "molar-mass",
                    "in-liquor",
                    "skin"),
            List.of("measured")),
    START("a start", List.of("value", "per", "varies", "give-or-take"), List.of()),
    PROFILE("a start", List.of("profile"), List.of("varies")),
    DIFFUSIVITY(
            "a diffusivity",
            List.of("value", "at", "activation-energy", "scaling", "points", "from", "give-or-take", "varies"),
            List.of("measured")),
    GRAIN(
            "a diffusivity by direction",
            List.of("along", "across", "thickness", "width", "length", "varies"),
            List.of()),
    DIRECTION("the diffusivity in a direction", Forms.OF_DIFFUSIVITIES, List.of("measured")),
    IN_LIQUOR("the diffusivity in the liquor", Forms.OF_DIFFUSIVITIES, List.of("measured")),
    STEP_GRAIN(
            "a diffusivity by direction in a step",
            List.of("along", "across", "thickness", "width", "length"),
            List.of()),
    PARTITION("a partition", List.of("value", "from", "give-or-take"), List.of("measured")),
    SKIN("a skin", List.of("permeance", "face"), List.of()),
    BY_GRADE("the skin of each grade", List.of(), List.of()),
    VALUE("a value", List.of("value"), List.of("varies")),
    KNOWN("a value", List.of("value", "give-or-take"), List.of("varies")),
    TIME_BETWEEN("a free time", List.of("from", "to", "grain", "planned"), List.of("varies")),
    TIME_ANY_OF("a free time", List.of("any-of", "planned"), List.of("varies")),
    SOAK(
            "a soak",
            List.of(
                    "soak",
                    "liquor",
                    "temperature",
                    "film",
                    "drag-out",
                    "time",
                    "gain",
                    "diffusivity",
                    "partition",
                    "prices",
                    "stays",
                    "changeover",
                    "attended",
                    "hold-at-most"),
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
                    "gain",
                    "diffusivity",
                    "partition",
                    "prices",
                    "stays",
                    "changeover",
                    "attended",
                    "hold-at-most"),
            Later.OF_STEPS),
    REST(
            "a rest",
            List.of(
                    "rest",
                    "temperature",
                    "time",
                    "gain",
                    "diffusivity",
                    "stays",
                    "changeover",
                    "attended",
                    "hold-at-most"),
            Later.OF_STEPS),
    DRY(
            "a dry step",
            List.of(
                    "dry",
                    "air",
                    "film",
                    "temperature",
                    "time",
                    "gain",
                    "diffusivity",
                    "stays",
                    "changeover",
                    "attended",
                    "hold-at-most"),
            Later.OF_STEPS),
    CHANGEOVER("a changeover", List.of("drain", "refill"), List.of("measured")),
    SOAK_LIQUOR("the liquor of a soak", List.of("volume", "ratio", "density", "others"), List.of("measured")),
    RINSE_LIQUOR("the liquor of a rinse", List.of("volume", "ratio", "flow", "density", "others"), List.of("measured")),
    AIR("air", List.of("equilibrium"), List.of("temperature", "humidity", "speed")),
    EQUILIBRIUM("an equilibrium", List.of("value", "per", "give-or-take"), List.of()),
    FILM("a film", List.of("coefficient", "still", "speed", "stirred", "packed", "length"), List.of()),
    STIRRED("a stirred liquor", List.of("power"), List.of()),
    PACKED("a packed bed", List.of("speed", "void"), List.of()),
    BY_SPECIES("this list of species", List.of(), List.of()),
    PIECE_TARGET(
            "a target",
            List.of(
                    "species",
                    "reading",
                    "at-most",
                    "at-least",
                    "of",
                    "per",
                    "phase",
                    "grade",
                    "after",
                    "share",
                    "confidence"),
            List.of("measured")),
    LIQUOR_TARGET(
            "a liquor target", List.of("liquor", "species", "reading", "at-most", "at-least", "confidence"), List.of()),
    MASS_TARGET(
            "a target on the mass", List.of("total", "at-most", "at-least", "of", "after", "confidence"), List.of()),
    TOTAL_TARGET("a target on a total", List.of("total", "at-most"), List.of()),
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
            entry("give-or-take", "a value that is measured"),
            entry("skin", "a species"),
            entry("substance", "a species"),
            entry("molar-mass", "a species"),
            entry("in-liquor", "a species"),
            entry("moisture", "the lot"),
            entry("thermal-diffusivity", "the lot"),
            entry("gain", "a step"),
            entry("stays", "a step"),
            entry("changeover", "a step"),
            entry("attended", "a step"),
            entry("hold-at-most", "a step"),
            entry("drain", "the changeover of a step"),
            entry("refill", "the changeover of a step"),
            entry("per", "a start, an equilibrium or a target on pieces"),
            entry("phase", "a target on pieces"),
            entry("confidence", "the recipe, or a target on pieces, a liquor or the mass"),
            entry("allowed-by", "the recipe"),
            entry("scaling", "a diffusivity of a species"),
            entry("points", "a diffusivity of a species"),
            entry("at", "a diffusivity of a species"),
            entry("activation-energy", "a diffusivity of a species"),
            entry("still", "a film"),
            entry("speed", "a film"),
            entry("stirred", "a film"),
            entry("packed", "a film"),
            entry("power", "a film that is stirred"),
            entry("void", "a film that is packed"),
            entry("coefficient", "a film"),
            entry("varies", "a start of one content or a species' diffusivity as a whole"),
            entry("soak", "a step of its own"),
            entry("rinse", "a step of its own"),
            entry("rest", "a step of its own"),
            entry("dry", "a step of its own"),
            entry("vessels", "the file of a line"),
            entry("crew", "the file of a line"),
            entry("moves", "the file of a line"),
            entry("lots", "the file of a line"));

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

    @Override
    public String label() {
        return label;
    }

    @Override
    public List<String> keys() {
        return keys;
    }

    @Override
    public List<String> later() {
        return later;
    }

    @Override
    public String home(String key) {
        return HOMES.getOrDefault(key, "");
    }

    private static final class Later {
        static final List<String> OF_STEPS = List.of("measured");

        private Later() {}
    }

    private static final class Forms {
        static final List<String> OF_DIFFUSIVITIES =
                List.of("value", "at", "activation-energy", "scaling", "points", "from", "give-or-take");

        private Forms() {}
    }
}
