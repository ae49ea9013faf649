package org.soakwright.recipes.model.line;

import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.zone.ZoneOffsetTransition;
import java.time.zone.ZoneRules;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import java.util.function.ToIntFunction;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/**
 * When how many people are there. Shifts may overlap: their heads add up.
 *
 * @param zone whose clock counts
 * @param except days that replace the shifts which would begin on them
 */
public record Crew(Place place, ZoneId zone, List<Hours> hours, List<ExceptionalDay> except, Night night) {
    public Crew {
        hours = List.copyOf(hours);
        except = List.copyOf(except);
        if (hours.isEmpty() && except.stream().allMatch(ExceptionalDay::isClosed)) {
            throw new Unsound(
                    place,
                    "a crew has hours: found none; write such as hours: [{days: mon-fri, from: \"06:00\", to: \"14:00\","
                            + " heads: 2}], or leave crew out where moves happen at any time");
        }
        List<Problem> problems = new ArrayList<>();
        for (ExceptionalDay closed : except) {
            except.stream()
                    .filter(open -> closed.isClosed() && !open.isClosed() && closed.overlaps(open))
                    .forEach(open -> problems.add(new Problem(
                            open.place(),
                            "a day is closed or has hours: found hours on " + open.date() + ", closed at line "
                                    + closed.place().line() + "; keep one")));
        }
        if (!problems.isEmpty()) {
            throw new Unsound(problems);
        }
    }

    /** How many can move lots: those on shift and not in a break. Plain rather than quick. */
    public int heads(Instant time) {
        return count(time, false);
    }

    /** Whether anybody is on shift, breaks included. Plain rather than quick. */
    public boolean onShift(Instant time) {
        return count(time, true) > 0;
    }

    public boolean isNight(Instant time) {
        return night.contains(LocalDateTime.ofInstant(time, zone).toLocalTime());
    }

    private int count(Instant time, boolean withBreaks) {
        LocalDateTime local = LocalDateTime.ofInstant(time, zone);
        int heads = 0;
        // A shift is at most a day long, so whoever is here came today or yesterday.
        for (LocalDate begun : List.of(local.toLocalDate(), local.toLocalDate().minusDays(1))) {
            for (Shift shift : beginningOn(begun)) {
                boolean here = withBreaks ? shift.isOn(begun, local) : shift.works(begun, local);
                heads += here ? shift.heads() : 0;
            }
        }
        return heads;
    }

    /** The shifts that begin on a day. */
    public List<Shift> beginningOn(LocalDate day) {
        List<ExceptionalDay> instead =
                except.stream().filter(one -> one.covers(day)).toList();
        List<Shift> shifts = new ArrayList<>();
        for (ExceptionalDay one : instead) {
            if (one.shift() != null) {
                shifts.add(one.shift());
            }
        }
        if (instead.isEmpty()) {
            hours.stream()
                    .filter(one -> one.days().contains(day.getDayOfWeek()))
                    .forEach(one -> shifts.add(one.shift()));
        }
        return shifts;
    }

    /** How many can move lots, from one instant until before another, in spans without gaps; none is longer than it has to be. */
    public List<Span> spans(Instant from, Instant to) {
        return spans(from, to, this::heads);
    }

    /** How many are on shift, breaks included. */
    public List<Span> shifts(Instant from, Instant to) {
        return spans(from, to, time -> count(time, true));
    }

    private List<Span> spans(Instant from, Instant to, ToIntFunction<Instant> heads) {
        List<Span> spans = new ArrayList<>();
        Instant begun = from;
        int now = from.isBefore(to) ? heads.applyAsInt(from) : 0;
        for (Instant edge : edges(from, to)) {
            int next = heads.applyAsInt(edge);
            if (next != now) {
                spans.add(new Span(begun, edge, now));
                begun = edge;
                now = next;
            }
        }
        if (begun.isBefore(to)) {
            spans.add(new Span(begun, to, now));
        }
        return spans;
    }

    /** Every instant strictly between at which the number may change. */
    private TreeSet<Instant> edges(Instant from, Instant to) {
        TreeSet<Instant> edges = new TreeSet<>();
        ZoneRules rules = zone.getRules();
        LocalDate last = LocalDateTime.ofInstant(to, zone).toLocalDate();
        for (LocalDate day = LocalDateTime.ofInstant(from, zone).toLocalDate().minusDays(1);
                !day.isAfter(last);
                day = day.plusDays(1)) {
            for (Shift shift : beginningOn(day)) {
                for (LocalDateTime edge : shift.edges(day)) {
                    // Twice where the clock is turned back; not at all where it is turned over the edge, which the
                    // turning itself is then.
                    for (ZoneOffset offset : rules.getValidOffsets(edge)) {
                        edges.add(edge.toInstant(offset));
                    }
                }
            }
        }
        for (ZoneOffsetTransition turn = rules.nextTransition(from.minusSeconds(1));
                turn != null && turn.getInstant().isBefore(to);
                turn = rules.nextTransition(turn.getInstant())) {
            edges.add(turn.getInstant());
        }
        return new TreeSet<>(edges.subSet(from, false, to, false));
    }
}
