package org.soakwright.planner.batch;

import java.util.OptionalDouble;

/**
 * What a batch takes.
 *
 * @param seconds all steps and the gaps between them and between their fills
 * @param liquorM3 all fills plus what runs through, m3; empty where a liquor is unlimited
 * @param cost in the recipe's currency; empty where nothing is priced or the liquor cannot be counted
 */
public record Totals(double seconds, OptionalDouble liquorM3, OptionalDouble cost) {}
