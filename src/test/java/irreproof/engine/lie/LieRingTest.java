package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.Decomposition;
import irreproof.engine.RepresentationRing.CentralCharacter;
import java.math.BigInteger;
import java.util.Arrays;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;

class LieRingTest {
    private static final Budget UNLIMITED = Budget.unlimited();

    /**
     * Dimensions multiply, conjugation commutes, the trivial irrep occurs exactly against the conjugate, classes add, and
     * the indices obey l(R x S) = l(R) dim S + dim R l(S) (Dynkin 1952).
     */
    @Test
    void productsObeyTheTheorems() {
        RandomIrreps random = new RandomIrreps(20260106, "productsObeyTheTheorems");
        for (SimpleAlgebra algebra : Algebras.upToRank(8)) {
            LieRing ring = new LieRing(algebra);
            for (int i = 0; i < 6; i++) {
                DominantWeight left = random.next(algebra, 1_000);
                DominantWeight right = random.next(algebra, 20_000);
                Decomposition<DominantWeight> product = ring.product(left, right, UNLIMITED);
                String message = algebra + ": " + left + " x " + right;
                assertTrue(product.isActual(), message);
                BigInteger terms = BigInteger.valueOf(product.multiplicities().size());
                assertTrue(ProductBound.leastIrreps(algebra, left, right).compareTo(terms) <= 0, message);
                assertEquals(product, ring.product(right, left, UNLIMITED), message);
                assertEquals(ring.dimension(left).multiply(ring.dimension(right)), ring.dimension(product), message);
                assertEquals(indexOfProduct(ring, left, right), index(algebra, product), message);
                assertEquals(
                        conjugate(ring, product),
                        ring.product(ring.conjugate(left), ring.conjugate(right), UNLIMITED),
                        message);
                assertEquals(left.equals(ring.conjugate(right)) ? 1 : 0, product.multiplicity(ring.trivial()), message);
                CongruenceClass sum = CongruenceClass.of(algebra, left).plus(CongruenceClass.of(algebra, right));
                product.multiplicities()
                        .keySet()
                        .forEach(term -> assertEquals(sum, CongruenceClass.of(algebra, term), message));
            }
        }
    }

    private static BigInteger indexOfProduct(LieRing ring, DominantWeight left, DominantWeight right) {
        BigInteger first = Invariants.dynkinIndex(ring.algebra(), left).multiply(ring.dimension(right));
        return first.add(Invariants.dynkinIndex(ring.algebra(), right).multiply(ring.dimension(left)));
    }

    private static BigInteger index(SimpleAlgebra algebra, Decomposition<DominantWeight> sum) {
        return sum.multiplicities().entrySet().stream()
                .map(term ->
                        Invariants.dynkinIndex(algebra, term.getKey()).multiply(BigInteger.valueOf(term.getValue())))
                .reduce(BigInteger.ZERO, BigInteger::add);
    }

    private static Decomposition<DominantWeight> conjugate(LieRing ring, Decomposition<DominantWeight> sum) {
        Decomposition<DominantWeight> result = Decomposition.zero();
        for (var term : sum.multiplicities().entrySet()) {
            result = result.plus(Decomposition.of(ring.conjugate(term.getKey())), term.getValue());
        }
        return result;
    }

    /** The cubic anomaly of a product of SU(N) irreps obeys the same rule as the index (Banks and Georgi 1976). */
    @Test
    void anomaliesAddUp() {
        RandomIrreps random = new RandomIrreps(20260107, "anomaliesAddUp");
        for (int i = 0; i < 60; i++) {
            SimpleAlgebra algebra = new SimpleAlgebra(Series.A, 2 + random.below(6));
            LieRing ring = new LieRing(algebra);
            DominantWeight left = random.next(algebra, 500);
            DominantWeight right = random.next(algebra, 5_000);
            BigInteger total = BigInteger.ZERO;
            for (var term :
                    ring.product(left, right, UNLIMITED).multiplicities().entrySet()) {
                total = total.add(
                        Invariants.cubicAnomaly(algebra, term.getKey()).multiply(BigInteger.valueOf(term.getValue())));
            }
            BigInteger expected = Invariants.cubicAnomaly(algebra, left)
                    .multiply(ring.dimension(right))
                    .add(Invariants.cubicAnomaly(algebra, right).multiply(ring.dimension(left)));
            assertEquals(expected, total, () -> algebra + ": " + left + " x " + right);
        }
    }

