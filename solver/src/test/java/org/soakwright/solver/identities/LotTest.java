package org.soakwright.solver.identities;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Reading;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.StageTooShort;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Surface;

/** How a lot is written down, and in which units, does not matter. */
class LotTest {
    private static final int DRAWS = 160;

    @Test
    void theOrderOfTheGradesDoesNotMatter() {
        Draw draw = new Draw(301);
        Tally tally = new Tally("order of the grades");
        Tally honest = new Tally("order of the grades, over the stated errors");
        for (int i = 0; i < DRAWS; i++) {
            List<Grade> lot = draw.lot(6);
            List<Integer> places = new ArrayList<>();
            for (int j = 0; j < lot.size(); j++) {
                places.add(j);
            }
            Collections.shuffle(places, new Random(i));
            Start start = draw.start();
            List<Timed> steps = steps(draw, lot);
            try {
                Course one = Timed.follow(lot, start, steps);
                Course other = Timed.follow(places.stream().map(lot::get).toList(), start, steps);
                double worst = departure(one, new Probe.Liquor(), other, new Probe.Liquor(), start, steps);
                for (int j = 0; j < lot.size(); j++) {
                    worst = Math.max(worst, ofGrade(one, places.get(j), other, j, start, steps));
                    honest.note(overStated(one, places.get(j), other, j));
                }
                tally.note(worst);
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        tally.within(1e-11, DRAWS / 2);
        honest.within(1, DRAWS);
    }

    @Test
    void aGradeMayBeSplitIntoTwoEqualOnes() {
        Draw draw = new Draw(302);
        Tally tally = new Tally("a grade split in two");
        for (int i = 0; i < DRAWS; i++) {
            List<Grade> lot = draw.lot(5);
            int which = draw.below(lot.size());
            Grade grade = lot.get(which);
            double part = draw.between(0.01, 0.99);
            List<Grade> split = new ArrayList<>(lot);
            split.set(which, new Grade(grade.axis(), grade.length(), part * grade.volume()));
            split.add(new Grade(grade.axis(), grade.length(), (1 - part) * grade.volume()));
            Start start = draw.start();
            List<Timed> steps = steps(draw, lot);
            try {
                Course one = Timed.follow(lot, start, steps);
                Course other = Timed.follow(split, start, steps);
                double worst = departure(one, new Probe.Liquor(), other, new Probe.Liquor(), start, steps);
                for (int j = 0; j < lot.size(); j++) {
                    worst = Math.max(worst, ofGrade(one, j, other, j, start, steps));
                }
                worst = Math.max(worst, ofGrade(one, which, other, lot.size(), start, steps));
                tally.note(worst);
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        tally.within(1e-11, DRAWS / 2);
    }

    @Test
    void sizesAndTimesScaleTogether() {
        Draw draw = new Draw(303);
        Tally tally = new Tally("scaling of sizes and times");
        for (int i = 0; i < DRAWS; i++) {
            List<Grade> lot = draw.lot(6);
            Start start = draw.start();
            List<Timed> steps = steps(draw, lot);
            double a = draw.log(0.05, 20);
            List<Grade> larger = lot.stream()
                    .map(g -> new Grade(g.axis(), a * g.length(), a * a * a * g.volume()))
                    .toList();
            try {
                Course one = Timed.follow(lot, start, steps);
                Course other = Timed.follow(
                        larger, start, steps.stream().map(s -> scaled(s, a)).toList());
                double worst = departure(one, new Probe.Liquor(), other, new Probe.Liquor(), start, steps);
                for (int j = 0; j < lot.size(); j++) {
                    worst = Math.max(worst, ofGrade(one, j, other, j, start, steps));
                }
                tally.note(worst);
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        tally.within(1e-11, DRAWS / 2);
    }

    private static List<Timed> steps(Draw draw, List<Grade> lot) {
        List<Timed> steps = new ArrayList<>();
        int count = 1 + draw.below(3);
        for (int k = 0; k < count; k++) {
            steps.add(draw.clinging(draw.stage(lot, draw.kind(), 1)));
        }
        return steps;
    }

    /** Sizes times a, volumes times a^3, times times a^2: Bi, V/S and Qt/V are kept. */
    private static Timed scaled(Timed step, double a) {
        Stage stage = step.stage();
        Surface surface = stage.surfaces().of(0) instanceof Surface.Film film
                ? new Surface.Film(film.coefficient() / a)
                : stage.surfaces().of(0);
        Surroundings around = stage.surroundings() instanceof Surroundings.Vessel v
                ? new Surroundings.Vessel(a * a * a * v.volume(), v.content(), a * v.flow(), v.feed())
                : stage.surroundings();
        return new Timed(
                new Stage(stage.diffusivity(), stage.partition(), surface, around, a * a * a * stage.clinging()),
                a * a * step.seconds());
    }

    private static double ofGrade(Course one, int grade, Course other, int same, Start start, List<Timed> steps) {
        double mean = departure(one, new Probe.Mean(grade), other, new Probe.Mean(same), start, steps);
        double core = departure(one, new Probe.At(grade, 0), other, new Probe.At(same, 0), start, steps);
        double surface = departure(one, new Probe.At(grade, 1), other, new Probe.At(same, 1), start, steps);
        return Math.max(mean, Math.max(core, surface));
    }

    /** Largest difference of the last stage's means, surfaces and liquors over the sum of their stated errors. */
    private static double overStated(Course one, int grade, Course other, int same) {
        int last = one.size() - 1;
        double mean = overStated(one.read(new Probe.Mean(grade), last), other.read(new Probe.Mean(same), last));
        double surface = overStated(one.read(new Probe.At(grade, 1), last), other.read(new Probe.At(same, 1), last));
        double liquor = overStated(one.read(new Probe.Liquor(), last), other.read(new Probe.Liquor(), last));
        return Math.max(mean, Math.max(surface, liquor));
    }

    private static double overStated(Reading a, Reading b) {
        double difference = Math.abs(a.value() - b.value());
        return difference == 0 ? 0 : difference / (a.error() + b.error());
    }

    private static double departure(Course one, Probe probe, Course other, Probe same, Start start, List<Timed> steps) {
        double[] bounds = Bounds.highest(start, steps);
        double worst = 0;
        for (int k = 0; k < steps.size(); k++) {
            double scale = bounds[k]
                    * (probe instanceof Probe.Liquor ? 1 : steps.get(k).stage().partition());
            worst = Math.max(worst, Math.abs(one.value(probe, k) - other.value(same, k)) / scale);
        }
        return worst;
    }
}
