package org.soakwright.recipes;

import java.nio.file.Path;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.parsing.LineReader;
import org.soakwright.recipes.text.Document;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.YamlReader;

/** Reads lines. Nothing here throws for what a file holds: bad input comes back as its problems. */
public final class Lines {
    /** The resource with the JSON Schema of the line file, beside this class. */
    public static final String SCHEMA = "line.schema.json";

    private Lines() {}

    /** Reads the line in a file of UTF-8 YAML, of 2 MiB at most, with the recipes and the list of lots it names beside it. */
    public static LineOutcome read(Path file) {
        Problems problems = new Problems();
        BesideLine beside = new BesideLine(file);
        Source source = problems.attempt(() -> Source.of(file, Document.LINE));
        Line line = source == null ? null : line(source, beside, problems);
        return source == null || line == null
                ? new LineOutcome.Refused(problems.sorted())
                : new LineOutcome.Accepted(line, beside.sha256(source));
    }

    private static @Nullable Line line(Source source, BesideLine beside, Problems problems) {
        Tree tree = YamlReader.read(source.file(), source.text(), Document.LINE, problems);
        Line line = tree == null ? null : LineReader.read(tree, beside, problems);
        return problems.isEmpty() ? line : null;
    }
}
