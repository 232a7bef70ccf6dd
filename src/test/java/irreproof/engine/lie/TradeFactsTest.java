package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Partition;
import java.math.BigInteger;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** What everybody in the trade knows; source of each check: common practice, no source. */
class TradeFactsTest {
    private static final Budget UNLIMITED = Budget.unlimited();
    private static final LieRing SU3 = new LieRing(new SimpleAlgebra(Series.A, 2));

    private static Decomposition<DominantWeight> tensor(LieRing ring, DominantWeight... factors) {
        Decomposition<DominantWeight> product = Decomposition.of(ring.trivial());
        for (DominantWeight factor : factors) {
            product = ring.product(product, Decomposition.of(factor), UNLIMITED);
        }
        return product;
    }

    /** Common practice, no source. */
    @Test
    void eightTimesEight() {
        DominantWeight octet = DominantWeight.of(1, 1);
        Decomposition<DominantWeight> product = tensor(SU3, octet, octet);
        Map<DominantWeight, Long> expected = Map.of(
                DominantWeight.of(2, 2),
                1L,
                DominantWeight.of(3, 0),
                1L,
                DominantWeight.of(0, 3),
                1L,
                octet,
                2L,
                DominantWeight.of(0, 0),
                1L);
        assertEquals(expected, product.multiplicities());
        assertEquals(BigInteger.valueOf(64), SU3.dimension(product));
        List<Integer> dimensions = expected.keySet().stream()
                .map(irrep -> SU3.dimension(irrep).intValueExact())
                .sorted()
                .toList();
        assertEquals(List.of(1, 8, 10, 10, 27), dimensions);
    }

    /** Common practice, no source. */
    @Test
    void twentySevenTimesTwentySeven() {
        DominantWeight irrep = DominantWeight.of(2, 2);
        assertEquals(BigInteger.valueOf(27), SU3.dimension(irrep));
        assertEquals(BigInteger.valueOf(729), SU3.dimension(tensor(SU3, irrep, irrep)));
    }

    /** Common practice, no source. */
    @Test
    void columnsOfNBoxesDropOutAndLongerOnesVanish() {
        for (int degree = 2; degree <= 7; degree++) {
            LieRing ring = new LieRing(new SimpleAlgebra(Series.A, degree - 1));
            DominantWeight fundamental =
                    Diagrams.weight(degree, Partition.of(1)).orElseThrow();
            assertEquals(Optional.of(ring.trivial()), Diagrams.weight(degree, Partition.column(degree)));
            assertEquals(
                    Decomposition.of(ring.trivial()),
                    ring.schurFunctor(fundamental, Partition.column(degree), UNLIMITED));
            assertEquals(Optional.empty(), Diagrams.weight(degree, Partition.column(degree + 1)));
            assertTrue(ring.schurFunctor(fundamental, Partition.column(degree + 1), UNLIMITED)
                    .isZero());
            // a diagram with a full column in front, and without it
            int[] rows = new int[degree];
            Arrays.fill(rows, 2);
            rows[0] = 5;
            assertEquals(Diagrams.weight(degree, Partition.of(3)), Diagrams.weight(degree, Partition.of(rows)));
        }
    }

    /** Common practice, no source: rows may be of any length. */
    @Test
    void rowsMayBeOfAnyLength() {
        for (int length : new int[] {1, 3, 10, 1000, 1_000_000}) {
            DominantWeight row = Diagrams.weight(3, Partition.of(length)).orElseThrow();
            BigInteger n = BigInteger.valueOf(length);
            BigInteger expected =
                    n.add(BigInteger.ONE).multiply(n.add(BigInteger.TWO)).shiftRight(1);
            assertEquals(expected, SU3.dimension(row));
        }
    }

    /** Common practice, no source: boxes with symmetric indices never come to lie in one column. */
    @Test
    void symmetricIndicesNeverShareAColumn() {
        RandomIrreps random = new RandomIrreps(20260215, "symmetricIndicesNeverShareAColumn");
        SimpleAlgebra su6 = new SimpleAlgebra(Series.A, 5);
        for (int i = 0; i < 100; i++) {
            Partition start = Diagrams.partition(random.next(su6, 5_000));
            Partition row = Partition.of(1 + random.below(6));
            LittlewoodRichardson.multiply(start, row, 6, UNLIMITED).forEach((shape, count) -> {
                assertEquals(1, count);
                for (int below = 1; below <= shape.length(); below++) {
                    assertTrue(shape.row(below) <= start.row(below - 1), () -> start + " x " + row + " has " + shape);
                }
            });
        }
    }

    /** Common practice, no source: baryons and mesons exist, diquarks do not. */
    @Test
    void quarksMakeSingletsInThreesAndWithAntiquarks() {
        DominantWeight quark = DominantWeight.of(1, 0);
        DominantWeight antiquark = SU3.conjugate(quark);
        assertEquals(1, tensor(SU3, quark, quark, quark).multiplicity(SU3.trivial()));
        assertEquals(1, tensor(SU3, quark, antiquark).multiplicity(SU3.trivial()));
        assertEquals(0, tensor(SU3, quark, quark).multiplicity(SU3.trivial()));
    }

    /**
     * Common practice, no source: the isometries of a five-sphere, SO(6), act as SU(4): the six is the antisymmetric
     * square of the four, and the harmonics of degree k are the irrep (0,k,0).
     */
    @Test
    void theFiveSphereIsMovedBySu4() {
        LieRing su4 = new LieRing(new SimpleAlgebra(Series.A, 3));
        LieRing so6 = new LieRing(new SimpleAlgebra(Series.D, 3));
        DominantWeight six = DominantWeight.of(0, 1, 0);
        assertEquals(Decomposition.of(six), su4.exteriorPower(DominantWeight.of(1, 0, 0), 2, UNLIMITED));
        for (int degree = 0; degree <= 6; degree++) {
            Decomposition<DominantWeight> harmonics = Decomposition.zero();
            for (int k = degree; k >= 0; k -= 2) {
                harmonics = harmonics.plus(Decomposition.of(DominantWeight.of(0, k, 0)));
            }
            assertEquals(harmonics, su4.symmetricPower(six, degree, UNLIMITED));
        }
        RandomIrreps random = new RandomIrreps(20260216, "theFiveSphereIsMovedBySu4");
        for (int i = 0; i < 50; i++) {
            DominantWeight left = random.next(su4.algebra(), 300);
            DominantWeight right = random.next(su4.algebra(), 300);
            assertEquals(su4.dimension(left), so6.dimension(asSo6(left)));
            Map<DominantWeight, Long> product = new HashMap<>();
            su4.product(left, right, UNLIMITED)
                    .multiplicities()
                    .forEach((irrep, count) -> product.put(asSo6(irrep), count));
            assertEquals(Decomposition.of(product), so6.product(asSo6(left), asSo6(right), UNLIMITED));
        }
    }

    /** The vector node of SO(6) comes first. */
    private static DominantWeight asSo6(DominantWeight su4) {
        return DominantWeight.of(su4.label(1), su4.label(0), su4.label(2));
    }
}
