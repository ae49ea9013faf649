package org.soakwright.solver.finitevolume;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.finitevolume.Step.Kind;

/** What the reference for several axes must itself get right, before anything is held against it. */
class SolidsTest {
    private static final double NO_FILM = Double.POSITIVE_INFINITY;

    @Test
    void oneAxisIsFollowedAsTheTridiagonalLawSays() {
        double worst = 0;
        int compared = 0;
        for (Recipe recipe : Recipes.all()) {
            double level = recipe.start().get(0).content();
            if (recipe.start().stream().anyMatch(c -> c.content() != level)) {
                continue;
            }
            List<Solid> lot = recipe.lot().stream()
                    .map(b -> Solid.of(b.power(), b.length(), b.volume()))
                    .toList();
            Batch batch = new Batch(
                    lot, level, recipe.steps().stream().map(Phase::even).toList());
            List<Snapshot> expected = FiniteVolumes.follow(recipe, 64);
            List<State> found = Solids.follow(batch, 64);
            for (int k = 0; k < expected.size(); k++) {
                Snapshot one = expected.get(k);
                State other = found.get(k);
                double scale = one.drive() * recipe.steps().get(k).partition();
                worst = Math.max(worst, Math.abs(one.liquor() - other.liquor()) / one.drive());
                for (int j = 0; j < lot.size(); j++) {
                    Profile profile = one.profiles().get(j);
                    Field field = other.fields().get(j);
                    worst = Math.max(worst, Math.abs(profile.mean() - field.mean()) / scale);
                    worst = Math.max(worst, Math.abs(profile.core() - field.core()) / scale);
                    worst = Math.max(worst, Math.abs(profile.surface() - field.wetted()) / scale);
                    compared += 3;
                }
            }
        }
        System.out.println(String.format(
                Locale.ROOT, "one axis by waves and by elimination: %d readings, worst %.1e", compared, worst));
        assertTrue(compared > 500);
        assertTrue(worst < 1e-11, "differ by " + worst);
    }

    @Test
    void theErrorFallsWithTheSquareOfTheMeshAndElementsAgreeWithItsLimit() {
        double first = 0;
        double second = 0;
        double meshes = 0;
        double elements = 0;
        List<Batch> batches = Batches.all();
        // Every third: each shape with every lot.
        for (int r = 0; r < batches.size(); r += 3) {
            Batch batch = batches.get(r);
            int cells = Batches.bricks(batch) ? 24 : 32;
            List<State> coarse = Solids.follow(batch, cells);
            List<State> middle = Solids.follow(batch, 2 * cells);
            List<State> fine = Solids.follow(batch, 4 * cells);
            List<State> limit = Solids.extrapolated(coarse, middle, fine);
            List<State> smooth = Solids.onElements(batch, Batches.degree(batch));
            List<State> smoother = Solids.onElements(batch, Batches.degree(batch) + 2);
            for (int k = 0; k < coarse.size(); k++) {
                double partition = batch.phases().get(k).step().partition();
                first += Math.pow(difference(coarse.get(k), middle.get(k), partition, false), 2);
                second += Math.pow(difference(middle.get(k), fine.get(k), partition, false), 2);
                meshes = Math.max(meshes, difference(limit.get(k), smooth.get(k), partition, false));
                elements = Math.max(elements, difference(smooth.get(k), smoother.get(k), partition, true));
            }
        }
        double order = Math.log(first / second) / Math.log(2) / 2;
        System.out.println(String.format(
                Locale.ROOT,
                "several axes: observed order %.3f; limit of the meshes off by %.1e, elements by %.1e",
                order,
                meshes,
                elements));
        assertEquals(2, order, 0.05);
        assertTrue(meshes < 1e-6);
        assertTrue(elements < 2e-8);
    }

    /**
     * Newman, Transactions of the American Institute of Chemical Engineers 27 (1931) 203 and 310: what is left is the product of
     * what would be left in each axis alone; twelve digits recomputed from the exact series.
     */
    @Test
    void elementsGiveNewmansProducts() {
        Step leach = Step.unlimited(0.1, 1, 1, NO_FILM, 0);
        Solid cube = Solid.brick(1, 1, 1, 1);
        Solid squat = Solid.shortCylinder(1, 0.5, 1);
        Solid square = Solid.shortCylinder(1, 1, 1);
        Solid tall = Solid.shortCylinder(1, 2, 1);
        Batch batch = new Batch(List.of(cube, squat, square, tall), 1, List.of(Phase.even(leach)));
        List<Field> fields = Solids.onElements(batch, 12).get(0).fields();
        double[] left = {0.266066811885, 0.119087643130, 0.253524654548, 0.323849949879};
        for (int j = 0; j < left.length; j++) {
            assertEquals(left[j], fields.get(j).mean(), 0.6e-12);
        }
    }

    /** Largest of all readings, over what has driven them. */
    private static double difference(State a, State b, double partition, boolean extrema) {
        double worst = Math.abs(a.liquor() - b.liquor()) / b.drive();
        for (int j = 0; j < a.fields().size(); j++) {
            Field one = a.fields().get(j);
            Field two = b.fields().get(j);
            double scale = b.drive() * partition;
            worst = Math.max(worst, Math.abs(one.mean() - two.mean()) / scale);
            worst = Math.max(worst, Math.abs(one.core() - two.core()) / scale);
            worst = Math.max(worst, Math.abs(one.wetted() - two.wetted()) / scale);
            if (extrema) {
                worst = Math.max(worst, Math.abs(one.highest() - two.highest()) / scale);
                worst = Math.max(worst, Math.abs(one.lowest() - two.lowest()) / scale);
            }
        }
        return worst;
    }

