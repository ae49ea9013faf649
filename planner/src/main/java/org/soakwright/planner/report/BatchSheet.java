package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import org.soakwright.planner.batch.Cautions;
import org.soakwright.planner.batch.EachGrade;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.batch.Totals;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Recipe;

/**
 * The sheet of one batch for whoever runs it: the answer first, then steps, liquor, what to expect, targets, totals and cautions. Plain
 * text, lines of at most 100 characters parted by {@code \n}; durations in days, hours and minutes, liquor in litres and g/L, contents of
 * pieces in the unit of the recipe.
 */
public final class BatchSheet {
    private final Run run;
    private final Recipe recipe;
    private final Style style;
    private final List<String> lines = new ArrayList<>();

    private BatchSheet(Run run, Style style) {
        this.run = run;
        this.style = style;
        recipe = run.batch().recipe();
    }

    /** Of a recipe followed as written. */
    public static String of(Run run, Style style) {
        BatchSheet sheet = new BatchSheet(run, style);
        sheet.title();
        sheet.answer(Answer.followed(run), run.meetsTargets());
        sheet.body(List.of());
        sheet.cautions();
        return sheet.text();
    }

    /** Of a plan; where no choice meets the targets, of its nearest miss, marked as such. */
    public static String of(Plan plan, Style style) {
        BatchSheet sheet = new BatchSheet(plan.run(), style);
        sheet.title();
        sheet.answer(Answer.planned(plan), plan.met());
        sheet.remedies(plan);
        sheet.body(plan.met() ? plan.binds() : List.of());
        sheet.perHour(plan);
        sheet.cautions();
        return sheet.text();
    }

    private String text() {
        return lines.stream().collect(Collectors.joining("\n", "", "\n"));
    }

    private void title() {
        Prose.lines(recipe.title()).forEach(line -> lines.add(style.heading(line)));
        String grades = recipe.lot().grades().stream().map(BatchSheet::grade).collect(Collectors.joining("; "));
        String mass = recipe.lot().massKg().isPresent()
                ? Figures.made(recipe.lot().massKg().getAsDouble()) + " kg"
                : Figures.made(recipe.lot().volumeM3() * 1000) + " L of pieces";
        lines.addAll(Prose.lines(mass + ": " + grades));
    }

    private static String grade(Grade grade) {
        String share = grade.share() < 1 ? Figures.made(grade.share() * 100) + " % " : "";
        return share + grade.name() + ", " + grade.shape().word() + " of " + grade.size();
    }

    private void answer(List<String> sentences, boolean met) {
        lines.add("");
        for (int i = 0; i < sentences.size(); i++) {
            for (String line : Prose.lines(sentences.get(i))) {
                lines.add(i > 0 ? line : met ? style.good(line) : style.bad(line));
            }
        }
    }

    private void body(List<String> binds) {
        StepTables tables = new StepTables(run);
        section("Steps", tables.steps().lines(style));
        note(tables.transfers());
        Table liquor = tables.liquor();
        if (!liquor.isEmpty()) {
            section("Liquor to make up", liquor.lines(style));
            note(tables.clinging());
        }
        section("Expected at the end of each step", tables.expected().lines(style));
        Table targets = targets(binds);
        if (!targets.isEmpty()) {
            section("Targets", targets.lines(style));
        }
        section("In all", totals());
    }

    private void section(String heading, List<String> content) {
        lines.add("");
        lines.add(style.heading(heading));
        lines.addAll(content);
    }

    private void note(List<String> notes) {
        notes.forEach(note -> lines.addAll(Prose.lines("  ", "  ", note)));
    }

    private Table targets(List<String> binds) {
        Table table = new Table()
                .text("Target")
                .text("Grade")
                .number("Value")
                .text("Limit")
                .text("", (paint, word) -> word.startsWith("met") ? paint.good(word) : paint.bad(word));
        String before = "";
        for (TargetState state : EachGrade.of(run)) {
            String grade = state.grade().orElse("");
            String name = grade.isEmpty()
                    ? state.name()
                    : state.name().substring(0, state.name().length() - grade.length() - 2);
            String limit = Wording.limit(state);
            String key = name + limit;
            String verdict = !state.met() ? "MISSED" : binds.contains(state.name()) ? "met, decides" : "met";
            table.row(List.of(key.equals(before) ? "" : name, grade, Wording.value(state), limit, verdict));
            before = key;
        }
        return table;
    }

    private List<String> totals() {
        Totals totals = run.totals();
        List<String> all = new ArrayList<>();
        all.add("  Time    " + Wording.lasting(totals.seconds()));
        all.add("  Liquor  "
                + (totals.liquorM3().isPresent()
                        ? Figures.made(totals.liquorM3().getAsDouble() * 1000) + " L"
                        : "unlimited, not counted"));
        totals.cost().ifPresent(cost -> all.add("  Cost    " + Wording.money(cost, recipe)));
        return all;
    }

    private void remedies(Plan plan) {
        if (plan.met()) {
            return;
        }
        List<String> points = new ArrayList<>();
        for (Plan.Remedy remedy : plan.remedies()) {
            String caution = remedy.caution().isEmpty() ? "" : " Caution: " + remedy.caution() + ".";
            points.addAll(Prose.point(
                    capital(remedy.change()) + ": " + Wording.totals(remedy.totals(), recipe) + "." + caution));
        }
        if (points.isEmpty()) {
            points.addAll(Prose.lines("  ", "  ", "No single change that was planned again meets every target."));
        }
        section("What would help, each planned again", points);
    }

    private void perHour(Plan plan) {
        if (plan.perHour().isEmpty()) {
            return;
        }
        Table table = new Table().text("Step").text("Reading").number("Change");
        String before = "";
        for (Plan.PerHour one : plan.perHour()) {
            String step = one.step().equals(before) ? "" : one.step();
            table.row(List.of(step, one.reading(), Figures.change(one.change()) + " " + one.unit()));
            before = one.step();
        }
        section("What one hour more in a step changes", table.lines(style));
    }

    private void cautions() {
        List<String> points = new ArrayList<>();
        Cautions.of(run).forEach(caution -> points.addAll(Prose.point(caution)));
        section("Cautions", points);
    }

    private static String capital(String text) {
        return text.isEmpty() ? text : text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }
}
