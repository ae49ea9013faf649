package org.soakwright.recipes;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.parsing.LineFiles;
import org.soakwright.recipes.text.Document;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Unsound;

/** The recipes and the list of lots beside a line: in its folder or below it, never elsewhere. */
final class BesideLine implements LineFiles {
    private static final Neighbour RECIPE = new Neighbour("recipe", "line", "loin-desalting.yaml");
    private static final Neighbour LOTS = new Neighbour("list of lots", "line", "orders.csv");

    private final Path line;
    private final Map<String, String> sums = new LinkedHashMap<>();

    BesideLine(Path line) {
        this.line = line;
    }

    @Override
    public Source lots(String name, Place place) {
        Source source = Source.of(LOTS.path(line, name, place), Document.LOTS);
        sums.put(name, source.sha256());
        return source;
    }

    @Override
    public Recipe recipe(String name, Place place) {
        Outcome outcome = Recipes.read(RECIPE.path(line, name, place));
        if (outcome instanceof Outcome.Accepted accepted) {
            sums.put(name, accepted.sha256());
            return accepted.recipe();
        }
        throw new Unsound(((Outcome.Refused) outcome).problems());
    }

    /** Of the line and of every file that was read. */
    String sha256(Source source) {
        return Neighbour.sha256(source, sums);
    }
}
