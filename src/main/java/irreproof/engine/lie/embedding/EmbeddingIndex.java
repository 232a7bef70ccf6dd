package irreproof.engine.lie.embedding;

import irreproof.engine.Rational;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.RootSystem;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * Dynkin's index of a simple factor in the algebra (Dynkin 1952): the squared length, in the algebra's form, of the coroot
 * of the factor's highest root, over that of the algebra's own, which is 2. Restricted irreps of the algebra have that
 * many times their own index.
 */
public final class EmbeddingIndex {
    private EmbeddingIndex() {}

    /** @param factor counted from 0 */
    public static BigInteger of(Embedding embedding, int factor) {
        RootSystem system = RootSystem.of(embedding.algebra());
        RootSystem smaller = RootSystem.of(embedding.subalgebra().factors().get(factor));
        int[] comarks = RegularEmbeddings.comarks(smaller);
        List<Rational> coroot = new ArrayList<>();
        for (int i = 0; i < system.rank(); i++) {
            Rational coefficient = Rational.ZERO;
            for (int j = 0; j < comarks.length; j++) {
                Rational entry = embedding.rows(factor).get(j).get(i);
                coefficient = coefficient.plus(entry.times(Rational.of(comarks[j])));
            }
            coroot.add(coefficient);
        }
        Rational square = Rational.ZERO;
        for (int i = 0; i < system.rank(); i++) {
            // the form on two simple coroots is 2 C_ij / (squared length of root i): zero but for neighbours
            Rational row = Rational.ZERO;
            for (int j = 0; j < system.rank(); j++) {
                if (system.cartan(i, j) != 0) {
                    row = row.plus(coroot.get(j).times(Rational.of(2L * system.cartan(i, j))));
                }
            }
            if (row.signum() != 0 && coroot.get(i).signum() != 0) {
                square = square.plus(row.times(coroot.get(i)).dividedBy(RegularEmbeddings.length(system, i)));
            }
        }
        return square.dividedBy(Rational.of(2)).toIntegerExact();
    }
}
