package org.soakwright.planner.line.verify;

import java.util.ArrayList;
import java.util.List;

/** Whatever was found, a sentence each, in the order in which it was found. */
final class Faults {
    private final List<String> all = new ArrayList<>();

    void add(String sentence) {
        if (!all.contains(sentence)) {
            all.add(sentence);
        }
    }

    boolean isEmpty() {
        return all.isEmpty();
    }

    List<String> all() {
        return List.copyOf(all);
    }
}
