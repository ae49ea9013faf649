package org.soakwright.planner.report.paper;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.soakwright.planner.batch.Cautions;
import org.soakwright.planner.batch.Checkpoint;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.EachGrade;
import org.soakwright.planner.batch.PullWindow;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.report.Figures;
import org.soakwright.planner.report.HandlingWords;
import org.soakwright.planner.report.PieceWords;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.TargetWords;
import org.soakwright.planner.report.Wording;
import org.soakwright.recipes.model.Gap;
import org.soakwright.recipes.model.Lot;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;

/** Puts a sheet together from a batch that was followed. */
final class Draft {
    /** More fills than these are not listed one by one. */
    private static final int MOST_FILLS = 24;

    private final Run run;
    private final List<String> binds;
    private final Stamp stamp;
    private final Clock clock;
    private final Recipe recipe;
    private final List<PullWindow> windows;
    private final List<Checkpoint> checkpoints;
    private final Advice advice;
    private final Cautions cautions;

    /**
     * A draft.
     *
     * @param binds names of the targets that decide
     */
    Draft(Run run, List<String> binds, Stamp stamp, Clock clock) {
        this.run = run;
        this.binds = binds;
        this.stamp = stamp;
        this.clock = clock;
        recipe = run.batch().recipe();
        cautions = Cautions.of(run);
        boolean followable = run.meetsTargets() && cautions.stops().isEmpty();
        windows = followable && !recipe.targets().isEmpty() ? PullWindow.of(run) : List.of();
        checkpoints = followable ? Checkpoint.of(run) : List.of();
        advice = new Advice(run, windows, clock);
    }

    Sheet sheet() {
        List<String> misses = EachGrade.of(run).stream()
                .filter(state -> !state.met())
                .map(state -> Wording.miss(state) + ".")
                .toList();
        boolean plan = misses.isEmpty() && cautions.stops().isEmpty();
        List<Sheet.Part> parts = new ArrayList<>();
        for (int i = 0; i < recipe.steps().size(); i++) {
            parts.add(part(i));
        }
        return new Sheet(
                recipe.title(),
                misses,
                cautions.stops(),
                List.of(
                        new Sheet.Blank("Lot code", ""),
                        new Sheet.Blank("Loaded", recipe.lot().massKg().isPresent() ? "kg" : "L")),
                lot(),
                timing(),
                parts,
                targets(),
                plan ? Sampling.of(run, clock) : List.of(),
                cautions.shown(),
                plan ? List.of("Prepared", "Checked", "Released") : List.of("Prepared", "Checked"),
                stamp);
    }

    private List<String> lot() {
        Lot lot = recipe.lot();
        String volume = MakeUp.litres(lot.volumeM3()) + " of pieces";
        String amount = lot.massKg().isPresent() ? Figures.made(lot.massKg().getAsDouble()) + " kg, " + volume : volume;
        String grades = lot.grades().stream().map(PieceWords::grade).collect(Collectors.joining("; "));
        List<String> lines = new ArrayList<>(List.of(amount + ": " + grades + "."));
        PieceWords.differences(recipe)
                .ifPresent(differences -> lines.add(
                        differences + " What is expected is the average over a grade, unless a share is named."));
        String allowedBy = recipe.allowedBy();
        if (allowedBy != null) {
            lines.add("In spite of cautions that would stop it, allowed by " + allowedBy + ".");
        }
        return lines;
    }

    private List<String> timing() {
        double total = run.totals().seconds();
        List<String> lines = new ArrayList<>();
        String span = clock.hasWall() ? ", from " + clock.wallWithYear(0) + " to " + clock.wallWithYear(total) : "";
        lines.add("Takes " + Durations.practical(total) + span + between() + ".");
        lines.addAll(HandlingWords.of(recipe));
        lines.add("The clock runs in hours and minutes from the start of the first step."
                + (clock.hasWall()
                        ? " Times of day are local, with 60 minutes to every hour: where summer time begins or ends,"
                                + " go by the clock."
                        : ""));
        if (!windows.isEmpty()) {
            lines.add(
                    "A window says when a step may end with every target still met, if all other steps last as planned. Use one"
                            + " window only; when two steps ended off their times, call the planner.");
        }
        return lines;
    }

    private String between() {
        Quantity between = recipe.between();
        return between == null
                ? ""
                : HandlingWords.transferred(recipe)
                        .map(where -> ", with " + Durations.practical(between.si()) + " between " + where
                                + " to drain and transfer")
                        .orElse("");
    }

    private Sheet.Part part(int index) {
        StepEnd end = run.end(index);
        Step step = end.step();
        String temperature = Wording.temperature(step);
        List<Sheet.Moment> moments = new ArrayList<>();
        moments.add(moment("Start", end.from(), atStart(step), "", List.of()));
        moments.addAll(fills(end));
        List<Sheet.Moment> readings = readings(index, end);
        moments.addAll(readings);
        moments.add(moment("End", end.to(), atEnd(index, end), "", window(index, end)));
        moments.sort(Comparator.comparingDouble(Sheet.Moment::seconds));
        return new Sheet.Part(
                index + 1,
                step.name(),
                (run.meetsTargets() ? "" : Sheet.NO_PLAN + ": ") + step.kind() + ", "
                        + Durations.practical(end.seconds())
                        + (step.gapBetweenFills().lasts() ? " in liquor" : "")
                        + (temperature.isEmpty() ? "" : ", at " + temperature),
                new MakeUp(recipe).of(index, end.seconds()),
                moments,
                notes(readings));
    }

