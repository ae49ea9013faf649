package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.soakwright.recipes.text.Problem;

/** The rule that things of a kind have different names. */
public final class Names {
    private Names() {}

    /** A problem at each name that stood before. */
    public static List<Problem> duplicates(String what, List<Reference> names) {
        Set<String> seen = new HashSet<>();
        List<Problem> problems = new ArrayList<>();
        for (Reference reference : names) {
            if (!seen.add(reference.name())) {
                problems.add(new Problem(
                        reference.place(),
                        "two " + what + " have one name: found \"" + reference + "\" again; give each its own"));
            }
        }
        return problems;
    }
}
