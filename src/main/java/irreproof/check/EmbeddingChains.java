package irreproof.check;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.lie.Branching;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.ReductiveAlgebra;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.SimpleAlgebra;
import irreproof.engine.lie.embedding.SubalgebraSearch;
import irreproof.naming.LieGroup;
import irreproof.naming.ProductGroup;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/**
 * Embeddings along groups that an author names one inside the other. Each step goes to a subalgebra of one simple factor,
 * the other factors staying in their order; a step that no maximal subalgebra makes is made by two or three.
 */
final class EmbeddingChains {
    private static final int MOST_STEPS = 3;

    private EmbeddingChains() {}

    /**
     * @param groups a simple one first
     * @return with coprime whole charges, those in which orthogonal groups act by their vectors first; none if a step is
     *     not known
     */
    static List<Embedding> find(List<ProductGroup> groups, Budget budget) {
        List<Embedding> found =
                List.of(Embedding.identity(groups.get(0).algebra().factors().get(0)));
        for (ProductGroup next : groups.subList(1, groups.size())) {
            List<Embedding> longer = new ArrayList<>();
            for (Embedding chain : found) {
                longer.addAll(extended(chain, next.algebra(), budget));
            }
            found = longer;
        }
        ProductGroup last = groups.get(groups.size() - 1);
        return found.stream()
                .map(EmbeddingChains::withWholeCharges)
                .sorted(Comparator.comparingLong(embedding -> missingVectors(embedding, last, budget)))
                .toList();
    }

    /** The irrep by which a group is defined: the smallest, but for spinors. */
    static DominantWeight defining(SimpleAlgebra algebra) {
        int[] labels = new int[algebra.rank()];
        int node = switch (algebra.series()) {
            case A, B, C, D, G -> 0;
            case E -> algebra.rank() == 6 ? 0 : algebra.rank() - 1;
            case F -> 3;
        };
        labels[node] = 1;
        return DominantWeight.of(labels);
    }

    /** How many orthogonal groups do not act by their vectors, which is how one thinks of an SO(n) in a matrix group. */
    private static long missingVectors(Embedding embedding, ProductGroup group, Budget budget) {
        Decomposition<ReductiveIrrep> defining = Branching.branch(embedding, defining(embedding.algebra()), budget);
        List<LieGroup> factors = group.factors();
        return IntStream.range(0, factors.size())
                .filter(i -> factors.get(i).family() == LieGroup.Family.SO)
                .filter(i -> defining.multiplicities().keySet().stream()
                        .noneMatch(irrep -> irrep.weights().get(i).equals(vector(factors.get(i)))))
                .count();
    }

    private static DominantWeight vector(LieGroup orthogonal) {
        return orthogonal.degree() == 3 ? DominantWeight.of(2) : defining(orthogonal.algebra());
    }

    private static List<Embedding> extended(Embedding chain, ReductiveAlgebra next, Budget budget) {
        List<SimpleAlgebra> factors = chain.subalgebra().factors();
        int more = next.factors().size() - factors.size() + 1;
        int charges = next.charges() - chain.subalgebra().charges();
        List<Embedding> longer = new ArrayList<>();
        for (int i = 0; i < factors.size() && more >= 0 && charges >= 0; i++) {
            boolean othersStay = factors.subList(0, i).equals(next.factors().subList(0, i))
                    && factors.subList(i + 1, factors.size())
                            .equals(next.factors()
                                    .subList(i + more, next.factors().size()));
            if (othersStay) {
                ReductiveAlgebra wanted = new ReductiveAlgebra(next.factors().subList(i, i + more), charges);
                for (Embedding step : steps(factors.get(i), wanted, budget)) {
                    boolean first = factors.size() == 1 && chain.equals(Embedding.identity(chain.algebra()));
                    longer.add(first ? step : chain.then(i, step));
                }
            }
        }
        return longer;
    }

    private static List<Embedding> steps(SimpleAlgebra algebra, ReductiveAlgebra wanted, Budget budget) {
        if (wanted.equals(ReductiveAlgebra.of(algebra))) {
            return List.of(Embedding.identity(algebra));
        }
        for (int steps = 1; steps <= MOST_STEPS; steps++) {
            List<Embedding> found = SubalgebraSearch.find(algebra, wanted, steps, budget);
            if (!found.isEmpty()) {
                return found;
            }
        }
        return List.of();
    }

    private static Embedding withWholeCharges(Embedding embedding) {
        int simple = embedding.projection().size() - embedding.subalgebra().charges();
        List<List<Rational>> rows = new ArrayList<>(embedding.projection().subList(0, simple));
        embedding.chargeRows().forEach(row -> rows.add(coprime(row)));
        return new Embedding(embedding.algebra(), embedding.subalgebra(), rows, embedding.name());
    }

    private static List<Rational> coprime(List<Rational> row) {
        BigInteger numerators = BigInteger.ZERO;
        BigInteger denominators = BigInteger.ONE;
        for (Rational entry : row) {
            numerators = numerators.gcd(entry.numerator());
            denominators =
                    denominators.divide(denominators.gcd(entry.denominator())).multiply(entry.denominator());
        }
        if (numerators.signum() == 0) {
            return row;
        }
        Rational scale = new Rational(denominators, numerators);
        return row.stream().map(entry -> entry.times(scale)).toList();
    }
}
