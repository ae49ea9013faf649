/** What users know, turned into what the solver needs: films, diffusivities by temperature, strengths of liquors, warming. */
@org.jspecify.annotations.NullMarked
package org.soakwright.planner.conditions;
