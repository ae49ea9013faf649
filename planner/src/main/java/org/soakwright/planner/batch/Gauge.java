package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.model.Reading;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Part;
import org.soakwright.solver.chain.Probe;

/** One number read from a species' chain at the end of a stage, over the classes that stand for the pieces; kg/m3. */
sealed interface Gauge {
    double value(Course course, int stage);

    /** Derivatives by the durations of the stages so far, kg/m3 per s. */
    double[] gradient(Course course, int stage);

    /** The grade read, from 0; -1 where it is the lot or a liquor. */
    int grade();

    /** The liquor. */
    record OfLiquor() implements Gauge {
        @Override
        public double value(Course course, int stage) {
            return course.value(new Probe.Liquor(), stage);
        }

        @Override
        public double[] gradient(Course course, int stage) {
            return course.gradient(new Probe.Liquor(), stage);
        }

        @Override
        public int grade() {
            return -1;
        }
    }

    /** The mean over the lot. */
    record OfLot() implements Gauge {
        @Override
        public double value(Course course, int stage) {
            return course.value(new Probe.LotMean(), stage);
        }

        @Override
        public double[] gradient(Course course, int stage) {
            return course.gradient(new Probe.LotMean(), stage);
        }

        @Override
        public int grade() {
            return -1;
        }
    }

    /** A reading of each of a grade's pieces, averaged by mass. */
    record Average(int grade, Population pieces, Reading reading) implements Gauge {
        @Override
        public double value(Course course, int stage) {
            double sum = 0;
            for (int i = 0; i < pieces.count(); i++) {
                sum += pieces.weight(i) * course.value(Gauge.probe(reading, pieces.first() + i), stage);
            }
            return sum;
        }

        @Override
        public double[] gradient(Course course, int stage) {
            List<Part> sum = new ArrayList<>();
            for (int i = 0; i < pieces.count(); i++) {
                sum.add(new Part(pieces.weight(i), Gauge.probe(reading, pieces.first() + i)));
            }
            return course.gradient(sum, stage);
        }

        /** Bound on the numerical error of the value. */
        double error(Course course, int stage) {
            double sum = 0;
            for (int i = 0; i < pieces.count(); i++) {
                sum += pieces.weight(i)
                        * course.read(Gauge.probe(reading, pieces.first() + i), stage)
                                .error();
            }
            return sum;
        }
    }

    /**
     * The reading at or below which a share of the pieces lies, by mass.
     *
     * @param grade -1 for the whole lot
     */
    record Percentile(int grade, List<Population> pieces, Reading reading, double share) implements Gauge {
        public Percentile {
            pieces = List.copyOf(pieces);
        }

        @Override
        public double value(Course course, int stage) {
            return new Scatter(pieces, Gauge.values(pieces, reading, course, stage)).percentile(share);
        }

        @Override
        public double[] gradient(Course course, int stage) {
            double[] values = Gauge.values(pieces, reading, course, stage);
            Scatter scatter = new Scatter(pieces, values);
            double[] answers = scatter.answers(scatter.percentile(share));
            List<Part> sum = new ArrayList<>();
            for (int i = 0; i < answers.length; i++) {
                if (answers[i] != 0) {
                    sum.add(new Part(answers[i], Gauge.probe(reading, i)));
                }
            }
            return course.gradient(sum, stage);
        }
    }

    /** The readings of the classes of some populations, by class of the lot; others are left 0. */
    static double[] values(List<Population> populations, Reading reading, Course course, int stage) {
        int last = populations.stream()
                .mapToInt(one -> one.first() + one.count())
                .max()
                .orElse(0);
        double[] values = new double[last];
        for (Population population : populations) {
            for (int i = 0; i < population.count(); i++) {
                values[population.first() + i] = course.value(probe(reading, population.first() + i), stage);
            }
        }
        return values;
    }

    static Probe probe(Reading reading, int index) {
        return switch (reading) {
            case MEAN -> new Probe.Mean(index);
            case CORE -> new Probe.Core(index);
            case SURFACE -> new Probe.Surface(index);
            case HIGHEST -> new Probe.Highest(index);
            case LOWEST -> new Probe.Lowest(index);
            case RANGE -> new Probe.Range(index);
        };
    }
}
