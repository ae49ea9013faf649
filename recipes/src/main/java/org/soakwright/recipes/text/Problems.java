package org.soakwright.recipes.text;

import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;

/** The problems of one file, each kept once. */
public final class Problems {
    private final Set<Problem> seen = new LinkedHashSet<>();

    public void add(Place place, String what) {
        seen.add(new Problem(place, what));
    }

    public void unknownKey(Place place, String what) {
        seen.add(new Problem(place, Problem.Rank.UNKNOWN_KEY, what));
    }

    public void addAll(Collection<Problem> problems) {
        seen.addAll(problems);
    }

    /** What the supplier makes; or null, with its problems added, where it cannot. */
    public <T> @Nullable T attempt(Supplier<T> supplier) {
        try {
            return supplier.get();
        } catch (Unsound unsound) {
            addAll(unsound.problems());
            return null;
        }
    }

    public boolean isEmpty() {
        return seen.isEmpty();
    }

    /** Unknown keys first, then in the order of the file. */
    public List<Problem> sorted() {
        return seen.stream().sorted().toList();
    }
}
