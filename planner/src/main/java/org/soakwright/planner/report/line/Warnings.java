package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.regex.Pattern;
import org.soakwright.planner.batch.Cautions;
import org.soakwright.planner.line.LoadPlan;

/**
 * The cautions of every load with its real times: what is due of a recipe planned alone may differ from what is due of a lot that waited. Those
 * that differ in how long something lasts only are told once, of the first load.
 */
final class Warnings {
    private static final Pattern LASTING = Pattern.compile("(?:\\d+(?:\\.\\d+)? (?:d|h|min|s)\\b ?)+");
    private static final int MOST_NAMED = 3;

    private final List<LoadPlan> all;
    private final IdentityHashMap<LoadPlan, Cautions> own = new IdentityHashMap<>();

    Warnings(List<LoadPlan> loads) {
        all = loads;
        loads.forEach(load -> own.put(load, Cautions.of(load.run())));
    }

    /**
     * A caution and whose it is.
     *
     * @param words of the first of the loads
     */
    record Warning(String words, List<LoadPlan> loads) {}

    Cautions of(LoadPlan load) {
        return own.getOrDefault(load, new Cautions(List.of(), List.of()));
    }

    List<Warning> shown() {
        return told(Cautions::shown);
    }

    /** Those that forbid to use the plan until somebody answers for it. */
    List<Warning> stops() {
        return told(Cautions::stops);
    }

    private List<Warning> told(Function<Cautions, List<String>> which) {
        Map<String, Warning> told = new LinkedHashMap<>();
        for (LoadPlan load : all) {
            for (String words : which.apply(of(load))) {
                String key = LASTING.matcher(words).replaceAll("");
                told.computeIfAbsent(key, any -> new Warning(words, new ArrayList<>()))
                        .loads()
                        .add(load);
            }
        }
        return List.copyOf(told.values());
    }

    /** Whose it is, where it is not everybody's: {@code Thin loins: }, {@code L1, L4 and 2 more: }. */
    String whose(Warning warning, Function<String, String> title) {
        if (warning.loads().size() == all.size()) {
            return "";
        }
        List<String> files = files(warning.loads());
        long ofThese = all.stream()
                .filter(load -> files.contains(load.load().recipeFile()))
                .count();
        if (ofThese == warning.loads().size()) {
            return String.join(", ", files.stream().map(title).toList()) + ": ";
        }
        List<String> names =
                warning.loads().stream().map(load -> load.load().name()).toList();
        int more = names.size() - MOST_NAMED;
        return (more <= 0
                        ? String.join(", ", names)
                        : String.join(", ", names.subList(0, MOST_NAMED)) + " and " + more + " more")
                + ": ";
    }

    static List<String> files(List<LoadPlan> loads) {
        return loads.stream().map(load -> load.load().recipeFile()).distinct().toList();
    }
}
