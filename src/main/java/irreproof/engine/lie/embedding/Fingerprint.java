package irreproof.engine.lie.embedding;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.lie.Branching;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.ArrayList;
import java.util.List;

/**
 * What tells embeddings apart up to linear equivalence (Dynkin 1952): how the smallest irrep restricts, and in SO(2n) how
 * the difference of the two spinors does. Its character is the product of x^(m/2) - x^(-m/2) over half the vector's
 * weights m, so the vector fixes it up to a sign, which is that of its leading term; no spinor is restricted. Cost: that
 * of restricting the smallest irrep.
 *
 * @param orientation 1 or -1; 0 if both spinors restrict alike, or the algebra is not D_n
 */
record Fingerprint(Decomposition<ReductiveIrrep> restriction, int orientation) {
    static Fingerprint of(Embedding embedding, Budget budget) {
        SimpleAlgebra algebra = embedding.algebra();
        Decomposition<ReductiveIrrep> restriction = Branching.branch(embedding, smallestIrrep(algebra), budget);
        return new Fingerprint(restriction, algebra.series() == Series.D ? orientation(embedding) : 0);
    }

    /** The defining irrep of a classical algebra, the 7, 26, 27, 56 or 248 of an exceptional one. */
    static DominantWeight smallestIrrep(SimpleAlgebra algebra) {
        int[] labels = new int[algebra.rank()];
        boolean lastNode = switch (algebra.series()) {
            case A, B, C, D, G -> false;
            case E -> algebra.rank() > 6;
            case F -> true;
        };
        labels[lastNode ? labels.length - 1 : 0] = 1;
        return DominantWeight.of(labels);
    }

    private static int orientation(Embedding embedding) {
        int rank = embedding.algebra().rank();
        int sign = 1;
        for (int i = 0; i < rank; i++) {
            List<Rational> image = new ArrayList<>();
            for (List<Rational> row : embedding.projection()) {
                image.add(coordinate(row, i, rank));
            }
            sign *= image.stream()
                    .map(Rational::signum)
                    .filter(entry -> entry != 0)
                    .findFirst()
                    .orElse(0);
        }
        return sign;
    }

    /** The orthogonal coordinate e_i over the fundamental weights, projected. */
    private static Rational coordinate(List<Rational> row, int i, int rank) {
        if (i == rank - 1) {
            return row.get(i).minus(row.get(i - 1));
        }
        Rational before = i == 0 ? Rational.ZERO : row.get(i - 1);
        Rational own = i == rank - 2 ? row.get(i).plus(row.get(rank - 1)) : row.get(i);
        return own.minus(before);
    }
}
