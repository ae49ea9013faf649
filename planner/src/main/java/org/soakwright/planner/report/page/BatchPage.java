package org.soakwright.planner.report.page;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.EachGrade;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.batch.Totals;
import org.soakwright.planner.report.Figures;
import org.soakwright.planner.report.Findings;
import org.soakwright.planner.report.Section;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.Wording;
import org.soakwright.planner.report.picture.Picture;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Step;

/** The page of one batch: the answer first, then what shows it, then what it rests on. */
final class BatchPage {
    private static final String PICTURES = "pictures";
    private static final String ASSUMPTIONS = "assumptions";

    private final Subject subject;
    private final Run run;
    private final Recipe recipe;
    private final Findings findings;
    private final Optional<Section> percentiles;
    private final Shell shell;
    private final Html html;

    /**
     * What the page is about and what lies beside it.
     *
     * @param kind of report: a plan, or a recipe followed
     * @param binds names of the targets that decide
     * @param groups the dimensionless groups at the durations of the run
     * @param files that lie beside the page
     */
    record Subject(
            String kind,
            Run run,
            Findings findings,
            List<String> binds,
            Section groups,
            List<Picture> pictures,
            Optional<LocalDateTime> start,
            Stamp stamp,
            List<String> files) {}

    private BatchPage(Subject subject) {
        this.subject = subject;
        run = subject.run();
        recipe = run.batch().recipe();
        findings = subject.findings();
        percentiles = Findings.percentiles(run);
        shell = new Shell(subject.kind(), findings.title(), findings.about());
        html = shell.html();
    }

    static String of(Subject subject) {
        return new BatchPage(subject).write();
    }

    private String write() {
        shell.contents(anchors());
        html.open("main");
        answer();
        findings.section(Findings.REMEDIES).ifPresent(this::section);
        for (String id : List.of(Findings.STEPS, Findings.TARGETS, Findings.CHANCES, Findings.MEASURE)) {
            findings.section(id).ifPresent(this::section);
        }
        pictures();
        for (String id : List.of(Findings.LIQUOR, Findings.EXPECTED)) {
            findings.section(id).ifPresent(this::section);
        }
        section(Findings.contents(run));
        percentiles.ifPresent(this::section);
        for (String id : List.of(Findings.TOTALS, Findings.PER_HOUR)) {
            findings.section(id).ifPresent(this::section);
        }
        shell.open(ASSUMPTIONS, "What it assumes");
        shell.points(Assumptions.of(recipe));
        shell.close();
        section(subject.groups());
        findings.section(Findings.CAUTIONS).ifPresent(this::section);
        html.close();
        shell.footer(List.of(
                "Soakwright " + subject.stamp().version() + " computed this from the recipe whose file has the SHA-256 "
                        + subject.stamp().sha256() + ". The same recipe gives the same report."));
        return shell.end();
    }

    private void section(Section section) {
        shell.section(section, subject.files());
    }

    private List<Shell.Anchor> anchors() {
        List<Shell.Anchor> anchors = new ArrayList<>();
        add(anchors, Findings.REMEDIES, "What would help");
        add(anchors, Findings.STEPS, "Steps");
        add(anchors, Findings.TARGETS, "Targets");
        add(anchors, Findings.CHANCES, "How sure");
        add(anchors, Findings.MEASURE, "What to measure");
        anchors.add(new Shell.Anchor(PICTURES, "Pictures"));
        add(anchors, Findings.LIQUOR, "Liquor");
        add(anchors, Findings.EXPECTED, "Expected");
        anchors.add(new Shell.Anchor(Findings.CONTENTS, "In the pieces"));
        percentiles.ifPresent(section -> anchors.add(new Shell.Anchor(section.id(), "How pieces differ")));
        add(anchors, Findings.TOTALS, "In all");
        add(anchors, Findings.PER_HOUR, "One hour more");
        anchors.add(new Shell.Anchor(ASSUMPTIONS, "Assumptions"));
        anchors.add(new Shell.Anchor(subject.groups().id(), "What decides"));
        add(anchors, Findings.CAUTIONS, "Cautions");
        return anchors;
    }

    private void add(List<Shell.Anchor> anchors, String id, String label) {
        if (findings.section(id).isPresent()) {
            anchors.add(new Shell.Anchor(id, label));
        }
    }

