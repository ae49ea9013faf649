package org.soakwright.solver.chain;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Side;
import org.soakwright.solver.stage.Bath;
import org.soakwright.solver.stage.Bathing;
import org.soakwright.solver.stage.Product;
import org.soakwright.solver.stage.Ritz;

/**
 * A {@link RitzChain} followed. Within a stage theta is the offset, plus what the liquor differs from it, plus the coefficients times
 * modes.
 */
final class RitzCourse extends Course {
    /** Of the largest driving difference: what each inverse transform may be wrong by. */
    private static final double TRANSFORM = 4e-12;

    /** Of the same: below this nobody looks at a single place. */
    private static final double SHARP = 5e-9;

    /** The most by which the error is taken to fall with a step of the degree where it hardly falls. */
    private static final double SLOWEST = 0.9;

    final RitzChain chain;
    final Space space;
    final double[] seconds;
    private final Leg[] legs;
    private final Map<List<Object>, double[]> places = new HashMap<>();
    private @Nullable RitzCourse lower;

    /**
     * One stage followed.
     *
     * @param end coefficients at the end, by grade
     * @param liquor what the liquor differs from the offset at the end; 0 where pieces do not change it
     * @param poured content of the liquor at the beginning, what clung mixed in
     * @param met content of the liquor last met
     * @param passage how pieces and liquor changed each other; null where they do not
     */
    record Leg(double[][] end, double liquor, double poured, double met, Bathing.@Nullable Passage passage) {}

    RitzCourse(RitzChain chain, Space space, double[] seconds) {
        this.chain = chain;
        this.space = space;
        this.seconds = seconds;
        legs = new Leg[seconds.length];
        int known = 0;
        RitzCourse earlier = space.passed().course;
        if (earlier != null) {
            int most = Math.min(seconds.length, earlier.legs.length);
            while (known < most && seconds[known] == earlier.seconds[known]) {
                legs[known] = earlier.legs[known];
                known++;
            }
        }
        for (int k = known; k < legs.length; k++) {
            legs[k] = followed(k);
        }
        space.passed().course = this;
    }

    private Leg followed(int k) {
        Stage stage = chain.stage(k);
        double offset = stage.offset();
        double clinging = k == 0 ? 0 : legs[k - 1].met;
        double fresh = fresh(stage);
        double poured = stage.wets() ? (1 - chain.mixed(k)) * fresh + chain.mixed(k) * clinging : clinging;
        List<Product> products = space.products(k);
        double[][] begin = new double[products.size()][];
        double[] unheld = new double[products.size()];
        for (int j = 0; j < begin.length; j++) {
            double[] uniform = products.get(j).uniform();
            double shift;
            if (k == 0) {
                begin[j] = space.loaded(j);
                shift = -offset;
                unheld[j] = space.loadedMean(j) - Link.dot(uniform, begin[j], uniform.length);
            } else {
                double[] before = legs[k - 1].end[j];
                double ratio = chain.stage(k - 1).partition() / stage.partition();
                begin[j] = Product.apply(space.carry(k, j), before);
                double[] meanBefore = space.products(k - 1).get(j).uniform();
                shift = ratio * (chain.stage(k - 1).offset() + legs[k - 1].liquor) - offset;
                unheld[j] = ratio * Link.dot(meanBefore, before, before.length)
                        - Link.dot(uniform, begin[j], uniform.length);
            }
            add(begin[j], shift, uniform);
            unheld[j] += shift * products.get(j).missing();
        }
        if (!changes(k)) {
            return new Leg(decayed(products, begin, seconds[k]), 0, poured, stage.wets() ? offset : clinging, null);
        }
        double pour = poured - offset;
        double liquor = joined(k, pour, unheld);
        for (int j = 0; j < begin.length; j++) {
            add(begin[j], -liquor, products.get(j).uniform());
        }
        Bathing.Passage passage = space.bathing(k, seconds[k]).pass(begin, liquor);
        return new Leg(passage.end(), passage.liquor(), poured, offset + passage.liquor(), passage);
    }

    /** The liquor once what no mode holds of the pieces has joined it: their outermost layer, which follows it at once. */
    private double joined(int k, double pour, double[] unheld) {
        List<Product> products = space.products(k);
        double volume = volume(k);
        double solute = volume * pour;
        double room = volume;
        for (int j = 0; j < unheld.length; j++) {
            solute += products.get(j).capacity() * unheld[j];
            room += products.get(j).capacity() * products.get(j).missing();
        }
        return solute / room;
    }

    double volume(int k) {
        return ((Bath.Vessel) chain.conditions(k).bath()).volume();
    }

