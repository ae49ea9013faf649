package org.soakwright.planner.cli;

/** The version that the jar was built as. */
final class Version {
    private Version() {}

    /** Such as {@code 0.1.0}; {@code development} where the classes do not come from a jar. */
    static String current() {
        String version = Soakwright.class.getPackage().getImplementationVersion();
        return version == null ? "development" : version;
    }
}
