package org.soakwright.recipes.library;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Unsound;

/** The usual cautions, each with its source. Nothing is read before {@link #load}. */
public final class CautionBook {
    private static final String FILE = "cautions.yaml";

    private final Map<String, Caution> cautions;

    private CautionBook(Map<String, Caution> cautions) {
        this.cautions = cautions;
    }

    /** Reads the book, at every call; keep what it returns. */
    public static CautionBook load() {
        return Shelf.sound(() -> of(Shelf.source(FILE)));
    }

    /**
     * Reads a file of cautions.
     *
     * @throws Unsound with every problem found in it
     */
    static CautionBook of(Source source) {
        Problems problems = new Problems();
        Map<String, Caution> cautions = new LinkedHashMap<>();
        List<Caution> read = problems.attempt(() -> new CautionReader(problems).cautions(Shelf.tree(source)));
        for (Caution caution : read == null ? List.<Caution>of() : read) {
            cautions.put(caution.id(), caution);
        }
        if (!problems.isEmpty()) {
            throw new Unsound(problems.sorted());
        }
        return new CautionBook(cautions);
    }

    /** In the order of the file. */
    public List<Caution> all() {
        return new ArrayList<>(cautions.values());
    }

    public Optional<Caution> find(String id) {
        return Optional.ofNullable(cautions.get(id));
    }

    /** Those that are due, in the order of the file. */
    public List<Caution> due(Facts facts) {
        return cautions.values().stream()
                .filter(caution -> caution.isDue(facts))
                .toList();
    }

    /** Those that forbid to use the plan as it stands; empty for a plan that may be used. */
    public List<Caution> stopping(Facts facts) {
        return cautions.values().stream()
                .filter(caution -> caution.stops(facts))
                .toList();
    }
}
