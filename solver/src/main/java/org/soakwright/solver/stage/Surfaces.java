package org.soakwright.solver.stage;

import java.util.List;
import org.soakwright.solver.shape.Grade;

/** How the surfaces of a lot's grades meet what surrounds them in one stage. Sealed are all or none: a rest seals whatever it holds. */
public sealed interface Surfaces {
    /** That of a grade, from 0. */
    Surface of(int grade);

    /** Whether nothing passes anywhere. */
    boolean sealed();

    /** Refuses a lot of more or fewer grades than have surfaces here, and two faces where a piece has no two that could differ. */
    default void require(List<Grade> lot) {
        if (this instanceof ByGrade each && each.surfaces.size() != lot.size()) {
            throw new IllegalArgumentException("a surface for each of " + lot.size()
                    + " grades is wanted, or one for all; found " + each.surfaces.size());
        }
        for (int j = 0; j < lot.size(); j++) {
            if (of(j) instanceof Surface.Faces && !lot.get(j).twoFaced()) {
                throw new IllegalArgumentException(
                        "grade " + j + " has no side between two faces: one surface is wanted, found " + of(j));
            }
        }
    }

    /** One for all grades. */
    record Alike(Surface surface) implements Surfaces {
        @Override
        public Surface of(int grade) {
            return surface;
        }

        @Override
        public boolean sealed() {
            return surface instanceof Surface.Sealed;
        }
    }

    /**
     * Films go by size and shape, skins by what a piece is: one for each grade.
     *
     * @param surfaces in the order of the lot; at least one
     */
    record ByGrade(List<Surface> surfaces) implements Surfaces {
        public ByGrade {
            surfaces = List.copyOf(surfaces);
            if (surfaces.isEmpty()) {
                throw new IllegalArgumentException("a surface for each grade is wanted, found none");
            }
            long sealed =
                    surfaces.stream().filter(Surface.Sealed.class::isInstance).count();
            if (sealed != 0 && sealed != surfaces.size()) {
                throw new IllegalArgumentException("either all grades are sealed or none, found " + surfaces);
            }
        }

        @Override
        public Surface of(int grade) {
            return surfaces.get(grade);
        }

        @Override
        public boolean sealed() {
            return surfaces.get(0) instanceof Surface.Sealed;
        }
    }
}
