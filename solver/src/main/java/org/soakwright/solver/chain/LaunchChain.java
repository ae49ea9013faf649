package org.soakwright.solver.chain;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.solver.shape.Grade;

/** A lot with pieces of several sides in surroundings that no piece changes, so that every grade goes its own way. */
final class LaunchChain extends Chain {
    private final List<Grade> lot;
    private final List<Stage> stages;
    private final List<Way> ways = new ArrayList<>();

    /** How one grade is followed. */
    sealed interface Way {
        /** Pieces of one axis, in standing waves. */
        record Waves(WaveChain chain) implements Way {}

        /** Pieces of several, as products. */
        record Products(Launches launches) implements Way {}
    }

    LaunchChain(List<Grade> lot, List<Start> starts, List<Stage> stages) {
        this.lot = lot;
        this.stages = stages;
        for (int j = 0; j < lot.size(); j++) {
            Grade grade = lot.get(j);
            int at = j;
            List<Stage> own = stages.stream().map(stage -> stage.of(at)).toList();
            ways.add(
                    starts.get(j) instanceof Start.Uniform uniform && !grade.oneAxis()
                            ? new Way.Products(new Launches(grade, uniform.content(), own))
                            : new Way.Waves(
                                    WaveChain.of(List.of(grade), List.of(starts.get(j)), own, new WaveChain.Shelf())));
        }
    }

    @Override
    public List<Grade> lot() {
        return lot;
    }

    @Override
    public int size() {
        return stages.size();
    }

    @Override
    public Stage stage(int index) {
        return stages.get(index);
    }

    Way way(int grade) {
        return ways.get(grade);
    }

    @Override
    public LaunchCourse follow(double... seconds) {
        return new LaunchCourse(this, seconds.clone());
    }
}