    @Test
    void productsAreAssociative() {
        RandomIrreps random = new RandomIrreps(20260108, "productsAreAssociative");
        for (SimpleAlgebra algebra : Algebras.upToRank(5)) {
            LieRing ring = new LieRing(algebra);
            DominantWeight a = random.next(algebra, 60);
            DominantWeight b = random.next(algebra, 60);
            DominantWeight c = random.next(algebra, 60);
            Decomposition<DominantWeight> leftFirst =
                    ring.product(ring.product(a, b, UNLIMITED), Decomposition.of(c), UNLIMITED);
            Decomposition<DominantWeight> rightFirst =
                    ring.product(Decomposition.of(a), ring.product(b, c, UNLIMITED), UNLIMITED);
            assertEquals(leftFirst, rightFirst, () -> algebra + ": " + a + b + c);
        }
    }

    @Test
    void theCentreIsNamedAsTheTradeDoes() {
        LieRing su5 = new LieRing(new SimpleAlgebra(Series.A, 4));
        assertEquals(
                Optional.of(new CentralCharacter("N-ality", "2")), su5.centralCharacter(DominantWeight.of(0, 1, 0, 0)));
        LieRing so10 = new LieRing(new SimpleAlgebra(Series.D, 5));
        assertEquals(
                Optional.of(new CentralCharacter("congruence class", "(1,1)")),
                so10.centralCharacter(DominantWeight.of(0, 0, 0, 0, 1)));
        LieRing g2 = new LieRing(new SimpleAlgebra(Series.G, 2));
        assertEquals(Optional.empty(), g2.centralCharacter(DominantWeight.of(1, 0)));
    }

    /** A result is remembered, yet a smaller budget is refused it as if it were not, and a fitting one pays in full. */
    @Test
    void whatABudgetAllowsDoesNotDependOnTheCache() {
        LieRing ring = new LieRing(new SimpleAlgebra(Series.F, 4));
        DominantWeight left = DominantWeight.of(0, 0, 1, 1);
        DominantWeight right = DominantWeight.of(1, 0, 0, 2);
        Budget first = Budget.of(1_000_000);
        Decomposition<DominantWeight> product = ring.product(left, right, first);
        long cost = 1_000_000 - first.remaining();
        assertTrue(cost > 100);
        Budget exact = Budget.of(cost);
        assertEquals(product, ring.product(left, right, exact));
        assertEquals(0, exact.remaining());
        Budget tooSmall = Budget.of(cost - 1);
        assertThrows(BudgetExceeded.class, () -> ring.product(left, right, tooSmall));
    }

    @Test
    @Timeout(value = 20, threadMode = Timeout.ThreadMode.SEPARATE_THREAD)
    void hopelessProductsAreRefusedBeforeTheyStart() {
        for (SimpleAlgebra algebra : Algebras.upToRank(8)) {
            int[] labels = new int[algebra.rank()];
            Arrays.fill(labels, 1_000_000);
            DominantWeight weight = DominantWeight.of(labels);
            LieRing ring = new LieRing(algebra);
            Budget budget = Budget.of(900_000);
            BudgetExceeded refusal =
                    assertThrows(BudgetExceeded.class, () -> ring.product(weight, weight, budget), algebra::toString);
            assertEquals(BudgetExceeded.Cause.TOO_LARGE, refusal.reason());
        }
    }

    @Test
    @Timeout(value = 20, threadMode = Timeout.ThreadMode.SEPARATE_THREAD)
    void hugeRanksAreRefusedWithoutOverflowingTheStack() {
        LieRing ring = new LieRing(new SimpleAlgebra(Series.A, 50_000));
        int[] labels = new int[50_000];
        labels[0] = 1;
        DominantWeight fundamental = DominantWeight.of(labels);
        assertEquals(
                2,
                ring.product(fundamental, fundamental, UNLIMITED)
                        .multiplicities()
                        .size());
        labels[49_999] = 1;
        DominantWeight adjoint = DominantWeight.of(labels);
        assertThrows(BudgetExceeded.class, () -> ring.product(adjoint, adjoint, UNLIMITED));
    }
}
