package org.soakwright.planner.cli;

import java.io.IOException;
import java.nio.file.AccessDeniedException;

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

    /** Why something could not be read or written, in a few words. */
    static String reason(IOException e) {
        String message = e.getMessage();
        return message == null || e instanceof AccessDeniedException ? "access denied" : message;
    }

    int status() {
        return status;
    }
}
