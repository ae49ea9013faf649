package org.soakwright.planner.line;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalLong;
import org.soakwright.planner.batch.Progress;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.line.constraint.Improvement;
import org.soakwright.planner.line.constraint.Native;
import org.soakwright.planner.line.shop.Aim;
import org.soakwright.planner.line.shop.Placed;
import org.soakwright.planner.line.shop.Schedule;
import org.soakwright.planner.line.shop.Search;
import org.soakwright.planner.line.shop.Slack;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.text.Unsound;

/** Schedules a line: who goes where and when, and how long each step lasts, so that every lot meets its targets. */
public final class LinePlanner {
    /** Placings of a job that take about a second. */
    private static final long PLACINGS_PER_EFFORT = 6_000;

    /** Parts of an effort that are spent on placing before and while constraint programming proposes schedules. */
    private static final double SEARCHING = 0.3;

    private static final double POLISHING = 0.3;

    /** Deterministic work of constraint programming, in its own unit, for the rest. */
    private static final double WORK_PER_EFFORT = 0.2;

    private LinePlanner() {}

    /**
     * The best schedule found. Same line and options, same schedule.
     *
     * @throws Unsound where a lot cannot be made on this line however late: with the place of each
     */
    public static LinePlan plan(Line line, Options options, Progress progress) {
        Hall hall = new Hall(line);
        Jobs jobs = new Jobs(line, hall, options.decoupled(), progress);
        List<Aim> aims =
                line.minimise().stream().map(goal -> Aim.valueOf(goal.name())).toList();
        List<Jobs.Made> alone = jobs.of(Loads.alone(line));
        List<Jobs.Made> made = alone;
        Search search =
                new Search(hall.shop(), alone.stream().map(Jobs.Made::job).toList(), aims);
        Search.Found first = first(hall, alone, search);
        List<Load> together =
                Loads.together(line, alone.stream().map(Jobs.Made::load).toList(), 0);
        if (together.size() < alone.size()) {
            List<Jobs.Made> shared = jobs.of(together);
            Search other =
                    new Search(hall.shop(), shared.stream().map(Jobs.Made::job).toList(), aims);
            if (isBetter(other, first)) {
                made = shared;
                search = other;
            }
        }
        progress.at("scheduling", 0.5);
        Search.Found found = search.best((long) (options.effort() * SEARCHING * PLACINGS_PER_EFFORT));
        progress.at("improving", 0.7);
        Improvement.Outcome improved = new Improvement(
                        hall.shop(), made.stream().map(Jobs.Made::job).toList(), aims, search)
                .of(found, options.effort() * WORK_PER_EFFORT, (long)
                        (options.effort() * POLISHING * PLACINGS_PER_EFFORT));
        return told(line, hall, made, improved);
    }

    private static Search.Found first(Hall hall, List<Jobs.Made> made, Search search) {
        try {
            return search.best(0);
        } catch (Search.Unplaceable nowhere) {
            throw Unplaced.told(hall, made, nowhere);
        }
    }

    /** Lots that have a place each need not have one together. */
    private static boolean isBetter(Search other, Search.Found first) {
        try {
            return other.best(0).score().compareTo(first.score()) < 0;
        } catch (Search.Unplaceable nowhere) {
            return false;
        }
    }

    private static LinePlan told(Line line, Hall hall, List<Jobs.Made> made, Improvement.Outcome outcome) {
        Schedule schedule = outcome.found().schedule();
        Reasons reasons = new Reasons(schedule, hall.clock());
        List<List<Slack>> slacks = Slack.of(schedule);
        List<LoadPlan> loads = new ArrayList<>();
        for (int j = 0; j < made.size(); j++) {
            loads.add(load(hall, made, j, schedule, slacks.get(j), reasons));
        }
        loads.sort(Comparator.comparingLong(
                        (LoadPlan load) -> load.placed().begins(hall.shop().carriage()))
                .thenComparing(load -> load.load().name()));
        return new LinePlan(
                line,
                hall.clock(),
                schedule,
                loads,
                new LinePlan.Proof(
                        outcome.lateness(),
                        outcome.makespan().isPresent()
                                ? OptionalLong.of(Math.round(outcome.makespan().getAsDouble()))
                                : OptionalLong.empty()),
                notes(loads, outcome));
    }

    private static LoadPlan load(
            Hall hall, List<Jobs.Made> all, int index, Schedule schedule, List<Slack> slacks, Reasons reasons) {
        Jobs.Made made = all.get(index);
        Placed placed = schedule.jobs().get(index);
        Run run = made.followed(placed.times());
        Route route = made.route();
        List<LoadPlan.LegPlan> legs = new ArrayList<>();
        for (int k = 0; k < route.size(); k++) {
            Placed.Visit visit = placed.visit(k);
            Slack slack = slacks.get(k);
            String name = route.name(k);
            legs.add(new LoadPlan.LegPlan(
                    route.legs().get(k),
                    name,
                    route.steps()[k],
                    hall.shop().stations().get(visit.station()).name(),
                    visit.start(),
                    visit.end(),
                    slack.latest(),
                    reasons.limit(slack, name, k + 1 < route.size() ? route.name(k + 1) : "")));
        }
        List<String> late =
                schedule.late(placed) > 0 ? reasons.late(placed, placed.job().due(), all) : List.of();
        return new LoadPlan(made.load(), placed, run, run.targets(), legs, late);
    }

    private static List<String> notes(List<LoadPlan> loads, Improvement.Outcome outcome) {
        List<String> notes = new ArrayList<>();
        if (!Native.loads()) {
            notes.add(
                    "The constraint solver has no native part on this machine: the schedule is the search's alone, and no"
                            + " bound is known.");
        } else if (outcome.tooLarge()) {
            notes.add(
                    "The line is too large for the constraint solver: the schedule is the search's alone, and no bound is"
                            + " known.");
        }
        boolean confident = loads.stream()
                .anyMatch(load -> load.load().recipe().targets().stream()
                        .anyMatch(target ->
                                load.load().recipe().confidence(target).isPresent()));
        if (confident) {
            notes.add(
                    "Targets with a confidence are held, at the values stated, to as much more as it took when their recipe"
                            + " was planned alone.");
        }
        List<String> missed = loads.stream()
                .filter(load -> !load.met())
                .map(load -> load.load().name())
                .toList();
        if (!missed.isEmpty()) {
            notes.add("No schedule was found in which these meet their targets: " + String.join(", ", missed)
                    + "; they wait too long for crew or vessels.");
        }
        return notes;
    }
}
