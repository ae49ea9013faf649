package org.soakwright.planner.cli;

import java.io.PrintStream;
import org.soakwright.planner.batch.Progress;

/** One line that tells how far long work has come, and is gone when the work is done. Work under a second shows none. */
final class ProgressLine implements Progress {
    private static final long PATIENCE_NANOS = 1_000_000_000L;
    private static final long BETWEEN_NANOS = 100_000_000L;
    private static final String ERASE = "\r\u001b[K";

    private final PrintStream err;
    private final boolean watched;
    private final long begun = System.nanoTime();
    private long last = begun;
    private boolean shown;

    ProgressLine(PrintStream err, boolean watched) {
        this.err = err;
        this.watched = watched;
    }

    @Override
    public void at(String what, double done) {
        if (watched) {
            show(what, done, System.nanoTime());
        }
    }

    private synchronized void show(String what, double done, long now) {
        if (now - begun >= PATIENCE_NANOS && (!shown || now - last >= BETWEEN_NANOS)) {
            err.print(ERASE + "soakwright: " + what + ", " + Math.round(100 * done) + " %");
            err.flush();
            last = now;
            shown = true;
        }
    }

    synchronized void erase() {
        if (shown) {
            err.print(ERASE);
            err.flush();
            shown = false;
        }
    }
}
