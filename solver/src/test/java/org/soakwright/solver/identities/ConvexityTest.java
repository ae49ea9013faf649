package org.soakwright.solver.identities;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.StageTooShort;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Surface;

/** In unlimited clean liquor, from a uniform start and with one Biot number throughout, log(mean) is convex in the durations. */
class ConvexityTest {
    @Test
    void theLogarithmOfTheMeanLiesAboveItsTangentsAndBelowItsChords() {
        Draw draw = new Draw(701);
        Tally chords = new Tally("log(mean) above its chords");
        Tally tangents = new Tally("log(mean) below its tangents");
        for (int i = 0; i < 500; i++) {
            List<Grade> lot = draw.lot(3);
            double biot = draw.log(1e-6, 1e6);
            List<Stage> stages = new ArrayList<>();
            int count = 1 + draw.below(4);
            double[] t = new double[count];
            double[] u = new double[count];
            double[] middle = new double[count];
            double length = lot.get(0).length();
            for (int k = 0; k < count; k++) {
                double diffusivity = draw.log(1e-11, 1e-8);
                double partition = draw.log(0.1, 10);
                Surface film = new Surface.Film(biot * partition * diffusivity / length);
                stages.add(new Stage(diffusivity, partition, film, new Surroundings.Plenty(0), 0));
                double unit = length * length / diffusivity;
                t[k] = unit * draw.log(1e-4, 3);
                u[k] = unit * draw.log(1e-4, 3);
                middle[k] = 0.5 * (t[k] + u[k]);
            }
            Chain chain = Chain.of(lot, new Start.Uniform(1), stages);
            Probe mean = i % 2 == 0 ? new Probe.Mean(0) : new Probe.LotMean();
            try {
                Course atT = chain.follow(t);
                double a = Math.log(atT.value(mean, count - 1));
                double b = Math.log(chain.follow(u).value(mean, count - 1));
                double m = Math.log(chain.follow(middle).value(mean, count - 1));
                double[] slope = atT.gradient(mean, count - 1);
                double tangent = a;
                for (int k = 0; k < count; k++) {
                    tangent += slope[k] / atT.value(mean, count - 1) * (u[k] - t[k]);
                }
                double scale = 1 + Math.abs(a) + Math.abs(b);
                chords.note(Math.max(0, m - 0.5 * (a + b)) / scale);
                tangents.note(Math.max(0, tangent - b) / (scale + Math.abs(tangent)));
            } catch (StageTooShort refused) {
                chords.skip();
                tangents.skip();
            }
        }
        chords.within(1e-14, 350);
        tangents.within(1e-14, 350);
    }
}
