package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.LoadPlan;
import org.soakwright.planner.report.Figures;
import org.soakwright.planner.report.Wording;

/** The answer in a few plain sentences: whether it all comes about, until when, and how good that is. */
final class LineAnswer {
    private static final int MOST_NAMED = 5;

    private final Account account;
    private final LinePlan plan;
    private final Times times;

    LineAnswer(Account account) {
        this.account = account;
        plan = account.plan();
        times = new Times(plan.clock());
    }

    List<String> sentences() {
        List<String> sentences = new ArrayList<>();
        List<String> stops = account.stops();
        if (!stops.isEmpty()) {
            sentences.add("This is not a plan to use. " + String.join(" ", stops)
                    + " Whoever answers for it in spite of that writes allowed-by with their name into the recipe.");
        }
        sentences.add(outcome());
        sentences.add("The last lot is out on " + times.wall(plan.schedule().makespan()) + ", "
                + Times.lasting(plan.schedule().makespan()) + " after the line starts." + nights());
        sentences.addAll(bounds());
        return sentences;
    }

    private String outcome() {
        List<String> late = account.lateLots().stream()
                .map(lot -> lot.order().lot())
                .distinct()
                .toList();
        List<String> missing =
                account.missing().stream().map(load -> load.load().name()).toList();
        if (late.isEmpty() && missing.isEmpty()) {
            boolean due = account.lots().stream().anyMatch(lot -> lot.order().due() != null);
            int all = plan.line().orders().size();
            return all == 1
                    ? "The lot meets its targets" + (due ? " and is not late." : ".")
                    : "All " + all + " lots meet their targets" + (due ? " and none is late." : ".");
        }
        List<String> parts = new ArrayList<>();
        if (!late.isEmpty()) {
            int all = plan.line().orders().size();
            parts.add(late.size() + " of " + all + (all == 1 ? " lot" : " lots") + (late.size() == 1 ? " is" : " are")
                    + " late: " + named(late));
        }
        if (!missing.isEmpty()) {
            parts.add(count(missing.size(), "load") + (missing.size() == 1 ? " misses" : " miss") + " a target: "
                    + named(missing));
        }
        return capital(String.join("; ", parts)) + ".";
    }

    private String nights() {
        long nights = plan.schedule().atNight();
        return nights == 0 ? "" : " " + count(nights, "move") + " at night.";
    }

    /** Two numbers that no schedule can beat, beside what this one has. */
    private List<String> bounds() {
        List<String> sentences = new ArrayList<>();
        double lateness = plan.schedule().lateness();
        OptionalDouble leastLate = plan.proof().lateness();
        if (lateness > 0) {
            if (leastLate.isEmpty()) {
                sentences.add("How much of the lateness no schedule can avoid is not known.");
            } else if (leastLate.getAsDouble() >= lateness - 0.5) {
                sentences.add("No schedule has less lateness: this is proven.");
            } else if (leastLate.getAsDouble() > 0) {
                sentences.add("Of the weighted lateness of " + hours(lateness) + " no schedule can avoid "
                        + hours(leastLate.getAsDouble()) + "; the rest may or may not be avoidable.");
            } else {
                sentences.add("That any lateness has to be is not proven.");
            }
        }
        OptionalLong least = plan.proof().makespan();
        long takes = plan.schedule().makespan();
        if (least.isEmpty()) {
            sentences.add("Nothing is known of how much shorter it could be.");
        } else if (least.getAsLong() >= takes) {
            sentences.add("No schedule that is no later is done sooner: this is proven.");
        } else {
            sentences.add("No schedule that is no later takes less than " + Times.lasting(least.getAsLong())
                    + ": at most " + percent(takes - least.getAsLong(), takes) + " could be gained.");
        }
        return sentences;
    }

    private static String percent(long gap, long of) {
        return of <= 0 ? "all" : Figures.rounded(100.0 * gap / of, 2) + " %";
    }

    private static String hours(double seconds) {
        return Figures.made(seconds / 3600) + " h";
    }

    private static String named(List<String> names) {
        int more = names.size() - MOST_NAMED;
        return more <= 0
                ? Wording.list(names)
                : String.join(", ", names.subList(0, MOST_NAMED)) + " and " + more + " more";
    }

    private static String count(long number, String what) {
        return number + " " + what + (number == 1 ? "" : "s");
    }

    private static String capital(String text) {
        return text.substring(0, 1).toUpperCase(java.util.Locale.ROOT) + text.substring(1);
    }

    /** Why a load is no good, a sentence each. */
    static List<String> misses(LoadPlan load) {
        return load.targets().stream()
                .filter(state -> !state.met())
                .map(state -> load.load().name() + ": " + Wording.miss(state) + ".")
                .toList();
    }
}
