package org.soakwright.planner.report.picture;

import java.awt.Color;
import java.awt.image.BufferedImage;
import java.awt.image.IndexColorModel;
import java.awt.image.WritableRaster;
import java.util.List;

/** Images whose points are contents: one byte each, and a table of the colours they stand for. */
final class Shades {
    private Shades() {}

    /** Shares from 0 to 1 by column, then by row. */
    static BufferedImage image(double[][] shares, List<Color> colors) {
        int width = shares.length;
        int height = shares[0].length;
        byte[] red = new byte[colors.size()];
        byte[] green = new byte[colors.size()];
        byte[] blue = new byte[colors.size()];
        for (int i = 0; i < red.length; i++) {
            red[i] = (byte) colors.get(i).getRed();
            green[i] = (byte) colors.get(i).getGreen();
            blue[i] = (byte) colors.get(i).getBlue();
        }
        IndexColorModel model = new IndexColorModel(8, colors.size(), red, green, blue);
        BufferedImage image = new BufferedImage(width, height, BufferedImage.TYPE_BYTE_INDEXED, model);
        WritableRaster raster = image.getRaster();
        for (int i = 0; i < width; i++) {
            for (int j = 0; j < height; j++) {
                raster.setSample(i, j, 0, (int) Math.rint(shares[i][j] * (colors.size() - 1)));
            }
        }
        return image;
    }
}
