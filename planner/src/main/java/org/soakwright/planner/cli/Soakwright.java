package org.soakwright.planner.cli;

/** The command line's front door. */
public final class Soakwright {
    private Soakwright() {}

    public static void main(String[] args) {
        System.out.println("soakwright");
    }
}
