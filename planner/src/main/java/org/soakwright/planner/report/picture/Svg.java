package org.soakwright.planner.report.picture;

import java.awt.Color;
import java.awt.Dimension;
import java.awt.Font;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.batik.dom.GenericDOMImplementation;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NamedNodeMap;
import org.w3c.dom.Node;

/**
 * Pictures as SVG: Batik turns the drawing into elements, and this writes them plainly, tenths of a px, without ids or clips, which would
 * meet those of other pictures in one page.
 *
 * <p>Letters stay text, so that they can be searched, copied and read aloud and take little room. Each line says how long it is in the
 * bundled letters, to which a viewer that has others stretches them: nothing then touches or leaves the picture anywhere.
 */
final class Svg {
    private static final String NAMESPACE = "http://www.w3.org/2000/svg";
    private static final String LETTERS = "'Open Sans','Noto Sans','Segoe UI','Helvetica Neue',Arial,sans-serif";
    private static final Set<String> SHAPES =
            Set.of("rect", "line", "path", "polyline", "polygon", "circle", "ellipse");
    private static final Set<String> GEOMETRY =
            Set.of("x", "y", "width", "height", "rx", "ry", "x1", "y1", "x2", "y2", "d", "points", "cx", "cy", "r");
    private static final Set<String> PEN =
            Set.of("stroke-width", "stroke-dasharray", "stroke-linecap", "stroke-linejoin");
    private static final Pattern NUMBER = Pattern.compile("-?\\d+\\.\\d+(?:[eE]-?\\d+)?");
    private static final Pattern ROLE = Pattern.compile("var\\(--soak-([a-z0-9-]+)\\)");
    private static final Pattern RGB = Pattern.compile("rgb\\((\\d+),(\\d+),(\\d+)\\)");

    /** What Batik calls the colours that have a name in SVG 1.0. */
    private static final Map<String, Integer> NAMED = Map.ofEntries(
            Map.entry("black", 0),
            Map.entry("white", 0xffffff),
            Map.entry("gray", 0x808080),
            Map.entry("silver", 0xc0c0c0),
            Map.entry("maroon", 0x800000),
            Map.entry("red", 0xff0000),
            Map.entry("purple", 0x800080),
            Map.entry("fuchsia", 0xff00ff),
            Map.entry("green", 0x008000),
            Map.entry("lime", 0x00ff00),
            Map.entry("olive", 0x808000),
            Map.entry("yellow", 0xffff00),
            Map.entry("navy", 0x000080),
            Map.entry("blue", 0x0000ff),
            Map.entry("teal", 0x008080),
            Map.entry("aqua", 0x00ffff));

    private final Map<Integer, String> names = new LinkedHashMap<>();
    private final StringBuilder out = new StringBuilder(40_000);

    private Svg(Theme theme, boolean named) {
        if (named) {
            Look.of(theme).roles().forEach((role, color) -> names.put(color.getRGB(), "var(--soak-" + role + ")"));
        }
    }

    /** A file. */
    static String file(Picture picture, Theme theme) {
        Svg svg = new Svg(theme, false);
        svg.out.append("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n");
        svg.open(picture, "");
        svg.out.append("<title>").append(escaped(picture.title())).append("</title>\n<desc>");
        svg.out.append(escaped(picture.altText())).append("</desc>\n");
        if (theme == Theme.LIGHT) {
            svg.out.append(coloured(picture.inside()));
        } else {
            svg.body(picture, theme);
        }
        return svg.out.append("</svg>\n").toString();
    }

    /** The light drawing with the names of its colours; the costly part, which file and element share. */
    static String inside(Picture picture) {
        Svg svg = new Svg(Theme.LIGHT, true);
        svg.body(picture, Theme.LIGHT);
        return svg.out.toString();
    }

    private static String coloured(String inside) {
        Map<String, String> colours = new LinkedHashMap<>();
        Look.of(Theme.LIGHT).roles().forEach((role, color) -> colours.put(role, Look.hex(color)));
        return ROLE.matcher(inside).replaceAll(found -> colours.getOrDefault(found.group(1), found.group()));
    }

    /** An element whose colours are names of {@link #stylesheet()}. */
    static String element(Picture picture) {
        Svg svg = new Svg(Theme.LIGHT, true);
        svg.open(picture, " aria-label=\"" + escaped(picture.altText()) + "\"");
        return svg.out.append(picture.inside()).append("</svg>\n").toString();
    }

    static String stylesheet() {
        return ":root{" + variables(Theme.LIGHT) + "}\n@media (prefers-color-scheme:dark){:root{"
                + variables(Theme.DARK) + "}}\n@media print{:root{" + variables(Theme.GREY) + "}}\n";
    }

    private static String variables(Theme theme) {
        StringBuilder text = new StringBuilder();
        Look.of(theme)
                .roles()
                .forEach((role, color) -> text.append("--soak-")
                        .append(role)
                        .append(':')
                        .append(Look.hex(color))
                        .append(';'));
        return text.toString();
    }

    private void open(Picture picture, String attributes) {
        String size = picture.width() + " " + picture.height();
        out.append("<svg xmlns=\"").append(NAMESPACE).append("\" viewBox=\"");
        out.append(-Sheet.MARGIN)
                .append(' ')
                .append(-Sheet.MARGIN)
                .append(' ')
                .append(size)
                .append("\" width=\"");
        out.append(picture.width())
                .append("\" height=\"")
                .append(picture.height())
                .append("\" role=\"img\"");
        out.append(attributes).append(" font-family=\"").append(LETTERS).append("\">\n");
    }

