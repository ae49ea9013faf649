package org.soakwright.planner.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Planner;
import org.soakwright.planner.batch.Progress;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepTimes;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Recipe;

/** The names, the nesting and the meaning of the result, as the language states them. */
class ResultJsonTest {
    private static final Stamp STAMP = new Stamp("0.1.0", "00ff");

    private static final String RECIPE = """
            language: 1
            title: One water
            product: [food]
            lot:
              mass: 100 kg
              density: 1000 kg/m3
              pieces:
                - {name: thin, shape: slab, thickness: 10 mm, share: 40 %}
                - {name: thick, shape: slab, thickness: 16 mm, share: 60 %}
            species:
              salt: {start: 100 g/kg, diffusivity: 1e-9 m2/s, partition: 0.8}
            steps:
              - soak: first water
                liquor: {volume: 200 L, salt: 1 g/L}
                temperature: 4 Cel
                film: {coefficient: 2e-6 m/s}
                time: {from: 1 h, to: 12 h, grain: 30 min, planned: 5 h}
              - rest: cold room
                temperature: 4 Cel
                time: 1 h
            targets:
              - {species: salt, reading: mean, at-most: LIMIT}
              - {species: salt, reading: highest, at-least: 1 %, of: start, grade: thick, after: first water}
              - {liquor: first water, species: salt, reading: end, at-most: 90 g/L}
              - {total: time, at-most: 20 h}
            prices: {time: 40 EUR/h, liquor: 3 EUR/m3}
            """;

    /** The same with pieces that differ, of which most must reach the limit. */
    private static Run differing() {
        String text = RECIPE.replace("    - {name: thin", "    - {name: thin")
                .replace("species:\n  salt", "  spread: 6 %\nspecies:\n  salt")
                .replace("at-most: LIMIT}", "at-most: 70 g/kg, share: 95 %}");
        Recipe recipe = ((Outcome.Accepted) Recipes.read("recipe.yaml", text)).recipe();
        return new Batch(recipe).follow(StepTimes.definite(recipe));
    }

    private static Recipe recipe(String limit) {
        return ((Outcome.Accepted) Recipes.read("recipe.yaml", RECIPE.replace("LIMIT", limit))).recipe();
    }

    private static Map<String, @Nullable Object> followed() throws IOException {
        Recipe recipe = recipe("60 g/kg");
        return Json.object(ResultJson.of(STAMP, new Batch(recipe).follow(StepTimes.definite(recipe))));
    }

    private static Map<String, @Nullable Object> planned(String limit) throws IOException {
        Plan plan = Planner.plan(recipe(limit), Progress.NONE);
        return Json.object(ResultJson.of(STAMP, plan));
    }

    @Test
    void theResultHasTheNamesOfTheLanguageInTheirOrder() throws IOException {
        List<String> names = List.of(
                "soakwright",
                "title",
                "inputs-sha256",
                "met",
                "steps",
                "targets",
                "totals",
                "proof",
                "binds",
                "per-hour",
                "nearest-miss",
                "remedies",
                "cautions",
                "stops");
        assertEquals(names, Json.names(followed()));
        assertEquals(names, Json.names(planned("60 g/kg")));
    }

    @Test
    void aStepTellsItsLiquorItsLotAndItsPieces() throws IOException {
        Object step = Json.at(followed(), "steps", 0);
        assertEquals(List.of("name", "kind", "seconds", "liquor", "species", "pieces"), Json.names(step));
        assertEquals("first water", Json.at(step, "name"));
        assertEquals("soak", Json.at(step, "kind"));
        assertEquals(18000.0, Json.number(step, "seconds"));
        assertEquals(List.of("start", "end", "unit"), Json.names(step, "liquor", "salt"));
        assertEquals(1.0, Json.number(step, "liquor", "salt", "start"), 1e-12);
        assertEquals(List.of("mean", "unit"), Json.names(step, "species", "salt"));
        assertEquals("thick", Json.at(step, "pieces", 1, "name"));
        assertEquals(
                List.of("mean", "core", "surface", "highest", "lowest", "range", "error", "unit"),
                Json.names(step, "pieces", 1, "species", "salt"));
        assertEquals(List.of(), Json.names(followed(), "steps", 1, "liquor"));
    }

