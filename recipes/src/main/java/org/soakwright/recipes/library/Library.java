package org.soakwright.recipes.library;

import java.util.Collection;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Unsound;

/**
 * Published property values, each with its source. Sources that differ stand side by side; none is preferred here. Nothing is
 * read before {@link #load}.
 */
public final class Library {
    /** A data file for each field. */
    static final List<String> FILES = List.of(
            "food.yaml",
            "gels.yaml",
            "polymers.yaml",
            "building.yaml",
            "wood.yaml",
            "resins.yaml",
            "water.yaml",
            "air.yaml");

    private final Map<String, Entry> entries;

    private Library(Map<String, Entry> entries) {
        this.entries = Collections.unmodifiableMap(entries);
    }

    /** Reads the whole library, at every call; keep what it returns. */
    public static Library load() {
        return Shelf.sound(() -> of(FILES.stream().map(Shelf::source).toList()));
    }

    /**
     * Reads files of entries.
     *
     * @throws Unsound with every problem found in them
     */
    static Library of(List<Source> sources) {
        Problems problems = new Problems();
        Map<String, Entry> entries = new LinkedHashMap<>();
        for (Source source : sources) {
            List<Entry> read = problems.attempt(() -> new EntryReader(problems).entries(Shelf.tree(source)));
            for (Entry entry : read == null ? List.<Entry>of() : read) {
                Entry first = entries.putIfAbsent(entry.name(), entry);
                if (first != null) {
                    problems.add(
                            entry.place(),
                            "two entries have one name: found " + entry.name() + " at " + first.place()
                                    + " already; rename one");
                }
            }
        }
        if (!problems.isEmpty()) {
            throw new Unsound(problems.sorted());
        }
        return new Library(entries);
    }

    /** In the order of the files. */
    public Collection<Entry> entries() {
        return entries.values();
    }

    /** The entry of the name. */
    public Optional<Entry> find(String name) {
        return Optional.ofNullable(entries.get(name));
    }

    /** For a name that is not found: {@code did you mean "salt-in-feta"?}, or whatever is nearest. */
    public String hint(String name) {
        return Nearest.of(name, entries.keySet())
                .map(nearest -> "did you mean \"" + nearest + "\"?")
                .orElse("the library is empty");
    }

    /** Every other entry of the same species in the same material: what other sources, or the same one, say of it. */
    public List<Entry> alike(Entry entry) {
        return entries.values().stream()
                .filter(other ->
                        other.subject().species().equals(entry.subject().species()))
                .filter(other ->
                        other.subject().material().equals(entry.subject().material()))
                .filter(other -> !other.equals(entry))
                .toList();
    }
}
