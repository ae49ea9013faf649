package org.soakwright.planner.conditions;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Basis;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unit;
import org.soakwright.recipes.text.Unsound;
import org.soakwright.solver.transport.Solution;

/** Strengths of liquors in whatever basis they are written, as mass per volume. */
public final class Strengths {
    /** What the solubility and the density behind a strength may be off by, 1: beyond saturation by less is not said to be. */
    private static final double ROUNDING = 0.005;

    private static final Unit GRAMS_PER_LITRE = Kind.PER_VOLUME.unit("g/L").orElseThrow();

    private Strengths() {}

    /**
     * Every wet step of the recipe with its liquor's contents in mass per volume.
     *
     * @param conversions what was worked out is added to it
     * @param problems what cannot be is added to it
     */
    static List<Step> resolved(Recipe recipe, List<Conversion> conversions, List<Problem> problems) {
        List<Step> steps = new ArrayList<>();
        for (Step step : recipe.steps()) {
            steps.add(step instanceof Step.Wet wet ? resolved(recipe, wet, conversions, problems) : step);
        }
        return steps;
    }

    private static Step resolved(Recipe recipe, Step.Wet step, List<Conversion> conversions, List<Problem> problems) {
        Map<String, Content> contents = new LinkedHashMap<>(step.liquor().contents());
        boolean changed = false;
        for (Map.Entry<String, Content> entry : contents.entrySet()) {
            Content written = entry.getValue();
            Species species = recipe.species(entry.getKey()).orElseThrow();
            try {
                if (!step.liquor().tells(written)) {
                    double si = kgPerM3(step, species, written.amount());
                    Quantity derived = Quantity.derived(si, GRAMS_PER_LITRE, written.place());
                    entry.setValue(new Content(derived.with(written.amount().giveOrTake())));
                    conversions.add(new Conversion(
                            species.name() + " in " + step.name(),
                            written.toString(),
                            derived.toString(),
                            how(step, species, written.amount())));
                    changed = true;
                }
                dissolved(step, species, entry.getValue(), written);
            } catch (Unsound unsound) {
                problems.addAll(unsound.problems());
            }
        }
        return changed ? step.with(step.liquor().with(contents)) : step;
    }

    /**
     * A strength of a step's liquor, kg/m3.
     *
     * @param strength with a unit of any basis of a liquor
     * @throws Unsound where the recipe does not say what it takes
     */
    public static double kgPerM3(Step.Wet step, Species species, Quantity strength) {
        Basis basis = Basis.of(strength.unit());
        if (basis == Basis.PER_VOLUME || strength.si() == 0) {
            return strength.si();
        }
        if (basis == Basis.PER_AMOUNT) {
            return strength.si() * molarMass(species, strength);
        }
        Quantity density = step.liquor().density();
        if (basis == Basis.PER_MASS && density != null) {
            return strength.si() * density.si();
        }
        Solution solution = solution(step, species, strength);
        double kelvin = temperature(step, strength).si();
        double saturation = Sources.at(temperature(step, strength), () -> solution.saturation(kelvin))
                .value();
        double fraction = basis == Basis.OF_SATURATION ? strength.si() * saturation : strength.si();
        if (fraction > saturation * (1 + ROUNDING)) {
            throw above(step, species, strength, solution, kelvin);
        }
        return Sources.at(temperature(step, strength), () -> solution.content(fraction, kelvin))
                .value();
    }

    /** A content of a step's liquor in the unit of a strength: the other way round. */
    public static double express(Step.Wet step, Species species, double kgPerM3, Quantity like) {
        Unit unit = like.unit();
        Basis basis = Basis.of(unit);
        if (basis == Basis.PER_VOLUME) {
            return unit.fromSi(kgPerM3);
        }
        if (basis == Basis.PER_AMOUNT) {
            return unit.fromSi(kgPerM3 / molarMass(species, like));
        }
        Quantity density = step.liquor().density();
        if (basis == Basis.PER_MASS && density != null) {
            return unit.fromSi(kgPerM3 / density.si());
        }
        Solution solution = solution(step, species, like);
        double kelvin = temperature(step, like).si();
        double fraction = Sources.at(temperature(step, like), () -> solution.fraction(Math.max(0, kgPerM3), kelvin))
                .value();
        return unit.fromSi(
                basis == Basis.OF_SATURATION
                        ? fraction / solution.saturation(kelvin).value()
                        : fraction);
    }

