package org.soakwright.recipes.parsing;

import static java.util.Map.entry;

import java.util.List;
import java.util.Map;

/**
 * Which keys may stand where in the file of a line. Its JSON Schema has a definition of the same name for each, with the same
 * keys; a test holds the two together.
 */
enum LineSection implements Keys {
    LINE("a line", "language", "title", "starts", "zone", "vessels", "crew", "moves", "utilities", "lots", "minimise"),
    VESSELS("the vessels"),
    VESSEL("a vessel", "count", "serves", "volume", "capacity", "turnaround", "outages", "draws"),
    VESSEL_VOLUME("the volume of a vessel", "gross", "usable"),
    OUTAGE("an outage", "vessel", "from", "to", "reason"),
    DRAWS("what a vessel draws"),
    UTILITIES("the utilities"),
    CREW("a crew", "hours", "except", "night"),
    HOURS("hours", "days", "from", "to", "heads", "breaks"),
    BREAK("a break", "from", "to"),
    EXCEPT("an exceptional day", "date", "through", "closed", "from", "to", "heads", "breaks"),
    NIGHT("a night", "from", "to"),
    MOVES("moves", "takes", "at-once", "heads", "hangs-at-most"),
    ORDER("a lot of a line", "lot", "recipe", "mass", "ready", "due", "priority", "alone");

    /** Keys of a right name in the wrong place, and where they belong. */
    private static final Map<String, String> HOMES = Map.ofEntries(
            entry("serves", "a vessel"),
            entry("volume", "a vessel"),
            entry("capacity", "a vessel"),
            entry("turnaround", "a vessel"),
            entry("outages", "a vessel"),
            entry("draws", "a vessel"),
            entry("gross", "the volume of a vessel"),
            entry("usable", "the volume of a vessel"),
            entry("hours", "the crew"),
            entry("except", "the crew"),
            entry("night", "the crew"),
            entry("days", "the hours of the crew"),
            entry("breaks", "the hours of the crew or an exceptional day"),
            entry("heads", "the hours of the crew, an exceptional day or moves"),
            entry("closed", "an exceptional day of the crew"),
            entry("takes", "moves"),
            entry("at-once", "moves"),
            entry("hangs-at-most", "moves"),
            entry("ready", "a lot"),
            entry("due", "a lot"),
            entry("priority", "a lot"),
            entry("alone", "a lot"),
            entry("steps", "a recipe"),
            entry("species", "a recipe"),
            entry("targets", "a recipe"),
            entry("prices", "a recipe"),
            entry("stays", "a step of a recipe"),
            entry("changeover", "a step of a recipe"),
            entry("attended", "a step of a recipe"),
            entry("hold-at-most", "a step of a recipe"));

    private final String label;

    @SuppressWarnings("ImmutableEnumChecker") // only ever a List.of
    private final List<String> keys;

    LineSection(String label, String... keys) {
        this.label = label;
        this.keys = List.of(keys);
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
        return List.of();
    }

    @Override
    public String home(String key) {
        return HOMES.getOrDefault(key, "");
    }
}
