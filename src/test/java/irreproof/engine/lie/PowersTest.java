package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.Decomposition;
import java.math.BigInteger;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;

class PowersTest {
    private static final Budget UNLIMITED = Budget.unlimited();

    @Test
    void squaresSplitIntoSymmetricAndExterior() {
        RandomIrreps random = new RandomIrreps(20260105, "squaresSplitIntoSymmetricAndExterior");
        for (SimpleAlgebra algebra : Algebras.upToRank(8)) {
            LieRing ring = new LieRing(algebra);
            for (int i = 0; i < 3; i++) {
                DominantWeight weight = random.next(algebra, 1_500);
                Decomposition<DominantWeight> symmetric = ring.symmetricPower(weight, 2, UNLIMITED);
                Decomposition<DominantWeight> exterior = ring.exteriorPower(weight, 2, UNLIMITED);
                String message = algebra + " " + weight;
                assertTrue(symmetric.isActual() && exterior.isActual(), message);
                assertEquals(ring.product(weight, weight, UNLIMITED), symmetric.plus(exterior), message);
                // the trivial irrep sits in the half that the reality names
                long inSymmetric = symmetric.multiplicity(ring.trivial());
                long inExterior = exterior.multiplicity(ring.trivial());
                Reality reality = Invariants.reality(algebra, weight);
                assertEquals(reality == Reality.REAL ? 1 : 0, inSymmetric, message);
                assertEquals(reality == Reality.PSEUDOREAL ? 1 : 0, inExterior, message);
            }
        }
    }

    /** The Koszul complex is exact (Bourbaki, Algebra X, 9): the alternating sum of S^k times the exterior rest is 0. */
    @Test
    void symmetricAndExteriorPowersCancel() {
        for (SimpleAlgebra algebra : Algebras.upToRank(6)) {
            LieRing ring = new LieRing(algebra);
            int[] labels = new int[algebra.rank()];
            labels[algebra.rank() - 1] = 1;
            DominantWeight weight = DominantWeight.of(labels);
            for (int n = 1; n <= 4; n++) {
                Decomposition<DominantWeight> sum = Decomposition.zero();
                for (int k = 0; k <= n; k++) {
                    Decomposition<DominantWeight> symmetric = ring.symmetricPower(weight, k, UNLIMITED);
                    Decomposition<DominantWeight> exterior = ring.exteriorPower(weight, n - k, UNLIMITED);
                    assertEquals(binomial(ring.dimension(weight), k, true), ring.dimension(symmetric));
                    assertEquals(binomial(ring.dimension(weight), n - k, false), ring.dimension(exterior));
                    sum = sum.plus(ring.product(symmetric, exterior, UNLIMITED), k % 2 == 0 ? 1 : -1);
                }
                assertTrue(sum.isZero(), algebra + " power " + n);
            }
        }
    }

    private static BigInteger binomial(BigInteger dimension, int k, boolean repeated) {
        BigInteger value = BigInteger.ONE;
        for (int i = 0; i < k; i++) {
            BigInteger shift = BigInteger.valueOf(repeated ? i : -i);
            value = value.multiply(dimension.add(shift)).divide(BigInteger.valueOf(i + 1L));
        }
        return value;
    }

    /** Exterior powers of SU(n)'s fundamental irrep are the fundamental irreps, then nothing (Fulton and Harris, 15). */
    @Test
    void exteriorPowersOfTheFundamentalIrrepRunThroughTheNodes() {
        LieRing ring = new LieRing(new SimpleAlgebra(Series.A, 6));
        DominantWeight fundamental = DominantWeight.of(1, 0, 0, 0, 0, 0);
        for (int k = 1; k <= 6; k++) {
            int[] labels = new int[6];
            labels[k - 1] = 1;
            assertEquals(Decomposition.of(DominantWeight.of(labels)), ring.exteriorPower(fundamental, k, UNLIMITED));
            assertEquals(
                    Decomposition.of(DominantWeight.of(k, 0, 0, 0, 0, 0)),
                    ring.symmetricPower(fundamental, k, UNLIMITED));
        }
        assertEquals(Decomposition.of(ring.trivial()), ring.exteriorPower(fundamental, 7, UNLIMITED));
        assertTrue(ring.exteriorPower(fundamental, 8, UNLIMITED).isZero());
    }

    /** The whole exterior algebra of SO(10)'s spinor: 2^16 dimensions, self-dual up to conjugation. */
    @Test
    void theExteriorAlgebraOfASpinorIsComplete() {
        LieRing ring = new LieRing(new SimpleAlgebra(Series.D, 5));
        DominantWeight spinor = DominantWeight.of(0, 0, 0, 0, 1);
        BigInteger total = BigInteger.ZERO;
        for (int k = 0; k <= 16; k++) {
            Decomposition<DominantWeight> power = ring.exteriorPower(spinor, k, UNLIMITED);
            assertTrue(power.isActual());
            assertEquals(binomial(BigInteger.valueOf(16), k, false), ring.dimension(power));
            total = total.add(ring.dimension(power));
        }
        assertEquals(BigInteger.valueOf(65536), total);
    }

    @Test
    @Timeout(value = 20, threadMode = Timeout.ThreadMode.SEPARATE_THREAD)
    void hopelessPowersAreRefused() {
        LieRing ring = new LieRing(new SimpleAlgebra(Series.A, 2));
        DominantWeight weight = DominantWeight.of(1, 0);
        for (int exponent : List.of(30_000, Integer.MAX_VALUE)) {
            Budget budget = Budget.of(1_000_000);
            BudgetExceeded refusal =
                    assertThrows(BudgetExceeded.class, () -> ring.symmetricPower(weight, exponent, budget));
            assertEquals(BudgetExceeded.Cause.TOO_LARGE, refusal.reason());
        }
        assertThrows(IllegalArgumentException.class, () -> ring.exteriorPower(weight, -1, UNLIMITED));
    }
}
