package org.soakwright.recipes.library;

/** What a caution does to a plan. */
public sealed interface Weight {
    /** It is shown beside the plan. */
    record Shown() implements Weight {}

    /**
     * The plan must not be used as it stands.
     *
     * @param because why no more leave is given than its source gives
     */
    record Stops(String because) implements Weight {}
}
