package org.soakwright.solver.identities;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Grain;
import org.soakwright.solver.shape.Side;
import org.soakwright.solver.stage.Surface;

/** Seeded ingredients over the whole range that the solver promises. */
final class Draw {
    /** What a stage can be. */
    enum Kind {
        CLOSED,
        FLOWING,
        PLENTY,
        AIR,
        REST
    }

    /** Largest content drawn, kg/m3. */
    static final double MOST = 100;

    private static final double SHARE_WITHOUT_FILM = 0.1;

    private static final List<Kind> KINDS = List.of(Kind.values());
    private static final List<Axis> AXES = List.of(Axis.values());

    private final SplittableRandom random;

    Draw(long seed) {
        random = new SplittableRandom(seed);
    }

    double log(double low, double high) {
        return low * Math.pow(high / low, random.nextDouble());
    }

    double between(double low, double high) {
        return low + (high - low) * random.nextDouble();
    }

    int below(int bound) {
        return random.nextInt(bound);
    }

    Kind kind() {
        return KINDS.get(below(KINDS.size()));
    }

    Axis axis() {
        return AXES.get(below(AXES.size()));
    }

    /** One to so many grades of any shape, sizes within a factor of three about one of a few millimetres. */
    List<Grade> lot(int most) {
        double length = log(1e-3, 1e-2);
        int grades = 1 + below(most);
        List<Grade> lot = new ArrayList<>();
        for (int j = 0; j < grades; j++) {
            lot.add(new Grade(axis(), j == 0 ? length : length * log(0.3, 3), 1e-3 * log(0.1, 10)));
        }
        return lot;
    }

    /** Pieces of two or three sides: a short cylinder, a bar or a brick, sizes within a factor of two about one length. */
    Grade solid(double length) {
        List<Side> sides = new ArrayList<>();
        Axis first = below(3) == 0 ? Axis.CYLINDER : Axis.SLAB;
        int count = first == Axis.CYLINDER || below(2) == 0 ? 2 : 3;
        for (int i = 0; i < count; i++) {
            sides.add(new Side(i == 0 ? first : Axis.SLAB, length * log(0.5, 2), i));
        }
        return new Grade(sides, 1e-3 * log(0.1, 10), below(2) == 0 ? 1 : log(0.5, 2));
    }

    /** So many grades of which the first has several sides, and about half of the others. */
    List<Grade> solids(int count) {
        double length = log(1e-3, 1e-2);
        List<Grade> lot = new ArrayList<>(List.of(solid(length)));
        while (lot.size() < count) {
            lot.add(
                    below(2) == 0
                            ? solid(length * log(0.5, 2))
                            : new Grade(axis(), length * log(0.3, 3), 1e-3 * log(0.1, 10)));
        }
        return lot;
    }

    /** Every other time with a diffusivity that differs by direction. */
    Timed grained(Timed timed) {
        Stage stage = timed.stage();
        Grain grain = below(2) == 0 ? Grain.NONE : new Grain(List.of(1.0, log(0.4, 2.5), log(0.4, 2.5)));
        return timed.with(new Stage(
                stage.diffusivity(),
                stage.partition(),
                stage.surfaces(),
                stage.surroundings(),
                stage.clinging(),
                grain));
    }

    /** Mostly uniform, now and then a polyline. */
    Start start() {
        if (below(12) > 0) {
            return new Start.Uniform(MOST * random.nextDouble());
        }
        double corner = between(0.1, 0.9);
        return new Start.Polyline(List.of(
                new Start.Point(0, MOST * random.nextDouble()),
                new Start.Point(corner, MOST * random.nextDouble()),
                new Start.Point(1, MOST * random.nextDouble())));
    }

    /** K times volume of the lot, m3. */
    static double capacity(List<Grade> lot, double partition) {
        return partition * lot.stream().mapToDouble(Grade::volume).sum();
    }

    /**
     * A stage and its duration: Bi 1e-6 to 1e6 or no film, Fo 1e-4 to 10, liquor 1e-3 to 1e6 times the capacity of the lot, flow
     * 1e-2 to 1e2 volumes, partition 0.1 to 10; contents up to {@link #MOST} times the given share.
     */
    Timed stage(List<Grade> lot, Kind kind, double contents) {
        return stage(lot, kind, contents, log(0.1, 10));
    }

    Timed stage(List<Grade> lot, Kind kind, double contents, double partition) {
        double length = lot.get(0).length();
        double diffusivity = log(1e-11, 1e-8);
        double seconds = length * length / diffusivity * log(1e-4, 10);
        double film = log(1e-6, 1e6) * partition * diffusivity / length;
        Surface surface = random.nextDouble() < SHARE_WITHOUT_FILM ? new Surface.Open() : new Surface.Film(film);
        double content = contents * MOST * random.nextDouble();
        double feed = contents * MOST * random.nextDouble();
        double volume = capacity(lot, partition) * log(1e-3, 1e6);
        double flow = volume / seconds * log(1e-2, 1e2);
        Surroundings around = switch (kind) {
            case CLOSED -> new Surroundings.Vessel(volume, content, 0, 0);
            case FLOWING -> new Surroundings.Vessel(volume, content, flow, feed);
            case PLENTY -> new Surroundings.Plenty(content);
            case AIR -> new Surroundings.Air(content);
            case REST -> new Surroundings.Rest();
        };
        Surface met = kind == Kind.REST ? new Surface.Sealed() : surface;
        return new Timed(new Stage(diffusivity, partition, met, around, 0), seconds);
    }

    /** With liquor clinging at the end, up to a fifth of a vessel's. */
    Timed clinging(Timed timed) {
        Stage stage = timed.stage();
        if (!(stage.surroundings() instanceof Surroundings.Vessel vessel)) {
            return timed;
        }
        double clinging = 0.2 * vessel.volume() * random.nextDouble();
        return timed.with(new Stage(
                stage.diffusivity(),
                stage.partition(),
                stage.surfaces(),
                stage.surroundings(),
                clinging,
                stage.grain()));
    }
}
