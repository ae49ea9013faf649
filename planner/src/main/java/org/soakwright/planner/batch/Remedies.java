package org.soakwright.planner.batch;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.Supplier;
import org.soakwright.recipes.model.Goal;
import org.soakwright.recipes.model.Liquor;
import org.soakwright.recipes.model.LiquorVolume;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.StepHead;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.model.Time;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Unit;
import org.soakwright.recipes.text.Unsound;

/** Single changes to a recipe that no choice can satisfy, each planned again before it is offered. */
final class Remedies {
    private static final double[] LONGER = {1.25, 1.5, 2, 3, 4, 8};
    private static final double[] WARMER = {2, 5, 10, 15, 20};
    private static final double[] MORE = {1.25, 1.5, 2, 3, 5};
    private static final int MOST_FILLS_ADDED = 3;

    private final Recipe recipe;
    private final Run miss;
    private final Progress progress;
    private final List<Plan.Remedy> found = new ArrayList<>();
    private double share;

    private Remedies(Run miss, Progress progress) {
        this.miss = miss;
        recipe = miss.batch().recipe();
        this.progress = progress;
    }

    /** Of the nearest miss. */
    static List<Plan.Remedy> of(Run miss, Progress progress) {
        Remedies remedies = new Remedies(miss, progress);
        List<Runnable> kinds = List.of(
                remedies::longer,
                remedies::finer,
                remedies::moreFills,
                remedies::warmer,
                remedies::moreLiquor,
                remedies::laterTotal);
        for (int i = 0; i < kinds.size(); i++) {
            remedies.share = (double) i / kinds.size();
            kinds.get(i).run();
        }
        return List.copyOf(remedies.found);
    }

    /** A change that cannot be written or computed is no remedy. */
    private boolean offer(String kind, Supplier<Recipe> change, Function<Run, String> words, String caution) {
        progress.at("looking for a remedy", share);
        try {
            Optional<Run> run = Planner.sure(miss.holding(new Batch(change.get())));
            run.ifPresent(met -> found.add(new Plan.Remedy(kind, words.apply(met), met.totals(), caution)));
            return run.isPresent();
        } catch (Unsound impossible) {
            return false;
        }
    }

    private void longer() {
        for (double factor : LONGER) {
            if (offer("longer", () -> recipe.withSteps(each(step -> stretched(step, factor))), this::longest, "")) {
                return;
            }
        }
    }

    /** Where the grain leaps over what would do. */
    private void finer() {
        List<Step> steps = each(step -> {
            boolean coarse = step.time() instanceof Time.Between between
                    && between.grain().si() > 60
                    && between.to().si() - between.from().si() >= 60;
            return coarse ? fine(step, (Time.Between) step.time()) : step;
        });
        if (!steps.equals(recipe.steps())) {
            offer("finer", () -> recipe.withSteps(steps), run -> "choose times by the minute: grain 1 min", "");
        }
    }

    private static Step fine(Step step, Time.Between time) {
        Quantity grain = new Quantity(BigDecimal.ONE, minute(), time.place());
        return step.with(step.head().withTime(new Time.Between(time.place(), time.from(), time.to(), grain, null)));
    }

    private String longest(Run run) {
        StringBuilder text = new StringBuilder("allow ");
        double[] seconds = run.seconds();
        boolean first = true;
        for (int i = 0; i < seconds.length; i++) {
            Time time = recipe.steps().get(i).time();
            double most = time.seconds(time.choices() - 1);
            if (seconds[i] > most * (1 + 1e-12)) {
                text.append(first ? "" : ", ")
                        .append(Durations.practical(seconds[i]))
                        .append(" for ")
                        .append(recipe.steps().get(i).name());
                first = false;
            }
        }
        return text.toString();
    }

    private static Step stretched(Step step, double factor) {
        Time time = step.time();
        Quantity longest;
        Quantity from;
        Quantity grain;
        if (time instanceof Time.Between between) {
            longest = between.to();
            from = between.from();
            grain = between.grain();
        } else {
            from = time instanceof Time.AnyOf any ? any.durations().get(0) : ((Time.Fixed) time).duration();
            longest = time instanceof Time.AnyOf several
                    ? several.durations().get(several.durations().size() - 1)
                    : from;
            grain = new Quantity(BigDecimal.ONE, minute(), time.place());
        }
        Quantity to = new Quantity(longest.value().multiply(BigDecimal.valueOf(factor)), longest.unit(), time.place());
        if (to.si() - from.si() < grain.si()) {
            return step;
        }
        return step.with(step.head().withTime(new Time.Between(time.place(), from, to, grain, null)));
    }

    private static Unit minute() {
        return Kind.DURATION.unit("min").orElseThrow();
    }

    private void moreFills() {
        for (int added = 1; added <= MOST_FILLS_ADDED; added++) {
            int more = added;
            String words = more == 1 ? "one more" : more + " more";
            int last = lastWet();
            if (last < 0) {
                return;
            }
            Step step = recipe.steps().get(last);
            boolean fills = step instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Fills;
            if (((Step.Wet) step).liquor().isUnlimited()
                    || (step instanceof Step.Rinse running && running.renewal() instanceof Renewal.Flow)) {
                return;
            }
            Supplier<Recipe> changed = () -> fills ? withFills(last, more) : withCopies(last, more);
            String change = fills
                    ? "use " + words + " fill" + (more == 1 ? "" : "s") + " in " + step.name()
                    : "add " + words + " step" + (more == 1 ? "" : "s") + " like " + step.name() + " after it";
            if (offer("fill", changed, run -> change, "")) {
                return;
            }
        }
    }

