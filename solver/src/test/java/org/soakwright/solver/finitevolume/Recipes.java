package org.soakwright.solver.finitevolume;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.soakwright.solver.finitevolume.Step.Kind;

/** Seeded recipes that together meet every surrounding with every film, shape and rest. */
final class Recipes {
    /** How much of the resistance lies in the film. */
    enum FilmClass {
        NONE,
        MODERATE,
        DOMINANT;

        /** Of one body in one step, by its Biot number. */
        static FilmClass of(Body body, Step step) {
            double biot = step.film() * body.length() / (step.partition() * step.diffusivity());
            return biot > 100 ? NONE : biot > 0.05 ? MODERATE : DOMINANT;
        }
    }

    private static final double REFERENCE_LENGTH = 4e-3;
    private static final double REFERENCE_DIFFUSIVITY = 8e-10;
    private static final int WETTED_STEPS = 4;
    private static final int COUNT = 36;

    private final Random random;

    private Recipes(long seed) {
        random = new Random(seed);
    }

    /** All of them. */
    static List<Recipe> all() {
        List<List<Object>> conditions = new ArrayList<>();
        List<Recipe> recipes = new ArrayList<>();
        Recipes dealer = new Recipes(20260);
        for (int r = 0; r < COUNT; r++) {
            List<Step> steps = new ArrayList<>();
            List<Body> lot = dealer.lot(1 + r % 4, r);
            for (int k = 0; k < WETTED_STEPS; k++) {
                if (conditions.isEmpty()) {
                    conditions.addAll(dealer.deck());
                }
                List<Object> drawn = conditions.remove(conditions.size() - 1);
                steps.add(dealer.step((Kind) drawn.get(0), (FilmClass) drawn.get(1), lot));
                if (dealer.random.nextBoolean()) {
                    Step last = steps.get(steps.size() - 1);
                    steps.add(Step.rest(dealer.seconds(), dealer.diffusivity(), last.partition()));
                }
            }
            recipes.add(new Recipe(lot, dealer.start(r), steps));
        }
        return recipes;
    }

    /** Those of several bodies again, now each with a film of its own and every other with a skin: some open beside others that are not. */
    static List<Recipe> dressed() {
        Recipes dealer = new Recipes(20261);
        List<Recipe> dressed = new ArrayList<>();
        for (Recipe recipe : all()) {
            if (recipe.lot().size() > 1) {
                List<Body> lot = new ArrayList<>();
                for (Body body : recipe.lot()) {
                    lot.add(body.in(coat(dealer.random, lot.size() % 2 == dressed.size() % 2)));
                }
                dressed.add(new Recipe(lot, recipe.start(), recipe.steps()));
            }
        }
        return dressed;
    }

    static Coat coat(Random random, boolean skin) {
        double speed = 0.3 * Math.pow(10, random.nextDouble());
        double permeance = REFERENCE_DIFFUSIVITY / REFERENCE_LENGTH * 0.3 * Math.pow(100, random.nextDouble());
        return new Coat(speed, skin ? permeance : Double.POSITIVE_INFINITY);
    }

    /** Every kind of surroundings with every class of film, shuffled. */
    private List<List<Object>> deck() {
        List<List<Object>> cards = new ArrayList<>();
        for (Kind kind : Kind.values()) {
            for (FilmClass film : FilmClass.values()) {
                if (kind != Kind.REST) {
                    cards.add(List.of(kind, film));
                }
            }
        }
        Collections.shuffle(cards, random);
        return cards;
    }

    private List<Body> lot(int grades, int turn) {
        List<Body> lot = new ArrayList<>();
        for (int j = 0; j < grades; j++) {
            lot.add(new Body((turn / 4 + j) % 3, REFERENCE_LENGTH * log(0.5, 1.5), 1e-3 * log(0.3, 3)));
        }
        return lot;
    }

    private List<Corner> start(int turn) {
        double level = 100 * random.nextDouble();
        return switch (turn % 3) {
            case 0 -> List.of(new Corner(0, level), new Corner(8, level));
            case 1 -> List.of(new Corner(0, level), new Corner(3, 100 * random.nextDouble()), new Corner(8, 0));
            default ->
                List.of(
                        new Corner(0, 0),
                        new Corner(2, level),
                        new Corner(5, level),
                        new Corner(8, 60 * random.nextDouble()));
        };
    }

    private Step step(Kind kind, FilmClass filmClass, List<Body> lot) {
        double diffusivity = diffusivity();
        double partition = kind == Kind.AIR ? 1 : log(0.3, 3);
        double longest = lot.stream().mapToDouble(Body::length).max().orElseThrow();
        double unit = partition * diffusivity / longest;
        double film = switch (filmClass) {
            case NONE -> Double.POSITIVE_INFINITY;
            case MODERATE -> unit * log(0.5, 20);
            case DOMINANT -> unit * log(1e-4, 0.03);
        };
        double seconds = filmClass == FilmClass.DOMINANT ? 10 * seconds() : seconds();
        double content = 80 * random.nextDouble();
        double volume = 0;
        double flow = 0;
        double feed = 0;
        if (kind.limited()) {
            double capacity = partition * lot.stream().mapToDouble(Body::volume).sum();
            volume = capacity * log(0.1, 10);
            if (kind == Kind.FLOWING) {
                flow = volume / seconds * log(0.1, 10);
                feed = 30 * random.nextDouble();
            }
        }
        boolean clings = kind == Kind.UNLIMITED || kind.limited();
        double clinging = clings && random.nextInt(4) > 0 ? 1e-4 * log(0.3, 3) : 0;
        return new Step(kind, seconds, diffusivity, partition, film, volume, content, flow, feed, clinging);
    }

    private double diffusivity() {
        return REFERENCE_DIFFUSIVITY * log(0.5, 2);
    }

    /** So long that Fo is between 0.003 and 0.5 for a body of the reference length. */
    private double seconds() {
        return REFERENCE_LENGTH * REFERENCE_LENGTH / REFERENCE_DIFFUSIVITY * log(0.003, 0.5);
    }

    private double log(double low, double high) {
        return low * Math.pow(high / low, random.nextDouble());
    }
}
