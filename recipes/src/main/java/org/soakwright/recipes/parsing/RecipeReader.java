package org.soakwright.recipes.parsing;

import java.math.BigDecimal;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Clinging;
import org.soakwright.recipes.model.Consistency;
import org.soakwright.recipes.model.Counting;
import org.soakwright.recipes.model.Declared;
import org.soakwright.recipes.model.Goal;
import org.soakwright.recipes.model.Lot;
import org.soakwright.recipes.model.Prices;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/**
 * Reads a recipe from its tree. What is declared is gathered first, wherever it stands in the file, so that steps and
 * targets can be held against it even where some of it is broken.
 */
public final class RecipeReader {
    static final BigDecimal LANGUAGE = BigDecimal.ONE;

    private final Lists lists;
    private final Values values;
    private final Problems problems;

    private RecipeReader(Lists lists, Problems problems) {
        this.lists = lists;
        this.values = new Values(problems);
        this.problems = problems;
    }

    /** The recipe; null, with every problem added, where it or a list it names is not whole. */
    public static @Nullable Recipe read(Tree tree, Lists lists, Problems problems) {
        Fields fields = Fields.of(tree, Section.RECIPE, problems);
        return fields == null ? null : new RecipeReader(lists, problems).recipe(fields);
    }

    private @Nullable Recipe recipe(Fields fields) {
        language(fields.need("language", "1"));
        String title = values.name("title", fields.need("title", "Desalting of loins"), "Desalting of loins");
        Set<Product> products = products(fields.need("product", "[food]"));
        LotReader lots = new LotReader(values, lists);
        Tree lotTree = fields.need("lot", "{mass: 600 kg, density: 1120 kg/m3, pieces: […]}");
        Lot lot = lotTree == null ? null : lots.lot(lotTree);
        SpeciesReader speciesReader = new SpeciesReader(values);
        Tree speciesTree = fields.need("species", "{salt: {start: 190 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8}}");
        List<Species> species = speciesTree == null ? List.of() : speciesReader.species(speciesTree);
        Tree stepsTree = fields.need("steps", "[{soak: first water, …}]");
        Map<String, String> stepKinds = StepReader.declared(stepsTree, problems);
        boolean priced = fields.has("prices") || StepReader.anyHas(stepsTree, "prices");
        Declared declared = new Declared(
                products,
                speciesReader.names(),
                species,
                stepKinds,
                lots.gradeNames(),
                lots.shapes(),
                lots.hasDensity(),
                lots.hasMoisture(),
                StepReader.anyHas(stepsTree, "gain"),
                priced);
        Consistency consistency = new Consistency(declared);
        species.forEach(one -> problems.addAll(consistency.of(one)));
        problems.addAll(Consistency.ofWater(lots.moisture(), species));
        Quantity between = values.quantity("between", fields.get("between"), Kind.DURATION);
        problems.addAll(Consistency.ofBetween(between));
        List<Step> steps = stepsTree == null ? List.of() : new StepReader(values, declared).steps(stepsTree);
        problems.addAll(Clinging.problems(steps, lot == null ? OptionalDouble.empty() : lot.massKg()));
        List<Target> targets = new TargetReader(values, declared).targets(fields.get("targets"));
        List<Goal> goals = goals(fields.get("minimise"), consistency);
        Tree pricesTree = fields.get("prices");
        Prices prices = pricesTree == null ? null : new PriceReader(values).ofRecipe(pricesTree);
        Tree allowedTree = fields.get("allowed-by");
        String allowedBy = values.name("allowed-by", allowedTree, "E. Vik, quality");
        Quantity confidence = values.confidence(fields.get("confidence"));
        problems.addAll(Counting.problems(steps, targets, goals, prices));
        if (!problems.isEmpty() || title == null || lot == null) {
            return null;
        }
        return problems.attempt(() -> new Recipe(
                fields.place(),
                title,
                products,
                lot,
                species,
                between,
                steps,
                targets,
                goals,
                prices,
                allowedBy,
                confidence));
    }

    private void language(@Nullable Tree tree) {
        BigDecimal language = values.number("language", tree, "1");
        if (tree != null && language != null && language.compareTo(LANGUAGE) != 0) {
            problems.add(tree.place(), "this version reads language 1: found " + tree.label() + "; write language: 1");
        }
    }

    private Set<Product> products(@Nullable Tree tree) {
        Set<Product> products = EnumSet.noneOf(Product.class);
        products.addAll(values.someWords("product", tree, Product.class));
        return products;
    }

    private List<Goal> goals(@Nullable Tree tree, Consistency consistency) {
        if (tree == null) {
            return List.of(Goal.TIME);
        }
        List<Goal> goals = values.someWords("minimise", tree, Goal.class);
        goals.forEach(goal -> problems.addAll(consistency.of(goal, tree.place())));
        return goals;
    }
}
