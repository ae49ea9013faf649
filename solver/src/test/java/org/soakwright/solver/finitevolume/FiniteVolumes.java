package org.soakwright.solver.finitevolume;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.solver.finitevolume.Step.Kind;

/** Follows a recipe on one mesh, or on three and extrapolates. */
final class FiniteVolumes {
    private final Recipe recipe;
    private final List<Mesh> meshes = new ArrayList<>();
    /** Contents of the bodies at the nodes. */
    private final List<double[]> content = new ArrayList<>();

    private double liquor;
    private double clinging;
    private double drive;

    private FiniteVolumes(Recipe recipe, int cells) {
        this.recipe = recipe;
        for (Body body : recipe.lot()) {
            Mesh mesh = new Mesh(body.power(), cells);
            meshes.add(mesh);
            content.add(loaded(mesh, recipe.start(), cells));
        }
    }

    /** The ends of all steps, on one mesh. */
    static List<Snapshot> follow(Recipe recipe, int cells) {
        FiniteVolumes state = new FiniteVolumes(recipe, cells);
        List<Snapshot> ends = new ArrayList<>();
        for (Step step : recipe.steps()) {
            ends.add(state.advance(step));
        }
        return ends;
    }

    /** The ends of all steps from meshes of one, two and four times so many cells, without the errors in h^2 and h^4. */
    static List<Snapshot> extrapolated(Recipe recipe, int cells) {
        List<Snapshot> coarse = follow(recipe, cells);
        List<Snapshot> middle = follow(recipe, 2 * cells);
        List<Snapshot> fine = follow(recipe, 4 * cells);
        List<Snapshot> ends = new ArrayList<>();
        for (int k = 0; k < coarse.size(); k++) {
            ends.add(coarse.get(k).combine(1 / 45.0, middle.get(k), -20 / 45.0).combine(1, fine.get(k), 64 / 45.0));
        }
        return ends;
    }

    private static double[] loaded(Mesh mesh, List<Corner> corners, int cells) {
        double[] nodes = new double[cells + 1];
        for (int c = 1; c < corners.size(); c++) {
            Corner left = corners.get(c - 1);
            Corner right = corners.get(c);
            int from = left.eighth() * cells / 8;
            int to = right.eighth() * cells / 8;
            for (int i = from; i <= to; i++) {
                double part = (mesh.node[i] - mesh.node[from]) / (mesh.node[to] - mesh.node[from]);
                nodes[i] = left.content() + part * (right.content() - left.content());
            }
        }
        return nodes;
    }

    private Snapshot advance(Step step) {
        double bath = step.content();
        double volume = 0;
        if (step.kind().limited()) {
            double poured = step.volume() + clinging;
            bath = (step.volume() * step.content() + clinging * liquor) / poured;
            volume = step.kind() == Kind.CLOSED ? poured : step.volume();
        }
        // Departures from what would be at rest: a uniform state in equilibrium with the feed.
        double level = step.kind() == Kind.FLOWING ? step.feed() : step.kind() == Kind.REST ? 0 : bath;
        for (double[] nodes : content) {
            for (int i = 0; i < nodes.length; i++) {
                nodes[i] = nodes[i] / step.partition() - level;
            }
        }
        noteDrive(step, bath - level);
        double after = solve(step, volume, bath - level) + level;
        for (double[] nodes : content) {
            for (int i = 0; i < nodes.length; i++) {
                nodes[i] = (nodes[i] + level) * step.partition();
            }
        }
        if (step.kind().limited() || step.kind() == Kind.UNLIMITED) {
            liquor = step.kind() == Kind.UNLIMITED ? level : after;
            clinging = step.clinging();
        }
        List<Profile> profiles = new ArrayList<>();
        for (int j = 0; j < content.size(); j++) {
            double mean = 0;
            for (int i = 0; i < content.get(j).length; i++) {
                mean += meshes.get(j).share[i] * content.get(j)[i];
            }
            profiles.add(new Profile(content.get(j).clone(), mean));
        }
        return new Snapshot(profiles, liquor, drive);
    }

    private void noteDrive(Step step, double bath) {
        double low = step.kind() == Kind.REST ? Double.POSITIVE_INFINITY : Math.min(0, bath);
        double high = step.kind() == Kind.REST ? Double.NEGATIVE_INFINITY : Math.max(0, bath);
        for (double[] nodes : content) {
            for (double theta : nodes) {
                low = Math.min(low, theta);
                high = Math.max(high, theta);
            }
        }
        drive = Math.max(drive, high - low);
    }

    private double solve(Step step, double volume, double bath) {
        List<Arrow.Block> blocks = new ArrayList<>();
        List<double[]> unknown = new ArrayList<>();
        double bathMass = volume;
        double bathContent = volume * bath;
        for (int j = 0; j < content.size(); j++) {
            Body body = recipe.lot().get(j);
            Mesh mesh = meshes.get(j);
            double[] nodes = content.get(j);
            double capacity = step.partition() * body.volume();
            double pace = step.diffusivity() / (body.length() * body.length());
            int cells = mesh.conductance.length;
            // Without resistance the node at the surface is part of the bath.
            boolean open = body.coat().open(step);
            int free = open ? cells : cells + 1;
            double[] mass = new double[free];
            double[] link = new double[free - 1];
            for (int i = 0; i < free; i++) {
                mass[i] = capacity * mesh.share[i];
                if (i > 0) {
                    link[i - 1] = capacity * pace * mesh.conductance[i - 1];
                }
            }
            double tie = 0;
            if (open) {
                tie = capacity * pace * mesh.conductance[cells - 1];
                bathMass += step.kind().limited() ? capacity * mesh.share[cells] : 0;
                bathContent += capacity * mesh.share[cells] * nodes[cells];
            } else if (step.kind() != Kind.REST) {
                tie = body.volume() * (body.power() + 1) * body.coat().film(step) / body.length();
            }
            blocks.add(new Arrow.Block(mass, link, tie));
            unknown.add(java.util.Arrays.copyOf(nodes, free));
        }
        double initial = bathMass == 0 ? 0 : bathContent / bathMass;
        double after = new Arrow(blocks, bathMass, step.flow()).advance(unknown, initial, step.seconds());
        for (int j = 0; j < content.size(); j++) {
            double[] nodes = content.get(j);
            System.arraycopy(unknown.get(j), 0, nodes, 0, unknown.get(j).length);
            if (recipe.lot().get(j).coat().open(step)) {
                nodes[nodes.length - 1] = after;
            }
        }
        return after;
    }
}
