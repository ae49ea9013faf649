package org.soakwright.solver.chain;

/** The backward pass: how a reading answers to every duration and every liquor before it. */
final class Adjoint {
    private Adjoint() {}

    static Sensitivity of(WaveCourse course, Probe probe, int stage) {
        double[] bySeconds = new double[stage + 1];
        double[] byContent = new double[stage + 1];
        double[] byFeed = new double[stage + 1];
        boolean ofLiquor = probe instanceof Probe.Liquor;
        double scale = ofLiquor ? 1 : course.link(stage).stage.partition();
        // Derivatives by the coefficients at the end of stage k, by its liquor's content there, and by its offset.
        double[] q = new double[course.count(stage)];
        double byLiquor = ofLiquor ? 1 : 0;
        double byOffset = 0;
        if (!ofLiquor) {
            double[] row = course.row(probe, stage);
            for (int m = 0; m < q.length; m++) {
                q[m] = scale * row[m];
            }
            byOffset = scale;
        }
        for (int k = stage; k >= 0; k--) {
            Link link = course.link(k);
            int n = course.count(k);
            Surroundings around = link.stage.surroundings();
            boolean vessel = around instanceof Surroundings.Vessel;
            if (vessel && byLiquor != 0) {
                for (int m = 0; m < n; m++) {
                    q[m] += byLiquor * link.modes.liquor(m);
                }
            }
            if (link.stage.wets()) {
                byOffset += byLiquor;
                byLiquor = 0;
            }
            double[] decay = course.decay(k);
            double[] end = course.end(k);
            double slope = 0;
            for (int m = 0; m < n; m++) {
                slope -= link.modes.rate(m) * q[m] * end[m];
                q[m] *= decay[m];
            }
            bySeconds[k] = slope;
            double poured = link.byPoured(q, n);
            double uniform = link.byUniform(q, n);
            byOffset -= poured + uniform;
            if (vessel && ((Surroundings.Vessel) around).flow() > 0) {
                byFeed[k] = byOffset;
                byContent[k] = (1 - link.mixed) * poured;
            } else if (vessel) {
                byContent[k] = byOffset + (1 - link.mixed) * poured;
            } else if (!(around instanceof Surroundings.Rest)) {
                byContent[k] = byOffset;
            }
            if (k > 0) {
                byLiquor += link.mixed * poured;
                byOffset = link.ratio * uniform;
                q = link.back(q, n, course.count(k - 1));
            }
        }
        return new Sensitivity(bySeconds, byContent, byFeed);
    }
}
