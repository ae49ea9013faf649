package org.soakwright.solver.chain;

/** A reading as part of a sum. */
public record Part(double weight, Probe probe) {}
