package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.model.Counted;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/** What a recipe can say and this version cannot compute yet. */
final class NotYet {
    private final List<Problem> problems = new ArrayList<>();

    private NotYet() {}

    /**
     * Everything in the recipe can be computed.
     *
     * @throws Unsound with each place otherwise
     */
    static void require(Recipe recipe) {
        NotYet notYet = new NotYet();
        recipe.species().forEach(notYet::species);
        recipe.targets().forEach(notYet::target);
        if (!notYet.problems.isEmpty()) {
            throw new Unsound(notYet.problems);
        }
    }

    private void refuse(Place place, String what) {
        problems.add(new Problem(place, what + ": not computed yet by this version; remove it"));
    }

    private void species(Species species) {
        if (species.traits().skin() != null && species.traits().skin().face() == Faces.ONE) {
            refuse(species.traits().skin().place(), "a skin on one face");
        }
        species.traits().skins().values().stream()
                .filter(skin -> skin.face() == Faces.ONE)
                .forEach(skin -> refuse(skin.place(), "a skin on one face"));
    }

    private void target(Target target) {
        if (target instanceof Target.OfMass) {
            refuse(target.place(), "total: mass");
        } else if (target instanceof Target.OfPieces pieces && !pieces.counted().equals(Counted.AS_LOADED)) {
            refuse(target.place(), "a target per anything but the mass as loaded");
        }
    }
}
