package org.soakwright.solver.identities;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Reading;
import org.soakwright.solver.chain.Sensitivity;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.StageTooShort;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.identities.Draw.Kind;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Side;
import org.soakwright.solver.stage.Surface;
import org.soakwright.solver.stage.Surfaces;

/** Sides between two faces that exchange each in its own way: what they must agree with, and what must hold of them. */
class TwoFacesTest {
    private static final Probe LIQUOR = new Probe.Liquor();
    private static final Probe LOT = new Probe.LotMean();
    private static final double CHANGE = 2e-3;
    private static final Surface SEALED = new Surface.Sealed();

    /** A slab beside others, in shared liquors and liquors that nothing changes. */
    private static List<Grade> lot(Draw draw) {
        List<Grade> lot = new ArrayList<>(draw.lot(3));
        lot.set(0, new Grade(Axis.SLAB, lot.get(0).length(), lot.get(0).volume()));
        return lot;
    }

    private static List<Timed> steps(Draw draw, List<Grade> lot) {
        List<Timed> steps = new ArrayList<>();
        int count = 1 + draw.below(3);
        for (int k = 0; k < count; k++) {
            steps.add(draw.clinging(draw.stage(lot, draw.kind(), 1)));
        }
        return steps;
    }

    /** The first grade's first flat side, so many times its length, between two faces. */
    private static List<Grade> between(List<Grade> lot, double times) {
        List<Grade> faced = new ArrayList<>(lot);
        List<Side> sides = new ArrayList<>(lot.get(0).sides());
        int flat = sides.get(0).axis() == Axis.SLAB ? 0 : 1;
        sides.set(
                flat,
                Side.betweenFaces(
                        times * sides.get(flat).length(), sides.get(flat).direction()));
        faced.set(0, new Grade(sides, lot.get(0).volume(), lot.get(0).ease()));
        return faced;
    }

    /** The first grade's surface in every stage but rests. */
    private static List<Timed> with(List<Timed> steps, int grades, UnaryOperator<Surface> first) {
        List<Timed> changed = new ArrayList<>();
        for (Timed step : steps) {
            Stage stage = step.stage();
            Surface surface = stage.surfaces().of(0);
            if (stage.surfaces().sealed()) {
                changed.add(step);
                continue;
            }
            List<Surface> each = new ArrayList<>(List.of(first.apply(surface)));
            while (each.size() < grades) {
                each.add(surface);
            }
            changed.add(step.with(new Stage(
                    stage.diffusivity(),
                    stage.partition(),
                    new Surfaces.ByGrade(each),
                    stage.surroundings(),
                    stage.clinging(),
                    stage.grain())));
        }
        return changed;
    }

    /** A back of its own in every stage: another film, open, or sealed; now and then it is the front that is sealed. */
    private static List<Timed> skinned(Draw draw, List<Timed> steps, int grades) {
        return with(steps, grades, front -> switch (draw.below(5)) {
            case 0 -> new Surface.Faces(SEALED, front);
            case 1 -> new Surface.Faces(front, SEALED);
            case 2 -> new Surface.Faces(new Surface.Open(), front);
            default -> new Surface.Faces(new Surface.Film(draw.log(1e-9, 1e-5)), front);
        });
    }

    /** What a grade reads like in another writing of the lot, the first grade's positions being moved. */
    private interface Placed {
        double at(double position);
    }

    private record Agreement(Tally means, Tally places) {
        void note(Course one, Course other, List<Grade> lot, Placed placed, Start start, List<Timed> steps) {
            double[] bounds = Bounds.highest(start, steps);
            for (int k = 0; k < steps.size(); k++) {
                double inPieces = bounds[k] * steps.get(k).stage().partition();
                note(one.read(LIQUOR, k), other.read(LIQUOR, k), bounds[k]);
                for (int j = 0; j < lot.size(); j++) {
                    note(one.read(new Probe.Mean(j), k), other.read(new Probe.Mean(j), k), inPieces);
                    for (double x : new double[] {0, 0.35, 0.9, 1}) {
                        Probe there = new Probe.At(j, j == 0 ? placed.at(x) : x);
                        places.note(overStated(one.read(new Probe.At(j, x), k), other.read(there, k), inPieces));
                    }
                    for (Probe probe : List.of(new Probe.Highest(j), new Probe.Lowest(j), new Probe.Range(j))) {
                        places.note(overStated(one.read(probe, k), other.read(probe, k), inPieces));
                    }
                }
            }
        }

