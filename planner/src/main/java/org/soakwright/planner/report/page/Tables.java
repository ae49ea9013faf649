package org.soakwright.planner.report.page;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.batch.Balance;
import org.soakwright.planner.batch.EachGrade;
import org.soakwright.planner.batch.Groups;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.batch.Totals;
import org.soakwright.planner.batch.Trace;
import org.soakwright.planner.report.Csv;
import org.soakwright.planner.report.Findings;
import org.soakwright.planner.report.PieceWords;
import org.soakwright.planner.report.Way;
import org.soakwright.planner.report.Wording;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;

/** The tables of a batch for spreadsheets: numbers in full, each with its unit in the header or, where rows differ, beside it. */
final class Tables {
    static final String BALANCE = "balance";
    static final String COURSE = "course";

    private final Run run;
    private final Recipe recipe;
    private final List<StepEnd> ends = new ArrayList<>();
    private final Map<String, String> files = new LinkedHashMap<>();

    private Tables(Run run) {
        this.run = run;
        recipe = run.batch().recipe();
        for (int i = 0; i < recipe.steps().size(); i++) {
            ends.add(run.end(i));
        }
    }

    /** The file of the table of a section. */
    static String file(String section) {
        return "tables/" + section + ".csv";
    }

    /** The text of each file by its name. */
    static Map<String, String> of(
            Trace trace, @Nullable Plan plan, List<Groups.Group> groups, Optional<LocalDateTime> start) {
        Tables tables = new Tables(trace.run());
        tables.steps(start);
        tables.liquor();
        tables.contents();
        tables.percentiles();
        tables.targets();
        tables.totals();
        if (plan != null) {
            tables.reasons(plan);
        }
        tables.groups(groups);
        tables.balance();
        tables.course(trace);
        return tables.files;
    }

    private void add(String name, Csv csv) {
        files.put(file(name), csv.toString());
    }

    private void steps(Optional<LocalDateTime> start) {
        List<String> headers = new ArrayList<>(
                List.of("step number", "step", "kind", "duration [s]", "start [s]", "end [s]", "temperature [Cel]"));
        if (start.isPresent()) {
            headers.addAll(List.of("starts", "ends"));
        }
        Csv csv = new Csv(headers);
        for (int i = 0; i < ends.size(); i++) {
            StepEnd end = ends.get(i);
            Quantity temperature = end.step().temperature();
            csv.number(i + 1)
                    .text(end.step().name())
                    .text(end.step().kind())
                    .number(end.seconds())
                    .number(end.from())
                    .number(end.to())
                    .number(temperature == null ? OptionalDouble.empty() : OptionalDouble.of(celsius(temperature)));
            start.ifPresent(begin -> csv.text(wall(begin, end.from())).text(wall(begin, end.to())));
            csv.end();
        }
        add(Findings.STEPS, csv);
    }

    private static double celsius(Quantity temperature) {
        return temperature.unit().symbol().equals("Cel")
                ? temperature.value().doubleValue()
                : temperature.si() - 273.15;
    }

    private static String wall(LocalDateTime start, double seconds) {
        return start.plusSeconds(Math.round(seconds)).toString();
    }

    private void liquor() {
        Csv csv = new Csv(List.of(
                "step number",
                "step",
                "species",
                "content of fresh liquor [g/L]",
                "content at start [g/L]",
                "content at end [g/L]",
                "volume of one fill [L]"));
        boolean any = false;
        for (int i = 0; i < ends.size(); i++) {
            StepEnd end = ends.get(i);
            for (StepEnd.Liquor liquor : end.liquor()) {
                org.soakwright.recipes.model.Liquor fresh =
                        ((org.soakwright.recipes.model.Step.Wet) end.step()).liquor();
                OptionalDouble fill = fresh.volumeM3(recipe.lot());
                csv.number(i + 1)
                        .text(end.step().name())
                        .text(liquor.species())
                        .number(fresh.kgPerM3(liquor.species()))
                        .number(liquor.start())
                        .number(liquor.end())
                        .number(fill.isPresent() ? OptionalDouble.of(fill.getAsDouble() * 1000) : fill)
                        .end();
                any = true;
            }
        }
        if (any) {
            add(Findings.LIQUOR, csv);
        }
    }

