package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.soakwright.planner.batch.Checked;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.FilmFound;
import org.soakwright.planner.batch.Published;
import org.soakwright.planner.conditions.Conversion;
import org.soakwright.recipes.library.Entry;

/** What a check worked out of what a recipe says: strengths, diffusivities, films, and what the library says. */
final class FoundTables {
    /** From here on numbers are written with a power of ten. */
    private static final double LARGE = 1e5;

    private FoundTables() {}

    /** Only sections that have something to say. */
    static List<Section> of(Checked checked) {
        List<Section> sections = new ArrayList<>();
        if (!checked.conversions().isEmpty()) {
            sections.add(Section.of(
                    "conversions",
                    "Worked out",
                    checked.conversions().stream().map(FoundTables::conversion).toList()));
        }
        if (!checked.films().isEmpty()) {
            sections.add(Section.of("films", "Films", films(checked.films()), notes(checked.films())));
        }
        if (!checked.published().isEmpty()) {
            List<String> lines = new ArrayList<>();
            checked.published().forEach(one -> lines.addAll(published(one)));
            sections.add(Section.of("library", "From the library", lines));
        }
        return sections;
    }

    private static String conversion(Conversion conversion) {
        return conversion.what() + ": " + conversion.written() + " is " + conversion.becomes() + ", " + conversion.how()
                + ".";
    }

    private static Table films(List<FilmFound> films) {
        Table table = new Table()
                .text("Species")
                .text("Grade")
                .number("Re")
                .number("Sc")
                .number("Gr")
                .number("Sh")
                .number("k, m/s")
                .number("Within")
                .text("Worth");
        String before = "";
        for (FilmFound film : films) {
            if (!film.step().equals(before)) {
                table.heading(film.step());
            }
            before = film.step();
            table.row(List.of(
                    "  " + film.species(),
                    film.piece(),
                    group(film.reynolds()),
                    group(film.schmidt()),
                    group(film.grashof()),
                    group(film.sherwood()),
                    group(film.coefficient()),
                    Math.round(100 * film.within()) + " %",
                    worth(film)));
        }
        return table;
    }

    private static String worth(FilmFound film) {
        if (film.worthSeconds().orElse(0) > film.stepSeconds()) {
            return "more than its " + Durations.practical(film.stepSeconds());
        }
        return film.worthSeconds().isPresent()
                ? Durations.practical(film.worthSeconds().getAsDouble()) + " of "
                        + Durations.practical(film.stepSeconds())
                : "";
    }

    private static String group(double value) {
        return value == 0 ? "" : value < LARGE ? Figures.rounded(value, 3) : power(value);
    }

    private static String power(double value) {
        int exponent = (int) Math.floor(Math.log10(value));
        return Figures.rounded(value / Math.pow(10, exponent), 3) + "e" + exponent;
    }

    private static List<String> notes(List<FilmFound> films) {
        Set<String> notes = new LinkedHashSet<>();
        notes.add(
                "Re, Sc, Gr, Sh: Reynolds, Schmidt, Grashof and Sherwood number; k: the film's coefficient on the liquor's"
                        + " side. Worth: so much of the step goes to the film.");
        for (FilmFound film : films) {
            film.denser()
                    .ifPresent(denser -> notes.add(film.step() + ": beside the pieces the liquor's density differs by "
                            + Figures.rounded(denser, 2) + " kg/m3 on average, which is what moves it."));
        }
        films.forEach(film -> notes.add(film.step() + ": " + film.correlations() + "."));
        return List.copyOf(notes);
    }

    private static List<String> published(Published published) {
        List<String> lines = new ArrayList<>();
        lines.add(published.what() + ": " + published.used().value() + ", from " + entry(published.entry()));
        published.others().forEach(other -> lines.add("beside it the library has " + entry(other)));
        return lines;
    }

    private static String entry(Entry entry) {
        String at = entry.temperature() == null ? "" : " at " + entry.temperature();
        String of = entry.subject().composition().isEmpty()
                ? ""
                : ", " + entry.subject().composition();
        return entry.name() + ": " + entry.figure() + at + of + " ("
                + entry.origin().publication() + ", " + entry.origin().at() + "; "
                + entry.origin().trust().word() + ").";
    }
}
