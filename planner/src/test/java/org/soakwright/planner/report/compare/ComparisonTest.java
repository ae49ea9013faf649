package org.soakwright.planner.report.compare;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepTimes;
import org.soakwright.planner.report.ResultJson;
import org.soakwright.planner.report.Stamp;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Unsound;

class ComparisonTest {
    private static final String RECIPE = """
            language: 1
            title: One water
            product: [other]
            lot:
              mass: 100 kg
              density: 1000 kg/m3
              pieces: [{name: loin, shape: slab, thickness: 10 mm}]
            species:
              salt: {start: START, diffusivity: 1e-9 m2/s, partition: 0.8}
            steps:
              - soak: first water
                liquor: {volume: 200 L, salt: 1 g/L}
                temperature: 4 Cel
                film: {coefficient: 2e-6 m/s}
                time: TIME
            targets:
              - {species: salt, reading: core, at-most: 60 g/kg}
            prices: {time: 40 CUR/h}
            """;

    /** Pieces that differ, of which a share must keep the limit. */
    private static Side differing(String share) {
        String text = RECIPE.replace("START", "100 g/kg")
                .replace("TIME", "5 h")
                .replace("CUR", "EUR")
                .replace("species:\n  salt", "  spread: 6 %\nspecies:\n  salt")
                .replace("at-most: 60 g/kg", "at-most: 60 g/kg, share: " + share);
        Recipe recipe = ((Outcome.Accepted) Recipes.read("recipe.yaml", text)).recipe();
        return side(new Batch(recipe).follow(StepTimes.definite(recipe)));
    }

    private static Run run(String start, String time, String currency) {
        String text = RECIPE.replace("START", start).replace("TIME", time).replace("CUR", currency);
        Recipe recipe = ((Outcome.Accepted) Recipes.read("recipe.yaml", text)).recipe();
        return new Batch(recipe).follow(StepTimes.definite(recipe));
    }

    private static String json(Run run) {
        return ResultJson.of(new Stamp("0.1.0", "00ff"), run);
    }

    private static Side side(Run run) {
        return Side.read("recipe.yaml", "followed as written", json(run));
    }

    @Test
    void aResultTellsWhatTheRunWas() {
        Run run = run("100 g/kg", "5 h", "EUR");
        Side side = side(run);
        assertEquals("One water", side.title());
        assertEquals(18000, side.seconds());
        assertEquals(OptionalDouble.of(200), side.cost(), "5 h at 40 EUR/h");
        Side.Step step = side.steps().get(0);
        assertEquals(
                run.end(0).liquor().get(0).end(),
                Objects.requireNonNull(step.liquors().get("salt")).value());
        assertEquals(
                run.end(0).pieces().get(0).species().get(0).value(Reading.CORE),
                Objects.requireNonNull(Objects.requireNonNull(
                                        step.pieces().get(0).species().get("salt"))
                                .get(Reading.CORE))
                        .value());
        assertEquals("salt core", side.targets().get(0).name());
        assertEquals("at most 60 g/kg", side.targets().get(0).limit());
    }

    @Test
    void aBatchDoesNotDifferFromItself() {
        Side side = side(run("100 g/kg", "5 h", "EUR"));
        Comparison comparison = Comparison.of(side, side);
        OptionalDouble none = OptionalDouble.of(0);
        assertEquals(none, comparison.seconds().difference());
        assertEquals(none, comparison.litres().difference());
        assertEquals(none, comparison.cost().difference());
        assertTrue(comparison.steps().stream()
                .allMatch(row -> row.seconds().difference().equals(none)));
        assertTrue(comparison.ends().stream()
                .allMatch(row -> row.content().difference().equals(none)));
        assertTrue(comparison.readings().stream()
                .allMatch(row -> row.content().difference().equals(none)));
        assertEquals(
                List.of("Against A, B takes the same time, needs the same amount of liquor and costs the same."),
                ComparisonFindings.of(comparison).answer().subList(0, 1));
    }

    @Test
    void targetsOnOtherSharesAreNotOneTarget() {
        Side most = differing("95 %");
        assertEquals("salt core in 95 %", most.targets().get(0).name());
        assertEquals(1, Comparison.of(most, differing("95 %")).targets().size());
        Comparison apart = Comparison.of(most, differing("90 %"));
        assertEquals(
                List.of("salt core in 95 %", "salt core in 90 %"),
                apart.targets().stream().map(Comparison.TargetRow::target).toList());
        assertEquals(
                2,
                Comparison.of(most, side(run("100 g/kg", "5 h", "EUR")))
                        .targets()
                        .size());
    }

    @Test
    void readingsAreTheMeanAndWhatTargetsLookAt() {
        Side side = side(run("100 g/kg", "5 h", "EUR"));
        assertEquals(
                List.of("lot mean", "loin mean", "loin core"),
                Comparison.of(side, side).readings().stream()
                        .map(row -> row.grade() + " " + row.reading())
                        .toList());
    }

    /** 100 g/kg are 10 %: the second is told in the unit of the first. */
    @Test
    void contentsOfOneKindAreToldInOneUnit() {
        Comparison comparison = Comparison.of(side(run("100 g/kg", "5 h", "EUR")), side(run("10 %", "5 h", "EUR")));
        Measure mean = comparison.readings().get(0).content();
        assertEquals("g/kg", mean.unit());
        assertEquals(0, mean.difference().orElseThrow(), 1e-9);
    }