    @Test
    void piecesThatDifferTellWhatSharesOfThemRead() throws IOException {
        Run run = differing();
        Object salt = Json.at(Json.object(ResultJson.of(STAMP, run)), "steps", 1, "pieces", 1, "species", "salt");
        assertEquals(
                List.of("mean", "core", "surface", "highest", "lowest", "range", "distribution", "error", "unit"),
                Json.names(salt));
        assertEquals(
                List.of("mean", "core", "surface", "highest", "lowest", "range"), Json.names(salt, "distribution"));
        assertEquals(
                List.of("1", "5", "10", "25", "50", "75", "90", "95", "99"), Json.names(salt, "distribution", "mean"));
        double before = 0;
        for (String share : Json.names(salt, "distribution", "mean")) {
            double value = Json.number(salt, "distribution", "mean", share);
            assertTrue(value > before, share + " % read at most " + value);
            before = value;
        }
        Map<String, @Nullable Object> result = Json.object(ResultJson.of(STAMP, run));
        assertEquals(
                List.of("species", "reading", "grade", "share", "at-most", "value", "unit", "met"),
                Json.names(result, "targets", 0));
        assertEquals(0.95, Json.number(result, "targets", 0, "share"));
        assertEquals(Json.number(salt, "distribution", "mean", "95"), Json.number(result, "targets", 0, "value"), 1e-9);
    }

    /** 100 kg at 100 g/kg and 200 L at 1 g/L: 10.2 kg of salt, wherever they are. */
    @Test
    void theSaltOfPiecesAndLiquorTogetherStaysTheSame() throws IOException {
        Object step = Json.at(followed(), "steps", 0);
        double inPieces = 100 * Json.number(step, "species", "salt", "mean") / 1000;
        double inLiquor = 200 * Json.number(step, "liquor", "salt", "end") / 1000;
        assertEquals(10.2, inPieces + inLiquor, 1e-9);
    }

    @Test
    void theLotsMeanIsThatOfItsGradesByMass() throws IOException {
        Object step = Json.at(followed(), "steps", 1);
        double thin = Json.number(step, "pieces", 0, "species", "salt", "mean");
        double thick = Json.number(step, "pieces", 1, "species", "salt", "mean");
        assertEquals(0.4 * thin + 0.6 * thick, Json.number(step, "species", "salt", "mean"), 1e-9);
    }

    @Test
    void targetsStandInTheirOwnUnits() throws IOException {
        Map<String, @Nullable Object> result = followed();
        assertEquals(
                List.of("species", "reading", "grade", "at-most", "value", "unit", "met"),
                Json.names(result, "targets", 0));
        assertEquals("thick", Json.at(result, "targets", 0, "grade"));
        assertEquals(60.0, Json.number(result, "targets", 0, "at-most"));
        assertEquals(
                Json.number(result, "steps", 1, "pieces", 1, "species", "salt", "mean"),
                Json.number(result, "targets", 0, "value"),
                1e-9);

        assertEquals(
                List.of("species", "reading", "grade", "after", "at-least", "of", "value", "unit", "met"),
                Json.names(result, "targets", 1));
        assertEquals("start", Json.at(result, "targets", 1, "of"));
        assertEquals("%", Json.at(result, "targets", 1, "unit"));
        // The start is 100 g/kg, so that per cent of it and g/kg are one number.
        assertEquals(
                Json.number(result, "steps", 0, "pieces", 1, "species", "salt", "highest"),
                Json.number(result, "targets", 1, "value"),
                1e-9);

        assertEquals(
                List.of("liquor", "species", "reading", "at-most", "value", "unit", "met"),
                Json.names(result, "targets", 2));
        assertEquals("g/L", Json.at(result, "targets", 2, "unit"));
        assertEquals(List.of("total", "at-most", "value", "unit", "met"), Json.names(result, "targets", 3));
        assertEquals(6.0, Json.number(result, "targets", 3, "value"), 1e-12);
    }

