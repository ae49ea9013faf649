package org.soakwright.solver.identities;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Reading;
import org.soakwright.solver.chain.StageTooShort;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.identities.Draw.Kind;
import org.soakwright.solver.shape.Grade;

/** To stop for a moment changes nothing: a stage is as good as its two parts. */
class SemigroupTest {
    @Test
    void twoPartsOfAStageMakeTheWhole() {
        for (Kind kind : Kind.values()) {
            Draw draw = new Draw(200 + kind.name().hashCode());
            Tally tally = new Tally("semigroup, " + kind);
            Tally honest = new Tally("semigroup, " + kind + ", over the stated errors");
            for (int i = 0; i < 100; i++) {
                List<Grade> lot = draw.lot(6);
                Start start = draw.start();
                Timed step = draw.stage(lot, kind, 1);
                double part = step.seconds() * draw.between(0.1, 0.9);
                try {
                    compare(lot, start, step, part, tally, honest);
                } catch (StageTooShort refused) {
                    tally.skip();
                }
            }
            // Where much liquor nearly follows a mode of the pieces, the two are told apart with fewer digits.
            tally.within(kind == Kind.FLOWING ? 1e-11 : 2e-13, 75);
            honest.within(1, 500);
        }
    }

    private static void compare(List<Grade> lot, Start start, Timed step, double part, Tally tally, Tally honest) {
        Course whole = Timed.follow(lot, start, List.of(step));
        Timed first = step.lasting(part);
        Timed second = step.lasting(step.seconds() - part);
        if (step.stage().surroundings() instanceof Surroundings.Vessel vessel) {
            double liquor = Timed.follow(lot, start, List.of(first)).value(new Probe.Liquor(), 0);
            second = second.with(
                    new Surroundings.Vessel(vessel.volume(), Math.max(0, liquor), vessel.flow(), vessel.feed()));
        }
        Course parts = Timed.follow(lot, start, List.of(first, second));
        double scale = Bounds.highest(start, List.of(step))[0];
        double worst = 0;
        List<Probe> probes = new ArrayList<>(List.of(new Probe.Liquor(), new Probe.LotMean()));
        for (int j = 0; j < lot.size(); j++) {
            probes.addAll(List.of(new Probe.Mean(j), new Probe.At(j, 0), new Probe.At(j, 0.6), new Probe.At(j, 1)));
        }
        for (Probe probe : probes) {
            Reading a = whole.read(probe, 0);
            Reading b = parts.read(probe, 1);
            double difference = Math.abs(a.value() - b.value());
            double partition = probe instanceof Probe.Liquor ? 1 : step.stage().partition();
            worst = Math.max(worst, difference / (partition * scale));
            // The second part's liquor is typed in, rounded.
            double allowed = a.error() + b.error() + Math.ulp(partition * scale);
            honest.note(difference / allowed);
        }
        tally.note(worst);
    }
}
