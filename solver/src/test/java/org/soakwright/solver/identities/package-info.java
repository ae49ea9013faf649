/** What must hold whatever the numbers: identities, limits and inequalities, each over many seeded draws. */
@org.jspecify.annotations.NullMarked
package org.soakwright.solver.identities;
