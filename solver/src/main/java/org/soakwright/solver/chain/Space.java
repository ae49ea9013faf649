package org.soakwright.solver.chain;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Side;
import org.soakwright.solver.stage.Bathing;
import org.soakwright.solver.stage.Conditions;
import org.soakwright.solver.stage.Mesh;
import org.soakwright.solver.stage.Product;
import org.soakwright.solver.stage.Ritz;

/** Everything of a {@link RitzChain} that belongs to one cutting of its pieces' sides into elements; found when first asked for. */
final class Space {
    private final RitzChain chain;
    private final Fineness fineness;
    private final List<List<Mesh>> meshes = new ArrayList<>();
    private final List<List<Boolean>> sealedSides = new ArrayList<>();
    private final Map<Wanted, Ritz> sides = new HashMap<>();
    private final Map<Conditions, List<Product>> products = new HashMap<>();
    private final Map<Crossing, List<double[][]>> carries = new HashMap<>();
    private final Passed passed = new Passed();
    /** What was looked up before, by stage and then by grade: the maps' keys are long. */
    private final List<@Nullable List<Product>> byStage;

    private final List<List<@Nullable List<double[][]>>> carried = new ArrayList<>();

    private record Wanted(Axis axis, Mesh mesh, double back, double biot) {}

    private record Crossing(Conditions before, Conditions after, int grade) {}

    /** The course last followed in this space: another with the same beginning starts where they part. */
    static final class Passed {
        @Nullable
        RitzCourse course;
    }

    Space(RitzChain chain, Fineness fineness) {
        this.chain = chain;
        this.fineness = fineness;
        byStage = new ArrayList<>(Collections.nCopies(chain.size(), null));
        for (int k = 0; k < chain.size(); k++) {
            carried.add(new ArrayList<>(Collections.nCopies(chain.lot().size(), null)));
        }
        Map<List<Object>, Mesh> known = new HashMap<>();
        int at = 0;
        for (int j = 0; j < chain.lot().size(); j++) {
            List<Mesh> ofGrade = new ArrayList<>();
            List<Boolean> sealed = new ArrayList<>();
            double[] corners = chain.starts().get(j) instanceof Start.Polyline line
                    ? line.points().stream().mapToDouble(Start.Point::position).toArray()
                    : new double[0];
            int degree = fineness.degree(chain.lot().get(j));
            for (int i = 0; i < chain.lot().get(j).sides().size(); i++) {
                int step = fineness.steps().get(at++);
                Side side = chain.lot().get(j).sides().get(i);
                sealed.add(step == Fineness.SEALED);
                ofGrade.add(
                        corners.length == 0
                                ? known.computeIfAbsent(
                                        List.of(side.reach(), step, degree), key -> Fineness.mesh(side, step, degree))
                                : Fineness.mesh(side, step, degree, corners));
            }
            meshes.add(ofGrade);
            sealedSides.add(sealed);
        }
    }

    Fineness fineness() {
        return fineness;
    }

    Passed passed() {
        return passed;
    }

    List<Product> products(int stage) {
        if (byStage.get(stage) == null) {
            byStage.set(stage, products(chain.conditions(stage)));
        }
        return byStage.get(stage);
    }

    private List<Product> products(Conditions conditions) {
        List<Product> known = products.get(conditions);
        if (known == null) {
            known = new ArrayList<>();
            for (int j = 0; j < chain.lot().size(); j++) {
                known.add(new Product(chain.lot().get(j), conditions, sides(j, conditions)));
            }
            products.put(conditions, known);
        }
        return known;
    }

    private List<Ritz> sides(int grade, Conditions conditions) {
        List<Ritz> found = new ArrayList<>();
        Grade pieces = chain.lot().get(grade);
        for (int i = 0; i < pieces.sides().size(); i++) {
            Side side = pieces.sides().get(i);
            boolean sealed = sealedSides.get(grade).get(i);
            Conditions own = conditions.of(grade);
            Wanted wanted = new Wanted(
                    side.axis(),
                    meshes.get(grade).get(i),
                    sealed ? 0 : own.biotOfBack(pieces, i),
                    sealed ? 0 : own.biot(pieces, i));
            found.add(sides.computeIfAbsent(wanted, key -> new Ritz(key.axis, key.mesh, key.back, key.biot)));
        }
        return found;
    }

    /** A matrix for each side of a grade, from the stage before to this one; the ratio of the partitions is in the first. */
    List<double[][]> carry(int stage, int grade) {
        List<double[][]> known = carried.get(stage).get(grade);
        if (known == null) {
            known = found(stage, grade);
            carried.get(stage).set(grade, known);
        }
        return known;
    }

    private List<double[][]> found(int stage, int grade) {
        Conditions before = chain.conditions(stage - 1);
        Conditions after = chain.conditions(stage);
        return carries.computeIfAbsent(new Crossing(before, after, grade), key -> {
            List<double[][]> matrices = new ArrayList<>();
            double ratio = before.partition() / after.partition();
            List<Product> from = products(before);
            List<Product> to = products(after);
            for (int i = 0; i < chain.lot().get(grade).sides().size(); i++) {
                double[][] matrix =
                        to.get(grade).side(i).carryFrom(from.get(grade).side(i));
                for (double[] row : matrix) {
                    for (int n = 0; i == 0 && n < row.length; n++) {
                        row[n] *= ratio;
                    }
                }
                matrices.add(matrix);
            }
            return matrices;
        });
    }

    /** A grade as loaded, theta in the modes of the first stage. */
    double[] loaded(int grade) {
        double partition = chain.conditions(0).partition();
        Product product = products(0).get(grade);
        if (chain.starts().get(grade) instanceof Start.Polyline line) {
            return product.side(0).project(position -> line.at(position) / partition);
        }
        double content = ((Start.Uniform) chain.starts().get(grade)).content() / partition;
        double[] theta = product.uniform().clone();
        for (int n = 0; n < theta.length; n++) {
            theta[n] *= content;
        }
        return theta;
    }

    /** Mean theta of a grade as loaded. */
    double loadedMean(int grade) {
        double partition = chain.conditions(0).partition();
        return Projection.mean(chain.starts().get(grade), chain.lot().get(grade).axis(), 0) / partition;
    }

    Bathing bathing(int stage, double seconds) {
        return chain.passages().of(fineness, products(stage), chain.conditions(stage), seconds);
    }
}
