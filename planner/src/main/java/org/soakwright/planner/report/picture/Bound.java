package org.soakwright.planner.report.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.report.TargetWords;
import org.soakwright.recipes.model.Basis;
import org.soakwright.recipes.model.Counted;
import org.soakwright.recipes.model.Limits;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Target;

/**
 * A limit of the content of pieces, in the unit of the species; one on what is counted otherwise than as loaded is none.
 *
 * @param text in the words and the unit of the target: {@code mean ≤ 25 g/kg}
 */
record Bound(double level, String text) {

    /** Those that hold for a grade; a range is the difference of two contents and bounds none. */
    static List<Bound> of(History history, int species, int grade) {
        List<Bound> bounds = new ArrayList<>();
        String name = history.recipe().species().get(species).name();
        String gradeName = history.grades().get(grade).name();
        for (TargetState state : history.targets()) {
            if (state.target() instanceof Target.OfPieces pieces
                    && pieces.reading() != Reading.RANGE
                    && pieces.counted().equals(Counted.AS_LOADED)
                    && pieces.species().name().equals(name)
                    && (state.grade().orElse("").equals(gradeName)
                            || state.grade().orElse("").equals("lot"))) {
                double factor = perTargetUnit(history, species, grade, pieces);
                String sure = TargetWords.sure(history.recipe(), pieces);
                add(bounds, state.atMost(), "≤", factor, sure, state);
                add(bounds, state.atLeast(), "≥", factor, sure, state);
            }
        }
        return bounds;
    }

    private static void add(
            List<Bound> bounds, OptionalDouble limit, String sign, double factor, String sure, TargetState state) {
        if (limit.isPresent()) {
            Target.OfPieces pieces = (Target.OfPieces) state.target();
            double value = limit.getAsDouble();
            Quantity share = pieces.share();
            String text = pieces.reading().word() + " " + sign + " " + Words.written(value) + " " + state.unit()
                    + (share == null ? "" : " in " + share) + sure;
            bounds.add(new Bound(value * factor, text));
        }
    }

    /** How much of the species' unit one of the target's unit is; grade below 0 is the lot. */
    static double perTargetUnit(History history, int species, int grade, Target.OfPieces pieces) {
        Limits limits = pieces.limits();
        double si = limits.unit().toSi(java.math.BigDecimal.ONE);
        if (limits.basis() == Basis.OF_START) {
            return si * start(history, species, grade);
        }
        double one = history.recipe()
                .lot()
                .express(1, history.recipe().species().get(species).start().unit());
        return one / history.recipe().lot().express(1, limits.unit());
    }

    private static double start(History history, int species, int grade) {
        return grade < 0
                ? history.lotMeans(species)[0]
                : new Loaded(history.recipe(), species).mean(history.grades().get(grade));
    }
}
