package org.soakwright.planner.report.compare;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.soakwright.recipes.model.Reading;

/**
 * Two batches side by side.
 *
 * @param steps how long each lasts
 * @param ends what liquors and lot hold at the end of each step
 * @param readings of the pieces at the end of the batch: the mean and whatever a target looks at
 * @param litres in all
 * @param cost in all; without numbers where the currencies differ, since no difference says anything
 */
public record Comparison(
        Side a,
        Side b,
        List<StepRow> steps,
        List<EndRow> ends,
        List<ReadingRow> readings,
        List<TargetRow> targets,
        Measure seconds,
        Measure litres,
        Measure cost) {

    /** Where a species would stand. */
    static final String MASS = "mass";

    /** A step; named by both where they are called differently. */
    public record StepRow(String step, String kind, Measure seconds) {}

    /** What is in the {@code liquor} or the {@code lot} at the end of a step; the lot's mass has no species. */
    public record EndRow(String step, String species, String where, Measure content) {}

    /** A reading of one grade, or of the lot, at the end. */
    public record ReadingRow(String species, String grade, String reading, Measure content) {}

    /** A target that one or both have. */
    public record TargetRow(String target, String limit, Optional<Side.Target> a, Optional<Side.Target> b) {
        public Measure value() {
            String unit = a.or(() -> b).map(Side.Target::unit).orElse("");
            return new Measure(unit, value(a), value(b));
        }

        private static OptionalDouble value(Optional<Side.Target> target) {
            return target.map(one -> OptionalDouble.of(one.value())).orElse(OptionalDouble.empty());
        }
    }

    public static Comparison of(Side a, Side b) {
        List<StepRow> steps = new ArrayList<>();
        List<EndRow> ends = new ArrayList<>();
        for (Pairing.Pair<Side.Step> pair : Pairing.of(
                a.steps(),
                b.steps(),
                Side.Step::name,
                (one, other) -> one.kind().equals(other.kind()))) {
            String label = pair.label(Side.Step::name);
            steps.add(new StepRow(label, pair.label(Side.Step::kind), seconds(pair)));
            Optional<Map<String, Side.Content>> meansA = pair.a().map(Side.Step::means);
            Optional<Map<String, Side.Content>> meansB = pair.b().map(Side.Step::means);
            for (String species : names(meansA, meansB)) {
                Optional<EndRow> liquor = end(
                        label,
                        species,
                        "liquor",
                        pair.a().map(Side.Step::liquors),
                        pair.b().map(Side.Step::liquors));
                liquor.filter(row -> row.content().isAny()).ifPresent(ends::add);
                end(label, species, "lot", meansA, meansB).ifPresent(ends::add);
            }
            Measure.of(pair.a().flatMap(Side.Step::mass), pair.b().flatMap(Side.Step::mass))
                    .filter(Measure::isAny)
                    .ifPresent(mass -> ends.add(new EndRow(label, MASS, "lot", mass)));
        }
        return new Comparison(
                a,
                b,
                List.copyOf(steps),
                List.copyOf(ends),
                readings(a, b),
                targets(a, b),
                new Measure("s", OptionalDouble.of(a.seconds()), OptionalDouble.of(b.seconds())),
                new Measure("L", a.litres(), b.litres()),
                cost(a, b));
    }

    private static Measure seconds(Pairing.Pair<Side.Step> pair) {
        return new Measure(
                "s",
                pair.a().map(step -> OptionalDouble.of(step.seconds())).orElse(OptionalDouble.empty()),
                pair.b().map(step -> OptionalDouble.of(step.seconds())).orElse(OptionalDouble.empty()));
    }

    private static Measure cost(Side a, Side b) {
        return a.currency().equals(b.currency())
                ? new Measure(a.currency().orElse(""), a.cost(), b.cost())
                : new Measure("", OptionalDouble.empty(), OptionalDouble.empty());
    }

    private static Optional<EndRow> end(
            String step,
            String species,
            String where,
            Optional<Map<String, Side.Content>> a,
            Optional<Map<String, Side.Content>> b) {
        return Measure.of(a.map(all -> all.get(species)), b.map(all -> all.get(species)))
                .map(content -> new EndRow(step, species, where, content));
    }

    private static Set<String> names(Optional<? extends Map<String, ?>> a, Optional<? extends Map<String, ?>> b) {
        Set<String> names = new LinkedHashSet<>();
        a.ifPresent(all -> names.addAll(all.keySet()));
        b.ifPresent(all -> names.addAll(all.keySet()));
        return names;
    }

    private static List<ReadingRow> readings(Side a, Side b) {
        Set<Reading> looked = EnumSet.of(Reading.MEAN);
        a.targets().forEach(target -> target.reading().ifPresent(looked::add));
        b.targets().forEach(target -> target.reading().ifPresent(looked::add));
        Optional<Side.Step> endA = last(a);
        Optional<Side.Step> endB = last(b);
        Optional<Map<String, Side.Content>> meansA = endA.map(Side.Step::means);
        Optional<Map<String, Side.Content>> meansB = endB.map(Side.Step::means);
        List<Side.Piece> piecesA = endA.map(Side.Step::pieces).orElse(List.of());
        List<Side.Piece> piecesB = endB.map(Side.Step::pieces).orElse(List.of());
        List<Pairing.Pair<Side.Piece>> grades = Pairing.of(
                piecesA, piecesB, Side.Piece::name, (one, other) -> piecesA.size() == 1 && piecesB.size() == 1);
        List<ReadingRow> rows = new ArrayList<>();
        for (String species : names(meansA, meansB)) {
            Measure.of(meansA.map(all -> all.get(species)), meansB.map(all -> all.get(species)))
                    .ifPresent(content -> rows.add(new ReadingRow(species, "lot", Reading.MEAN.word(), content)));
            for (Pairing.Pair<Side.Piece> grade : grades) {
                for (Reading reading : looked) {
                    Measure.of(content(grade.a(), species, reading), content(grade.b(), species, reading))
                            .filter(content ->
                                    content.a().isPresent() || content.b().isPresent())
                            .ifPresent(content -> rows.add(
                                    new ReadingRow(species, grade.label(Side.Piece::name), reading.word(), content)));
                }
            }
        }
        return List.copyOf(rows);
    }

    private static Optional<Side.Step> last(Side side) {
        return side.steps().isEmpty()
                ? Optional.empty()
                : Optional.of(side.steps().get(side.steps().size() - 1));
    }

    private static Optional<Side.Content> content(Optional<Side.Piece> piece, String species, Reading reading) {
        return piece.map(one -> one.species().get(species)).map(readings -> readings.get(reading));
    }

    private static List<TargetRow> targets(Side a, Side b) {
        List<TargetRow> rows = new ArrayList<>();
        for (Pairing.Pair<Side.Target> pair : Pairing.of(
                a.targets(), b.targets(), target -> target.name() + ": " + target.limit(), (one, other) -> false)) {
            Side.Target any = pair.a().or(pair::b).orElseThrow();
            rows.add(new TargetRow(any.name(), any.limit(), pair.a(), pair.b()));
        }
        return List.copyOf(rows);
    }
}