    @Test
    void contentsByMassAndByVolumeAreNotSetAgainstEachOther() {
        Comparison comparison = Comparison.of(side(run("100 g/kg", "5 h", "EUR")), side(run("100 g/L", "5 h", "EUR")));
        assertTrue(comparison.readings().isEmpty());
    }

    @Test
    void twoCurrenciesHaveNoDifference() {
        Comparison comparison = Comparison.of(side(run("100 g/kg", "5 h", "EUR")), side(run("100 g/kg", "6 h", "NOK")));
        assertEquals(OptionalDouble.empty(), comparison.cost().difference());
        assertEquals(OptionalDouble.of(3600), comparison.seconds().difference());
        String text = ComparisonJson.of("0.1.0", comparison);
        assertTrue(text.contains("\"currency-b\" : \"NOK\""), text);
    }

    @Test
    void aTargetThatOnlyOneHasStandsAlone() {
        Side a = side(run("100 g/kg", "5 h", "EUR"));
        Side b = new Side(
                a.file(),
                a.how(),
                a.title(),
                a.sha256(),
                true,
                a.steps(),
                List.of(),
                a.seconds(),
                a.litres(),
                a.cost(),
                a.currency());
        Comparison.TargetRow row = Comparison.of(a, b).targets().get(0);
        assertTrue(row.a().isPresent());
        assertEquals(Optional.empty(), row.b());
        assertEquals(OptionalDouble.empty(), row.value().difference());
    }

    private static String refused(String json) {
        return assertThrows(Unsound.class, () -> Side.read("a.json", "a result", json))
                .problems()
                .get(0)
                .toString();
    }

    @Test
    void whatIsNoResultIsRefusedByItsPlace() {
        String json = json(run("100 g/kg", "5 h", "EUR"));
        assertEquals(
                "a.json: this is no result of follow or plan: \"totals.seconds\" is not as wanted, a number would be right",
                refused(json.replaceAll(
                        "\"seconds\" : 18000.0,\\s+\"liquor-litres\"", "\"seconds\":\"5 h\",\"liquor-litres\"")));
        assertEquals(
                "a.json: this is no result of follow or plan: \"steps\" is missing, a list would be right",
                refused("{\"soakwright\": \"0.1.0\", \"title\": \"x\"}"));
        assertTrue(refused(json.substring(0, json.length() / 2)).startsWith("a.json:"), "cut off");
        assertTrue(refused(json.substring(0, json.length() / 2)).contains("this is no whole JSON text"));
        assertTrue(refused(json + "{}").contains("found more after its end"));
        assertTrue(refused("[1]").contains("an object would be right"));
        assertTrue(refused(json.replaceFirst("\"kind\"", "\"name\"")).contains("this is no whole JSON text"), "twice");
    }

    private static Side counted(String target) {
        String text = RECIPE.replace("START", "100 g/kg")
                .replace("TIME", "5 h")
                .replace("CUR", "EUR")
                .replace("density: 1000 kg/m3", "density: 1000 kg/m3\n  moisture: {start: 60 %, end: 65 %}")
                .replace("{species: salt, reading: core, at-most: 60 g/kg}", target);
        Recipe recipe = ((Outcome.Accepted) Recipes.read("recipe.yaml", text)).recipe();
        return side(new Batch(recipe).follow(StepTimes.definite(recipe)));
    }

    @Test
    void aReadingIsComparedOnlyWithOneCountedAlike() {
        String dry = "{species: salt, reading: mean, at-most: 300 g/kg, per: dry}";
        String water = "{species: salt, reading: mean, at-most: 30 %, phase: water}";
        Comparison alike = Comparison.of(counted(dry), counted(dry));
        assertEquals(1, alike.targets().size());
        assertEquals("salt mean per dry mass", alike.targets().get(0).target());
        Comparison unlike = Comparison.of(counted(dry), counted(water));
        assertEquals(
                List.of("salt mean per dry mass", "salt mean in the water phase"),
                unlike.targets().stream().map(Comparison.TargetRow::target).toList());
    }

    @Test
    void theSameLimitAskedMoreSurelyIsAnother() {
        String target = "{species: salt, reading: mean, at-most: 30 %, phase: moisture, confidence: SURE}";
        Comparison comparison =
                Comparison.of(counted(target.replace("SURE", "80 %")), counted(target.replace("SURE", "90 %")));
        assertEquals(
                List.of("at most 30 %, 80 % sure", "at most 30 %, 90 % sure"),
                comparison.targets().stream().map(Comparison.TargetRow::limit).toList());
        assertEquals("salt mean per moisture", comparison.targets().get(0).target());
    }

    @Test
    void whatTheLotWeighsIsComparedWhereEitherKnows() {
        Side weighed = counted("{total: mass, at-most: 120 kg, after: first water}");
        assertEquals(
                "mass of the lot after first water", weighed.targets().get(0).name());
        Side not = side(run("100 g/kg", "5 h", "EUR"));
        Comparison.EndRow row = Comparison.of(weighed, not).ends().stream()
                .filter(end -> end.species().equals("mass"))
                .findFirst()
                .orElseThrow();
        assertEquals("kg", row.content().unit());
        assertEquals(weighed.targets().get(0).value(), row.content().a().orElseThrow(), 1e-9);
        assertTrue(row.content().b().isEmpty());
        assertTrue(Comparison.of(not, not).ends().stream()
                .noneMatch(end -> end.species().equals("mass")));
    }
}
