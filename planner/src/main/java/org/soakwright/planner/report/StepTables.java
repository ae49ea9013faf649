package org.soakwright.planner.report;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.recipes.model.Basis;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;

/** What to do in each step, what to make up for it, and what to expect at its end. */
final class StepTables {
    /** More grades than these have no room beside each other; their last values stand in the targets. */
    private static final int MOST_GRADES = 3;

    private final Recipe recipe;
    private final List<StepEnd> ends = new ArrayList<>();

    StepTables(Run run) {
        recipe = run.batch().recipe();
        for (int i = 0; i < recipe.steps().size(); i++) {
            ends.add(run.end(i));
        }
    }

    Table steps(Optional<LocalDateTime> start) {
        Table table = numbered(false)
                .text("Step")
                .text("Kind")
                .text("Time")
                .text("Clock")
                .text("At");
        if (start.isPresent()) {
            table.text("Starts").text("Ends");
        }
        for (int i = 0; i < ends.size(); i++) {
            StepEnd end = ends.get(i);
            List<String> row = new ArrayList<>(List.of(
                    number(i),
                    end.step().name(),
                    end.step().kind(),
                    Durations.practical(end.seconds()),
                    Durations.clock(end.from()) + " – " + Durations.clock(end.to()),
                    Wording.temperature(end.step())));
            start.ifPresent(
                    begin -> row.addAll(List.of(Wording.wall(begin, end.from()), Wording.wall(begin, end.to()))));
            table.row(row);
        }
        return table;
    }

    private static Table numbered(boolean grouped) {
        return new Table().column("", "No.", Table.Kind.NUMBER, grouped);
    }

    /** What lies between steps and fills, and how the lot is handled. */
    List<String> handling() {
        List<String> notes = new ArrayList<>();
        Quantity between = recipe.between();
        if (between != null) {
            HandlingWords.transferred(recipe)
                    .ifPresent(where -> notes.add("Between " + where + " " + Durations.practical(between.si())
                            + " to drain and transfer; the clock counts them."));
        }
        notes.addAll(HandlingWords.of(recipe));
        return notes;
    }

    Table liquor() {
        Table table = numbered(true)
                .group("Step")
                .group("Fill")
                .group("Flow")
                .column("In all", "In all", Table.Kind.NUMBER, true)
                .text("Solute")
                .number("Strength")
                .number("To dissolve in all");
        for (int i = 0; i < ends.size(); i++) {
            if (ends.get(i).step() instanceof Step.Wet wet) {
                makeUp(table, i, wet);
            }
        }
        return table;
    }

    private void makeUp(Table table, int step, Step.Wet wet) {
        OptionalDouble fill = wet.liquor().volumeM3(recipe.lot());
        OptionalDouble all = total(step, wet, fill);
        List<String> head = List.of(number(step), wet.name(), fill(wet, fill), flow(wet), litres(all));
        List<Species> solutes = recipe.species().stream()
                .filter(species ->
                        species.exchangesWith(Medium.LIQUOR) && wet.liquor().kgPerM3(species.name()) > 0)
                .toList();
        if (solutes.isEmpty()) {
            table.row(with(head, "none", "", ""));
        }
        for (Species species : solutes) {
            double strength = wet.liquor().kgPerM3(species.name());
            table.row(with(
                    head, species.name(), strength(wet, species, strength), toDissolve(strength, all, wet.fills())));
        }
    }

    private static List<String> with(List<String> head, String... tail) {
        List<String> row = new ArrayList<>(head);
        row.addAll(List.of(tail));
        return row;
    }

    private static String strength(Step.Wet wet, Species species, double kgPerM3) {
        Content content = wet.liquor().contents().get(species.name());
        String written = content != null && content.basis() == Basis.PER_MASS ? " = " + content : "";
        return Figures.made(kgPerM3) + " g/L" + written;
    }

    private OptionalDouble total(int step, Step.Wet wet, OptionalDouble fill) {
        if (fill.isEmpty()) {
            return fill;
        }
        double volume = wet.fills() * fill.getAsDouble();
        if (wet instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Flow flow) {
            volume += flow.rate().si() * ends.get(step).seconds();
        }
        return OptionalDouble.of(volume);
    }

