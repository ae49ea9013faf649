package org.soakwright.planner.cli;

import java.nio.file.Path;
import java.util.List;
import org.soakwright.planner.report.Folder;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;

/** Where what a command found out goes: standard output, a file of JSON, a folder with a report. */
final class Outputs {
    private final Session session;
    private final boolean reports;
    private final OptionSpec json = OptionSpec.builder("--json")
            .type(String.class)
            .paramLabel("FILE")
            .description("write the result as JSON; - is standard output, then nothing else goes there")
            .build();
    private final OptionSpec report = OptionSpec.builder("--report")
            .type(String.class)
            .paramLabel("DIR")
            .description(
                    "write a report, pictures and tables into a folder: a new or empty one, or an earlier report's")
            .build();
    private final OptionSpec quiet =
            Help.flag("--quiet", "print nothing but problems").build();

    /**
     * Of one command.
     *
     * @param reports whether it has a report to write
     */
    Outputs(Session session, boolean reports) {
        this.session = session;
        this.reports = reports;
    }

    void addTo(CommandSpec spec) {
        spec.addOption(json);
        if (reports) {
            spec.addOption(report);
        }
        spec.addOption(quiet);
    }

    /** Whether a folder was named for a report. */
    boolean wantsReport() {
        return report.getValue() != null;
    }

    /** What looks into its input only after the outputs have been found fit. */
    interface Work {
        Finding find() throws Refusal;
    }

    /** Does the work and puts what it found where it belongs, or says why not. */
    int of(Work work) {
        try {
            return deliver(work);
        } catch (Unsound unsound) {
            return refuse(unsound.problems());
        } catch (Refusal refusal) {
            session.say(String.valueOf(refusal.getMessage()));
            return refusal.status();
        }
    }

    private int deliver(Work work) throws Refusal {
        String file = json.getValue();
        boolean toOut = JsonTarget.STANDARD_OUTPUT.equals(file);
        JsonTarget jsonTarget = file == null || toOut ? null : JsonTarget.of(file);
        String folder = report.getValue();
        ReportTarget reportTarget = folder == null ? null : ReportTarget.of(folder);
        if (jsonTarget != null && folder != null && samePlace(String.valueOf(file), folder)) {
            throw new Refusal(
                    Exit.BAD_INPUT, "--json and --report both name " + folder + "; a report holds its own result.json");
        }
        Finding finding = work.find();
        List<Folder.Entry> entries =
                reportTarget == null ? List.of() : finding.report().get();
        session.line().erase();
        if (jsonTarget != null) {
            String text = finding.json().get();
            session.write(jsonTarget.name(), () -> jsonTarget.write(text));
        }
        if (reportTarget != null) {
            session.write(reportTarget.name(), () -> reportTarget.write(entries));
        }
        if (toOut) {
            session.out().print(finding.json().get());
        } else if (!isQuiet()) {
            session.out().print(finding.sheet().get() + (reportTarget == null ? "" : reportTarget.told()));
        }
        return finding.status();
    }

    private static boolean samePlace(String one, String other) {
        return Path.of(one)
                .toAbsolutePath()
                .normalize()
                .equals(Path.of(other).toAbsolutePath().normalize());
    }

    private boolean isQuiet() {
        Boolean given = quiet.getValue();
        return Boolean.TRUE.equals(given);
    }

    private int refuse(List<Problem> problems) {
        session.line().erase();
        problems.forEach(session.err()::println);
        session.say(problems.size() + (problems.size() == 1 ? " problem" : " problems") + "; nothing was computed");
        return Exit.BAD_INPUT;
    }
}
