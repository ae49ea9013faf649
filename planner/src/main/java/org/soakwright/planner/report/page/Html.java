package org.soakwright.planner.report.page;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Set;

/** A page being written. Everything that is not {@link #trusted} is escaped, and every element that is opened is closed. */
public final class Html {
    private static final Set<String> BLOCKS = Set.of(
            "head",
            "body",
            "header",
            "nav",
            "main",
            "section",
            "footer",
            "div",
            "ul",
            "ol",
            "li",
            "dl",
            "p",
            "h1",
            "h2",
            "h3",
            "figure",
            "figcaption",
            "table",
            "thead",
            "tbody",
            "tr",
            "title",
            "style",
            "meta",
            "html");

    private final StringBuilder text = new StringBuilder();
    private final Deque<String> open = new ArrayDeque<>();

    /** Opens an element; attributes by name and value in turn. */
    public Html open(String name, String... attributes) {
        tag(name, attributes);
        open.push(name);
        return this;
    }

    public Html close() {
        String name = open.pop();
        text.append("</").append(name).append('>');
        if (BLOCKS.contains(name)) {
            text.append('\n');
        }
        return this;
    }

    /** An element of plain text. */
    public Html leaf(String name, String content, String... attributes) {
        return open(name, attributes).text(content).close();
    }

    /** An element that has no content and no end. */
    Html empty(String name, String... attributes) {
        tag(name, attributes);
        text.append('\n');
        return this;
    }

    private void tag(String name, String... attributes) {
        text.append('<').append(name);
        for (int i = 0; i < attributes.length; i += 2) {
            text.append(' ').append(attributes[i]).append("=\"");
            escape(attributes[i + 1]);
            text.append('"');
        }
        text.append('>');
    }

    public Html text(String content) {
        escape(content);
        return this;
    }

    /** Someone else's words, whose direction of writing must not disturb what stands beside them. */
    public Html words(String content) {
        return isPlain(content) ? text(content) : leaf("bdi", content);
    }

    /** Markup of our own. */
    Html trusted(String markup) {
        text.append(markup);
        return this;
    }

    private static boolean isPlain(String content) {
        return content.chars().allMatch(c -> c < 0x0590);
    }

    private void escape(String content) {
        content.codePoints().forEach(c -> {
            switch (c) {
                case '&' -> text.append("&amp;");
                case '<' -> text.append("&lt;");
                case '>' -> text.append("&gt;");
                case '"' -> text.append("&quot;");
                case '\'' -> text.append("&#39;");
                default -> text.appendCodePoint(isText(c) ? c : 0xfffd);
            }
        });
    }

    /** What HTML allows in text: no controls, no halves of characters, no non-characters. */
    private static boolean isText(int c) {
        boolean control = (c < 0x20 && c != '\n' && c != '\t') || (c >= 0x7f && c < 0xa0);
        boolean none = (c & 0xfffe) == 0xfffe || (c >= 0xfdd0 && c <= 0xfdef);
        return !control && !none && !(c >= 0xd800 && c <= 0xdfff);
    }

    @Override
    public String toString() {
        if (!open.isEmpty()) {
            throw new IllegalStateException("not closed: " + open);
        }
        return text.toString();
    }
}
