package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;

/** What whoever runs the batch should know beside the numbers. */
public final class Cautions {
    /** Between these a food is neither kept cold nor kept hot, K: 5 and 57 Cel, FDA Food Code 3-501.16. */
    static final double COLD = 278.15;

    private static final double HOT = 330.15;

    private static final String ALWAYS =
            "A planning estimate: confirm by assay of the product before it is released or sold."
                    + " Local codes and licensed practice decide.";

    /** A caution of a product, and where what it says is published; empty where it is plain good practice. */
    private record Entry(Product product, String text, String source) {
        String shown() {
            return (source.isEmpty() ? text : text + " (" + source + ")") + ".";
        }
    }

    private static final List<Entry> TABLE = List.of(
            new Entry(
                    Product.FOOD,
                    "Water that touches food must be safe and of adequate sanitary quality",
                    "21 CFR 117.37(a)"),
            new Entry(
                    Product.FOOD,
                    "Cold holding is at 5 °C or below, hot holding at 57 °C or above; time in between lets microbes grow",
                    "FDA Food Code 3-501.16"),
            new Entry(
                    Product.FLAMMABLE,
                    "Keep ignition sources away and bond and earth vessels against static; solvent vapours spread along"
                            + " the floor",
                    ""),
            new Entry(
                    Product.FLAMMABLE,
                    "Never load a hot dryer before the solvent is drained and vented. Ventilate so that exhaust vapour stays"
                            + " at or below 25 % of the lower flammable limit",
                    "NFPA 86"),
            new Entry(Product.CORROSIVE, "Wear eye and skin protection", ""),
            new Entry(Product.CORROSIVE, "Add caustic slowly to cold water, never water to caustic", "CCOHS"),
            new Entry(
                    Product.CORROSIVE,
                    "Have suitable facilities for drenching eyes and body within the work area",
                    "29 CFR 1910.151(c)"));

    private Cautions() {}

    /** For a recipe not followed yet: where times are free, counted is the longest that there can be. */
    public static List<String> of(Recipe recipe) {
        boolean free = recipe.steps().stream().anyMatch(step -> step.time().isFree());
        return of(recipe, StepTimes.longest(recipe), free ? "up to " : "");
    }

    /** For a recipe followed. */
    public static List<String> of(Run run) {
        return of(run.batch().recipe(), run.seconds(), "");
    }

    private static List<String> of(Recipe recipe, double[] seconds, String hedge) {
        Set<Product> products = recipe.products();
        List<String> cautions = new ArrayList<>(List.of(ALWAYS));
        TABLE.stream()
                .filter(entry -> products.contains(entry.product()))
                .forEach(entry -> cautions.add(entry.shown()));
        double between = betweenColdAndHot(recipe, seconds);
        if (products.contains(Product.FOOD) && between > 0) {
            cautions.add("Here steps between 5 °C and 57 °C last " + hedge + Durations.practical(between)
                    + " together: have a food safety plan that allows it.");
        }
        Warming.of(recipe).ifPresent(cautions::add);
        return List.copyOf(cautions);
    }

    private static double betweenColdAndHot(Recipe recipe, double[] seconds) {
        double sum = 0;
        for (int i = 0; i < seconds.length; i++) {
            Quantity temperature = recipe.steps().get(i).temperature();
            if (temperature != null && temperature.si() > COLD && temperature.si() < HOT) {
                sum += seconds[i];
            }
        }
        return sum;
    }
}
