package irreproof.engine.lie.embedding;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.lie.Branching;
import irreproof.engine.lie.CongruenceClass;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.Invariants;
import irreproof.engine.lie.LieRing;
import irreproof.engine.lie.Published;
import irreproof.engine.lie.ReductiveAlgebra;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.ReductiveRing;
import irreproof.engine.lie.RootSystem;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import irreproof.engine.lie.WeylDimension;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** Theorems that every restriction obeys, over all maximal subalgebras up to rank 8 and random irreps. */
class BranchingIdentitiesTest {
    private static final Budget FREE = Budget.unlimited();
    private static final long SEED = 20260;
    /** {@code -Dcases=2000} runs as many. */
    private static final int CASES = Integer.getInteger("cases", 2000);

    private static List<Embedding> embeddings() {
        Set<String> algebras = new LinkedHashSet<>();
        for (Map<String, String> row : Published.rows("maximal_subalgebras.tsv")) {
            algebras.add(row.get("algebra"));
        }
        List<Embedding> embeddings = new ArrayList<>();
        for (String name : algebras) {
            Series series = Series.valueOf(name.substring(0, 1));
            SimpleAlgebra algebra = new SimpleAlgebra(series, Integer.parseInt(name.substring(1)));
            embeddings.addAll(Embeddings.maximal(algebra, FREE));
        }
        return embeddings;
    }

    /** Not the trivial one; of E8 always the smallest. */
    private static DominantWeight nontrivial(Random random, SimpleAlgebra algebra, long largest) {
        boolean large = algebra.series() == Series.E && algebra.rank() == 8;
        DominantWeight irrep = irrep(random, algebra, large ? 248 : largest);
        return irrep.isZero() ? nontrivial(random, algebra, largest) : irrep;
    }

    /** Labels are raised at random while the dimension allows. */
    private static DominantWeight irrep(Random random, SimpleAlgebra algebra, long largest) {
        int[] labels = new int[algebra.rank()];
        for (int tries = 0; tries < 6; tries++) {
            int node = random.nextInt(labels.length);
            labels[node]++;
            BigInteger dimension = WeylDimension.dimension(algebra, DominantWeight.of(labels));
            if (dimension.compareTo(BigInteger.valueOf(largest)) > 0) {
                labels[node]--;
            }
        }
        return DominantWeight.of(labels);
    }

    @Test
    void restrictionCommutesWithTheProduct() {
        Random random = new Random(SEED);
        List<Embedding> embeddings = embeddings();
        for (int i = 0; i < CASES; i++) {
            Embedding embedding = embeddings.get(i % embeddings.size());
            SimpleAlgebra algebra = embedding.algebra();
            DominantWeight left = nontrivial(random, algebra, 60);
            DominantWeight right = nontrivial(random, algebra, 150);
            Decomposition<ReductiveIrrep> product =
                    Branching.branch(embedding, new LieRing(algebra).product(left, right, FREE), FREE);
            Decomposition<ReductiveIrrep> products = new ReductiveRing(embedding.subalgebra())
                    .product(Branching.branch(embedding, left, FREE), Branching.branch(embedding, right, FREE), FREE);
            assertEquals(products, product, () -> embedding + " " + left + " " + right);
        }
        System.out.println("restriction commutes with product: " + CASES + " cases, seed " + SEED);
    }

    @Test
    void dimensionsIndicesChargesAndClassesAgree() {
        Random random = new Random(SEED + 1);
        int checked = 0;
        for (Embedding embedding : embeddings()) {
            SimpleAlgebra algebra = embedding.algebra();
            Set<List<CongruenceClass>> adjoint =
                    classes(embedding, RootSystem.of(algebra).highestRoot());
            List<DominantWeight> irreps =
                    new ArrayList<>(List.of(RootSystem.of(algebra).highestRoot()));
            for (int i = 0; i < 4; i++) {
                irreps.add(irrep(random, algebra, 2000));
            }
            for (DominantWeight irrep : irreps) {
                Decomposition<ReductiveIrrep> sum = Branching.branch(embedding, irrep, FREE);
                ReductiveRing ring = new ReductiveRing(embedding.subalgebra());
                assertEquals(WeylDimension.dimension(algebra, irrep), ring.dimension(sum));
                for (int i = 0; i < embedding.subalgebra().factors().size(); i++) {
                    BigInteger index = Invariants.dynkinIndex(algebra, irrep);
                    assertEquals(EmbeddingIndex.of(embedding, i).multiply(index), index(ring, sum, i));
                }
                for (int i = 0; i < embedding.subalgebra().charges(); i++) {
                    assertEquals(Rational.ZERO, trace(ring, sum, i));
                }
                assertOneClass(classes(embedding, irrep), adjoint, embedding);
                checked++;
            }
        }
        System.out.println(
                "dimension, index, charge and congruence identities: " + checked + " restrictions, seed " + (SEED + 1));
        assertTrue(checked > 900);
    }

