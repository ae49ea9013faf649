package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.planner.batch.Cautions;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.Load;
import org.soakwright.planner.line.LoadPlan;
import org.soakwright.planner.report.Figures;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.Table;
import org.soakwright.planner.report.TargetWords;
import org.soakwright.planner.report.Wording;
import org.soakwright.planner.report.page.Html;
import org.soakwright.planner.report.page.Shell;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Step;

/** A sheet for every load, to be printed and to go with it: where it is when, what to make up, until when it can wait, what to expect. */
final class LotSheets {
    private static final String BLANK = "________";
    private static final String NO_PLAN = "NOT A PLAN";
    private static final String STYLE = """
            #answer { border-color: var(--mark); }
            .against { font-weight: 600; color: var(--bad); }
            section section { margin-top: 1.2rem; }
            .lots p { margin: 0 0 0.2rem; }
            @media print {
              main > section + section { break-before: page; margin-top: 0; }
              section section { margin-top: 0.8rem; }
            }
            """;

    private final Account account;
    private final LinePlan plan;
    private final LineTables tables;
    private final Times times;
    private final Shell shell;
    private final Html html;

    private LotSheets(Account account) {
        this.account = account;
        plan = account.plan();
        tables = new LineTables(account);
        times = tables.times();
        shell = new Shell("Sheets of the lots", plan.line().title(), tables.about(), STYLE);
        html = shell.html();
    }

    static String id(int load) {
        return "load-" + (load + 1);
    }

    static String of(Account account, Stamp stamp) {
        return new LotSheets(account).write(stamp);
    }

    private String write(Stamp stamp) {
        List<Shell.Anchor> anchors = new ArrayList<>();
        for (int i = 0; i < plan.loads().size(); i++) {
            anchors.add(new Shell.Anchor(id(i), plan.loads().get(i).load().name()));
        }
        shell.contents(anchors);
        html.open("main");
        shell.open("answer", "How to use them");
        shell.paragraphs(List.of(
                "A step may end between its planned and its latest pull with everything else of the schedule in place; use"
                        + " the slack of one step only, then plan again. An earlier pull needs a new plan in any case.",
                "What is expected holds for the planned times. Contents of pieces are means by mass."));
        shell.close();
        for (int i = 0; i < plan.loads().size(); i++) {
            sheet(i, plan.loads().get(i));
        }
        html.close();
        LinePage.footer(shell, stamp);
        return shell.end();
    }

    private void sheet(int index, LoadPlan load) {
        String id = id(index);
        shell.open(id, load.load().name());
        html.open("div", "class", "lots");
        html.open("p")
                .words(account.recipeTitle(load.load().recipeFile()) + " ("
                        + load.load().recipeFile() + "), "
                        + Figures.made(load.load().kg()) + " kg")
                .close();
        load.load()
                .shares()
                .forEach(share -> html.open("p").words(share(load, share)).close());
        html.close();
        Cautions cautions = account.warnings().of(load);
        List<String> stops = cautions.stops();
        if (!load.met() || !stops.isEmpty()) {
            html.leaf("p", NO_PLAN + (load.met() ? ": stopped by a caution" : ": misses a target"), "class", "against");
        }
        List<String> bad = new ArrayList<>(stops);
        bad.addAll(LineAnswer.misses(load));
        account.latest(load).ifPresent(lot -> bad.addAll(lot.why()));
        shell.points(bad);
        part(id + "-steps", "Where it is when", steps(load));
        part(id + "-make-up", "What to make up, and what to expect at the pull", makeUp(load));
        if (!load.targets().isEmpty()) {
            part(id + "-targets", "Targets", targets(load));
        }
        if (!cautions.shown().isEmpty()) {
            html.leaf("h3", "Cautions");
            shell.points(cautions.shown());
        }
        shell.close();
    }

    private String share(LoadPlan load, Load.Share share) {
        long late = plan.late(load, share);
        java.time.ZonedDateTime due = share.order().due();
        String when = due == null
                ? "no due time"
                : "due " + times.wall(plan.clock().seconds(due)) + (late > 0 ? ", late by " + Times.lasting(late) : "");
        return "Lot " + share.name() + ": " + Figures.made(share.kg()) + " kg, " + when + ", done "
                + times.wall(load.placed().finishes(plan.schedule().shop().carriage()));
    }

