package org.soakwright.solver.stage;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.soakwright.solver.shape.Grade;

/**
 * The modes of one grade's pieces under one stage's conditions as products of its sides' modes: rates add, everything else multiplies.
 * A state is its coefficients, the last side's index running fastest.
 */
public final class Product {
    private final List<Ritz> sides;
    private final double[] rate;
    private final double[] uniform;
    private final double volume;

    /**
     * Combines sides.
     *
     * @param sides modes of each of the grade's sides, in order
     */
    public Product(Grade grade, Conditions conditions, List<Ritz> sides) {
        this.sides = List.copyOf(sides);
        volume = conditions.partition() * grade.volume();
        double[] rates = {0};
        double[] uniforms = {1};
        for (int i = 0; i < sides.size(); i++) {
            Ritz side = sides.get(i);
            double pace = conditions.pace(grade, i);
            double[] grownRates = new double[rates.length * side.size()];
            double[] grownUniforms = new double[grownRates.length];
            for (int n = 0; n < rates.length; n++) {
                for (int m = 0; m < side.size(); m++) {
                    grownRates[n * side.size() + m] = rates[n] + pace * side.rate(m);
                    grownUniforms[n * side.size() + m] = uniforms[n] * side.uniform(m);
                }
            }
            rates = grownRates;
            uniforms = grownUniforms;
        }
        rate = rates;
        uniform = uniforms;
    }

    public int size() {
        return rate.length;
    }

    /** K times volume of the grade, m3 of liquor that would hold as much. */
    public double capacity() {
        return volume;
    }

    /** Coefficients after so many seconds in surroundings that the pieces do not change. */
    public double[] decayed(double[] coefficients, double seconds) {
        double[] after = new double[rate.length];
        for (int n = 0; n < after.length; n++) {
            after[n] = coefficients[n] * Math.exp(-rate[n] * seconds);
        }
        return after;
    }

    /** Derivative by the time of what a row reads of coefficients that decay so. */
    public double slope(double[] row, double[] coefficients) {
        double sum = 0;
        for (int n = 0; n < rate.length; n++) {
            sum -= rate[n] * row[n] * coefficients[n];
        }
        return sum;
    }

    double[] rates() {
        return rate;
    }

    /** What the uniform state has of each mode, which is also each mode's mean. Not to be changed. */
    public double[] uniform() {
        return uniform;
    }

    /** Share of the uniform state that no mode holds: 0 but where the surface is held at the liquor's content. */
    public double missing() {
        double kept = 1;
        for (Ritz side : sides) {
            double sum = 0;
            for (int m = 0; m < side.size(); m++) {
                sum += side.uniform(m) * side.uniform(m);
            }
            kept *= sum;
        }
        return Math.max(0, 1 - kept);
    }

    /** The modes on their sides. */
    public Ritz side(int side) {
        return sides.get(side);
    }

    /** What multiplies the coefficients in a reading that is a product of one reading of each side. */
    public static double[] outer(List<double[]> rows) {
        double[] product = {1};
        for (double[] row : rows) {
            double[] grown = new double[product.length * row.length];
            for (int n = 0; n < product.length; n++) {
                for (int m = 0; m < row.length; m++) {
                    grown[n * row.length + m] = product[n] * row[m];
                }
            }
            product = grown;
        }
        return product;
    }

    /** A matrix for each side, applied to coefficients one side after the other. */
    public static double[] apply(List<double[][]> matrices, double[] coefficients) {
        double[] state = coefficients;
        int after = coefficients.length;
        int before = 1;
        for (double[][] matrix : matrices) {
            after /= matrix[0].length;
            state = after == 1 ? last(matrix, state, before) : along(matrix, state, before, after);
            before *= matrix.length;
        }
        return state;
    }

    /** The side whose index runs fastest: column by column, so that what is added to lies side by side. */
    private static double[] last(double[][] matrix, double[] state, int before) {
        int rows = matrix.length;
        int columns = matrix[0].length;
        double[][] turned = transposed(matrix);
        double[] next = new double[before * rows];
        double[] sum = new double[rows];
        for (int b = 0; b < before; b++) {
            Arrays.fill(sum, 0);
            for (int c = 0; c < columns; c++) {
                double factor = state[b * columns + c];
                double[] column = turned[c];
                for (int r = 0; r < rows; r++) {
                    sum[r] += factor * column[r];
                }
            }
            System.arraycopy(sum, 0, next, b * rows, rows);
        }
        return next;
    }

    /** Any other: whole runs of the sides after it at once. */
    private static double[] along(double[][] matrix, double[] state, int before, int after) {
        int rows = matrix.length;
        int columns = matrix[0].length;
        double[] next = new double[before * rows * after];
        for (int b = 0; b < before; b++) {
            for (int r = 0; r < rows; r++) {
                int to = (b * rows + r) * after;
                for (int c = 0; c < columns; c++) {
                    double factor = matrix[r][c];
                    int from = (b * columns + c) * after;
                    for (int a = 0; a < after; a++) {
                        next[to + a] += factor * state[from + a];
                    }
                }
            }
        }
        return next;
    }

    /** Each matrix turned over. */
    public static List<double[][]> transposed(List<double[][]> matrices) {
        List<double[][]> turned = new ArrayList<>();
        matrices.forEach(matrix -> turned.add(transposed(matrix)));
        return turned;
    }

    private static double[][] transposed(double[][] matrix) {
        double[][] turned = new double[matrix[0].length][matrix.length];
        for (int r = 0; r < matrix.length; r++) {
            for (int c = 0; c < matrix[0].length; c++) {
                turned[c][r] = matrix[r][c];
            }
        }
        return turned;
    }
}
