package org.soakwright.solver.stage;

import java.util.Arrays;
import java.util.List;
import java.util.TreeSet;

/**
 * Where one side is cut into elements, each a polynomial of one degree. Diffusion smooths: at the end of a stage nothing is steeper than
 * the layer of depth sqrt(D t) that its shortest stage leaves at the surface. So the outermost element is a few such layers deep, and
 * the others grow towards the core; the error then falls exponentially with the degree.
 *
 * @param ends of the elements, from 0, the core or back, to 1, the surface; at least two, rising
 * @param degree of the polynomials, at least 2
 */
public record Mesh(double[] ends, int degree) {
    /**
     * Depth of the outermost element over the layer's. With it, the growth and the rest below, degree 13 keeps the whole profile of a slab,
     * cylinder or sphere without film within 4e-8 of its start at Fo 2e-4 to 1; of what was tried, the fewest unknowns that do.
     */
    private static final double LAYERS = 3;

    /** Depth of an element over that of its neighbour towards the core. */
    private static final double GROWTH = 0.4;

    /** An element that would leave less than this to the core takes the rest. */
    private static final double REST = 0.35;

    /** So thin a layer that nothing is refined further: Fo 1e-12. */
    private static final double THINNEST = 1e-6;

    /** A corner so close to the middle between two faces takes its place as an end. */
    private static final double NARROW = 0.1;

    public Mesh {
        ends = ends.clone();
        if (ends.length < 2 || ends[0] != 0 || ends[ends.length - 1] != 1 || degree < 2) {
            throw new IllegalArgumentException("elements run from 0 to 1 with a degree of at least 2, found "
                    + Arrays.toString(ends) + " of degree " + degree);
        }
    }

    /**
     * For a shortest stage.
     *
     * @param fourier D t / L^2 of the shortest stage, 1; above 0
     * @param corners positions where the start profile has a corner
     */
    public static Mesh of(double fourier, int degree, double... corners) {
        TreeSet<Double> ends = new TreeSet<>(List.of(0.0, 1.0));
        double depth = Math.max(THINNEST, LAYERS * Math.sqrt(fourier));
        for (double corner : corners) {
            ends.add(corner);
        }
        // A corner rounds off as a layer grows, to both sides.
        for (double from : List.copyOf(ends)) {
            for (double away = depth; from > 0 && away < 1 - REST; away /= GROWTH) {
                addBetween(ends, from - away, depth);
                addBetween(ends, from + away, depth);
            }
        }
        return new Mesh(ends.stream().mapToDouble(end -> end).toArray(), degree);
    }

    /**
     * The same between two faces: layers grow from both, each half is cut as one from the core would be.
     *
     * @param fourier D t / L^2 of the shortest stage, L from face to face, 1; above 0
     * @param corners positions where the start profile has a corner
     */
    public static Mesh betweenFaces(double fourier, int degree, double... corners) {
        TreeSet<Double> from = new TreeSet<>(List.of(0.0, 1.0));
        for (double corner : corners) {
            from.add(corner);
        }
        TreeSet<Double> ends = new TreeSet<>(from);
        double depth = Math.max(THINNEST, LAYERS * Math.sqrt(fourier));
        addBetween(ends, 0.5, Math.min(NARROW, depth));
        for (double end : from) {
            for (double away = depth; away < 0.5 * (1 - REST); away /= GROWTH) {
                addBetween(ends, end - away, depth);
                addBetween(ends, end + away, depth);
            }
        }
        return new Mesh(ends.stream().mapToDouble(end -> end).toArray(), degree);
    }

    /** Not outside, and not so close to another that an element would be thinner than the outermost's half. */
    private static void addBetween(TreeSet<Double> ends, double end, double depth) {
        Double below = ends.floor(end);
        Double above = ends.ceiling(end);
        if (below != null && above != null && end - below > depth / 2 && above - end > depth / 2) {
            ends.add(end);
        }
    }

    int elements() {
        return ends.length - 1;
    }

    /** Number of unknowns: one for each end, and the bubbles within. */
    public int size() {
        return elements() * degree + 1;
    }
}
