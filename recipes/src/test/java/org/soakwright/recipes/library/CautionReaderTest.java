package org.soakwright.recipes.library;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Unsound;

/** What is wrong in the file of cautions is said with its place. */
class CautionReaderTest {
    private static final String WHOLE = """
            words:
              salt: [salt, nacl]
            sources:
              hall: {document: Hall rules, section: 4, dated: 2025, read: text}
            cautions:
              slippery:
                when: {product: food, species: salt}
                text: Brine on the floor is slippery
                source: hall
            """;

    private static CautionBook book(String text) {
        return CautionBook.of(Source.of("f", text.getBytes(StandardCharsets.UTF_8)));
    }

    private static Caution with(String when) {
        return book(WHOLE.replace("{product: food, species: salt}", when)).all().get(0);
    }

    @Test
    void aWholeCautionIsReadAsWritten() {
        Caution caution = book(WHOLE).all().get(0);
        assertEquals("slippery", caution.id());
        assertEquals("f:6:3", caution.place().toString());
        assertEquals(new Weight.Shown(), caution.weight());
        assertTrue(caution.isDue(Situation.of(Product.FOOD).species("NaCl")));
        assertEquals("Brine on the floor is slippery (Hall rules 4).", caution.shown(Situation.of(), seconds -> ""));
    }

    @Test
    void alwaysIsDueInEverySituation() {
        assertTrue(with("always").isDue(Situation.of()));
    }

    @Test
    void oneOfSeveralProductsIsEnough() {
        Caution caution = with("{product: [food, corrosive]}");
        assertTrue(caution.isDue(Situation.of(Product.CORROSIVE, Product.OTHER)));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "species: salt} | species: sall} | f:7:36: species names a list of words: found \"sall\"; did you mean \"salt\"?",
                "species: salt} | steps: soak} | f:7:27: unknown key in when: found \"steps\"; did you mean \"step\"?",
                "product: food | product: foot | f:7:21: product: found \"foot\"; write one of food, flammable, corrosive, other",
                "species: salt} | held: {above: 5 Cel}} | f:7:33: held needs longer-than: found none",
                "species: salt} | step: {above: 5}} | f:7:41: above: found \"5\", where a temperature is needed; write such as 4 Cel",
                "species: salt} | step: {above: 9 Cel, below: 5 Cel}} | f:7:55: `below` lies over `above`: found \"5 Cel\" after \"9 Cel\"",
                "species: salt} | step: {kind: boil}} | f:7:40: kind: found \"boil\"; write one of soak, rinse, rest, dry",
                "species: salt} | vessel: {}} | f:7:35: this needs above or below: found neither; write such as above: 1200 L",
                "species: salt} | liquor: {of: salt, reading: mean}} | f:7:46: unknown key in liquor: found \"reading\"; known are of, above, below; the nearest is \"above\"",
                "species: salt} | piece: {of: salt, above: 1 g/kg}} | f:7:34: piece needs reading: found none",
                "species: salt} | any: [{product: food}]} | f:7:32: any is a list of two or more: found a list",
                "{product: food, species: salt} | {} | f:7:11: when holds nothing; write always, or such as {product: food}",
                "{product: food, species: salt} | often | f:7:11: when is written as keys and values: found \"often\"",
                "is slippery | is slippery. | f:6:3: the text of a caution ends without a full stop, its source follows; remove it",
                "source: hall | source: hal | f:9:13: unknown source: found \"hal\"; did you mean \"hall\"?",
                "source: hall | stop: true | f:7:5: a caution needs because: found none",
                "source: hall | stop: no | f:9:11: stop is true or not there: found \"no\"; remove it",
                "section: 4 | seen: 4 | f:4:3: a source needs section: found none; write such as 3-501.16",
                "document: Hall rules | document: common practice | f:4:3: common practice has no section: found \"4\"; remove it, or name the document",
                "dated: 2025 | read: text | f:4:56: the key \"read\" stands twice: found the first at line 4; keep one"
            })
    void whatIsWrongIsSaidAtItsPlace(String right, String wrong, String expected) {
        String text = WHOLE.replace(right, wrong);
        Unsound unsound = assertThrows(Unsound.class, () -> book(text));
        assertEquals(expected, unsound.problems().get(0).toString());
    }

    @Test
    void whatEverybodyDoesIsFromMemory() {
        String practice = WHOLE.replace("document: Hall rules, section: 4", "document: common practice");
        Unsound unsound = assertThrows(Unsound.class, () -> book(practice));
        assertEquals(
                "f:4:3: common practice is from memory: found read \"text\"; name what was read",
                unsound.problems().get(0).toString());
    }
}