    private static BigInteger index(ReductiveRing ring, Decomposition<ReductiveIrrep> sum, int factor) {
        SimpleAlgebra algebra = ring.algebra().factors().get(factor);
        BigInteger total = BigInteger.ZERO;
        for (var term : sum.multiplicities().entrySet()) {
            DominantWeight weight = term.getKey().weights().get(factor);
            BigInteger others = ring.dimension(term.getKey()).divide(WeylDimension.dimension(algebra, weight));
            BigInteger count = BigInteger.valueOf(term.getValue());
            total = total.add(
                    Invariants.dynkinIndex(algebra, weight).multiply(others).multiply(count));
        }
        return total;
    }

    private static Rational trace(ReductiveRing ring, Decomposition<ReductiveIrrep> sum, int charge) {
        Rational total = Rational.ZERO;
        for (var term : sum.multiplicities().entrySet()) {
            Rational dimension = Rational.of(ring.dimension(term.getKey()));
            total = total.plus(
                    term.getKey().charges().get(charge).times(dimension).times(Rational.of(term.getValue())));
        }
        return total;
    }

    private static Set<List<CongruenceClass>> classes(Embedding embedding, DominantWeight irrep) {
        Set<List<CongruenceClass>> classes = new HashSet<>();
        List<SimpleAlgebra> factors = embedding.subalgebra().factors();
        for (ReductiveIrrep term :
                Branching.branch(embedding, irrep, FREE).multiplicities().keySet()) {
            List<CongruenceClass> all = new ArrayList<>();
            for (int i = 0; i < factors.size(); i++) {
                all.add(CongruenceClass.of(factors.get(i), term.weights().get(i)));
            }
            classes.add(all);
        }
        return classes;
    }

    /** Roots of the algebra lead from each weight to each other: classes differ by sums of those in the adjoint irrep. */
    private static void assertOneClass(
            Set<List<CongruenceClass>> classes, Set<List<CongruenceClass>> adjoint, Embedding embedding) {
        Set<List<CongruenceClass>> reached =
                new HashSet<>(Set.of(classes.iterator().next()));
        List<List<CongruenceClass>> open = new ArrayList<>(reached);
        for (int next = 0; next < open.size(); next++) {
            for (List<CongruenceClass> step : adjoint) {
                List<CongruenceClass> sum = new ArrayList<>();
                for (int i = 0; i < step.size(); i++) {
                    sum.add(open.get(next).get(i).plus(step.get(i)));
                }
                if (reached.add(sum)) {
                    open.add(sum);
                }
            }
        }
        assertTrue(reached.containsAll(classes), embedding::toString);
    }

    /** The classical families beyond the tables: dimension and index at ranks up to 16. */
    @Test
    void familiesHoldAtHigherRanks() {
        List<Embedding> families = List.of(
                ClassicalEmbeddings.unitarySum(9, 6, FREE),
                ClassicalEmbeddings.unitaryProduct(3, 5, FREE),
                ClassicalEmbeddings.orthogonalInUnitary(15, FREE),
                ClassicalEmbeddings.symplecticInUnitary(16, FREE),
                ClassicalEmbeddings.orthogonalSum(10, 11, FREE),
                ClassicalEmbeddings.orthogonalSum(22, 10, FREE),
                ClassicalEmbeddings.orthogonalSum(2, 18, FREE),
                ClassicalEmbeddings.orthogonalProduct(4, 7, FREE),
                ClassicalEmbeddings.symplecticProduct(4, 6, FREE),
                ClassicalEmbeddings.unitaryInOrthogonal(11, FREE),
                ClassicalEmbeddings.unitaryInSymplectic(12, FREE),
                ClassicalEmbeddings.symplecticSum(8, 14, FREE),
                ClassicalEmbeddings.mixedProduct(4, 7, FREE));
        for (Embedding embedding : families) {
            DominantWeight adjoint = RootSystem.of(embedding.algebra()).highestRoot();
            Decomposition<ReductiveIrrep> sum = Branching.branch(embedding, adjoint, FREE);
            ReductiveAlgebra subalgebra = embedding.subalgebra();
            ReductiveRing ring = new ReductiveRing(subalgebra);
            for (int i = 0; i < subalgebra.factors().size(); i++) {
                BigInteger index = Invariants.dynkinIndex(embedding.algebra(), adjoint);
                assertEquals(EmbeddingIndex.of(embedding, i).multiply(index), index(ring, sum, i), embedding.name());
                assertTrue(sum.multiplicities().keySet().containsAll(adjoints(subalgebra)), embedding.name());
            }
        }
    }

    /** The adjoint irrep of the subalgebra: that of each factor, and one singlet for each charge. */
    private static List<ReductiveIrrep> adjoints(ReductiveAlgebra algebra) {
        ReductiveIrrep trivial = new ReductiveRing(algebra).trivial();
        List<ReductiveIrrep> adjoints = new ArrayList<>();
        for (int i = 0; i < algebra.factors().size(); i++) {
            List<DominantWeight> weights = new ArrayList<>(trivial.weights());
            weights.set(i, RootSystem.of(algebra.factors().get(i)).highestRoot());
            adjoints.add(new ReductiveIrrep(weights, trivial.charges()));
        }
        return adjoints;
    }
}
