/** What a recipe says: immutable records, validated in their constructors, each knowing its place in the file. */
@NullMarked
package org.soakwright.recipes.model;

import org.jspecify.annotations.NullMarked;
