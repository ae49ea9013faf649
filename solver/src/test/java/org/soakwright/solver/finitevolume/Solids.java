package org.soakwright.solver.finitevolume;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.BiFunction;
import java.util.function.Function;
import org.soakwright.solver.finitevolume.Step.Kind;

/**
 * Follows bodies of several axes: on finite volumes of one mesh, on those of three and extrapolated, or on elements of a high degree.
 * The hand-over from phase to phase is written a second time here, so that one axis followed both ways checks it.
 */
final class Solids {
    private final Batch batch;
    private final Function<Edge, Ruler> rulers;
    private final Map<List<Object>, Waves> known = new HashMap<>();
    private final List<Tensor> content = new ArrayList<>();

    private double liquor;
    private double clinging;
    private double drive;

    private Solids(Batch batch, Function<Edge, Ruler> rulers) {
        this.batch = batch;
        this.rulers = rulers;
        for (Solid solid : batch.lot()) {
            content.add(Tensor.level(
                    solid.edges().stream()
                            .mapToInt(edge -> rulers.apply(edge).node.length)
                            .toArray(),
                    batch.start()));
        }
    }

    /** The ends of all phases, on finite volumes of one mesh. */
    static List<State> follow(Batch batch, int cells) {
        return new Solids(batch, cached((power, twoFaced) -> Ruler.cells(power, twoFaced, cells))).ends();
    }

    /** The ends of all phases from meshes of one, two and four times so many cells, without the errors in h^2 and h^4. */
    static List<State> extrapolated(Batch batch, int cells) {
        return extrapolated(follow(batch, cells), follow(batch, 2 * cells), follow(batch, 4 * cells));
    }

    static List<State> extrapolated(List<State> coarse, List<State> middle, List<State> fine) {
        List<State> ends = new ArrayList<>();
        for (int k = 0; k < coarse.size(); k++) {
            ends.add(coarse.get(k).combine(1 / 45.0, middle.get(k), -20 / 45.0).combine(1, fine.get(k), 64 / 45.0));
        }
        return ends;
    }

    /** The ends of all phases, on elements of a degree. */
    static List<State> onElements(Batch batch, int degree) {
        return new Solids(batch, cached((power, twoFaced) -> Ruler.elements(power, twoFaced, degree))).ends();
    }

    private static Function<Edge, Ruler> cached(BiFunction<Integer, Boolean, Ruler> rulers) {
        Map<List<Object>, Ruler> made = new HashMap<>();
        return edge -> made.computeIfAbsent(
                List.of(edge.power(), edge.twoFaced()), key -> rulers.apply(edge.power(), edge.twoFaced()));
    }

    private List<State> ends() {
        return batch.phases().stream().map(this::advance).toList();
    }

    private State advance(Phase phase) {
        Step step = phase.step();
        double bath = step.content();
        double volume = 0;
        if (step.kind().limited()) {
            double poured = step.volume() + clinging;
            bath = (step.volume() * step.content() + clinging * liquor) / poured;
            volume = step.kind() == Kind.CLOSED ? poured : step.volume();
        }
        double level = step.kind() == Kind.FLOWING ? step.feed() : step.kind() == Kind.REST ? 0 : bath;
        for (Tensor nodes : content) {
            for (int i = 0; i < nodes.value.length; i++) {
                nodes.value[i] = nodes.value[i] / step.partition() - level;
            }
        }
        noteDrive(step, bath - level);
        double after = solve(phase, volume, bath - level) + level;
        for (Tensor nodes : content) {
            for (int i = 0; i < nodes.value.length; i++) {
                nodes.value[i] = (nodes.value[i] + level) * step.partition();
            }
        }
        if (step.kind().limited() || step.kind() == Kind.UNLIMITED) {
            liquor = step.kind() == Kind.UNLIMITED ? level : after;
            clinging = step.clinging();
        }
        List<Field> fields = new ArrayList<>();
        for (int j = 0; j < content.size(); j++) {
            fields.add(read(batch.lot().get(j), axes(phase, batch.lot().get(j)), content.get(j)));
        }
        return new State(fields, liquor, drive);
    }

