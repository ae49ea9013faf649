package org.soakwright.planner.line.shop;

import java.util.List;

/**
 * What a job costs: linear in its times.
 *
 * @param standing whatever its times
 * @param perSecond for each of its times, phases and gaps by turns; empty where time costs nothing
 */
public record Tariff(double standing, List<Double> perSecond) {
    public static final Tariff NONE = new Tariff(0, List.of());

    public Tariff {
        perSecond = List.copyOf(perSecond);
    }

    double of(long[] times) {
        double sum = standing;
        for (int i = 0; i < perSecond.size(); i++) {
            sum += perSecond.get(i) * times[i];
        }
        return sum;
    }
}
