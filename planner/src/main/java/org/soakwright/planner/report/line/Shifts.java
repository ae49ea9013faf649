package org.soakwright.planner.report.line;

import java.time.LocalDate;
import java.time.ZonedDateTime;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.line.Clock;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.recipes.model.line.Crew;
import org.soakwright.recipes.model.line.Shift;

/** The moves of a line shift by shift. Where shifts overlap, a move belongs to the one that came last; without a crew, to its day. */
final class Shifts {
    private final Clock clock;
    private final Times times;
    private final @Nullable Crew crew;

    private Shifts(LinePlan plan) {
        clock = plan.clock();
        times = new Times(clock);
        crew = plan.line().crew();
    }

    /** One shift with what is done in it. */
    record Worked(String name, List<Move> moves) {
        Worked {
            moves = List.copyOf(moves);
        }
    }

    /** From one moment until before another. */
    private record Window(long from, long until, int heads) {
        boolean holds(long moment) {
            return from <= moment && moment < until;
        }
    }

    static List<Worked> of(LinePlan plan, List<Move> moves) {
        Shifts shifts = new Shifts(plan);
        List<Worked> worked = new ArrayList<>();
        // In the order of their first moves.
        Map<Window, List<Move>> groups = new LinkedHashMap<>();
        Map<LocalDate, List<Window>> known = new TreeMap<>();
        for (Move move : moves) {
            groups.computeIfAbsent(shifts.window(move.start(), known), key -> new ArrayList<>())
                    .add(move);
        }
        groups.forEach((window, own) -> worked.add(new Worked(shifts.name(window), own)));
        return List.copyOf(worked);
    }

    private Window window(long moment, Map<LocalDate, List<Window>> known) {
        LocalDate day = clock.at(moment).toLocalDate();
        List<Window> near = known.computeIfAbsent(day, this::near);
        return near.stream()
                .filter(window -> window.holds(moment))
                .max(Comparator.comparingLong(Window::from).thenComparing(Window::until, Comparator.reverseOrder()))
                .orElseGet(() -> whole(day));
    }

    private Window whole(LocalDate day) {
        return new Window(
                clock.seconds(day.atStartOfDay(clock.zone())),
                clock.seconds(day.plusDays(1).atStartOfDay(clock.zone())),
                0);
    }

    /** The shifts that can be on at any time of a day; those of the same hours are one. */
    private List<Window> near(LocalDate day) {
        Map<Long, Map<Long, Integer>> heads = new TreeMap<>();
        for (LocalDate begun : List.of(day.minusDays(1), day)) {
            for (Shift shift : crew == null ? List.<Shift>of() : crew.beginningOn(begun)) {
                ZonedDateTime from = begun.atTime(shift.from()).atZone(clock.zone());
                ZonedDateTime until =
                        begun.atTime(shift.from()).plusMinutes(shift.minutes()).atZone(clock.zone());
                heads.computeIfAbsent(clock.seconds(from), key -> new TreeMap<>())
                        .merge(clock.seconds(until), shift.heads(), Integer::sum);
            }
        }
        List<Window> windows = new ArrayList<>();
        heads.forEach((from, ends) -> ends.forEach((until, count) -> windows.add(new Window(from, until, count))));
        return windows;
    }

    /** {@code Mon 2 Mar 06:00 – 14:00, 2 heads}; of a day alone just the day. */
    private String name(Window window) {
        if (window.heads() == 0) {
            return times.day(clock.at(window.from()).toLocalDate());
        }
        return times.wall(window.from()) + " – " + times.hour(window.until()) + ", " + window.heads()
                + (window.heads() == 1 ? " head" : " heads");
    }
}
