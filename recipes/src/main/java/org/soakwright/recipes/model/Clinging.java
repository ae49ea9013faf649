package org.soakwright.recipes.model;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Shown;

/** Whether the liquor that clings to the pieces was there: less than one fill of its own step. */
public final class Clinging {
    private static final MathContext SHOWN = new MathContext(4, RoundingMode.DOWN);

    private Clinging() {}

    /**
     * Every problem of the steps, so far as they could be read.
     *
     * @param lotKg the mass of the lot; empty where it is not known, which leaves a stated volume unasked
     */
    public static List<Problem> problems(List<Step> steps, OptionalDouble lotKg) {
        return steps.stream()
                .filter(Step.Wet.class::isInstance)
                .flatMap(step -> problem((Step.Wet) step, lotKg))
                .toList();
    }

    private static Stream<Problem> problem(Step.Wet step, OptionalDouble lotKg) {
        Quantity dragOut = step.dragOut();
        double most = m3PerKg(step.liquor().volume(), lotKg);
        if (dragOut == null || !(dragOut.si() >= most)) {
            return Stream.empty();
        }
        String shown = Shown.number(
                BigDecimal.valueOf(dragOut.unit().fromSi(most)).round(SHOWN).stripTrailingZeros());
        return Stream.of(new Problem(
                dragOut.place(),
                "more would cling than the liquor holds: found \"" + dragOut + "\"; write less than " + shown + " "
                        + dragOut.unit() + ", which is the whole liquor"));
    }

    private static double m3PerKg(LiquorVolume volume, OptionalDouble lotKg) {
        if (volume instanceof LiquorVolume.Ratio ratio) {
            return ratio.value().si();
        }
        return volume instanceof LiquorVolume.Volume stated && lotKg.isPresent()
                ? stated.value().si() / lotKg.getAsDouble()
                : Double.POSITIVE_INFINITY;
    }
}
