package org.soakwright.planner.cli;

/** Why a command ends early, in one line for whoever gave it. */
final class Refusal extends Exception {
    private static final long serialVersionUID = 1;

    private final int status;

    Refusal(int status, String message) {
        super(message);
        this.status = status;
    }

    Refusal(int status, String message, Throwable cause) {
        super(message, cause);
        this.status = status;
    }

    int status() {
        return status;
    }
}
