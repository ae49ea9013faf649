package org.soakwright.solver.transport;

import static org.soakwright.solver.transport.Check.ICE_POINT;
import static org.soakwright.solver.transport.Check.assertRelative;

import java.util.List;
import org.junit.jupiter.api.Test;

class DissolvedTest {
    /** Closer to its end the iteration may go round in circles of rounding; of these contents, one in two hundred did. */
    @Test
    void everyContentHasAFraction() {
        for (Solution solution : List.of(Solution.brine(), Solution.sugar())) {
            for (double celsius = 0; celsius <= 100; celsius += 10) {
                double kelvin = ICE_POINT + celsius;
                double most = solution.content(solution.mostFraction(), kelvin).value();
                for (int i = 1; i <= 1500; i++) {
                    double content = Math.min(most, most * i / 1500);
                    double fraction = solution.fraction(content, kelvin).value();
                    assertRelative(content, solution.content(fraction, kelvin).value(), 5e-15, "content");
                }
            }
        }
    }
}
