/** The command line: reads arguments, calls the services below, prints what they say. */
@org.jspecify.annotations.NullMarked
package org.soakwright.planner.cli;
