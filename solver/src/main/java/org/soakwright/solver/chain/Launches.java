package org.soakwright.solver.chain;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Side;

/**
 * Pieces of several sides in surroundings that they do not change. Each new surrounding launches a uniform disturbance, the step from the
 * content that the last one pulled towards to the new one's; each disturbance stays a product of what its sides make of it, so the
 * profile is their sum.
 */
final class Launches {
    final Grade grade;
    /** Content towards which each stage pulls the pieces, by stage; a rest keeps the one before. kg/m3 of piece. */
    final double[] pull;
    /** The disturbance that each stage launches, kg/m3 of piece. */
    final double[] step;

    private final List<Stage> stages;
    private final List<WaveChain.Shelf> shelves = new ArrayList<>();
    private final WaveChain[][] chain;

    Launches(Grade grade, double start, List<Stage> stages) {
        this.grade = grade;
        this.stages = stages.stream().map(Launches::alone).toList();
        pull = new double[stages.size()];
        step = new double[stages.size()];
        double before = start;
        for (int k = 0; k < stages.size(); k++) {
            Stage stage = stages.get(k);
            pull[k] = rests(stage) ? before : stage.partition() * stage.offset();
            step[k] = before - pull[k];
            before = pull[k];
        }
        grade.sides().forEach(side -> shelves.add(new WaveChain.Shelf()));
        chain = new WaveChain[stages.size()][grade.sides().size()];
    }

    static boolean rests(Stage stage) {
        return stage.surroundings() instanceof Surroundings.Rest;
    }

    private static Stage alone(Stage stage) {
        Surroundings around = rests(stage) ? stage.surroundings() : new Surroundings.Plenty(0);
        return new Stage(stage.diffusivity(), stage.partition(), stage.surfaces(), around, 0, stage.grain());
    }

    Stage stage(int index) {
        return stages.get(index);
    }

    /** One side of what a stage launches, as content 1 in surroundings without any. */
    WaveChain chain(int launch, int side) {
        if (chain[launch][side] == null) {
            Side one = grade.sides().get(side);
            chain[launch][side] = WaveChain.of(
                    List.of(new Grade(List.of(one), 1, grade.ease())),
                    List.of(new Start.Uniform(1)),
                    stages.subList(launch, stages.size()),
                    shelves.get(side));
        }
        return chain[launch][side];
    }
}
