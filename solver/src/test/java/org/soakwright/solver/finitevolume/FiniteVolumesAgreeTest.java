package org.soakwright.solver.finitevolume;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.finitevolume.Recipes.FilmClass;
import org.soakwright.solver.finitevolume.Step.Kind;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Grain;
import org.soakwright.solver.stage.Surface;
import org.soakwright.solver.stage.Surfaces;

/** The chain of modes against finite volumes, on every combination of shape, surroundings, film and rest. */
class FiniteVolumesAgreeTest {
    /** Cells of the coarsest mesh. */
    private static final int CELLS = 128;

    private static final List<Axis> AXES = List.of(Axis.SLAB, Axis.CYLINDER, Axis.SPHERE);

    /** Of the largest difference that has driven anything so far; measured worst 1.5e-8, the finite volumes' own. */
    private static final double AGREEMENT = 2e-7;

    private int inside;

    @Test
    void everyReadingAgreesAtTheEndOfEveryStep() {
        agree("finite volumes against modes: ", Recipes.all());
    }

    @Test
    void everyReadingAgreesWhereFilmsAndSkinsDifferByBody() {
        List<Recipe> recipes = Recipes.dressed();
        long mixed = recipes.stream()
                .flatMap(recipe -> recipe.steps().stream()
                        .filter(step -> recipe.lot().stream()
                                        .map(body -> body.coat().open(step))
                                        .distinct()
                                        .count()
                                == 2))
                .count();
        assertTrue(mixed > 20, "open bodies beside others in " + mixed + " steps only");
        agree("finite volumes against modes, surfaces by grade: ", recipes);
    }

    private void agree(String what, List<Recipe> recipes) {
        Map<String, Double> worst = new TreeMap<>();
        int readings = 0;
        for (Recipe recipe : recipes) {
            readings += compare(recipe, worst);
        }
        StringBuilder line = new StringBuilder();
        worst.forEach((name, difference) -> line.append(String.format(Locale.ROOT, " %s %.1e", name, difference)));
        System.out.println(what + readings + " readings, highest or lowest inside in " + inside + ", worst" + line);
        assertTrue(inside > 50, "extrema inside in " + inside + " readings only");
        assertEquals(6, worst.size());
        worst.forEach((name, difference) -> assertTrue(difference < AGREEMENT, name + " differ by " + difference));
    }

    @Test
    void theRecipesCoverEveryShapeWithEverySurroundingsAndEveryFilm() {
        Set<String> triples = new TreeSet<>();
        Set<String> rested = new TreeSet<>();
        Set<String> polylines = new TreeSet<>();
        Set<Integer> grades = new TreeSet<>();
        Set<String> handedOver = new TreeSet<>();
        for (Recipe recipe : Recipes.all()) {
            grades.add(recipe.lot().size());
            Step wetting = null;
            for (int k = 0; k < recipe.steps().size(); k++) {
                Step step = recipe.steps().get(k);
                boolean restAfter = k + 1 < recipe.steps().size()
                        && recipe.steps().get(k + 1).kind() == Kind.REST;
                for (Body body : recipe.lot()) {
                    if (step.kind() != Kind.REST) {
                        triples.add(body.power() + " " + step.kind() + " " + FilmClass.of(body, step));
                    }
                    if (restAfter) {
                        rested.add(body.power() + " " + step.kind());
                    }
                    if (k == 0) {
                        polylines.add(body.power() + " " + recipe.start().size());
                    }
                }
                if (step.kind().limited() && wetting != null && wetting.clinging() > 0) {
                    handedOver.add(wetting.kind() + " into " + step.kind()
                            + (recipe.steps().get(k - 1).equals(wetting) ? "" : ", later"));
                }
                wetting = step.kind() == Kind.REST || step.kind() == Kind.AIR ? wetting : step;
            }
        }
        System.out.println("finite volumes cover " + triples.size() + " of 36 shape x surroundings x film, "
                + rested.size() + " of 12 shape x surroundings before a rest, " + polylines.size()
                + " of 9 shape x start, lots of " + grades + " grades, drag-out " + handedOver);
        assertEquals(36, triples.size(), () -> "only " + triples);
        assertEquals(12, rested.size(), () -> "only " + rested);
        assertEquals(9, polylines.size(), () -> "only " + polylines);
        assertEquals(Set.of(1, 2, 3, 4), grades);
        for (Kind from : List.of(Kind.CLOSED, Kind.FLOWING, Kind.UNLIMITED)) {
            for (Kind to : List.of(Kind.CLOSED, Kind.FLOWING)) {
                assertTrue(
                        handedOver.stream().anyMatch(pair -> pair.startsWith(from + " into " + to)),
                        () -> from + " into " + to + " is missing");
            }
        }
    }

    @Test
    void theErrorOfTheFiniteVolumesFallsWithTheSquareOfTheMesh() {
        double first = 0;
        double second = 0;
        for (Recipe recipe : Recipes.all()) {
            List<Snapshot> coarse = FiniteVolumes.follow(recipe, CELLS);
            List<Snapshot> middle = FiniteVolumes.follow(recipe, 2 * CELLS);
            List<Snapshot> fine = FiniteVolumes.follow(recipe, 4 * CELLS);
            for (int k = 0; k < coarse.size(); k++) {
                first += squaredDifference(coarse.get(k), middle.get(k));
                second += squaredDifference(middle.get(k), fine.get(k));
            }
        }
        double order = Math.log(first / second) / Math.log(2) / 2;
        System.out.println(String.format(Locale.ROOT, "finite volumes: observed order %.3f", order));
        assertEquals(2, order, 0.05);
    }

