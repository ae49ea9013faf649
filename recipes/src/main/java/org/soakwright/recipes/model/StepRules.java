package org.soakwright.recipes.model;

import org.soakwright.recipes.text.Unsound;

/** What makes a step whole in itself. */
final class StepRules {
    private StepRules() {}

    static void renewed(StepHead head, Liquor liquor, Renewal renewal) {
        boolean plenty = renewal instanceof Renewal.Plenty;
        if (plenty && !liquor.isUnlimited()) {
            throw new Unsound(
                    head.place(),
                    "a rinse needs fresh liquor: found neither flow nor fills; add fills, such as 3, or flow to its"
                            + " liquor, such as 10 L/min, or write soak");
        }
        if (!plenty && liquor.isUnlimited()) {
            throw new Unsound(
                    liquor.volume().place(),
                    "unlimited liquor is never renewed: found volume: unlimited with flow or fills; remove those, or"
                            + " write a volume such as 1200 L");
        }
    }
}
