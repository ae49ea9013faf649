package org.soakwright.planner.report.picture;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Objects;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Section;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.report.Way;
import org.soakwright.recipes.model.Reading;

/** Pieces with a skin on one of two faces, and targets that are not counted as loaded. */
class SkinnedTest {
    private static final History HISTORY = Batches.history(Batches.skinned());

    @Test
    void theWayRunsFromTheSkinThroughTheCoreToTheBareFace() {
        for (int j = 0; j < 2; j++) {
            Way way = HISTORY.way(0, j);
            assertTrue(way.fromSkin());
            assertEquals(List.of(24.0, 30.0).get(j), way.millimetres(), 1e-9);
            double[] profile = HISTORY.profileAtEnd(0, j, 0);
            assertTrue(profile[0] < 0.7 * Way.bare(profile), "a skin holds the salt back");
            assertTrue(way.core(profile) < profile[0], "it comes from both faces");
        }
    }

    @Test
    void coreAndSurfaceAreReadWhereTheTablesReadThem() {
        for (StepEnd end : HISTORY.ends()) {
            int at = HISTORY.momentAt(end.to());
            for (int j = 0; j < 2; j++) {
                StepEnd.Content content = end.pieces().get(j).species().get(0);
                for (Reading reading : List.of(Reading.MEAN, Reading.CORE, Reading.SURFACE)) {
                    if (j == 1 && reading == Reading.SURFACE) {
                        // Of a block the tables mean all faces, a profile only the two that it runs between.
                        continue;
                    }
                    assertEquals(
                            content.value(reading),
                            HISTORY.readings(0, j, reading)[at],
                            1e-4 * content.value(Reading.HIGHEST),
                            end.step().name() + " " + reading);
                }
            }
        }
    }

    @Test
    void aStartStatedFromTheMiddleGoesBothWays() {
        Loaded loaded = new Loaded(Batches.read("profile", """
                        language: 1
                        title: A skinned slab
                        product: [other]
                        lot:
                          mass: 3 kg
                          density: 1000 kg/m3
                          pieces: [{name: slab, shape: slab, thickness: 10 mm}]
                        species:
                          salt:
                            start: {profile: [[0, 10 g/kg], [1, 130 g/kg]]}
                            diffusivity: 1e-9 m2/s
                            partition: 1
                            skin: {permeance: 1e-8 m/s, face: one}
                        steps:
                          - rest: night
                            time: 8 h
                        targets: []
                        minimise: time
                        """), 0);
        double[] profile = loaded.profile(new Way(HISTORY.grades().get(0), true), new double[] {0, 0.25, 0.5, 0.75, 1});
        assertArrayEquals(new double[] {130, 70, 10, 70, 130}, profile, 1e-10);
    }

    @Test
    void onlyLimitsCountedAsLoadedAreDrawnAcrossContents() {
        for (int j = 0; j < 2; j++) {
            assertEquals(
                    List.of("mean ≥ 20 g/kg, 90 % sure"),
                    Bound.of(HISTORY, 0, j).stream().map(Bound::text).toList());
        }
    }

    /** 5 g/kg of salt as loaded, 740 g/kg of water: by hand. */
    @Test
    void whatWasLoadedIsCountedAsTheTargetCounts() {
        assertEquals(5, asLoaded("salt mean,"), 1e-9);
        assertEquals(100 * 5 / 745.0, asLoaded("salt mean in the water phase,"), 1e-9);
        assertEquals(100 * 5 / 740.0, asLoaded("salt lowest per moisture,"), 1e-9);
        assertEquals(5, asLoaded("salt surface per present mass after brine,"), 1e-9);
        assertEquals(5 / 0.26, asLoaded("salt core per dry mass,"), 1e-9);
        assertEquals(100, asLoaded("mass of the lot,"), 1e-9);
        assertEquals(120, asLoaded("mass of the lot after brine,"), 1e-9);
    }

