package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.Decomposition;
import irreproof.engine.Partition;
import irreproof.engine.RepresentationRing;
import irreproof.engine.SquareParts;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;

/** Schur functors against theorems of Macdonald, Symmetric Functions and Hall Polynomials, chapter I (from memory). */
class SchurFunctorTest {
    private static final Budget UNLIMITED = Budget.unlimited();

    /** All diagrams of so many boxes. */
    private static List<Partition> diagrams(int boxes) {
        List<Partition> found = new ArrayList<>();
        extend(boxes, boxes, new ArrayList<>(), found);
        return found;
    }

    private static void extend(int left, int longest, List<Integer> rows, List<Partition> found) {
        if (left == 0) {
            found.add(new Partition(rows));
        }
        for (int row = Math.min(left, longest); row > 0; row--) {
            List<Integer> longer = new ArrayList<>(rows);
            longer.add(row);
            extend(left - row, row, longer, found);
        }
    }

    /** Over the fundamental irrep of SU(N) a diagram gives the irrep that it names, or nothing (Weyl). */
    @Test
    void diagramsOverTheFundamentalIrrepNameTheIrreps() {
        for (int degree = 2; degree <= 6; degree++) {
            LieRing ring = new LieRing(new SimpleAlgebra(Series.A, degree - 1));
            DominantWeight fundamental =
                    Diagrams.weight(degree, Partition.of(1)).orElseThrow();
            for (int boxes = 0; boxes <= 8; boxes++) {
                for (Partition diagram : diagrams(boxes)) {
                    Decomposition<DominantWeight> expected = Diagrams.weight(degree, diagram)
                            .map(Decomposition::of)
                            .orElse(Decomposition.zero());
                    assertEquals(expected, ring.schurFunctor(fundamental, diagram, UNLIMITED), diagram::toString);
                }
            }
        }
    }

    /** Dimensions by the hook content formula (I.3 example 4). */
    @Test
    void dimensionsFollowTheHookContentFormula() {
        RandomIrreps random = new RandomIrreps(20260210, "dimensionsFollowTheHookContentFormula");
        for (SimpleAlgebra algebra : Algebras.upToRank(8)) {
            LieRing ring = new LieRing(algebra);
            DominantWeight weight = random.next(algebra, 60);
            List<Partition> choices = diagrams(2 + random.below(3));
            Partition diagram = choices.get(random.below(choices.size()));
            Decomposition<DominantWeight> value = ring.schurFunctor(weight, diagram, UNLIMITED);
            String message = algebra + " " + weight + " " + diagram;
            assertTrue(value.isActual(), message);
            assertEquals(hookContent(ring.dimension(weight), diagram), ring.dimension(value), message);
        }
    }

    private static BigInteger hookContent(BigInteger dimension, Partition diagram) {
        BigInteger above = BigInteger.ONE;
        BigInteger below = BigInteger.ONE;
        for (int row = 0; row < diagram.length(); row++) {
            for (int column = 0; column < diagram.row(row); column++) {
                int leg = 0;
                while (diagram.row(row + leg + 1) > column) {
                    leg++;
                }
                above = above.multiply(dimension.add(BigInteger.valueOf(column - (long) row)));
                below = below.multiply(BigInteger.valueOf(diagram.row(row) - column + (long) leg));
            }
        }
        return above.divide(below);
    }

    /** The second way: Jacobi and Trudi's determinant of symmetric powers (I.3.4). */
    @Test
    void agreesWithTheDeterminantOfSymmetricPowers() {
        RandomIrreps random = new RandomIrreps(20260211, "agreesWithTheDeterminantOfSymmetricPowers");
        for (SimpleAlgebra algebra : Algebras.upToRank(5)) {
            LieRing ring = new LieRing(algebra);
            DominantWeight weight = random.next(algebra, 30);
            for (Partition diagram : diagrams(4)) {
                assertEquals(
                        determinant(ring, weight, diagram, 0, new boolean[diagram.length()]),
                        ring.schurFunctor(weight, diagram, UNLIMITED),
                        () -> algebra + " " + weight + " " + diagram);
            }
        }
    }

    private static Decomposition<DominantWeight> determinant(
            LieRing ring, DominantWeight weight, Partition diagram, int row, boolean[] used) {
        if (row == used.length) {
            return Decomposition.of(ring.trivial());
        }
        Decomposition<DominantWeight> sum = Decomposition.zero();
        int sign = 1;
        for (int column = 0; column < used.length; column++) {
            if (!used[column]) {
                int power = diagram.row(row) - row + column;
                if (power >= 0) {
                    used[column] = true;
                    Decomposition<DominantWeight> minor = determinant(ring, weight, diagram, row + 1, used);
                    used[column] = false;
                    sum = sum.plus(ring.product(ring.symmetricPower(weight, power, UNLIMITED), minor, UNLIMITED), sign);
                }
                sign = -sign;
            }
        }
        return sum;
    }

    /** Schur and Weyl: the n-th tensor power is the sum over diagrams, each as often as it has standard fillings. */
    @Test
    void tensorPowersSplitBySymmetry() {
        for (SimpleAlgebra algebra : Algebras.upToRank(4)) {
            LieRing ring = new LieRing(algebra);
            int[] labels = new int[algebra.rank()];
            labels[algebra.rank() - 1] = 1;
            Decomposition<DominantWeight> one = Decomposition.of(DominantWeight.of(labels));
            Decomposition<DominantWeight> cube = ring.product(ring.product(one, one, UNLIMITED), one, UNLIMITED);
            Decomposition<DominantWeight> sum = ring.schurFunctor(one, Partition.of(3), UNLIMITED)
                    .plus(ring.schurFunctor(one, Partition.of(2, 1), UNLIMITED), 2)
                    .plus(ring.schurFunctor(one, Partition.column(3), UNLIMITED));
            assertEquals(cube, sum, algebra::toString);
        }
    }