        /** Where so much cannot be promised the stated error says so, and is what counts. */
        private void note(Reading a, Reading b, double scale) {
            if (a.error() + b.error() < 1e-8 * scale) {
                means.note(Math.abs(a.value() - b.value()) / scale);
            }
            places.note(overStated(a, b, scale));
        }

        private static double overStated(Reading a, Reading b, double scale) {
            return Math.abs(a.value() - b.value()) / (a.error() + b.error() + 1e-10 * scale);
        }
    }

    @Test
    void facesThatAreAlikeMakeAnOrdinarySlab() {
        Draw draw = new Draw(2201);
        Agreement agreement = new Agreement(
                new Tally("faces alike against half the thickness, means and liquors"),
                new Tally("faces alike against half the thickness, places over the stated errors"));
        for (int i = 0; i < 32; i++) {
            List<Grade> lot = lot(draw);
            Start start = draw.start();
            Start whole = start instanceof Start.Polyline line ? mirrored(line) : start;
            List<Timed> steps = steps(draw, lot);
            boolean named = i % 2 == 0;
            List<Timed> same = with(steps, lot.size(), film -> named ? new Surface.Faces(film, film) : film);
            try {
                Course one = Timed.follow(lot, start, steps);
                List<Start> starts = new ArrayList<>(List.of(whole));
                while (starts.size() < lot.size()) {
                    starts.add(start);
                }
                Course other = Chain.of(
                                between(lot, 2),
                                starts,
                                same.stream().map(Timed::stage).toList(),
                                java.util.Set.of())
                        .follow(Timed.seconds(steps));
                double half = i % 4 < 2 ? 0.5 : -0.5;
                agreement.note(one, other, lot, x -> 0.5 + half * x, start, steps);
                for (int k = 0; k < steps.size(); k++) {
                    double inPieces = Bounds.highest(start, steps)[k]
                            * steps.get(k).stage().partition();
                    agreement.places.note(Agreement.overStated(
                            one.read(new Probe.Surface(0), k), other.read(new Probe.Surface(0), k), inPieces));
                    agreement.places.note(Agreement.overStated(
                            one.read(new Probe.Core(0), k), other.read(new Probe.Core(0), k), inPieces));
                }
            } catch (StageTooShort refused) {
                agreement.means.skip();
            }
        }
        agreement.means.within(1e-10, 100);
        agreement.places.within(1, 500);
    }

    /** From 0 at the core to both faces. */
    private static Start mirrored(Start.Polyline half) {
        List<Start.Point> points = new ArrayList<>();
        for (int i = half.points().size() - 1; i > 0; i--) {
            Start.Point point = half.points().get(i);
            points.add(new Start.Point(0.5 - 0.5 * point.position(), point.content()));
        }
        for (Start.Point point : half.points()) {
            points.add(new Start.Point(0.5 + 0.5 * point.position(), point.content()));
        }
        return new Start.Polyline(points);
    }

    @Test
    void aSealedBackMakesASlabOfOneFace() {
        Draw draw = new Draw(2202);
        Agreement agreement = new Agreement(
                new Tally("back sealed against one face, means and liquors"),
                new Tally("back sealed against one face, places over the stated errors"));
        for (int i = 0; i < 32; i++) {
            List<Grade> lot = lot(draw);
            Start start = draw.start();
            List<Timed> steps = steps(draw, lot);
            boolean turned = start instanceof Start.Uniform && i % 2 == 0;
            List<Timed> sealed = with(
                    steps,
                    lot.size(),
                    film -> turned ? new Surface.Faces(film, SEALED) : new Surface.Faces(SEALED, film));
            try {
                Course one = Timed.follow(lot, start, steps);
                Course other = Timed.follow(between(lot, 1), start, sealed);
                agreement.note(one, other, lot, x -> turned ? 1 - x : x, start, steps);
            } catch (StageTooShort refused) {
                agreement.means.skip();
            }
        }
        agreement.means.within(1e-10, 100);
        agreement.places.within(1, 500);
    }

