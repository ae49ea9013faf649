package org.soakwright.solver.chain;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.soakwright.solver.stage.Product;

/** One grade's {@link Launches} followed. */
final class ProductCourse extends Course {
    private final Launches launches;
    private final double[] seconds;
    private final WaveCourse[][] course;
    private final Map<List<Object>, double[]> places = new HashMap<>();

    ProductCourse(Launches launches, double[] seconds) {
        this.launches = launches;
        this.seconds = seconds;
        course = new WaveCourse[seconds.length][launches.grade.sides().size()];
    }

    private WaveCourse course(int launch, int side) {
        if (course[launch][side] == null) {
            double[] rest = Arrays.copyOfRange(seconds, launch, seconds.length);
            course[launch][side] = launches.chain(launch, side).follow(rest);
        }
        return course[launch][side];
    }

    @Override
    public int size() {
        return seconds.length;
    }

    @Override
    public int modes(int stage) {
        int sum = 0;
        for (int m = 0; m <= stage; m++) {
            if (launches.step[m] != 0) {
                for (int i = 0; i < launches.grade.sides().size(); i++) {
                    sum += course(m, i).modes(stage - m);
                }
            }
        }
        return sum;
    }

    @Override
    public Reading read(Probe probe, int stage) {
        double error = 0x1p-51 * Math.abs(launches.pull[stage]);
        for (Probe one : probe instanceof Probe.Range
                ? List.<Probe>of(new Probe.Highest(0), new Probe.Lowest(0))
                : List.of(probe)) {
            for (Term term : terms(one, stage)) {
                for (int m = 0; m <= stage; m++) {
                    error += Math.abs(term.weight() * launches.step[m]) * error(term, m, stage);
                }
            }
        }
        int modes = 0;
        for (int k = 0; k <= stage; k++) {
            modes += modes(k);
        }
        return new Reading(value(probe, stage), error, modes, Reading.Method.PRODUCTS);
    }

    /** No factor exceeds one. */
    private double error(Term term, int launch, int stage) {
        if (launches.step[launch] == 0) {
            return 0;
        }
        double sum = 0x1p-50;
        for (int i = 0; i < term.bySide().size(); i++) {
            sum += course(launch, i).read(term.bySide().get(i), stage - launch).error();
        }
        return sum;
    }

    @Override
    public double liquorAtStart(int stage) {
        throw new IllegalArgumentException("the liquor is the chain's");
    }

    @Override
    public double value(Probe probe, int stage) {
        if (probe instanceof Probe.Range) {
            return value(new Probe.Highest(0), stage) - value(new Probe.Lowest(0), stage);
        }
        double sum = launches.pull[stage];
        for (Term term : terms(probe, stage)) {
            for (int m = 0; m <= stage; m++) {
                if (launches.step[m] != 0) {
                    sum += term.weight() * launches.step[m] * product(term, m, stage, -1);
                }
            }
        }
        return sum;
    }

    /** What the sides make of one launch; all but one of them where that is 0 or more. */
    private double product(Term term, int launch, int stage, int without) {
        double product = 1;
        for (int i = 0; i < term.bySide().size(); i++) {
            if (i != without) {
                product *= course(launch, i).value(term.bySide().get(i), stage - launch);
            }
        }
        return product;
    }

    private List<Term> terms(Probe probe, int stage) {
        if (probe instanceof Probe.Mean || probe instanceof Probe.LotMean) {
            return Term.mean(launches.grade);
        }
        if (probe instanceof Probe.Core) {
            return Term.core(launches.grade);
        }
        if (probe instanceof Probe.At at) {
            return Term.at(launches.grade, at.position());
        }
        if (probe instanceof Probe.Surface) {
            return Term.surface(launches.grade);
        }
        if (probe instanceof Probe.Highest highest) {
            return Term.at(place(highest, stage));
        }
        if (probe instanceof Probe.Lowest lowest) {
            return Term.at(place(lowest, stage));
        }
        throw new IllegalArgumentException("no products read " + probe);
    }

    @Override
    public double[] gradient(Probe probe, int stage) {
        if (probe instanceof Probe.Range) {
            double[] high = gradient(new Probe.Highest(0), stage);
            double[] low = gradient(new Probe.Lowest(0), stage);
            for (int k = 0; k < high.length; k++) {
                high[k] -= low[k];
            }
            return high;
        }
        double[] bySeconds = new double[stage + 1];
        for (Term term : terms(probe, stage)) {
            for (int m = 0; m <= stage; m++) {
                for (int i = 0; launches.step[m] != 0 && i < term.bySide().size(); i++) {
                    double others = term.weight() * launches.step[m] * product(term, m, stage, i);
                    double[] own = course(m, i).gradient(term.bySide().get(i), stage - m);
                    for (int k = 0; k < own.length; k++) {
                        bySeconds[m + k] += others * own[k];
                    }
                }
            }
        }
        return bySeconds;
    }

    @Override
    public Sensitivity sensitivity(Probe probe, int stage) {
        if (probe instanceof Probe.Range) {
            return sensitivity(new Probe.Highest(0), stage).minus(sensitivity(new Probe.Lowest(0), stage));
        }
        double[] byPull = new double[stage + 1];
        for (Term term : terms(probe, stage)) {
            for (int m = 0; m <= stage; m++) {
                double answer = term.weight() * product(term, m, stage, -1);
                byPull[m] -= answer;
                if (m > 0) {
                    byPull[m - 1] += answer;
                }
            }
        }
        byPull[stage] += 1;
        double[] byContent = new double[stage + 1];
        for (int k = stage; k >= 0; k--) {
            if (Launches.rests(launches.stage(k))) {
                if (k > 0) {
                    byPull[k - 1] += byPull[k];
                }
            } else {
                byContent[k] = launches.stage(k).partition() * byPull[k];
            }
        }
        return new Sensitivity(gradient(probe, stage), byContent, new double[stage + 1]);
    }

    @Override
    public double[] profile(int grade, int stage, double... positions) {
        double[][] places = new double[launches.grade.sides().size()][1];
        places[launches.grade.shortest()] = positions;
        return grid(stage, places);
    }

    @Override
    public double[][] section(int grade, int stage, int first, int second, double[] across, double[] down) {
        return Cut.of(positions -> grid(stage, positions), launches.grade.sides(), first, second, across, down);
    }

    @Override
    public double[] place(Probe.Highest probe, int stage) {
        return place(probe, stage, 1);
    }

    @Override
    public double[] place(Probe.Lowest probe, int stage) {
        return place(probe, stage, -1);
    }

    /** Searched for once: value, error and derivatives all ask. */
    private double[] place(Probe probe, int stage, double sign) {
        return places.computeIfAbsent(
                List.of(probe, stage),
                key -> Summit.place(positions -> grid(stage, positions), launches.grade.sides(), sign));
    }

    private double[] grid(int stage, double[][] positions) {
        int size = 1;
        for (double[] side : positions) {
            size *= side.length;
        }
        double[] sum = new double[size];
        Arrays.fill(sum, launches.pull[stage]);
        for (int m = 0; m <= stage; m++) {
            if (launches.step[m] != 0) {
                List<double[]> rows = new ArrayList<>();
                for (int i = 0; i < positions.length; i++) {
                    rows.add(course(m, i).profile(0, stage - m, positions[i]));
                }
                double[] product = Product.outer(rows);
                for (int n = 0; n < size; n++) {
                    sum[n] += launches.step[m] * product[n];
                }
            }
        }
        return sum;
    }
}
