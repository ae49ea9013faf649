package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.model.Basis;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.GradeScope;
import org.soakwright.recipes.model.Limits;
import org.soakwright.recipes.model.Liquor;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;
import org.soakwright.solver.chain.Probe;

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
            sides(index, species, batch.lastStage(step), new Probe.Liquor(), liquor.limits(), held);
        } else {
            Target.OfPieces pieces = (Target.OfPieces) target;
            int species = batch.species(pieces.species().name());
            int stage = batch.lastStage(
                    pieces.after() == null
                            ? recipe.steps().size() - 1
                            : batch.step(pieces.after().name()));
            for (Probe probe : probes(pieces)) {
                sides(index, species, stage, probe, pieces.limits(), null);
            }
        }
    }

    private List<Probe> probes(Target.OfPieces target) {
        if (target.grade() instanceof GradeScope.WholeLot) {
            return List.of(new Probe.LotMean());
        }
        List<Grade> grades = recipe.lot().grades();
        List<Probe> probes = new ArrayList<>();
        for (int j = 0; j < grades.size(); j++) {
            if (target.grade() instanceof GradeScope.Each
                    || (target.grade() instanceof GradeScope.Named named
                            && named.name().name().equals(grades.get(j).name()))) {
                probes.add(probe(target.reading(), j));
            }
        }
        return probes;
    }

    static Probe probe(Reading reading, int grade) {
        return switch (reading) {
            case MEAN -> new Probe.Mean(grade);
            case CORE -> new Probe.At(grade, 0);
            case SURFACE -> new Probe.At(grade, 1);
            case HIGHEST -> new Probe.Highest(grade);
            case LOWEST -> new Probe.Lowest(grade);
            case RANGE -> new Probe.Range(grade);
        };
    }

    private void sides(
            int index,
            int species,
            int stage,
            Probe probe,
            Limits limits,
            @org.jspecify.annotations.Nullable Liquor liquor) {
        double start = StartContent.of(recipe, recipe.species().get(species), probe);
        Quantity atMost = limits.atMost();
        Quantity atLeast = limits.atLeast();
        double scale = Math.max(start, Double.MIN_NORMAL);
        if (atMost != null) {
            double limit = si(limits.basis(), atMost, start, liquor);
            all.add(new Requirement.OfContent(index, species, stage, probe, limit, true, scale));
        }
        if (atLeast != null) {
            double limit = si(limits.basis(), atLeast, start, liquor);
            all.add(new Requirement.OfContent(index, species, stage, probe, limit, false, scale));
        }
    }

    private double si(Basis basis, Quantity limit, double start, @org.jspecify.annotations.Nullable Liquor liquor) {
        if (basis == Basis.OF_START) {
            return limit.si() * start;
        }
        Content content = new Content(limit);
        return liquor == null ? recipe.lot().kgPerM3(content) : liquor.kgPerM3(content);
    }
}