    private static String toDissolve(double kgPerM3, OptionalDouble all, int fills) {
        if (all.isEmpty()) {
            return "";
        }
        double kg = kgPerM3 * all.getAsDouble();
        return Figures.made(kg) + " kg" + (fills > 1 ? ", " + Figures.made(kg / fills) + " kg a fill" : "");
    }

    private static String fill(Step.Wet wet, OptionalDouble fill) {
        return (wet.fills() > 1 ? wet.fills() + " x " : "") + litres(fill);
    }

    private static String flow(Step.Wet wet) {
        return wet instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Flow flow
                ? flow.rate().toString()
                : "";
    }

    private static String litres(OptionalDouble m3) {
        return m3.isPresent() ? Figures.made(m3.getAsDouble() * 1000) + " L" : "unlimited";
    }

    /** What clings to the pieces and where it goes. */
    List<String> clinging() {
        Map<String, List<String>> after = new LinkedHashMap<>();
        for (int i = 0; i < ends.size(); i++) {
            if (ends.get(i).step() instanceof Step.Wet wet && wet.dragOut() != null) {
                Quantity dragOut = wet.dragOut();
                double litres = dragOut.si() * recipe.lot().massKg().orElseThrow() * 1000;
                String what = Figures.made(litres) + " L (" + dragOut + ") cling to the pieces"
                        + (liquorAfter(i) ? " and go into the next liquor" : "");
                after.computeIfAbsent(what, key -> new ArrayList<>()).add(wet.name());
            }
        }
        return after.entrySet().stream()
                .map(note -> "After " + String.join(", ", note.getValue()) + ": " + note.getKey() + ".")
                .toList();
    }

    private boolean liquorAfter(int step) {
        return ends.stream().skip(step + 1L).anyMatch(end -> end.step() instanceof Step.Wet);
    }

    Table expected() {
        boolean liquor = ends.stream().anyMatch(end -> !end.liquor().isEmpty());
        boolean several = recipe.lot().grades().size() > 1;
        boolean each = several && recipe.lot().grades().size() <= MOST_GRADES;
        Table table = numbered(true).group("Step").text("Species");
        if (liquor) {
            table.number("Liquor at start").number("Liquor at end");
        }
        table.number(several ? "Lot mean" : "Mean in pieces");
        if (each) {
            recipe.lot()
                    .grades()
                    .forEach(grade -> table.column(
                            Prose.clipped(grade.name(), 10) + " mean",
                            grade.name() + " mean",
                            Table.Kind.NUMBER,
                            false));
        }
        for (int i = 0; i < ends.size(); i++) {
            for (int s = 0; s < recipe.species().size(); s++) {
                table.row(expected(i, s, liquor, each));
            }
        }
        return table;
    }

    private List<String> expected(int step, int species, boolean liquor, boolean each) {
        StepEnd end = ends.get(step);
        StepEnd.LotMean mean = end.means().get(species);
        List<String> row = new ArrayList<>();
        row.add(number(step));
        row.add(end.step().name());
        row.add(mean.species());
        if (liquor) {
            StepEnd.Liquor held = end.liquor().stream()
                    .filter(one -> one.species().equals(mean.species()))
                    .findFirst()
                    .orElse(null);
            row.add(held == null ? "" : Figures.measured(held.start()) + " g/L");
            row.add(held == null ? "" : Figures.measured(held.end()) + " g/L");
        }
        row.add(Figures.measured(mean.value()) + " " + mean.unit());
        if (each) {
            end.pieces()
                    .forEach(piece -> row.add(
                            Figures.measured(piece.species().get(species).value(Reading.MEAN))));
        }
        return row;
    }

