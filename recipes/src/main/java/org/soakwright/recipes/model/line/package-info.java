/** What a line file says: vessels, crew, moves and lots that share them. Immutable records, each knowing its place. */
@NullMarked
package org.soakwright.recipes.model.line;

import org.jspecify.annotations.NullMarked;
