package org.soakwright.planner.report.picture;

/** The points of a line without which it would visibly be another one (Douglas and Peucker, 1973). */
final class Bends {
    /** px that nobody sees. */
    private static final double LEAST = 0.1;

    private final double[] xs;
    private final double[] ys;
    private final boolean[] kept;

    private Bends(double[] xs, double[] ys) {
        this.xs = xs;
        this.ys = ys;
        kept = new boolean[xs.length];
    }

    /** Which to keep, the ends among them; in px. */
    static boolean[] kept(double[] xs, double[] ys) {
        Bends bends = new Bends(xs, ys);
        int last = xs.length - 1;
        bends.kept[0] = true;
        bends.kept[last] = true;
        bends.keep(0, last);
        return bends.kept;
    }

    private void keep(int from, int to) {
        double dx = xs[to] - xs[from];
        double dy = ys[to] - ys[from];
        double length = Math.hypot(dx, dy);
        double most = LEAST;
        int farthest = -1;
        for (int i = from + 1; i < to; i++) {
            double px = xs[i] - xs[from];
            double py = ys[i] - ys[from];
            double off = length > 0 ? Math.abs(px * dy - py * dx) / length : Math.hypot(px, py);
            if (off > most) {
                most = off;
                farthest = i;
            }
        }
        if (farthest > 0) {
            kept[farthest] = true;
            keep(from, farthest);
            keep(farthest, to);
        }
    }
}
