package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Film;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Spread;
import org.soakwright.recipes.model.Step;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.shape.Side;

/**
 * The pieces of a lot as one species tells them apart: grades, and within a grade classes of size, of diffusivity and of start content, all of
 * which share the liquor.
 */
final class Classes {
    private final List<Population> populations = new ArrayList<>();
    private final List<org.soakwright.solver.shape.Grade> lot = new ArrayList<>();
    private final List<Start> starts = new ArrayList<>();

    private Classes() {}

    static Classes of(Recipe recipe, Species species) {
        Classes classes = new Classes();
        for (Grade grade : recipe.lot().grades()) {
            classes.add(recipe, species, grade);
        }
        return classes;
    }

    List<org.soakwright.solver.shape.Grade> lot() {
        return lot;
    }

    /** By class. */
    List<Start> starts() {
        return starts;
    }

    /** By grade. */
    List<Population> populations() {
        return populations;
    }

    /** Leaves a grade's pieces only the side with the shortest way out. */
    void makeEndless(int grade) {
        Population population = populations.get(grade);
        for (int i = population.first(); i < population.first() + population.count(); i++) {
            org.soakwright.solver.shape.Grade whole = lot.get(i);
            Side side = whole.sides().get(whole.shortest());
            lot.set(i, new org.soakwright.solver.shape.Grade(List.of(side), whole.volume(), whole.ease()));
        }
    }

    private void add(Recipe recipe, Species species, Grade grade) {
        double size = sigma(grade.spread());
        double ease = sigma(species.diffusivityVaries());
        double start = sigma(species.startVaries());
        if (ease > 0 && !anyFilm(recipe, species)) {
            // Without a film only D/L^2 counts, so that pieces in which the solute is slow are as good as larger ones.
            size = Math.hypot(size, ease / 2);
            ease = 0;
        }
        List<Variation> variations = new ArrayList<>();
        int ofSize = put(variations, size, false);
        int ofEase = put(variations, ease, false);
        int ofStart = put(variations, start, true);
        Population population = new Population(lot.size(), grade.share(), variations);
        populations.add(population);
        List<Side> sides = Translation.sides(grade, species);
        double volume = recipe.lot().volumeM3() * grade.share();
        for (int i = 0; i < population.count(); i++) {
            double larger = factor(population, i, ofSize);
            List<Side> scaled = sides.stream().map(side -> side.scaled(larger)).toList();
            lot.add(new org.soakwright.solver.shape.Grade(
                    scaled, population.weight(i) * volume, factor(population, i, ofEase)));
            starts.add(Translation.start(recipe, species, grade, factor(population, i, ofStart)));
        }
    }

    private static double sigma(@Nullable Spread spread) {
        return spread == null ? 0 : spread.sigma();
    }

    private static int put(List<Variation> variations, double sigma, boolean ofStart) {
        if (sigma == 0) {
            return -1;
        }
        variations.add(ofStart ? Variation.ofStart(sigma) : Variation.ofSize(sigma));
        return variations.size() - 1;
    }

    private static double factor(Population population, int index, int variation) {
        return variation < 0 ? 1 : population.variations().get(variation).factor(population.node(index, variation));
    }

    private static boolean anyFilm(Recipe recipe, Species species) {
        return species.traits().skin() != null
                || !species.traits().skins().isEmpty()
                || recipe.steps().stream()
                        .anyMatch(step -> (step instanceof Step.Wet wet && !(wet.film() instanceof Film.Negligible))
                                || (step instanceof Step.Dry dry && !(dry.film() instanceof Film.Negligible)));
    }

    /** What the pieces hold on average of a start content that varies, over its median. */
    static double meanStart(Species species) {
        double sigma = sigma(species.startVaries());
        if (sigma == 0) {
            return 1;
        }
        Variation variation = Variation.ofStart(sigma);
        double sum = 0;
        for (int i = 0; i < variation.count(); i++) {
            sum += variation.weights()[i] * variation.factor(i);
        }
        return sum;
    }
}
