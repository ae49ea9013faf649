package org.soakwright.planner.bench;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;

/** Turns the results that JMH wrote into a table in Markdown: prints it and writes it beside them. */
public final class BenchTable {
    private BenchTable() {}

    /** One result: class and method, parameters, microseconds and half the width of their 99.9 % interval. */
    private record Line(String name, Map<String, String> parameters, double score, double error) {
        /** How many times as long as the chain the rival took; empty where there is nothing to compare. */
        String ratio(List<Line> all) {
            String chain = name.replace("RivalBench", "ChainBench");
            return all.stream()
                    .filter(other -> !name.equals(chain) && other.name.equals(chain))
                    .filter(other -> other.parameter("fo").equals(parameter("fo")))
                    .findFirst()
                    .map(other -> figure(score / other.score))
                    .orElse("");
        }

        String parameter(String key) {
            return parameters.getOrDefault(key, "");
        }
    }

    /**
     * Writes the table.
     *
     * @param args the file of results, and the file for the table
     */
    public static void main(String[] args) throws IOException {
        List<Line> lines = read(Path.of(args[0]));
        StringBuilder table = new StringBuilder("| benchmark | of | within | µs | ± | rival / chain |\n")
                .append("|---|---|---|--:|--:|--:|\n");
        for (Line line : lines) {
            String of = line.parameters.containsKey("fo") ? "Fo " + line.parameter("fo") : line.parameter("recipe");
            table.append("| %s | %s | %s | %s | %s | %s |%n"
                    .formatted(
                            line.name,
                            of,
                            line.parameter("within"),
                            figure(line.score),
                            figure(line.error),
                            line.ratio(lines)));
        }
        System.out.print(table);
        Files.writeString(Path.of(args[1]), table);
    }

    /** Three significant digits. */
    private static String figure(double number) {
        int decimals = number > 0 ? Math.max(0, 2 - (int) Math.floor(Math.log10(number))) : 0;
        return String.format(Locale.ROOT, "%." + decimals + "f", number);
    }

    private static List<Line> read(Path file) throws IOException {
        List<Line> lines = new ArrayList<>();
        try (JsonParser parser = new JsonFactory().createParser(file.toFile())) {
            parser.nextToken();
            while (parser.nextToken() == JsonToken.START_OBJECT) {
                lines.add(line(parser));
            }
        }
        return lines;
    }

    private static Line line(JsonParser parser) throws IOException {
        String name = "";
        Map<String, String> parameters = Map.of();
        Map<String, String> metric = Map.of();
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            String field = parser.currentName();
            parser.nextToken();
            switch (field) {
                case "benchmark" -> name = parser.getText();
                case "params" -> parameters = scalars(parser);
                case "primaryMetric" -> metric = scalars(parser);
                default -> parser.skipChildren();
            }
        }
        if (!"us/op".equals(metric.get("scoreUnit"))) {
            throw new IOException(name + " is in " + metric.get("scoreUnit") + ", not in us/op");
        }
        String[] parts = name.split("\\.");
        return new Line(
                parts[parts.length - 2] + "." + parts[parts.length - 1],
                parameters,
                Double.parseDouble(metric.getOrDefault("score", "NaN")),
                Double.parseDouble(metric.getOrDefault("scoreError", "NaN")));
    }

    /** The texts and numbers directly in an object. */
    private static Map<String, String> scalars(JsonParser parser) throws IOException {
        Map<String, String> scalars = new TreeMap<>();
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            String field = parser.currentName();
            if (parser.nextToken().isScalarValue()) {
                scalars.put(field, parser.getText());
            } else {
                parser.skipChildren();
            }
        }
        return scalars;
    }
}
