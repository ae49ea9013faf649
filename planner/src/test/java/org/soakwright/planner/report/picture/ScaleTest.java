package org.soakwright.planner.report.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Planner;

class ScaleTest {
    @Test
    void axesAreMarkedAtRoundValues() {
        assertEquals(List.of("0", "50", "100", "150", "200"), labels(Scale.holding(0, 190, 5)));
        assertEquals(List.of("170", "172", "174", "176", "178", "180"), labels(Scale.holding(170, 180, 5)));
        assertEquals(List.of("0.00", "0.02", "0.04"), labels(Scale.holding(0, 0.037, 3)));
        assertEquals(List.of("0.1", "1", "10", "100"), labels(Scale.logarithmic(0.3, 100)));
        assertEquals(List.of("0", "5", "10", "13"), labels(Scale.full(13, 6)));
    }

    @Test
    void whatIsHeldLiesOnTheAxis() {
        for (double most : new double[] {3e-5, 0.4, 7, 190, 1e6}) {
            Scale scale = Scale.holding(0.9 * most, most, 5);
            assertTrue(scale.at(0.9 * most) >= 0 && scale.at(0.9 * most) < scale.at(most) && scale.at(most) <= 1);
        }
        assertEquals(
                1,
                Scale.holding(0, 0, 5)
                        .ticks()
                        .get(Scale.holding(0, 0, 5).ticks().size() - 1)
                        .value());
    }

    @Test
    void anEvenClockStaysEven() {
        Clock clock = new Clock(Batches.history(Planner.plan(Batches.example("loin-desalting"), (what, share) -> {})
                        .run())
                .ends());
        assertTrue(clock.isEven());
        assertEquals(0.5, clock.at(clock.clock(0.5)), 1e-12);
    }

    @Test
    void aShortStepIsWideEnoughToBeSeen() {
        History history = Batches.history(Batches.crowded());
        Clock clock = new Clock(history.ends());
        assertFalse(clock.isEven());
        for (var end : history.ends()) {
            assertTrue(
                    clock.at(end.to()) - clock.at(end.from()) > 0.02, end.step().name());
        }
        for (double share = 0; share <= 1; share += 0.01) {
            assertEquals(share, clock.at(clock.clock(share)), 1e-9);
        }
        assertEquals(0, clock.at(0));
        assertEquals(1, clock.at(history.end()), 1e-12);
    }

    private static List<String> labels(Scale scale) {
        return scale.ticks().stream().map(Scale.Tick::label).toList();
    }
}