    /** Over a sum: s_lambda(R + Q) is the sum of c s_mu(R) s_nu(Q) with Littlewood and Richardson's c (I.5.9). */
    @Test
    void sumsSplitByLittlewoodAndRichardson() {
        RandomIrreps random = new RandomIrreps(20260212, "sumsSplitByLittlewoodAndRichardson");
        for (SimpleAlgebra algebra : Algebras.upToRank(4)) {
            LieRing ring = new LieRing(algebra);
            DominantWeight left = random.next(algebra, 20);
            DominantWeight right = random.next(algebra, 20);
            for (Partition diagram : diagrams(3)) {
                Decomposition<DominantWeight> expected = Decomposition.zero();
                for (int taken = 0; taken <= 3; taken++) {
                    for (Partition mu : diagrams(taken)) {
                        for (Partition nu : diagrams(3 - taken)) {
                            long count = LittlewoodRichardson.multiply(mu, nu, 3, UNLIMITED)
                                    .getOrDefault(diagram, 0L);
                            if (count != 0) {
                                expected = expected.plus(
                                        ring.product(
                                                ring.schurFunctor(left, mu, UNLIMITED),
                                                ring.schurFunctor(right, nu, UNLIMITED),
                                                UNLIMITED),
                                        count);
                            }
                        }
                    }
                }
                Decomposition<DominantWeight> sum = Decomposition.sum(List.of(left, right));
                assertEquals(expected, ring.schurFunctor(sum, diagram, UNLIMITED), algebra + " " + diagram);
            }
        }
    }

    /** A ring that knows powers only gets its Schur functors by Newton's formula. */
    @Test
    void ringsWithoutAdamsOperationsGetThemFromPowers() {
        LieRing quick = new LieRing(new SimpleAlgebra(Series.G, 2));
        RepresentationRing<DominantWeight> plain = new PowersOnly(quick);
        DominantWeight seven = DominantWeight.of(1, 0);
        for (Partition diagram : diagrams(4)) {
            assertEquals(quick.schurFunctor(seven, diagram, UNLIMITED), plain.schurFunctor(seven, diagram, UNLIMITED));
        }
    }

    private record PowersOnly(LieRing ring) implements RepresentationRing<DominantWeight> {
        @Override
        public DominantWeight trivial() {
            return ring.trivial();
        }

        @Override
        public BigInteger dimension(DominantWeight irrep) {
            return ring.dimension(irrep);
        }

        @Override
        public DominantWeight conjugate(DominantWeight irrep) {
            return ring.conjugate(irrep);
        }

        @Override
        public Decomposition<DominantWeight> product(DominantWeight left, DominantWeight right, Budget budget) {
            return ring.product(left, right, budget);
        }

        @Override
        public Decomposition<DominantWeight> symmetricPower(DominantWeight irrep, int exponent, Budget budget) {
            return ring.symmetricPower(irrep, exponent, budget);
        }

        @Override
        public Decomposition<DominantWeight> exteriorPower(DominantWeight irrep, int exponent, Budget budget) {
            return ring.exteriorPower(irrep, exponent, budget);
        }

        @Override
        public Optional<CentralCharacter> centralCharacter(DominantWeight irrep) {
            return ring.centralCharacter(irrep);
        }
    }

    /** SU(3), common practice: of the two octets in 8 x 8 one is symmetric (d), one antisymmetric (f). */
    @Test
    void squarePartsTellCopiesApart() {
        LieRing su3 = new LieRing(new SimpleAlgebra(Series.A, 2));
        DominantWeight octet = DominantWeight.of(1, 1);
        SquareParts<DominantWeight> parts = SquareParts.of(su3, octet, UNLIMITED);
        assertEquals(
                Map.of(DominantWeight.of(0, 0), 1L, octet, 1L, DominantWeight.of(2, 2), 1L),
                parts.symmetric().multiplicities());
        assertEquals(
                Map.of(octet, 1L, DominantWeight.of(3, 0), 1L, DominantWeight.of(0, 3), 1L),
                parts.antisymmetric().multiplicities());
        assertEquals(Set.of(octet), parts.inBoth());
        assertEquals(su3.product(octet, octet, UNLIMITED), parts.square());
    }

    @Test
    @Timeout(value = 20, threadMode = Timeout.ThreadMode.SEPARATE_THREAD)
    void hopelessDiagramsAreRefused() {
        LieRing ring = new LieRing(new SimpleAlgebra(Series.E, 8));
        DominantWeight adjoint = DominantWeight.of(0, 0, 0, 0, 0, 0, 0, 1);
        for (Partition diagram :
                List.of(Partition.of(40, 40, 40, 40), Partition.of(30_000, 7), Partition.column(200))) {
            Budget budget = Budget.of(1_000_000);
            BudgetExceeded refusal =
                    assertThrows(BudgetExceeded.class, () -> ring.schurFunctor(adjoint, diagram, budget));
            assertTrue(refusal.reason() == BudgetExceeded.Cause.TOO_LARGE || diagram.row(0) == 1, diagram::toString);
        }
        // 135751 diagrams fit into four rows of 40, with 80 boxes on the average
        BudgetExceeded refusal = assertThrows(
                BudgetExceeded.class,
                () -> ring.schurFunctor(adjoint, Partition.of(40, 40, 40, 40), Budget.of(1_000_000)));
        assertEquals("the Schur functor of [40, 40, 40, 40] is too large (about 10860080 steps)", refusal.getMessage());
    }
}
