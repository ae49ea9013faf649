package org.soakwright.solver.identities;

import java.util.List;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Grade;

/** A stage and how long it lasts. */
record Timed(Stage stage, double seconds) {
    Timed with(Stage other) {
        return new Timed(other, seconds);
    }

    Timed with(Surroundings around) {
        return with(new Stage(
                stage.diffusivity(), stage.partition(), stage.surfaces(), around, stage.clinging(), stage.grain()));
    }

    Timed lasting(double other) {
        return new Timed(stage, other);
    }

    static Chain chain(List<Grade> lot, Start start, List<Timed> steps) {
        return Chain.of(lot, start, steps.stream().map(Timed::stage).toList());
    }

    static Course follow(List<Grade> lot, Start start, List<Timed> steps) {
        return chain(lot, start, steps).follow(seconds(steps));
    }

    static double[] seconds(List<Timed> steps) {
        return steps.stream().mapToDouble(Timed::seconds).toArray();
    }
}
