package org.soakwright.planner.batch;

import java.util.List;
import org.soakwright.solver.chain.Course;

/**
 * A batch at the end of a stage, from which measures are read.
 *
 * @param courses of each species, up to the stage or farther
 * @param seconds of the stages by the clock, up to the stage or farther
 * @param whole all the time of the recipe that {@link Batch#exchanging counts} for a moisture, s
 * @param sloping whether derivatives by the durations of the steps are wanted
 */
record State(Batch batch, List<Course> courses, double[] seconds, double whole, int stage, boolean sloping) {
    /** What a gauge of a species' chain reads, kg/m3. */
    Dual read(int species, Gauge gauge) {
        Course course = courses.get(species);
        double value = gauge.value(course, stage);
        if (!sloping) {
            return number(value);
        }
        return new Dual(value, batch.byStep(species, gauge.gradient(course, stage), seconds));
    }

    Dual number(double value) {
        return sloping ? Dual.constant(value, batch.recipe().steps().size()) : new Dual(value, new double[0]);
    }

    /** The part of all the time in liquor or air that is over, 1; at rest nothing is exchanged. Where all is rest, of all the time. */
    Dual elapsed() {
        double over = 0;
        for (int k = 0; k <= stage; k++) {
            over += batch.exchanges(k) ? seconds[k] : 0;
        }
        if (!sloping) {
            return number(over / whole);
        }
        double[] slopes = new double[batch.recipe().steps().size()];
        for (int k = 0; k < seconds.length; k++) {
            Translation.Slot slot = batch.slots().get(k);
            if (batch.exchanges(k)) {
                slopes[slot.step()] += slot.part() * ((k <= stage ? 1 : 0) - over / whole) / whole;
            }
        }
        return new Dual(over / whole, slopes);
    }

    /** Whether a step is over. */
    boolean past(int step) {
        return batch.lastStage(step) <= stage;
    }
}