    private void body(Picture picture, Theme theme) {
        Document document = GenericDOMImplementation.getDOMImplementation().createDocument(NAMESPACE, "svg", null);
        SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
        context.setGenericImageHandler(new EmbeddedImages());
        SVGGraphics2D g = new SVGGraphics2D(context, false);
        g.setSVGCanvasSize(new Dimension(picture.width(), picture.height()));
        picture.drawInside(g, theme);
        write(g.getRoot(), Map.of());
    }

    private void write(Element element, Map<String, String> inherited) {
        Map<String, String> attributes = new LinkedHashMap<>(inherited);
        NamedNodeMap own = element.getAttributes();
        for (int i = 0; i < own.getLength(); i++) {
            attributes.put(own.item(i).getNodeName(), own.item(i).getNodeValue());
        }
        String name = element.getTagName();
        if (SHAPES.contains(name)) {
            shape(element, attributes);
        } else if (name.equals("text")) {
            text(element, attributes);
        } else if (name.equals("image")) {
            image(element);
        } else if (!name.equals("defs")) {
            for (Node child = element.getFirstChild(); child != null; child = child.getNextSibling()) {
                if (child instanceof Element part) {
                    write(part, attributes);
                }
            }
        }
    }

    private void shape(Element element, Map<String, String> attributes) {
        out.append('<').append(element.getTagName());
        NamedNodeMap own = element.getAttributes();
        Map<String, String> geometry = new java.util.TreeMap<>();
        for (int i = 0; i < own.getLength(); i++) {
            if (GEOMETRY.contains(own.item(i).getNodeName())) {
                geometry.put(own.item(i).getNodeName(), own.item(i).getNodeValue());
            }
        }
        geometry.forEach(
                (key, value) -> attribute(key, rounded(value).replace(" L", "L").replace("L ", "L")));
        if (attributes.getOrDefault("stroke", "none").equals("none")) {
            attribute("fill", color(attributes.get("fill")));
        } else {
            attribute("fill", "none");
            attribute("stroke", color(attributes.get("stroke")));
            attributes.forEach((key, value) -> {
                if (PEN.contains(key) && !isDefault(key, value)) {
                    attribute(key, value);
                }
            });
        }
        out.append("/>\n");
    }

    private static boolean isDefault(String key, String value) {
        return switch (key) {
            case "stroke-width" -> value.equals("1");
            case "stroke-dasharray" -> value.equals("none") || value.equals("null");
            case "stroke-linecap" -> value.equals("butt");
            default -> value.equals("miter");
        };
    }

    private void text(Element element, Map<String, String> attributes) {
        String words = element.getTextContent();
        float size =
                Float.parseFloat(attributes.getOrDefault("font-size", "12px").replace("px", ""));
        boolean strong = attributes.getOrDefault("font-family", "").contains("Semibold");
        Font font = (strong ? Typeface.SEMIBOLD : Typeface.REGULAR).deriveFont(size);
        out.append("<text");
        attribute("x", rounded(element.getAttribute("x")));
        attribute("y", rounded(element.getAttribute("y")));
        attribute("font-size", rounded(Float.toString(size)));
        if (strong) {
            attribute("font-weight", "600");
        }
        attribute("fill", color(attributes.get("fill")));
        attribute("textLength", rounded(Double.toString(Typeface.width(words, font))));
        attribute("lengthAdjust", "spacingAndGlyphs");
        out.append('>').append(escaped(words)).append("</text>\n");
    }

    private void image(Element element) {
        out.append("<image");
        for (String key : new String[] {"x", "y", "width", "height"}) {
            attribute(key, rounded(element.getAttribute(key)));
        }
        attribute("preserveAspectRatio", "none");
        attribute("href", element.getAttribute("href"));
        out.append("/>\n");
    }

    private void attribute(String name, String value) {
        out.append(' ').append(name).append("=\"").append(value).append('"');
    }

    private String color(@org.jspecify.annotations.Nullable String text) {
        int rgb = rgb(text);
        String name = names.get(rgb);
        return name == null ? Look.hex(new Color(rgb)) : name;
    }

    private static int rgb(@org.jspecify.annotations.Nullable String text) {
        Integer named = text == null ? null : NAMED.get(text);
        if (named != null) {
            return 0xff000000 | named;
        }
        Matcher matcher = RGB.matcher(text == null ? "" : text);
        if (!matcher.matches()) {
            throw new IllegalStateException("not a colour: " + text);
        }
        return new Color(
                        Integer.parseInt(matcher.group(1)),
                        Integer.parseInt(matcher.group(2)),
                        Integer.parseInt(matcher.group(3)))
                .getRGB();
    }

    /** Every number to a tenth. */
    private static String rounded(String text) {
        if (text.indexOf('.') < 0) {
            return text;
        }
        Matcher matcher = NUMBER.matcher(text);
        StringBuilder result = new StringBuilder();
        while (matcher.find()) {
            long tenths = Math.round(10 * Double.parseDouble(matcher.group()));
            String whole = (tenths < 0 ? "-" : "") + Math.abs(tenths) / 10;
            matcher.appendReplacement(result, tenths % 10 == 0 ? whole : whole + "." + Math.abs(tenths) % 10);
        }
        return matcher.appendTail(result).toString();
    }

    private static String escaped(String text) {
        return text.replace("&", "&amp;")
                .replace("<", "&lt;")
                .replace(">", "&gt;")
                .replace("\"", "&quot;");
    }
}
