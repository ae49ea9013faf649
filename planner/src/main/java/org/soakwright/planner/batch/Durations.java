package org.soakwright.planner.batch;

/** Durations as a person on the floor reads them. */
public final class Durations {
    private Durations() {}

    /** Days, hours and minutes, with seconds only below an hour: {@code 2 d 3 h 15 min}, {@code 4 min 30 s}, {@code 0.020 s}. */
    public static String practical(double seconds) {
        if (seconds > 0 && seconds < 1) {
            return String.format(java.util.Locale.ROOT, "%.2g s", seconds);
        }
        boolean fine = seconds < 3600 && Math.abs(seconds - 60 * Math.rint(seconds / 60)) > 0.05;
        if (fine) {
            double tenths = Math.rint(seconds * 10) / 10;
            long minutes = (long) (tenths / 60);
            double rest = tenths - 60 * minutes;
            String tail = number(rest) + " s";
            return minutes == 0 ? tail : minutes + " min" + (rest == 0 ? "" : " " + tail);
        }
        long minutes = Math.round(seconds / 60);
        long days = minutes / 1440;
        long hours = minutes / 60 % 24;
        long rest = minutes % 60;
        StringBuilder text = new StringBuilder();
        append(text, days, "d");
        append(text, hours, "h");
        append(text, rest, "min");
        return text.length() == 0 ? "0 min" : text.toString();
    }

    /** Running clock in hours and minutes from the start: {@code 57:45}. */
    public static String clock(double seconds) {
        long minutes = Math.round(seconds / 60);
        return String.format(java.util.Locale.ROOT, "%d:%02d", minutes / 60, minutes % 60);
    }

    private static void append(StringBuilder text, long amount, String unit) {
        if (amount > 0) {
            text.append(text.length() == 0 ? "" : " ")
                    .append(amount)
                    .append(' ')
                    .append(unit);
        }
    }

    private static String number(double value) {
        double tenths = Math.rint(value * 10) / 10;
        return tenths == Math.rint(tenths) ? Long.toString((long) tenths) : Double.toString(tenths);
    }
}