    private Sheet.Moment moment(String what, double seconds, String planned, String unit, List<String> notes) {
        return new Sheet.Moment(what, seconds, clock.running(seconds), clock.wall(seconds), planned, unit, notes);
    }

    /** Every fill but the first, which is the start. */
    private List<Sheet.Moment> fills(StepEnd end) {
        int fills = end.step().fills();
        if (!(end.step() instanceof Step.Wet wet) || fills == 1) {
            return List.of();
        }
        Gap gap = end.step().gapBetweenFills();
        if (fills > MOST_FILLS) {
            String words = "a fresh fill every " + Durations.practical(end.fillFrom(1) - end.from()) + ", " + fills
                    + " in all" + drained(gap);
            return List.of(moment("Fills", end.fillFrom(1), words, "", List.of()));
        }
        String fresh = MakeUp.litres(wet.liquor().volumeM3(recipe.lot()).orElseThrow()) + " fresh";
        List<Sheet.Moment> moments = new ArrayList<>();
        for (int k = 1; k < fills; k++) {
            if (gap instanceof Gap.Refilling refilling) {
                moments.add(
                        moment("Drain", end.fillTo(k - 1), HandlingWords.work(refilling.changeover()), "", List.of()));
            }
            moments.add(moment(
                    "Fill " + (k + 1), end.fillFrom(k), gap.lasts() ? fresh : "drain, then " + fresh, "", List.of()));
        }
        return moments;
    }

    private static String drained(Gap gap) {
        return gap instanceof Gap.Refilling refilling
                ? "; between them " + HandlingWords.work(refilling.changeover())
                : "";
    }

    private static String atStart(Step step) {
        boolean wet = step instanceof Step.Wet;
        if (step.head().handling().stays()) {
            return wet ? "the pieces stayed, the liquor is in" : "the pieces stayed";
        }
        return wet ? "pieces in the liquor" : "";
    }

    private List<Sheet.Moment> readings(int index, StepEnd end) {
        List<Sheet.Moment> moments = new ArrayList<>();
        double before = 0;
        for (Checkpoint checkpoint : checkpoints) {
            if (checkpoint.step() == index && checkpoint.seconds() > before) {
                Advice.Given given = advice.at(checkpoint);
                moments.add(moment(
                        "Read",
                        end.from() + checkpoint.clock(),
                        checkpoint.species() + " " + Advice.figure(checkpoint.expected()) + " g/L; "
                                + (given.telling()
                                        ? "go on at " + given.asPlanned().shown()
                                        : "for the record*"),
                        "g/L",
                        given.off()));
                before = checkpoint.seconds();
            }
        }
        return moments;
    }

    /** What holds for all readings of a step. */
    private static List<String> notes(List<Sheet.Moment> readings) {
        boolean some = readings.stream().anyMatch(reading -> !reading.planned().endsWith("*"));
        boolean recorded =
                readings.stream().anyMatch(reading -> reading.planned().endsWith("*"));
        List<String> notes = new ArrayList<>();
        if (some) {
            notes.add(Advice.OTHERWISE);
        }
        if (recorded) {
            notes.add(Advice.RECORD);
        }
        return notes;
    }

    private String atEnd(int index, StepEnd end) {
        String weight = end.massKg().isPresent()
                ? "the lot weighs " + Figures.measured(end.massKg().getAsDouble()) + " kg"
                : "";
        boolean stay = index + 1 < recipe.steps().size()
                && recipe.steps().get(index + 1).head().handling().stays();
        String pieces = stay ? stay(recipe.gapBefore(index + 1)) : end.step() instanceof Step.Wet ? "pieces out" : "";
        return pieces + (pieces.isEmpty() || weight.isEmpty() ? "" : "; ") + weight;
    }

    private static String stay(Gap gap) {
        return "pieces stay"
                + (gap instanceof Gap.Refilling refilling ? ": " + HandlingWords.work(refilling.changeover()) : "");
    }

    private List<String> window(int index, StepEnd end) {
        Optional<PullWindow> window =
                windows.stream().filter(one -> one.step() == index).findFirst();
        return window.map(one -> List.of("Window: not before " + clock.both(end.ending(one.earliest()))
                        + (one.latest().isPresent()
                                ? ", not after "
                                        + clock.both(end.ending(one.latest().getAsDouble())) + "."
                                : "; no later limit within three times the planned time.")))
                .orElse(List.of());
    }

    private List<Sheet.TargetLine> targets() {
        List<Sheet.TargetLine> lines = new ArrayList<>();
        for (TargetState state : EachGrade.of(run)) {
            String grade = state.grade().orElse("");
            lines.add(new Sheet.TargetLine(
                    TargetWords.name(recipe, state),
                    grade,
                    when(state),
                    TargetWords.limit(recipe, state),
                    Wording.value(state),
                    !state.met() ? "MISSED" : binds.contains(state.name()) ? "decides" : "",
                    state.total().isPresent() ? "" : state.unit()));
        }
        return lines;
    }

    private String when(TargetState state) {
        if (state.target() instanceof Target.OfLiquor liquor) {
            return liquor.step().name();
        }
        if (state.total().isPresent()) {
            return "the batch";
        }
        Reference after = state.target() instanceof Target.OfMass mass
                ? mass.after()
                : ((Target.OfPieces) state.target()).after();
        return after != null
                ? after.name()
                : recipe.steps().get(recipe.steps().size() - 1).name();
    }
}