    /** The whole law of a small brick and a sphere in one bath, cell by cell, solved without any product. */
    @Test
    void productsOfWavesSolveTheLawAssembledCellByCell() {
        int cells = 8;
        Solid brick = Solid.brick(1, 1.3, 0.8, 0.7).eased(1.2);
        Solid sphere = Solid.of(2, 1.1, 0.4);
        List<Double> grain = List.of(1.0, 0.6, 1.7);
        for (double film : new double[] {NO_FILM, 2.5}) {
            for (double flow : new double[] {0, 9}) {
                Kind kind = flow > 0 ? Kind.FLOWING : Kind.CLOSED;
                Step step = new Step(kind, 0.07, 0.9, 1.4, film, 1.1, 0.3, flow, 0, 0);
                Batch batch = new Batch(List.of(brick, sphere), 1, List.of(new Phase(step, grain)));
                State found = Solids.follow(batch, cells).get(0);
                double[] expected = assembled(batch, cells);
                assertEquals(expected[0], found.liquor(), 1e-11);
                assertEquals(expected[1], found.fields().get(0).core(), 1e-11);
                assertEquals(expected[2], found.fields().get(1).core(), 1e-11);
            }
        }
    }

    /** Liquor and cores. One unknown for each node that is not part of the bath, and one for the bath. */
    private static double[] assembled(Batch batch, int cells) {
        Phase phase = batch.phases().get(0);
        Step step = phase.step();
        int free = step.open() ? cells : cells + 1;
        List<int[]> sizes = new ArrayList<>();
        int unknowns = 1;
        for (Solid solid : batch.lot()) {
            int[] size = new int[solid.edges().size()];
            Arrays.fill(size, cells + 1);
            sizes.add(size);
            unknowns += (int) Math.pow(free, size.length);
        }
        double[] mass = new double[unknowns];
        double[][] tie = new double[unknowns][unknowns];
        double[] start = new double[unknowns];
        mass[0] = step.volume();
        double bathContent = step.volume() * step.content();
        int next = 1;
        int[] core = new int[sizes.size()];
        for (int j = 0; j < sizes.size(); j++) {
            Solid solid = batch.lot().get(j);
            double capacity = step.partition() * solid.volume();
            List<Mesh> meshes =
                    solid.edges().stream().map(e -> new Mesh(e.power(), cells)).toList();
            Tensor place = Tensor.level(sizes.get(j), 0);
            core[j] = next;
            for (int i = 0; i < place.value.length; i++) {
                boolean inBath = Arrays.stream(place.index(i)).anyMatch(x -> x >= free);
                place.value[i] = inBath ? 0 : next++;
                double share = capacity;
                for (int a = 0; a < meshes.size(); a++) {
                    share *= meshes.get(a).share[place.index(i)[a]];
                }
                mass[(int) place.value[i]] += share;
                bathContent += inBath ? share * batch.start() / step.partition() : 0;
                start[(int) place.value[i]] = batch.start() / step.partition();
            }
            for (int i = 0; i < place.value.length; i++) {
                int[] index = place.index(i);
                for (int a = 0; a < index.length; a++) {
                    Edge edge = solid.edges().get(a);
                    double across = capacity;
                    for (int o = 0; o < index.length; o++) {
                        across *= o == a ? 1 : meshes.get(o).share[index[o]];
                    }
                    if (index[a] < cells) {
                        double pace = phase.diffusivity(solid, edge) / (edge.length() * edge.length());
                        int[] beside = index.clone();
                        beside[a]++;
                        tie(tie, place.value[i], place.at(beside), across * pace * meshes.get(a).conductance[index[a]]);
                    } else if (!step.open()) {
                        tie(
                                tie,
                                place.value[i],
                                0,
                                across / step.partition() * (edge.power() + 1) * step.film() / edge.length());
                    }
                }
            }
        }
        start[0] = bathContent / mass[0];
        tie[0][0] += step.flow();
        for (int i = 0; i < unknowns; i++) {
            for (int k = 0; k < unknowns; k++) {
                tie[i][k] /= Math.sqrt(mass[i] * mass[k]);
            }
        }
        EigenDecomposition split = new EigenDecomposition(new Array2DRowRealMatrix(tie, false));
        double[] end = new double[unknowns];
        for (int n = 0; n < unknowns; n++) {
            double[] vector = split.getEigenvector(n).toArray();
            double held = 0;
            for (int i = 0; i < unknowns; i++) {
                held += vector[i] * Math.sqrt(mass[i]) * start[i];
            }
            held *= Math.exp(-split.getRealEigenvalue(n) * step.seconds());
            for (int i = 0; i < unknowns; i++) {
                end[i] += held * vector[i] / Math.sqrt(mass[i]);
            }
        }
        return new double[] {end[0], step.partition() * end[core[0]], step.partition() * end[core[1]]};
    }

    private static void tie(double[][] tie, double from, double to, double strength) {
        int a = (int) from;
        int b = (int) to;
        if (a != b) {
            tie[a][a] += strength;
            tie[b][b] += strength;
            tie[a][b] -= strength;
            tie[b][a] -= strength;
        }
    }
}
