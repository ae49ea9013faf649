package org.soakwright.solver.identities;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Surface;

/** Highest and lowest against the whole profile looked at closely, while a maximum travels from the surface to the core. */
class ExtremaTest {
    private static final int LOOKS = 4000;

    private static Chain saltedThenRinsed(Axis axis) {
        Surface open = new Surface.Open();
        return Chain.of(
                List.of(new Grade(axis, 1, 1)),
                new Start.Uniform(0),
                List.of(
                        new Stage(1, 1, open, new Surroundings.Plenty(100), 0),
                        new Stage(1, 1, open, new Surroundings.Plenty(0), 0)));
    }

    /** When the curvature at the core turns, seen without the search that is tested. */
    private static double arrival(Axis axis, double soak) {
        double before = 1e-3;
        double after = 1;
        Chain chain = saltedThenRinsed(axis);
        while (after - before > 1e-12) {
            double middle = 0.5 * (before + after);
            Course course = chain.follow(soak, middle);
            boolean rises = course.value(new Probe.At(0, 1e-4), 1) > course.value(new Probe.At(0, 0), 1);
            before = rises ? middle : before;
            after = rises ? after : middle;
        }
        return before;
    }

    @Test
    void nothingInTheProfileExceedsItsExtrema() {
        SplittableRandom random = new SplittableRandom(77);
        int inside = 0;
        int nearCore = 0;
        double worst = 0;
        int draws = 600;
        for (int i = 0; i < draws; i++) {
            Axis axis = List.of(Axis.values()).get(i % 3);
            double soak = 0.05 + 0.3 * random.nextDouble();
            // Every other draw stops the maximum just before it reaches the core.
            double rinse = i % 2 == 0
                    ? 2e-3 * Math.pow(60, random.nextDouble())
                    : arrival(axis, soak) * (1 - Math.pow(10, -1 - 5 * random.nextDouble()));
            Course course = saltedThenRinsed(axis).follow(soak, rinse);
            double high = course.value(new Probe.Highest(0), 1);
            double low = course.value(new Probe.Lowest(0), 1);
            double place = course.place(new Probe.Highest(0), 1)[0];
            inside += place > 0 && place < 1 ? 1 : 0;
            nearCore += place > 0 && place < 0.03 ? 1 : 0;
            double seenHigh = Double.NEGATIVE_INFINITY;
            double seenLow = Double.POSITIVE_INFINITY;
            for (int k = 0; k <= LOOKS; k++) {
                double seen = course.value(new Probe.At(0, (double) k / LOOKS), 1);
                seenHigh = Math.max(seenHigh, seen);
                seenLow = Math.min(seenLow, seen);
            }
            worst = Math.max(worst, Math.max(seenHigh - high, low - seenLow));
            // A parabola through the top is missed by at most curvature times a quarter of the square of a spacing.
            assertTrue(high - seenHigh <= 1e-3 && seenLow - low <= 1e-3, () -> axis + " " + soak + " " + rinse);
        }
        System.out.println("extrema against " + (LOOKS + 1) + " looks: " + draws + " draws, " + inside + " inside, "
                + nearCore + " within 0.03 of the core, exceeded by at most " + worst);
        assertTrue(inside > 300 && nearCore > 50);
        assertTrue(worst <= 1e-11, "exceeded by " + worst);
    }

    @Test
    void anExtremumDoesNotDependOnWhatWasReadBefore() {
        for (Axis axis : Axis.values()) {
            for (double rinse = 0.01; rinse < 0.06; rinse += 1.7e-3) {
                Chain used = saltedThenRinsed(axis);
                used.follow(1e-3, 1e-4).value(new Probe.Range(0), 1);
                double fresh = saltedThenRinsed(axis).follow(0.1, rinse).value(new Probe.Highest(0), 1);
                assertEquals(fresh, used.follow(0.1, rinse).value(new Probe.Highest(0), 1), 1e-12);
            }
        }
    }
}
