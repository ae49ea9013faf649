package org.soakwright.planner.report.paper;

import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentInformation;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.interactive.viewerpreferences.PDViewerPreferences;

/** Marks written as PDF. The file knows no time, and its identifier comes from the recipe, so that equal sheets are equal files. */
final class PdfFile {
    private static final float GREY = 0.91f;

    private final PDDocument document;
    private final Sheet sheet;

    PdfFile(PDDocument document, Sheet sheet) {
        this.document = document;
        this.sheet = sheet;
    }

    void write(List<List<Mark>> pages, OutputStream out) throws IOException {
        PDDocumentInformation information = new PDDocumentInformation();
        information.setTitle(Sheet.KIND + ": " + sheet.title());
        information.setCreator("Soakwright " + sheet.stamp().version());
        document.setDocumentInformation(information);
        document.setDocumentId((long) sheet.stamp().hashCode());
        document.getDocumentCatalog().setLanguage("en");
        PDViewerPreferences viewer = new PDViewerPreferences(new org.apache.pdfbox.cos.COSDictionary());
        viewer.setDisplayDocTitle(true);
        document.getDocumentCatalog().setViewerPreferences(viewer);
        for (List<Mark> marks : pages) {
            page(marks);
        }
        // The library closes what it writes to; the stream is not ours to close.
        document.save(new Kept(out));
    }

    private void page(List<Mark> marks) throws IOException {
        PDPage page = new PDPage(new PDRectangle((float) Setting.PAGE_WIDTH, (float) Setting.PAGE_HEIGHT));
        document.addPage(page);
        try (PDPageContentStream content = new PDPageContentStream(document, page)) {
            for (Mark mark : marks) {
                if (mark instanceof Mark.Words words) {
                    write(content, words);
                } else if (mark instanceof Mark.Rule rule) {
                    draw(content, rule);
                } else if (mark instanceof Mark.Frame frame) {
                    draw(content, frame);
                }
            }
        }
    }

    private static void write(PDPageContentStream content, Mark.Words words) throws IOException {
        if (words.text().isBlank()) {
            return;
        }
        content.beginText();
        content.setNonStrokingColor(0f);
        content.setFont(words.face().font(), (float) words.size());
        content.newLineAtOffset((float) words.x(), up(words.baseline()));
        content.showText(words.text());
        content.endText();
    }

    private static void draw(PDPageContentStream content, Mark.Rule rule) throws IOException {
        content.setLineWidth((float) rule.weight());
        content.moveTo((float) rule.x(), up(rule.y()));
        content.lineTo((float) (rule.x() + rule.length()), up(rule.y()));
        content.stroke();
    }

    private static void draw(PDPageContentStream content, Mark.Frame frame) throws IOException {
        boolean ground = frame.weight() == 0;
        content.setNonStrokingColor(ground ? GREY : 1f);
        content.addRect(
                (float) frame.x(), up(frame.y() + frame.height()), (float) frame.width(), (float) frame.height());
        if (ground) {
            content.fill();
        } else {
            content.setLineWidth((float) frame.weight());
            content.fillAndStroke();
        }
    }

    private static float up(double y) {
        return (float) (Setting.PAGE_HEIGHT - y);
    }

    /** Leaves the stream behind it open. */
    private static final class Kept extends java.io.FilterOutputStream {
        Kept(OutputStream out) {
            super(out);
        }

        @Override
        public void write(byte[] bytes, int from, int length) throws IOException {
            out.write(bytes, from, length);
        }

        @Override
        public void close() throws IOException {
            flush();
        }
    }
}
