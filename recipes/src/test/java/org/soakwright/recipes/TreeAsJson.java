package org.soakwright.recipes;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.math.BigDecimal;
import java.util.function.Function;
import java.util.regex.Pattern;
import org.soakwright.recipes.text.Tree;

/** A YAML tree as the JSON a schema validator takes. */
final class TreeAsJson {
    private static final JsonNodeFactory JSON = JsonNodeFactory.instance;
    private static final Pattern NUMBER = Pattern.compile("-?(0|[1-9][0-9]*)(\\.[0-9]+)?([eE][+-]?[0-9]+)?");

    private TreeAsJson() {}

    /** As the language reads it: every scalar is text. */
    static JsonNode asText(Tree tree) {
        return json(tree, JSON::textNode);
    }

    /** As a YAML-aware editor reads it: a scalar that is a JSON number is one. */
    static JsonNode withNumbers(Tree tree) {
        return json(
                tree,
                text -> NUMBER.matcher(text).matches() ? JSON.numberNode(new BigDecimal(text)) : JSON.textNode(text));
    }

    private static JsonNode json(Tree tree, Function<String, JsonNode> scalar) {
        if (tree instanceof Tree.Leaf leaf) {
            return scalar.apply(leaf.text());
        }
        if (tree instanceof Tree.Items items) {
            ArrayNode array = JSON.arrayNode();
            items.items().forEach(item -> array.add(json(item, scalar)));
            return array;
        }
        if (tree instanceof Tree.Entries entries) {
            ObjectNode object = JSON.objectNode();
            entries.entries().forEach(entry -> object.set(entry.key(), json(entry.value(), scalar)));
            return object;
        }
        return JSON.nullNode();
    }
}