    private int lastWet() {
        int last = -1;
        for (int i = 0; i < recipe.steps().size(); i++) {
            last = recipe.steps().get(i) instanceof Step.Wet ? i : last;
        }
        return last;
    }

    private Recipe withFills(int index, int added) {
        List<Step> steps = new ArrayList<>(recipe.steps());
        Step.Rinse rinse = (Step.Rinse) steps.get(index);
        Renewal.Fills fills = (Renewal.Fills) rinse.renewal();
        steps.set(index, rinse.with(new Renewal.Fills(fills.count() + added, fills.place())));
        return recipe.withSteps(steps);
    }

    private Recipe withCopies(int index, int added) {
        List<Step> steps = new ArrayList<>(recipe.steps());
        for (int i = 1; i <= added; i++) {
            Step step = steps.get(index);
            StepHead head = step.head();
            steps.add(index + i, step.with(head.withName(unused(head.name() + " again", steps))));
        }
        return recipe.withSteps(steps);
    }

    private static String unused(String name, List<Step> steps) {
        boolean used = steps.stream().anyMatch(step -> step.name().equals(name));
        return used ? unused(name + " again", steps) : name;
    }

    private void warmer() {
        boolean matters = recipe.species().stream()
                .anyMatch(species -> species.diffusivity().dependsOnTemperature());
        if (!matters) {
            return;
        }
        boolean food = recipe.products().contains(Product.FOOD);
        double limit = food ? Cautions.COLD : Double.POSITIVE_INFINITY;
        String caution = food
                ? "food kept at or below 5 °C; check what the warmth does to the product"
                : "check what the warmth does to the product and to vapours";
        for (double kelvins : WARMER) {
            List<Step> steps = each(step -> warmed(step, kelvins, limit));
            if (steps.equals(recipe.steps())) {
                return;
            }
            if (offer(
                    "warmer",
                    () -> recipe.withSteps(steps),
                    run -> temperatures(run.batch().recipe()),
                    caution)) {
                return;
            }
        }
    }

    private static Step warmed(Step step, double kelvins, double limit) {
        Quantity temperature = step.temperature();
        if (!(step instanceof Step.Wet) || temperature == null || temperature.si() >= limit) {
            return step;
        }
        double to = Math.min(limit, temperature.si() + kelvins);
        try {
            return step.with(step.head().withTemperature(Quantity.ofSi(to, temperature.unit(), temperature.place())));
        } catch (Unsound tooHot) {
            return step;
        }
    }

    private String temperatures(Recipe warmed) {
        StringBuilder text = new StringBuilder("warm ");
        boolean first = true;
        for (int i = 0; i < warmed.steps().size(); i++) {
            Quantity now = warmed.steps().get(i).temperature();
            if (now != null && !now.equals(recipe.steps().get(i).temperature())) {
                text.append(first ? "" : ", ")
                        .append(warmed.steps().get(i).name())
                        .append(" to ")
                        .append(now);
                first = false;
            }
        }
        return text.toString();
    }

    private void moreLiquor() {
        for (double factor : MORE) {
            List<Step> steps = each(step -> enlarged(step, factor));
            if (steps.equals(recipe.steps())) {
                return;
            }
            String words =
                    "use " + BigDecimal.valueOf(factor).stripTrailingZeros().toPlainString()
                            + " times the liquor in every closed step";
            if (offer("liquor", () -> recipe.withSteps(steps), run -> words, "check that it fits the vessel")) {
                return;
            }
        }
    }

    private static Step enlarged(Step step, double factor) {
        if (!(step instanceof Step.Wet wet)
                || wet.liquor().isUnlimited()
                || (step instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Flow)) {
            return step;
        }
        Liquor liquor = wet.liquor();
        LiquorVolume volume = liquor.volume() instanceof LiquorVolume.Ratio ratio
                ? new LiquorVolume.Ratio(Rescaled.times(ratio.value(), factor))
                : new LiquorVolume.Volume(Rescaled.times(((LiquorVolume.Volume) liquor.volume()).value(), factor));
        return wet.with(new Liquor(liquor.place(), volume, liquor.contents(), liquor.othersZero(), liquor.density()));
    }

    /** Where only a total stands in the way: what it would have to be. */
    private void laterTotal() {
        List<Target> others = recipe.targets().stream()
                .filter(target -> !(target instanceof Target.OfTotal))
                .toList();
        if (others.size() == recipe.targets().size()) {
            return;
        }
        Recipe changed = recipe.withTargets(others);
        offer("total", () -> changed, run -> "allow totals of " + totals(run), "");
    }

    private String totals(Run run) {
        List<String> words = new ArrayList<>();
        for (Target target : recipe.targets()) {
            if (target instanceof Target.OfTotal total) {
                double value = run.batch().cost().of(total.total(), run.seconds());
                words.add(
                        total.total() == Goal.TIME
                                ? Durations.practical(value)
                                : String.format(
                                        java.util.Locale.ROOT,
                                        "%.4g %s",
                                        total.atMost().unit().fromSi(value),
                                        total.atMost().unit()));
            }
        }
        return String.join(" and ", words);
    }

    private List<Step> each(Function<Step, Step> change) {
        return recipe.steps().stream().map(change).toList();
    }
}
