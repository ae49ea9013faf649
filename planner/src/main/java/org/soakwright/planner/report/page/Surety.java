package org.soakwright.planner.report.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.report.Figures;
import org.soakwright.planner.report.PieceWords;

/** How far the numbers of a batch are to be trusted. */
final class Surety {
    private Surety() {}

    static List<String> of(Run run) {
        Map<String, Double> errors = new TreeMap<>();
        for (int i = 0; i < run.batch().recipe().steps().size(); i++) {
            for (StepEnd.Piece piece : run.end(i).pieces()) {
                for (StepEnd.Content content : piece.species()) {
                    errors.merge(content.unit().symbol(), content.error(), Math::max);
                }
            }
        }
        List<String> sentences = new ArrayList<>();
        sentences.add("For the recipe as it stands the contents are computed to within "
                + errors.entrySet().stream()
                        .map(error -> bound(error.getValue()) + " " + error.getKey())
                        .collect(Collectors.joining(" and "))
                + ". How well they hold on the floor depends on the values the recipe states, above all diffusivity,"
                + " partition, film and piece size: each "
                + (run.outlook().isPresent() ? "without a give-or-take is taken as exact" : "is taken as exact here")
                + (PieceWords.differ(run.batch().recipe())
                        ? ", and so is how far pieces are said to differ. Keep a margin"
                        : " and the same for every piece. Keep a margin")
                + " until an assay has confirmed them.");
        return sentences;
    }

    /** The power of ten that is not exceeded. */
    private static String bound(double error) {
        double power = Math.pow(10, Math.ceil(Math.log10(Math.max(error, 1e-12))));
        return power < 1e-4 ? "1e" + Math.round(Math.log10(power)) : Figures.written(power);
    }
}
