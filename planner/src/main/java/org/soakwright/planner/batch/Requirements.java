package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.conditions.Strengths;
import org.soakwright.recipes.model.Basis;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Counted;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.GradeScope;
import org.soakwright.recipes.model.Limits;
import org.soakwright.recipes.model.Phase;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;
import org.soakwright.solver.chain.Stage;

/** Targets taken apart into requirements on single numbers. */
final class Requirements {
    private final Batch batch;
    private final Recipe recipe;
    private final List<Requirement> all = new ArrayList<>();

    private Requirements(Batch batch) {
        this.batch = batch;
        recipe = batch.recipe();
    }

    static List<Requirement> of(Batch batch) {
        Requirements requirements = new Requirements(batch);
        for (int i = 0; i < requirements.recipe.targets().size(); i++) {
            requirements.add(i, requirements.recipe.targets().get(i));
        }
        return List.copyOf(requirements.all);
    }

    private void add(int index, Target target) {
        if (target instanceof Target.OfTotal total) {
            all.add(new Requirement.OfTotal(index, total.total(), total.atMost().si()));
        } else if (target instanceof Target.OfMass mass) {
            ofMass(index, mass);
        } else if (target instanceof Target.OfLiquor liquor) {
            int species = batch.species(liquor.species().name());
            int step = batch.step(liquor.step().name());
            Step.Wet held = (Step.Wet) recipe.steps().get(step);
            sides(index, species, batch.lastStage(step), new Gauge.OfLiquor(), liquor.limits(), held);
        } else {
            Target.OfPieces pieces = (Target.OfPieces) target;
            int species = batch.species(pieces.species().name());
            int stage = stage(pieces.after());
            List<Population> populations = batch.classes(species).populations();
            if (pieces.grade() instanceof GradeScope.WholeLot) {
                pieces(index, species, stage, pieces, -1, populations);
                return;
            }
            List<Grade> grades = recipe.lot().grades();
            for (int j = 0; j < grades.size(); j++) {
                if (pieces.grade() instanceof GradeScope.Each
                        || (pieces.grade() instanceof GradeScope.Named named
                                && named.name().name().equals(grades.get(j).name()))) {
                    pieces(index, species, stage, pieces, j, List.of(populations.get(j)));
                }
            }
        }
    }

    /**
     * Without a share the average piece is meant, or the lot's mean. With one, at most is a limit on the piece at that share from below, at
     * least from above; of a band each side may be missed by half of the rest.
     */
    private void pieces(
            int index, int species, int stage, Target.OfPieces target, int grade, List<Population> populations) {
        Quantity share = target.share();
        Limits limits = target.limits();
        boolean loaded = target.counted().equals(Counted.AS_LOADED);
        if (share == null) {
            Gauge gauge =
                    grade < 0 ? new Gauge.OfLot() : new Gauge.Average(grade, populations.get(0), target.reading());
            if (loaded) {
                sides(index, species, stage, gauge, limits, null);
            } else {
                counted(index, species, stage, target, gauge, gauge);
            }
            return;
        }
        boolean band = limits.atMost() != null && limits.atLeast() != null;
        double inside = band ? (1 + share.si()) / 2 : share.si();
        Gauge low = new Gauge.Percentile(grade, populations, target.reading(), 1 - inside);
        Gauge high = new Gauge.Percentile(grade, populations, target.reading(), inside);
        if (loaded) {
            upper(index, species, stage, high, limits, null);
            lower(index, species, stage, low, limits, null);
        } else {
            counted(index, species, stage, target, high, low);
        }
    }

    private void sides(int index, int species, int stage, Gauge gauge, Limits limits, Step.@Nullable Wet liquor) {
        upper(index, species, stage, gauge, limits, liquor);
        lower(index, species, stage, gauge, limits, liquor);
    }

    private void upper(int index, int species, int stage, Gauge gauge, Limits limits, Step.@Nullable Wet liquor) {
        Quantity atMost = limits.atMost();
        if (atMost != null) {
            side(index, species, stage, gauge, limits.basis(), atMost, true, liquor);
        }
    }

    private void lower(int index, int species, int stage, Gauge gauge, Limits limits, Step.@Nullable Wet liquor) {
        Quantity atLeast = limits.atLeast();
        if (atLeast != null) {
            side(index, species, stage, gauge, limits.basis(), atLeast, false, liquor);
        }
    }

    private void side(
            int index,
            int species,
            int stage,
            Gauge gauge,
            Basis basis,
            Quantity limit,
            boolean upper,
            Step.@Nullable Wet liquor) {
        double start = StartContent.of(recipe, recipe.species().get(species), gauge.grade());
        double scale = Math.max(Math.max(start, most(species)), Double.MIN_NORMAL);
        double si = si(species, basis, limit, start, liquor);
        all.add(new Requirement.OfContent(index, species, stage, gauge, si, upper, scale));
    }

