package org.soakwright.planner.report.paper;

import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import org.apache.fontbox.ttf.CmapLookup;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.font.PDType0Font;
import org.soakwright.planner.report.Stamp;

/** A bundled font: what it can show, and how wide that is. All sizes and widths in points. */
final class Face implements AutoCloseable {
    static final String REGULAR = "OpenSans-Regular.ttf";
    static final String SEMIBOLD = "OpenSans-Semibold.ttf";

    private static final int REPLACEMENT = 0xFFFD;
    private static final String ELLIPSIS = "…";

    private final TrueTypeFont file;
    private final CmapLookup glyphs;
    private final double unitsPerEm;
    private final PDType0Font font;

    private Face(TrueTypeFont file, PDDocument document) throws IOException {
        this.file = file;
        // Ligatures would be drawn narrower or wider than they were measured.
        file.setEnableGsub(false);
        glyphs = file.getUnicodeCmapLookup();
        unitsPerEm = file.getUnitsPerEm();
        font = PDType0Font.load(document, file, true);
    }

    static Face of(String name, PDDocument document) throws IOException {
        try (InputStream in = Objects.requireNonNull(Stamp.class.getResourceAsStream("fonts/" + name), name)) {
            return new Face(new TTFParser().parse(new RandomAccessReadBuffer(in)), document);
        }
    }

    PDType0Font font() {
        return font;
    }

    /** After the document was saved: only then are the glyphs used copied into it. */
    @Override
    public void close() throws IOException {
        file.close();
    }

    /** The text as it can be shown: one replacement character for every one that the font lacks, white space as spaces. */
    String shown(String text) {
        StringBuilder shown = new StringBuilder(text.length());
        Glue.of(text).codePoints().forEach(point -> {
            boolean blank = Character.isWhitespace(point);
            shown.appendCodePoint(blank ? ' ' : glyphs.getGlyphId(point) == 0 ? REPLACEMENT : point);
        });
        return shown.toString();
    }

    /** Of text that can be shown. */
    double width(String text, double size) {
        return text.codePoints().mapToDouble(this::advance).sum() * size / unitsPerEm;
    }

    private double advance(int point) {
        try {
            return file.getAdvanceWidth(glyphs.getGlyphId(point));
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    /** Lines no wider than this, broken at spaces where words allow it; an ellipsis for what does not fit into so many. */
    List<String> wrapped(String text, double size, double width, int most) {
        List<String> lines = new ArrayList<>();
        String line = "";
        for (String word : shown(text).strip().split(" +", -1)) {
            String longer = line.isEmpty() ? word : line + " " + word;
            if (width(longer, size) <= width) {
                line = longer;
                continue;
            }
            if (!line.isEmpty()) {
                lines.add(line);
            }
            String rest = word;
            while (width(rest, size) > width) {
                int end = fitting(rest, size, width);
                lines.add(rest.substring(0, end));
                rest = rest.substring(end);
            }
            line = rest;
        }
        lines.add(line);
        return lines.size() <= most ? lines : shortened(lines, size, width, most);
    }

    private List<String> shortened(List<String> lines, double size, double width, int most) {
        List<String> kept = new ArrayList<>(lines.subList(0, most));
        String last = kept.get(most - 1);
        int end = fitting(last, size, width - width(ELLIPSIS, size));
        kept.set(most - 1, last.substring(0, end).stripTrailing() + ELLIPSIS);
        return kept;
    }

    /** How many characters fit; one code point at least. */
    private int fitting(String text, double size, double width) {
        int end = text.offsetByCodePoints(0, 1);
        while (end < text.length()) {
            int next = text.offsetByCodePoints(end, 1);
            if (width(text.substring(0, next), size) > width) {
                break;
            }
            end = next;
        }
        return end;
    }
}
