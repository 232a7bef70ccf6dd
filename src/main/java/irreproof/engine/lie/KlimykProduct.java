package irreproof.engine.lie;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import java.math.BigInteger;
import java.util.Map;

/**
 * Products of irreps by the Brauer-Klimyk formula (Brauer 1937; Klimyk 1968; Humphreys, Introduction to Lie Algebras,
 * exercise 24.9): the weights of one factor are added to the highest weight of the other plus rho, reflected into the
 * dominant chamber with sign, and those on a wall dropped.
 *
 * <p>Cost: one step per weight of the smaller factor and term of the other, beside the character. A multiplicity beyond
 * 64 bits throws {@link ArithmeticException}. Rank limit as in {@link RootSystem}.
 */
public final class KlimykProduct {
    private KlimykProduct() {}

    /** Where the character of the smaller factor comes from: {@link DominantCharacter}, or a memory of its results. */
    @FunctionalInterface
    interface CharacterSource {
        Map<DominantWeight, Long> character(DominantWeight highest, Budget budget);
    }

    /** The product of two irreps. */
    public static Decomposition<DominantWeight> product(
            SimpleAlgebra algebra, DominantWeight left, DominantWeight right, Budget budget) {
        return product(
                algebra, left, right, (highest, allowed) -> DominantCharacter.of(algebra, highest, allowed), budget);
    }

    static Decomposition<DominantWeight> product(
            SimpleAlgebra algebra,
            DominantWeight left,
            DominantWeight right,
            CharacterSource characters,
            Budget budget) {
        RootSystem system = RootSystem.of(algebra);
        budget.require(ProductBound.leastIrreps(algebra, left, right), "a product of irreps of " + algebra);
        BigInteger leftDimension = WeylDimension.dimension(algebra, left);
        boolean leftIsSmaller = leftDimension.compareTo(WeylDimension.dimension(algebra, right)) < 0;
        Map<DominantWeight, Long> character = characters.character(leftIsSmaller ? left : right, budget);
        return scaled(system, character, 1, Decomposition.of(leftIsSmaller ? right : left), budget);
    }

    /**
     * A sum of irreps times the Adams operation of a character: the character with all weights multiplied by a factor.
     *
     * @param character dominant weights with multiplicities
     * @param factor 1 for the character itself
     */
    static Decomposition<DominantWeight> scaled(
            RootSystem system,
            Map<DominantWeight, Long> character,
            int factor,
            Decomposition<DominantWeight> sum,
            Budget budget) {
        if (sum.isZero()) {
            return sum;
        }
        int terms = sum.multiplicities().size();
        budget.require(
                weights(system, character).multiply(BigInteger.valueOf(terms)),
                "a product of irreps of " + system.algebra());
        int[][] highest = new int[terms][];
        long[] counts = new long[terms];
        int next = 0;
        for (var term : sum.multiplicities().entrySet()) {
            highest[next] = term.getKey().labels();
            for (int node = 0; node < system.rank(); node++) {
                highest[next][node] = Math.addExact(highest[next][node], 1);
            }
            counts[next++] = term.getValue();
        }
        WeightTable result = new WeightTable(system.rank());
        int[] shifted = new int[system.rank()];
        character.forEach((dominant, multiplicity) -> WeylOrbit.forEach(system, dominant, budget, weight -> {
            budget.spend(terms - 1L);
            for (int term = 0; term < terms; term++) {
                if (shift(highest[term], factor, weight, shifted)) {
                    int sign = ChamberReflection.toStrictlyDominant(system, shifted);
                    if (sign != 0) {
                        result.add(shifted, Math.multiplyExact(Math.multiplyExact(multiplicity, counts[term]), sign));
                    }
                }
            }
        }));
        return result.toDecomposition(-1);
    }

    /**
     * Adds so many times a weight to another.
     *
     * @return false if the sum lies on the wall of a simple root
     */
    private static boolean shift(int[] start, int factor, int[] weight, int[] sum) {
        for (int node = 0; node < sum.length; node++) {
            sum[node] = Math.addExact(start[node], Math.multiplyExact(factor, weight[node]));
            if (sum[node] == 0) {
                return false;
            }
        }
        return true;
    }

    /** The number of different weights of a character. */
    private static BigInteger weights(RootSystem system, Map<DominantWeight, Long> character) {
        return character.keySet().stream()
                .map(weight -> WeylOrbit.size(system, weight))
                .reduce(BigInteger.ZERO, BigInteger::add);
    }
}
