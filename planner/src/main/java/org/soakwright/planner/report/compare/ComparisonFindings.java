package org.soakwright.planner.report.compare;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.report.Figures;
import org.soakwright.planner.report.Findings;
import org.soakwright.planner.report.Section;
import org.soakwright.planner.report.Table;
import org.soakwright.planner.report.Wording;

/** What there is to say about two batches, in words and tables. */
public final class ComparisonFindings {
    private static final String DIFFERENCE = "B - A";

    private ComparisonFindings() {}

    public static Findings of(Comparison comparison) {
        Side a = comparison.a();
        Side b = comparison.b();
        List<Section> sections = new ArrayList<>();
        sections.add(Section.of(Findings.TOTALS, "In all", totals(comparison), List.of()));
        sections.add(Section.of(Findings.STEPS, "Steps", steps(comparison), List.of()));
        if (!comparison.targets().isEmpty()) {
            sections.add(Section.of(Findings.TARGETS, "Targets", targets(comparison), List.of()));
        }
        sections.add(Section.of("readings", "In the pieces at the end", readings(comparison), List.of()));
        sections.add(Section.of(Findings.EXPECTED, "At the end of each step", ends(comparison), List.of()));
        return new Findings(
                "Two batches compared",
                List.of(about("A", a), about("B", b)),
                List.of(sums(comparison), targetsMet(a, b)),
                a.met() && b.met(),
                sections);
    }

    private static String about(String name, Side side) {
        return name + ": " + side.title() + " (" + side.file() + ", " + side.how() + ")";
    }

    private static String sums(Comparison comparison) {
        List<String> parts = new ArrayList<>();
        parts.add(more(
                comparison.seconds().difference(),
                "takes the same time",
                Durations::practical,
                "takes %s more",
                "takes %s less"));
        if (comparison.litres().difference().isPresent()) {
            parts.add(more(
                    comparison.litres().difference(),
                    "needs the same amount of liquor",
                    litres -> Figures.made(litres) + " L",
                    "needs %s more liquor",
                    "needs %s less liquor"));
        }
        if (comparison.cost().difference().isPresent()) {
            String currency = comparison.cost().unit();
            parts.add(more(
                    comparison.cost().difference(),
                    "costs the same",
                    amount -> Wording.money(amount, currency),
                    "costs %s more",
                    "costs %s less"));
        }
        int last = parts.size() - 1;
        return "Against A, B "
                + (last == 0 ? parts.get(0) : String.join(", ", parts.subList(0, last)) + " and " + parts.get(last))
                + ".";
    }

    private interface Shown {
        String of(double amount);
    }

    private static String more(OptionalDouble difference, String none, Shown shown, String more, String less) {
        double by = difference.orElse(0);
        String amount = shown.of(Math.abs(by));
        // What shows as nothing is nothing.
        if (amount.equals(shown.of(0))) {
            return none;
        }
        return String.format(java.util.Locale.ROOT, by > 0 ? more : less, amount);
    }

    private static String targetsMet(Side a, Side b) {
        if (a.targets().isEmpty() && b.targets().isEmpty()) {
            return "Neither states a target.";
        }
        if (a.met() && b.met()) {
            return "Both meet all their targets.";
        }
        return "A " + met(a) + "; B " + met(b) + ".";
    }

    private static String met(Side side) {
        long missed = side.targets().stream().filter(target -> !target.met()).count();
        return missed == 0
                ? "meets every target of its own"
                : "misses " + missed + " of " + side.targets().size() + " targets";
    }

    private static Table columns(Table table) {
        return table.number("A").number("B").number(DIFFERENCE);
    }

    private static Table totals(Comparison comparison) {
        Side a = comparison.a();
        Side b = comparison.b();
        Table table = new Table().text("Total").text("A").text("B").text(DIFFERENCE);
        table.row(List.of(
                "Time",
                Durations.practical(a.seconds()),
                Durations.practical(b.seconds()),
                duration(comparison.seconds().difference())));
        table.row(List.of("Liquor", litres(a.litres()), litres(b.litres()), signed(comparison.litres(), "L")));
        if (a.cost().isPresent() || b.cost().isPresent()) {
            OptionalDouble difference = comparison.cost().difference();
            table.row(List.of(
                    "Cost",
                    money(a),
                    money(b),
                    difference.isPresent()
                            ? plus(difference.getAsDouble())
                                    + Wording.money(
                                            difference.getAsDouble(),
                                            comparison.cost().unit())
                            : ""));
        }
        return table;
    }

