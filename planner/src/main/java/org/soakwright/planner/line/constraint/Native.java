package org.soakwright.planner.line.constraint;

import com.google.ortools.Loader;

/** Whether the constraint solver's native part is there. */
public final class Native {
    /** Set to {@code off}, lines are planned as where there is none. */
    public static final String SWITCH = "soakwright.constraint-solver";

    private Native() {}

    /** Loads it, once; false where this platform has none or it is switched off. */
    public static boolean loads() {
        if ("off".equals(System.getProperty(SWITCH))) {
            return false;
        }
        return Holder.LOADED;
    }

    private static final class Holder {
        static final boolean LOADED = load();

        private static boolean load() {
            try {
                Loader.loadNativeLibraries();
                return true;
            } catch (RuntimeException | LinkageError e) {
                // No platform jar, a system without the C++ library it needs, or a folder for temporary files that runs
                // nothing.
                return false;
            }
        }
    }
}
