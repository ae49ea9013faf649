package org.soakwright.solver.chain;

import java.util.ArrayList;
import java.util.List;

/** A {@link LaunchChain} followed: every grade on its own. */
final class LaunchCourse extends Course {
    private final LaunchChain chain;
    private final int stages;
    private final List<Course> alone = new ArrayList<>();

    LaunchCourse(LaunchChain chain, double[] seconds) {
        Chain.requireDurations(seconds, chain.size());
        this.chain = chain;
        stages = seconds.length;
        for (int j = 0; j < chain.lot().size(); j++) {
            alone.add(
                    chain.way(j) instanceof LaunchChain.Way.Waves waves
                            ? waves.chain().follow(seconds)
                            : new ProductCourse(((LaunchChain.Way.Products) chain.way(j)).launches(), seconds));
        }
    }

    @Override
    public int size() {
        return stages;
    }

    @Override
    public int modes(int stage) {
        return alone.stream().mapToInt(course -> course.modes(stage)).sum();
    }

    @Override
    public Reading read(Probe probe, int stage) {
        if (probe instanceof Probe.Liquor) {
            return new Reading(value(probe, stage), 0, 0, Reading.Method.PRODUCTS);
        }
        double error = 0;
        int modes = 0;
        Reading.Method method = Reading.Method.MODES;
        for (int j = 0; j < alone.size(); j++) {
            double share = share(probe, j);
            if (share > 0) {
                Reading one = alone.get(j).read(own(probe), stage);
                error += share * one.error();
                modes += one.modes();
                method = one.method() == Reading.Method.PRODUCTS ? one.method() : method;
            }
        }
        return new Reading(value(probe, stage), error, modes, method);
    }

    @Override
    public double liquorAtStart(int stage) {
        return value(new Probe.Liquor(), stage);
    }

    @Override
    public double value(Probe probe, int stage) {
        if (probe instanceof Probe.Liquor) {
            for (int k = stage; k >= 0; k--) {
                if (chain.stage(k).wets()) {
                    return chain.stage(k).offset();
                }
            }
            return 0;
        }
        double sum = 0;
        for (int j = 0; j < alone.size(); j++) {
            double share = share(probe, j);
            sum += share > 0 ? share * alone.get(j).value(own(probe), stage) : 0;
        }
        return sum;
    }

    @Override
    public Sensitivity sensitivity(Probe probe, int stage) {
        if (probe instanceof Probe.Liquor) {
            return Sensitivity.ofStillLiquor(chain, stage);
        }
        Sensitivity sum = null;
        for (int j = 0; j < alone.size(); j++) {
            double share = share(probe, j);
            if (share > 0) {
                Sensitivity one = alone.get(j).sensitivity(own(probe), stage).times(share);
                sum = sum == null ? one : sum.plus(one);
            }
        }
        return java.util.Objects.requireNonNull(sum, "no grade is read");
    }

    /** How much of a reading a grade contributes: all or nothing, but for the lot's mean. */
    private double share(Probe probe, int grade) {
        if (probe instanceof Probe.LotMean) {
            double whole = chain.lot().stream().mapToDouble(one -> one.volume()).sum();
            return chain.lot().get(grade).volume() / whole;
        }
        return probe.grade() == grade ? 1 : 0;
    }

    private static Probe own(Probe probe) {
        return probe.of(0);
    }

    @Override
    public double[] profile(int grade, int stage, double... positions) {
        return alone.get(grade).profile(0, stage, positions);
    }

    @Override
    public double[][] section(int grade, int stage, int first, int second, double[] across, double[] down) {
        return alone.get(grade).section(0, stage, first, second, across, down);
    }

    @Override
    public double[] place(Probe.Highest probe, int stage) {
        return alone.get(probe.grade()).place(new Probe.Highest(0), stage);
    }

    @Override
    public double[] place(Probe.Lowest probe, int stage) {
        return alone.get(probe.grade()).place(new Probe.Lowest(0), stage);
    }
}