    @Test
    void aPieceTurnedOverIsTheSamePiece() {
        Draw draw = new Draw(2203);
        Agreement agreement = new Agreement(
                new Tally("turned over, means and liquors"), new Tally("turned over, places over the stated errors"));
        for (int i = 0; i < 40; i++) {
            List<Grade> lot = between(List.of(lot(draw).get(0)), 1.7);
            Start start = draw.start();
            List<Timed> steps = skinned(draw, steps(draw, lot), 1);
            List<Timed> turned = with(steps, 1, surface -> new Surface.Faces(surface.atFront(), surface.atBack()));
            Course one = Timed.follow(lot, start, steps);
            Course other = Timed.follow(lot, start instanceof Start.Polyline line ? turned(line) : start, turned);
            agreement.note(one, other, lot, x -> 1 - x, start, steps);
        }
        agreement.means.within(1e-12, 80);
        agreement.places.within(1, 400);
    }

    private static Start turned(Start.Polyline line) {
        List<Start.Point> points = new ArrayList<>();
        for (int i = line.points().size() - 1; i >= 0; i--) {
            points.add(new Start.Point(
                    1 - line.points().get(i).position(), line.points().get(i).content()));
        }
        return new Start.Polyline(points);
    }

    @Test
    void aBrickWithFacesAlikeIsABrick() {
        Draw draw = new Draw(2204);
        Agreement agreement = new Agreement(
                new Tally("bricks with faces alike, means and liquors"),
                new Tally("bricks with faces alike, places over the stated errors"));
        Tally surfaces = new Tally("bricks with faces alike, surfaces over the stated errors");
        for (int i = 0; i < 16; i++) {
            List<Grade> lot = draw.solids(1 + i % 2);
            Start start = new Start.Uniform(draw.between(0, Draw.MOST));
            List<Timed> steps = steps(draw, lot);
            List<Timed> same = with(steps, lot.size(), film -> new Surface.Faces(film, film));
            Grade first = lot.get(0);
            int flat = first.axis() == Axis.SLAB ? 0 : 1;
            boolean way = first.shortest() == flat;
            Course one = Timed.follow(lot, start, steps);
            Course other = Timed.follow(between(lot, 2), start, same);
            for (int k = 0; k < steps.size(); k++) {
                double bound = Bounds.highest(start, steps)[k];
                Reading a = one.read(new Probe.Surface(0), k);
                Reading b = other.read(new Probe.Surface(0), k);
                surfaces.note(
                        Agreement.overStated(a, b, bound * steps.get(k).stage().partition()));
            }
            agreement.note(one, other, lot, x -> way ? 0.5 + 0.5 * x : x, start, steps);
        }
        agreement.means.within(1e-10, 40);
        agreement.places.within(1, 240);
        surfaces.within(1, 16);
    }

    @Test
    void soluteIsNeitherMadeNorLost() {
        Draw draw = new Draw(2205);
        Tally tally = new Tally("two faces: balance of closed baths with drag-out and rest");
        for (int i = 0; i < 36; i++) {
            List<Grade> plain = i % 3 == 0 ? draw.solids(1 + i % 2) : lot(draw);
            List<Grade> lot = between(plain, 2);
            Start start = new Start.Uniform(draw.between(0, Draw.MOST));
            Timed first = draw.clinging(draw.stage(plain, Kind.CLOSED, 1));
            Timed rest = draw.stage(plain, Kind.REST, 0);
            Timed second = draw.stage(plain, Kind.CLOSED, 1);
            List<Timed> steps = skinned(draw, List.of(first, rest, second), lot.size());
            Course course = Timed.follow(lot, start, steps);
            double pieces = Draw.capacity(lot, 1);
            double clinging = first.stage().clinging();
            double poured = vessel(second).volume();
            double whole = vessel(first).volume();
            double loaded = pieces * ((Start.Uniform) start).content()
                    + whole * vessel(first).content();
            double soaked = pieces * course.value(LOT, 0) + whole * course.value(LIQUOR, 0);
            double before = pieces * course.value(LOT, 1)
                    + clinging * course.value(LIQUOR, 1)
                    + poured * vessel(second).content();
            double after = pieces * course.value(LOT, 2) + (poured + clinging) * course.value(LIQUOR, 2);
            double[] bounds = Bounds.highest(start, steps);
            tally.note(Math.abs(soaked - loaded)
                    / (bounds[0] * (whole + pieces * first.stage().partition())));
            tally.note(Math.abs(after - before)
                    / (bounds[2] * (poured + clinging + pieces * second.stage().partition())));
        }
        tally.within(1e-12, 72);
    }

