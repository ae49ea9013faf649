package org.soakwright.planner.batch;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.conditions.Strengths;
import org.soakwright.recipes.model.Basis;
import org.soakwright.recipes.model.Counted;
import org.soakwright.recipes.model.Goal;
import org.soakwright.recipes.model.Limits;
import org.soakwright.recipes.model.Per;
import org.soakwright.recipes.model.Phase;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.text.Unit;

/**
 * A target and how it stands.
 *
 * @param target as written
 * @param name how it is called in sheets and results: {@code salt mean, thick}
 * @param grade the grade meant or, for each, the one nearest to failing; {@code lot}; empty for liquor and totals
 * @param atMost in the target's own unit; empty where there is no such side
 * @param value in the target's own unit
 * @param unit the target's own unit, {@code % of start} for a share of the start
 */
public record TargetState(
        Target target,
        String name,
        Optional<String> grade,
        OptionalDouble atMost,
        OptionalDouble atLeast,
        double value,
        String unit,
        boolean met) {

    static TargetState of(Run run, Requirement requirement) {
        return of(run, requirement, run.value(requirement));
    }

    /** As it would stand if it read so much, in SI, comparable with the limit at stated values. */
    static TargetState of(Run run, Requirement requirement, double si) {
        Recipe recipe = run.batch().recipe();
        Target target = recipe.targets().get(requirement.target());
        boolean met = run.batch().requirements().stream()
                .filter(one -> one.target() == requirement.target())
                .allMatch(run::meets);
        String name = name(recipe, requirement);
        if (target instanceof Target.OfTotal total) {
            Quantity limit = total.atMost();
            return new TargetState(
                    target,
                    name,
                    Optional.empty(),
                    OptionalDouble.of(limit.value().doubleValue()),
                    OptionalDouble.empty(),
                    limit.unit().fromSi(si),
                    limit.unit().symbol(),
                    met);
        }
        if (target instanceof Target.OfLiquor ofLiquor) {
            Step.Wet step = (Step.Wet)
                    recipe.steps().get(run.batch().step(ofLiquor.step().name()));
            Species species = recipe.species(ofLiquor.species().name()).orElseThrow();
            Limits limits = ofLiquor.limits();
            Quantity like = limits.atMost() != null ? limits.atMost() : Objects.requireNonNull(limits.atLeast());
            return limited(target, name, null, limits, Strengths.express(step, species, si, like), met);
        }
        if (target instanceof Target.OfMass mass) {
            return ofMass(recipe, mass, name, si, met);
        }
        Target.OfPieces pieces = (Target.OfPieces) target;
        Limits limits = pieces.limits();
        int grade = requirement.grade();
        double value;
        if (limits.basis() == Basis.OF_START) {
            double start = StartContent.of(
                    recipe, recipe.species(pieces.species().name()).orElseThrow(), grade);
            value = limits.unit().fromSi(si / start);
        } else if (requirement instanceof Requirement.OfState) {
            value = limits.unit().fromSi(si);
        } else {
            value = recipe.lot().express(si, limits.unit());
        }
        return limited(target, name, gradeName(recipe, grade), limits, value, met);
    }

    private static TargetState ofMass(Recipe recipe, Target.OfMass target, String name, double kg, boolean met) {
        Quantity either = target.atMost() != null ? target.atMost() : Objects.requireNonNull(target.atLeast());
        Unit unit = either.unit();
        double loaded = recipe.lot().massKg().orElseThrow();
        return new TargetState(
                target,
                name,
                Optional.empty(),
                side(target.atMost(), unit),
                side(target.atLeast(), unit),
                unit.fromSi(target.ofStart() ? kg / loaded : kg),
                target.ofStart() ? unit.symbol() + " of start" : unit.symbol(),
                met);
    }

    private static TargetState limited(
            Target target, String name, @Nullable String grade, Limits limits, double value, boolean met) {
        String unit = limits.unit().symbol();
        return new TargetState(
                target,
                name,
                Optional.ofNullable(grade),
                side(limits.atMost(), limits.unit()),
                side(limits.atLeast(), limits.unit()),
                value,
                limits.basis() == Basis.OF_START ? unit + " of start" : unit,
                met);
    }

    /** In the unit of the target, which is that of its upper limit when there are two. */
    private static OptionalDouble side(@Nullable Quantity limit, Unit unit) {
        if (limit == null) {
            return OptionalDouble.empty();
        }
        boolean same = limit.unit().equals(unit);
        return OptionalDouble.of(same ? limit.value().doubleValue() : unit.fromSi(limit.si()));
    }

    /** {@code salt mean, thick}; {@code salt core after rest, thick}; {@code salt in first water}; {@code total time}. */
    static String name(Recipe recipe, Requirement requirement) {
        return name(
                recipe,
                requirement,
                recipe.confidence(recipe.targets().get(requirement.target()))
                        .map(confidence -> " with " + confidence + " confidence")
                        .orElse(""));
    }

    /** The same; how surely it is to be met is said with its words. */
    static String name(Recipe recipe, Requirement requirement, String sure) {
        if (requirement instanceof Requirement.OfTotal total) {
            return "total " + total.goal().name().toLowerCase(java.util.Locale.ROOT);
        }
        Target target = recipe.targets().get(requirement.target());
        if (target instanceof Target.OfLiquor liquor) {
            return liquor.species().name() + " in " + liquor.step().name() + sure;
        }
        if (target instanceof Target.OfMass mass) {
            return "mass of the lot"
                    + (mass.after() == null ? "" : " after " + mass.after().name()) + sure;
        }
        Target.OfPieces pieces = (Target.OfPieces) target;
        String after = pieces.after() == null ? "" : " after " + pieces.after().name();
        Quantity share = pieces.share();
        String of = share == null ? "" : " in " + share;
        return pieces.species().name() + " " + pieces.reading().word() + counted(pieces.counted()) + of + after + sure
                + ", "
                + gradeName(recipe, requirement.grade());
    }

    /** Nothing for what is counted as loaded. */
    private static String counted(Counted counted) {
        if (counted instanceof Counted.InPhase in) {
            return in.phase() == Phase.WATER ? " in the water phase" : " per moisture";
        }
        Per per = ((Counted.OfPiece) counted).per();
        return per == Per.LOADED ? "" : " per " + per.word() + " mass";
    }

    private static String gradeName(Recipe recipe, int grade) {
        return grade < 0 ? "lot" : recipe.lot().grades().get(grade).name();
    }

    /** The goal of a total, for those who show it. */
    public Optional<Goal> total() {
        return target instanceof Target.OfTotal ofTotal ? Optional.of(ofTotal.total()) : Optional.empty();
    }
}