    private void noteDrive(Step step, double bath) {
        double low = step.kind() == Kind.REST ? Double.POSITIVE_INFINITY : Math.min(0, bath);
        double high = step.kind() == Kind.REST ? Double.NEGATIVE_INFINITY : Math.max(0, bath);
        for (Tensor nodes : content) {
            for (double theta : nodes.value) {
                low = Math.min(low, theta);
                high = Math.max(high, theta);
            }
        }
        drive = Math.max(drive, high - low);
    }

    private double solve(Phase phase, double volume, double bath) {
        Step step = phase.step();
        List<Share> shares = new ArrayList<>();
        double mass = volume;
        double load = volume * bath;
        for (int j = 0; j < content.size(); j++) {
            Solid solid = batch.lot().get(j);
            List<Double> paces = solid.edges().stream()
                    .map(edge -> phase.diffusivity(solid, edge) / (edge.length() * edge.length()))
                    .toList();
            Share share = new Share(axes(phase, solid), paces, step.partition() * solid.volume(), content.get(j));
            shares.add(share);
            mass += share.bathCapacity;
            load += share.bathContent;
        }
        Coupled coupled = new Coupled(shares, mass, step.flow());
        double after = 0;
        if (step.kind().limited()) {
            after = coupled.advance(load / mass, step.seconds());
        }
        for (int j = 0; j < content.size(); j++) {
            Share share = shares.get(j);
            double[] held = coupled.after.get(j);
            if (!step.kind().limited()) {
                // Nothing is coupled: every wave dies away by itself.
                Arrays.setAll(held, n -> share.held.value[n] * Math.exp(-share.rate.value[n] * step.seconds()));
            }
            content.set(j, share.contents(held, after));
        }
        return after;
    }

    private List<Waves> axes(Phase phase, Solid solid) {
        Step step = phase.step();
        List<Waves> axes = new ArrayList<>();
        for (Edge edge : solid.edges()) {
            double unit = edge.length() / (step.partition() * phase.diffusivity(solid, edge));
            boolean rests = step.kind() == Kind.REST;
            double biot = rests ? 0 : solid.coat().film(step) * unit;
            double back = rests || !edge.twoFaced() ? 0 : solid.back().film(step) * unit;
            axes.add(known.computeIfAbsent(
                    List.of(edge.power(), edge.twoFaced(), back, biot),
                    key -> new Waves(rulers.apply(edge), edge.power(), back, biot)));
        }
        return axes;
    }

    private static Field read(Solid solid, List<Waves> axes, Tensor nodes) {
        double area = 0;
        double onSurface = 0;
        for (int i = 0; i < axes.size(); i++) {
            // The mean over one edge's faces: shares of the volume along the others, the last node along itself.
            List<double[]> weights = new ArrayList<>();
            for (int k = 0; k < axes.size(); k++) {
                double[] weight = axes.get(k).share;
                if (k == i) {
                    weight = new double[weight.length];
                    boolean both = solid.edges().get(i).twoFaced();
                    weight[weight.length - 1] = both ? 0.5 : 1;
                    weight[0] = both ? 0.5 : 0;
                }
                weights.add(weight);
            }
            double faces =
                    (solid.edges().get(i).power() + 1) / solid.edges().get(i).depth();
            area += faces;
            onSurface += faces * Tensor.outer(weights, (a, b) -> a * b).dot(nodes);
        }
        Tensor kept = new Tensor(nodes.size, nodes.value.clone());
        List<Ruler> rulers = axes.stream().map(a -> a.ruler).toList();
        return new Field(kept, rulers, Share.mean(axes, nodes), onSurface / area, solid);
    }
}
