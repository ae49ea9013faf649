package org.soakwright.solver.identities;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.StageTooShort;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.shape.Grade;

/**
 * Each step, from pieces to pieces through clean liquor, is a self-adjoint map. So steps in reverse order leave as much in a lot
 * that was loaded uniformly, whatever they are.
 */
class ReciprocityTest {
    @Test
    void theOrderOfTheStepsDoesNotChangeWhatTheLotKeeps() {
        Draw draw = new Draw(401);
        Tally tally = new Tally("reciprocity of the steps");
        for (int i = 0; i < 300; i++) {
            List<Grade> lot = draw.lot(6);
            Start start = new Start.Uniform(1);
            List<Timed> steps = new ArrayList<>();
            int count = 2 + draw.below(3);
            for (int k = 0; k < count; k++) {
                steps.add(draw.stage(lot, draw.kind(), 0));
            }
            List<Timed> reversed = new ArrayList<>(steps);
            Collections.reverse(reversed);
            Probe kept = new Probe.LotMean();
            try {
                double there = Timed.follow(lot, start, steps).value(kept, count - 1);
                double back = Timed.follow(lot, start, reversed).value(kept, count - 1);
                tally.note(Math.abs(there - back));
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        tally.within(2e-14, 200);
    }
}
