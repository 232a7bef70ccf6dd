package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import irreproof.budget.BudgetExceeded;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;

class RootSystemTest {
    @Test
    void theRootsFillTheAlgebra() {
        for (SimpleAlgebra algebra : Algebras.upToRank(9)) {
            List<Root> roots = RootSystem.of(algebra).positiveRoots();
            assertEquals(algebra.dimension(), algebra.rank() + 2L * roots.size(), algebra::toString);
        }
        SimpleAlgebra large = new SimpleAlgebra(Series.B, 60);
        assertEquals(3600, RootSystem.of(large).positiveRoots().size());
    }

    @Test
    void theFormIsInverseToTheCartanMatrix() {
        for (SimpleAlgebra algebra : Algebras.upToRank(9)) {
            RootSystem system = RootSystem.of(algebra);
            for (int i = 0; i < algebra.rank(); i++) {
                for (int j = 0; j < algebra.rank(); j++) {
                    long paired = 0;
                    for (int k = 0; k < algebra.rank(); k++) {
                        paired += (long) system.cartan(i, k) * system.form(k, j);
                    }
                    // (simple root i, fundamental weight j) is half the root's squared length if i = j, else 0
                    long expected =
                            i == j ? system.formDenominator() * system.simpleRootLength(i) / algebra.lacing() : 0;
                    assertEquals(expected, paired, algebra::toString);
                    assertEquals(system.form(i, j), system.form(j, i), algebra::toString);
                }
            }
        }
    }

    /** Bourbaki, Lie IV-VI, plates V-IX: the highest root's coefficients. */
    @Test
    void theHighestRootsAreThoseOfThePlates() {
        assertEquals("[1, 2, 2, 3, 2, 1]", highest(Series.E, 6));
        assertEquals("[2, 2, 3, 4, 3, 2, 1]", highest(Series.E, 7));
        assertEquals("[2, 3, 4, 6, 5, 4, 3, 2]", highest(Series.E, 8));
        assertEquals("[2, 3, 4, 2]", highest(Series.F, 4));
        assertEquals("[3, 2]", highest(Series.G, 2));
    }

    private static String highest(Series series, int rank) {
        List<Root> roots = RootSystem.of(new SimpleAlgebra(series, rank)).positiveRoots();
        return roots.get(roots.size() - 1).toString();
    }

    @Test
    @Timeout(value = 20, threadMode = Timeout.ThreadMode.SEPARATE_THREAD)
    void ranksBeyondTheLimitAreRefused() {
        SimpleAlgebra huge = new SimpleAlgebra(Series.D, 100_000);
        assertThrows(BudgetExceeded.class, () -> RootSystem.of(huge));
    }
}
