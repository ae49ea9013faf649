package org.soakwright.recipes.parsing;

import java.util.List;

/**
 * Lognormals fitted to the parts of a sample.
 *
 * @param worth how many pieces of equal mass would tell as much as the whole sample
 * @param worst the largest gap between the share of mass up to a size in the sample and in all parts together as fitted
 */
record Fitting(List<Part> parts, double worth, double worst) {
    /**
     * One of the parts, each of the same mass.
     *
     * @param pieces how many pieces have at least a part in it
     * @param averageMass of a piece in it
     */
    record Part(Sample.Lognormal lognormal, int pieces, double averageMass) {}

    static Fitting of(Sample whole, int count) {
        List<Part> parts = whole.split(count).stream().map(Fitting::part).toList();
        double worst = whole.gap(parts.stream().map(Part::lognormal).toList());
        return new Fitting(parts, whole.worth(), worst);
    }

    private static Part part(Sample sample) {
        double pieces = sample.pieces().stream().mapToDouble(Sample.Piece::part).sum();
        return new Part(sample.lognormal(), sample.pieces().size(), sample.mass() / pieces);
    }
}
