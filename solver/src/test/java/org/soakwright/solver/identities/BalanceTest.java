package org.soakwright.solver.identities;

import java.util.List;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.StageTooShort;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.identities.Draw.Kind;
import org.soakwright.solver.shape.Grade;

/** Solute is neither made nor lost: what leaves the pieces is in the liquor or has run off with it. */
class BalanceTest {
    private static final Probe LIQUOR = new Probe.Liquor();
    private static final Probe LOT = new Probe.LotMean();
    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendreHighPrecision(16);

    @Test
    void aClosedBathConservesTheSolute() {
        Draw draw = new Draw(101);
        Tally tally = new Tally("balance of closed baths");
        for (int i = 0; i < 500; i++) {
            List<Grade> lot = draw.lot(6);
            Start start = new Start.Uniform(draw.between(0, Draw.MOST));
            // With pure water what the liquor gains is measured against the pieces alone, up to V/S = 1e6.
            boolean water = i % 2 == 0;
            Timed step = draw.stage(lot, Kind.CLOSED, water ? 0 : 1);
            try {
                Course course = Timed.follow(lot, start, List.of(step));
                double capacity = Draw.capacity(lot, step.stage().partition());
                double volume = vessel(step).volume();
                double before = amount(((Start.Uniform) start).content(), lot)
                        + volume * vessel(step).content();
                double after = amount(course.value(LOT, 0), lot) + volume * course.value(LIQUOR, 0);
                double scale = (capacity + (water ? 0 : volume)) * Bounds.highest(start, List.of(step))[0];
                tally.note(Math.abs(after - before) / scale);
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        tally.within(2e-14, 350);
    }

    @Test
    void dragOutCarriesItsSoluteFromBathToBath() {
        Draw draw = new Draw(102);
        Tally tally = new Tally("balance of closed baths with drag-out and rest");
        for (int i = 0; i < 240; i++) {
            List<Grade> lot = draw.lot(4);
            Start start = draw.start();
            Timed first = draw.clinging(draw.stage(lot, Kind.CLOSED, 1));
            Timed rest = draw.stage(lot, Kind.REST, 0);
            Timed second = draw.stage(lot, Kind.CLOSED, 1);
            List<Timed> steps = List.of(first, rest, second);
            try {
                Course course = Timed.follow(lot, start, steps);
                double clinging = first.stage().clinging();
                double poured = vessel(second).volume();
                double before = amount(course.value(LOT, 0), lot)
                        + clinging * course.value(LIQUOR, 0)
                        + poured * vessel(second).content();
                double after = amount(course.value(LOT, 2), lot) + (poured + clinging) * course.value(LIQUOR, 2);
                double scale = Draw.capacity(lot, second.stage().partition()) + poured + clinging;
                tally.note(Math.abs(after - before) / (scale * Bounds.highest(start, steps)[2]));
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        tally.within(2e-14, 150);
    }

    @Test
    void whatRunsOffIsWhatPiecesAndVesselLose() {
        Draw draw = new Draw(103);
        Tally tally = new Tally("balance of flowing vessels, outflow by quadrature");
        for (int i = 0; i < 220; i++) {
            List<Grade> lot = draw.lot(6);
            Start start = draw.start();
            boolean water = i % 2 == 0;
            Timed step = draw.stage(lot, Kind.FLOWING, water ? 0 : 1);
            try {
                Chain chain = Timed.chain(lot, start, List.of(step));
                double from = step.seconds() / 16;
                double outflow = outflow(chain, step, from);
                double change = held(chain, step, lot, step.seconds()) - held(chain, step, lot, from);
                double scale = Draw.capacity(lot, step.stage().partition())
                        + (water ? 0 : vessel(step).volume());
                tally.note(Math.abs(change + outflow) / (scale * Bounds.highest(start, List.of(step))[0]));
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        tally.within(3e-14, 140);
    }

    /** The first instants cannot be read, so the outflow there is only known to lie between two bounds. */
    @Test
    void whatRunsOffFromTheVeryBeginningIsWhatWasLoadedLessWhatRemains() {
        Draw draw = new Draw(104);
        Tally tally = new Tally("balance of flowing vessels from the start, beyond the bounds of the first instant");
        Tally width = new Tally("width of those bounds");
        for (int i = 0; i < 60; i++) {
            List<Grade> lot = draw.lot(1);
            double content = draw.between(1, Draw.MOST);
            Start start = new Start.Uniform(content);
            Timed step = draw.stage(lot, Kind.FLOWING, 0);
            double instant = 1e-5
                    * lot.get(0).length()
                    * lot.get(0).length()
                    / step.stage().diffusivity();
            if (step.seconds() < 100 * instant) {
                tally.skip();
                continue;
            }
            Chain chain = Timed.chain(lot, start, List.of(step));
            double scale = amount(content, lot);
            double early = vessel(step).flow() * instant * chain.follow(instant).value(LIQUOR, 0) / scale;
            double outflow = outflow(chain, step, instant) / scale;
            double remains = held(chain, step, lot, step.seconds()) / scale;
            double missing = 1 - remains - outflow;
            // The liquor starts clean and rises; it may peak, but not above twice what it holds at the first reading.
            tally.note(Math.max(0, Math.max(-missing, missing - 2 * early)));
            width.note(2 * early);
        }
        tally.within(1e-14, 30);
        width.within(1e-2, 30);
    }

    private static double outflow(Chain chain, Timed step, double from) {
        double sum = 0;
        double left = from;
        while (left < step.seconds()) {
            double right = 2.001 * left > step.seconds() ? step.seconds() : 2 * left;
            double half = 0.5 * (right - left);
            for (int i = 0; i < RULE.getNumberOfPoints(); i++) {
                double t = left + half * (1 + RULE.getPoint(i));
                double net = chain.follow(t).value(LIQUOR, 0) - vessel(step).feed();
                sum += half * RULE.getWeight(i) * vessel(step).flow() * net;
            }
            left = right;
        }
        return sum;
    }

    private static double held(Chain chain, Timed step, List<Grade> lot, double t) {
        Course course = chain.follow(t);
        return amount(course.value(LOT, 0), lot) + vessel(step).volume() * course.value(LIQUOR, 0);
    }

    private static double amount(double content, List<Grade> lot) {
        return content * Draw.capacity(lot, 1);
    }

    private static Surroundings.Vessel vessel(Timed step) {
        return (Surroundings.Vessel) step.stage().surroundings();
    }
}
