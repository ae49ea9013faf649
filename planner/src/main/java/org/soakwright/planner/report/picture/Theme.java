package org.soakwright.planner.report.picture;

/** What a picture is looked at on; its structure is the same on each. */
public enum Theme {
    LIGHT,
    DARK,
    /** Shades only, for paper. */
    GREY
}
