package org.soakwright.planner.report.paper;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Planner;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepTimes;
import org.soakwright.planner.report.Stamp;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Recipe;

/** Batches to be put on paper; plants and numbers are invented. */
final class Batches {
    static final Stamp STAMP = new Stamp("0.1.0", "0123456789abcdef".repeat(4));
    static final LocalDateTime START = LocalDateTime.parse("2026-02-27T18:00");

    static final String DESALTING = """
            language: 1
            title: Desalting of loins
            product: [food]
            lot:
              mass: 600 kg
              density: 1120 kg/m3
              pieces:
                - {name: thin, shape: slab, thickness: 18 mm, share: 40 %}
                - {name: thick, shape: slab, thickness: 26 mm, share: 60 %}
            species:
              salt:
                start: 190 g/kg
                diffusivity: {value: 8e-10 m2/s, at: 5 Cel, activation-energy: 22 kJ/mol}
                partition: 0.8
            between: 20 min
            steps:
              - soak: first water
                liquor: {ratio: 2 L/kg, salt: 0 g/L}
                temperature: 4 Cel
                film: {coefficient: 2e-6 m/s}
                drag-out: 0.05 L/kg
                time: {from: 4 h, to: 36 h, grain: 15 min, planned: 18 h}
              - soak: second water
                liquor: {ratio: 2 L/kg, salt: 0 g/L}
                temperature: 4 Cel
                film: {coefficient: 2e-6 m/s}
                time: {from: 4 h, to: 36 h, grain: 15 min, planned: 18 h}
            targets:
              - {species: salt, reading: mean, at-most: 55 g/kg}
              - {species: salt, reading: highest, at-most: 90 g/kg, grade: thick}
            minimise: time
            """;

    static final String BRINING = """
            language: 1
            title: Brining of cords
            product: [food, other]
            lot:
              mass: 250 kg
              density: 1000 kg/m3
              pieces:
                - {name: cord, shape: cylinder, diameter: 10 mm}
            species:
              salt:
                start: 2 g/kg
                diffusivity: 3e-10 m2/s
                partition: 0.55
            steps:
              - soak: brine tank
                liquor: {volume: 1500 L, salt: 180 g/L}
                temperature: 12 Cel
                film: {coefficient: 3e-6 m/s}
                drag-out: 0.04 L/kg
                time: 30 min
              - rinse: three fills
                liquor: {volume: 100 L, salt: 5 g/L}
                fills: 3
                temperature: 12 Cel
                film: {coefficient: 3e-6 m/s}
                time: 45 min
              - rinse: overflow
                liquor: {volume: 80 L, flow: 2 L/min, salt: 5 g/L}
                temperature: 12 Cel
                film: {coefficient: 3e-6 m/s}
                time: 10 min
              - rest: room
                temperature: 10 Cel
                time: 12 h
            targets:
              - {species: salt, reading: core, at-least: 1 g/kg}
              - {species: salt, reading: range, at-most: 60 g/kg}
              - {liquor: brine tank, species: salt, reading: end, at-least: 10 g/L}
              - {total: time, at-most: 48 h}
            minimise: time
            """;

    static final String ROUNDS = """
            language: 1
            title: Brining of blocks and rounds
            product: [food]
            lot:
              mass: 300 kg
              density: 1080 kg/m3
              pieces:
                - {name: block, shape: brick, thickness: 40 mm, width: 60 mm, length: 90 mm, faces: {thickness: one}, share: 40 %}
                - {name: round, shape: short-cylinder, diameter: 90 mm, length: 110 mm, share: 60 %}
              spread: 6 %
            species:
              salt: {start: 2 g/kg, diffusivity: 3e-10 m2/s, partition: 0.45}
            steps:
              - soak: brine
                liquor: {volume: unlimited, salt: 220 g/L}
                temperature: 4 Cel
                film: {coefficient: 2e-6 m/s}
                time: 30 h
              - rest: cold room
                temperature: 4 Cel
                time: 20 d
            targets:
              - {species: salt, reading: mean, at-least: 10 g/kg, share: 90 %}
              - {species: salt, reading: core, at-least: 3 g/kg, grade: block}
              - {species: salt, reading: lowest, at-least: 3 g/kg, grade: round}
              - {species: salt, reading: mean, at-least: 10 g/kg, grade: lot, share: 80 %}
            minimise: time
            """;

    private Batches() {}

    static Recipe recipe(String text) {
        Outcome outcome = Recipes.read("test.yaml", text);
        if (outcome instanceof Outcome.Refused refused) {
            throw new AssertionError(refused.problems() + "\n" + text);
        }
        return ((Outcome.Accepted) outcome).recipe();
    }

    static Run followed(String text) {
        Recipe recipe = recipe(text);
        return new Batch(recipe).follow(StepTimes.definite(recipe));
    }

    static Plan planned(String text) {
        return Planner.plan(recipe(text), (doing, done) -> {});
    }

    static Sheet sheet(Run run, Optional<LocalDateTime> start) {
        return new Draft(run, List.of(), STAMP, new Clock(start)).sheet();
    }

    static byte[] pdf(Sheet sheet) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        PdfSheet.write(sheet, out);
        return out.toByteArray();
    }

    /** More of everything than fits a page, and names of every kind. */
    static String large(int steps) {
        StringBuilder text = new StringBuilder("""
                language: 1
                title: "Washing & <salting> of an extraordinarily long list of pieces, Промывка кусков, 洗浄, Bäume, to see what happens"
                product: [food, flammable, corrosive]
                lot:
                  mass: 600 kg
                  density: 1120 kg/m3
                  pieces:
                    - {name: thin, shape: slab, thickness: 8 mm, share: 10 %}
                    - {name: thickandneverbrokenbyanyspaceatallinitswholelength, shape: slab, thickness: 12 mm, share: 20 %}
                    - {name: "<b>round</b> & sound", shape: sphere, diameter: 12 mm, share: 30 %}
                    - {name: ж 丸, shape: cylinder, diameter: 14 mm, share: 40 %}
                species:
                  salt: {start: 190 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8}
                between: 10 min
                steps:
                """);
        for (int i = 1; i <= steps; i++) {
            text.append("  - {soak: \"bath ")
                    .append(i)
                    .append(" of a plant with names as long as the hall that it stands in, ")
                    .append("and then some more words\", liquor: {ratio: 1 L/kg, salt: 0 g/L}, temperature: 4 Cel, ")
                    .append("film: {coefficient: 2e-6 m/s}, time: 5 h}\n");
        }
        return text.append("targets:\n  - {species: salt, reading: mean, at-most: 25 g/kg}\nminimise: time\n")
                .toString();
    }
}
