package org.soakwright.planner.line;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.model.line.Order;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Unsound;

/** Lots as they go through the line: whole, in parts that vessels hold, or several together. */
final class Loads {
    /** Nobody cuts a lot into more. */
    private static final int MOST_PARTS = 200;

    private Loads() {}

    /**
     * Every lot for itself, in as few equal parts as fit.
     *
     * @throws Unsound with a problem for every lot that no vessel holds
     */
    static List<Load> alone(Line line) {
        List<Problem> problems = new ArrayList<>();
        List<Load> loads = new ArrayList<>();
        for (Order order : line.orders()) {
            int parts = parts(line, order);
            if (parts == 0) {
                problems.add(nowhere(line, order));
                continue;
            }
            double kg = order.mass().si() / parts;
            for (int part = 1; part <= parts; part++) {
                loads.add(new Load(
                        Route.weighing(order.recipe(), kg),
                        order.recipeFile(),
                        kg,
                        List.of(new Load.Share(order, part, parts, kg))));
            }
        }
        problems.addAll(alike(loads));
        if (!problems.isEmpty()) {
            throw new Unsound(problems);
        }
        return loads;
    }

    /** A lot may be called what a part of another is called. */
    private static List<Problem> alike(List<Load> loads) {
        Set<String> names = new HashSet<>();
        List<Problem> problems = new ArrayList<>();
        for (Load load : loads) {
            if (!names.add(load.name())) {
                problems.add(new Problem(
                        load.shares().get(0).order().place(),
                        "two loads would have one name: found " + Shown.quoted(load.name())
                                + ", which a part of another lot is called; give the lot another name"));
            }
        }
        return problems;
    }

    private static int parts(Line line, Order order) {
        for (int parts = 1; parts <= MOST_PARTS; parts++) {
            Recipe part = Route.weighing(order.recipe(), order.mass().si() / parts);
            if (Fitting.fits(part, line.vessels())) {
                return parts;
            }
        }
        return 0;
    }

    private static Problem nowhere(Line line, Order order) {
        Recipe least = Route.weighing(order.recipe(), order.mass().si() / MOST_PARTS);
        var groups = Fitting.groups(least, line.vessels());
        int step = 0;
        while (!groups.get(step).isEmpty()) {
            step++;
        }
        var written = order.recipe().steps().get(step);
        boolean stays = written.head().handling().stays()
                || (step + 1 < groups.size()
                        && order.recipe()
                                .steps()
                                .get(step + 1)
                                .head()
                                .handling()
                                .stays());
        return new Problem(
                order.place(),
                "no vessel holds lot " + Shown.quoted(order.lot()) + ", not even in " + MOST_PARTS + " parts: found "
                        + order.mass() + " for the " + written.kind() + " " + Shown.quoted(written.name()) + " of "
                        + order.recipeFile()
                        + (stays
                                ? "; one vessel has to serve all steps that the lot stays for, with room for each"
                                : "")
                        + "; give a vessel that serves it more usable volume or capacity, or the step less liquor");
    }

    /**
     * Small lots of one recipe together, as far as one load of them still fits: by due moment, and only where waiting for the last of them does
     * not make the first one late.
     *
     * @param least how long a load takes at least, s
     */
    static List<Load> together(Line line, List<Load> alone, double least) {
        Clock clock = Clock.of(line);
        Map<String, List<Load>> byRecipe = new TreeMap<>();
        List<Load> loads = new ArrayList<>();
        for (Load load : alone) {
            Load.Share share = load.shares().get(0);
            if (share.parts() > 1 || share.order().alone()) {
                loads.add(load);
            } else {
                byRecipe.computeIfAbsent(load.recipeFile(), any -> new ArrayList<>())
                        .add(load);
            }
        }
        for (List<Load> alike : byRecipe.values()) {
            List<Load> sorted = new ArrayList<>(alike);
            sorted.sort(Comparator.comparingLong((Load load) -> due(clock, load))
                    .thenComparingLong(load -> ready(clock, load))
                    .thenComparing(Load::name));
            Load open = null;
            for (Load load : sorted) {
                Load both = open == null ? null : joined(open, load);
                if (both != null
                        && Fitting.fits(both.recipe(), line.vessels())
                        && ready(clock, both) + least <= due(clock, both)) {
                    open = both;
                } else {
                    if (open != null) {
                        loads.add(open);
                    }
                    open = load;
                }
            }
            if (open != null) {
                loads.add(open);
            }
        }
        // Names that cannot be told apart are worth less than a shared load.
        return alike(loads).isEmpty() ? loads : alone;
    }

    private static Load joined(Load one, Load other) {
        double kg = one.kg() + other.kg();
        List<Load.Share> shares = new ArrayList<>(one.shares());
        shares.addAll(other.shares());
        return new Load(Route.weighing(one.recipe(), kg), one.recipeFile(), kg, shares);
    }

    static long ready(Clock clock, Load load) {
        return load.shares().stream()
                .mapToLong(share -> clock.seconds(share.order().ready()))
                .max()
                .orElse(0);
    }

    private static long due(Clock clock, Load load) {
        return load.shares().stream()
                .mapToLong(share -> share.order().due() == null
                        ? Long.MAX_VALUE / 4
                        : clock.seconds(share.order().due()))
                .min()
                .orElse(Long.MAX_VALUE / 4);
    }
}
