package org.soakwright.planner.cli;

/** Exit statuses. */
final class Exit {
    /** Done; also when a recipe followed misses its targets. */
    static final int DONE = 0;

    /** No plan meets the targets. */
    static final int NO_PLAN = 1;

    /** Bad input or usage. */
    static final int BAD_INPUT = 2;

    /** The program or what it writes to failed. */
    static final int FAILED = 3;

    private Exit() {}
}
