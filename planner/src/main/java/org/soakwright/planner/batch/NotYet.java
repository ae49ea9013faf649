package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Counted;
import org.soakwright.recipes.model.Diffusivities;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Film;
import org.soakwright.recipes.model.Per;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Start;
import org.soakwright.recipes.model.Step;
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
        recipe.steps().forEach(notYet::step);
        recipe.targets().forEach(notYet::target);
        if (!notYet.problems.isEmpty()) {
            throw new Unsound(notYet.problems);
        }
    }

    private void refuse(Place place, String what) {
        problems.add(new Problem(place, what + ": not computed yet by this version; remove it"));
    }

    private void species(Species species) {
        if (species.start() instanceof Start.Uniform uniform) {
            content(uniform.content());
        }
        diffusivities(species.diffusivity());
        if (species.traits().skin() != null) {
            refuse(species.traits().skin().place(), "skin");
        }
        species.traits().skins().values().forEach(skin -> refuse(skin.place(), "skin"));
    }

    private void content(Content content) {
        if (content.per() != Per.LOADED) {
            refuse(content.place(), "per");
        }
    }

    private void diffusivities(Diffusivities stated) {
        for (Diffusivity one : stated.all()) {
            if (one.law() instanceof Diffusivity.Law.Viscous) {
                refuse(one.place(), "scaling");
            } else if (one.law() instanceof Diffusivity.Law.Measured) {
                refuse(one.place(), "points");
            }
        }
    }

    private void step(Step step) {
        if (step instanceof Step.Wet wet) {
            if (wet.film() instanceof Film.Computed computed) {
                refuse(computed.place(), "a film from what moves the liquor");
            }
            wet.liquor().contents().values().stream()
                    .filter(content -> !wet.liquor().tells(content))
                    .forEach(content -> refuse(content.place(), "a content that needs the density of the liquor"));
        }
        if (step instanceof Step.Dry dry) {
            dry.air().equilibrium().values().forEach(this::content);
        }
    }

    private void target(Target target) {
        if (target instanceof Target.OfMass) {
            refuse(target.place(), "total: mass");
        } else if (target instanceof Target.OfPieces pieces && !pieces.counted().equals(Counted.AS_LOADED)) {
            refuse(target.place(), "a target per anything but the mass as loaded");
        }
    }
}
