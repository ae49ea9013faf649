package org.soakwright.solver.chain;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Bath;
import org.soakwright.solver.stage.Conditions;
import org.soakwright.solver.stage.Modes;

/**
 * A lot of one species carried through a list of stages, each starting from the profile that the last one left. Set-up
 * finds the modes of each distinct stage once; following a choice of durations is then a few small matrix products.
 *
 * <p>Contents are kg/m3, durations seconds. Not safe for use by several threads at once: modes are found as they are needed.
 */
public final class Chain {
    /** A mode is left out once it has decayed to exp(-40), about 4e-18, of what the slowest keeps. */
    static final double DECAYED = 40;

    /** The most modes kept for one stage. */
    public static final int MOST_MODES = 1000;

    private final List<Grade> lot;
    private final List<Link> links;
    private final Extrema[][] extrema;
    private final Samples[][] samples;

    private Chain(List<Grade> lot, List<Link> links) {
        this.lot = lot;
        this.links = links;
        extrema = new Extrema[links.size()][lot.size()];
        samples = new Samples[links.size()][lot.size()];
    }

    /**
     * Prepares a chain.
     *
     * @param lot grades that share every liquor; at least one
     * @param start the profile of every piece as loaded
     * @param stages at least one
     */
    public static Chain of(List<Grade> lot, Start start, List<Stage> stages) {
        if (lot.isEmpty() || stages.isEmpty()) {
            throw new IllegalArgumentException("a chain needs at least one grade and one stage");
        }
        List<Grade> grades = List.copyOf(lot);
        Map<Conditions, Modes> spectra = new HashMap<>();
        Map<List<Conditions>, Carry> carries = new HashMap<>();
        List<Link> links = new ArrayList<>();
        double clinging = 0;
        for (Stage stage : stages) {
            double mixed = mixed(stage, clinging);
            Modes modes = spectra.computeIfAbsent(conditions(stage, clinging), key -> new Modes(grades, key));
            if (links.isEmpty()) {
                links.add(new Link(stage, modes, mixed, 1, new Link.Entry.Loaded(new Loading(grades, start, modes))));
            } else {
                Link before = links.get(links.size() - 1);
                Carry carry = carries.computeIfAbsent(
                        List.of(before.modes.conditions(), modes.conditions()), key -> new Carry(before.modes, modes));
                double ratio = before.stage.partition() / stage.partition();
                links.add(new Link(stage, modes, mixed, ratio, new Link.Entry.Carried(carry, before.offset)));
            }
            clinging = stage.wets() ? stage.clinging() : clinging;
        }
        return new Chain(grades, List.copyOf(links));
    }

    private static Conditions conditions(Stage stage, double clinging) {
        Bath bath = new Bath.Unlimited();
        if (stage.surroundings() instanceof Surroundings.Vessel vessel) {
            double volume = vessel.flow() > 0 ? vessel.volume() : vessel.volume() + clinging;
            bath = new Bath.Vessel(volume, vessel.flow());
        }
        return new Conditions(stage.diffusivity(), stage.partition(), stage.surface(), bath, stage.grain());
    }

    private static double mixed(Stage stage, double clinging) {
        return stage.surroundings() instanceof Surroundings.Vessel vessel ? clinging / (vessel.volume() + clinging) : 0;
    }

    public List<Grade> lot() {
        return lot;
    }

    /** Number of stages. */
    public int size() {
        return links.size();
    }

    /** Waves at positions, kept from one look along a profile to the next. */
    Samples samples(int stage, int grade, double[] positions) {
        Samples known = samples[stage][grade];
        if (known == null || !known.isAt(positions)) {
            known = new Samples(link(stage).modes, grade, positions);
            samples[stage][grade] = known;
        }
        return known;
    }

    /** A stage, from 0. */
    public Stage stage(int index) {
        return links.get(index).stage;
    }

    Link link(int stage) {
        return links.get(stage);
    }

    Extrema extrema(int stage, int grade) {
        Extrema known = extrema[stage][grade];
        if (known == null) {
            known = new Extrema(link(stage).modes, grade, lot.get(grade).axis());
            extrema[stage][grade] = known;
        }
        return known;
    }

    /**
     * Follows the lot.
     *
     * @param seconds durations of the first stages, each above 0; fewer than there are stages look inside the chain, and
     *     a shorter last one inside a stage
     * @throws StageTooShort when a stage would need more than {@link #MOST_MODES} modes
     */
    public Course follow(double... seconds) {
        return new Course(this, seconds.clone());
    }
}