    /** Whether pieces and liquor change each other in a stage. */
    boolean changes(int k) {
        return chain.stage(k).surroundings() instanceof Surroundings.Vessel;
    }

    static double fresh(Stage stage) {
        return stage.surroundings() instanceof Surroundings.Vessel vessel ? vessel.content() : stage.offset();
    }

    private static void add(double[] coefficients, double factor, double[] uniform) {
        for (int n = 0; n < coefficients.length; n++) {
            coefficients[n] += factor * uniform[n];
        }
    }

    static double[][] decayed(List<Product> products, double[][] coefficients, double seconds) {
        double[][] end = new double[coefficients.length][];
        for (int j = 0; j < end.length; j++) {
            end[j] = products.get(j).decayed(coefficients[j], seconds);
        }
        return end;
    }

    Leg leg(int stage) {
        return legs[stage];
    }

    @Override
    public int size() {
        return legs.length;
    }

    @Override
    public int modes(int stage) {
        int sum = 0;
        for (Product product : space.products(stage)) {
            sum += product.size();
        }
        return sum;
    }

    @Override
    public Reading read(Probe probe, int stage) {
        int modes = 0;
        for (int k = 0; k <= stage; k++) {
            modes += modes(k);
        }
        return new Reading(value(probe, stage), error(probe, stage), modes, Reading.Method.POLYNOMIALS);
    }

    private double error(Probe probe, int stage) {
        if (probe instanceof Probe.Range range) {
            return error(new Probe.Highest(range.grade()), stage) + error(new Probe.Lowest(range.grade()), stage);
        }
        RitzCourse once = lower();
        double step = gap(once, probe, stage);
        double before = once.gap(once.lower(), probe, stage);
        // The error falls by about as much with every step of the degree; what is left after this one is the rest of
        // that series.
        double ratio = before > 0 ? Math.min(SLOWEST, step / before) : SLOWEST;
        double partition =
                probe instanceof Probe.Liquor ? 1 : chain.stage(stage).partition();
        double floor = TRANSFORM * (stage + 1)
                + space.fineness().blur()
                + (probe instanceof Probe.Mean || probe.grade() < 0 ? 0 : SHARP);
        return step * Math.max(1, 4 * ratio / (1 - ratio)) + partition * floor * driving(stage);
    }

    private RitzCourse lower() {
        if (lower == null) {
            lower = chain.follow(space.fineness().lower(), seconds);
        }
        return lower;
    }

    /** How far a reading and its neighbours lie from another course's: one number may agree by chance. */
    private double gap(RitzCourse other, Probe probe, int stage) {
        List<Probe> all = probe.grade() < 0
                ? List.of(probe, new Probe.LotMean(), new Probe.Liquor())
                : List.of(
                        probe,
                        new Probe.Mean(probe.grade()),
                        new Probe.Core(probe.grade()),
                        new Probe.Surface(probe.grade()));
        double worst = 0;
        for (Probe one : all) {
            worst = Math.max(worst, Math.abs(value(one, stage) - other.value(one, stage)));
        }
        if (probe instanceof Probe.Highest || probe instanceof Probe.Lowest) {
            // An extremum is off by no more than the whole profile is.
            double[][] places = Summit.looks(chain.lot().get(probe.grade()).sides());
            double[] here = grid(probe.grade(), stage, places);
            double[] there = other.grid(probe.grade(), stage, places);
            for (int i = 0; i < here.length; i++) {
                worst = Math.max(worst, Math.abs(here[i] - there[i]));
            }
        }
        return worst;
    }

    /** The largest difference between pieces and surroundings, or between two surroundings, so far, as theta. */
    private double driving(int stage) {
        double low = Double.POSITIVE_INFINITY;
        double high = 0;
        for (Start start : chain.starts()) {
            high = Math.max(high, start.most() / chain.stage(0).partition());
            low = Math.min(low, start.most() / chain.stage(0).partition());
        }
        for (int k = 0; k <= stage; k++) {
            if (k > 0) {
                high *= Math.max(
                        1, chain.stage(k - 1).partition() / chain.stage(k).partition());
            }
            if (!Launches.rests(chain.stage(k))) {
                for (double content : new double[] {chain.stage(k).offset(), legs[k].poured}) {
                    high = Math.max(high, content);
                    low = Math.min(low, content);
                }
            }
        }
        return high - low;
    }

    @Override
    public double liquorAtStart(int stage) {
        return legs[stage].poured;
    }

