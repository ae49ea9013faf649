package org.soakwright.planner.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalLong;
import org.soakwright.planner.batch.Progress;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.LinePlanner;
import org.soakwright.planner.line.Options;
import org.soakwright.recipes.LineOutcome;
import org.soakwright.recipes.Lines;
import org.soakwright.recipes.model.line.Line;

/**
 * Plans invented lines and prints a row of a table in Markdown for each: how long it takes until every lot has a place and meets its targets, and
 * how good the schedule is after more effort. Not warmed up: the first row pays for the compiler, as a process of its own would.
 */
public final class LineBench {
    private static final long SEED = 1;
    private static final double HOUR = 3600;
    private static final double[] EFFORTS = {2, 10, 60};
    private static final int[] GROWTH = {20, 40, 80, 160, 320, 640};

    /** Beyond so many lots only the first schedules are made. */
    private static final int MOST_IMPROVED = 60;

    private LineBench() {}

    /**
     * Prints the table.
     *
     * @param args {@code week} for 60 lots, {@code month} for 500, {@code growth} for 20 to 640, which is drawn to target/line-growth.svg; all of them
     *     without any
     */
    public static void main(String[] args) throws IOException {
        String what = args.length == 0 ? "all" : args[0];
        System.out.println(
                "| lots | effort | seconds | lateness, h | makespan, h | least lateness, h | bound, h | gap, % |");
        System.out.println("|--:|--:|--:|--:|--:|--:|--:|--:|");
        if (what.equals("all") || what.equals("week")) {
            rows(MOST_IMPROVED);
        }
        if (what.equals("all") || what.equals("month")) {
            rows(500);
        }
        if (what.equals("all") || what.equals("growth")) {
            // Growth is not the compiler's: once before it counts.
            rows(GROWTH[0]);
            List<GrowthPicture.Point> points = new ArrayList<>();
            for (int lots : GROWTH) {
                points.add(new GrowthPicture.Point(lots, rows(lots)));
            }
            Files.writeString(Path.of("target", "line-growth.svg"), GrowthPicture.of(points));
        }
    }

    private static double rows(int lots) throws IOException {
        Path folder = Files.createTempDirectory("line-bench");
        Path file = MadeLine.in(folder, lots, SEED);
        double seconds = row(file, lots, 0);
        if (lots == MOST_IMPROVED) {
            for (double effort : EFFORTS) {
                row(file, lots, effort);
            }
        }
        return seconds;
    }

    private static double row(Path file, int lots, double effort) {
        long begun = System.nanoTime();
        LineOutcome outcome = Lines.read(file);
        if (outcome instanceof LineOutcome.Refused refused) {
            throw new IllegalStateException(refused.problems().toString());
        }
        Line line = ((LineOutcome.Accepted) outcome).line();
        LinePlan plan = LinePlanner.plan(line, new Options(effort, false), Progress.NONE);
        double seconds = (System.nanoTime() - begun) * 1e-9;
        long missed = plan.loads().stream().filter(load -> !load.met()).count();
        if (missed > 0) {
            throw new IllegalStateException(missed + " loads miss their targets");
        }
        long makespan = plan.schedule().makespan();
        OptionalLong bound = plan.proof().makespan();
        System.out.printf(
                Locale.ROOT,
                "| %d | %.0f | %.2f | %.1f | %.1f | %s | %s | %s |%n",
                lots,
                effort,
                seconds,
                plan.schedule().lateness() / HOUR,
                makespan / HOUR,
                plan.proof().lateness().isPresent()
                        ? String.format(
                                Locale.ROOT, "%.1f", plan.proof().lateness().getAsDouble() / HOUR)
                        : "",
                bound.isPresent() ? String.format(Locale.ROOT, "%.1f", bound.getAsLong() / HOUR) : "",
                bound.isPresent()
                        ? String.format(Locale.ROOT, "%.1f", 100.0 * (makespan - bound.getAsLong()) / makespan)
                        : "");
        return seconds;
    }
}
