package org.soakwright.planner.report.line;

import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.ZonedDateTime;
import java.time.temporal.TemporalAdjusters;
import java.util.ArrayList;
import java.util.List;
import java.util.function.IntPredicate;
import org.soakwright.planner.line.Clock;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.report.picture.TimeChart;
import org.soakwright.recipes.model.line.Crew;
import org.soakwright.recipes.model.line.Night;
import org.soakwright.recipes.model.line.Span;

/**
 * How time is laid out in a chart: up to three days from hour to hour, up to eight days whole, more week by week below each other, each
 * from a Monday on, so that weekdays stand under each other.
 */
record ChartClock(
        List<TimeChart.Span> panels,
        List<TimeChart.Mark> days,
        List<TimeChart.Mark> hours,
        List<TimeChart.Span> away,
        List<TimeChart.Span> pauses,
        List<TimeChart.Span> nights) {
    private static final long HOUR = 3600;
    private static final int FEW_DAYS = 3;
    private static final int ONE_PANEL = 8;

    /** Marks of one panel beside whose lines there is room for what they say. */
    private static final int MOST_MARKS = 16;

    private static final int[] STEPS = {1, 2, 3, 6, 12};

    static ChartClock of(LinePlan plan) {
        Clock clock = plan.clock();
        List<TimeChart.Span> panels = panels(clock, plan.schedule().makespan());
        long from = panels.get(0).from();
        long until = panels.get(panels.size() - 1).until();
        List<TimeChart.Mark> days = new ArrayList<>();
        List<TimeChart.Mark> hours = new ArrayList<>();
        List<TimeChart.Span> nights = new ArrayList<>();
        Crew crew = plan.line().crew();
        Night night = crew == null ? Night.usual(plan.line().place()) : crew.night();
        Times times = new Times(clock);
        int step = step(panels.get(0));
        LocalDate last = clock.at(until).toLocalDate();
        for (LocalDate day = clock.at(from).toLocalDate().minusDays(1); !day.isAfter(last); day = day.plusDays(1)) {
            days.add(new TimeChart.Mark(clock.seconds(day.atStartOfDay(clock.zone())), times.day(day)));
            for (int hour = step; hour < 24 && step > 0; hour += step) {
                ZonedDateTime time = day.atTime(hour, 0).atZone(clock.zone());
                if (time.getHour() == hour) {
                    hours.add(new TimeChart.Mark(clock.seconds(time), times.hour(clock.seconds(time))));
                }
            }
            boolean over = !night.to().isAfter(night.from());
            nights.add(new TimeChart.Span(
                    clock.seconds(day.atTime(night.from()).atZone(clock.zone())),
                    clock.seconds(
                            (over ? day.plusDays(1) : day).atTime(night.to()).atZone(clock.zone()))));
        }
        List<TimeChart.Span> there = new ArrayList<>();
        List<TimeChart.Span> away = new ArrayList<>();
        List<TimeChart.Span> pauses = new ArrayList<>();
        if (crew != null) {
            away.addAll(spans(
                    clock,
                    crew.shifts(clock.at(from).toInstant(), clock.at(until).toInstant()),
                    n -> n == 0));
            there.addAll(spans(
                    clock,
                    crew.shifts(clock.at(from).toInstant(), clock.at(until).toInstant()),
                    n -> n > 0));
            List<TimeChart.Span> idle = spans(
                    clock,
                    crew.spans(clock.at(from).toInstant(), clock.at(until).toInstant()),
                    n -> n == 0);
            for (TimeChart.Span one : idle) {
                for (TimeChart.Span shift : there) {
                    if (one.from() < shift.until() && one.until() > shift.from()) {
                        pauses.add(new TimeChart.Span(
                                Math.max(one.from(), shift.from()), Math.min(one.until(), shift.until())));
                    }
                }
            }
        }
        return new ChartClock(
                panels,
                List.copyOf(days),
                List.copyOf(hours),
                List.copyOf(away),
                List.copyOf(pauses),
                List.copyOf(nights));
    }

    private static List<TimeChart.Span> panels(Clock clock, long end) {
        long shown = Math.max(end, HOUR);
        LocalDate first = clock.at(0).toLocalDate();
        LocalDate last = clock.at(shown - 1).toLocalDate();
        if (shown <= FEW_DAYS * 24 * HOUR) {
            long from = clock.seconds(clock.at(0).withMinute(0));
            return List.of(new TimeChart.Span(from, from + (shown - from + HOUR - 1) / HOUR * HOUR));
        }
        if (!last.isAfter(first.plusDays(ONE_PANEL - 1))) {
            return List.of(span(clock, first, last.plusDays(1)));
        }
        List<TimeChart.Span> weeks = new ArrayList<>();
        for (LocalDate monday = first.with(TemporalAdjusters.previousOrSame(DayOfWeek.MONDAY));
                !monday.isAfter(last);
                monday = monday.plusWeeks(1)) {
            weeks.add(span(clock, monday, monday.plusWeeks(1)));
        }
        return weeks;
    }

    private static TimeChart.Span span(Clock clock, LocalDate from, LocalDate until) {
        return new TimeChart.Span(
                clock.seconds(from.atStartOfDay(clock.zone())), clock.seconds(until.atStartOfDay(clock.zone())));
    }

    /** Hours from one mark to the next; 0 for none. */
    private static int step(TimeChart.Span panel) {
        for (int step : STEPS) {
            if ((panel.until() - panel.from()) / (step * HOUR) <= MOST_MARKS) {
                return step;
            }
        }
        return 0;
    }

    private static List<TimeChart.Span> spans(Clock clock, List<Span> spans, IntPredicate wanted) {
        return spans.stream()
                .filter(span -> wanted.test(span.heads()))
                .map(span -> new TimeChart.Span(clock.seconds(span.from()), clock.seconds(span.to())))
                .toList();
    }
}
