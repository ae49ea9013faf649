package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Basis;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.GradeScope;
import org.soakwright.recipes.model.Limits;
import org.soakwright.recipes.model.Liquor;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;
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
        } else if (target instanceof Target.OfLiquor liquor) {
            int species = batch.species(liquor.species().name());
            int step = batch.step(liquor.step().name());
            Liquor held = ((Step.Wet) recipe.steps().get(step)).liquor();
            sides(index, species, batch.lastStage(step), new Gauge.OfLiquor(), liquor.limits(), held);
        } else {
            Target.OfPieces pieces = (Target.OfPieces) target;
            int species = batch.species(pieces.species().name());
            int stage = batch.lastStage(
                    pieces.after() == null
                            ? recipe.steps().size() - 1
                            : batch.step(pieces.after().name()));
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
        if (share == null) {
            Gauge gauge =
                    grade < 0 ? new Gauge.OfLot() : new Gauge.Average(grade, populations.get(0), target.reading());
            sides(index, species, stage, gauge, limits, null);
            return;
        }
        boolean band = limits.atMost() != null && limits.atLeast() != null;
        double inside = band ? (1 + share.si()) / 2 : share.si();
        upper(index, species, stage, new Gauge.Percentile(grade, populations, target.reading(), inside), limits, null);
        lower(
                index,
                species,
                stage,
                new Gauge.Percentile(grade, populations, target.reading(), 1 - inside),
                limits,
                null);
    }

    private void sides(int index, int species, int stage, Gauge gauge, Limits limits, @Nullable Liquor liquor) {
        upper(index, species, stage, gauge, limits, liquor);
        lower(index, species, stage, gauge, limits, liquor);
    }

    private void upper(int index, int species, int stage, Gauge gauge, Limits limits, @Nullable Liquor liquor) {
        Quantity atMost = limits.atMost();
        if (atMost != null) {
            side(index, species, stage, gauge, limits.basis(), atMost, true, liquor);
        }
    }

    private void lower(int index, int species, int stage, Gauge gauge, Limits limits, @Nullable Liquor liquor) {
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
            @Nullable Liquor liquor) {
        double start = StartContent.of(recipe, recipe.species().get(species), gauge.grade());
        double scale = Math.max(Math.max(start, most(species)), Double.MIN_NORMAL);
        double si = si(basis, limit, start, liquor);
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

    private double si(Basis basis, Quantity limit, double start, @Nullable Liquor liquor) {
        if (basis == Basis.OF_START) {
            return limit.si() * start;
        }
        Content content = new Content(limit);
        return liquor == null ? recipe.lot().kgPerM3(content) : liquor.kgPerM3(content);
    }
}
