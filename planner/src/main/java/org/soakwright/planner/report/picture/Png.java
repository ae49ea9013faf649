package org.soakwright.planner.report.picture;

import java.awt.image.BufferedImage;
import java.awt.image.IndexColorModel;
import java.io.ByteArrayOutputStream;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.zip.Adler32;
import java.util.zip.CRC32;

/**
 * Small indexed images as PNG files. The points are stored, not squeezed, because what a compressor makes of them depends on the machine;
 * ISO/IEC 15948 for the file, RFC 1950 and 1951 for the stored blocks.
 */
final class Png {
    private static final byte[] SIGNATURE = {(byte) 137, 'P', 'N', 'G', 13, 10, 26, 10};
    private static final int LONGEST_BLOCK = 65535;

    private Png() {}

    /** An image of 8-bit indices into a table without transparency. */
    static byte[] of(BufferedImage image) {
        IndexColorModel table = (IndexColorModel) image.getColorModel();
        int width = image.getWidth();
        int height = image.getHeight();
        ByteBuffer header = ByteBuffer.allocate(13);
        header.putInt(width).putInt(height).put((byte) 8).put((byte) 3);
        byte[] palette = new byte[3 * table.getMapSize()];
        for (int i = 0; i < table.getMapSize(); i++) {
            palette[3 * i] = (byte) table.getRed(i);
            palette[3 * i + 1] = (byte) table.getGreen(i);
            palette[3 * i + 2] = (byte) table.getBlue(i);
        }
        byte[] rows = new byte[(width + 1) * height];
        for (int j = 0; j < height; j++) {
            for (int i = 0; i < width; i++) {
                rows[j * (width + 1) + 1 + i] = (byte) image.getRaster().getSample(i, j, 0);
            }
        }
        ByteArrayOutputStream file = new ByteArrayOutputStream(rows.length + palette.length + 200);
        file.writeBytes(SIGNATURE);
        chunk(file, "IHDR", header.array());
        chunk(file, "PLTE", palette);
        chunk(file, "IDAT", stored(rows));
        chunk(file, "IEND", new byte[0]);
        return file.toByteArray();
    }

    private static byte[] stored(byte[] data) {
        ByteArrayOutputStream stream = new ByteArrayOutputStream(data.length + 100);
        stream.write(0x78);
        stream.write(0x01);
        for (int from = 0; from < data.length; from += LONGEST_BLOCK) {
            int length = Math.min(LONGEST_BLOCK, data.length - from);
            stream.write(from + length == data.length ? 1 : 0);
            stream.write(length & 0xff);
            stream.write(length >> 8);
            stream.write(~length & 0xff);
            stream.write(~length >> 8 & 0xff);
            stream.write(data, from, length);
        }
        Adler32 sum = new Adler32();
        sum.update(data);
        stream.writeBytes(number((int) sum.getValue()));
        return stream.toByteArray();
    }

    private static void chunk(ByteArrayOutputStream file, String type, byte[] data) {
        byte[] name = type.getBytes(StandardCharsets.US_ASCII);
        CRC32 sum = new CRC32();
        sum.update(name);
        sum.update(data);
        file.writeBytes(number(data.length));
        file.writeBytes(name);
        file.writeBytes(data);
        file.writeBytes(number((int) sum.getValue()));
    }

    private static byte[] number(int value) {
        return ByteBuffer.allocate(4).putInt(value).array();
    }
}
