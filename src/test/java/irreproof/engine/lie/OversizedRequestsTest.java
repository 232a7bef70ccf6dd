package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.Decomposition;
import irreproof.engine.Partition;
import java.math.BigInteger;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.function.Executable;

/** Requests beyond any budget end within it, as too large, and say how large. */
@Timeout(value = 20, threadMode = Timeout.ThreadMode.SEPARATE_THREAD)
class OversizedRequestsTest {
    private static final long STEPS = 2_000_000;

    private static String refusal(Executable request) {
        BudgetExceeded refusal = assertThrows(BudgetExceeded.class, request);
        assertEquals(BudgetExceeded.Cause.TOO_LARGE, refusal.reason(), refusal::getMessage);
        return refusal.getMessage();
    }

    @Test
    void theSquareOf60BoxesInSu50() {
        LieRing su50 = new LieRing(new SimpleAlgebra(Series.A, 49));
        DominantWeight irrep =
                Diagrams.weight(50, Partition.of(12, 11, 10, 9, 8, 6, 4)).orElseThrow();
        assertEquals(
                "the product [12, 11, 10, 9, 8, 6, 4] x [12, 11, 10, 9, 8, 6, 4] is too large (the work was stopped after "
                        + "2000000 steps; it has at least 235967865 irreps, counted with multiplicity)",
                refusal(() -> su50.product(irrep, irrep, Budget.of(STEPS))));
        // no fewer than the weights of its character times the 1225 roots
        for (boolean symmetric : List.of(true, false)) {
            String message = refusal(() -> {
                if (symmetric) {
                    su50.symmetricPower(irrep, 2, Budget.of(STEPS));
                } else {
                    su50.exteriorPower(irrep, 2, Budget.of(STEPS));
                }
            });
            assertTrue(message.matches("the character of .* is too large \\(about \\d{9} steps\\)"), message);
        }
    }

    /** With a small factor it is no large request: only that factor's weights count. */
    @Test
    void factorsOf10To12InE8() {
        LieRing e8 = new LieRing(new SimpleAlgebra(Series.E, 8));
        DominantWeight irrep = DominantWeight.of(0, 0, 0, 0, 0, 1, 1, 1);
        assertTrue(e8.dimension(irrep).compareTo(BigInteger.TEN.pow(12)) > 0, () -> "" + e8.dimension(irrep));
        String message = refusal(() -> e8.product(irrep, irrep, Budget.of(STEPS)));
        assertTrue(message.matches("a product of irreps of E8 is too large \\(about \\d+ steps\\)"), message);
        DominantWeight adjoint = DominantWeight.of(0, 0, 0, 0, 0, 0, 0, 1);
        Decomposition<DominantWeight> product = e8.product(irrep, adjoint, Budget.of(STEPS));
        assertEquals(e8.dimension(irrep).multiply(BigInteger.valueOf(248)), e8.dimension(product));
    }

    /** The estimate stays below the truth: else it would refuse what is possible. */
    @Test
    void dominatedDiagramsAreWeightsOfTheIrrep() {
        RandomIrreps random = new RandomIrreps(20260213, "dominatedDiagramsAreWeightsOfTheIrrep");
        for (int i = 0; i < 200; i++) {
            SimpleAlgebra algebra = new SimpleAlgebra(Series.A, 1 + random.below(5));
            DominantWeight weight = random.next(algebra, 5_000);
            assertEquals(
                    DominantCharacter.of(algebra, weight, Budget.unlimited()).size(),
                    DominatedDiagrams.count(Diagrams.partition(weight), algebra.rank() + 1),
                    () -> algebra + " " + weight);
        }
        // Sloane's A000041: the partitions of 60, all dominated by the single row
        assertEquals(966_467, DominatedDiagrams.count(Partition.of(60), 60));
        assertEquals(1, DominatedDiagrams.count(Partition.of(), 3));
    }

    @Test
    void termsAreNoFewerThanTold() {
        RandomIrreps random = new RandomIrreps(20260214, "termsAreNoFewerThanTold");
        SimpleAlgebra su9 = new SimpleAlgebra(Series.A, 8);
        for (int i = 0; i < 100; i++) {
            Partition left = Diagrams.partition(random.next(su9, 20_000));
            Partition right = Diagrams.partition(random.next(su9, 20_000));
            long terms =
                    LittlewoodRichardson.multiply(left, right, left.length() + right.length(), Budget.unlimited())
                            .values()
                            .stream()
                            .mapToLong(Long::longValue)
                            .sum();
            BigInteger least = HookLengths.leastTerms(left, right);
            assertTrue(least.compareTo(BigInteger.valueOf(terms)) <= 0, () -> left + " x " + right);
        }
    }
}