    private void part(String id, String heading, Table table) {
        html.leaf("h3", heading, "id", id);
        shell.table(id, table);
    }

    private Table steps(LoadPlan load) {
        Table table = new Table()
                .text("Step")
                .text("Vessel")
                .text("Starts")
                .text("Pull at")
                .text("Latest pull")
                .text("Slack")
                .text("What stops it from lasting longer")
                .text("Pulled");
        for (LoadPlan.LegPlan leg : load.legs()) {
            table.row(List.of(
                    Legs.name(leg),
                    LineTables.solid(leg.vessel()),
                    LineTables.solid(times.wall(leg.start())),
                    LineTables.solid(times.wall(leg.end())),
                    leg.slack() > 0 ? LineTables.solid(times.wall(leg.latestPull())) : "then",
                    leg.slack() > 0 ? Times.lasting(leg.slack()) : "none",
                    leg.reason(),
                    BLANK));
        }
        return table;
    }

    private Table makeUp(LoadPlan load) {
        Table table = new Table()
                .text("Step")
                .text("At")
                .text("Liquor")
                .text("To dissolve")
                .text("Liquor at the pull")
                .text("Pieces at the pull");
        for (LoadPlan.LegPlan leg : load.legs()) {
            Step step = load.load().recipe().steps().get(leg.leg().step());
            List<Supply> own = account.supplies(leg);
            StepEnd end = load.run().end(leg.runStep());
            table.row(List.of(
                    Legs.name(leg),
                    LineTables.solid(Wording.temperature(step)),
                    liquor(own),
                    String.join(
                            "; ",
                            own.stream().limit(1).map(LineTables::dissolve).toList()),
                    liquorAtPull(end),
                    piecesAtPull(end)));
        }
        return table;
    }

    private static String liquor(List<Supply> own) {
        if (own.isEmpty()) {
            return "";
        }
        Optional<Supply> fill = own.stream().filter(supply -> !supply.running()).findFirst();
        double running = own.stream()
                .filter(Supply::running)
                .mapToDouble(supply -> supply.litres().orElse(0))
                .sum();
        String made = fill.map(one ->
                        one.litres().isPresent() ? Figures.made(one.litres().getAsDouble()) + " L" : "unlimited")
                .orElse("");
        return running > 0 ? made + ", then " + Figures.made(running) + " L run in" : made;
    }

    private static String liquorAtPull(StepEnd end) {
        return String.join(
                ", ",
                end.liquor().stream()
                        .map(one -> one.species() + " " + Figures.measured(one.end()) + " g/L")
                        .toList());
    }

    private static String piecesAtPull(StepEnd end) {
        List<String> parts = new ArrayList<>();
        for (int s = 0; s < end.means().size(); s++) {
            StepEnd.LotMean mean = end.means().get(s);
            int species = s;
            String grades = end.pieces().size() < 2
                    ? ""
                    : " ("
                            + String.join(
                                    ", ",
                                    end.pieces().stream()
                                            .map(piece -> piece.name() + " "
                                                    + Figures.measured(piece.species()
                                                            .get(species)
                                                            .value(Reading.MEAN)))
                                            .toList())
                            + ")";
            parts.add(mean.species() + " " + Figures.measured(mean.value()) + " " + mean.unit() + grades);
        }
        end.massKg().ifPresent(kg -> parts.add("the lot weighs " + Figures.measured(kg) + " kg"));
        return String.join("; ", parts);
    }

    private static Table targets(LoadPlan load) {
        Table table = new Table()
                .text("Target")
                .text("Grade")
                .number("Value")
                .text("Limit")
                .verdict("Verdict")
                .text("Found");
        for (TargetState state : load.targets()) {
            table.row(List.of(
                    TargetWords.name(load.load().recipe(), state),
                    state.grade().orElse(""),
                    Wording.value(state),
                    TargetWords.limit(load.load().recipe(), state),
                    state.met() ? "met" : "MISSED",
                    BLANK));
        }
        return table;
    }
}
