package org.soakwright.planner.conditions;

/**
 * What something written comes to.
 *
 * @param what such as {@code salt in brine tank}
 * @param written as the recipe has it
 * @param becomes in what is computed with
 * @param how the way from one to the other, with its source
 */
public record Conversion(String what, String written, String becomes, String how) {}
