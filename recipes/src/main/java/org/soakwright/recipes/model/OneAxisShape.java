package org.soakwright.recipes.model;

/** The shapes with one axis of diffusion. */
public enum OneAxisShape implements Word {
    SLAB("thickness"),
    CYLINDER("diameter"),
    SPHERE("diameter");

    private final String measure;

    OneAxisShape(String measure) {
        this.measure = measure;
    }

    /** The key of the one size this shape has. */
    public String measure() {
        return measure;
    }
}
