package org.soakwright.solver.finitevolume;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.soakwright.solver.finitevolume.Recipes.FilmClass;
import org.soakwright.solver.finitevolume.Step.Kind;

/** Seeded batches that together put every shape of several axes into all surroundings, with and without film, before and after rests. */
final class Batches {
    /** Shapes of several axes. */
    enum Shape {
        SHORT_CYLINDER(50310),
        BAR(50311),
        BRICK(50312);

        private final long seed;

        Shape(long seed) {
            this.seed = seed;
        }

        static Shape of(Solid solid) {
            return solid.edges().get(0).power() == 1
                    ? SHORT_CYLINDER
                    : solid.edges().size() == 2 ? BAR : BRICK;
        }
    }

    private static final double REFERENCE_LENGTH = 4e-3;
    private static final double REFERENCE_DIFFUSIVITY = 8e-10;
    private static final int WETTED_PHASES = 4;
    private static final int COUNT = 24;

    private final Random random;
    private final List<List<Object>> cards = new ArrayList<>();

    private Batches(long seed) {
        random = new Random(seed);
    }

    /** All of them. */
    static List<Batch> all() {
        List<Batch> batches = new ArrayList<>();
        for (Shape shape : Shape.values()) {
            // One deck of surroundings and films for each shape, so that each meets all.
            Batches dealer = new Batches(shape.seed);
            for (int r = 0; r < COUNT / 3; r++) {
                List<Solid> lot = dealer.lot(shape, r);
                List<Phase> phases = new ArrayList<>();
                for (int k = 0; k < WETTED_PHASES; k++) {
                    Step wetted = dealer.step(lot);
                    phases.add(new Phase(wetted, dealer.grain()));
                    if (dealer.random.nextInt(3) > 0) {
                        Step rest = Step.rest(dealer.seconds(), dealer.diffusivity(), wetted.partition());
                        phases.add(new Phase(rest, dealer.grain()));
                    }
                }
                batches.add(new Batch(lot, 100 * dealer.random.nextDouble(), phases));
            }
        }
        return batches;
    }

    /** Those of several solids again, each with a film of its own and every other with a skin. */
    static List<Batch> dressed() {
        Random random = new Random(50313);
        List<Batch> dressed = new ArrayList<>();
        for (Batch batch : all()) {
            if (batch.lot().size() > 1) {
                List<Solid> lot = new ArrayList<>();
                for (Solid solid : batch.lot()) {
                    lot.add(solid.in(Recipes.coat(random, lot.size() % 2 == dressed.size() % 2)));
                }
                dressed.add(new Batch(lot, batch.start(), batch.phases()));
            }
        }
        return dressed;
    }

    /**
     * Again with a flat edge from face to face, the faces not alike: skins, other films, sealed backs. All but most bricks, which take
     * long, and bars a second time as slabs.
     */
    static List<Batch> twoFaced() {
        Random random = new Random(50315);
        List<Batch> batches = new ArrayList<>();
        for (Batch batch : all()) {
            if (!bricks(batch) || batches.size() % 4 == 0) {
                batches.add(twoFaced(batch, random));
            }
            if (Shape.of(batch.lot().get(0)) == Shape.BAR) {
                List<Solid> slabs = batch.lot().stream()
                        .map(solid -> Solid.of(
                                        solid.edges().get(0).power(),
                                        solid.edges().get(0).length(),
                                        solid.volume())
                                .eased(solid.ease()))
                        .toList();
                batches.add(twoFaced(new Batch(slabs, batch.start(), batch.phases()), random));
            }
        }
        return batches;
    }

    private static Batch twoFaced(Batch batch, Random random) {
        List<Solid> lot = new ArrayList<>();
        for (Solid solid : batch.lot()) {
            Coat back = random.nextInt(4) == 0 ? new Coat(1, 0) : Recipes.coat(random, random.nextInt(3) > 0);
            Coat front = random.nextInt(4) == 0 ? Recipes.coat(random, true) : Coat.NONE;
            lot.add(solid.twoFaced(front, back));
        }
        return new Batch(lot, batch.start(), batch.phases());
    }

    static boolean bricks(Batch batch) {
        return batch.lot().stream().anyMatch(s -> s.edges().size() == 3);
    }

    /** Of the elements that leave a few 1e-9 of what drives the batch. */
    static int degree(Batch batch) {
        return bricks(batch) ? 10 : 12;
    }

    /** One grade alone; then with a second of another size; then with slab, cylinder and sphere. */
    private List<Solid> lot(Shape shape, int turn) {
        List<Solid> lot = new ArrayList<>();
        lot.add(solid(shape));
        if (turn % 3 == 1) {
            lot.add(solid(shape));
        } else if (turn % 3 == 2) {
            for (int power = 0; power <= 2; power++) {
                lot.add(Solid.of(power, length(), volume()).eased(log(0.7, 1.4)));
            }
            Collections.shuffle(lot, random);
        }
        return lot;
    }

    private Solid solid(Shape shape) {
        double a = length();
        double b = length();
        Solid solid = switch (shape) {
            case SHORT_CYLINDER -> Solid.shortCylinder(a, b, volume());
            case BAR -> Solid.bar(a, b, volume());
            case BRICK -> Solid.brick(a, b, length(), volume());
        };
        return random.nextBoolean() ? solid : solid.eased(log(0.7, 1.4));
    }

    private Step step(List<Solid> lot) {
        if (cards.isEmpty()) {
            for (Kind kind : Kind.values()) {
                if (kind != Kind.REST) {
                    cards.add(List.of(kind, FilmClass.NONE));
                    cards.add(List.of(kind, FilmClass.MODERATE));
                }
            }
            Collections.shuffle(cards, random);
        }
        List<Object> card = cards.remove(cards.size() - 1);
        Kind kind = (Kind) card.get(0);
        double diffusivity = diffusivity();
        double partition = kind == Kind.AIR ? 1 : log(0.3, 3);
        double film = card.get(1) == FilmClass.NONE
                ? Double.POSITIVE_INFINITY
                : partition * diffusivity / REFERENCE_LENGTH * log(0.2, 20);
        double seconds = seconds();
        double content = 80 * random.nextDouble();
        double volume = 0;
        double flow = 0;
        double feed = 0;
        if (kind.limited()) {
            volume = partition * lot.stream().mapToDouble(Solid::volume).sum() * log(0.1, 10);
            if (kind == Kind.FLOWING) {
                flow = volume / seconds * log(0.1, 10);
                feed = 30 * random.nextDouble();
            }
        }
        boolean clings = kind == Kind.UNLIMITED || kind.limited();
        double clinging = clings && random.nextInt(4) > 0 ? 1e-4 * log(0.3, 3) : 0;
        return new Step(kind, seconds, diffusivity, partition, film, volume, content, flow, feed, clinging);
    }

    /** Every other time the same in all directions. */
    private List<Double> grain() {
        return random.nextBoolean() ? List.of() : List.of(1.0, log(0.5, 2), log(0.5, 2));
    }

    private double length() {
        return REFERENCE_LENGTH * log(0.6, 1.8);
    }

    private double volume() {
        return 1e-3 * log(0.3, 3);
    }

    private double diffusivity() {
        return REFERENCE_DIFFUSIVITY * log(0.5, 2);
    }

    /** So long that Fo is between 0.01 and 0.4 for a body of the reference length. */
    private double seconds() {
        return REFERENCE_LENGTH * REFERENCE_LENGTH / REFERENCE_DIFFUSIVITY * log(0.01, 0.4);
    }

    private double log(double low, double high) {
        return low * Math.pow(high / low, random.nextDouble());
    }
}
