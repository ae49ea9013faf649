package org.soakwright.planner.batch;

import java.util.List;
import org.soakwright.recipes.model.Phase;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Place;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Part;
import org.soakwright.solver.chain.Probe;

/**
 * Where the water is a species of its own: the highest or lowest of a phase anywhere in pieces of one side. Neither solute nor water need
 * be extreme there, so the way through the piece is looked at in {@link #LOOKS} places and the best refined by golden section to
 * {@link #NEAR}; the place held, the derivative is that of the two contents there.
 */
final class Extreme {
    private static final int LOOKS = 129;
    private static final double NEAR = 1e-7;
    private static final double GOLDEN = (Math.sqrt(5) - 1) / 2;

    private final State state;
    private final Weighing weighing;
    private final int species;
    private final int water;
    private final int index;
    private final Phase phase;
    private final Place place;
    /** Whether the places of both count alike: from the core, or from face to face. */
    private final boolean alike;

    private final boolean waterThrough;

    /**
     * Of one class of pieces.
     *
     * @param grade of the class
     * @param index of the class in the lot, for the water the same
     * @param place of the target
     */
    Extreme(State state, Weighing weighing, int species, int grade, int index, Phase phase, Place place) {
        this.state = state;
        this.weighing = weighing;
        this.species = species;
        this.index = index;
        this.phase = phase;
        this.place = place;
        water = weighing.waterSpecies().orElseThrow();
        alike = isThrough(state, species, grade) == isThrough(state, water, grade);
        waterThrough = isThrough(state, water, grade);
    }

    private static boolean isThrough(State state, int species, int grade) {
        Recipe recipe = state.batch().recipe();
        return Films.twoFaced(
                recipe.species().get(species), recipe.lot().grades().get(grade));
    }

    /** Where one has a face behind a skin and the other has none, places run from face to face: halfway is the other's core. */
    private double own(int of, double position) {
        boolean through = of == water ? waterThrough : !waterThrough;
        return alike || through ? position : Math.abs(2 * position - 1);
    }

    /** What is read at the extreme. */
    Dual read(boolean highest) {
        double[] positions = new double[LOOKS];
        for (int i = 0; i < LOOKS; i++) {
            positions[i] = (double) i / (LOOKS - 1);
        }
        double[] solute = profile(species, positions);
        double[] moist = profile(water, positions);
        int best = 0;
        double sign = highest ? 1 : -1;
        for (int i = 1; i < LOOKS; i++) {
            if (sign * ratio(solute[i], moist[i]) > sign * ratio(solute[best], moist[best])) {
                best = i;
            }
        }
        double low = positions[Math.max(0, best - 1)];
        double high = positions[Math.min(LOOKS - 1, best + 1)];
        double there = refined(low, high, sign);
        if (sign * at(there) < sign * ratio(solute[best], moist[best])) {
            there = positions[best];
        }
        return Measure.InPhase.of(content(species, there), content(water, there), phase, place);
    }

    private double refined(double from, double to, double sign) {
        double low = from;
        double high = to;
        while (high - low > NEAR) {
            double left = high - GOLDEN * (high - low);
            double right = low + GOLDEN * (high - low);
            if (sign * at(left) > sign * at(right)) {
                high = right;
            } else {
                low = left;
            }
        }
        // An extreme at an end of the piece is there, not a hair beside it.
        return low == 0 ? 0 : high == 1 ? 1 : (low + high) / 2;
    }

    private double at(double position) {
        return ratio(profile(species, position)[0], profile(water, position)[0]);
    }

    private double ratio(double solute, double moist) {
        return solute / (phase == Phase.WATER ? solute + moist : moist);
    }

    private double[] profile(int of, double... positions) {
        double[] own = new double[positions.length];
        for (int i = 0; i < own.length; i++) {
            own[i] = own(of, positions[i]);
        }
        return state.courses().get(of).profile(index, state.stage(), own);
    }

    private Dual content(int of, double position) {
        Course course = state.courses().get(of);
        Probe probe = new Probe.At(index, own(of, position));
        double value = course.value(probe, state.stage());
        Dual read = state.sloping()
                ? new Dual(
                        value,
                        state.batch()
                                .byStep(
                                        of,
                                        course.gradient(List.of(new Part(1, probe)), state.stage()),
                                        state.seconds()))
                : state.number(value);
        return weighing.perLoaded(read);
    }
}
