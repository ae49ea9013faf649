package org.soakwright.planner.report.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.awt.Color;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.List;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;

class ShadesTest {
    private static final List<Color> SHADES = Look.of(Theme.LIGHT).contents();

    @Test
    void theLeastContentIsTheFirstShadeAndTheMostTheLast() {
        BufferedImage image = Shades.image(new double[][] {{0, 1}, {0.5, 0.25}}, SHADES);
        assertEquals(SHADES.get(0).getRGB(), image.getRGB(0, 0));
        assertEquals(SHADES.get(255).getRGB(), image.getRGB(0, 1));
        assertEquals(SHADES.get(128).getRGB(), image.getRGB(1, 0));
    }

    /** The JDK's own reader is the judge; the image is large enough for more than one stored block. */
    @Test
    void otherReadersSeeTheSameImage() throws IOException {
        double[][] shares = new double[300][250];
        for (int i = 0; i < 300; i++) {
            for (int j = 0; j < 250; j++) {
                shares[i][j] = (i * 31 + j * 17) % 101 / 100.0;
            }
        }
        BufferedImage image = Shades.image(shares, SHADES);
        BufferedImage read = ImageIO.read(new ByteArrayInputStream(Png.of(image)));
        assertEquals(300, read.getWidth());
        assertEquals(250, read.getHeight());
        for (int i = 0; i < 300; i++) {
            for (int j = 0; j < 250; j++) {
                assertEquals(image.getRGB(i, j), read.getRGB(i, j));
            }
        }
    }
}