    @Test
    void derivativesAgreeWithDifferences() {
        Draw draw = new Draw(2206);
        Tally byDuration = new Tally("two faces: derivatives by duration");
        Tally byContent = new Tally("two faces: derivatives by content");
        for (int i = 0; i < 36; i++) {
            List<Grade> plain = i % 3 == 0 ? draw.solids(1 + i % 2) : lot(draw);
            List<Grade> lot = between(plain, 2);
            Start start = new Start.Uniform(draw.between(0, Draw.MOST));
            List<Timed> steps = skinned(draw, steps(draw, plain), lot.size());
            int which = draw.below(steps.size());
            int last = steps.size() - 1;
            double scale = Bounds.highest(start, steps)[last]
                    * Math.max(1, steps.get(last).stage().partition());
            Chain chain = Timed.chain(lot, start, steps);
            Course course = chain.follow(Timed.seconds(steps));
            Course more = Timed.follow(lot, start, richer(steps, which, 7));
            for (Probe probe : List.of(
                    new Probe.Mean(0),
                    LOT,
                    LIQUOR,
                    new Probe.Surface(0),
                    new Probe.Core(0),
                    new Probe.At(0, 0),
                    new Probe.At(0, 0.3))) {
                Sensitivity found = course.sensitivity(probe, last);
                double seconds = steps.get(which).seconds();
                double difference = slope(chain, steps, probe, which);
                byDuration.note(Math.abs(found.bySeconds()[which] * seconds - difference) / scale);
                double gained = more.value(probe, last) - course.value(probe, last);
                byContent.note(Math.abs(found.byContent()[which] * 7 - gained) / scale);
            }
        }
        byDuration.within(1e-10, 250);
        byContent.within(1e-12, 250);
    }

    private static double slope(Chain chain, List<Timed> steps, Probe probe, int which) {
        double[] value = new double[5];
        for (int i = -2; i <= 2; i++) {
            double[] changed = Timed.seconds(steps);
            changed[which] *= 1 + i * CHANGE;
            value[i + 2] = chain.follow(changed).value(probe, steps.size() - 1);
        }
        return (8 * (value[3] - value[1]) - (value[4] - value[0])) / (12 * CHANGE);
    }

    private static List<Timed> richer(List<Timed> steps, int which, double by) {
        List<Timed> changed = new ArrayList<>(steps);
        Surroundings around = steps.get(which).stage().surroundings();
        Surroundings richer = around;
        if (around instanceof Surroundings.Vessel v) {
            richer = new Surroundings.Vessel(v.volume(), v.content() + by, v.flow(), v.feed());
        } else if (around instanceof Surroundings.Plenty plenty) {
            richer = new Surroundings.Plenty(plenty.content() + by);
        } else if (around instanceof Surroundings.Air air) {
            richer = new Surroundings.Air(air.equilibrium() + by);
        }
        changed.set(which, steps.get(which).with(richer));
        return changed;
    }

    @Test
    void nothingOnTheWayLiesBeyondTheExtrema() {
        Draw draw = new Draw(2207);
        Tally tally = new Tally("two faces: profiles beyond the extrema");
        int inside = 0;
        int atBack = 0;
        for (int i = 0; i < 60; i++) {
            List<Grade> plain = List.of(lot(draw).get(0));
            List<Grade> lot = between(plain, 2);
            Start start = draw.start();
            List<Timed> steps = skinned(draw, steps(draw, plain), 1);
            Course course = Timed.follow(lot, start, steps);
            int last = steps.size() - 1;
            double high = course.value(new Probe.Highest(0), last);
            double low = course.value(new Probe.Lowest(0), last);
            double place = course.place(new Probe.Highest(0), last)[0];
            inside += place > 0 && place < 1 ? 1 : 0;
            atBack += place == 0 ? 1 : 0;
            double[] positions = new double[2001];
            for (int p = 0; p < positions.length; p++) {
                positions[p] = p / 2000.0;
            }
            double scale =
                    Bounds.highest(start, steps)[last] * steps.get(last).stage().partition();
            for (double content : course.profile(0, last, positions)) {
                tally.note(Math.max(0, Math.max(content - high, low - content)) / scale);
            }
        }
        System.out.println("  of which highest inside: " + inside + ", at the back: " + atBack);
        tally.within(1e-9, 100_000);
        assertTrue(inside > 5 && atBack > 5, "inside " + inside + ", at the back " + atBack);
    }

