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
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.soakwright.recipes.Lines;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Unit;

/** The shipped schema knows exactly the keys and the units that the reader knows. */
class SchemaTest {
    private static final JsonNode SCHEMA = schema(Recipes.SCHEMA);
    private static final JsonNode OF_LINES = schema(Lines.SCHEMA);

    private static JsonNode schema(String resource) {
        try (InputStream in = Recipes.class.getResourceAsStream(resource)) {
            return new ObjectMapper().readTree(Objects.requireNonNull(in));
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private static JsonNode definition(String name) {
        return SCHEMA.path("$defs").path(name);
    }

    private static String definitionName(LineSection section) {
        return section.name().toLowerCase(Locale.ROOT).replace('_', '-');
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
    @EnumSource(
            value = LineSection.class,
            mode = EnumSource.Mode.EXCLUDE,
            names = {"VESSELS", "DRAWS", "UTILITIES"})
    void aSectionOfALineHasTheSameKeysInTheSchema(LineSection section) {
        JsonNode definition =
                section == LineSection.LINE ? OF_LINES : OF_LINES.path("$defs").path(definitionName(section));
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
        for (JsonNode schema : List.of(SCHEMA, OF_LINES)) {
            keys(schema.path("$defs")).stream()
                    // What has properties but is no object is a condition that others put.
                    .filter(name -> schema.path("$defs").path(name).has("properties")
                            && schema.path("$defs").path(name).has("type"))
                    .forEach(withKeys::add);
        }
        Set<String> sections = new LinkedHashSet<>();
        Arrays.stream(Section.values()).forEach(section -> sections.add(definitionName(section)));
        Arrays.stream(LineSection.values()).forEach(section -> sections.add(definitionName(section)));
        withKeys.removeAll(sections);
        assertEquals(Set.of(), withKeys);
    }

    @ParameterizedTest
    @EnumSource(Kind.class)
    void aKindHasTheSameUnitsInEverySchemaThatHasIt(Kind kind) {
        String name = kind.name().toLowerCase(Locale.ROOT).replace('_', '-') + "-text";
        List<String> patterns = Stream.of(SCHEMA, OF_LINES)
                .map(schema -> schema.path("$defs").path(name).path("pattern").asText())
                .filter(pattern -> !pattern.isEmpty())
                .toList();
        assertFalse(patterns.isEmpty(), name);
        patterns.forEach(pattern -> assertUnits(kind, Pattern.compile(pattern)));
    }

    private static void assertUnits(Kind kind, Pattern pattern) {
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
        for (JsonNode schema : List.of(SCHEMA, OF_LINES)) {
            assertEquals(
                    "https://json-schema.org/draft/2020-12/schema",
                    schema.path("$schema").asText());
            assertFalse(schema.path("additionalProperties").asBoolean(true));
        }
    }

    private static Set<String> keys(JsonNode properties) {
        Set<String> keys = new TreeSet<>();
        properties.fieldNames().forEachRemaining(keys::add);
        return keys;
    }
}
