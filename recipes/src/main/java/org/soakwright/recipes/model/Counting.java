package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Problem;

/** Whether what a recipe counts can be counted: liquor that has a volume, money in one currency. */
public final class Counting {
    private Counting() {}

    /** Every problem of the steps, targets, goals and prices together, so far as they could be read. */
    public static List<Problem> problems(
            List<Step> steps, List<Target> targets, List<Goal> minimise, @Nullable Prices prices) {
        List<Problem> problems = new ArrayList<>(countableLiquor(steps, targets, minimise, prices));
        problems.addAll(oneCurrency(money(steps, targets, prices)));
        problems.addAll(liquorByMass(steps, targets));
        return problems;
    }

    /** A liquor's content is counted by mass only where its density is known. */
    private static List<Problem> liquorByMass(List<Step> steps, List<Target> targets) {
        List<Problem> problems = new ArrayList<>();
        for (Target target : targets) {
            if (target instanceof Target.OfLiquor limited && limited.limits().basis() == Basis.PER_MASS) {
                steps.stream()
                        .filter(step -> step.name().equals(limited.step().name()))
                        .filter(step ->
                                step instanceof Step.Wet wet && wet.liquor().density() == null)
                        .map(step -> new Problem(
                                limited.limits().place(),
                                "a limit by mass needs the liquor's density: found none in " + step.name()
                                        + "; add density to its liquor, such as 1080 kg/m3, or write the limit as g/L"))
                        .forEach(problems::add);
            }
        }
        return problems;
    }

    /** Unlimited liquor has no volume to count and, at a price, no cost. */
    private static List<Problem> countableLiquor(
            List<Step> steps, List<Target> targets, List<Goal> minimise, @Nullable Prices prices) {
        boolean litres = counted(targets, minimise, Goal.LIQUOR);
        boolean cost = counted(targets, minimise, Goal.COST);
        List<Problem> problems = new ArrayList<>();
        for (Step step : steps) {
            if (step instanceof Step.Wet wet && wet.liquor().isUnlimited()) {
                Optional<LiquorPrice> price = LiquorPrice.of(step, prices);
                if (litres || (cost && price.filter(one -> one.perM3() > 0).isPresent())) {
                    problems.add(new Problem(
                            wet.liquor().volume().place(),
                            "unlimited liquor cannot be counted, and the recipe counts its "
                                    + (litres ? "volume" : "cost") + "; write a volume such as 1200 L"));
                }
            }
        }
        return problems;
    }

    private static boolean counted(List<Target> targets, List<Goal> minimise, Goal goal) {
        return minimise.contains(goal)
                || targets.stream().anyMatch(target -> target instanceof Target.OfTotal total && total.total() == goal);
    }

    private static List<Problem> oneCurrency(List<Quantity> money) {
        return money.stream()
                .filter(one -> !currency(one).equals(currency(money.get(0))))
                .map(one -> new Problem(
                        one.place(),
                        "a recipe counts in one currency: found \"" + one + "\" beside \"" + money.get(0)
                                + "\"; write them all in one"))
                .toList();
    }

    /** The currency in which anything has a price or a limit; empty where nothing has. */
    static Optional<String> currency(List<Step> steps, List<Target> targets, @Nullable Prices prices) {
        return money(steps, targets, prices).stream().findFirst().map(Counting::currency);
    }

    private static List<Quantity> money(List<Step> steps, List<Target> targets, @Nullable Prices prices) {
        Stream<Quantity> ofRecipe =
                prices == null ? Stream.of() : Stream.concat(Stream.ofNullable(prices.time()), parts(prices.liquor()));
        Stream<Quantity> ofSteps =
                steps.stream().flatMap(step -> parts(step.head().price()));
        Stream<Quantity> ofTargets = targets.stream()
                .filter(target -> target instanceof Target.OfTotal total && total.total() == Goal.COST)
                .map(target -> ((Target.OfTotal) target).atMost());
        return Stream.of(ofRecipe, ofSteps, ofTargets).flatMap(part -> part).toList();
    }

    private static Stream<Quantity> parts(@Nullable LiquorPrice price) {
        return price == null
                ? Stream.of()
                : Stream.of(Optional.ofNullable(price.supply()), Optional.ofNullable(price.disposal()))
                        .flatMap(Optional::stream);
    }

    /** The currency that money, or a price in money, is counted in. */
    static String currency(Quantity money) {
        String symbol = money.unit().symbol();
        int slash = symbol.indexOf('/');
        return slash < 0 ? symbol : symbol.substring(0, slash);
    }
}