    /** 6 h at 40 EUR/h and 0.2 m3 at 3 EUR/m3. */
    @Test
    void totalsAreSecondsLitresAndMoney() throws IOException {
        Object totals = Json.at(followed(), "totals");
        assertEquals(List.of("seconds", "liquor-litres", "cost", "currency"), Json.names(totals));
        assertEquals(21600.0, Json.number(totals, "seconds"));
        assertEquals(200.0, Json.number(totals, "liquor-litres"), 1e-9);
        assertEquals(240.6, Json.number(totals, "cost"), 1e-9);
        assertEquals("EUR", Json.at(totals, "currency"));
    }

    @Test
    void whatCannotBeCountedIsNull() throws IOException {
        String free = RECIPE.replace("volume: 200 L", "volume: unlimited")
                .replace("LIMIT", "60 g/kg")
                .replace("prices: {time: 40 EUR/h, liquor: 3 EUR/m3}", "");
        Recipe recipe = ((Outcome.Accepted) Recipes.read("recipe.yaml", free)).recipe();
        Object totals = Json.at(
                Json.object(ResultJson.of(STAMP, new Batch(recipe).follow(StepTimes.definite(recipe)))), "totals");
        assertNull(Json.at(totals, "liquor-litres"));
        assertNull(Json.at(totals, "cost"));
        assertNull(Json.at(totals, "currency"));
    }

    @Test
    void aRecipeFollowedClaimsNothing() throws IOException {
        Map<String, @Nullable Object> result = followed();
        assertNull(Json.at(result, "proof"));
        assertNull(Json.at(result, "nearest-miss"));
        assertEquals(List.of(), Json.at(result, "binds"));
        assertEquals(List.of(), Json.at(result, "per-hour"));
        assertEquals(List.of(), Json.at(result, "remedies"));
    }

    @Test
    void aPlanSaysWhatItClaimsAndWhatBinds() throws IOException {
        Map<String, @Nullable Object> result = planned("60 g/kg");
        assertEquals(true, Json.at(result, "met"));
        assertEquals(List.of("claim", "starts", "agreed", "bound-seconds", "evaluations"), Json.names(result, "proof"));
        assertTrue(List.of("global", "local", "exhaustive").contains(Json.at(result, "proof", "claim")));
        assertEquals(List.of("salt mean, thick"), Json.at(result, "binds"));
        assertEquals(List.of("step", "reading", "change", "unit"), Json.names(result, "per-hour", 0));
        assertEquals("first water", Json.at(result, "per-hour", 0, "step"));
        assertTrue(Json.number(result, "per-hour", 0, "change") < 0, "longer leaves less");
        assertNull(Json.at(result, "nearest-miss"));
    }

    @Test
    void aPlanOutOfReachNamesItsNearestMiss() throws IOException {
        Map<String, @Nullable Object> result = planned("1 g/kg");
        assertEquals(false, Json.at(result, "met"));
        assertEquals(List.of("target", "grade", "value", "limit", "by", "unit"), Json.names(result, "nearest-miss"));
        assertEquals(1.0, Json.number(result, "nearest-miss", "limit"));
        assertEquals(Json.number(result, "nearest-miss", "value") - 1, Json.number(result, "nearest-miss", "by"), 1e-9);
        assertTrue(Json.number(result, "nearest-miss", "by") > 0);
    }

    /** What is not known exactly: chances, percentiles and shares, with the names of the language; nothing of it where all is known. */
    @Test
    void whatIsNotKnownExactlyIsTold() throws IOException {
        String text = RECIPE.replace("diffusivity: 1e-9 m2/s", "diffusivity: {value: 1e-9 m2/s, give-or-take: 20 %}")
                .replace("at-most: LIMIT}", "at-most: 60 g/kg, confidence: 90 %}");
        Recipe recipe = ((Outcome.Accepted) Recipes.read("recipe.yaml", text)).recipe();
        Run run = new Batch(recipe).follow(StepTimes.definite(recipe)).judged(Progress.NONE);
        Map<String, @Nullable Object> result = Json.object(ResultJson.of(STAMP, run));
        assertEquals(List.of("value", "low", "high", "samples", "refused"), Json.names(result, "chance"));
        assertEquals("diffusivity of salt", Json.at(result, "uncertain", 0, "name"));
        assertEquals(List.of("target", "share", "remaining"), Json.names(result, "uncertain", 0, "shares", 0));
        assertEquals(0.9, Json.number(result, "targets", 0, "confidence"));
        assertEquals(List.of("5", "50", "95"), Json.names(result, "targets", 0, "percentiles"));
        double value = Json.number(result, "targets", 0, "value");
        assertTrue(Json.number(result, "targets", 0, "percentiles", "50") < value);
        assertTrue(value < Json.number(result, "targets", 0, "percentiles", "95"));
        assertEquals(List.of("value", "low", "high", "samples"), Json.names(result, "targets", 1, "chance"));
        assertTrue(Json.number(result, "targets", 0, "chance", "value") >= Json.number(result, "chance", "value"));
        assertFalse(followed().containsKey("chance") || followed().containsKey("uncertain"));
    }

