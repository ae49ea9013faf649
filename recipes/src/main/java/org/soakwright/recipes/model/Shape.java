package org.soakwright.recipes.model;

import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;

/** The shapes pieces can have, each with what is measured of it, in the order of its sides. */
public enum Shape implements Word {
    /** So wide that its edges do not matter. */
    SLAB(Dimension.THICKNESS),
    /** So long that its ends do not matter. */
    CYLINDER(Dimension.DIAMETER),
    SPHERE(Dimension.DIAMETER),
    SHORT_CYLINDER(Dimension.DIAMETER, Dimension.LENGTH),
    BRICK(Dimension.THICKNESS, Dimension.WIDTH, Dimension.LENGTH);

    @SuppressWarnings("ImmutableEnumChecker") // only ever a List.of
    private final List<Dimension> dimensions;

    Shape(Dimension... dimensions) {
        this.dimensions = List.of(dimensions);
    }

    /** What is measured of it. */
    public List<Dimension> dimensions() {
        return dimensions;
    }

    /** Those of its dimensions that end in faces. */
    public List<Dimension> withFaces() {
        return dimensions.stream().filter(Dimension::hasFaces).toList();
    }

    /** Whether its sizes give its volume. */
    public boolean isFinite() {
        return this != SLAB && this != CYLINDER;
    }

    /**
     * The volume of a piece.
     *
     * @param sizes in metres, in the order of the dimensions
     * @throws IllegalStateException for a slab and a long cylinder, which have none
     */
    public double volumeM3(double... sizes) {
        return switch (this) {
            case SLAB, CYLINDER -> throw new IllegalStateException("a " + word() + " has no volume of its own");
            case SPHERE -> Math.PI / 6 * Math.pow(sizes[0], 3);
            case SHORT_CYLINDER -> Math.PI / 4 * Math.pow(sizes[0], 2) * sizes[1];
            case BRICK -> sizes[0] * sizes[1] * sizes[2];
        };
    }

    /** The direction of diffusion that belongs to a dimension; null for a sphere, which has none. */
    public @Nullable Grain grain(Dimension dimension) {
        return switch (dimension) {
            case THICKNESS -> Grain.THICKNESS;
            case WIDTH -> Grain.WIDTH;
            case LENGTH -> this == SHORT_CYLINDER ? Grain.ALONG : Grain.LENGTH;
            case DIAMETER -> this == SPHERE ? null : Grain.ACROSS;
        };
    }

    /** The directions of diffusion it has. */
    public List<Grain> grains() {
        return dimensions.stream().map(this::grain).filter(Objects::nonNull).toList();
    }
}
