package org.soakwright.planner.line.verify;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;

/** Halls nobody would build, each of a seed: a line file and its recipes, written into a folder. All numbers are invented. */
final class RandomHall {
    private static final List<String> GOALS = List.of("lateness", "makespan", "night-moves");

    private final Random random;
    private final Path folder;
    private final boolean priced;
    private final boolean flowing;
    private final boolean room;
    private final List<String> kinds = new ArrayList<>();

    private RandomHall(Path folder, long seed) {
        this.folder = folder;
        random = new Random(seed);
        priced = chance(0.3);
        flowing = chance(0.4);
        room = chance(0.5);
    }

    /** Writes it; the path of the line. */
    static Path write(Path folder, long seed) {
        try {
            return new RandomHall(folder, seed).written();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private boolean chance(double part) {
        return random.nextDouble() < part;
    }

    private int from(int least, int most) {
        return least + random.nextInt(most - least + 1);
    }

    private <T> T any(List<T> of) {
        return of.get(random.nextInt(of.size()));
    }

    private Path written() throws IOException {
        int recipes = from(1, 2);
        for (int r = 1; r <= recipes; r++) {
            Files.writeString(folder.resolve("recipe" + r + ".yaml"), recipe(r));
        }
        Path line = folder.resolve("hall.yaml");
        Files.writeString(line, line(recipes));
        return line;
    }

    private String recipe(int number) {
        int steps = from(1, 4);
        StringBuilder text = new StringBuilder("language: 1\ntitle: Recipe " + number + "\nproduct: [other]\n");
        text.append("lot:\n  mass: 100 kg\n  density: ")
                .append(from(1000, 1200))
                .append(" kg/m3\n  pieces:\n");
        if (chance(0.3)) {
            text.append("    - {name: thin, shape: slab, thickness: 8 mm, share: 40 %}\n");
            text.append("    - {name: thick, shape: slab, thickness: 11 mm, share: 60 %}\n");
        } else {
            text.append("    - {name: piece, shape: ")
                    .append(any(List.of("slab, thickness", "cylinder, diameter")))
                    .append(": ")
                    .append(from(8, 14))
                    .append(" mm}\n");
        }
        text.append("species:\n  salt:\n    start: 150 g/kg\n    diffusivity: 8e-10 m2/s\n    partition: 0.8\n");
        if (chance(0.5)) {
            text.append("between: ").append(from(0, 4) * 6 + 1).append(" min\n");
        }
        text.append("steps:\n");
        boolean wet = false;
        for (int i = 1; i <= steps; i++) {
            String kind = any(List.of("soak", "soak", "rinse", "rinse", "rest"));
            if (i == steps && !wet) {
                kind = "soak";
            }
            wet |= !kind.equals("rest");
            step(text, number, i, kind);
        }
        text.append("targets:\n  - {species: salt, reading: mean, at-most: ")
                .append(from(60, 110))
                .append(" g/kg");
        text.append(chance(0.2) ? ", at-least: " + from(20, 40) + " g/kg}\n" : "}\n");
        if (priced) {
            text.append("prices: {time: 40 EUR/h, liquor: 3 EUR/m3}\n");
        }
        return text.toString();
    }

    private void step(StringBuilder text, int number, int i, String kind) {
        boolean lodging = room
                && i > 1
                && (kind.equals("rest") || kinds.get(kinds.size() - 1).equals("rest"));
        kinds.add(kind);
        text.append("  - ")
                .append(kind)
                .append(": ")
                .append(kind)
                .append(' ')
                .append(number)
                .append(i)
                .append('\n');
        boolean stays = i > 1 && !lodging && chance(0.35);
        boolean fills = false;
        if (kind.equals("soak")) {
            text.append("    liquor: {ratio: ").append(from(2, 6)).append(" L/kg, salt: 0 g/L}\n");
        } else if (kind.equals("rinse")) {
            int which = from(0, flowing ? 1 : 2);
            fills = which == 0;
            if (fills) {
                text.append("    liquor: {ratio: ")
                        .append(from(1, 3))
                        .append(" L/kg, salt: 0 g/L}\n    fills: ")
                        .append(from(2, 3))
                        .append('\n');
            } else if (which == 1) {
                text.append("    liquor: {volume: 300 L, flow: ")
                        .append(from(1, 9))
                        .append(" L/min, salt: 0 g/L}\n");
            } else {
                text.append("    liquor: {volume: unlimited, salt: 0 g/L}\n");
            }
        }
        if (stays) {
            text.append("    stays: true\n");
        }
        if ((stays || fills) && chance(0.6)) {
            text.append("    changeover: {drain: ")
                    .append(from(0, 3) * 5)
                    .append(" min, refill: ")
                    .append(from(1, 12))
                    .append(" min}\n");
        }
        if (!kind.equals("rest")) {
            text.append(chance(0.5) ? "    film: negligible\n" : "    film: {coefficient: 4e-6 m/s}\n");
            text.append(chance(0.3) ? "    drag-out: 0.05 L/kg\n" : "");
        }
        text.append(chance(0.2) ? "    attended: true\n" : "");
        text.append(chance(0.4) ? "    hold-at-most: " + any(List.of("0 min", "7 min", "1 h", "13 h")) + "\n" : "");
        text.append("    time: ").append(time()).append('\n');
    }

    private String time() {
        return switch (from(0, 3)) {
            case 0 -> from(20, 150) + " min";
            case 1 -> "{any-of: [30 min, 95 min, 5 h]}";
            case 2 ->
                "{from: " + from(10, 60) + " min, to: " + from(3, 12) + " h, grain: "
                        + any(List.of("1 min", "7 min", "30 min")) + "}";
            default -> "{from: " + from(10, 60) + " min, to: 9 h}";
        };
    }

    private String line(int recipes) {
        LocalDateTime starts =
                LocalDateTime.parse(any(List.of("2026-03-27T06:00", "2026-10-23T05:30", "2026-06-03T14:10")));
        StringBuilder text = new StringBuilder("title: Hall\nstarts: " + starts + "\nzone: "
                + any(List.of("Europe/Oslo", "Europe/London", "Australia/Lord_Howe")) + "\nvessels:\n");
        boolean rests = room && kinds.contains("rest");
        vessels(
                text,
                "tank",
                rests ? "soak, rinse" : "soak, rinse, rest",
                "{gross: " + from(500, 1300) + " L, usable: 90 %}",
                starts);
        if (kinds.contains("rinse") && chance(0.4)) {
            vessels(text, "trough", "rinse", "{gross: 1000 L, usable: 80 %}", starts);
        }
        if (rests) {
            text.append("  room:\n    count: 1\n    serves: rest\n    capacity: ")
                    .append(from(60, 300))
                    .append(" kg\n");
            text.append(chance(0.3) ? "    turnaround: 25 min\n" : "");
            text.append(flowing ? "    draws: {power: 3 kW}\n" : "");
        }
        if (chance(0.85)) {
            crew(text, starts);
        }
        text.append("moves: {takes: ")
                .append(any(List.of(0, 5, 15, 15, 30)))
                .append(" min, at-once: ")
                .append(from(1, 2))
                .append(chance(0.5) ? ", hangs-at-most: " + any(List.of(5, 20)) + " min" : "")
                .append("}\n");
        if (flowing) {
            text.append("utilities: {water: 10 L/min, power: ")
                    .append(from(6, 14))
                    .append(" kW}\n");
        }
        lots(text, recipes, starts);
        List<String> goals = new ArrayList<>(GOALS);
        java.util.Collections.shuffle(goals, random);
        if (priced) {
            goals.add(from(0, 2), "cost");
        }
        return text.append("minimise: ")
                .append(goals.subList(0, from(1, goals.size())))
                .append('\n')
                .toString();
    }

    private void vessels(StringBuilder text, String name, String serves, String volume, LocalDateTime starts) {
        int count = from(1, 3);
        text.append("  ")
                .append(name)
                .append(":\n    count: ")
                .append(count)
                .append("\n    serves: [")
                .append(serves)
                .append("]\n    volume: ")
                .append(volume)
                .append('\n');
        text.append(chance(0.6) ? "    turnaround: " + from(1, 50) + " min\n" : "");
        if (chance(0.4)) {
            LocalDateTime from = starts.plusMinutes(from(-100, 3000));
            text.append("    outages: [{vessel: ")
                    .append(chance(0.5) ? "every" : from(1, count))
                    .append(", from: ")
                    .append(from)
                    .append(", to: ")
                    .append(from.plusMinutes(from(1, 700)))
                    .append("}]\n");
        }
        text.append(flowing ? "    draws: {water: flow, power: " + from(1, 4) + " kW}\n" : "");
    }

    private void crew(StringBuilder text, LocalDateTime starts) {
        text.append("crew:\n  hours:\n    - {days: mon-sun, from: \"06:00\", to: \"14:00\", heads: ")
                .append(from(1, 3))
                .append(", breaks: [{from: \"10:00\", to: \"10:")
                .append(from(11, 40))
                .append("\"}]}\n");
        if (chance(0.5)) {
            text.append(
                    "    - {days: [fri, sat, sun], from: \"22:00\", to: \"06:30\", heads: 1, breaks: [{from: \"02:10\", to:"
                            + " \"02:50\"}]}\n");
        } else if (chance(0.5)) {
            text.append("    - {days: mon-thu, from: \"13:00\", to: \"21:00\", heads: 1}\n");
        }
        if (chance(0.3)) {
            text.append("  except:\n    - {date: ")
                    .append(starts.toLocalDate().plusDays(1))
                    .append(", closed: true}\n");
        }
    }

    private void lots(StringBuilder text, int recipes, LocalDateTime starts) {
        text.append("lots:\n");
        int lots = from(1, 7);
        for (int i = 1; i <= lots; i++) {
            LocalDateTime ready = starts.plusMinutes(from(-600, 2000));
            text.append(String.format(
                    Locale.ROOT,
                    "  - {lot: L%d, recipe: recipe%d.yaml, mass: %d kg",
                    i,
                    from(1, recipes),
                    any(List.of(from(20, 60), from(60, 120), from(120, 500)))));
            text.append(chance(0.5) ? ", ready: " + ready : "");
            text.append(chance(0.7) ? ", due: " + starts.plusMinutes(from(2000, 6000)) : "");
            text.append(chance(0.3) ? ", priority: " + any(List.of("0.5", "2", "7.25")) : "");
            text.append(chance(0.2) ? ", alone: true" : "").append("}\n");
        }
    }
}