    /** No liquor holds more than stays dissolved in it, where that is known. */
    private static void dissolved(Step.Wet step, Species species, Content content, Content written) {
        Solution solution = Solutes.solution(species).orElse(null);
        Quantity temperature = step.temperature();
        if (solution == null || temperature == null || content.si() == 0) {
            return;
        }
        double kelvin = temperature.si();
        double most = Sources.at(temperature, () -> solution.saturationContent(kelvin))
                .value();
        if (step.liquor().kgPerM3(content) > most * (1 + ROUNDING)) {
            throw above(step, species, written.amount(), solution, kelvin);
        }
    }

    private static Unsound above(Step.Wet step, Species species, Quantity found, Solution solution, double kelvin) {
        return new Unsound(
                found.place(),
                "the liquor of " + step.name() + " cannot hold so much " + species.name() + ": found \"" + found
                        + "\", where saturation at " + step.temperature() + " is "
                        + shown(100 * solution.saturation(kelvin).value()) + " % by mass or "
                        + shown(solution.saturationContent(kelvin).value()) + " g/L; write less");
    }

    private static String how(Step.Wet step, Species species, Quantity strength) {
        Basis basis = Basis.of(strength.unit());
        if (basis == Basis.PER_AMOUNT) {
            return "times " + shown(1000 * molarMass(species, strength)) + " g/mol";
        }
        Solution solution = solution(step, species, strength);
        double kelvin = temperature(step, strength).si();
        double saturation = solution.saturation(kelvin).value();
        double fraction = basis == Basis.OF_SATURATION ? strength.si() * saturation : strength.si();
        String density =
                "density " + shown(solution.density(fraction, kelvin).value()) + " kg/m3 at " + step.temperature();
        return basis == Basis.OF_SATURATION
                ? shown(100 * fraction) + " % by mass, saturation being " + shown(100 * saturation) + " %; " + density
                : density + ", " + shown(100 * fraction / saturation) + " % of saturation";
    }

    private static double molarMass(Species species, Quantity strength) {
        OptionalDouble known = Solutes.molarMass(species);
        if (known.isEmpty()) {
            throw new Unsound(
                    strength.place(),
                    "an amount of " + species.name() + " needs its molar mass: found \"" + strength
                            + "\"; add molar-mass, such as 58.44 g/mol, or a substance to the species");
        }
        return known.getAsDouble();
    }

    private static Solution solution(Step.Wet step, Species species, Quantity strength) {
        Solution solution = Solutes.solution(species)
                .orElseThrow(() -> new Unsound(
                        strength.place(),
                        "the density of this liquor is not known: found \"" + strength
                                + "\"; add density to the liquor, such as 1080 kg/m3, or substance: sodium chloride to "
                                + species.name()));
        step.liquor().contents().entrySet().stream()
                .filter(other -> !other.getKey().equals(species.name())
                        && other.getValue().si() > 0)
                .findFirst()
                .ifPresent(other -> {
                    throw new Unsound(
                            strength.place(),
                            "the density of a liquor that holds " + other.getKey() + " beside " + species.name()
                                    + " is not known: found \"" + strength
                                    + "\"; add density to the liquor, such as 1080 kg/m3, and write % or g/L");
                });
        return solution;
    }

    private static Quantity temperature(Step.Wet step, Quantity strength) {
        @Nullable Quantity temperature = step.temperature();
        if (temperature == null) {
            throw new Unsound(
                    strength.place(),
                    "a strength in \"" + strength.unit() + "\" needs the step's temperature; add one such as 4 Cel");
        }
        return temperature;
    }

    private static String shown(double value) {
        return Quantity.derived(value, Unit.ONE, org.soakwright.recipes.text.Place.of(""))
                .written();
    }
}