    private void answer() {
        shell.openAnswer(findings);
        sizes();
        html.leaf("h3", findings.met() ? "What to do" : "What this looks at");
        route();
        html.leaf("h3", "How sure this is");
        shell.paragraphs(Surety.of(run));
        files();
        html.close();
    }

    private void sizes() {
        Totals totals = run.totals();
        OptionalDouble volume = totals.liquorM3();
        html.open("dl", "class", "sizes");
        size("Time", Durations.practical(totals.seconds()), during(totals.seconds()));
        size(
                "Liquor",
                volume.isPresent() ? Figures.made(volume.getAsDouble() * 1000) + " L" : "not counted",
                volume.isPresent() ? List.of() : List.of("a step has it without limit"));
        totals.cost().ifPresent(cost -> size("Cost", Wording.money(cost, recipe), List.of()));
        EachGrade.of(run).stream()
                .filter(state -> subject.binds().contains(state.name()))
                .limit(1)
                .forEach(state -> size("What decides", state.name(), List.of(reached(state))));
        html.close();
    }

    private List<String> during(double seconds) {
        return subject.start()
                .map(begin -> List.of("from " + Wording.wall(begin, true), "to " + Wording.wall(begin, seconds)))
                .orElse(List.of(Durations.clock(seconds) + " on the clock"));
    }

    private static String reached(TargetState state) {
        return Wording.value(state) + ", " + Wording.limit(state);
    }

    private void size(String what, String amount, List<String> more) {
        html.open("div").leaf("dt", what).open("dd").words(amount).close();
        more.forEach(line -> html.open("dd", "class", "more").words(line).close());
        html.close();
    }

    private void route() {
        html.open("ol", "class", "route");
        for (int i = 0; i < recipe.steps().size(); i++) {
            StepEnd end = run.end(i);
            html.open("li");
            html.open("span", "class", "name")
                    .words((i + 1) + " " + end.step().name())
                    .close();
            html.leaf("span", end.step().kind() + " " + Durations.practical(end.seconds()), "class", "time");
            String more = surroundings(end.step());
            if (!more.isEmpty()) {
                html.leaf("span", more, "class", "more");
            }
            subject.start()
                    .ifPresent(begin -> html.leaf("span", "from " + Wording.wall(begin, end.from()), "class", "more"));
            html.close();
        }
        html.close();
    }

    /** {@code 3 x 1200 L, 10 L/min, 4 °C}. */
    private String surroundings(Step step) {
        List<String> parts = new ArrayList<>();
        if (step instanceof Step.Wet wet) {
            OptionalDouble fill = wet.liquor().volumeM3(recipe.lot());
            String times = step instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Fills fills
                    ? fills.count() + " x "
                    : "";
            parts.add(
                    fill.isPresent() ? times + Figures.made(fill.getAsDouble() * 1000) + " L" : "liquor without limit");
            if (step instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Flow flow) {
                parts.add(flow.rate().toString());
            }
        }
        String temperature = Wording.temperature(step);
        if (!temperature.isEmpty()) {
            parts.add(temperature);
        }
        return String.join(", ", parts);
    }

    private void files() {
        List<String> pages = subject.files().stream()
                .filter(name -> name.startsWith("batch-sheet"))
                .collect(Collectors.toList());
        html.open("p", "class", "files")
                .text(
                        findings.met()
                                ? "To be printed and filled in on the floor: "
                                : "The batch sheet, marked as not a plan: ");
        for (int i = 0; i < pages.size(); i++) {
            html.text(i == 0 ? "" : ", ").leaf("a", pages.get(i), "href", pages.get(i));
        }
        html.text(". For programs: ")
                .leaf("a", "result.json", "href", "result.json")
                .text(".");
        html.close();
    }

    private void pictures() {
        shell.open(PICTURES, "Pictures");
        subject.pictures().forEach(shell::picture);
        List<String> tables = subject.files().stream()
                .filter(name -> name.equals(Tables.file(Tables.COURSE)) || name.equals(Tables.file(Tables.BALANCE)))
                .toList();
        html.open("p", "class", "file").text("What is drawn, as CSV: ");
        for (int i = 0; i < tables.size(); i++) {
            html.text(i == 0 ? "" : ", ").leaf("a", tables.get(i), "href", tables.get(i));
        }
        html.close();
        shell.close();
    }
}
