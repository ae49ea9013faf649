package org.soakwright.recipes.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

class LotTest {
    private static final Place HERE = new Place("f", 1, 1);

    private static Grade sphere(String name, String millimetres, double share) {
        return Given.grade(name, Shape.SPHERE, share, Given.side(Dimension.DIAMETER, millimetres));
    }

    private static Lot lot(Amount amount, @Nullable String density, Grade... grades) {
        Quantity stated = density == null ? null : Given.quantity(density, "kg/m3", Kind.DENSITY);
        return new Lot(HERE, amount, stated, null, List.of(grades));
    }

    @Test
    void massAndVolumeAreOneThroughTheDensity() {
        Lot byMass = lot(new Amount.ByMass(Given.quantity("550", "kg", Kind.MASS)), "1100", sphere("a", "3", 1));
        assertEquals(0.5, byMass.volumeM3(), 1e-15);
        Lot byVolume = lot(new Amount.ByVolume(Given.quantity("500", "L", Kind.VOLUME)), "1100", sphere("a", "3", 1));
        assertEquals(550, byVolume.massKg().orElseThrow(), 1e-12);
    }

    @Test
    void containersHoldTheirMassTogether() {
        Quantity each = Given.quantity("25", "kg", Kind.MASS);
        Lot lot = lot(new Amount.InContainers(HERE, 24, each), "1200", sphere("a", "3", 1));
        assertEquals(600, lot.massKg().orElseThrow());
        assertEquals(0.5, lot.volumeM3(), 1e-15);
        assertThrows(Unsound.class, () -> lot(new Amount.InContainers(HERE, 24, each), null, sphere("a", "3", 1)));
        assertThrows(Unsound.class, () -> new Amount.InContainers(HERE, 0, each));
    }

    @Test
    void withoutADensityThereIsNoMass() {
        Lot lot = lot(new Amount.ByVolume(Given.quantity("500", "L", Kind.VOLUME)), null, sphere("a", "3", 1));
        assertTrue(lot.massKg().isEmpty());
        assertThrows(Unsound.class, () -> lot(new Amount.ByMass(Given.quantity("1", "kg", Kind.MASS)), null));
    }

    @Test
    void aCountOfBallsFillsTheirVolume() {
        Lot one = lot(new Amount.ByCount(1000, HERE), null, sphere("a", "6", 1));
        assertEquals(1000 * Math.PI / 6 * 0.006 * 0.006 * 0.006, one.volumeM3(), 1e-18);
        // Half of the volume in balls of 6 mm, half in balls of 12 mm: eight small ones to each large one.
        Lot two = lot(new Amount.ByCount(9, HERE), null, sphere("a", "6", 0.5), sphere("b", "12", 0.5));
        double small = Math.PI / 6 * Math.pow(0.006, 3);
        assertEquals(16 * small, two.volumeM3(), 1e-18);
    }

    @Test
    void aContentGoesToVolumeAndBack() {
        Lot lot = lot(new Amount.ByMass(Given.quantity("1", "kg", Kind.MASS)), "1120", sphere("a", "3", 1));
        Content content = new Content(Given.quantity("190", "g/kg", Kind.PER_MASS));
        assertEquals(212.8, lot.kgPerM3(content), 1e-12);
        assertEquals(190, lot.express(212.8, content.unit()), 1e-12);
        assertEquals(212.8, lot.express(212.8, Kind.PER_VOLUME.unit("g/L").orElseThrow()), 1e-12);
    }

    @Test
    void theCoreOfASlabSealedOnOneSideIsAtThatSide() {
        Quantity size = Given.quantity("18", "mm", Kind.LENGTH);
        assertEquals(0.018, new Side(Dimension.THICKNESS, size, Faces.ONE).depth());
        assertEquals(0.009, new Side(Dimension.THICKNESS, size, Faces.BOTH).depth());
    }

    @Test
    void aLotMayStateItsTemperature() {
        Amount amount = new Amount.ByVolume(Given.quantity("1", "L", Kind.VOLUME));
        List<Grade> grades = List.of(sphere("a", "3", 1));
        Quantity cold = Given.quantity("3", "Cel", Kind.TEMPERATURE);
        assertEquals(cold, new Lot(HERE, amount, null, cold, grades).temperature());
        Quantity molten = Given.quantity("3001", "K", Kind.TEMPERATURE);
        assertThrows(Unsound.class, () -> new Lot(HERE, amount, null, molten, grades));
    }

    @Test
    void sharesSumToTheWhole() {
        Amount amount = new Amount.ByVolume(Given.quantity("1", "L", Kind.VOLUME));
        assertEquals(
                3,
                lot(amount, null, sphere("a", "1", 0.1), sphere("b", "1", 0.2), sphere("c", "1", 0.7))
                        .grades()
                        .size());
        Unsound unsound = assertThrows(
                Unsound.class, () -> lot(amount, null, sphere("a", "1", 0.4), sphere("b", "1", 0.5999999)));
        assertEquals(
                "f:1:1: the shares of the grades sum to 99.99999 %; they must sum to 100 %",
                unsound.problems().get(0).toString());
        assertThrows(Unsound.class, () -> sphere("a", "1", 0));
        assertThrows(Unsound.class, () -> sphere("a", "1", Double.NaN));
    }
}
