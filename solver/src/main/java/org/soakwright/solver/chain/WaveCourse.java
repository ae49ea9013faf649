package org.soakwright.solver.chain;

import java.util.Arrays;

/** A chain of standing waves followed; derivatives by one backward pass, the adjoint. */
final class WaveCourse extends Course {
    /** Rounding of one coefficient, as a multiple of the machine's precision: measured below 10, bounded here by 32. */
    private static final double ROUNDING = 32 * 0x1p-53;

    /** What the modes left out keep, as a share of what enters the stage: exp(-40), with room for their readings. */
    private static final double LEFT_OUT = 4e-17;

    private final WaveChain chain;
    private final double[] seconds;
    private final int[] count;
    private final double[][] decay;
    private final double[][] end;
    private final double[] poured;
    private final double[] liquor;
    private final double[] error;
    private final double[][] places;

    WaveCourse(WaveChain chain, double[] seconds) {
        int stages = seconds.length;
        Chain.requireDurations(seconds, chain.size());
        this.chain = chain;
        this.seconds = seconds;
        count = new int[stages];
        decay = new double[stages][];
        end = new double[stages][];
        poured = new double[stages];
        liquor = new double[stages];
        error = new double[stages];
        places = new double[stages][];
        double[] state = new double[0];
        double clinging = 0;
        double clingingError = 0;
        double beforeNorm = 0;
        for (int k = 0; k < stages; k++) {
            double t = seconds[k];
            Link link = chain.link(k);
            int n = link.needed(t, k);
            count[k] = n;
            state = link.begin(n, state, state.length, clinging);
            double entered = (k == 0 ? 0 : error[k - 1] * Math.sqrt(link.ratio))
                    + link.rootVolume() * link.mixed * clingingError
                    + ownError(link, n, state)
                    + LEFT_OUT * link.mostEntering(beforeNorm, clinging);
            beforeNorm = Math.sqrt(Link.dot(state, state, n));
            poured[k] = link.stage.wets() ? (1 - link.mixed) * link.fresh + link.mixed * clinging : clinging;
            double[] factor = new double[n];
            double[] after = new double[n];
            double blurred = 0;
            for (int m = 0; m < n; m++) {
                double exponent = link.modes.rate(m) * t;
                factor[m] = Math.exp(-exponent);
                after[m] = state[m] * factor[m];
                // A rate is known to a few units in the last place; what that leaves of the decay grows with its
                // exponent.
                double blur = (1 + 0.25 * exponent) * after[m];
                blurred += blur * blur;
            }
            decay[k] = factor;
            end[k] = after;
            // What was wrong at the beginning decays at least as the slowest mode does.
            error[k] = entered * factor[0] + ROUNDING * Math.sqrt(blurred);
            state = after;
            clinging = liquorAtEnd(link, n, after, clinging);
            liquor[k] = clinging;
            if (link.stage.wets()) {
                double rootVolume = link.rootVolume();
                clingingError = rootVolume == 0 ? 0 : error[k] / rootVolume;
            }
        }
    }

    private static double ownError(Link link, int count, double[] state) {
        return (link.defect(count) + ROUNDING) * Math.sqrt(Link.dot(state, state, count));
    }

    private static double liquorAtEnd(Link link, int count, double[] after, double before) {
        Surroundings around = link.stage.surroundings();
        if (around instanceof Surroundings.Vessel) {
            double sum = link.offset;
            for (int m = 0; m < count; m++) {
                sum += after[m] * link.modes.liquor(m);
            }
            return sum;
        }
        return around instanceof Surroundings.Plenty ? link.offset : before;
    }

    @Override
    public int size() {
        return seconds.length;
    }

    @Override
    public int modes(int stage) {
        return count[stage];
    }

    @Override
    public Reading read(Probe probe, int stage) {
        int modes = 0;
        for (int k = 0; k <= stage; k++) {
            modes += count[k];
        }
        return new Reading(value(probe, stage), error(probe, stage), modes, Reading.Method.MODES);
    }

    @Override
    public double liquorAtStart(int stage) {
        return poured[stage];
    }

    @Override
    public double value(Probe probe, int stage) {
        if (probe instanceof Probe.Liquor) {
            return liquor[stage];
        }
        if (probe instanceof Probe.Range range) {
            return value(new Probe.Highest(range.grade()), stage) - value(new Probe.Lowest(range.grade()), stage);
        }
        Link link = chain.link(stage);
        double theta = link.offset + Link.dot(row(probe, stage), end[stage], count[stage]);
        return link.stage.partition() * theta;
    }

