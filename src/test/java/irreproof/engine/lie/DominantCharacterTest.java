package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.Rational;
import java.math.BigInteger;
import java.util.Arrays;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;

class DominantCharacterTest {
    /** The weights fill the dimension, and their squared lengths the index (Dynkin 1952): rank l = sum of (w, w). */
    @Test
    void weightsFillTheDimensionAndTheIndex() {
        RandomIrreps random = new RandomIrreps(20260101, "weightsFillTheDimensionAndTheIndex");
        for (SimpleAlgebra algebra : Algebras.upToRank(8)) {
            RootSystem system = RootSystem.of(algebra);
            for (int i = 0; i < 12; i++) {
                DominantWeight highest = random.next(algebra, 500_000);
                BigInteger dimension = BigInteger.ZERO;
                BigInteger squares = BigInteger.ZERO;
                for (var entry : DominantCharacter.of(algebra, highest, Budget.unlimited())
                        .entrySet()) {
                    BigInteger weights =
                            WeylOrbit.size(system, entry.getKey()).multiply(BigInteger.valueOf(entry.getValue()));
                    dimension = dimension.add(weights);
                    squares = squares.add(weights.multiply(BigInteger.valueOf(square(system, entry.getKey()))));
                }
                String message = algebra + " " + highest;
                assertEquals(WeylDimension.dimension(algebra, highest), dimension, message);
                Rational index = new Rational(squares, BigInteger.valueOf(system.formDenominator() * algebra.rank()));
                assertEquals(Rational.of(Invariants.dynkinIndex(algebra, highest)), index, message);
            }
        }
    }

    private static long square(RootSystem system, DominantWeight weight) {
        long[] labels = new long[weight.rank()];
        for (int i = 0; i < labels.length; i++) {
            labels[i] = weight.label(i);
        }
        return system.form(labels, labels);
    }

    /** In the adjoint irrep: rank for the zero weight, 1 for roots (Humphreys, 8.4). Ranks well beyond the usual too. */
    @Test
    void theAdjointHasRankManyZeroWeights() {
        for (SimpleAlgebra algebra : Algebras.upToRank(30)) {
            Map<DominantWeight, Long> character =
                    DominantCharacter.of(algebra, RootSystem.of(algebra).highestRoot(), Budget.unlimited());
            DominantWeight zero = DominantWeight.of(new int[algebra.rank()]);
            character.forEach((weight, count) ->
                    assertEquals(weight.equals(zero) ? algebra.rank() : 1, count, () -> algebra + " " + weight));
        }
    }

    /** Multiplicities are constant on orbits: Freudenthal's recursion is not told so, the walk of orbits is. */
    @Test
    void orbitsAreWalkedOnceAndClosed() {
        RandomIrreps random = new RandomIrreps(20260102, "orbitsAreWalkedOnceAndClosed");
        for (SimpleAlgebra algebra : Algebras.upToRank(8)) {
            RootSystem system = RootSystem.of(algebra);
            DominantWeight dominant = random.next(algebra, 2_000);
            if (WeylOrbit.size(system, dominant).bitLength() > 14) {
                continue;
            }
            Set<String> seen = new HashSet<>();
            WeylOrbit.forEach(system, dominant, Budget.unlimited(), weight -> {
                assertEquals(true, seen.add(Arrays.toString(weight)));
                int[] moved = weight.clone();
                ChamberReflection.toDominant(system, moved);
                assertEquals(dominant, DominantWeight.of(moved));
            });
            assertEquals(WeylOrbit.size(system, dominant), BigInteger.valueOf(seen.size()), algebra::toString);
        }
    }

    /** Bourbaki, Lie IV-VI, plates: the orders of the Weyl groups, seen as orbits of rho. */
    @Test
    void theOrbitOfRhoIsTheWholeGroup() {
        assertEquals("696729600", orbitOfRho(Series.E, 8));
        assertEquals("2903040", orbitOfRho(Series.E, 7));
        assertEquals("51840", orbitOfRho(Series.E, 6));
        assertEquals("1152", orbitOfRho(Series.F, 4));
        assertEquals("12", orbitOfRho(Series.G, 2));
        assertEquals("1920", orbitOfRho(Series.D, 5));
        assertEquals("3840", orbitOfRho(Series.C, 5));
        assertEquals("720", orbitOfRho(Series.A, 5));
    }

    private static String orbitOfRho(Series series, int rank) {
        int[] labels = new int[rank];
        Arrays.fill(labels, 1);
        return WeylOrbit.size(RootSystem.of(new SimpleAlgebra(series, rank)), DominantWeight.of(labels))
                .toString();
    }

    @Test
    @Timeout(value = 20, threadMode = Timeout.ThreadMode.SEPARATE_THREAD)
    void hopelessWorkIsRefusedBeforeItStarts() {
        SimpleAlgebra algebra = new SimpleAlgebra(Series.E, 8);
        DominantWeight weight = DominantWeight.of(90, 90, 90, 90, 90, 90, 90, 90);
        Budget budget = Budget.of(1_000_000_000);
        BudgetExceeded refusal =
                assertThrows(BudgetExceeded.class, () -> DominantCharacter.of(algebra, weight, budget));
        assertEquals(BudgetExceeded.Cause.TOO_LARGE, refusal.reason());
    }
}
