package org.soakwright.planner.batch;

/** Told what is being worked on; lets long work be stopped. */
public interface Progress {
    /** Nobody watches. */
    Progress NONE = (what, done) -> {};

    /**
     * Says how far the work has come.
     *
     * @param what a few words
     * @param done share of the work done, 0 to 1
     */
    void at(String what, double done);
}
