package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Sizes of pieces with the masses they stand for, smallest first, and the lognormal that describes them best. */
record Sample(List<Piece> pieces) {
    /** Bounds the rounding of a sum of masses against the whole. */
    private static final double SLIVER = 1e-12;

    /**
     * A piece, or the part of one that counts here.
     *
     * @param mass what it counts: in any unit, above zero
     * @param part of the piece, above 0 up to 1
     */
    record Piece(double size, double mass, double part) {}

    /**
     * A lognormal by mass.
     *
     * @param median above zero
     * @param sigma standard deviation of the logarithm, zero or more
     */
    record Lognormal(double median, double sigma) {
        double cv() {
            return Math.sqrt(Math.expm1(sigma * sigma));
        }

        /** The share of mass in pieces of a size up to this one. */
        double upTo(double size) {
            return sigma > 0 ? Normal.upTo(Math.log(size / median) / sigma) : size >= median ? 1 : 0;
        }

        /** The share of mass in pieces below the size. */
        double below(double size) {
            return sigma > 0 ? upTo(size) : size > median ? 1 : 0;
        }
    }

    Sample {
        pieces = pieces.stream().sorted(Comparator.comparingDouble(Piece::size)).toList();
    }

    double mass() {
        return pieces.stream().mapToDouble(Piece::mass).sum();
    }

    /** As many pieces of equal mass would tell as much: Kish's effective sample size. */
    double worth() {
        double squares = pieces.stream()
                .mapToDouble(piece -> piece.mass() * piece.mass())
                .sum();
        return mass() * mass() / squares;
    }

    /** Weighted mean and standard deviation of the logarithms, the latter corrected for the mean being fitted too. */
    Lognormal lognormal() {
        double smallest = pieces.get(0).size();
        if (smallest == pieces.get(pieces.size() - 1).size()) {
            return new Lognormal(smallest, 0);
        }
        double mass = mass();
        double mean = 0;
        for (Piece piece : pieces) {
            mean += piece.mass() / mass * Math.log(piece.size());
        }
        double squares = 0;
        double free =
                0; // the mass less the sum of squares over it, of positive terms so that no heavy piece cancels it
        for (Piece piece : pieces) {
            squares += piece.mass() * Math.pow(Math.log(piece.size()) - mean, 2);
            free += piece.mass() * ((mass - piece.mass()) / mass);
        }
        return new Lognormal(Math.exp(mean), Math.sqrt(squares / free));
    }

    /** So many samples of equal mass, smallest sizes first; a piece on the border counts in part on either side. */
    List<Sample> split(int count) {
        double each = mass() / count;
        List<Sample> samples = new ArrayList<>();
        List<Piece> current = new ArrayList<>();
        double room = each;
        for (Piece whole : pieces) {
            double left = whole.mass();
            while (left > SLIVER * each) {
                double taken = samples.size() == count - 1 ? left : Math.min(left, room);
                if (taken > SLIVER * each) {
                    current.add(new Piece(whole.size(), taken, whole.part() * taken / whole.mass()));
                }
                left -= taken;
                room -= taken;
                if (room <= SLIVER * each && samples.size() < count - 1) {
                    samples.add(new Sample(current));
                    current = new ArrayList<>();
                    room = each;
                }
            }
        }
        samples.add(new Sample(current));
        return samples;
    }

    /** Kolmogorov's distance from lognormals of equal mass taken together: the largest gap between the shares of mass up to a size. */
    double gap(List<Lognormal> fitted) {
        double mass = mass();
        double worst = 0;
        double sum = 0;
        for (int i = 0; i < pieces.size(); i++) {
            double size = pieces.get(i).size();
            double below = fitted.stream().mapToDouble(one -> one.below(size)).sum() / fitted.size();
            if (i == 0 || pieces.get(i - 1).size() < size) {
                worst = Math.max(worst, Math.abs(sum / mass - below));
            }
            sum += pieces.get(i).mass();
            if (i == pieces.size() - 1 || pieces.get(i + 1).size() > size) {
                double upTo = fitted.stream().mapToDouble(one -> one.upTo(size)).sum() / fitted.size();
                worst = Math.max(worst, Math.abs(sum / mass - upTo));
            }
        }
        return Math.min(worst, 1);
    }
}
