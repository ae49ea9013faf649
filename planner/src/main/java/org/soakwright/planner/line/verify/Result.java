package org.soakwright.planner.line.verify;

import java.time.ZoneId;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;

/**
 * What a result says, as far as it is checked. Moments are seconds since 1970.
 *
 * @param stops how many cautions stop the plan
 */
record Result(
        boolean met,
        List<Entry> lots,
        List<Move> moves,
        double makespan,
        OptionalDouble bound,
        double lateness,
        OptionalDouble boundLateness,
        double nightMoves,
        OptionalDouble cost,
        Optional<String> currency,
        int stops) {

    /**
     * A lot, or a part of one.
     *
     * @param load what it goes through the line with
     */
    record Entry(
            String lot,
            int part,
            int parts,
            String load,
            String recipe,
            double kg,
            boolean met,
            double late,
            long ready,
            OptionalLong due,
            long loaded,
            long done,
            List<Stint> steps,
            List<Reached> targets) {
        String name() {
            return parts == 1 ? lot : lot + " (" + part + " of " + parts + ")";
        }
    }

    /**
     * A step or one of its fills.
     *
     * @param fill from 1
     */
    record Stint(
            String name,
            String kind,
            int fill,
            String vessel,
            long from,
            long until,
            double seconds,
            OptionalLong latestPull,
            OptionalDouble slack) {
        long lasts() {
            return until - from;
        }
    }

    record Reached(OptionalDouble atMost, OptionalDouble atLeast, double value, boolean met) {}

    record Move(
            String kind,
            String load,
            Optional<String> from,
            Optional<String> to,
            long start,
            long end,
            int heads,
            boolean hoist) {
        /** {@code transfer from tank 1 to tank 2}. */
        String way() {
            return kind
                    + from.map(vessel -> " from " + vessel).orElse("")
                    + to.map(vessel -> " to " + vessel).orElse("");
        }
    }

    /** Reads it; whatever is missing or wrong is told. */
    static Result of(Tree tree, ZoneId zone) {
        return new Result(
                tree.truth("met"),
                tree.elements("lots").stream().map(one -> entry(one, zone)).toList(),
                tree.elements("moves").stream().map(one -> move(one, zone)).toList(),
                tree.number("makespan-seconds"),
                tree.numberIfAny("bound-seconds"),
                tree.number("lateness-seconds"),
                tree.numberIfAny("bound-lateness-seconds"),
                tree.number("night-moves"),
                tree.numberIfAny("cost"),
                tree.textIfAny("currency"),
                tree.size("stops"));
    }

    private static Entry entry(Tree tree, ZoneId zone) {
        return new Entry(
                tree.text("lot"),
                tree.wholeOrOne("part"),
                tree.wholeOrOne("parts"),
                tree.text("load"),
                tree.text("recipe"),
                tree.number("mass-kg"),
                tree.truth("met"),
                tree.number("late-seconds"),
                tree.moment("ready", zone),
                tree.momentIfAny("due", zone),
                tree.moment("loaded", zone),
                tree.moment("done", zone),
                tree.elements("steps").stream().map(one -> stint(one, zone)).toList(),
                tree.elements("targets").stream().map(Result::reached).toList());
    }

    private static Stint stint(Tree tree, ZoneId zone) {
        return new Stint(
                tree.text("name"),
                tree.text("kind"),
                tree.wholeOrOne("fill"),
                tree.text("vessel"),
                tree.moment("start", zone),
                tree.moment("end", zone),
                tree.number("seconds"),
                tree.momentIfAny("latest-pull", zone),
                tree.numberIfAny("slack-seconds"));
    }

    private static Reached reached(Tree tree) {
        return new Reached(
                tree.numberIfAny("at-most"), tree.numberIfAny("at-least"), tree.number("value"), tree.truth("met"));
    }

    private static Move move(Tree tree, ZoneId zone) {
        return new Move(
                tree.text("kind"),
                tree.text("lot"),
                tree.textIfAny("from"),
                tree.textIfAny("to"),
                tree.moment("start", zone),
                tree.moment("end", zone),
                tree.whole("heads"),
                tree.truth("hoist"));
    }
}