    /** Of the side, as its name begins without how surely it is to be met. */
    private static double asLoaded(String name) {
        TargetState state = HISTORY.targets().stream()
                .filter(one -> (one.name().replaceAll(" with .* confidence", "") + ",").startsWith(name))
                .findFirst()
                .orElseThrow();
        return AsLoaded.read(HISTORY, state).orElseThrow();
    }

    @Test
    void everyCourseBeginsAsLoadedAndPassesWhatItsTargetReads() {
        List<Watched> all = Watched.of(HISTORY, List.of());
        assertEquals(8, all.size());
        assertEquals("salt mean in the water phase", all.get(1).name());
        assertEquals("at least 3.5, 90 % sure", all.get(1).limits().get(0).text());
        assertEquals("mass of the lot", all.get(6).name());
        assertEquals(
                List.of("lot"),
                all.get(6).courses().stream().map(Watched.Course::label).toList());
        for (Watched watched : all) {
            for (Watched.Course course : watched.courses()) {
                Watched.Piece line = course.pieces().get(0);
                assertEquals(0, line.clocks()[0]);
                int i = 0;
                while (i < line.clocks().length - 1 && line.clocks()[i] < course.readAt() - 1e-6) {
                    i++;
                }
                assertEquals(course.value(), line.values()[i], 1e-3 * History.highest(line.values()), course.name());
            }
        }
    }

    /** The mass as loaded, kept by what is neither salt nor water: (1 - 0.74 + salt gained)/(1 - 0.71) at the end. */
    @Test
    void theCourseOfTheMassIsThatOfItsDryMatter() {
        double gained = (HISTORY.lotMeans(0)[HISTORY.clocks().length - 1] - 5) / 1000;
        double kg = 120 * (0.26 + gained) / 0.29;
        assertEquals(kg, HISTORY.ends().get(1).massKg().orElseThrow(), 1e-4 * kg);
        assertEquals(OptionalDouble.empty(), Batches.crowded().end(0).massKg());
    }

    @Test
    void aCutIsNotMirroredBetweenUnlikeFaces() {
        Section section = Section.of(HISTORY.run(), CrossSection.POINTS).get(0);
        CutFace cut = new CutFace(section);
        assertEquals(CutFace.From.SKIN, cut.below());
        assertFalse(cut.isUnlikeLeft());
        assertEquals(0.5, cut.coreDown());
        Section.End brined = cut.ends().get(0);
        double[][] whole = cut.whole(brined);
        assertEquals(CrossSection.POINTS, whole[0].length);
        double[] middle = whole[whole.length / 2];
        assertTrue(middle[0] > 1.4 * middle[middle.length - 1], "bare above, the skin at the foot");
        assertEquals(cut.core(brined), middle[middle.length / 2], 1e-12);
        assertEquals(cut.middleOfFace(brined, false), middle[0], 1e-12);
        assertEquals(whole[0][0], whole[whole.length - 1][0], "mirrored along the other side");
        StepEnd.Content content =
                HISTORY.ends().get(0).pieces().get(1).species().get(0);
        assertEquals(content.value(Reading.CORE), cut.core(brined), 1e-6 * cut.corner(brined) + 2 * content.error());
    }

    @Test
    void picturesSayWhichFaceIsWhich() throws Exception {
        List<Picture> pictures = Objects.requireNonNull(Batches.all().get("skinned"));
        Picture map = pictures.get(0);
        assertEquals("map-side-salt", map.id());
        assertTrue(map.altText().contains("down the depth from the bare face to the face with skin at 24.00 mm"));
        assertTrue(map.caption().contains("the middle goes from 5.000 to"), map.caption());
        List<String> cut = new Drawn(pictures.get(2).svg(Theme.LIGHT))
                .lines().stream().map(Drawn.Line::text).toList();
        assertTrue(cut.contains("face with skin"), cut.toString());
    }
}
