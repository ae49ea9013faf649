package org.soakwright.solver.chain;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Conditions;
import org.soakwright.solver.stage.Modes;

/**
 * Pieces of one axis in standing waves: the exact modes of pieces and liquor together. Set-up finds the modes of each distinct stage
 * once; following a choice of durations is then a few small matrix products.
 */
final class WaveChain extends Chain {
    /** A mode is left out once it has decayed to exp(-40), about 4e-18, of what the slowest keeps. */
    static final double DECAYED = 40;

    private final List<Grade> lot;
    private final List<Link> links;
    private final Extrema[][] extrema;
    private final Samples[][] samples;

    private WaveChain(List<Grade> lot, List<Link> links) {
        this.lot = lot;
        this.links = links;
        extrema = new Extrema[links.size()][lot.size()];
        samples = new Samples[links.size()][lot.size()];
    }

    /** Modes and what becomes of them between two stages, shared where conditions are the same. */
    record Shelf(Map<Conditions, Modes> spectra, Map<List<Conditions>, Carry> carries) {
        Shelf() {
            this(new HashMap<>(), new HashMap<>());
        }
    }

    static WaveChain of(List<Grade> grades, List<Start> starts, List<Stage> stages, Shelf shelf) {
        List<Link> links = new ArrayList<>();
        double clinging = 0;
        for (Stage stage : stages) {
            double mixed = stage.mixed(clinging);
            Modes modes = shelf.spectra.computeIfAbsent(stage.conditions(clinging), key -> new Modes(grades, key));
            if (links.isEmpty()) {
                links.add(new Link(stage, modes, mixed, 1, new Link.Entry.Loaded(new Loading(grades, starts, modes))));
            } else {
                Link before = links.get(links.size() - 1);
                Carry carry = shelf.carries.computeIfAbsent(
                        List.of(before.modes.conditions(), modes.conditions()), key -> new Carry(before.modes, modes));
                double ratio = before.stage.partition() / stage.partition();
                links.add(new Link(stage, modes, mixed, ratio, new Link.Entry.Carried(carry, before.offset)));
            }
            clinging = stage.wets() ? stage.clinging() : clinging;
        }
        return new WaveChain(grades, List.copyOf(links));
    }

    @Override
    public List<Grade> lot() {
        return lot;
    }

    @Override
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

    @Override
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

    @Override
    public WaveCourse follow(double... seconds) {
        return new WaveCourse(this, seconds.clone());
    }
}
