package org.soakwright.planner.line.shop;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Schedules of tiny shops against all there are on a grid of ten minutes. */
class TinyShopsTest {
    private static final int DRAWS = 120;
    private static final int PLACINGS = 1500;

    /** Nothing that is tried ends so much later than what was found. */
    private static final int SLACK = 4;

    @ParameterizedTest(name = "physics {0}, lateness {1}: at least {2} %")
    @CsvSource({"false, false, 90", "false, true, 95", "true, false, 88", "true, true, 85"})
    void mostAreAsGoodAsTheBestOfAllAndAllAreAllowed(boolean physics, boolean late, int percent) {
        SplittableRandom random = new SplittableRandom(7);
        int shops = 0;
        int best = 0;
        List<String> worse = new ArrayList<>();
        for (int draw = 0; draw < DRAWS; draw++) {
            TinyShop tiny = TinyShop.drawn(random, physics);
            Search search = new Search(tiny.shop(), tiny.jobs(), tiny.aims(late));
            Search.Found found;
            try {
                found = search.best(PLACINGS);
            } catch (Search.Unplaceable none) {
                assertEquals(
                        TinyShop.STEPS,
                        Everything.below(tiny, false, TinyShop.STEPS - 4, TinyShop.STEPS),
                        () -> none.getMessage() + ", yet there is a schedule");
                continue;
            }
            Allowed.check(found.schedule());
            assertEquals(0, found.missing());
            double value =
                    (late ? found.schedule().lateness() : found.schedule().makespan()) / TinyShop.STEP;
            long whole = (long) Math.ceil(value - 1e-9);
            long latest = found.schedule().makespan() / TinyShop.STEP + SLACK;
            shops++;
            if (latest < TinyShop.STEPS && Everything.below(tiny, late, (int) latest, whole) < whole) {
                worse.add(draw + ": " + value);
            } else {
                best++;
            }
        }
        assertTrue(shops > 0.8 * DRAWS, "most draws can be made at all");
        assertTrue(100 * best >= percent * shops, best + " of " + shops + " are as good as any; not " + worse);
    }
}
