package org.soakwright.planner.line.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.soakwright.planner.batch.Progress;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.LinePlanner;
import org.soakwright.planner.line.Options;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.line.LineJson;
import org.soakwright.recipes.LineOutcome;
import org.soakwright.recipes.Lines;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.text.Unsound;

/** Whatever hall there is, what the planner makes of it keeps every rule of it. */
class RandomHallsTest {
    private static final int FIRST = 190;
    private static final int HALLS = 70;

    @TempDir
    Path folder = Path.of("");

    private static void assertKept(Line line, Options options, long seed) {
        LinePlan plan = LinePlanner.plan(line, options, Progress.NONE);
        List<String> faults = Verification.of(line, LineJson.of(new Stamp("0.1.0", "00"), plan))
                .faults();
        assertEquals(List.of(), faults, "hall " + seed);
    }

    @Test
    void everyScheduleKeepsEveryRule() throws IOException {
        int planned = 0;
        for (long seed = FIRST; seed < FIRST + HALLS; seed++) {
            Path own = Files.createDirectory(folder.resolve("hall" + seed));
            LineOutcome outcome = Lines.read(RandomHall.write(own, seed));
            if (outcome instanceof LineOutcome.Accepted accepted) {
                try {
                    assertKept(accepted.line(), new Options(seed % 4 == 0 ? 0.3 : 0, seed % 5 == 0), seed);
                    planned++;
                } catch (Unsound unsound) {
                    unsound.problems()
                            .forEach(problem ->
                                    assertFalse(problem.place().toString().isBlank(), problem.toString()));
                }
            }
        }
        assertTrue(planned > 0.7 * HALLS, planned + " halls had a schedule");
    }
}