    private static final List<String> COUNTED = List.of(
            "{species: salt, reading: mean, at-least: 3.5 %, phase: water, grade: thick, confidence: 80 %}",
            "{species: salt, reading: mean, at-most: 70 g/kg, per: present}",
            "{species: salt, reading: mean, at-most: 900 g/kg, per: dry}",
            "{total: mass, at-least: 90 %, of: start, after: first water}",
            "{total: mass, at-most: 120 kg}");

    /** Targets that are not counted as loaded, and what the lot weighs; nothing of it where the recipe does not say. */
    @Test
    void whatTheLotWeighsAndWhatContentsCountAgainstIsTold() throws IOException {
        String head = RECIPE.substring(0, RECIPE.indexOf("targets:"))
                .replace("density: 1000 kg/m3", "density: 1000 kg/m3\n  moisture: {start: 60 %, end: 65 %}")
                .replace("product: [food]", "product: [food]\nallowed-by: the head of quality");
        Recipe recipe = ((Outcome.Accepted)
                        Recipes.read("recipe.yaml", head + "targets:\n  - " + String.join("\n  - ", COUNTED) + "\n"))
                .recipe();
        Run run = new Batch(recipe).follow(StepTimes.definite(recipe));
        Map<String, @Nullable Object> result = Json.object(ResultJson.of(STAMP, run));
        assertEquals("the head of quality", Json.at(result, "allowed-by"));
        assertEquals(List.of("value", "of-start", "unit"), Json.names(result, "steps", 1, "mass"));
        // What is neither salt nor water stays: 0.4 of the mass as loaded, less the salt lost, is 0.35 of the mass at
        // the end.
        double lost = (100 - Json.number(result, "steps", 1, "species", "salt", "mean")) / 1000;
        double mass = (0.4 - lost) / 0.35;
        assertEquals(mass, Json.number(result, "steps", 1, "mass", "of-start"), 1e-9);
        assertEquals(100 * mass, Json.number(result, "steps", 1, "mass", "value"), 1e-7);
        assertEquals("kg", Json.at(result, "steps", 1, "mass", "unit"));
        assertEquals("water", Json.at(result, "targets", 0, "phase"));
        assertEquals(0.8, Json.number(result, "targets", 0, "confidence"));
        assertEquals("present", Json.at(result, "targets", 1, "per"));
        assertEquals("dry", Json.at(result, "targets", 2, "per"));
        assertEquals(
                List.of("total", "after", "at-least", "of", "value", "unit", "met"), Json.names(result, "targets", 3));
        assertEquals(
                100 * Json.number(result, "steps", 0, "mass", "of-start"),
                Json.number(result, "targets", 3, "value"),
                1e-7);
        assertEquals("%", Json.at(result, "targets", 3, "unit"));
        assertEquals(List.of("total", "at-most", "value", "unit", "met"), Json.names(result, "targets", 4));
        assertEquals("mass", Json.at(result, "targets", 4, "total"));
        assertEquals(100 * mass, Json.number(result, "targets", 4, "value"), 1e-7);
        assertFalse(Json.names(followed(), "steps", 0).contains("mass"));
        assertFalse(followed().containsKey("allowed-by"));
        assertFalse(Json.names(followed(), "targets", 0).contains("per"));
    }
}