    private static String unit(Species species) {
        return " [" + species.start().unit() + "]";
    }

    /** One row for each step and grade; the row without a grade is the lot: its means, and what it weighs where that is known. */
    private void contents() {
        List<String> headers = new ArrayList<>(List.of("step number", "step", "grade", "end [s]"));
        for (Species species : recipe.species()) {
            for (Reading reading : Reading.values()) {
                headers.add(species.name() + " " + reading.word() + unit(species));
            }
        }
        boolean weighed = ends.stream().anyMatch(end -> end.massKg().isPresent());
        if (weighed) {
            headers.add("mass [kg]");
        }
        Csv csv = new Csv(headers);
        for (int i = 0; i < ends.size(); i++) {
            StepEnd end = ends.get(i);
            for (StepEnd.Piece piece : end.pieces()) {
                csv.number(i + 1).text(end.step().name()).text(piece.name()).number(end.to());
                for (StepEnd.Content content : piece.species()) {
                    for (Reading reading : Reading.values()) {
                        csv.number(content.value(reading));
                    }
                }
                if (weighed) {
                    csv.number(OptionalDouble.empty());
                }
                csv.end();
            }
            csv.number(i + 1).text(end.step().name()).text("").number(end.to());
            for (StepEnd.LotMean mean : end.means()) {
                for (Reading reading : Reading.values()) {
                    csv.number(reading == Reading.MEAN ? OptionalDouble.of(mean.value()) : OptionalDouble.empty());
                }
            }
            if (weighed) {
                csv.number(end.massKg());
            }
            csv.end();
        }
        add(Findings.CONTENTS, csv);
    }

    /** What shares of the pieces of a grade, by mass, read at most; no file where all are alike. */
    private void percentiles() {
        List<String> headers = new ArrayList<>(List.of("step number", "step", "species", "grade", "reading"));
        StepEnd.SHARES.forEach(share -> headers.add(PieceWords.percent(share)));
        headers.add("unit");
        Csv csv = new Csv(headers);
        boolean any = false;
        for (int i = 0; i < ends.size(); i++) {
            for (StepEnd.Piece piece : ends.get(i).pieces()) {
                for (StepEnd.Content content : piece.species()) {
                    for (Map.Entry<Reading, List<Double>> one :
                            content.distribution().entrySet()) {
                        csv.number(i + 1)
                                .text(ends.get(i).step().name())
                                .text(content.species())
                                .text(piece.name())
                                .text(one.getKey().word());
                        one.getValue().forEach(csv::number);
                        csv.text(content.unit().symbol()).end();
                        any = true;
                    }
                }
            }
        }
        if (any) {
            add(Findings.PERCENTILES, csv);
        }
    }

    private void targets() {
        if (recipe.targets().isEmpty()) {
            return;
        }
        Csv csv = new Csv(List.of("target", "grade", "value", "at least", "at most", "unit", "met"));
        for (TargetState state : EachGrade.of(run)) {
            csv.text(state.name())
                    .text(state.grade().orElse(""))
                    .number(state.value())
                    .number(state.atLeast())
                    .number(state.atMost())
                    .text(state.unit())
                    .text(state.met() ? "yes" : "no")
                    .end();
        }
        add(Findings.TARGETS, csv);
    }

    private List<String> totalHeaders() {
        String currency =
                Wording.currency(recipe).map(code -> " [" + code + "]").orElse("");
        return List.of("time [s]", "liquor [L]", "cost" + currency);
    }

    private static Csv totals(Csv csv, Totals totals) {
        OptionalDouble volume = totals.liquorM3();
        return csv.number(totals.seconds())
                .number(volume.isPresent() ? OptionalDouble.of(volume.getAsDouble() * 1000) : volume)
                .number(totals.cost());
    }