    @Override
    public double[] profile(int grade, int stage, double... positions) {
        Link link = chain.link(stage);
        double[][] rows = chain.samples(stage, grade, positions).of(count[stage]);
        double[] contents = new double[positions.length];
        for (int i = 0; i < positions.length; i++) {
            double theta = link.offset + Link.dot(rows[i], end[stage], count[stage]);
            contents[i] = link.stage.partition() * theta;
        }
        return contents;
    }

    @Override
    public double[][] section(int grade, int stage, int first, int second, double[] across, double[] down) {
        throw new IllegalArgumentException("pieces of one axis have no cut along two sides");
    }

    @Override
    public double[] place(Probe.Highest probe, int stage) {
        return new double[] {place(2 * probe.grade(), stage, 1)};
    }

    @Override
    public double[] place(Probe.Lowest probe, int stage) {
        return new double[] {place(2 * probe.grade() + 1, stage, -1)};
    }

    /** Searched for once: value, error and derivatives all ask. */
    private double place(int slot, int stage, double sign) {
        if (places[stage] == null) {
            places[stage] = new double[2 * chain.lot().size()];
            Arrays.fill(places[stage], Double.NaN);
        }
        if (Double.isNaN(places[stage][slot])) {
            places[stage][slot] = chain.extrema(stage, slot / 2).place(end[stage], count[stage], sign);
        }
        return places[stage][slot];
    }

    @Override
    public Sensitivity sensitivity(Probe probe, int stage) {
        if (probe instanceof Probe.Range range) {
            return sensitivity(new Probe.Highest(range.grade()), stage)
                    .minus(sensitivity(new Probe.Lowest(range.grade()), stage));
        }
        return Adjoint.of(this, probe, stage);
    }

    Link link(int stage) {
        return chain.link(stage);
    }

    int count(int stage) {
        return count[stage];
    }

    double[] decay(int stage) {
        return decay[stage];
    }

    double[] end(int stage) {
        return end[stage];
    }

    /** The functional that the reading is, on the coefficients at the end of the stage; theta, without the offset. */
    double[] row(Probe probe, int stage) {
        Link link = chain.link(stage);
        int n = count[stage];
        double[] row = new double[n];
        if (probe instanceof Probe.Mean mean) {
            for (int m = 0; m < n; m++) {
                row[m] = link.modes.mean(mean.grade(), m);
            }
        } else if (probe instanceof Probe.LotMean) {
            double whole = 0;
            for (int j = 0; j < chain.lot().size(); j++) {
                whole += link.modes.capacity(j);
            }
            for (int m = 0; m < n; m++) {
                row[m] = link.modes.uniform(m) / whole;
            }
        } else if (probe instanceof Probe.Liquor) {
            for (int m = 0; m < n; m++) {
                row[m] = link.modes.liquor(m);
            }
        } else {
            int grade;
            double x;
            if (probe instanceof Probe.At at) {
                grade = at.grade();
                x = at.position();
            } else if (probe instanceof Probe.Core core) {
                grade = core.grade();
                x = 0;
            } else if (probe instanceof Probe.Surface surface) {
                grade = surface.grade();
                x = 1;
            } else if (probe instanceof Probe.Highest highest) {
                grade = highest.grade();
                x = place(highest, stage)[0];
            } else if (probe instanceof Probe.Lowest lowest) {
                grade = lowest.grade();
                x = place(lowest, stage)[0];
            } else {
                throw new IllegalArgumentException("no single functional reads " + probe);
            }
            for (int m = 0; m < n; m++) {
                row[m] = link.modes.at(grade, m, x);
            }
        }
        return row;
    }

    private double error(Probe probe, int stage) {
        Link link = chain.link(stage);
        double scale = link.stage.partition();
        if (probe instanceof Probe.Liquor) {
            if (!(link.stage.surroundings() instanceof Surroundings.Vessel)) {
                return stage == 0 || link.stage.wets() ? 0 : error(probe, stage - 1);
            }
            scale = 1;
        }
        if (probe instanceof Probe.Range range) {
            return error(new Probe.Highest(range.grade()), stage) + error(new Probe.Lowest(range.grade()), stage);
        }
        double[] row = row(probe, stage);
        return scale * (error[stage] * Math.sqrt(Link.dot(row, row, count[stage])) + ROUNDING * Math.abs(link.offset));
    }
}
