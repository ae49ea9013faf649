package org.soakwright.planner.line;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.soakwright.planner.batch.Progress;
import org.soakwright.planner.line.constraint.Native;
import org.soakwright.planner.line.verify.Verification;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.line.LineJson;
import org.soakwright.recipes.LineOutcome;
import org.soakwright.recipes.Lines;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.text.Unsound;

/** The demonstration plant: eighteen orders of two recipes in a week, six tanks and troughs, one hoist, two shifts. */
class LinePlannerTest {
    private static final Options LITTLE = new Options(1, false);

    private final Locale locale = Locale.getDefault();
    private final TimeZone zone = TimeZone.getDefault();

    @AfterEach
    void restore() {
        Locale.setDefault(locale);
        TimeZone.setDefault(zone);
        System.clearProperty(Native.SWITCH);
    }

    private static Line quayside() {
        LineOutcome outcome = Lines.read(Path.of("../recipes/examples/quayside-hall.yaml"));
        if (outcome instanceof LineOutcome.Refused refused) {
            throw new AssertionError(refused.problems());
        }
        return ((LineOutcome.Accepted) outcome).line();
    }

    private static String json(LinePlan plan) {
        return LineJson.of(new Stamp("0.1.0", "00"), plan);
    }

    @Test
    void planningTimesAndOrderTogetherBeatsTimesThatWerePlannedAlone() {
        Line line = quayside();
        LinePlan together = LinePlanner.plan(line, LITTLE, Progress.NONE);
        LinePlan apart = LinePlanner.plan(line, new Options(1, true), Progress.NONE);
        for (LinePlan plan : List.of(together, apart)) {
            assertEquals(List.of(), Verification.of(line, json(plan)).faults());
            assertTrue(plan.loads().stream().allMatch(LoadPlan::met));
        }
        assertTrue(
                together.schedule().lateness() < 0.5 * apart.schedule().lateness(),
                together.schedule().lateness() + " s late against "
                        + apart.schedule().lateness());
        assertTrue(together.schedule().makespan() <= apart.schedule().makespan());
    }

    @Test
    void aLateLotIsExplainedAndABoundIsNeverAboveWhatWasFound() {
        LinePlan apart = LinePlanner.plan(quayside(), new Options(1, true), Progress.NONE);
        for (LoadPlan load : apart.loads()) {
            boolean late = apart.schedule().late(load.placed()) > 0;
            assertEquals(late, !load.late().isEmpty(), load.load().name());
            assertTrue(!late || load.late().size() > 1, () -> load.late().toString());
            load.legs()
                    .forEach(leg -> assertTrue(leg.slack() >= 0 && !leg.reason().isEmpty(), leg::toString));
        }
        assertTrue(apart.proof().lateness().orElse(0) <= apart.schedule().lateness());
        assertTrue(apart.proof().makespan().orElse(0) <= apart.schedule().makespan());
    }

    @Test
    void theSameLineGivesTheSameBytesWhereverItIsPlanned() {
        Locale.setDefault(Locale.US);
        TimeZone.setDefault(TimeZone.getTimeZone("America/St_Johns"));
        String here = json(LinePlanner.plan(quayside(), new Options(0.5, false), Progress.NONE));
        Locale.setDefault(Locale.forLanguageTag("tr-TR"));
        TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Chatham"));
        assertEquals(here, json(LinePlanner.plan(quayside(), new Options(0.5, false), Progress.NONE)));
    }

    @Test
    void withoutTheNativeSolverTheSearchServesAloneAndSaysSo() {
        System.setProperty(Native.SWITCH, "off");
        Line line = quayside();
        LinePlan plan = LinePlanner.plan(line, LITTLE, Progress.NONE);
        assertEquals(List.of(), Verification.of(line, json(plan)).faults());
        assertTrue(plan.proof().makespan().isEmpty() && plan.proof().lateness().isEmpty());
        assertTrue(plan.notes().stream().anyMatch(note -> note.contains("no native part")), plan.notes()::toString);
    }

    @Test
    void aLotThatNoShiftIsLongEnoughForIsRefusedAtItsPlace(@TempDir Path folder) throws IOException {
        Files.writeString(folder.resolve("slow.yaml"), """
                language: 1
                title: Slow soak
                product: [other]
                lot: {mass: 100 kg, density: 1000 kg/m3, pieces: [{name: slabs, shape: slab, thickness: 8 mm, share: 100 %}]}
                species: {salt: {start: 50 g/kg, diffusivity: 1e-9 m2/s, partition: 1}}
                steps:
                  - soak: watched
                    liquor: {ratio: 3 L/kg, salt: 0 g/L}
                    film: negligible
                    attended: true
                    time: 10 h
                targets: [{species: salt, reading: mean, at-most: 30 g/kg}]
                """);
        Path file = Files.writeString(folder.resolve("line.yaml"), """
                title: One tank
                starts: 2026-03-02T06:00
                zone: Europe/Oslo
                vessels:
                  tank: {count: 1, serves: [soak], volume: {gross: 1000 L, usable: 90 %}}
                crew: {hours: [{days: mon-fri, from: "06:00", to: "14:00", heads: 1}]}
                moves: {takes: 10 min, at-once: 1}
                lots:
                  - {lot: A, recipe: slow.yaml, mass: 100 kg}
                """);
        Line line = ((LineOutcome.Accepted) Lines.read(file)).line();
        Unsound refused =
                assertThrows(Unsound.class, () -> LinePlanner.plan(line, new Options(0, false), Progress.NONE));
        String problem = refused.problems().get(0).toString();
        assertTrue(problem.contains("line.yaml:9:") && problem.contains("attended"), problem);
    }
}
