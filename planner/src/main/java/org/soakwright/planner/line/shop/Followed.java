package org.soakwright.planner.line.shop;

/** Times of a job that were followed exactly, and what came of them. */
public record Followed(long[] times, Physics.Reading reading) {}
