package org.soakwright.solver.chain;

import java.util.List;
import org.soakwright.solver.stage.Bathing;
import org.soakwright.solver.stage.Product;

/** The backward pass through a {@link RitzCourse}: the transpose of every map on the way, last first. */
final class Backwards {
    private final RitzCourse course;
    private final RitzChain chain;
    private final Space space;

    Backwards(RitzCourse course) {
        this.course = course;
        chain = course.chain;
        space = course.space;
    }

    /** Of a sum of readings: one pass serves them all. */
    Sensitivity of(List<Part> sum, int stage) {
        double[] bySeconds = new double[stage + 1];
        double[] byContent = new double[stage + 1];
        double[] byFeed = new double[stage + 1];
        // Derivatives by the coefficients at the end of stage k, by what all theta there stand on, and by the liquor
        // last met.
        double[][] byPieces = new double[chain.lot().size()][];
        for (int j = 0; j < byPieces.length; j++) {
            byPieces[j] = new double[space.products(stage).get(j).size()];
        }
        double byBase = 0;
        double byMet = 0;
        for (Part part : sum) {
            if (part.probe() instanceof Probe.Liquor) {
                byMet += part.weight();
            } else {
                double scale = part.weight() * chain.stage(stage).partition();
                byBase += scale;
                add(byPieces, scale, part.probe(), stage);
            }
        }
        for (int k = stage; k >= 0; k--) {
            Stage here = chain.stage(k);
            List<Product> products = space.products(k);
            RitzCourse.Leg leg = course.leg(k);
            Bathing.Passage passage = leg.passage();
            double byOffset = byBase;
            double byLiquor = byBase;
            if (here.wets()) {
                byOffset += byMet;
                byLiquor += byMet;
                byMet = 0;
            }
            double[] byUnheld = new double[products.size()];
            double byPour = 0;
            if (passage == null) {
                for (int j = 0; j < byPieces.length; j++) {
                    bySeconds[k] += products.get(j).slope(byPieces[j], leg.end()[j]);
                }
                byPieces = RitzCourse.decayed(products, byPieces, course.seconds[k]);
            } else {
                Bathing.Answer answer = space.bathing(k, course.seconds[k]).back(passage, byPieces, byLiquor);
                bySeconds[k] = answer.seconds();
                byPieces = answer.pieces();
                double byJoined = answer.liquor();
                double room = course.volume(k);
                for (int j = 0; j < byPieces.length; j++) {
                    byJoined -= dot(products.get(j).uniform(), byPieces[j]);
                    room += products.get(j).capacity() * products.get(j).missing();
                }
                byPour = byJoined * course.volume(k) / room;
                for (int j = 0; j < byPieces.length; j++) {
                    byUnheld[j] = byJoined * products.get(j).capacity() / room;
                }
            }
            double byShift = 0;
            for (int j = 0; j < byPieces.length; j++) {
                byShift += dot(products.get(j).uniform(), byPieces[j])
                        + byUnheld[j] * products.get(j).missing();
            }
            byOffset -= byShift + byPour;
            enter(k, byOffset, byPour, byContent, byFeed);
            byMet += chain.mixed(k) * byPour;
            if (k > 0) {
                byBase = byShift * chain.stage(k - 1).partition() / here.partition();
                byPieces = before(k, byPieces, byUnheld);
            }
        }
        return new Sensitivity(bySeconds, byContent, byFeed);
    }

    private void add(double[][] byPieces, double scale, Probe probe, int stage) {
        double[] shares = course.shares(probe);
        for (int j = 0; j < byPieces.length; j++) {
            if (shares[j] > 0) {
                double[] row = course.row(probe, stage, j);
                for (int n = 0; n < row.length; n++) {
                    byPieces[j][n] += scale * shares[j] * row[n];
                }
            }
        }
    }

    /** The offset is the feed where one runs in, else the content itself. */
    private void enter(int k, double byOffset, double byPour, double[] byContent, double[] byFeed) {
        Surroundings around = chain.stage(k).surroundings();
        if (around instanceof Surroundings.Vessel vessel && vessel.flow() > 0) {
            byFeed[k] = byOffset;
            byContent[k] = (1 - chain.mixed(k)) * byPour;
        } else if (!(around instanceof Surroundings.Rest)) {
            byContent[k] = byOffset + (1 - chain.mixed(k)) * byPour;
        }
    }

    /** Derivatives by the coefficients at the end of the stage before. */
    private double[][] before(int k, double[][] byPieces, double[] byUnheld) {
        double ratio = chain.stage(k - 1).partition() / chain.stage(k).partition();
        double[][] before = new double[byPieces.length][];
        for (int j = 0; j < before.length; j++) {
            double[] own = byPieces[j].clone();
            double[] uniform = space.products(k).get(j).uniform();
            for (int n = 0; n < own.length; n++) {
                own[n] -= byUnheld[j] * uniform[n];
            }
            before[j] = Product.apply(Product.transposed(space.carry(k, j)), own);
            double[] mean = space.products(k - 1).get(j).uniform();
            for (int n = 0; n < before[j].length; n++) {
                before[j][n] += byUnheld[j] * ratio * mean[n];
            }
        }
        return before;
    }

    private static double dot(double[] a, double[] b) {
        return Link.dot(a, b, a.length);
    }
}
