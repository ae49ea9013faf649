package org.soakwright.planner.report.picture;

import java.awt.Image;
import java.awt.geom.AffineTransform;
import java.awt.image.BufferedImage;
import java.awt.image.RenderedImage;
import java.awt.image.renderable.RenderableImage;
import java.util.Base64;
import org.apache.batik.svggen.DOMTreeManager;
import org.apache.batik.svggen.GenericImageHandler;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.w3c.dom.Element;

/** Images inside the SVG that shows them. */
final class EmbeddedImages implements GenericImageHandler {
    @Override
    public void setDOMTreeManager(DOMTreeManager manager) {
        // Nothing is kept in definitions.
    }

    @Override
    public Element createElement(SVGGeneratorContext context) {
        return context.getDOMFactory().createElementNS("http://www.w3.org/2000/svg", "image");
    }

    @Override
    public AffineTransform handleImage(
            Image image, Element element, int x, int y, int width, int height, SVGGeneratorContext context) {
        String data = Base64.getEncoder().encodeToString(Png.of((BufferedImage) image));
        element.setAttribute("x", Integer.toString(x));
        element.setAttribute("y", Integer.toString(y));
        element.setAttribute("width", Integer.toString(width));
        element.setAttribute("height", Integer.toString(height));
        element.setAttribute("href", "data:image/png;base64," + data);
        return new AffineTransform();
    }

    @Override
    public AffineTransform handleImage(
            RenderedImage image, Element element, int x, int y, int width, int height, SVGGeneratorContext context) {
        throw new IllegalArgumentException("only buffered images are drawn");
    }

    @Override
    public AffineTransform handleImage(
            RenderableImage image,
            Element element,
            double x,
            double y,
            double width,
            double height,
            SVGGeneratorContext context) {
        throw new IllegalArgumentException("only buffered images are drawn");
    }
}
