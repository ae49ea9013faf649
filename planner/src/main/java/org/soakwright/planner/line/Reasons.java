package org.soakwright.planner.line;

import java.time.ZonedDateTime;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.line.shop.Placed;
import org.soakwright.planner.line.shop.Schedule;
import org.soakwright.planner.line.shop.Search;
import org.soakwright.planner.line.shop.Slack;
import org.soakwright.planner.line.shop.Wait;

/** In words: what limits a step, and the chain of waits that made a lot late. */
final class Reasons {
    private static final DateTimeFormatter MOMENT = DateTimeFormatter.ofPattern("EEE d MMM HH:mm", Locale.ENGLISH);

    /** How many lots a chain is followed through. */
    private static final int MOST_LINKS = 4;

    private final Schedule schedule;
    private final Clock clock;

    Reasons(Schedule schedule, Clock clock) {
        this.schedule = schedule;
        this.clock = clock;
    }

    String limit(Slack slack, String step, String next) {
        return switch (slack.reason()) {
            case STATION ->
                slack.by() == null
                        ? "the vessel is out of use then"
                        : slack.by().name() + " comes into the vessel next";
            case PEOPLE -> "nobody is there to lift later";
            case HOIST -> "hoist or crew are with another lot then";
            case LONGEST -> step + " may not be held longer";
            case NEXT -> next + " would be shorter than it may be";
            case PHYSICS -> "a target would be missed";
            case DUE -> "the lot is due";
            case CONDITIONS -> "what it draws, or who attends, is not there longer";
            case NOTHING -> "nothing within two weeks";
        };
    }

    /** Why a lot is late, from its end back to what began it. */
    List<String> late(Placed placed, long due, List<Jobs.Made> made) {
        List<String> chain = new ArrayList<>();
        long out = placed.finishes(schedule.shop().carriage());
        chain.add(placed.job().name() + " is out " + at(out) + ", " + Durations.practical((double) (out - due))
                + " after it is due");
        Search.Found alone = new Search(schedule.shop(), List.of(placed.job()), List.of()).best(0);
        long earliest = alone.schedule().makespan();
        if (earliest > due) {
            chain.add("with the whole line for itself it would be out " + at(earliest)
                    + " at the earliest: no schedule has it on time");
        }
        Set<String> told = new HashSet<>();
        Placed at = placed;
        for (int link = 0; link < MOST_LINKS && at != null && told.add(at.job().name()); link++) {
            Placed by = null;
            for (Wait wait : Wait.of(schedule, at)) {
                chain.add(told(at, wait, made));
                by = by == null ? wait.by() : by;
            }
            at = by;
        }
        if (chain.size() == 1) {
            chain.add("it never waited: its steps take that long after it was ready");
        }
        return chain;
    }

    private String told(Placed placed, Wait wait, List<Jobs.Made> made) {
        String lot = placed.job().name();
        String what = wait.phase() == 0
                ? lot + " could have begun " + at(wait.since()) + " and began " + at(wait.until())
                : lot + " could have left " + step(placed, wait.phase() - 1, made) + " " + at(wait.since())
                        + " and left " + at(wait.until());
        String by = wait.by() == null ? "another lot" : wait.by().job().name();
        return what
                + switch (wait.reason()) {
                    case STATION ->
                        ": " + schedule.shop().stations().get(wait.station()).name()
                                + (wait.by() == null
                                        ? " was out of use"
                                        : " and any like it were taken, last by " + by);
                    case PEOPLE -> ": nobody was there to move it";
                    case HOIST -> ": hoist or crew were with " + by;
                    case LATER -> ": no vessel, hoist or crew would have been free for what comes after";
                };
    }

    private static String step(Placed placed, int phase, List<Jobs.Made> made) {
        return made.stream()
                .filter(one -> one.job().name().equals(placed.job().name()))
                .findFirst()
                .orElseThrow()
                .route()
                .name(phase);
    }

    private String at(long seconds) {
        ZonedDateTime time = clock.at(seconds);
        return MOMENT.format(time);
    }
}
