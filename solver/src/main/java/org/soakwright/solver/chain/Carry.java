package org.soakwright.solver.chain;

import org.soakwright.solver.stage.Modes;

/**
 * What each mode of one stage becomes in the modes of the next: theta changes by the ratio of the partitions, since the content
 * carries over. Computed as far as it is asked for.
 */
final class Carry {
    private final Modes from;
    private final Modes to;
    private final double ratio;
    private int columns;
    private int rows;
    private double[][] column = new double[0][];

    Carry(Modes from, Modes to) {
        this.from = from;
        this.to = to;
        ratio = from.conditions().partition() / to.conditions().partition();
    }

    /** Columns by mode of the earlier stage; at least so many columns and rows. */
    double[][] of(int wantedColumns, int wantedRows) {
        if (wantedColumns > columns || wantedRows > rows) {
            grow(Math.max(wantedColumns, columns), Math.max(wantedRows, rows));
        }
        return column;
    }

    private void grow(int newColumns, int newRows) {
        double[][] grown = new double[newColumns][];
        for (int n = 0; n < newColumns; n++) {
            double[] old = n < columns ? column[n] : new double[0];
            grown[n] = java.util.Arrays.copyOf(old, newRows);
            for (int m = old.length; m < newRows; m++) {
                grown[n][m] = ratio * to.overlap(m, from, n);
            }
        }
        column = grown;
        columns = newColumns;
        rows = newRows;
    }
}
