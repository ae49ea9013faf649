package org.soakwright.solver.finitevolume;

import java.util.List;
import java.util.function.DoubleBinaryOperator;

/** Values on the product of up to three axes, the last running fastest. */
final class Tensor {
    final int[] size;
    final double[] value;

    Tensor(int[] size, double[] value) {
        this.size = size.clone();
        this.value = value;
    }

    /** The same everywhere. */
    static Tensor level(int[] size, double value) {
        double[] values = new double[java.util.Arrays.stream(size).reduce(1, (a, b) -> a * b)];
        java.util.Arrays.fill(values, value);
        return new Tensor(size, values);
    }

    /** Every combination of one entry of each axis. */
    static Tensor outer(List<double[]> axes, DoubleBinaryOperator with) {
        Tensor whole = new Tensor(new int[0], new double[] {Double.NaN});
        for (double[] axis : axes) {
            boolean first = whole.size.length == 0;
            double[] next = new double[whole.value.length * axis.length];
            for (int i = 0; i < next.length; i++) {
                double own = axis[i % axis.length];
                next[i] = first ? own : with.applyAsDouble(whole.value[i / axis.length], own);
            }
            int[] size = java.util.Arrays.copyOf(whole.size, whole.size.length + 1);
            size[size.length - 1] = axis.length;
            whole = new Tensor(size, next);
        }
        return whole;
    }

    /** Each axis multiplied by its matrix. */
    Tensor times(List<double[][]> matrices) {
        Tensor result = this;
        for (int axis = 0; axis < size.length; axis++) {
            result = result.times(axis, matrices.get(axis));
        }
        return result;
    }

    private Tensor times(int axis, double[][] matrix) {
        int inner = 1;
        for (int i = axis + 1; i < size.length; i++) {
            inner *= size[i];
        }
        int from = size[axis];
        int to = matrix.length;
        int outer = value.length / (inner * from);
        double[] next = new double[outer * to * inner];
        for (int o = 0; o < outer; o++) {
            for (int r = 0; r < to; r++) {
                double[] row = matrix[r];
                int target = (o * to + r) * inner;
                int source = o * from * inner;
                if (inner == 1) {
                    double sum = 0;
                    for (int c = 0; c < from; c++) {
                        sum += row[c] * value[source + c];
                    }
                    next[target] = sum;
                    continue;
                }
                for (int c = 0; c < from; c++) {
                    double factor = row[c];
                    int start = source + c * inner;
                    for (int i = 0; i < inner; i++) {
                        next[target + i] += factor * value[start + i];
                    }
                }
            }
        }
        int[] sizes = size.clone();
        sizes[axis] = to;
        return new Tensor(sizes, next);
    }

    /** The value where each axis has the given index. */
    double at(int... index) {
        int place = 0;
        for (int i = 0; i < size.length; i++) {
            place = place * size[i] + index[i];
        }
        return value[place];
    }

    /** The indices of a place. */
    int[] index(int place) {
        int[] index = new int[size.length];
        int left = place;
        for (int i = size.length - 1; i >= 0; i--) {
            index[i] = left % size[i];
            left /= size[i];
        }
        return index;
    }

    double dot(Tensor other) {
        double sum = 0;
        for (int i = 0; i < value.length; i++) {
            sum += value[i] * other.value[i];
        }
        return sum;
    }
}
