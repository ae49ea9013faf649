package org.soakwright.planner.report.page;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.math.BigDecimal;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.batch.Groups;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.Trace;
import org.soakwright.planner.report.Findings;
import org.soakwright.planner.report.Folder;
import org.soakwright.planner.report.GroupTable;
import org.soakwright.planner.report.ResultJson;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.paper.BatchPaper;
import org.soakwright.planner.report.picture.Picture;
import org.soakwright.planner.report.picture.Pictures;
import org.soakwright.planner.report.picture.Theme;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Time;
import org.soakwright.recipes.text.Kind;

/**
 * The report of a batch as the files of a folder: {@code index.html}, the batch sheet as {@code batch-sheet.html} and {@code .pdf},
 * {@code result.json}, {@code tables/*.csv} and {@code pictures/*.svg}. The same bytes for the same recipe.
 */
public final class Report {
    private Report() {}

    /**
     * Of a recipe followed as written.
     *
     * @param start of the first step by the clock on the wall, where it is known
     */
    public static List<Folder.Entry> of(Run run, Stamp stamp, Optional<LocalDateTime> start) {
        Beside<Paper> paper = Beside.begin(() -> Paper.of(BatchPaper.of(again(run), stamp, start)));
        return entries(
                new Told("Recipe followed as written", run, null, Findings.of(run, start), ResultJson.of(stamp, run)),
                paper,
                stamp,
                start);
    }

    /** Of a plan; where no choice meets the targets, of its nearest miss, marked as such. */
    public static List<Folder.Entry> of(Plan plan, Stamp stamp, Optional<LocalDateTime> start) {
        Beside<Paper> paper = Beside.begin(() -> Paper.of(BatchPaper.of(again(plan), stamp, start)));
        String kind = plan.mayBeUsed()
                ? "Batch plan"
                : plan.met() ? "Stopped, not a plan to use" : "Nearest miss, not a plan";
        return entries(
                new Told(kind, plan.run(), plan, Findings.of(plan, start), ResultJson.of(stamp, plan)),
                paper,
                stamp,
                start);
    }

    /** What a report tells of. */
    private record Told(String kind, Run run, @Nullable Plan plan, Findings findings, String json) {}

    /** The batch sheet, printed. */
    private record Paper(String html, byte[] pdf) {
        static Paper of(BatchPaper paper) throws IOException {
            ByteArrayOutputStream pdf = new ByteArrayOutputStream();
            paper.pdf(pdf);
            return new Paper(paper.html(), pdf.toByteArray());
        }
    }

    /** The same with a batch of its own, which another thread may follow. */
    private static Run again(Run run) {
        return run.again();
    }

    private static Plan again(Plan plan) {
        return new Plan(
                again(plan.run()),
                plan.mayBeUsed(),
                plan.proof(),
                plan.binds(),
                plan.perHour(),
                plan.nearestMiss(),
                plan.remedies());
    }

    private static List<Folder.Entry> entries(
            Told told, Beside<Paper> beside, Stamp stamp, Optional<LocalDateTime> start) {
        Recipe fixed = fixed(told.run());
        List<Groups.Group> groups = Groups.of(fixed);
        Trace trace = Trace.of(told.run(), Pictures.LAYERS);
        List<String> binds = told.plan() == null ? List.of() : told.plan().binds();
        List<Picture> pictures = Pictures.of(trace, binds);

        List<Folder.Entry> entries = new ArrayList<>();
        Tables.of(trace, told.plan(), groups, start).forEach((name, text) -> entries.add(Folder.Entry.of(name, text)));
        pictures.forEach(
                picture -> entries.add(Folder.Entry.of("pictures/" + picture.id() + ".svg", picture.svg(Theme.LIGHT))));
        entries.add(0, Folder.Entry.of("result.json", told.json()));
        List<String> files = new ArrayList<>(List.of("batch-sheet.html", "batch-sheet.pdf"));
        entries.forEach(entry -> files.add(entry.path()));
        String page = BatchPage.of(new BatchPage.Subject(
                told.kind(),
                told.run(),
                told.findings(),
                binds,
                GroupTable.section(fixed, groups),
                pictures,
                start,
                stamp,
                files));
        Paper paper = beside.result();
        entries.add(0, new Folder.Entry("batch-sheet.pdf", out -> out.write(paper.pdf())));
        entries.add(0, Folder.Entry.of("batch-sheet.html", paper.html()));
        entries.add(0, Folder.Entry.of("index.html", page));
        return entries;
    }

    /** The recipe with the durations that were followed in place of what was left open. */
    private static Recipe fixed(Run run) {
        Recipe recipe = run.batch().recipe();
        double[] seconds = run.seconds();
        List<Step> steps = new ArrayList<>();
        for (int i = 0; i < seconds.length; i++) {
            Step step = recipe.steps().get(i);
            Time time = new Time.Fixed(new Quantity(
                    BigDecimal.valueOf(seconds[i]),
                    Kind.DURATION.unit("s").orElseThrow(),
                    step.time().place()));
            steps.add(step.with(step.head().withTime(time)));
        }
        return recipe.withSteps(steps);
    }
}
