package org.soakwright.planner.report.page;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import org.soakwright.planner.report.Findings;
import org.soakwright.planner.report.Section;
import org.soakwright.planner.report.Table;
import org.soakwright.planner.report.picture.Picture;
import org.soakwright.planner.report.picture.Pictures;

/** What every page of ours has in common: one file that needs no other, asks no network and runs no script. */
public final class Shell {
    private static final String STYLE = style();

    private final Html html = new Html();

    /** Begins a page up to its first heading. */
    public Shell(String kind, String title, List<String> about) {
        this(kind, title, about, "");
    }

    /**
     * The same.
     *
     * @param more rules of its own, after those that all pages have
     */
    public Shell(String kind, String title, List<String> about, String more) {
        html.trusted("<!DOCTYPE html>\n").open("html", "lang", "en");
        html.open("head");
        html.empty("meta", "charset", "utf-8");
        html.empty("meta", "name", "viewport", "content", "width=device-width, initial-scale=1");
        html.empty("meta", "name", "color-scheme", "content", "light dark");
        html.leaf("title", title + " – " + kind);
        html.open("style").trusted("\n" + Pictures.stylesheet() + STYLE + more).close();
        html.close();
        html.open("body");
        html.leaf("a", "Skip to the answer", "class", "skip", "href", "#answer");
        html.open("header");
        html.leaf("p", kind, "class", "kind");
        html.leaf("h1", title, "dir", "auto");
        about.forEach(line -> html.open("p", "class", "about").words(line).close());
        html.close();
    }

    private static String style() {
        try (InputStream in = Shell.class.getResourceAsStream("page.css")) {
            return new String(Objects.requireNonNull(in, "page.css").readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException("page.css is damaged", e);
        }
    }

    public Html html() {
        return html;
    }

    /** Ends the page. */
    public String end() {
        return html.close().close().toString();
    }

    /** A link of the contents. */
    public record Anchor(String id, String label) {}

    public void contents(List<Anchor> anchors) {
        html.open("nav", "aria-label", "Contents").open("ul");
        for (Anchor anchor : anchors) {
            html.open("li").leaf("a", anchor.label(), "href", "#" + anchor.id()).close();
        }
        html.close().close();
    }

    /** Opens the section that comes first: its sentences, then whatever is added. */
    public void openAnswer(Findings findings) {
        html.open(
                "section",
                "id",
                "answer",
                "class",
                findings.met() ? "good" : "bad",
                "aria-labelledby",
                "answer-heading");
        html.leaf("h2", "Answer", "id", "answer-heading");
        List<String> sentences = findings.answer();
        html.open("p", "class", "verdict-line").words(sentences.get(0)).close();
        paragraphs(sentences.subList(1, sentences.size()));
    }

    public void open(String id, String heading) {
        open(id, heading, List.of());
    }

    /** With links to files beside the heading. */
    private void open(String id, String heading, List<String> files) {
        html.open("section", "id", id, "aria-labelledby", id + "-heading").open("div", "class", "head");
        html.leaf("h2", heading, "id", id + "-heading");
        files.forEach(file -> html.leaf("a", "CSV", "href", file, "aria-label", heading + " as CSV"));
        html.close();
    }

    public void close() {
        html.close();
    }

    public void paragraphs(List<String> sentences) {
        sentences.forEach(sentence -> html.open("p").words(sentence).close());
    }

    public void points(List<String> points) {
        if (!points.isEmpty()) {
            html.open("ul");
            points.forEach(point -> html.open("li").words(point).close());
            html.close();
        }
    }

    /** A section with its table; a link to it where there is one as a file. */
    public void section(Section section, List<String> files) {
        String file = Tables.file(section.id());
        open(section.id(), section.heading(), files.contains(file) ? List.of(file) : List.of());
        section.table().ifPresent(table -> table(section.id() + "-heading", table));
        points(section.points());
        if (!section.notes().isEmpty()) {
            html.open("div", "class", "notes");
            paragraphs(section.notes());
            html.close();
        }
        close();
    }

    /** Wide ones scroll by themselves, also by the keyboard. */
    public void table(String labelledBy, Table table) {
        html.open("div", "class", "scroll", "role", "region", "aria-labelledby", labelledBy, "tabindex", "0");
        TableHtml.write(html, labelledBy, table);
        html.close();
    }

    public void picture(Picture picture) {
        html.open("figure", "id", "picture-" + picture.id());
        html.open("figcaption").words(picture.caption()).close();
        html.open("div", "class", "scroll picture", "role", "region", "aria-label", picture.title(), "tabindex", "0");
        html.trusted(picture.inline());
        html.close().close();
    }

    /** Below everything else: where it comes from. */
    public void footer(List<String> lines) {
        html.open("footer");
        lines.forEach(line -> html.open("p").words(line).close());
        html.close();
    }
}
