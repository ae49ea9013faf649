package org.soakwright.planner.line;

import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.line.shop.Carriage;
import org.soakwright.planner.line.shop.Moments;
import org.soakwright.planner.line.shop.Shop;
import org.soakwright.planner.line.shop.Staffing;
import org.soakwright.planner.line.shop.Station;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.line.Crew;
import org.soakwright.recipes.model.line.Draw;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.model.line.Night;
import org.soakwright.recipes.model.line.Outage;
import org.soakwright.recipes.model.line.Span;
import org.soakwright.recipes.model.line.Utility;
import org.soakwright.recipes.model.line.VesselGroup;

/** A line's vessels, crew and hoists as a shop, in seconds from its start. */
final class Hall {
    /** What a utility's limit counts as: draws are parts of it. */
    static final long WHOLE = 1_000_000;

    private static final double GRAMS = 1000;

    /** How long after the last lot is ready anything is still planned. */
    static final long AFTERWARDS_DAYS = 366;

    private final Line line;
    private final Clock clock;
    private final List<Station> stations = new ArrayList<>();
    private final List<VesselGroup> groups = new ArrayList<>();
    private final Shop shop;

    Hall(Line line) {
        this.line = line;
        clock = Clock.of(line);
        for (VesselGroup group : line.vessels()) {
            for (int i = 1; i <= group.count(); i++) {
                stations.add(station(group, i));
                groups.add(group);
            }
        }
        Carriage carriage = line.moves().seconds() == 0
                ? Carriage.NONE
                : new Carriage(
                        line.moves().seconds(),
                        line.moves().atOnce(),
                        line.crew() == null ? 0 : line.moves().heads());
        shop = new Shop(
                stations,
                staffing(),
                carriage,
                line.utilities().stream().map(one -> WHOLE).toList());
    }

    Shop shop() {
        return shop;
    }

    Clock clock() {
        return clock;
    }

    VesselGroup group(int station) {
        return groups.get(station);
    }

    /** What a load takes of vessels that hold many, in grams, rounded up. */
    static long amount(double kg) {
        return (long) Math.ceil(kg * GRAMS - 1e-6);
    }

    private Station station(VesselGroup group, int number) {
        Moments closed = Moments.NONE;
        for (Outage outage : group.outages()) {
            if (outage.concerns(number)) {
                closed = closed.or(Moments.of(clock.seconds(outage.from()), clock.seconds(outage.to())));
            }
        }
        return new Station(
                group.vessel(number),
                line.vessels().indexOf(group),
                group.capacity() == null
                        ? 0
                        : Math.max(1, (long) Math.floor(group.capacity().si() * GRAMS + 1e-6)),
                group.turnaroundSeconds(),
                closed);
    }

    private Staffing staffing() {
        Moments nights = nights();
        Crew crew = line.crew();
        if (crew == null) {
            return new Staffing(
                    Staffing.UNLIMITED.most(), Staffing.UNLIMITED.levels(), Staffing.UNLIMITED.shifts(), nights);
        }
        List<Staffing.Level> levels = new ArrayList<>();
        long most = 0;
        for (Span span : crew.spans(first(), last())) {
            if (span.heads() > 0) {
                levels.add(new Staffing.Level(clock.seconds(span.from()), clock.seconds(span.to()), span.heads()));
                most = Math.max(most, span.heads());
            }
        }
        Moments shifts = Moments.NONE;
        for (Span span : crew.shifts(first(), last())) {
            if (span.heads() > 0) {
                shifts = shifts.or(Moments.of(clock.seconds(span.from()), clock.seconds(span.to())));
            }
        }
        return new Staffing(most, levels, shifts, nights);
    }

    private Instant first() {
        return line.starts().toInstant();
    }

    private Instant last() {
        Instant last = first();
        for (var order : line.orders()) {
            Instant ready = order.ready().toInstant();
            last = ready.isAfter(last) ? ready : last;
        }
        return last.plusSeconds(AFTERWARDS_DAYS * 86_400);
    }

    private Moments nights() {
        Night night =
                line.crew() == null ? Night.usual(line.place()) : line.crew().night();
        Moments nights = Moments.NONE;
        LocalDate end = LocalDateTime.ofInstant(last(), line.zone()).toLocalDate();
        for (LocalDate day = line.starts().toLocalDate().minusDays(1); !day.isAfter(end); day = day.plusDays(1)) {
            boolean across = !night.to().isAfter(night.from());
            long from = clock.seconds(day.atTime(night.from()).atZone(line.zone()));
            long to = clock.seconds(
                    (across ? day.plusDays(1) : day).atTime(night.to()).atZone(line.zone()));
            // The moment at which a night ends is day.
            nights = nights.or(Moments.of(from, to - 1));
        }
        return nights;
    }

    /** The parts of each utility that a step draws in a station. */
    List<Long> draws(int station, Step step) {
        List<Long> draws = new ArrayList<>();
        for (Utility utility : line.utilities()) {
            Draw draw = groups.get(station).draws().get(utility.name());
            double si = draw instanceof Draw.Steady steady
                    ? steady.value().si()
                    : draw instanceof Draw.Flow
                                    && step instanceof Step.Rinse rinse
                                    && rinse.renewal() instanceof Renewal.Flow flow
                            ? flow.rate().si()
                            : 0;
            draws.add((long) Math.ceil(si / utility.atMost().si() * WHOLE - 1e-6));
        }
        return draws;
    }
}
