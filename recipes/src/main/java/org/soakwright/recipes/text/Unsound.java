package org.soakwright.recipes.text;

import java.io.Serial;
import java.util.List;

/** Thrown by a constructor of the model that cannot hold what it was given; carries every problem it saw. */
public final class Unsound extends IllegalArgumentException {
    @Serial
    private static final long serialVersionUID = 1L;

    private final transient List<Problem> problems;

    public Unsound(List<Problem> problems) {
        super(problems.toString());
        this.problems = List.copyOf(problems);
    }

    public Unsound(Place place, String what) {
        this(List.of(new Problem(place, what)));
    }

    public List<Problem> problems() {
        return problems;
    }
}
