package org.soakwright.planner.report;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Run;

/**
 * The sheet of one batch for whoever runs it: the answer first, then steps, liquor, what to expect, targets, totals and cautions. Plain
 * text, lines of at most 100 characters parted by {@code \n}.
 */
public final class BatchSheet {
    private BatchSheet() {}

    /**
     * Of a recipe followed as written.
     *
     * @param start of the first step by the clock on the wall, where it is known
     */
    public static String of(Run run, Optional<LocalDateTime> start, Style style) {
        return of(Findings.of(run, start), style);
    }

    /** Of a plan; where no choice meets the targets, of its nearest miss, marked as such. */
    public static String of(Plan plan, Optional<LocalDateTime> start, Style style) {
        return of(Findings.of(plan, start), style);
    }

    /** Of whatever there is to say. */
    public static String of(Findings findings, Style style) {
        List<String> lines = new ArrayList<>();
        Prose.lines(findings.title()).forEach(line -> lines.add(style.heading(line)));
        findings.about().forEach(line -> lines.addAll(Prose.lines(line)));
        lines.add("");
        for (int i = 0; i < findings.answer().size(); i++) {
            for (String line : Prose.lines(findings.answer().get(i))) {
                lines.add(i > 0 ? line : findings.met() ? style.good(line) : style.bad(line));
            }
        }
        for (Section section : findings.sections()) {
            lines.add("");
            lines.addAll(section.lines(style));
        }
        return lines.stream().collect(Collectors.joining("\n", "", "\n"));
    }
}
