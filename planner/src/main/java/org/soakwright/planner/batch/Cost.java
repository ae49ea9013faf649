package org.soakwright.planner.batch;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.OptionalDouble;
import org.soakwright.recipes.model.Goal;
import org.soakwright.recipes.model.Prices;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Step;

/** The totals of a recipe, all linear in the durations of its steps. */
public final class Cost {
    private final double gapSeconds;
    private final double standingM3;
    private final double standingMoney;
    private final double[] flowM3;
    private final double[] moneyPerSecond;
    private final boolean countable;
    private final boolean costed;
    private final double moneyPerSecondOverall;

    public Cost(Recipe recipe) {
        List<Step> steps = recipe.steps();
        Prices prices = recipe.prices();
        gapSeconds = recipe.gapSeconds(0, steps.size());
        flowM3 = new double[steps.size()];
        moneyPerSecond = new double[steps.size()];
        moneyPerSecondOverall = prices == null ? 0 : prices.perSecond();
        boolean priced =
                prices != null || steps.stream().anyMatch(step -> step.head().price() != null);
        double volume = 0;
        double money = 0;
        boolean all = true;
        boolean allPriced = true;
        for (int i = 0; i < steps.size(); i++) {
            moneyPerSecond[i] = moneyPerSecondOverall;
            if (steps.get(i) instanceof Step.Wet wet) {
                OptionalDouble fill = wet.liquor().volumeM3(recipe.lot());
                double price = recipe.liquorPrice(wet).map(one -> one.perM3()).orElse(0.0);
                if (fill.isEmpty()) {
                    all = false;
                    allPriced &= price == 0;
                    continue;
                }
                int fills = 1;
                if (wet instanceof Step.Rinse rinse) {
                    if (rinse.renewal() instanceof Renewal.Fills several) {
                        fills = several.count();
                    } else if (rinse.renewal() instanceof Renewal.Flow flow) {
                        flowM3[i] = flow.rate().si();
                        moneyPerSecond[i] += price * flowM3[i];
                    }
                }
                volume += fills * fill.getAsDouble();
                money += price * fills * fill.getAsDouble();
            }
        }
        standingM3 = volume;
        standingMoney = money + moneyPerSecondOverall * gapSeconds;
        countable = all;
        costed = priced && allPriced;
    }

    Totals of(double[] seconds) {
        OptionalDouble liquor = countable ? OptionalDouble.of(shown(Goal.LIQUOR, seconds)) : OptionalDouble.empty();
        OptionalDouble cost = costed ? OptionalDouble.of(shown(Goal.COST, seconds)) : OptionalDouble.empty();
        return new Totals(shown(Goal.TIME, seconds), liquor, cost);
    }

    /** Sums of decimals carry binary rounding in their last digits; what is shown does not. */
    private double shown(Goal goal, double[] seconds) {
        return new BigDecimal(of(goal, seconds)).round(new MathContext(13)).doubleValue();
    }

    /** Seconds, m3 or money. */
    public double of(Goal goal, double[] seconds) {
        double sum = standing(goal);
        for (int i = 0; i < seconds.length; i++) {
            sum += rate(goal, i) * seconds[i];
        }
        return sum;
    }

    /** What a total is before any step has lasted. */
    private double standing(Goal goal) {
        return switch (goal) {
            case TIME -> gapSeconds;
            case LIQUOR -> standingM3;
            case COST -> standingMoney;
        };
    }

    /** What one second of a step adds to a total. */
    public double rate(Goal goal, int step) {
        return switch (goal) {
            case TIME -> 1;
            case LIQUOR -> flowM3[step];
            case COST -> moneyPerSecond[step];
        };
    }
}
