package irreproof.engine.lie;

import irreproof.budget.Budget;
import irreproof.engine.BoundedCache;
import irreproof.engine.Decomposition;
import irreproof.engine.Partition;
import irreproof.engine.RepresentationRing;
import irreproof.engine.SchurFunctor;
import java.math.BigInteger;
import java.util.Map;
import java.util.Optional;

/**
 * The representation ring of a simple Lie algebra. Products of A_n by {@link LittlewoodRichardson}, of the other series
 * by {@link KlimykProduct}; powers by {@link SchurFunctor}. Products, powers and characters are remembered in caches
 * shared by all rings and threads.
 *
 * <p>Invariant: an estimate that refuses work is never above the work's true cost, so what a budget allows does not
 * depend on the caches.
 */
public record LieRing(SimpleAlgebra algebra) implements RepresentationRing<DominantWeight> {
    private static final long KEPT_TERMS = 200_000;
    private static final BoundedCache<Question, Decomposition<DominantWeight>> ANSWERS =
            new BoundedCache<>(KEPT_TERMS, sum -> sum.multiplicities().size());
    private static final BoundedCache<Question, Map<DominantWeight, Long>> CHARACTERS =
            new BoundedCache<>(KEPT_TERMS, Map::size);

    /** What was asked. Its equality is written out for the reason given at {@link SimpleAlgebra#hashCode}. */
    private record Question(
            Kind kind, SimpleAlgebra algebra, DominantWeight first, DominantWeight second, int exponent) {
        private enum Kind {
            CHARACTER,
            PRODUCT,
            SYMMETRIC,
            EXTERIOR
        }

        @Override
        public boolean equals(Object other) {
            return other instanceof Question that
                    && kind == that.kind
                    && exponent == that.exponent
                    && algebra.equals(that.algebra)
                    && first.equals(that.first)
                    && second.equals(that.second);
        }

        @Override
        public int hashCode() {
            int irreps = 31 * first.hashCode() + second.hashCode();
            return (31 * irreps + algebra.hashCode()) * 31 + 4 * exponent + kind.ordinal();
        }
    }

    @Override
    public DominantWeight trivial() {
        return DominantWeight.of(new int[algebra.rank()]);
    }

    @Override
    public BigInteger dimension(DominantWeight irrep) {
        return WeylDimension.dimension(algebra, irrep);
    }

    @Override
    public DominantWeight conjugate(DominantWeight irrep) {
        return Conjugation.conjugate(algebra, irrep);
    }

    /** Dominant weights with multiplicities, the highest weight first. */
    public Map<DominantWeight, Long> character(DominantWeight irrep, Budget budget) {
        Question question = new Question(Question.Kind.CHARACTER, algebra, irrep, irrep, 1);
        return CHARACTERS.get(question, budget, allowed -> DominantCharacter.of(algebra, irrep, allowed));
    }

    @Override
    public Decomposition<DominantWeight> product(DominantWeight left, DominantWeight right, Budget budget) {
        algebra.requireWeight(left);
        algebra.requireWeight(right);
        boolean inOrder = left.compareTo(right) <= 0;
        DominantWeight first = inOrder ? left : right;
        DominantWeight second = inOrder ? right : left;
        Question question = new Question(Question.Kind.PRODUCT, algebra, first, second, 1);
        return ANSWERS.get(question, budget, allowed -> switch (algebra.series()) {
            case A -> LittlewoodRichardson.product(first, second, allowed);
            case B, C, D, E, F, G -> KlimykProduct.product(algebra, first, second, this::character, allowed);
        });
    }

    @Override
    public Decomposition<DominantWeight> symmetricPower(DominantWeight irrep, int exponent, Budget budget) {
        return power(irrep, false, exponent, budget);
    }

    /** Beyond half the dimension by duality: the top exterior power of a simple group's irrep is trivial. */
    @Override
    public Decomposition<DominantWeight> exteriorPower(DominantWeight irrep, int exponent, Budget budget) {
        BigInteger dimension = dimension(irrep);
        BigInteger rest = dimension.subtract(BigInteger.valueOf(exponent));
        if (rest.signum() < 0) {
            return Decomposition.zero();
        }
        if (rest.compareTo(BigInteger.valueOf(exponent)) < 0) {
            return power(conjugate(irrep), true, rest.intValueExact(), budget);
        }
        return power(irrep, true, exponent, budget);
    }

    private Decomposition<DominantWeight> power(DominantWeight irrep, boolean exterior, int exponent, Budget budget) {
        if (exponent < 0) {
            throw new IllegalArgumentException("negative exponent " + exponent);
        }
        Question.Kind kind = exterior ? Question.Kind.EXTERIOR : Question.Kind.SYMMETRIC;
        return ANSWERS.get(new Question(kind, algebra, irrep, irrep, exponent), budget, allowed -> {
            // before a diagram of so many boxes is built
            SchurFunctor.requireBoxes(exponent, allowed);
            Partition diagram = exterior ? Partition.column(exponent) : Partition.of(exponent);
            return schurFunctor(Decomposition.of(irrep), diagram, allowed);
        });
    }

    @Override
    public Decomposition<DominantWeight> adamsProduct(
            DominantWeight irrep, int power, Decomposition<DominantWeight> factor, Budget budget) {
        return KlimykProduct.scaled(RootSystem.of(algebra), character(irrep, budget), power, factor, budget);
    }

    /** The N-ality of SU(N), the congruence class otherwise; empty where the centre is trivial (E8, F4, G2). */
    @Override
    public Optional<CentralCharacter> centralCharacter(DominantWeight irrep) {
        CongruenceClass congruenceClass = CongruenceClass.of(algebra, irrep);
        if (congruenceClass.modulus() == 1) {
            return Optional.empty();
        }
        String name = algebra.series() == Series.A ? "N-ality" : "congruence class";
        return Optional.of(new CentralCharacter(name, congruenceClass.toString()));
    }
}
