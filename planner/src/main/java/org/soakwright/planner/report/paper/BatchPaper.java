package org.soakwright.planner.report.paper;

import java.io.IOException;
import java.io.OutputStream;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.report.Stamp;

/**
 * The batch sheet for whoever runs the batch, to be printed and filled in by hand: steps with their times, liquor to make up, readings
 * to take and what to do about them, windows, targets, sampling, cautions and signatures. Of a batch that misses a target it says so
 * across the top and asks for no release.
 */
public final class BatchPaper {
    private final Sheet sheet;

    private BatchPaper(Sheet sheet) {
        this.sheet = sheet;
    }

    /**
     * Of a plan.
     *
     * @param start of the first step by the local clock on the wall, where it is known; counted to the minute
     * @throws java.time.DateTimeException where the end lies beyond what a date can say
     */
    public static BatchPaper of(Plan plan, Stamp stamp, Optional<LocalDateTime> start) {
        return of(plan.run(), plan.met() ? plan.binds() : List.of(), stamp, start);
    }

    /** Of a recipe followed as written; otherwise as for a plan. */
    public static BatchPaper of(Run run, Stamp stamp, Optional<LocalDateTime> start) {
        return of(run, List.of(), stamp, start);
    }

    private static BatchPaper of(Run run, List<String> binds, Stamp stamp, Optional<LocalDateTime> start) {
        return new BatchPaper(new Draft(run, binds, stamp, new Clock(start)).sheet());
    }

    /** One page that needs nothing else and prints on A4; well-formed XML. */
    public String html() {
        return HtmlSheet.of(sheet);
    }

    /**
     * The same as PDF, A4, on as few pages as it needs; the same bytes for the same inputs. Leaves the stream open.
     *
     * @throws IOException where the stream cannot be written to
     */
    public void pdf(OutputStream out) throws IOException {
        PdfSheet.write(sheet, out);
    }
}
