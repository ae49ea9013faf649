package org.soakwright.planner.report;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.soakwright.planner.batch.Cautions;
import org.soakwright.planner.batch.EachGrade;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.batch.Totals;
import org.soakwright.recipes.model.Recipe;

/**
 * What there is to say about a batch, in words and tables, for whatever shows it. Durations in days, hours and minutes, liquor in litres
 * and g/L, contents of pieces in the unit of the recipe.
 *
 * @param about of what, a line each: {@code 600 kg: 40 % thin, slab of 18 mm; …}
 * @param answer the answer first: how long, what decides, how sure
 * @param met whether every target is met, and of a plan, whether nothing forbids to use it
 * @param sections in the order in which they are to be read
 */
public record Findings(String title, List<String> about, List<String> answer, boolean met, List<Section> sections) {
    public static final String REMEDIES = "remedies";
    public static final String STEPS = "steps";
    public static final String LIQUOR = "liquor";
    public static final String EXPECTED = "expected";
    public static final String CONTENTS = "contents";
    public static final String PERCENTILES = "percentiles";
    public static final String TARGETS = "targets";
    public static final String CHANCES = "chances";
    public static final String MEASURE = "measure";
    public static final String TOTALS = "totals";
    public static final String PER_HOUR = "per-hour";
    public static final String CAUTIONS = "cautions";

    public Findings {
        about = List.copyOf(about);
        answer = List.copyOf(answer);
        sections = List.copyOf(sections);
    }

    /**
     * Of a recipe followed as written.
     *
     * @param start of the first step by the clock on the wall, where it is known
     */
    public static Findings of(Run run, Optional<LocalDateTime> start) {
        List<Section> sections = new ArrayList<>();
        body(run, List.of(), start, sections);
        sections.add(cautions(run));
        sections.addAll(at(sections, TOTALS), Prospects.sections(run, false));
        return new Findings(title(run), about(run), sure(Answer.followed(run), run), run.meetsTargets(), sections);
    }

    /** Of a plan; where no choice meets the targets, of its nearest miss, marked as such. */
    public static Findings of(Plan plan, Optional<LocalDateTime> start) {
        Run run = plan.run();
        List<Section> sections = new ArrayList<>();
        if (!plan.met()) {
            sections.add(remedies(plan));
        }
        body(run, plan.met() ? plan.binds() : List.of(), start, sections);
        if (!plan.perHour().isEmpty()) {
            sections.add(perHour(plan));
        }
        sections.add(cautions(run));
        sections.addAll(at(sections, TOTALS), Prospects.sections(run, true));
        return new Findings(title(run), about(run), sure(Answer.planned(plan), run), plan.mayBeUsed(), sections);
    }

    private static int at(List<Section> sections, String id) {
        return IntStream.range(0, sections.size())
                .filter(i -> sections.get(i).id().equals(id))
                .findFirst()
                .orElse(sections.size());
    }

    private static List<String> sure(List<String> answer, Run run) {
        List<String> all = new ArrayList<>(answer);
        Prospects.sentence(run).ifPresent(all::add);
        return all;
    }

    public Optional<Section> section(String id) {
        return sections.stream().filter(section -> section.id().equals(id)).findFirst();
    }

    private static String title(Run run) {
        return run.batch().recipe().title();
    }

    private static List<String> about(Run run) {
        Recipe recipe = run.batch().recipe();
        List<String> about = new ArrayList<>(List.of(lot(recipe)));
        PieceWords.differences(recipe).ifPresent(about::add);
        String allowedBy = recipe.allowedBy();
        if (allowedBy != null) {
            about.add("In spite of cautions that would stop it, allowed by " + allowedBy);
        }
        return about;
    }

    private static String lot(Recipe recipe) {
        String grades = recipe.lot().grades().stream().map(PieceWords::grade).collect(Collectors.joining("; "));
        String mass = recipe.lot().massKg().isPresent()
                ? Figures.made(recipe.lot().massKg().getAsDouble()) + " kg"
                : Figures.made(recipe.lot().volumeM3() * 1000) + " L of pieces";
        return mass + ": " + grades;
    }

