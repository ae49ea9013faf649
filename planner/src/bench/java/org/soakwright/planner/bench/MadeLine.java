package org.soakwright.planner.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.SplittableRandom;

/**
 * Writes an invented line of so many lots: three recipes of four steps each, six tanks, three troughs of running water and a cold room, two
 * shifts and one hoist. Dues are spread over the time that the tanks need for all lots, so that some are hard to keep.
 */
final class MadeLine {
    private static final DateTimeFormatter MINUTES = DateTimeFormatter.ofPattern("yyyy-MM-dd'T'HH:mm");
    private static final LocalDateTime STARTS = LocalDateTime.of(2026, 4, 6, 6, 0);

    /** Hours that a lot keeps one of the six tanks busy, all steps together and shared by six. */
    private static final double HOURS_A_LOT = 2.9;

    private static final String HEAD = """
            language: 1
            title: TITLE
            product: [food]
            lot:
              mass: 600 kg
              density: 1120 kg/m3
              pieces:
                - {name: slab, shape: slab, thickness: THICKNESS}
            species:
              salt:
                start: 160 g/kg
                diffusivity: 9e-10 m2/s
                partition: 0.8
            between: 20 min
            steps:
            """;

    private static final String SOAK = """
              - soak: NAME
                liquor: {ratio: 2 L/kg, salt: 0 g/L}
                temperature: 4 Cel
                film: {coefficient: 2e-6 m/s}
                drag-out: 0.05 L/kg
                time: {from: 90 min, to: 7 h, grain: 5 min, planned: 4 h}
            """;

    private static final String RINSE = """
              - rinse: NAME
                liquor: {volume: unlimited, salt: 0 g/L}
                temperature: 4 Cel
                film: {coefficient: 4e-6 m/s}
                time: {from: 30 min, to: 4 h, grain: 5 min, planned: 2 h}
            """;

    private static final String REST = """
              - rest: NAME
                temperature: 2 Cel
                time: {from: 2 h, to: 48 h, grain: 5 min, planned: 4 h}
            """;

    private static final String LINE = """
            title: Made line
            starts: 2026-04-06T06:00
            zone: Europe/Oslo
            vessels:
              tank:
                count: 6
                serves: [soak]
                volume: {gross: 2600 L, usable: 90 %}
                turnaround: 30 min
              trough:
                count: 3
                serves: [rinse]
                volume: {gross: 2200 L, usable: 90 %}
                turnaround: 15 min
              cold-room:
                count: 1
                serves: [rest]
                capacity: 6000 kg
            crew:
              hours:
                - {days: mon-sun, from: "06:00", to: "14:00", heads: 2, breaks: [{from: "10:00", to: "10:30"}]}
                - {days: mon-sun, from: "14:00", to: "22:00", heads: 2}
            moves: {takes: 10 min, at-once: 1, heads: 1, hangs-at-most: 10 min}
            lots: orders.csv
            minimise: [lateness, makespan]
            """;

    private MadeLine() {}

    /** The file of the line, in a folder with everything that it names. */
    static Path in(Path folder, int lots, long seed) throws IOException {
        write(folder, "loins.yaml", recipe("Loins", "16 mm", "mean, at-most: 20 g/kg", SOAK, SOAK, SOAK, RINSE));
        write(folder, "cutlets.yaml", recipe("Cutlets", "14 mm", "mean, at-most: 26 g/kg", SOAK, SOAK, RINSE, REST));
        write(folder, "strips.yaml", recipe("Strips", "12 mm", "mean, at-most: 18 g/kg", RINSE, SOAK, SOAK, RINSE));
        write(folder, "orders.csv", orders(lots, new SplittableRandom(seed)));
        return write(folder, "line.yaml", LINE);
    }

    private static Path write(Path folder, String name, String text) throws IOException {
        return Files.writeString(folder.resolve(name), text);
    }

    private static String recipe(String title, String thickness, String target, String... steps) {
        StringBuilder text = new StringBuilder(HEAD.replace("TITLE", title).replace("THICKNESS", thickness));
        for (int i = 0; i < steps.length; i++) {
            text.append(steps[i].replace("NAME", "step " + (i + 1)));
        }
        return text.append("targets:\n  - {species: salt, reading: " + target + "}\nminimise: time\n")
                .toString();
    }

    private static String orders(int lots, SplittableRandom random) {
        List<String> recipes = List.of("loins.yaml", "cutlets.yaml", "strips.yaml");
        StringBuilder text = new StringBuilder("lot,recipe,mass,ready,due,priority\n");
        long minutes = Math.round(60 * HOURS_A_LOT * lots);
        for (int i = 1; i <= lots; i++) {
            LocalDateTime ready = STARTS.plusMinutes(random.nextLong(minutes / 2 + 1));
            LocalDateTime due = ready.plusHours(30).plusMinutes(random.nextLong(minutes / 2 + 1));
            text.append("L" + i + "," + recipes.get(random.nextInt(recipes.size())) + ","
                    + (480 + 20 * random.nextInt(8)) + " kg," + MINUTES.format(ready) + "," + MINUTES.format(due) + ","
                    + (random.nextInt(4) == 0 ? "2" : "") + "\n");
        }
        return text.toString();
    }
}