    /** Every reading, in the unit of its species. */
    Table contents() {
        Table table = numbered(true).group("Step").group("Species").text("Grade");
        for (Reading reading : Reading.values()) {
            String word = reading.word();
            table.number(word.substring(0, 1).toUpperCase(Locale.ROOT) + word.substring(1));
        }
        table.text("Unit");
        for (int i = 0; i < ends.size(); i++) {
            for (int s = 0; s < recipe.species().size(); s++) {
                for (StepEnd.Piece piece : ends.get(i).pieces()) {
                    StepEnd.Content content = piece.species().get(s);
                    List<String> row = new ArrayList<>(
                            List.of(number(i), ends.get(i).step().name(), content.species(), piece.name()));
                    for (Reading reading : Reading.values()) {
                        row.add(Figures.measured(content.value(reading)));
                    }
                    row.add(content.unit().symbol());
                    table.row(row);
                }
            }
        }
        return table;
    }

    /** What is to be expected beside the contents. */
    List<String> expectations() {
        List<String> notes = new ArrayList<>(differences());
        List<String> masses = new ArrayList<>();
        for (StepEnd end : ends) {
            end.massKg()
                    .ifPresent(kg -> masses.add(
                            Figures.measured(kg) + " kg when " + end.step().name() + " ends"));
        }
        if (!masses.isEmpty()) {
            notes.add("The lot, loaded with "
                    + Figures.made(recipe.lot().massKg().orElseThrow()) + " kg, weighs " + Wording.list(masses) + ".");
        }
        return notes;
    }

    /** What the means are where pieces differ, and how far they lie apart at the end. */
    private List<String> differences() {
        if (!PieceWords.differ(recipe)) {
            return List.of();
        }
        StepEnd end = ends.get(ends.size() - 1);
        List<String> means = new ArrayList<>();
        for (int s = 0; s < recipe.species().size(); s++) {
            List<String> apart = new ArrayList<>();
            for (StepEnd.Piece piece : end.pieces()) {
                StepEnd.Content content = piece.species().get(s);
                if (!content.distribution().isEmpty()) {
                    apart.add(between(content) + " " + content.species()
                            + (end.pieces().size() > 1 ? " in " + piece.name() : ""));
                }
            }
            if (!apart.isEmpty() && apart.size() <= MOST_GRADES) {
                means.add(Wording.list(apart));
            }
        }
        String averages = "Means are averages over each grade.";
        return List.of(
                means.isEmpty()
                        ? averages
                        : averages + " At the end 90 % of the pieces, by mass, have means of "
                                + String.join("; ", means) + ".");
    }

    /** All but the twentieth of the pieces that read least and the twentieth that read most. */
    private static String between(StepEnd.Content content) {
        List<Double> values = content.distribution().getOrDefault(Reading.MEAN, List.of());
        double low = values.get(StepEnd.SHARES.indexOf(0.05));
        double high = values.get(StepEnd.SHARES.indexOf(0.95));
        return Figures.measured(low) + " to " + Figures.measured(high) + " " + content.unit();
    }

    /** What shares of the pieces read at most, for the mean and whatever a target looks at; no row where all are alike. */
    Table percentiles() {
        Table table =
                numbered(true).group("Step").group("Species").group("Grade").text("Reading");
        StepEnd.SHARES.forEach(share -> table.number(PieceWords.percent(share)));
        table.text("Unit");
        Set<Reading> looked = EnumSet.of(Reading.MEAN);
        recipe.targets().forEach(target -> {
            if (target instanceof Target.OfPieces pieces) {
                looked.add(pieces.reading());
            }
        });
        for (int i = 0; i < ends.size(); i++) {
            for (int s = 0; s < recipe.species().size(); s++) {
                for (StepEnd.Piece piece : ends.get(i).pieces()) {
                    percentiles(table, i, piece.name(), piece.species().get(s), looked);
                }
            }
        }
        return table;
    }

    private void percentiles(Table table, int step, String grade, StepEnd.Content content, Set<Reading> looked) {
        for (Reading reading : looked) {
            List<Double> values = content.distribution().getOrDefault(reading, List.of());
            if (!values.isEmpty()) {
                List<String> row = new ArrayList<>(
                        List.of(number(step), ends.get(step).step().name(), content.species(), grade, reading.word()));
                values.forEach(value -> row.add(Figures.measured(value)));
                row.add(content.unit().symbol());
                table.row(row);
            }
        }
    }

    private static String number(int step) {
        return Integer.toString(step + 1);
    }
}
