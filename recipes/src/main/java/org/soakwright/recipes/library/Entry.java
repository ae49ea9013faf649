package org.soakwright.recipes.library;

import java.util.Locale;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * A figure of the library, with numbers and units exactly as its source prints them.
 *
 * @param name the species, {@code -in-}, the material and what tells it from others; lower case with hyphens
 * @param temperature at which the figure was found; null where it is unknown or stands with each value
 * @param activationEnergy beside a diffusivity only; null where the source gives none
 */
public record Entry(
        Place place,
        String name,
        Subject subject,
        Property property,
        Figure figure,
        @Nullable Span temperature,
        @Nullable Span activationEnergy,
        Origin origin) {
    private static final Pattern KEBAB = Pattern.compile("[a-z0-9]+(-[a-z0-9]+)*");

    public Entry {
        String begins = subject.species().toLowerCase(Locale.ROOT).replace(' ', '-') + "-in-";
        if (!KEBAB.matcher(name).matches() || !name.startsWith(begins)) {
            throw new Unsound(
                    place,
                    "a name is in lower case with hyphens and begins with its species: found \"" + name
                            + "\"; write such as " + begins + "brick");
        }
        if ((property == Property.DIFFUSIVITY_RATIO) == subject.relativeTo().isEmpty()) {
            throw new Unsound(place, "`relative-to` belongs to a diffusivity-ratio, and every one needs it");
        }
        if (activationEnergy != null) {
            activationEnergy.from().positive("an activation energy");
            if (property != Property.DIFFUSIVITY) {
                throw new Unsound(
                        activationEnergy.place(),
                        "an activation energy stands beside a diffusivity: found it beside " + property.word()
                                + "; make it an entry of its own");
            }
        }
        if (temperature != null) {
            temperature.from().possible();
            temperature.to().possible();
        }
        checkTemperature(place, figure, temperature);
    }

    private static void checkTemperature(Place place, Figure figure, @Nullable Span temperature) {
        if (figure instanceof Figure.ByTemperature && temperature != null) {
            throw new Unsound(
                    temperature.place(), "values by temperature have theirs: found another beside them; remove it");
        }
        if (figure instanceof Figure.Range range
                && range.across() == Across.TEMPERATURE
                && (temperature == null || temperature.isOne())) {
            throw new Unsound(place, "a range across temperature needs two temperatures; write from and to");
        }
    }
}
