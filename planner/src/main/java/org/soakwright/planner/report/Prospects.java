package org.soakwright.planner.report;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.soakwright.planner.batch.EachGrade;
import org.soakwright.planner.batch.Outlook;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.doubt.Chance;
import org.soakwright.planner.batch.doubt.Shares;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Target;

/** How sure a run is where values are not known exactly, and which of them to measure first. */
final class Prospects {
    /** Targets whose values are worth measuring, and values named of each. */
    private static final int MOST_TARGETS = 3;

    private static final int MOST_VALUES = 3;

    /** Less of the variance is not worth measuring. */
    private static final double TELLING = 0.01;

    private Prospects() {}

    /** One sentence for the answer; empty where everything is taken as exact or the recipe states no target. */
    static Optional<String> sentence(Run run) {
        return outlook(run)
                .map(outlook -> (outlook.prospects().size() == 1 ? "Its target is" : "All targets together are")
                        + " met with a chance of " + words(outlook.all())
                        + ", as far as the recipe says how well its values are known.");
    }

    private static Optional<Outlook> outlook(Run run) {
        return run.outlook().filter(outlook -> !outlook.prospects().isEmpty());
    }

    /** Chances and percentiles of every target, then what to measure. */
    static List<Section> sections(Run run, boolean planned) {
        List<Section> sections = new ArrayList<>();
        outlook(run).ifPresent(outlook -> {
            sections.add(Section.of(Findings.CHANCES, "How sure", chances(run, outlook), notes(outlook, planned)));
            Table measure = measure(run.batch().recipe(), outlook);
            if (!measure.isEmpty()) {
                sections.add(Section.of(
                        Findings.MEASURE,
                        "What to measure first",
                        measure,
                        List.of("Part of the variance that the value makes alone, and what would remain of the standard"
                                + " deviation if it were known. Of readings above zero the logarithm is looked at.")));
            }
        });
        return sections;
    }

    /** Under a heading for each target, since its name and limit are long and its grades are few. */
    private static Table chances(Run run, Outlook outlook) {
        Table table = new Table().text("Of").number("Chance");
        for (double level : Outlook.LEVELS) {
            table.number(percent(level) + " read");
        }
        Recipe recipe = run.batch().recipe();
        String heading = "";
        for (Outlook.Prospect one : outlook.prospects()) {
            String own = name(recipe, one) + limit(run, one);
            if (!own.equals(heading)) {
                table.heading(own);
                heading = own;
            }
            List<String> cells = new ArrayList<>(List.of(where(one), percent(one.chance())));
            for (int i = 0; i < Outlook.LEVELS.size(); i++) {
                cells.add(
                        one.percentiles().isEmpty()
                                ? ""
                                : Figures.measured(one.percentiles().get(i)) + " " + one.unit());
            }
            table.row(cells);
        }
        return table;
    }

    private static String name(Recipe recipe, Outlook.Prospect one) {
        return TargetWords.name(recipe, one.target(), one.name(), one.grade());
    }

    private static String limit(Run run, Outlook.Prospect one) {
        return EachGrade.of(run).stream()
                .filter(state -> state.target().equals(one.target()))
                .findFirst()
                .map(state -> ": " + TargetWords.limit(run.batch().recipe(), state))
                .orElse("");
    }

    private static String where(Outlook.Prospect one) {
        return one.grade()
                .orElse(
                        one.target() instanceof Target.OfLiquor
                                ? "liquor"
                                : one.target() instanceof Target.OfTotal ? "batch" : "lot");
    }

    private static List<String> notes(Outlook outlook, boolean planned) {
        int values = outlook.values().size();
        List<String> notes = new ArrayList<>();
        notes.add("Found by following " + count(outlook.all().samples()) + " samples of "
                + (values == 1 ? "the one value" : "the " + values + " values") + " with a give-or-take"
                + (outlook.sketched() ? ", in a sketch good to about 1e-4" : "")
                + "; the chance of all together is " + words(outlook.all()) + ".");
        boolean asked =
                outlook.prospects().stream().anyMatch(one -> one.confidence().isPresent());
        if (asked) {
            notes.add(
                    "Of the samples, by part, what they read at most. The value of a target with a confidence is what so much of them reads at most,"
                            + " or at least.");
            if (planned) {
                notes.add("Times were chosen "
                        + (outlook.planned() > 1
                                ? "on " + count(outlook.planned()) + " samples"
                                : "at the stated values with a margin")
                        + " and judged by all of them; nothing is proven to be shortest.");
            }
        }
        if (outlook.refused() > 0) {
            notes.add(
                    count(outlook.refused()) + " of the samples could not be followed and count as failing; the first: "
                            + outlook.refusal().orElse("") + ".");
        }
        return notes;
    }

    private static Table measure(Recipe recipe, Outlook outlook) {
        Table table = new Table().text("Value").number("Of its variance").number("Would remain");
        outlook.prospects().stream()
                .sorted(Comparator.comparingDouble(one -> one.chance().value()))
                .limit(MOST_TARGETS)
                .filter(one -> !largest(one).isEmpty())
                .forEach(one -> {
                    table.heading(name(recipe, one) + ", " + where(one));
                    largest(one)
                            .forEach(value -> table.row(List.of(
                                    outlook.values().get(value),
                                    percent(one.shares().get(value)),
                                    percent(Shares.remaining(one.shares().get(value))))));
                });
        return table;
    }

    private static List<Integer> largest(Outlook.Prospect one) {
        return IntStream.range(0, one.shares().size())
                .filter(value -> one.shares().get(value) >= TELLING)
                .boxed()
                .sorted(Comparator.comparingDouble(value -> -one.shares().get(value)))
                .limit(MOST_VALUES)
                .toList();
    }

    /** {@code 90.4 % (90.3 to 90.5 %)}: the interval is that of sampling. */
    static String words(Chance chance) {
        return percent(chance) + " (" + bare(chance.low(), RoundingMode.FLOOR) + " to "
                + bare(chance.high(), RoundingMode.CEILING) + " %)";
    }

    private static String percent(Chance chance) {
        // What is not certain is never shown as if it were.
        return chance.value() > 0.5
                ? bare(chance.value(), RoundingMode.FLOOR) + " %"
                : bare(chance.value(), RoundingMode.CEILING) + " %";
    }

    private static String percent(double share) {
        return new BigDecimal(100 * share).setScale(0, RoundingMode.HALF_EVEN) + " %";
    }

    private static String bare(double share, RoundingMode mode) {
        // Ten digits first: a bound that is a round number stays one.
        BigDecimal exact = new BigDecimal(100 * share).setScale(10, RoundingMode.HALF_EVEN);
        boolean near = share > 0 && share < 1 && Math.min(share, 1 - share) < 0.005;
        return exact.setScale(near ? 2 : 1, mode).toPlainString();
    }

    private static String count(int number) {
        return Integer.toString(number);
    }
}