    private static void body(Run run, List<String> binds, Optional<LocalDateTime> start, List<Section> sections) {
        StepTables tables = new StepTables(run);
        sections.add(Section.of(STEPS, "Steps", tables.steps(start), tables.handling()));
        Table liquor = tables.liquor();
        if (!liquor.isEmpty()) {
            sections.add(Section.of(LIQUOR, "Liquor to make up", liquor, tables.clinging()));
        }
        sections.add(
                Section.of(EXPECTED, "Expected at the end of each step", tables.expected(), tables.expectations()));
        Table targets = targets(run, binds);
        if (!targets.isEmpty()) {
            sections.add(Section.of(TARGETS, "Targets", targets, List.of()));
        }
        sections.add(Section.of(TOTALS, "In all", totals(run), List.of()));
    }

    /** Every reading of every grade at the end of each step: more than a sheet has room for. */
    public static Section contents(Run run) {
        return Section.of(CONTENTS, "In the pieces at the end of each step", new StepTables(run).contents(), List.of());
    }

    /** How many pieces read how much at the end of each step; empty where all pieces of a grade are alike. */
    public static Optional<Section> percentiles(Run run) {
        Table table = new StepTables(run).percentiles();
        return table.isEmpty()
                ? Optional.empty()
                : Optional.of(Section.of(
                        PERCENTILES,
                        "How the pieces differ at the end of each step",
                        table,
                        List.of("Each column says what so much of the pieces of a grade, by mass, reads at most.")));
    }

    private static Table targets(Run run, List<String> binds) {
        Table table = new Table()
                .group("Target")
                .text("Grade")
                .number("Value")
                .text("Limit")
                .verdict("Verdict");
        for (TargetState state : EachGrade.of(run)) {
            String grade = state.grade().orElse("");
            Recipe recipe = run.batch().recipe();
            String verdict = !state.met() ? "MISSED" : binds.contains(state.name()) ? "met, decides" : "met";
            table.row(List.of(
                    TargetWords.name(recipe, state),
                    grade,
                    Wording.value(state),
                    TargetWords.limit(recipe, state),
                    verdict));
        }
        return table;
    }

    private static Table totals(Run run) {
        Totals totals = run.totals();
        Table table =
                new Table().column("", "Total", Table.Kind.TEXT, false).column("", "Amount", Table.Kind.TEXT, false);
        table.row(List.of("Time", Wording.lasting(totals.seconds())));
        table.row(List.of(
                "Liquor",
                totals.liquorM3().isPresent()
                        ? Figures.made(totals.liquorM3().getAsDouble() * 1000) + " L"
                        : "unlimited, not counted"));
        totals.cost()
                .ifPresent(cost -> table.row(
                        List.of("Cost", Wording.money(cost, run.batch().recipe()))));
        return table;
    }

    private static Section remedies(Plan plan) {
        Recipe recipe = plan.run().batch().recipe();
        String heading = "What would help, each planned again";
        if (plan.remedies().isEmpty()) {
            return new Section(
                    REMEDIES,
                    heading,
                    Optional.empty(),
                    List.of(),
                    List.of("No single change that was planned again meets every target."));
        }
        return Section.of(
                REMEDIES,
                heading,
                plan.remedies().stream()
                        .map(remedy -> capital(remedy.change()) + ": " + Wording.totals(remedy.totals(), recipe) + "."
                                + (remedy.caution().isEmpty() ? "" : " Caution: " + remedy.caution() + "."))
                        .toList());
    }

    private static Section perHour(Plan plan) {
        Table table = new Table().group("Step").text("Reading").number("Change");
        for (Plan.PerHour one : plan.perHour()) {
            table.row(List.of(one.step(), one.reading(), Figures.change(one.change()) + " " + one.unit()));
        }
        return Section.of(PER_HOUR, "What one hour more in a step changes", table, List.of());
    }

    private static Section cautions(Run run) {
        return Section.of(CAUTIONS, "Cautions", Cautions.of(run).shown());
    }

    private static String capital(String text) {
        return text.isEmpty() ? text : text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }
}
