package org.soakwright.solver.transport;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.soakwright.solver.transport.Check.assertRelative;

import java.util.List;
import org.junit.jupiter.api.Test;

class BodyTest {
    /**
     * What diffusion takes from a body, by the root of its surface: sphere 3.545, cube 3.388, cylinder as long as wide
     * 3.444, disc 3.1915 (Yovanovich, as in Bejan, Convection Heat Transfer, from memory). The bound used here is no
     * more than those, and little less.
     */
    @Test
    void diffusionTakesNoMoreThanPublished() {
        assertEquals(3.545, byRoot(new Body.Sphere(0.01), Math.PI * 1e-4), 0.5e-3);
        assertEquals(3.1915, byRoot(new Body.Lying(0.01, 0.01), 2e-4), 0.5e-4);
        double cube = byRoot(new Body.Brick(0.01, 0.01, 0.01), 6e-4);
        assertTrue(cube < 3.388 && cube > 0.92 * 3.388, "cube " + cube);
        double stub = byRoot(new Body.ShortCylinder(0.01, 0.01), 1.5 * Math.PI * 1e-4);
        assertTrue(stub < 3.444 && stub > 0.92 * 3.444, "short cylinder " + stub);
    }

    private static double byRoot(Body body, double area) {
        return body.pureDiffusion() * Math.sqrt(area);
    }

    @Test
    void surfacesAndSides() {
        Body.Brick brick = new Body.Brick(1, 2, 3);
        assertEquals(22, brick.area());
        assertEquals(3, brick.aspect());
        assertEquals(6, Equivalent.girth(brick));
        assertEquals(6, Equivalent.girth(new Body.Brick(3, 1, 2)));
        assertRelative(Math.sqrt(22 / Math.PI), brick.equalSurface(), 1e-15, "sphere");
        Body.ShortCylinder coin = new Body.ShortCylinder(4, 1);
        assertRelative(12 * Math.PI, coin.area(), 1e-15, "coin");
        assertEquals(4, coin.aspect());
        assertEquals(10, Equivalent.girth(coin));
        assertRelative(4 * Math.PI, Equivalent.girth(new Body.ShortCylinder(4, 40)), 1e-15, "rod");
        assertRelative(5 * Math.PI, Equivalent.girth(new Body.Sphere(5)), 1e-15, "sphere");
    }

    @Test
    void noFilmIsLessThanDiffusion() {
        Medium liquor = Liquors.ofSchmidt(1200);
        List<Body.Bounded> bodies =
                List.of(new Body.Sphere(1e-3), new Body.Brick(1e-3, 2e-3, 9e-3), new Body.ShortCylinder(1e-3, 4e-3));
        for (Body.Bounded body : bodies) {
            double least = body.pureDiffusion() * liquor.diffusivity() * (1 - 1e-14);
            for (double weak = 1e-12; weak < 1; weak *= 10) {
                assertTrue(Film.past(body, liquor, weak).coefficient() >= least);
                assertTrue(Film.still(body, liquor, new Buoyancy(weak)).coefficient() >= least);
                assertTrue(Film.stirred(body, liquor, weak).coefficient() >= least);
                assertTrue(Film.packed(body, liquor, new Bed(weak, 0.4)).coefficient() >= least);
            }
        }
    }
}
