package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Time;

/** The durations there are to choose from: for each free step its rising list, for each other one its time. */
final class Grid {
    private final double[] fixed;
    private final List<Integer> free = new ArrayList<>();
    private final List<Steps> durations = new ArrayList<>();

    /** Durations as plain numbers: even steps from the first, or a list where there is no grain. */
    private record Steps(int choices, double first, double grain, double[] listed) {
        static Steps of(Time time) {
            if (time instanceof Time.Between between) {
                return new Steps(
                        between.choices(), between.from().si(), between.grain().si(), new double[0]);
            }
            double[] all = new double[time.choices()];
            for (int c = 0; c < all.length; c++) {
                all[c] = time.seconds(c);
            }
            return new Steps(all.length, all[0], 0, all);
        }

        double value(int choice) {
            return listed.length > 0 ? listed[choice] : first + choice * grain;
        }
    }

    Grid(Recipe recipe) {
        fixed = new double[recipe.steps().size()];
        for (int i = 0; i < fixed.length; i++) {
            Time time = recipe.steps().get(i).time();
            fixed[i] = time.seconds(0);
            if (time.choices() > 1) {
                free.add(i);
                durations.add(Steps.of(time));
            }
        }
    }

    /** Number of free steps. */
    int size() {
        return free.size();
    }

    /** Index of a free step among all steps. */
    int step(int axis) {
        return free.get(axis);
    }

    int choices(int axis) {
        return durations.get(axis).choices;
    }

    double value(int axis, int choice) {
        return durations.get(axis).value(choice);
    }

    double low(int axis) {
        return value(axis, 0);
    }

    double high(int axis) {
        return value(axis, choices(axis) - 1);
    }

    /** The last choice that is not longer, at least the first. */
    int below(int axis, double seconds) {
        int low = 0;
        int high = choices(axis) - 1;
        while (low < high) {
            int middle = (low + high + 1) >>> 1;
            if (value(axis, middle) <= seconds) {
                low = middle;
            } else {
                high = middle - 1;
            }
        }
        return low;
    }

    /** How many points there are, as a real number since there can be very many. */
    double points() {
        double product = 1;
        for (int a = 0; a < size(); a++) {
            product *= choices(a);
        }
        return product;
    }

    /** The shortest of all free steps. */
    double[] lowest() {
        double[] values = new double[size()];
        for (int a = 0; a < values.length; a++) {
            values[a] = low(a);
        }
        return values;
    }

    /** The longest of all free steps. */
    double[] highest() {
        double[] values = new double[size()];
        for (int a = 0; a < values.length; a++) {
            values[a] = high(a);
        }
        return values;
    }

    /** The distances between neighbouring choices, rounded to microseconds; even ones once. */
    long[] gapsInMicroseconds(int axis) {
        Steps steps = durations.get(axis);
        if (steps.listed.length == 0) {
            return new long[] {Math.round(steps.grain * 1e6)};
        }
        long[] gaps = new long[steps.choices - 1];
        for (int c = 0; c < gaps.length; c++) {
            gaps[c] = Math.round((steps.listed[c + 1] - steps.listed[c]) * 1e6);
        }
        return gaps;
    }

    double[] values(int[] choice) {
        double[] values = new double[choice.length];
        for (int a = 0; a < choice.length; a++) {
            values[a] = value(a, choice[a]);
        }
        return values;
    }

    /** Durations of the free steps, from those of all. */
    double[] free(double[] seconds) {
        double[] values = new double[size()];
        for (int a = 0; a < values.length; a++) {
            values[a] = seconds[step(a)];
        }
        return values;
    }

    /** Durations of all steps, from those of the free ones. */
    double[] seconds(double[] freeSeconds) {
        double[] seconds = fixed.clone();
        for (int a = 0; a < freeSeconds.length; a++) {
            seconds[step(a)] = freeSeconds[a];
        }
        return seconds;
    }
}
