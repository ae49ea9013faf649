package org.soakwright.planner.report.picture;

import java.awt.Font;
import java.awt.FontFormatException;
import java.awt.font.FontRenderContext;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;

/**
 * The bundled letters. Whoever uses AWT for the first time in this program comes through here, so that it starts headless and never
 * depends on the fonts of the machine: where those are looked up through fontconfig, which may find none, it is told of a bundled one.
 */
final class Typeface {
    static final Font REGULAR;
    static final Font SEMIBOLD;

    private static final FontRenderContext UNHINTED;
    private static final String CONFIGURED = "sun.awt.fontconfig";

    static {
        System.setProperty("java.awt.headless", "true");
        try {
            configure();
            REGULAR = load("OpenSans-Regular.ttf");
            SEMIBOLD = load("OpenSans-Semibold.ttf");
        } catch (IOException failure) {
            throw new UncheckedIOException("the bundled letters cannot be unpacked: " + failure.getMessage(), failure);
        }
        UNHINTED = new FontRenderContext(null, true, true);
    }

    private Typeface() {}

    /** Sees to it that AWT is set up from here. */
    static void prepare() {
        // Naming the class has done it.
    }

    /** The advance width of a line, px. */
    static double width(String text, Font font) {
        return font.getStringBounds(text, UNHINTED).getWidth();
    }

    /** Cut to a width, an ellipsis for what is left out. */
    static String fitted(String text, Font font, double width) {
        if (width(text, font) <= width) {
            return text;
        }
        int end = text.length();
        while (end > 0 && width(text.substring(0, end).stripTrailing() + "…", font) > width) {
            end = text.offsetByCodePoints(end, -1);
        }
        return text.substring(0, end).stripTrailing() + "…";
    }

    private static void configure() throws IOException {
        String system = System.getProperty("os.name", "").toLowerCase(Locale.ROOT);
        boolean ownLookup = system.contains("windows") || system.contains("mac");
        if (ownLookup || System.getProperty(CONFIGURED) != null) {
            return;
        }
        Path folder = Files.createTempDirectory("soakwright-letters");
        Path letters = folder.resolve("letters.ttf");
        Path configuration = folder.resolve("letters.properties");
        try (InputStream bundled = open("OpenSans-Regular.ttf")) {
            Files.copy(bundled, letters);
        }
        String lines = "version=1\nallfonts.default=default\nsequence.allfonts=default\nfilename.default="
                + letters.toString().replace("\\", "\\\\") + "\n";
        Files.write(configuration, lines.getBytes(StandardCharsets.ISO_8859_1));
        // Deleted in the reverse order.
        folder.toFile().deleteOnExit();
        letters.toFile().deleteOnExit();
        configuration.toFile().deleteOnExit();
        System.setProperty(CONFIGURED, configuration.toString());
        System.setProperty("sun.java2d.fontpath", folder.toString());
    }

    private static Font load(String name) throws IOException {
        try (InputStream bundled = open(name)) {
            return Font.createFont(Font.TRUETYPE_FONT, bundled);
        } catch (FontFormatException damaged) {
            throw new IOException(name + " is damaged", damaged);
        }
    }

    private static InputStream open(String name) throws IOException {
        InputStream stream = Typeface.class.getResourceAsStream("/org/soakwright/planner/report/fonts/" + name);
        if (stream == null) {
            throw new IOException(name + " is missing");
        }
        return stream;
    }
}
