package org.soakwright.solver.transport;

/** A property was asked for so far outside its source that no number is given. */
public final class OutOfRange extends IllegalArgumentException {
    private static final long serialVersionUID = 1;

    private final String what;
    private final double value;
    private final double low;
    private final double high;

    OutOfRange(Range range, double value) {
        super(range.what() + " must be from " + Figure.shown(range.low(), "1") + " to "
                + Figure.shown(range.high(), range.unit()) + " for " + range.source() + ", found "
                + Figure.shown(value, range.unit()));
        this.what = range.what();
        this.value = value;
        this.low = range.low();
        this.high = range.high();
    }

    /** What lies outside, as "temperature". */
    public String what() {
        return what;
    }

    /** What was found, SI. */
    public double value() {
        return value;
    }

    /** The least that can be computed, SI. */
    public double low() {
        return low;
    }

    /** The most that can be computed, SI. */
    public double high() {
        return high;
    }
}
