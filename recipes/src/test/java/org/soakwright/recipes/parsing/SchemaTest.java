package org.soakwright.recipes.parsing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.Arrays;
import java.util.Collections;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Unit;

/** The shipped schema knows exactly the keys and the units that the reader knows. */
class SchemaTest {
    private static final JsonNode SCHEMA = schema();

    private static JsonNode schema() {
        try (InputStream in = Recipes.class.getResourceAsStream(Recipes.SCHEMA)) {
            return new ObjectMapper().readTree(Objects.requireNonNull(in));
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private static JsonNode definition(String name) {
        return SCHEMA.path("$defs").path(name);
    }

    private static String definitionName(Section section) {
        return switch (section) {
            case DIFFUSIVITY -> "diffusivity-of-species";
            case FILM -> "film-forms";
            default -> section.name().toLowerCase(Locale.ROOT).replace('_', '-');
        };
    }

    @ParameterizedTest
    @EnumSource(
            value = Section.class,
            mode = EnumSource.Mode.EXCLUDE,
            names = {"BY_SPECIES", "BY_GRADE"})
    void aSectionHasTheSameKeysInTheSchema(Section section) {
        JsonNode definition = section == Section.RECIPE ? SCHEMA : definition(definitionName(section));
        assertEquals(new TreeSet<>(section.keys()), keys(definition.path("properties")), section::name);
    }

    @ParameterizedTest
    @EnumSource(Section.class)
    void noKeyIsBothKnownAndForLater(Section section) {
        assertTrue(Collections.disjoint(section.keys(), section.later()), section::name);
    }

    @Test
    void everyDefinitionWithKeysBelongsToASection() {
        Set<String> withKeys = new LinkedHashSet<>();
        definitionNames().forEach(name -> {
            if (definition(name).has("properties")) {
                withKeys.add(name);
            }
        });
        Set<String> sections = new LinkedHashSet<>();
        Arrays.stream(Section.values()).forEach(section -> sections.add(definitionName(section)));
        withKeys.removeAll(sections);
        assertEquals(Set.of(), withKeys);
    }

    @ParameterizedTest
    @EnumSource(Kind.class)
    void aKindHasTheSameUnitsInTheSchema(Kind kind) {
        Pattern pattern =
                Pattern.compile(definition(kind.name().toLowerCase(Locale.ROOT).replace('_', '-') + "-text")
                        .path("pattern")
                        .asText());
        for (Unit unit : kind.units()) {
            String written = "12.5e-1 " + unit.symbol();
            assertTrue(pattern.matcher(written).find(), () -> written + " in " + pattern);
        }
        for (Kind other : Kind.values()) {
            for (Unit unit : other.units()) {
                assertEquals(
                        kind.unit(unit.symbol()).isPresent(),
                        pattern.matcher("3 " + unit.symbol()).find(),
                        () -> unit + " in " + pattern);
            }
        }
    }

    @Test
    void theSchemaSaysWhichLanguageItIs() {
        assertEquals(
                "https://json-schema.org/draft/2020-12/schema",
                SCHEMA.path("$schema").asText());
        assertFalse(SCHEMA.path("additionalProperties").asBoolean(true));
    }

    private static Set<String> keys(JsonNode properties) {
        Set<String> keys = new TreeSet<>();
        properties.fieldNames().forEachRemaining(keys::add);
        return keys;
    }

    private static List<String> definitionNames() {
        return List.copyOf(keys(SCHEMA.path("$defs")));
    }
}
