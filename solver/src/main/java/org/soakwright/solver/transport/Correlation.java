package org.soakwright.solver.transport;

import static org.soakwright.solver.transport.Limit.atLeast;
import static org.soakwright.solver.transport.Limit.atMost;

import java.util.List;

/**
 * The correlations that films are computed by, each with its formula, source and range. "Read" is what was seen in a
 * source or a worked example of it; all else is from memory. Where published fits of the same film disagree, the lower
 * one stands here, and {@link #within} reaches to the higher.
 */
public enum Correlation {
    /**
     * Sh = 0.664 Re^(1/2) Sc^(1/3), mean over the length; Re up to 5e5, Sc from 0.6 on (Pohlhausen 1921; Incropera and
     * DeWitt, equation 7.30, range read). Exact for a sharp, smooth plate once the layer is thin, Re above about 1000
     * (common practice). Fits of measured liquids lie up to half above it (0.99 Re^(1/2), Geankoplis, example 7.3-2,
     * read).
     */
    PLATE_LAMINAR(
            "plate in laminar flow (Pohlhausen 1921)",
            0.5,
            new Limit(Group.REYNOLDS, 1e3, 5e5),
            atLeast(Group.SCHMIDT, 0.6)),
    /**
     * Sh = (0.037 Re^(4/5) - 871) Sc^(1/3), laminar up to Re 5e5; Re up to 1e8, Sc 0.6 to 60 (Incropera and DeWitt,
     * equation 7.38 with A = 871, read). Meets the laminar one at 5e5 to 0.1 %.
     */
    PLATE_MIXED(
            "plate in mixed flow (Incropera 7.38)",
            0.25,
            new Limit(Group.REYNOLDS, 5e5, 1e8),
            new Limit(Group.SCHMIDT, 0.6, 60)),
    /**
     * Sh = 0.3 + 0.62 Re^(1/2) Sc^(1/3) / [1 + (0.4/Sc)^(2/3)]^(1/4) [1 + (Re/282000)^(5/8)]^(4/5); Re Sc from 0.2 on,
     * Re up to 1e7 (Churchill and Bernstein 1977, J Heat Transfer 99:300, read). Its authors call it a lower bound.
     */
    CYLINDER(
            "cylinder across the flow (Churchill and Bernstein 1977)",
            0.25,
            atLeast(Group.PECLET, 0.2),
            atMost(Group.REYNOLDS, 1e7)),
    /** Sh = 1 + (1 + Re Sc)^(1/3); Re up to 1 (Clift, Grace and Weber 1978, read in public codes). */
    SPHERE_CREEPING("sphere in creeping flow (Clift, Grace and Weber 1978)", 0.1, atMost(Group.REYNOLDS, 1)),
    /**
     * Sh = 1 + (1 + 1/(Re Sc))^(1/3) Re^0.41 Sc^(1/3); Re 1 to 100 (Clift, Grace and Weber 1978, read in public codes),
     * Sc from 0.25 on (from memory). Geankoplis' fit for liquids (2 + 0.95 Re^(1/2) Sc^(1/3), equation 7.3-34, from
     * memory) lies up to half above it.
     */
    SPHERE_SLOW(
            "sphere in slow flow (Clift, Grace and Weber 1978)",
            0.5,
            new Limit(Group.REYNOLDS, 1, 100),
            atLeast(Group.SCHMIDT, 0.25)),
    /**
     * Sh = 1 + 0.724 Re^0.48 Sc^(1/3); Re 100 to 2000 (Clift, Grace and Weber 1978, read in public codes), Sc from 200
     * on (from memory). Geankoplis' fit lies up to half above it.
     */
    SPHERE_MIDDLE(
            "sphere in flow (Clift, Grace and Weber 1978)",
            0.55,
            new Limit(Group.REYNOLDS, 100, 2000),
            atLeast(Group.SCHMIDT, 200)),
    /**
     * Sh = 1 + 0.425 Re^0.55 Sc^(1/3); Re 2000 to 1e5 (Clift, Grace and Weber 1978, read in public codes), Sc from 200
     * on (from memory). Geankoplis' fit (0.347 Re^0.62 Sc^(1/3) up to Re 17000, equation 7.3-35, from memory) lies up
     * to six tenths above it.
     */
    SPHERE_FAST(
            "sphere in quick flow (Clift, Grace and Weber 1978)",
            0.65,
            new Limit(Group.REYNOLDS, 2000, 1e5),
            atLeast(Group.SCHMIDT, 200)),
    /**
     * Sh = 2 + 0.552 Re^0.53 Sc^(1/3) in gases; Sc 0.6 to 2.7, Re 1 to 48000 (Geankoplis, equation 7.3-33, value read
     * in example 7.3-3). Used up to Sc 2.7.
     */
    SPHERE_IN_GAS(
            "sphere in gas (Geankoplis 7.3-33)",
            0.15,
            new Limit(Group.SCHMIDT, 0.6, 2.7),
            new Limit(Group.REYNOLDS, 1, 48_000)),
    /**
     * By the root of the surface: Sh = Sh0 + [0.15 (P/sqrt A)^(1/2) Re^(1/2) + 0.35 Re^0.566] Sc^(1/3), P the girth
     * across the flow, Sh0 what diffusion alone does; Re up to 2e5, Sc from 0.7 on, sides up to 5 to 1 (Yovanovich
     * 1988, from memory). Meant for low Sc too; against the sphere's own in liquor it is within 15 % from Re 1000 on, a
     * fifth below at 100 and two fifths at 10, so its range begins at 100 here.
     */
    SHORT_BODY(
            "short body in flow (Yovanovich 1988)",
            0.3,
            new Limit(Group.REYNOLDS, 100, 2e5),
            atLeast(Group.SCHMIDT, 0.7),
            atMost(Group.ASPECT, 5)),
    /**
     * Sh = 0.68 + 0.670 Ra^(1/4) / [1 + (0.492/Sc)^(9/16)]^(4/9) by height (Churchill and Chu 1975, Int J Heat Mass
     * Transfer 18:1323, laminar, from memory), stated from Sc 100 on, used from 10 on, where layers stay laminar up to Ra 1e12: Wilke,
     * Tobias and Eisenberg 1953, J Electrochem Soc 100:513, measured 0.66 Ra^(1/4) at Sc 500 to 80000 (from memory).
     * The formula for gases would give 1.3 times as much at Ra 1e8 and 2.3 times at 1e12.
     */
    STANDING_PLATE(
            "standing plate in still liquor (Churchill and Chu 1975)",
            0.2,
            new Limit(Group.RAYLEIGH, 0.1, 1e12),
            atLeast(Group.SCHMIDT, 100)),
    /**
     * Sh = {0.825 + 0.387 Ra^(1/6) / [1 + (0.492/Sc)^(9/16)]^(8/27)}^2 by height, laminar and turbulent; Ra 0.1 to 1e12
     * (Churchill and Chu 1975, formula and a value read, range from memory). Used below Sc 10.
     */
    STANDING_PLATE_IN_GAS(
            "standing plate in still gas (Churchill and Chu 1975)", 0.2, new Limit(Group.RAYLEIGH, 0.1, 1e12)),
    /**
     * Mean of the two faces, by area over girth of one face: 0.54 Ra^(1/4) where the layer falls or rises away, 0.27
     * Ra^(1/4) where it stays; together Ra 1e5 to 1e7 (McAdams 1954, Lloyd and Moran 1974; formulas and ranges read).
     */
    LYING_PLATE("lying plate in still liquor (McAdams 1954)", 0.3, new Limit(Group.RAYLEIGH, 1e5, 1e7)),
    /** The same with 0.15 Ra^(1/3) where the layer leaves; Ra 1e7 to 1e10 (read). 4 % above the other at 1e7. */
    LYING_PLATE_TURBULENT(
            "lying plate in still liquor, turbulent (Lloyd and Moran 1974)", 0.3, new Limit(Group.RAYLEIGH, 1e7, 1e10)),
    /**
     * Sh = 0.36 + 0.518 Ra^(1/4) / [1 + (0.559/Sc)^(9/16)]^(4/9) (Churchill and Chu 1975, Int J Heat Mass Transfer
     * 18:1049, laminar, from memory), used from Sc 10 on; Ra 1e-6 to 1e10: Schütz 1963, Int J Heat Mass Transfer
     * 6:873, measured 0.53 Ra^(1/4) there (from memory).
     */
    LYING_CYLINDER(
            "lying cylinder in still liquor (Churchill and Chu 1975)",
            0.2,
            new Limit(Group.RAYLEIGH, 1e-6, 1e10),
            atLeast(Group.SCHMIDT, 100)),
    /**
     * Sh = {0.60 + 0.387 Ra^(1/6) / [1 + (0.559/Sc)^(9/16)]^(8/27)}^2; Ra 1e-5 to 1e12 (Churchill and Chu 1975, formula
     * and a value read). Used below Sc 10.
     */
    LYING_CYLINDER_IN_GAS(
            "lying cylinder in still gas (Churchill and Chu 1975)", 0.2, new Limit(Group.RAYLEIGH, 1e-5, 1e12)),
    /**
     * Sh = 2 + 0.589 Ra^(1/4) / [1 + (0.469/Sc)^(9/16)]^(4/9); Ra up to 1e11, Sc from 0.7 on (Churchill 1983, formula
     * and a value read).
     */
    STILL_SPHERE(
            "sphere in still liquor (Churchill 1983)", 0.2, atMost(Group.RAYLEIGH, 1e11), atLeast(Group.SCHMIDT, 0.7)),
    /**
     * By the root of the surface: Sh = Sh0 + 0.67 G Ra^(1/4) / [1 + (0.492/Sc)^(9/16)]^(4/9) with G 0.951 for a brick
     * (a cube flat down), 0.967 for a short cylinder (one as long as wide, standing; lying it has 1.019); Ra up to 1e8,
     * Sc from 0.7 on (Yovanovich 1987, as in Bejan, Convection Heat Transfer; from memory). G falls to 0.77 for flat
     * bodies of 10 to 1: sides up to 2 to 1.
     */
    STILL_SHORT_BODY(
            "short body in still liquor (Yovanovich 1987)",
            0.25,
            atMost(Group.RAYLEIGH, 1e8),
            atLeast(Group.SCHMIDT, 0.7),
            atMost(Group.ASPECT, 2)),
    /**
     * J_D = 1.09/voids Re^(-2/3) by the speed over the whole section and the sphere of the same surface; Re 0.0016 to
     * 55, Sc 165 to 70600, voids 0.35 to 0.75 (Wilson and Geankoplis 1966; Geankoplis, example 7.3-4, value read).
     */
    BED_SLOW(
            "bed with slow liquor (Wilson and Geankoplis 1966)",
            0.25,
            new Limit(Group.REYNOLDS, 0.0016, 55),
            new Limit(Group.SCHMIDT, 165, 70_600),
            new Limit(Group.VOIDS, 0.35, 0.75)),
    /**
     * J_D = 0.25/voids Re^(-0.31); Re 55 to 1500, Sc 165 to 10690, voids 0.35 to 0.75 (Wilson and Geankoplis 1966;
     * value read in Dutta, example 3.8). 4 % below the slow one at 55.
     */
    BED_QUICK(
            "bed with quick liquor (Wilson and Geankoplis 1966)",
            0.25,
            new Limit(Group.REYNOLDS, 55, 1500),
            new Limit(Group.SCHMIDT, 165, 10_690),
            new Limit(Group.VOIDS, 0.35, 0.75)),
    /**
     * Sh = 2 + 1.1 Re^0.6 Sc^(1/3); Re 3 to 1e4 (Wakao and Funazkri 1978, Chem Eng Sci 33:1375, read). For gases, and
     * for liquors above Re 1500, where it is a fifth below to seven tenths above the other, for voids of 0.35 to 0.75.
     */
    BED("bed (Wakao and Funazkri 1978)", 0.25, new Limit(Group.REYNOLDS, 3, 1e4)),
    /**
     * k Sc^(2/3) = 0.13 (power per volume x viscosity / density^2)^(1/4), whatever the size of the piece (Calderbank
     * and Moo-Young 1961; Geankoplis, equation 7.4-2; from memory).
     */
    STIRRED("pieces in stirred liquor (Calderbank and Moo-Young 1961)", 0.4),
    /**
     * Sh = 2 + 0.47 [power^(1/3) d^(4/3) / nu]^0.62 (impeller/tank)^0.17 Sc^0.36, power per mass, pieces about as dense
     * as the liquor (Levins and Glastonbury 1972, Trans Inst Chem Eng 50:132, coefficients read in a public code).
     */
    SUSPENDED("suspended pieces in stirred liquor (Levins and Glastonbury 1972)", 0.4),
    /**
     * k = 2 D/d + 0.31 Sc^(-2/3) (density difference x viscosity x g / density^2)^(1/3); small pieces, d up to 0.6 mm
     * (Calderbank and Moo-Young 1961; Geankoplis, equation 7.4-1, value read in example 7.4-1).
     */
    SINKING("small pieces that sink or rise (Calderbank and Moo-Young 1961)", 0.3, atMost(Group.DIAMETER, 0.6e-3));

    private final String title;
    private final double within;

    @SuppressWarnings("ImmutableEnumChecker") // only ever a List.of
    private final List<Limit> limits;

    Correlation(String title, double within, Limit... limits) {
        this.title = title;
        this.within = within;
        this.limits = List.of(limits);
    }

    /** What it is for and whose it is. */
    public String title() {
        return title;
    }

    /** How far measured films lie from it, as a share of it (common practice, from memory). */
    public double within() {
        return within;
    }

    List<Limit> limits() {
        return limits;
    }

    /** Whether its range in size and power is known here. */
    boolean rangeKnown() {
        return !limits.isEmpty();
    }
}
