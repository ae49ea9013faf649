package org.soakwright.planner.report.picture;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.StepEnd;

/**
 * The running clock across a picture. It is even unless that would hide a step: then each step is as wide as the root of its time, and
 * within it the clock goes by the root of the time since the step began, as profiles do.
 */
final class Clock implements Scale {
    private static final double LEAST_SHARE = 0.03;
    private static final double LEAST_TRANSFER = 0.008;
    private static final double LABEL_SHARE = 0.075;
    private static final int MOST_TICKS = 9;

    /** A stretch of time that runs at one pace. */
    private record Leg(double from, double to, double at, double width) {}

    private final List<Leg> legs = new ArrayList<>();
    private final List<Tick> ticks = new ArrayList<>();
    private final boolean even;
    private final double end;

    Clock(List<StepEnd> ends) {
        end = ends.get(ends.size() - 1).to();
        even = ends.stream().allMatch(step -> step.to() - step.from() >= LEAST_SHARE * end);
        if (even) {
            double step = Rounds.clockStep(end, MOST_TICKS);
            for (long i = 0; i * step <= end; i++) {
                if (i * step < end * (1 - LABEL_SHARE)) {
                    ticks.add(new Tick(i * step, Durations.clock(i * step)));
                }
            }
            ticks.add(new Tick(end, Durations.clock(end)));
        } else {
            stretch(ends);
            mark(ends);
        }
    }

    /** Whether equal times are equally wide. */
    boolean isEven() {
        return even;
    }

    /** What to write at the axis. */
    String name() {
        return even ? "running clock, h:min" : "running clock, h:min, each step by the root of its time";
    }

    @Override
    public double at(double clock) {
        if (even) {
            return Math.max(0, Math.min(1, clock / end));
        }
        Leg leg = legs.get(0);
        for (Leg next : legs) {
            leg = next.from() <= clock ? next : leg;
        }
        double share = Math.max(0, Math.min(1, (clock - leg.from()) / (leg.to() - leg.from())));
        return leg.at() + leg.width() * Math.sqrt(share);
    }

    /** The clock at a share of the width: the inverse. */
    double clock(double share) {
        if (even) {
            return share * end;
        }
        Leg leg = legs.get(0);
        for (Leg next : legs) {
            leg = next.at() <= share ? next : leg;
        }
        double within = Math.max(0, Math.min(1, (share - leg.at()) / leg.width()));
        return leg.from() + (leg.to() - leg.from()) * within * within;
    }

    @Override
    public List<Tick> ticks() {
        return List.copyOf(ticks);
    }

    private void stretch(List<StepEnd> ends) {
        List<double[]> spans = new ArrayList<>();
        double before = 0;
        double roots = 0;
        for (StepEnd step : ends) {
            if (step.from() > before) {
                spans.add(new double[] {before, step.from(), LEAST_TRANSFER});
            }
            spans.add(new double[] {step.from(), step.to(), LEAST_SHARE});
            before = step.to();
        }
        for (double[] span : spans) {
            roots += Math.sqrt(span[1] - span[0]);
        }
        double sum = 0;
        for (double[] span : spans) {
            span[2] = Math.max(span[2], Math.sqrt(span[1] - span[0]) / roots);
            sum += span[2];
        }
        double at = 0;
        for (double[] span : spans) {
            legs.add(new Leg(span[0], span[1], at, span[2] / sum));
            at += span[2] / sum;
        }
    }

    /** Beginnings and ends of steps, and round times within long ones; labelled where there is room. */
    private void mark(List<StepEnd> ends) {
        List<Double> wanted = new ArrayList<>();
        wanted.add(0.0);
        wanted.add(end);
        ends.forEach(step -> wanted.add(step.to()));
        ends.forEach(step -> wanted.add(step.from()));
        for (StepEnd step : ends) {
            for (double share : new double[] {1 / 4.0, 1 / 16.0, 9 / 16.0}) {
                double grain = Rounds.clockStep((step.to() - step.from()) * Math.min(share, 1 - share), 2);
                double clock = grain * Math.rint((step.from() + share * (step.to() - step.from())) / grain);
                if (clock > step.from() && clock < step.to()) {
                    wanted.add(clock);
                }
            }
        }
        for (double clock : wanted) {
            boolean free = ticks.stream().allMatch(tick -> Math.abs(at(tick.value()) - at(clock)) >= LABEL_SHARE);
            if (free) {
                ticks.add(new Tick(clock, Durations.clock(clock)));
            }
        }
    }
}
