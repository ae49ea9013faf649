package org.soakwright.planner.report.picture;

import java.awt.geom.Rectangle2D;
import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javax.xml.parsers.DocumentBuilderFactory;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;

/** An SVG as someone sees it: its lines of text with the boxes they take, and the boxes of its shapes. */
final class Drawn {
    private static final Pattern NUMBER = Pattern.compile("-?\\d+(?:\\.\\d+)?");

    private final Document document;

    Drawn(String svg) throws Exception {
        document =
                DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new InputSource(new StringReader(svg)));
    }

    record Line(String text, Rectangle2D box) {}

    Element root() {
        return document.getDocumentElement();
    }

    Rectangle2D canvas() {
        List<Double> box = numbers(root().getAttribute("viewBox"));
        return new Rectangle2D.Double(box.get(0), box.get(1), box.get(2), box.get(3));
    }

    /** From the top of the ascenders to the foot of the descenders, as long as the bundled letters make it. */
    List<Line> lines() {
        List<Line> lines = new ArrayList<>();
        for (Element text : elements("text")) {
            double size = Double.parseDouble(text.getAttribute("font-size"));
            lines.add(new Line(
                    text.getTextContent(),
                    new Rectangle2D.Double(
                            Double.parseDouble(text.getAttribute("x")),
                            Double.parseDouble(text.getAttribute("y")) - 0.76 * size,
                            Double.parseDouble(text.getAttribute("textLength")),
                            size)));
        }
        return lines;
    }

    List<String> texts() {
        return lines().stream().map(Line::text).toList();
    }

    /** The corners of lines, paths and boxes. */
    List<Rectangle2D> shapes() {
        List<Rectangle2D> shapes = new ArrayList<>();
        for (Element path : elements("path")) {
            Rectangle2D box = null;
            List<Double> values = numbers(path.getAttribute("d"));
            for (int i = 0; i + 1 < values.size(); i += 2) {
                Rectangle2D point = new Rectangle2D.Double(values.get(i), values.get(i + 1), 0, 0);
                box = box == null ? point : box.createUnion(point);
            }
            if (box != null) {
                shapes.add(box);
            }
        }
        for (Element line : elements("line")) {
            Rectangle2D box = new Rectangle2D.Double();
            box.setFrameFromDiagonal(value(line, "x1"), value(line, "y1"), value(line, "x2"), value(line, "y2"));
            shapes.add(box);
        }
        for (String name : List.of("rect", "image")) {
            for (Element rect : elements(name)) {
                shapes.add(new Rectangle2D.Double(
                        value(rect, "x"), value(rect, "y"), value(rect, "width"), value(rect, "height")));
            }
        }
        return shapes;
    }

    List<Element> elements(String name) {
        NodeList nodes = document.getElementsByTagName(name);
        List<Element> elements = new ArrayList<>();
        for (int i = 0; i < nodes.getLength(); i++) {
            elements.add((Element) nodes.item(i));
        }
        return elements;
    }

    private static double value(Element element, String attribute) {
        return Double.parseDouble(element.getAttribute(attribute));
    }

    private static List<Double> numbers(String text) {
        List<Double> numbers = new ArrayList<>();
        Matcher matcher = NUMBER.matcher(text);
        while (matcher.find()) {
            numbers.add(Double.parseDouble(matcher.group()));
        }
        return numbers;
    }
}