    private void totals() {
        Csv csv = new Csv(totalHeaders());
        totals(csv, run.totals()).end();
        add(Findings.TOTALS, csv);
    }

    private void reasons(Plan plan) {
        if (!plan.perHour().isEmpty()) {
            Csv csv = new Csv(List.of("step", "reading", "change by one hour more", "unit"));
            plan.perHour()
                    .forEach(one -> csv.text(one.step())
                            .text(one.reading())
                            .number(one.change())
                            .text(one.unit())
                            .end());
            add(Findings.PER_HOUR, csv);
        }
        if (!plan.remedies().isEmpty()) {
            List<String> headers = new ArrayList<>(List.of("change"));
            headers.addAll(totalHeaders());
            headers.add("caution");
            Csv csv = new Csv(headers);
            plan.remedies()
                    .forEach(remedy -> totals(csv.text(remedy.change()), remedy.totals())
                            .text(remedy.caution())
                            .end());
            add(Findings.REMEDIES, csv);
        }
    }

    private void groups(List<Groups.Group> groups) {
        Csv csv = new Csv(List.of("step", "species", "grade", "Fo [1]", "Bi [1]", "capacity ratio [1]", "regime"));
        for (Groups.Group group : groups) {
            csv.text(group.step()).text(group.species()).text(group.piece()).number(group.foHigh());
            if (Double.isInfinite(group.biot())) {
                csv.text("infinite");
            } else {
                csv.number(group.biot());
            }
            csv.number(group.capacityRatio()).text(group.regime()).end();
        }
        add("groups", csv);
    }

    private void balance() {
        Csv csv = new Csv(List.of("species", "side", "where", "solute [kg]"));
        for (int s = 0; s < recipe.species().size(); s++) {
            Balance balance = run.balance(s);
            balance.sources().forEach(entry -> entry(csv, balance, "from", entry));
            balance.sinks().forEach(entry -> entry(csv, balance, "to", entry));
        }
        add(BALANCE, csv);
    }

    private static void entry(Csv csv, Balance balance, String side, Balance.Entry entry) {
        csv.text(balance.species())
                .text(side)
                .text(entry.name())
                .number(entry.kilograms())
                .end();
    }

    /** What the pictures are drawn from, without the profiles in between. */
    private void course(Trace trace) {
        List<String> headers = new ArrayList<>(List.of("clock [s]", "step"));
        for (Species species : recipe.species()) {
            headers.add(species.name() + " in liquor [g/L]");
            recipe.lot().grades().forEach(grade -> {
                String stated = PieceWords.differ(grade, species) ? " as stated" : "";
                String outside = PieceWords.hasSeveralSides(grade) ? "middle of the face" : Reading.SURFACE.word();
                String bare = Way.of(species, grade).fromSkin() ? "bare face" : outside;
                List<String> read =
                        new ArrayList<>(List.of(Reading.MEAN.word(), Reading.CORE.word() + stated, bare + stated));
                if (Way.of(species, grade).fromSkin()) {
                    read.add("face with skin" + stated);
                }
                read.forEach(one -> headers.add(species.name() + " " + one + ", " + grade.name() + unit(species)));
            });
        }
        Csv csv = new Csv(headers);
        for (Trace.Moment moment : trace.moments()) {
            csv.number(moment.clock())
                    .text(moment.gap() ? "" : recipe.steps().get(moment.step()).name());
            for (int s = 0; s < moment.sights().size(); s++) {
                Trace.Sight sight = moment.sights().get(s);
                csv.number(Double.isNaN(sight.liquor()) ? OptionalDouble.empty() : OptionalDouble.of(sight.liquor()));
                for (int j = 0; j < sight.means().length; j++) {
                    double[] profile = sight.profiles()[j];
                    Way way = Way.of(
                            recipe.species().get(s), recipe.lot().grades().get(j));
                    csv.number(sight.means()[j]).number(way.core(profile)).number(Way.bare(profile));
                    if (way.fromSkin()) {
                        csv.number(profile[0]);
                    }
                }
            }
            csv.end();
        }
        add(COURSE, csv);
    }
}