    @Override
    public double value(Probe probe, int stage) {
        if (probe instanceof Probe.Liquor) {
            return legs[stage].met;
        }
        if (probe instanceof Probe.Range range) {
            return value(new Probe.Highest(range.grade()), stage) - value(new Probe.Lowest(range.grade()), stage);
        }
        double sum = 0;
        double[] shares = shares(probe);
        for (int j = 0; j < shares.length; j++) {
            if (shares[j] > 0) {
                double[] row = row(probe, stage, j);
                sum += shares[j] * Link.dot(row, legs[stage].end[j], row.length);
            }
        }
        return chain.stage(stage).partition() * (base(stage) + sum);
    }

    private double base(int stage) {
        return chain.stage(stage).offset() + legs[stage].liquor;
    }

    /** How much of a reading each grade contributes: all or nothing, but for the lot's mean. */
    double[] shares(Probe probe) {
        double[] shares = new double[chain.lot().size()];
        if (!(probe instanceof Probe.LotMean)) {
            shares[probe.grade()] = 1;
            return shares;
        }
        double whole = chain.lot().stream().mapToDouble(Grade::volume).sum();
        for (int j = 0; j < shares.length; j++) {
            shares[j] = chain.lot().get(j).volume() / whole;
        }
        return shares;
    }

    /** The functional that a reading is, on one grade's coefficients. */
    double[] row(Probe probe, int stage, int grade) {
        Product product = space.products(stage).get(grade);
        Grade pieces = chain.lot().get(grade);
        if (probe instanceof Probe.Mean || probe instanceof Probe.LotMean) {
            return product.uniform();
        }
        if (probe instanceof Probe.Core) {
            return sum(product, Term.core(pieces));
        }
        if (probe instanceof Probe.At at) {
            return sum(product, Term.at(pieces, at.position()));
        }
        if (probe instanceof Probe.Surface) {
            return sum(product, Term.surface(pieces));
        }
        if (probe instanceof Probe.Highest highest) {
            return sum(product, Term.at(place(highest, stage)));
        }
        if (probe instanceof Probe.Lowest lowest) {
            return sum(product, Term.at(place(lowest, stage)));
        }
        throw new IllegalArgumentException("no single functional reads " + probe);
    }

    private static double[] sum(Product product, List<Term> terms) {
        double[] sum = new double[product.size()];
        for (Term term : terms) {
            List<double[]> rows = new ArrayList<>();
            for (int i = 0; i < term.bySide().size(); i++) {
                Ritz side = product.side(i);
                rows.add(term.bySide().get(i) instanceof Probe.At at ? side.at(at.position()) : side.uniform());
            }
            add(sum, term.weight(), Product.outer(rows));
        }
        return sum;
    }

    @Override
    public double[] profile(int grade, int stage, double... positions) {
        Grade pieces = chain.lot().get(grade);
        double[][] places = Cut.throughCore(pieces.sides());
        places[pieces.shortest()] = positions;
        return grid(grade, stage, places);
    }

    @Override
    public double[][] section(int grade, int stage, int first, int second, double[] across, double[] down) {
        List<Side> sides = chain.lot().get(grade).sides();
        return Cut.of(positions -> grid(grade, stage, positions), sides, first, second, across, down);
    }

    private double[] grid(int grade, int stage, double[][] positions) {
        Product product = space.products(stage).get(grade);
        List<double[][]> rows = new ArrayList<>();
        for (int i = 0; i < positions.length; i++) {
            double[][] values = new double[positions[i].length][];
            for (int p = 0; p < values.length; p++) {
                values[p] = product.side(i).at(positions[i][p]);
            }
            rows.add(values);
        }
        double[] contents = Product.apply(rows, legs[stage].end[grade]);
        for (int n = 0; n < contents.length; n++) {
            contents[n] = chain.stage(stage).partition() * (base(stage) + contents[n]);
        }
        return contents;
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
                key -> Summit.place(
                        positions -> grid(probe.grade(), stage, positions),
                        chain.lot().get(probe.grade()).sides(),
                        sign));
    }

    @Override
    public Sensitivity sensitivity(Probe probe, int stage) {
        return new Backwards(this).of(plain(List.of(new Part(1, probe))), stage);
    }

    @Override
    public double[] gradient(List<Part> sum, int stage) {
        return new Backwards(this).of(plain(sum), stage).bySeconds();
    }

    /** A range is a difference of two readings. */
    private static List<Part> plain(List<Part> sum) {
        List<Part> plain = new ArrayList<>();
        for (Part part : sum) {
            if (part.probe() instanceof Probe.Range range) {
                plain.add(new Part(part.weight(), new Probe.Highest(range.grade())));
                plain.add(new Part(-part.weight(), new Probe.Lowest(range.grade())));
            } else {
                plain.add(part);
            }
        }
        return plain;
    }
}
