package org.soakwright.solver.identities;

import java.util.List;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.identities.Draw.Kind;
import org.soakwright.solver.shape.Grade;

/** Pieces of several sides neither make nor lose solute: see {@link BalanceTest}. */
class SolidsBalanceTest {
    private static final Probe LIQUOR = new Probe.Liquor();
    private static final Probe LOT = new Probe.LotMean();

    @Test
    void aClosedBathConservesTheSolute() {
        Draw draw = new Draw(1101);
        Tally tally = new Tally("several sides: balance of closed baths");
        for (int i = 0; i < 60; i++) {
            List<Grade> lot = draw.solids(1 + i % 3);
            double content = draw.between(0, Draw.MOST);
            boolean water = i % 2 == 0;
            Timed step = draw.grained(draw.stage(lot, Kind.CLOSED, water ? 0 : 1));
            Start start = new Start.Uniform(content);
            Course course = Timed.follow(lot, start, List.of(step));
            double volume = vessel(step).volume();
            double before =
                    content * Draw.capacity(lot, 1) + volume * vessel(step).content();
            double after = course.value(LOT, 0) * Draw.capacity(lot, 1) + volume * course.value(LIQUOR, 0);
            double capacity = Draw.capacity(lot, step.stage().partition());
            double scale = (capacity + (water ? 0 : volume)) * Bounds.highest(start, List.of(step))[0];
            tally.note(Math.abs(after - before) / scale);
        }
        tally.within(1e-11, 60);
    }

    @Test
    void dragOutCarriesItsSoluteFromBathToBath() {
        Draw draw = new Draw(1102);
        Tally tally = new Tally("several sides: balance of closed baths with drag-out and rest");
        for (int i = 0; i < 40; i++) {
            List<Grade> lot = draw.solids(1 + i % 3);
            Start start = new Start.Uniform(draw.between(0, Draw.MOST));
            Timed first = draw.clinging(draw.grained(draw.stage(lot, Kind.CLOSED, 1)));
            Timed rest = draw.grained(draw.stage(lot, Kind.REST, 0));
            Timed second = draw.grained(draw.stage(lot, Kind.CLOSED, 1));
            List<Timed> steps = List.of(first, rest, second);
            Course course = Timed.follow(lot, start, steps);
            double clinging = first.stage().clinging();
            double poured = vessel(second).volume();
            double before = course.value(LOT, 0) * Draw.capacity(lot, 1)
                    + clinging * course.value(LIQUOR, 0)
                    + poured * vessel(second).content();
            double after = course.value(LOT, 2) * Draw.capacity(lot, 1) + (poured + clinging) * course.value(LIQUOR, 2);
            double scale = Draw.capacity(lot, second.stage().partition()) + poured + clinging;
            tally.note(Math.abs(after - before) / (scale * Bounds.highest(start, steps)[2]));
        }
        tally.within(1e-11, 40);
    }

    @Test
    void whatRunsOffIsWhatPiecesAndVesselLose() {
        Draw draw = new Draw(1103);
        Tally tally = new Tally("several sides: balance of flowing vessels, outflow by quadrature");
        GaussIntegrator rule = new GaussIntegratorFactory().legendreHighPrecision(12);
        for (int i = 0; i < 12; i++) {
            List<Grade> lot = draw.solids(1 + i % 2);
            Timed step = draw.grained(draw.stage(lot, Kind.FLOWING, i % 3 == 0 ? 0 : 1));
            Start start = new Start.Uniform(draw.between(0, Draw.MOST));
            Chain chain = Timed.chain(lot, start, List.of(step));
            double outflow = 0;
            double before = step.seconds() / 8;
            double change = held(chain, step, lot, step.seconds()) - held(chain, step, lot, before);
            for (double left = before; left < 0.99 * step.seconds(); left *= 2) {
                for (int p = 0; p < rule.getNumberOfPoints(); p++) {
                    double t = left + 0.5 * left * (1 + rule.getPoint(p));
                    double net = chain.follow(t).value(LIQUOR, 0) - vessel(step).feed();
                    outflow += 0.5 * left * rule.getWeight(p) * vessel(step).flow() * net;
                }
            }
            double scale =
                    Draw.capacity(lot, step.stage().partition()) + vessel(step).volume();
            tally.note(Math.abs(change + outflow) / (scale * Bounds.highest(start, List.of(step))[0]));
        }
        tally.within(1e-8, 12);
    }

    private static double held(Chain chain, Timed step, List<Grade> lot, double t) {
        Course course = chain.follow(t);
        return course.value(LOT, 0) * Draw.capacity(lot, 1) + vessel(step).volume() * course.value(LIQUOR, 0);
    }

    private static Surroundings.Vessel vessel(Timed step) {
        return (Surroundings.Vessel) step.stage().surroundings();
    }
}
