@org.jspecify.annotations.NullMarked
package org.soakwright.planner;
