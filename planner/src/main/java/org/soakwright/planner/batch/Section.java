package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Side;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.text.Unit;

/**
 * A cut through the core of pieces of several sides at the end of every step, along the two sides with the shortest ways out; a short
 * cylinder's along its axis. Pieces as stated where they differ.
 *
 * @param across the side drawn across
 * @param down the side drawn down
 * @param acrossPositions from 0, the core or sealed face, to 1, the wetted face
 * @param downPositions the same down
 * @param ends one for each step
 * @param unit of the contents
 */
public record Section(
        Species species,
        Grade grade,
        Side across,
        Side down,
        double[] acrossPositions,
        double[] downPositions,
        List<End> ends,
        Unit unit) {

    /** The end of a step, from 0; contents by position down, then across. */
    public record End(int step, double[][] contents) {}

    public Section {
        ends = List.copyOf(ends);
    }

    /** For every species and every grade of several sides, in that order. */
    public static List<Section> of(Run run, int points) {
        Recipe recipe = run.batch().recipe();
        List<Section> sections = new ArrayList<>();
        for (int s = 0; s < recipe.species().size(); s++) {
            for (int j = 0; j < recipe.lot().grades().size(); j++) {
                if (recipe.lot().grades().get(j).sides().size() > 1) {
                    sections.add(of(run, s, j, points));
                }
            }
        }
        return List.copyOf(sections);
    }

    private static Section of(Run run, int s, int j, int points) {
        Recipe recipe = run.batch().recipe();
        Species species = recipe.species().get(s);
        Grade grade = recipe.lot().grades().get(j);
        List<Side> sides = grade.sides();
        List<Integer> shortest = IntStream.range(0, sides.size())
                .boxed()
                .sorted(Comparator.comparingDouble(i -> sides.get(i).depth()))
                .limit(2)
                .toList();
        // The longer of the two lies across; a short cylinder stands.
        int down = sides.size() == 2 ? 1 : shortest.get(0);
        int across = sides.size() == 2 ? 0 : shortest.get(1);
        double[] positions = IntStream.range(0, points)
                .mapToDouble(i -> (double) i / (points - 1))
                .toArray();
        double unit = recipe.lot().express(1, species.start().unit());
        int median = run.batch().classes(s).populations().get(j).median();
        List<End> ends = new ArrayList<>();
        for (int step = 0; step < recipe.steps().size(); step++) {
            double[][] contents =
                    run.course(s).section(median, run.batch().lastStage(step), across, down, positions, positions);
            for (double[] row : contents) {
                for (int i = 0; i < row.length; i++) {
                    row[i] *= unit;
                }
            }
            ends.add(new End(step, contents));
        }
        return new Section(
                species,
                grade,
                sides.get(across),
                sides.get(down),
                positions,
                positions,
                ends,
                species.start().unit());
    }
}