    @Test
    void afterBrineAndRinseTheHighestContentLiesInside() {
        for (int power = 0; power <= 2; power++) {
            Body body = new Body(power, 5e-3, 1e-3);
            Step brine = Step.unlimited(2400, 1e-9, 0.8, Double.POSITIVE_INFINITY, 150);
            Step rinse = new Step(Kind.CLOSED, 900, 1e-9, 0.8, 2e-6, 4e-3, 0, 0, 0, 0);
            Recipe recipe =
                    new Recipe(List.of(body), List.of(new Corner(0, 5), new Corner(8, 5)), List.of(brine, rinse));
            Profile profile =
                    FiniteVolumes.extrapolated(recipe, CELLS).get(1).profiles().get(0);
            Course course = follow(recipe);
            Probe.Highest highest = new Probe.Highest(0);
            double place = course.place(highest, 1)[0];
            assertTrue(place > 0.3 && place < 0.9, "inside, not at " + place);
            assertEquals(Mesh.place(profile.highestNode()), place, 0.03);
            assertTrue(course.value(highest, 1) > 1.05 * course.value(new Probe.At(0, 1), 1));
            assertTrue(course.value(highest, 1) > 1.05 * course.value(new Probe.At(0, 0), 1));
            assertEquals(profile.highest(), course.value(highest, 1), 150 * 1e-8);
        }
    }

    private int compare(Recipe recipe, Map<String, Double> worst) {
        List<Snapshot> ends = FiniteVolumes.extrapolated(recipe, CELLS);
        Course course = follow(recipe);
        int readings = 0;
        for (int k = 0; k < ends.size(); k++) {
            Snapshot end = ends.get(k);
            double inPieces = end.drive() * recipe.steps().get(k).partition();
            for (int j = 0; j < recipe.lot().size(); j++) {
                Profile profile = end.profiles().get(j);
                note(worst, "means", profile.mean(), course.value(new Probe.Mean(j), k), inPieces);
                note(worst, "cores", profile.core(), course.value(new Probe.At(j, 0), k), inPieces);
                note(worst, "surfaces", profile.surface(), course.value(new Probe.At(j, 1), k), inPieces);
                note(worst, "highest", profile.highest(), course.value(new Probe.Highest(j), k), inPieces);
                note(worst, "lowest", profile.lowest(), course.value(new Probe.Lowest(j), k), inPieces);
                readings += 5;
                inside += isInside(course.place(new Probe.Highest(j), k)[0]) ? 1 : 0;
                inside += isInside(course.place(new Probe.Lowest(j), k)[0]) ? 1 : 0;
            }
            note(worst, "liquors", end.liquor(), course.value(new Probe.Liquor(), k), end.drive());
            readings++;
        }
        return readings;
    }

    private static boolean isInside(double place) {
        return place > 0.01 && place < 0.99;
    }

    private static void note(Map<String, Double> worst, String what, double expected, double found, double scale) {
        worst.merge(what, Math.abs(expected - found) / scale, Math::max);
    }

    private static double squaredDifference(Snapshot a, Snapshot b) {
        double scale = 1 / a.drive();
        double sum = Math.pow(scale * (a.liquor() - b.liquor()), 2);
        for (int j = 0; j < a.profiles().size(); j++) {
            Profile one = a.profiles().get(j);
            Profile two = b.profiles().get(j);
            sum += Math.pow(scale * (one.mean() - two.mean()), 2)
                    + Math.pow(scale * (one.core() - two.core()), 2)
                    + Math.pow(scale * (one.surface() - two.surface()), 2);
        }
        return sum;
    }

    /** One for all where they are alike. */
    static Surfaces surfaces(Step step, List<Coat> coats) {
        List<Surface> each = coats.stream().map(coat -> surface(step, coat)).toList();
        return coats.stream().allMatch(Coat.NONE::equals)
                ? new Surfaces.Alike(each.get(0))
                : new Surfaces.ByGrade(each);
    }

    static Surface surface(Step step, Coat coat) {
        if (step.kind() == Kind.REST) {
            return new Surface.Sealed();
        }
        if (coat.skin() == 0) {
            return new Surface.Sealed();
        }
        if (Double.isInfinite(coat.skin())) {
            return step.open() ? new Surface.Open() : new Surface.Film(coat.speed() * step.film());
        }
        return Surface.inSeries(coat.speed() * step.film(), coat.skin());
    }

    /** The same recipe in the solver's own terms. */
    private static Course follow(Recipe recipe) {
        List<Grade> lot = new ArrayList<>();
        for (Body body : recipe.lot()) {
            lot.add(new Grade(AXES.get(body.power()), body.length(), body.volume()));
        }
        List<Start.Point> points = new ArrayList<>();
        for (Corner corner : recipe.start()) {
            points.add(new Start.Point(Mesh.place(corner.eighth() / 8.0), corner.content()));
        }
        List<Stage> stages = new ArrayList<>();
        for (Step step : recipe.steps()) {
            Surfaces surfaces =
                    surfaces(step, recipe.lot().stream().map(Body::coat).toList());
            Surroundings around = switch (step.kind()) {
                case REST -> new Surroundings.Rest();
                case AIR -> new Surroundings.Air(step.content());
                case UNLIMITED -> new Surroundings.Plenty(step.content());
                case CLOSED, FLOWING ->
                    new Surroundings.Vessel(step.volume(), step.content(), step.flow(), step.feed());
            };
            stages.add(new Stage(step.diffusivity(), step.partition(), surfaces, around, step.clinging(), Grain.NONE));
        }
        boolean level =
                points.stream().mapToDouble(Start.Point::content).distinct().count() == 1;
        Start start = level ? new Start.Uniform(points.get(0).content()) : new Start.Polyline(points);
        return Chain.of(lot, start, stages)
                .follow(recipe.steps().stream().mapToDouble(Step::seconds).toArray());
    }
}
