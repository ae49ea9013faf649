package org.soakwright.recipes;

import java.util.Random;

/** Text as a careless hand or a bad disk might leave it. */
final class Damage {
    private static final String ALPHABET = "{}[]:,-&*!%|>'\"#\t\n 019eE.@`?<\\\u0007\u00e9";

    private Damage() {}

    /** The text with one to three hits. */
    static String to(String whole, Random random) {
        StringBuilder damaged = new StringBuilder(whole);
        for (int hit = random.nextInt(3); hit >= 0; hit--) {
            int at = random.nextInt(damaged.length());
            char c = ALPHABET.charAt(random.nextInt(ALPHABET.length()));
            switch (random.nextInt(3)) {
                case 0 -> damaged.setCharAt(at, c);
                case 1 -> damaged.insert(at, c);
                default -> damaged.delete(at, Math.min(damaged.length(), at + 1 + random.nextInt(20)));
            }
        }
        return damaged.toString();
    }
}
