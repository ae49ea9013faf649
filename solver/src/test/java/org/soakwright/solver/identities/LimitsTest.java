package org.soakwright.solver.identities;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.StageTooShort;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.identities.Draw.Kind;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Surface;

/** Where a simpler law takes over, the full one agrees with it, to within the simpler law's next term. */
class LimitsTest {
    private static final Probe MEAN = new Probe.Mean(0);
    private static final Start LOADED = new Start.Uniform(1);

    @Test
    void behindAThickFilmTheContentFallsExponentially() {
        Draw draw = new Draw(501);
        Tally tally = new Tally("Bi to 0, in units of the next term");
        for (int i = 0; i < 500; i++) {
            Grade grade = draw.lot(1).get(0);
            double biot = draw.log(1e-6, 1e-3);
            double diffusivity = 1e-9;
            Surface film = new Surface.Film(biot * diffusivity / grade.length());
            Stage stage = new Stage(diffusivity, 1, film, new Surroundings.Plenty(0), 0);
            double fourier = draw.log(1, 10 / biot);
            double seconds = fourier * grade.length() * grade.length() / diffusivity;
            double found = Timed.follow(List.of(grade), LOADED, List.of(new Timed(stage, seconds)))
                    .value(MEAN, 0);
            int sides = grade.axis().power() + 1;
            // The slowest rate is (s + 1) Bi (1 - Bi/(s + 3) + ...), its weight 1 - O(Bi^2).
            double exponent = sides * biot * fourier;
            double law = Math.exp(-exponent * (1 - biot / (sides + 2)));
            tally.note(Math.abs(found / law - 1) / (biot * biot * (1 + exponent) + 1e-14));
        }
        tally.within(1, 500);
    }

    @Test
    void muchLiquorOrMuchFlowIsUnlimitedLiquor() {
        Draw draw = new Draw(502);
        Tally volume = new Tally("V to infinity, in units of S/V");
        Tally flow = new Tally("Q to infinity, in units of S/(Q t)");
        for (int i = 0; i < 300; i++) {
            List<Grade> lot = draw.lot(3);
            Timed unlimited = draw.stage(lot, Kind.PLENTY, 1);
            double content = ((Surroundings.Plenty) unlimited.stage().surroundings()).content();
            double capacity = Draw.capacity(lot, unlimited.stage().partition());
            double much = draw.log(1e6, 1e12);
            Timed closed = unlimited.with(new Surroundings.Vessel(much * capacity, content, 0, 0));
            // A small vessel whose content is renewed many times while anything happens.
            double rate = much * capacity / unlimited.seconds();
            Timed flowing = unlimited.with(new Surroundings.Vessel(capacity, content, rate, content));
            try {
                double scale = Bounds.highest(LOADED, List.of(unlimited))[0]
                        * unlimited.stage().partition();
                double expected = Timed.follow(lot, LOADED, List.of(unlimited)).value(MEAN, 0);
                double inClosed = Timed.follow(lot, LOADED, List.of(closed)).value(MEAN, 0);
                double inFlow = Timed.follow(lot, LOADED, List.of(flowing)).value(MEAN, 0);
                volume.note(Math.abs(inClosed - expected) / scale / (1 / much + 1e-12));
                flow.note(Math.abs(inFlow - expected) / scale / (1 / much + 1e-12));
            } catch (StageTooShort refused) {
                volume.skip();
                flow.skip();
            }
        }
        volume.within(2, 250);
        flow.within(1, 250);
    }

    @Test
    void inTheLongRunPiecesAndLiquorShareTheSolute() {
        Draw draw = new Draw(503);
        Tally tally = new Tally("long times, equilibrium");
        for (int i = 0; i < 500; i++) {
            List<Grade> lot = draw.lot(6);
            double content = draw.between(1, Draw.MOST);
            Timed step = draw.stage(lot, Kind.CLOSED, 1);
            Stage stage = step.stage();
            Surroundings.Vessel vessel = (Surroundings.Vessel) stage.surroundings();
            double longest = lot.stream().mapToDouble(Grade::length).max().orElseThrow();
            double slowness = 1 + 1 / cappedBiot(step, lot.get(0));
            double seconds = 400 * slowness * longest * longest / stage.diffusivity();
            Course course = Timed.follow(lot, new Start.Uniform(content), List.of(step.lasting(seconds)));
            double capacity = Draw.capacity(lot, stage.partition());
            double shared = (capacity * content / stage.partition() + vessel.volume() * vessel.content())
                    / (capacity + vessel.volume());
            double worst = Math.abs(course.value(new Probe.Liquor(), 0) / shared - 1);
            for (int j = 0; j < lot.size(); j++) {
                double highest = course.value(new Probe.Highest(j), 0) / stage.partition();
                double lowest = course.value(new Probe.Lowest(j), 0) / stage.partition();
                worst = Math.max(worst, Math.max(Math.abs(highest / shared - 1), Math.abs(lowest / shared - 1)));
            }
            tally.note(worst);
        }
        tally.within(5e-13, 500);
    }

    @Test
    void atFirstTheUptakeGrowsWithTheRootOfTime() {
        Draw draw = new Draw(504);
        Tally tally = new Tally("short times without film, beyond the next term");
        for (int i = 0; i < 300; i++) {
            Grade grade = draw.lot(1).get(0);
            double fourier = draw.log(1e-5, 1e-2);
            double seconds = fourier * grade.length() * grade.length() / 1e-9;
            Stage stage = new Stage(1e-9, 1, new Surface.Open(), new Surroundings.Plenty(1), 0);
            double uptake = Timed.follow(List.of(grade), new Start.Uniform(0), List.of(new Timed(stage, seconds)))
                    .value(MEAN, 0);
            // 2 (s + 1) sqrt(Fo/pi) less s (s + 1)/2 Fo; then nothing for slab and sphere but exp(-1/Fo), and for the
            // cylinder Fo^(3/2)/(3 sqrt(pi)) with a next term measured at about Fo^2/8.
            int power = grade.axis().power();
            double law = 2 * (power + 1) * Math.sqrt(fourier / Math.PI) - 0.5 * power * (power + 1) * fourier;
            double rest = 0;
            if (power == 1) {
                law -= Math.pow(fourier, 1.5) / (3 * Math.sqrt(Math.PI));
                rest = fourier * fourier / 4;
            }
            tally.note(Math.abs(uptake - law) / (rest + 1e-13));
        }
        tally.within(1, 300);
    }

    /** Bi of a grade, no more than 1. */
    private static double cappedBiot(Timed step, Grade grade) {
        return step.stage().surfaces().of(0) instanceof Surface.Film film
                ? Math.min(
                        1,
                        film.coefficient()
                                * grade.length()
                                / (step.stage().partition() * step.stage().diffusivity()))
                : 1;
    }
}
