package org.soakwright.solver.finitevolume;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.finitevolume.Step.Kind;

/** Slabs with two films against finite volumes between two faces, beside cylinders and spheres; elements do the same in {@link SolidsAgreeTest}. */
class TwoFacesAgreeTest {
    /** Of the coarsest mesh. */
    private static final int CELLS = 40;

    /** Of what has driven; measured worst 4.1e-8, in the middle: the finite volumes' own, extrapolated from so few cells. */
    private static final double AGREEMENT = 2e-7;

    private static List<Batch> slabs() {
        return Batches.twoFaced().stream()
                .filter(batch ->
                        batch.lot().stream().allMatch(solid -> solid.edges().size() == 1))
                .limit(5)
                .toList();
    }

    @Test
    void everyReadingAgreesAtTheEndOfEveryPhase() {
        Map<String, Double> worst = new TreeMap<>();
        for (Batch batch : slabs()) {
            List<State> ends = Solids.extrapolated(batch, CELLS);
            Course course = SolidsAgreeTest.follow(batch);
            for (int k = 0; k < ends.size(); k++) {
                State end = ends.get(k);
                double inPieces = end.drive() * batch.phases().get(k).step().partition();
                for (int j = 0; j < batch.lot().size(); j++) {
                    Field field = end.fields().get(j);
                    note(worst, "means", field.mean() - course.value(new Probe.Mean(j), k), inPieces);
                    note(worst, "cores", field.core() - course.value(new Probe.Core(j), k), inPieces);
                    note(worst, "backs", field.on(0) - course.value(new Probe.At(j, 0), k), inPieces);
                    note(worst, "fronts", field.on(1) - course.value(new Probe.At(j, 1), k), inPieces);
                    note(worst, "surfaces", field.wetted() - course.value(new Probe.Surface(j), k), inPieces);
                }
                note(worst, "liquors", end.liquor() - course.value(new Probe.Liquor(), k), end.drive());
            }
        }
        StringBuilder line = new StringBuilder("finite volumes between two faces against the solver:");
        worst.forEach((what, off) -> line.append(String.format(Locale.ROOT, " %s %.1e", what, off)));
        System.out.println(line);
        assertEquals(6, worst.size());
        worst.forEach((what, off) -> assertTrue(off < AGREEMENT, what + " differ by " + off));
    }

    private static void note(Map<String, Double> worst, String what, double difference, double scale) {
        worst.merge(what, Math.abs(difference) / scale, Math::max);
    }

    @Test
    void theErrorOfTheFiniteVolumesFallsWithTheSquareOfTheMesh() {
        double first = 0;
        double second = 0;
        for (Batch batch : slabs()) {
            List<State> coarse = Solids.follow(batch, CELLS);
            List<State> middle = Solids.follow(batch, 2 * CELLS);
            List<State> fine = Solids.follow(batch, 4 * CELLS);
            for (int k = 0; k < coarse.size(); k++) {
                for (int j = 0; j < batch.lot().size(); j++) {
                    double scale = 1 / coarse.get(k).drive();
                    Field one = coarse.get(k).fields().get(j);
                    Field two = middle.get(k).fields().get(j);
                    Field three = fine.get(k).fields().get(j);
                    first += Math.pow(scale * (one.mean() - two.mean()), 2)
                            + Math.pow(scale * (one.wetted() - two.wetted()), 2);
                    second += Math.pow(scale * (two.mean() - three.mean()), 2)
                            + Math.pow(scale * (two.wetted() - three.wetted()), 2);
                }
            }
        }
        double order = Math.log(first / second) / Math.log(2) / 2;
        System.out.println(String.format(Locale.ROOT, "finite volumes between two faces: observed order %.3f", order));
        assertEquals(2, order, 0.05);
    }

    @Test
    void theBatchesPutTwoFacesIntoAllSurroundings() {
        Set<Kind> slabs = new TreeSet<>();
        slabs().forEach(batch ->
                batch.phases().forEach(phase -> slabs.add(phase.step().kind())));
        assertEquals(Set.of(Kind.values()), slabs);
        Set<String> met = new TreeSet<>();
        for (Batch batch : Batches.twoFaced()) {
            for (Phase phase : batch.phases()) {
                for (Solid solid : batch.lot()) {
                    if (solid.isTwoFaced() && phase.step().kind() != Kind.REST) {
                        String back = solid.back().skin() == 0
                                ? "sealed"
                                : solid.back().open(phase.step()) ? "open" : "behind a film";
                        String front = solid.coat().open(phase.step()) ? "open" : "behind a film";
                        met.add(phase.step().kind() + ", back " + back + ", front " + front);
                    }
                }
            }
        }
        System.out.println("two faces meet " + met.size() + " of 24 surroundings x back x front");
        assertEquals(24, met.size(), () -> "only " + met);
    }
}
