package org.soakwright.solver.finitevolume;

/** A complex number. */
record Complex(double re, double im) {
    static final Complex ZERO = new Complex(0, 0);

    Complex plus(Complex o) {
        return new Complex(re + o.re, im + o.im);
    }

    Complex plus(double real) {
        return new Complex(re + real, im);
    }

    Complex minus(Complex o) {
        return new Complex(re - o.re, im - o.im);
    }

    Complex times(Complex o) {
        return new Complex(re * o.re - im * o.im, re * o.im + im * o.re);
    }

    Complex times(double real) {
        return new Complex(re * real, im * real);
    }

    Complex reciprocal() {
        double square = re * re + im * im;
        return new Complex(re / square, -im / square);
    }

    Complex exp() {
        double size = Math.exp(re);
        return new Complex(size * Math.cos(im), size * Math.sin(im));
    }
}
