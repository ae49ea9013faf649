package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;

/** Goes through a recipe as {@link Recipe#each} does, and names what carries a give-or-take. */
final class Doubts {
    private final Map<Place, Uncertain> found = new LinkedHashMap<>();

    Doubts(Recipe recipe) {
        lot(recipe.lot());
        recipe.species().forEach(this::species);
        recipe.steps().forEach(this::step);
    }

    /** In the order of the file, each once. */
    List<Uncertain> all() {
        List<Uncertain> all = new ArrayList<>(found.values());
        all.sort(Comparator.comparing(one -> one.quantity().place()));
        return List.copyOf(all);
    }

    private void see(String name, @Nullable Quantity quantity) {
        if (quantity != null && quantity.giveOrTake() != null) {
            found.putIfAbsent(quantity.place(), new Uncertain(name, quantity));
        }
    }

    private void lot(Lot lot) {
        if (lot.amount() instanceof Amount.ByMass byMass) {
            see("mass of the lot", byMass.mass());
        } else if (lot.amount() instanceof Amount.ByVolume byVolume) {
            see("volume of the lot", byVolume.volume());
        } else if (lot.amount() instanceof Amount.InContainers containers) {
            see("mass in each container", containers.each());
        }
        see("density of the lot", lot.density());
        see("temperature of the lot", lot.temperature());
        see("thermal diffusivity of the lot", lot.thermalDiffusivity());
        Moisture moisture = lot.moisture();
        if (moisture != null) {
            see("moisture at the start", moisture.start());
            see("moisture at the end", moisture.end());
        }
        for (Grade grade : lot.grades()) {
            grade.sides().forEach(side -> see(side.dimension().word() + " of " + grade.name(), side.size()));
            see("weight of " + grade.name(), grade.weight());
        }
    }

    private void species(Species species) {
        String name = species.name();
        if (species.start() instanceof Start.Uniform uniform) {
            see("start of " + name, uniform.content().amount());
        } else if (species.start() instanceof Start.Profile profile) {
            for (int i = 0; i < profile.points().size(); i++) {
                see(
                        "start of " + name + ", point " + (i + 1),
                        profile.points().get(i).content().amount());
            }
        }
        diffusivities("diffusivity of " + name, species.diffusivity());
        see("partition of " + name, species.partition().amount());
        Traits traits = species.traits();
        see("molar mass of " + name, traits.molarMass());
        if (traits.inLiquor() != null) {
            diffusivity("diffusivity of " + name + " in the liquor", traits.inLiquor());
        }
        if (traits.skin() != null) {
            see("permeance of the skin for " + name, traits.skin().permeance());
        }
        traits.skins()
                .forEach((grade, skin) -> see("permeance of the skin of " + grade + " for " + name, skin.permeance()));
    }

    private void diffusivities(String name, Diffusivities diffusivities) {
        if (diffusivities instanceof Diffusivities.ByGrain byGrain) {
            byGrain.values().forEach((grain, one) -> diffusivity(name + " " + grain.word(), one));
        } else {
            diffusivity(name, diffusivities.all().get(0));
        }
    }

    private void diffusivity(String name, Diffusivity diffusivity) {
        see(name, diffusivity.value());
        if (diffusivity.law() instanceof Diffusivity.Law.Activated activated) {
            see("temperature at which the " + name + " was found", activated.at());
            see("activation energy of the " + name, activated.energy());
        } else if (diffusivity.law() instanceof Diffusivity.Law.Viscous viscous) {
            see("temperature at which the " + name + " was found", viscous.at());
        }
    }

    private void step(Step step) {
        String of = " of " + step.name();
        StepHead head = step.head();
        see("temperature" + of, head.temperature());
        see("gain" + of, head.gain());
        head.overrides()
                .diffusivity()
                .forEach((species, one) -> diffusivities("diffusivity of " + species + " in " + step.name(), one));
        head.overrides()
                .partition()
                .forEach((species, one) -> see("partition of " + species + " in " + step.name(), one.amount()));
        if (step instanceof Step.Wet wet) {
            liquor(step.name(), wet.liquor());
            film(step.name(), wet.film());
            see("drag-out" + of, wet.dragOut());
        }
        if (step instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Flow flow) {
            see("flow" + of, flow.rate());
        }
        if (step instanceof Step.Dry dry) {
            film(step.name(), dry.film());
            dry.air()
                    .equilibrium()
                    .forEach((species, one) -> see("equilibrium of " + species + " in " + step.name(), one.amount()));
        }
    }

    private void liquor(String step, Liquor liquor) {
        if (liquor.volume() instanceof LiquorVolume.Ratio ratio) {
            see("ratio of " + step, ratio.value());
        } else if (liquor.volume() instanceof LiquorVolume.Volume volume) {
            see("volume of " + step, volume.value());
        }
        see("density of the liquor of " + step, liquor.density());
        liquor.contents().forEach((species, content) -> see(species + " of " + step, content.amount()));
    }

    private void film(String step, Film film) {
        if (film instanceof Film.Coefficient coefficient) {
            see("film of " + step, coefficient.value());
        } else if (film instanceof Film.Past past) {
            see("speed of " + step, past.speed());
        } else if (film instanceof Film.Stirred stirred) {
            see("power of " + step, stirred.power());
        } else if (film instanceof Film.Packed packed) {
            see("speed of " + step, packed.speed());
            see("void of " + step, packed.voids());
        }
        if (film instanceof Film.Computed computed) {
            see("length along a face of " + step, computed.length());
        }
    }
}