    private static String litres(OptionalDouble litres) {
        return litres.isPresent() ? Figures.made(litres.getAsDouble()) + " L" : "unlimited";
    }

    private static String money(Side side) {
        return side.cost().isPresent()
                ? Wording.money(side.cost().getAsDouble(), side.currency().orElse(""))
                : "";
    }

    private static Table steps(Comparison comparison) {
        Table table = new Table().text("Step").text("Kind").text("A").text("B").text(DIFFERENCE);
        for (Comparison.StepRow row : comparison.steps()) {
            table.row(List.of(
                    row.step(),
                    row.kind(),
                    duration(row.seconds().a(), ""),
                    duration(row.seconds().b(), ""),
                    duration(row.seconds().difference())));
        }
        return table;
    }

    private static String duration(OptionalDouble seconds, String sign) {
        return seconds.isPresent() ? sign + Durations.practical(seconds.getAsDouble()) : "";
    }

    private static String duration(OptionalDouble difference) {
        if (difference.isEmpty()) {
            return "";
        }
        double by = difference.getAsDouble();
        return by == 0 ? "0" : (by > 0 ? "+" : "-") + Durations.practical(Math.abs(by));
    }

    /** In a table of one line each or, where that would be too wide, under a heading for each reading. */
    private static Table targets(Comparison comparison) {
        Table flat = results(new Table().text("Target").text("Limit"));
        comparison.targets().forEach(row -> flat.row(results(row, row.target(), row.limit())));
        if (flat.fitsASheet()) {
            return flat;
        }
        Table table = results(new Table().text("Limit"));
        String heading = "";
        for (Comparison.TargetRow row : comparison.targets()) {
            if (!row.target().equals(heading)) {
                heading = row.target();
                table.heading(heading);
            }
            table.row(results(row, "  " + row.limit()));
        }
        return table;
    }

    private static Table results(Table table) {
        return table.number("A")
                .verdict("A verdict")
                .number("B")
                .verdict("B verdict")
                .number(DIFFERENCE);
    }

    private static List<String> results(Comparison.TargetRow row, String... head) {
        List<String> cells = new ArrayList<>(List.of(head));
        cells.addAll(
                List.of(value(row.a()), verdict(row.a()), value(row.b()), verdict(row.b()), signed(row.value(), "")));
        return cells;
    }

    private static String value(Optional<Side.Target> target) {
        return target.map(one -> Figures.measured(one.value())
                        + one.grade().map(grade -> " " + grade).orElse(""))
                .orElse("");
    }

    private static String verdict(Optional<Side.Target> target) {
        return target.map(one -> one.met() ? "met" : "MISSED").orElse("");
    }

    private static Table readings(Comparison comparison) {
        Table table = columns(new Table().group("Species").group("Grade").text("Reading"))
                .text("Unit");
        for (Comparison.ReadingRow row : comparison.readings()) {
            table.row(List.of(
                    row.species(),
                    row.grade(),
                    row.reading(),
                    plain(row.content().a()),
                    plain(row.content().b()),
                    signed(row.content(), ""),
                    row.content().unit()));
        }
        return table;
    }

    private static Table ends(Comparison comparison) {
        Table table =
                columns(new Table().group("Step").group("Species").text("In")).text("Unit");
        for (Comparison.EndRow row : comparison.ends()) {
            table.row(List.of(
                    row.step(),
                    row.species(),
                    row.where(),
                    plain(row.content().a()),
                    plain(row.content().b()),
                    signed(row.content(), ""),
                    row.content().unit()));
        }
        return table;
    }

    private static String plain(OptionalDouble value) {
        return value.isPresent() ? Figures.measured(value.getAsDouble()) : "";
    }

    /** A difference smaller than what is shown of its terms is none. */
    private static String signed(Measure measure, String unit) {
        OptionalDouble difference = measure.difference();
        if (difference.isEmpty()) {
            return "";
        }
        double by = difference.getAsDouble();
        double size =
                Math.max(Math.abs(measure.a().orElse(0)), Math.abs(measure.b().orElse(0)));
        String text = Math.abs(by) < 1e-9 * size || by == 0 ? "0" : plus(by) + Figures.rounded(by, 3);
        return unit.isEmpty() ? text : text + " " + unit;
    }

    private static String plus(double by) {
        return by > 0 ? "+" : "";
    }
}
