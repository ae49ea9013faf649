package org.soakwright.planner.report.picture;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.List;
import org.soakwright.planner.batch.Batch;

/** What the pictures of a batch come to, for a machine to tell another. */
final class Fingerprint {
    private Fingerprint() {}

    public static void main(String[] arguments) throws Exception {
        System.out.println(of());
    }

    static String of() throws Exception {
        MessageDigest digest = MessageDigest.getInstance("SHA-256");
        double[] seconds = {9.75 * 3600, 13.25 * 3600, 16.25 * 3600, 12 * 3600};
        List<Picture> loins = Pictures.of(new Batch(Batches.example("loin-desalting")).follow(seconds));
        for (List<Picture> pictures : List.of(loins, Pictures.of(Batches.crowded()), Pictures.of(Batches.corners()))) {
            for (Picture picture : pictures) {
                for (Theme theme : Theme.values()) {
                    digest.update(picture.svg(theme).getBytes(StandardCharsets.UTF_8));
                }
                digest.update(picture.inline().getBytes(StandardCharsets.UTF_8));
                digest.update(picture.caption().getBytes(StandardCharsets.UTF_8));
            }
        }
        return HexFormat.of().formatHex(digest.digest());
    }
}
