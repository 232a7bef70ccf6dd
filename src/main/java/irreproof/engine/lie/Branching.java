package irreproof.engine.lie;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Restriction of irreps to a reductive subalgebra, by the alternating sum: every weight of the irrep is projected, shifted
 * by the subalgebra's rho, reflected into its dominant chamber with sign, and dropped if it lies on a wall (Klimyk 1967;
 * the Brauer-Klimyk formula with the trivial irrep). Neither characters of the subalgebra nor an order of its weights are
 * needed.
 *
 * <p>Cost: one step per weight of the irrep, beside its dominant character. Multiplicities beyond 64 bits, and labels or
 * charges beyond 31 bits, throw {@link ArithmeticException}. Rank limit as in {@link RootSystem}.
 */
public final class Branching {
    private final Embedding embedding;
    private final List<RootSystem> factors;
    private final long[] chargeDenominators;
    private final int[][] rows;
    private final Map<Key, Long> counts = new HashMap<>();

    private Branching(Embedding embedding) {
        this.embedding = embedding;
        this.factors =
                embedding.subalgebra().factors().stream().map(RootSystem::of).toList();
        int charges = embedding.subalgebra().charges();
        int simpleRank = embedding.projection().size() - charges;
        this.chargeDenominators = new long[charges];
        this.rows = new int[embedding.projection().size()][];
        for (int i = 0; i < rows.length; i++) {
            List<Rational> row = embedding.projection().get(i);
            BigInteger denominator =
                    row.stream().map(Rational::denominator).reduce(BigInteger.ONE, Branching::multiple);
            rows[i] = new int[row.size()];
            for (int j = 0; j < row.size(); j++) {
                rows[i][j] = row.get(j)
                        .times(Rational.of(denominator))
                        .toIntegerExact()
                        .intValueExact();
            }
            if (i >= simpleRank) {
                chargeDenominators[i - simpleRank] = denominator.longValueExact();
            }
        }
    }

    private static BigInteger multiple(BigInteger left, BigInteger right) {
        return left.divide(left.gcd(right)).multiply(right);
    }

    /** The irrep of the algebra, restricted to the subalgebra and decomposed. */
    public static Decomposition<ReductiveIrrep> branch(Embedding embedding, DominantWeight irrep, Budget budget) {
        embedding.algebra().requireWeight(irrep);
        RootSystem system = RootSystem.of(embedding.algebra());
        String what = "the restriction of " + irrep + " to " + embedding.subalgebra();
        budget.require(WeylOrbit.size(system, irrep), what);
        Map<DominantWeight, Long> character = new LieRing(embedding.algebra()).character(irrep, budget);
        BigInteger weights = character.keySet().stream()
                .map(weight -> WeylOrbit.size(system, weight))
                .reduce(BigInteger.ZERO, BigInteger::add);
        budget.require(weights, what);
        Branching branching = new Branching(embedding);
        character.forEach((dominant, multiplicity) ->
                WeylOrbit.forEach(system, dominant, budget, weight -> branching.add(weight, multiplicity)));
        return branching.result();
    }

    /** The same for a sum of irreps. */
    public static Decomposition<ReductiveIrrep> branch(
            Embedding embedding, Decomposition<DominantWeight> sum, Budget budget) {
        Decomposition<ReductiveIrrep> result = Decomposition.zero();
        for (var term : sum.multiplicities().entrySet()) {
            result = result.plus(branch(embedding, term.getKey(), budget), term.getValue());
        }
        return result;
    }

    /**
     * An irrep of a reductive algebra, restricted to a subalgebra of each of its factors.
     *
     * @param embeddings one for each factor; {@link Embedding#identity} leaves one as it is
     * @return irreps of the subalgebras in order, with their charges after those of the irrep
     */
    public static Decomposition<ReductiveIrrep> branch(
            List<Embedding> embeddings, ReductiveIrrep irrep, Budget budget) {
        Decomposition<ReductiveIrrep> result = Decomposition.of(new ReductiveIrrep(List.of(), irrep.charges()));
        for (int i = 0; i < embeddings.size(); i++) {
            Decomposition<ReductiveIrrep> factor =
                    branch(embeddings.get(i), irrep.weights().get(i), budget);
            Map<ReductiveIrrep, Long> joined = new HashMap<>();
            result.multiplicities()
                    .forEach((left, count) -> factor.multiplicities().forEach((right, times) -> {
                        budget.spend(1);
                        joined.put(joined(left, right), Math.multiplyExact(count, times));
                    }));
            result = Decomposition.of(joined);
        }
        return result;
    }

    private static ReductiveIrrep joined(ReductiveIrrep left, ReductiveIrrep right) {
        List<DominantWeight> weights = new ArrayList<>(left.weights());
        weights.addAll(right.weights());
        List<Rational> charges = new ArrayList<>(left.charges());
        charges.addAll(right.charges());
        return new ReductiveIrrep(weights, charges);
    }

    private void add(int[] weight, long multiplicity) {
        int[] labels = new int[rows.length];
        for (int i = 0; i < labels.length; i++) {
            long sum = 0;
            for (int j = 0; j < weight.length; j++) {
                sum += (long) rows[i][j] * weight[j];
            }
            labels[i] = Math.toIntExact(sum);
        }
        int sign = 1;
        int start = 0;
        for (RootSystem factor : factors) {
            int[] shifted = Arrays.copyOfRange(labels, start, start + factor.rank());
            for (int i = 0; i < shifted.length; i++) {
                shifted[i] = Math.addExact(shifted[i], 1);
            }
            sign *= ChamberReflection.toStrictlyDominant(factor, shifted);
            if (sign == 0) {
                return;
            }
            for (int i = 0; i < shifted.length; i++) {
                labels[start + i] = shifted[i] - 1;
            }
            start += factor.rank();
        }
        counts.merge(new Key(labels), sign * multiplicity, Math::addExact);
    }

    private Decomposition<ReductiveIrrep> result() {
        Map<ReductiveIrrep, Long> result = new HashMap<>();
        counts.forEach((key, count) -> {
            if (count != 0) {
                result.put(irrep(key.labels), count);
            }
        });
        Decomposition<ReductiveIrrep> decomposition = Decomposition.of(result);
        if (!decomposition.isActual()) {
            throw new IllegalStateException(embedding.name() + " is no embedding of " + embedding.subalgebra());
        }
        return decomposition;
    }

    private ReductiveIrrep irrep(int[] labels) {
        List<DominantWeight> weights = new ArrayList<>();
        int start = 0;
        for (RootSystem factor : factors) {
            weights.add(DominantWeight.of(Arrays.copyOfRange(labels, start, start + factor.rank())));
            start += factor.rank();
        }
        List<Rational> charges = new ArrayList<>();
        for (int i = 0; i < chargeDenominators.length; i++) {
            charges.add(Rational.of(labels[start + i], chargeDenominators[i]));
        }
        return new ReductiveIrrep(weights, charges);
    }

    /** Labels of the factors and charges as whole numbers, with value equality. */
    private static final class Key {
        private final int[] labels;
        private final int hash;

        Key(int[] labels) {
            this.labels = labels;
            this.hash = Arrays.hashCode(labels);
        }

        @Override
        public boolean equals(Object other) {
            return other instanceof Key that && Arrays.equals(labels, that.labels);
        }

        @Override
        public int hashCode() {
            return hash;
        }
    }
}
