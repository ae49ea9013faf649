package org.soakwright.planner.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** RFC 4180, Common Format and MIME Type for CSV Files, section 2; its rules are named by their numbers. */
class CsvTest {
    /** Rules 1 and 4: lines end with CR LF, the last one too; fields are parted by commas, none after the last. */
    @Test
    void linesEndWithCarriageReturnAndLineFeed() {
        Csv csv = new Csv(List.of("step", "time [s]"));
        csv.text("first water").number(35100).end();
        assertEquals("step,time [s]\r\nfirst water,35100\r\n", csv.toString());
    }

    /** Rules 6 and 7: fields with commas, quotes or line breaks stand in quotes, and quotes are doubled. */
    @Test
    void whatIsReadBackIsWhatWasWritten() {
        List<String> hard = List.of("a,b", "say \"soak\"", "two\r\nlines", "", " blank before", "żółw, مياه");
        Csv csv = new Csv(List.of("1", "2", "3", "4", "5", "6"));
        hard.forEach(csv::text);
        csv.end();
        assertEquals(hard, CsvText.read(csv.toString()).get(1));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.1, 1 / 3.0, -2.5e-7, 6.02e23, 40, 123456789.125, -0.0})
    void aNumberComesBackToTheLastBit(double value) {
        Csv csv = new Csv(List.of("value"));
        csv.number(value).end();
        assertEquals(
                value + 0.0,
                Double.parseDouble(CsvText.read(csv.toString()).get(1).get(0)));
    }

    @ParameterizedTest
    @ValueSource(strings = {"=1+1", "+46", "-ice", "@SUM(A1)", "\tx"})
    void noTextIsAFormula(String text) {
        Csv csv = new Csv(List.of("name"));
        csv.text(text).end();
        assertEquals("'" + text, CsvText.read(csv.toString()).get(1).get(0));
    }

    @Test
    void aNegativeNumberIsNoFormula() {
        Csv csv = new Csv(List.of("change"));
        csv.number(-0.5).end();
        assertEquals("change\r\n-0.5\r\n", csv.toString());
    }

    @Test
    void aRowIsAsLongAsTheHeader() {
        Csv csv = new Csv(List.of("a", "b"));
        csv.text("x");
        assertThrows(IllegalStateException.class, csv::end);
        csv.number(OptionalDouble.empty()).end();
        assertThrows(ArithmeticException.class, () -> csv.number(Double.NaN));
    }
}
