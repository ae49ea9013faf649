package org.soakwright.recipes.parsing;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Dimension;
import org.soakwright.recipes.text.Unit;

/**
 * A list of measured pieces.
 *
 * @param dimension which of the sizes was measured
 * @param unit of that column
 * @param weightUnit of the column of weights; null where there is none
 */
record SizeList(Dimension dimension, Unit unit, @Nullable Unit weightUnit, List<Row> rows) {
    /** One piece, in metres and kilograms; 0 kg where none was weighed. */
    record Row(double size, double weight) {}
}