    /** The largest content that any surroundings pull towards, kg/m3 of piece. */
    private double most(int species) {
        double most = 0;
        for (int k = 0; k < batch.slots().size(); k++) {
            Stage stage = batch.stage(species, k);
            most = Math.max(most, stage.partition() * stage.offset());
        }
        return most;
    }

    private double si(int species, Basis basis, Quantity limit, double start, Step.@Nullable Wet liquor) {
        if (basis == Basis.OF_START) {
            return limit.si() * start;
        }
        return liquor == null
                ? recipe.lot().kgPerM3(new Content(limit))
                : Strengths.kgPerM3(liquor, recipe.species().get(species), limit);
    }

    private void ofMass(int index, Target.OfMass target) {
        int stage = stage(target.after());
        double loaded = recipe.lot().massKg().orElseThrow();
        Measure mass = new Measure.MassOfLot(weighing(target.place()), loaded);
        double unit = target.ofStart() ? loaded : 1;
        limit(index, stage, mass, target.atMost(), true, unit);
        limit(index, stage, mass, target.atLeast(), false, unit);
    }

    private void limit(int index, int stage, Measure measure, @Nullable Quantity limit, boolean upper, double unit) {
        if (limit != null) {
            all.add(new Requirement.OfState(index, stage, measure, unit * limit.si(), upper));
        }
    }

    /** The same readings counted against the mass at present, the dry mass or the water, in kg per kg. */
    private void counted(int index, int species, int stage, Target.OfPieces target, Gauge atMost, Gauge atLeast) {
        Weighing weighing = weighing(target.place());
        Limits limits = target.limits();
        limit(index, stage, measure(weighing, species, target, atMost), limits.atMost(), true, 1);
        limit(index, stage, measure(weighing, species, target, atLeast), limits.atLeast(), false, 1);
    }

    private Measure measure(Weighing weighing, int species, Target.OfPieces target, Gauge gauge) {
        Reading reading = target.reading();
        if (target.counted() instanceof Counted.OfPiece piece) {
            return new Measure.PerMass(target.place(), weighing, species, gauge, piece.per());
        }
        Phase phase = ((Counted.InPhase) target.counted()).phase();
        boolean extreme = reading == Reading.HIGHEST || reading == Reading.LOWEST || reading == Reading.RANGE;
        if (weighing.waterSpecies().isPresent() && target.share() != null) {
            throw new Unsound(
                    target.place(),
                    "a share of pieces by their water phase is not computed where the water is a species; remove share, or"
                            + " state moisture instead of the species");
        }
        if (!extreme) {
            return new Measure.InPhase(target.place(), weighing, species, gauge, reading, phase);
        }
        if (reading == Reading.RANGE) {
            return new Measure.Between(
                    extreme(weighing, species, target, gauge, true, phase),
                    extreme(weighing, species, target, gauge, false, phase));
        }
        return extreme(weighing, species, target, gauge, reading == Reading.HIGHEST, phase);
    }

    /** Where the moisture is the same everywhere, the phase is extreme where the solute is. */
    private Measure extreme(
            Weighing weighing, int species, Target.OfPieces target, Gauge gauge, boolean highest, Phase phase) {
        Reading reading = highest ? Reading.HIGHEST : Reading.LOWEST;
        int grade = gauge.grade();
        if (weighing.waterSpecies().isEmpty()) {
            Gauge own = gauge instanceof Gauge.Average average
                    ? new Gauge.Average(grade, average.pieces(), reading)
                    : gauge;
            return new Measure.InPhase(target.place(), weighing, species, own, reading, phase);
        }
        if (recipe.lot().grades().get(grade).sides().size() > 1) {
            throw new Unsound(
                    target.place(),
                    "the " + reading.word()
                            + " of a phase is not computed in pieces of several sides where the water is a"
                            + " species; read the mean, core or surface, or state moisture instead of the species");
        }
        if (!weighing.sharesClasses(species)) {
            throw new Unsound(
                    target.place(),
                    "the " + reading.word()
                            + " of a phase is not computed where start or diffusivity differ from piece to piece; remove"
                            + " varies from the species and the water, or read the mean, core or surface");
        }
        Population pieces = batch.classes(species).populations().get(grade);
        return new Measure.ExtremeOfPhase(target.place(), weighing, species, pieces, grade, highest, phase);
    }

    private Weighing weighing(Place place) {
        return Weighing.of(recipe)
                .orElseThrow(() -> new Unsound(
                        place,
                        "this target needs to know how the mass changes; add gain to a step, moisture to the lot, or the"
                                + " species water, and a density"));
    }

    private int stage(@Nullable Reference after) {
        return batch.lastStage(after == null ? recipe.steps().size() - 1 : batch.step(after.name()));
    }
}
