package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** What people may well write and nobody can compute: a problem at its place, never a number and never a failure inside. */
class PlausiblyWrongTest {
    private static final String LOT =
            "lot: {mass: 100 kg, density: 1000 kg/m3, pieces: [{name: a, shape: slab, thickness: 8 mm, share: 100 %}]}";
    private static final String SALT =
            "  salt: {start: 60 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8, substance: sodium chloride}";
    private static final String WATER =
            "  water: {start: 70 %, diffusivity: 1e-9 m2/s, partition: 1, exchanges-with: [air]}";
    private static final String REST = "  - {rest: wait, time: 1 h}";

    private static String said(String lot, String salt, String water, String step, String... targets) {
        String[] lines = new String[9 + targets.length];
        lines[0] = "language: 1";
        lines[1] = "title: Wrong";
        lines[2] = "product: [other]";
        lines[3] = lot;
        lines[4] = "species:";
        lines[5] = salt;
        lines[6] = water;
        lines[7] = "steps:\n" + step;
        lines[8] = targets.length == 0 ? "" : "targets:";
        System.arraycopy(targets, 0, lines, 9, targets.length);
        return Refused.said(lines);
    }

    private static void assertSays(String said, String place, String words) {
        assertTrue(said.startsWith("test.yaml:" + place) && said.contains(words), said);
    }

    private static String bath(String temperature) {
        return "  - {soak: bath, liquor: {ratio: 3 L/kg, salt: 0 g/L}, film: negligible, temperature: " + temperature
                + ", time: 6 h}";
    }

    @Test
    void lossesThatAddUpToMoreThanTheLot() {
        String steps = "  - {rest: drain, gain: -60 %, time: 1 h}\n  - {rest: press, gain: -60 %, time: 1 h}";
        String target = "  - {species: salt, reading: mean, at-most: 20 g/kg, per: present}";
        assertSays(said(LOT, SALT, "", steps, target), "10:25", "the gains so far leave nothing of the lot");
    }

    @Test
    void aLossOfMoreThanTheSaltLeavesRoomFor() {
        String target = "  - {species: salt, reading: mean, at-most: 20 g/kg, per: present}";
        assertSays(
                said(LOT, SALT, "", "  - {rest: drain, gain: -99 %, time: 1 h}", target),
                "11:5",
                "the mass at present is less than what the target finds in it: found 6 kg per kg");
    }

    @Test
    void piecesThatHoldMoreThanTheyWeigh() {
        String salty = SALT.replace("60 g/kg", "400 g/kg");
        assertSays(said(LOT, salty, WATER, REST), "7:18", "found 110.0 % of their mass together with water");
        String wet = LOT.replace("mass: 100 kg", "mass: 100 kg, moisture: {start: 96 %, end: 60 %}");
        assertSays(said(wet, SALT, "", REST), "6:17", "found 102.0 % of their mass together with salt");
    }

    @Test
    void aPhaseOfWaterThatIsGone() {
        String oven =
                "  - {dry: oven, air: {equilibrium: {water: 0 g/kg}}, film: negligible, temperature: 60 Cel, time: 1 h}";
        String surface = "  - {species: salt, reading: surface, at-most: 20 %, phase: moisture}";
        assertSays(said(LOT, SALT, WATER, oven, surface), "11:5", "the target counts against water");
        String highest = "  - {species: salt, reading: highest, at-most: 20 %, phase: moisture}";
        assertSays(said(LOT, SALT, WATER, oven, highest), "11:5", "the target counts against water");
        String none = SALT.replace("60 g/kg", "0 g/kg");
        String dry = WATER.replace("70 %", "0 %");
        String mean = "  - {species: salt, reading: mean, at-most: 20 %, phase: water}";
        assertSays(said(LOT, none, dry, REST, mean), "11:5", "the target counts against water");
    }

    @Test
    void dryMassOfPiecesThatAreAllWater() {
        String none = SALT.replace("60 g/kg", "0 g/kg");
        String target = "  - {species: salt, reading: mean, at-most: 20 g/kg, per: dry}";
        assertSays(said(LOT, none, WATER.replace("70 %", "100 %"), REST, target), "11:5", "against the dry mass");
    }

    @Test
    void extremesOfAPhaseWherePiecesDifferInOneOfThem() {
        String varied = SALT.replace("60 g/kg", "{value: 60 g/kg, varies: 10 %}");
        String target = "  - {species: salt, reading: highest, at-most: 20 %, phase: water}";
        assertSays(said(LOT, varied, WATER, bath("20 Cel"), target), "11:5", "remove varies");
    }

    @Test
    void pointsThatLeadNowhere() {
        String steep = SALT.replace("8e-10 m2/s", "{points: [[5 Cel, 8e-10 m2/s], [5.01 Cel, 9e-10 m2/s]]}");
        assertSays(said(LOT, steep, "", bath("90 Cel")), "9:", "found \"90 Cel\"; diffusivity must be");
    }

    /** The temperature that is out of range is the step's, so that is where it is said. */
    @Test
    void aStepHotterThanWaterIsKnown() {
        String viscous = SALT.replace("8e-10 m2/s", "{value: 8e-10 m2/s, at: 20 Cel, scaling: viscosity}");
        assertSays(said(LOT, viscous, "", bath("200 Cel")), "9:", "no property is known there: found \"200 Cel\"");
        String stated = SALT.replace("8e-10 m2/s", "{value: 8e-10 m2/s, at: 200 Cel, scaling: viscosity}");
        assertSays(said(LOT, stated, "", bath("20 Cel")), "6:", "no property is known there: found \"200 Cel\"");
    }

    @Test
    void aContentPerDryMassWhereNobodySaysHowWetThePiecesAre() {
        String dry = SALT.replace("60 g/kg", "{value: 60 g/kg, per: dry}");
        String profiled = WATER.replace("70 %", "{profile: [[0, 70 %], [1, 60 %]]}");
        assertSays(said(LOT, dry, profiled, REST), "6:", "declare the species water with one start");
    }
}
