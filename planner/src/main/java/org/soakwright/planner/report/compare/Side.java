package org.soakwright.planner.report.compare;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.planner.report.Figures;
import org.soakwright.planner.report.PieceWords;
import org.soakwright.recipes.model.Reading;

/**
 * One of the two batches, as its result tells of it.
 *
 * @param file what it was read from
 * @param how it came about: planned, followed as written, or read as a result
 * @param sha256 of the recipe
 * @param met whether every target is met
 * @param litres of liquor; empty where it is unlimited
 */
public record Side(
        String file,
        String how,
        String title,
        String sha256,
        boolean met,
        List<Step> steps,
        List<Target> targets,
        double seconds,
        OptionalDouble litres,
        OptionalDouble cost,
        Optional<String> currency) {

    /** One step: what liquor and lot hold at its end, and what the lot weighs where that is known. */
    public record Step(
            String name,
            String kind,
            double seconds,
            Map<String, Content> liquors,
            Map<String, Content> means,
            Optional<Content> mass,
            List<Piece> pieces) {}

    /** A content and its unit. */
    public record Content(double value, String unit) {}

    /** One grade. */
    public record Piece(String name, Map<String, Map<Reading, Content>> species) {}

    /**
     * A target as it stands.
     *
     * @param name without the grade: {@code salt mean}
     * @param reading empty where it is not of pieces
     * @param grade the one nearest to failing
     * @param limit in words
     */
    public record Target(
            String name,
            Optional<Reading> reading,
            Optional<String> grade,
            String limit,
            double value,
            String unit,
            boolean met) {}

    /**
     * Reads the result of {@code follow} or {@code plan}.
     *
     * @param file what to call it
     * @param how it came about
     * @throws org.soakwright.recipes.text.Unsound where the text is none
     */
    public static Side read(String file, String how, String json) {
        JsonTree root = JsonTree.read(file, json);
        root.at("soakwright").text();
        String title = root.at("title").text();
        List<Step> steps = root.at("steps").elements(Side::step);
        JsonTree totals = root.at("totals");
        return new Side(
                file,
                how,
                title,
                root.at("inputs-sha256").text(),
                root.at("met").truth(),
                steps,
                root.at("targets").elements(Side::target),
                totals.at("seconds").number(),
                totals.number("liquor-litres"),
                totals.number("cost"),
                totals.text("currency"));
    }

    /** The same under another name. */
    public Side called(String name) {
        return new Side(name, how, title, sha256, met, steps, targets, seconds, litres, cost, currency);
    }

    private static Step step(JsonTree step) {
        return new Step(
                step.at("name").text(),
                step.at("kind").text(),
                step.at("seconds").number(),
                step.at("liquor").each(one -> content(one, "end")),
                step.at("species").each(one -> content(one, "mean")),
                step.has("mass") ? Optional.of(content(step.at("mass"), "value")) : Optional.empty(),
                step.at("pieces").elements(Side::piece));
    }

    private static Content content(JsonTree one, String name) {
        return new Content(one.at(name).number(), one.at("unit").text());
    }

    private static Piece piece(JsonTree piece) {
        return new Piece(piece.at("name").text(), piece.at("species").each(Side::readings));
    }

    private static Map<Reading, Content> readings(JsonTree one) {
        Map<Reading, Content> readings = new java.util.EnumMap<>(Reading.class);
        for (Reading reading : Reading.values()) {
            readings.put(reading, content(one, reading.word()));
        }
        return readings;
    }

    private static Target target(JsonTree target) {
        String unit = target.at("unit").text()
                + target.text("of").map(of -> " of " + of).orElse("");
        Optional<Reading> reading = Optional.empty();
        String name;
        if (target.has("total")) {
            String total = target.at("total").text();
            name = total.equals("mass") ? "mass of the lot" + after(target) : "total " + total;
        } else if (target.has("liquor")) {
            name = target.at("species").text() + " in " + target.at("liquor").text();
        } else {
            String word = target.at("reading").text();
            reading = java.util.Arrays.stream(Reading.values())
                    .filter(one -> one.word().equals(word))
                    .findFirst();
            OptionalDouble share = target.number("share");
            name = target.at("species").text() + " " + word.toLowerCase(Locale.ROOT) + counted(target)
                    + (share.isPresent() ? " in " + PieceWords.percent(share.getAsDouble()) : "")
                    + after(target);
        }
        return new Target(
                name,
                reading,
                target.text("grade"),
                limit(target, unit),
                target.at("value").number(),
                unit,
                target.at("met").truth());
    }

    private static String after(JsonTree target) {
        return target.text("after").map(step -> " after " + step).orElse("");
    }

    private static String counted(JsonTree target) {
        String per = target.text("per").map(mass -> " per " + mass + " mass").orElse("");
        return target.text("phase")
                .map(phase -> phase.equals("water") ? " in the water phase" : " per " + phase)
                .orElse(per);
    }

    private static String limit(JsonTree target, String unit) {
        OptionalDouble confidence = target.number("confidence");
        return sides(target, unit)
                + (confidence.isPresent() ? ", " + PieceWords.percent(confidence.getAsDouble()) + " sure" : "");
    }

    private static String sides(JsonTree target, String unit) {
        OptionalDouble most = target.number("at-most");
        OptionalDouble least = target.number("at-least");
        if (most.isPresent() && least.isPresent()) {
            return Figures.written(least.getAsDouble()) + " to " + Figures.written(most.getAsDouble()) + " " + unit;
        }
        return most.isPresent()
                ? "at most " + Figures.written(most.getAsDouble()) + " " + unit
                : "at least " + Figures.written(target.at("at-least").number()) + " " + unit;
    }
}
