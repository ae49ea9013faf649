package org.soakwright.planner.report;

/**
 * Where a result comes from.
 *
 * @param version of this program
 * @param sha256 of the recipe file, lower-case hexadecimal
 */
public record Stamp(String version, String sha256) {}