    @Test
    void aSkinKeepsTheSoluteOnItsSide() {
        Stage soak = new Stage(
                1e-9,
                1,
                new Surface.Faces(Surface.inSeries(3e-6, 2e-8), new Surface.Film(3e-6)),
                new Surroundings.Plenty(0),
                0);
        Chain chain = Chain.of(
                List.of(new Grade(List.of(Side.betweenFaces(8e-3, 0)), 1e-3, 1)), new Start.Uniform(90), List.of(soak));
        Course course = chain.follow(3 * 3600);
        double[] across = course.profile(0, 0, 0, 0.25, 0.5, 0.75, 1);
        assertTrue(across[0] > 2 * across[4], "more at the back than at the front");
        double place = course.place(new Probe.Highest(0), 0)[0];
        assertTrue(place > 0.01 && place < 0.4, "highest beneath the skin, found at " + place);
        assertEquals(across[2], course.value(new Probe.Core(0), 0), 1e-12);
        assertEquals(0.5 * (across[0] + across[4]), course.value(new Probe.Surface(0), 0), 1e-12);
        assertEquals(
                course.value(new Probe.Mean(0), 0),
                chain.sketch().follow(3 * 3600).value(new Probe.Mean(0), 0),
                90 * 1e-4);
    }

    @Test
    void aCutThroughABrickShowsBackAndFront() {
        Grade brick = new Grade(
                List.of(Side.betweenFaces(6e-3, 0), new Side(Axis.SLAB, 4e-3, 1), new Side(Axis.SLAB, 5e-3, 2)),
                1e-3,
                1);
        Surface front = new Surface.Film(2e-6);
        Stage soak = new Stage(
                8e-10, 1, new Surface.Faces(new Surface.Film(5e-8), front), new Surroundings.Vessel(2e-3, 0, 0, 0), 0);
        Course course =
                Chain.of(List.of(brick), new Start.Uniform(50), List.of(soak)).follow(7200);
        double[] across = {0, 0.3, 0.5, 1};
        double[][] cut = course.section(0, 0, 0, 2, across, new double[] {0, 1});
        double[] way = course.profile(0, 0, across);
        for (int i = 0; i < across.length; i++) {
            assertEquals(way[i], cut[0][i], 1e-10);
            assertTrue(cut[1][i] < cut[0][i], "less at the face beside");
        }
        // Along another side it runs through the middle of the first.
        assertEquals(way[2], course.section(0, 0, 1, 2, new double[] {0}, new double[] {0})[0][0], 1e-10);
        assertEquals(way[2], course.value(new Probe.Core(0), 0), 1e-10);
        assertTrue(way[0] > way[3] + 5, "back " + way[0] + ", front " + way[3]);
    }

    @Test
    void whatDoesNotGoTogetherIsRefused() {
        Surface film = new Surface.Film(1e-6);
        Surface.Faces faces = new Surface.Faces(film, new Surface.Open());
        refused(
                "two sealed faces are a sealed surface, found both sealed",
                () -> new Surface.Faces(SEALED, new Surface.Sealed()));
        refused("a face has one surface, found " + faces + " and " + film, () -> new Surface.Faces(faces, film));
        refused("only a slab has a back, found a SPHERE", () -> new Side(Axis.SPHERE, 1e-3, 0, Side.Reach.FROM_BACK));
        Stage stage = new Stage(1e-9, 1, faces, new Surroundings.Plenty(0), 0);
        List<Grade> lot = List.of(new Grade(Axis.SLAB, 4e-3, 1e-3));
        refused(
                "grade 0 has no side between two faces: one surface is wanted, found " + faces,
                () -> Chain.of(lot, new Start.Uniform(1), List.of(stage)));
    }

    private static void refused(String message, org.junit.jupiter.api.function.Executable what) {
        assertEquals(message, assertThrows(IllegalArgumentException.class, what).getMessage());
    }

    private static Surroundings.Vessel vessel(Timed timed) {
        return (Surroundings.Vessel) timed.stage().surroundings();
    }
}
