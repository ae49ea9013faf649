package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.LoadPlan;
import org.soakwright.planner.report.Figures;
import org.soakwright.planner.report.Findings;
import org.soakwright.planner.report.Section;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.Wording;
import org.soakwright.planner.report.page.Html;
import org.soakwright.planner.report.page.Shell;
import org.soakwright.planner.report.picture.Picture;

/** The page of a planned line: the answer first, then the chart, lots, moves and liquors, then what to know. */
final class LinePage {
    private static final String CHART = "chart";
    private static final String FILLS = "fills";

    private final Account account;
    private final LinePlan plan;
    private final Findings findings;
    private final LineTables tables;
    private final List<String> files;
    private final Shell shell;
    private final Html html;

    private LinePage(Account account, List<String> files) {
        this.account = account;
        this.files = files;
        plan = account.plan();
        findings = LineFindings.whole(account);
        tables = new LineTables(account);
        shell = new Shell(kind(account), findings.title(), findings.about());
        html = shell.html();
    }

    static String kind(Account account) {
        return account.isGood()
                ? "Line plan"
                : account.stops().isEmpty() ? "Best line plan found" : "Stopped, not a plan to use";
    }

    static String of(Account account, List<Picture> pictures, Stamp stamp, List<String> files) {
        return new LinePage(account, files).write(pictures, stamp);
    }

    private String write(List<Picture> pictures, Stamp stamp) {
        shell.contents(anchors());
        html.open("main");
        answer();
        shell.open(CHART, "Time chart");
        pictures.forEach(shell::picture);
        shell.close();
        for (String id : List.of(LineFindings.LOTS, LineFindings.LATE, LineFindings.MISSED)) {
            findings.section(id).ifPresent(this::section);
        }
        if (!account.moves().isEmpty()) {
            section(Section.of(
                    LineFindings.MOVES, "What to do, shift by shift", tables.moves(account.moves(), true), hands()));
        }
        if (!account.supplies().isEmpty()) {
            section(Section.of(FILLS, "Liquor by day", tables.days(), tables.uncounted()));
            section(Section.of(LineFindings.LIQUOR, "Every liquor to make up", tables.liquors(), List.of()));
        }
        for (String id : List.of(LineFindings.NOTES, LineFindings.CAUTIONS)) {
            findings.section(id).ifPresent(this::section);
        }
        html.close();
        footer(shell, stamp);
        return shell.end();
    }

    static void footer(Shell shell, Stamp stamp) {
        shell.footer(List.of("Soakwright " + stamp.version()
                + " computed this from the line and the recipes whose files together have the SHA-256 " + stamp.sha256()
                + ". The same files give the same report."));
    }

    private List<String> hands() {
        return plan.line().crew() == null
                ? List.of("No crew is stated: somebody is taken to be there whenever a move begins.")
                : List.of(
                        "Free besides: who is there all the while with nothing else to do. Hoist: moves at once while this"
                                + " one lasts, of those that can be.");
    }

    private void section(Section section) {
        shell.section(section, files);
    }

    private List<Shell.Anchor> anchors() {
        List<Shell.Anchor> anchors = new ArrayList<>(
                List.of(new Shell.Anchor(CHART, "Time chart"), new Shell.Anchor(LineFindings.LOTS, "Lots")));
        add(anchors, LineFindings.LATE, "Late");
        add(anchors, LineFindings.MISSED, "Missed");
        if (!account.moves().isEmpty()) {
            anchors.add(new Shell.Anchor(LineFindings.MOVES, "Moves"));
        }
        if (!account.supplies().isEmpty()) {
            anchors.add(new Shell.Anchor(FILLS, "Liquor by day"));
            anchors.add(new Shell.Anchor(LineFindings.LIQUOR, "Every liquor"));
        }
        add(anchors, LineFindings.NOTES, "Notes");
        add(anchors, LineFindings.CAUTIONS, "Cautions");
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
        html.open("div", "class", "files");
        html.leaf("h3", "To print");
        html.open("p", "class", "files");
        link("The dispatch list", LineReport.DISPATCH);
        html.text(" of every shift, ");
        link("a sheet for every lot", LineReport.SHEETS);
        html.text(", ");
        link("the moves as a calendar", LineReport.CALENDAR);
        html.text(", ");
        link("the whole result", LineReport.RESULT);
        html.text(" and the same as tables: ");
        List<String> csv = files.stream().filter(name -> name.endsWith(".csv")).toList();
        for (int i = 0; i < csv.size(); i++) {
            html.text(i == 0 ? "" : ", ");
            link(csv.get(i), csv.get(i));
        }
        html.text(".").close();
        sheets();
        html.close();
        shell.close();
    }

    private void link(String words, String file) {
        html.leaf("a", words, "href", file);
    }

    private void sheets() {
        html.open("p", "class", "files").text("Straight to the sheet of ");
        for (int i = 0; i < plan.loads().size(); i++) {
            html.text(i == 0 ? "" : ", ");
            html.open("a", "href", LineReport.SHEETS + "#" + LotSheets.id(i));
            html.words(plan.loads().get(i).load().name()).close();
        }
        html.text(".").close();
    }

    private void sizes() {
        Times times = new Times(plan.clock());
        html.open("dl", "class", "sizes");
        long end = plan.schedule().makespan();
        size("The last lot is out", times.wall(end), List.of(Times.lasting(end) + " after the start"));
        size(
                "Lots late",
                account.lateLots().stream()
                                .map(lot -> lot.order().lot())
                                .distinct()
                                .count()
                        + " of " + plan.line().orders().size(),
                plan.schedule().lateness() > 0
                        ? List.of("the latest by "
                                + Times.lasting(account.lateLots().stream()
                                        .mapToLong(Account.Lot::late)
                                        .max()
                                        .orElse(0)))
                        : List.of());
        size(
                "Moves",
                Integer.toString(account.moves().size()),
                List.of(plan.schedule().atNight() + " at night"));
        double litres = Supplies.byDay(account.supplies()).stream()
                .mapToDouble(Supplies.Day::litres)
                .sum();
        size(
                "Liquor",
                Figures.made(litres) + " L",
                account.supplies().stream().allMatch(supply -> supply.litres().isPresent())
                        ? List.of()
                        : List.of("and what is unlimited"));
        account.cost()
                .ifPresent(cost ->
                        size("Cost", Wording.money(cost, account.currency().orElse("")), List.of()));
        busiest().ifPresent(words -> size("Longest in a vessel", words.get(0), words.subList(1, words.size())));
        html.close();
    }

    /** The leg that lasts longest, as a measure of what the line waits for. */
    private Optional<List<String>> busiest() {
        LoadPlan.LegPlan most = null;
        String load = "";
        for (LoadPlan one : plan.loads()) {
            for (LoadPlan.LegPlan leg : one.legs()) {
                if (most == null || leg.seconds() > most.seconds()) {
                    most = leg;
                    load = one.load().name();
                }
            }
        }
        return most == null
                ? Optional.empty()
                : Optional.of(List.of(Times.lasting(most.seconds()), load + ", " + Legs.name(most)));
    }

    private void size(String what, String amount, List<String> more) {
        html.open("div").leaf("dt", what).open("dd").words(amount).close();
        more.forEach(line -> html.open("dd", "class", "more").words(line).close());
        html.close();
    }
}
