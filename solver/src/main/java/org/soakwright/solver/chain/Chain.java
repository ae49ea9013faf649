package org.soakwright.solver.chain;

import java.util.Collections;
import java.util.List;
import java.util.Set;
import org.soakwright.solver.shape.Grade;

/**
 * A lot of one species carried through a list of stages, each starting from the profile that the last one left. Contents are kg/m3,
 * durations seconds. Not safe for use by several threads at once: what is needed is found when it is first asked for.
 */
public abstract sealed class Chain permits WaveChain, LaunchChain, RitzChain {
    /** A mode is left out once it has decayed to exp(-40), about 4e-18, of what the slowest keeps. */
    static final double DECAYED = 40;

    /** The most modes kept for one stage where all pieces have one axis. */
    public static final int MOST_MODES = 1000;

    /** More grades than this are followed in polynomials: the coupled waves of so many take room and time by their square. */
    static final int MANY = 12;

    /**
     * Prepares a chain.
     *
     * @param lot grades that share every liquor; at least one
     * @param start the profile of every piece as loaded; uniform where a grade has several sides
     * @param stages at least one
     */
    public static Chain of(List<Grade> lot, Start start, List<Stage> stages) {
        return of(lot, Collections.nCopies(lot.size(), start), stages, Set.of());
    }

    /**
     * Prepares a chain of grades that start differently.
     *
     * @param starts by grade
     * @param passing stages at whose end nothing is read, such as short transfers; where that is dear they are not resolved for
     *     their own sake
     */
    public static Chain of(List<Grade> lot, List<Start> starts, List<Stage> stages, Set<Integer> passing) {
        if (lot.isEmpty() || stages.isEmpty()) {
            throw new IllegalArgumentException("a chain needs at least one grade and one stage");
        }
        if (starts.size() != lot.size()) {
            throw new IllegalArgumentException(lot.size() + " starts wanted, found " + starts.size());
        }
        for (int j = 0; j < lot.size(); j++) {
            if (!lot.get(j).oneAxis() && !(starts.get(j) instanceof Start.Uniform)) {
                throw new IllegalArgumentException("pieces of several sides start uniform, found " + starts.get(j));
            }
        }
        List<Grade> grades = List.copyOf(lot);
        stages.forEach(stage -> stage.surfaces().require(grades));
        boolean twoFaced = grades.stream().anyMatch(Grade::twoFaced);
        if (grades.stream().allMatch(Grade::oneAxis) && grades.size() <= MANY && !twoFaced) {
            return WaveChain.of(grades, List.copyOf(starts), List.copyOf(stages), new WaveChain.Shelf());
        }
        boolean shared = stages.stream().anyMatch(stage -> stage.surroundings() instanceof Surroundings.Vessel);
        return shared || twoFaced
                ? new RitzChain(grades, List.copyOf(starts), List.copyOf(stages), Set.copyOf(passing))
                : new LaunchChain(grades, List.copyOf(starts), List.copyOf(stages));
    }

    public abstract List<Grade> lot();

    /** Number of stages. */
    public abstract int size();

    /** A stage, from 0. */
    public abstract Stage stage(int index);

    /**
     * Follows the lot.
     *
     * @param seconds durations of the first stages, each above 0; fewer than there are stages look inside the chain, and
     *     a shorter last one inside a stage
     * @throws StageTooShort when a stage would need more than {@link #MOST_MODES} modes
     */
    public abstract Course follow(double... seconds);

    /**
     * Refuses durations at whose ends readings could not be told to about 1e-5 of the driving difference; {@link #follow} follows them, and its
     * readings state their error.
     *
     * @throws StageTooShort naming the stage that is too short
     */
    public void require(double... seconds) {}

    /** The same for looking, not for deciding: where being exact is dear, quicker and good to about 1e-4 of the driving difference. */
    public Chain sketch() {
        return this;
    }

    static void requireDurations(double[] seconds, int stages) {
        if (seconds.length == 0 || seconds.length > stages) {
            throw new IllegalArgumentException(
                    "durations must be given for 1 to " + stages + " stages, found " + seconds.length);
        }
        for (int k = 0; k < seconds.length; k++) {
            if (!(seconds[k] > 0) || Double.isInfinite(seconds[k])) {
                throw new IllegalArgumentException(
                        "duration of stage " + k + " must be above 0, found " + seconds[k] + " s");
            }
        }
    }
}
