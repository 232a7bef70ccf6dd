package irreproof.engine.lie.embedding;

import irreproof.budget.Budget;
import irreproof.engine.Rational;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.Invariants;
import irreproof.engine.lie.Reality;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A subalgebra of a classical algebra from the representation by which its matrices act in the defining irrep: the weights
 * of that representation, in descending order, are the images of the defining irrep's weights e_1, e_2, ..., and the
 * fundamental weights are sums (for spinors half sums) of these (Dynkin 1952). Cost: the dimension times the ranks.
 */
public final class MatrixEmbedding {
    private MatrixEmbedding() {}

    /**
     * The embedding in A_n, B_n, C_n or D_n. In D_n the two choices that an outer automorphism exchanges are both right;
     * one is taken.
     *
     * @throws IllegalArgumentException if the representation's dimension, trace or invariant form does not fit
     */
    public static Embedding of(
            SimpleAlgebra algebra, DefiningRepresentation representation, String name, Budget budget) {
        Series series = algebra.series();
        int rank = algebra.rank();
        int dimension = dimension(algebra);
        WeightSystem system = WeightSystem.of(representation.algebra(), representation.sum(), budget);
        List<long[]> weights = system.weights();
        require(weights.size() == dimension, name + ": the dimension is not " + dimension);
        require(keepsForm(series, representation), name + ": no invariant form of the kind that belongs to " + algebra);
        List<long[]> images = new ArrayList<>();
        long[] sum = new long[representation.algebra().rank()];
        for (int i = 0; i < dimension; i++) {
            for (int j = 0; j < sum.length; j++) {
                sum[j] = Math.addExact(sum[j], weights.get(i)[j]);
            }
            images.add(sum.clone());
        }
        require(Arrays.equals(sum, new long[sum.length]), name + ": the charges have a trace");
        List<List<Rational>> rows = new ArrayList<>();
        for (int j = 0; j < sum.length; j++) {
            List<Rational> row = new ArrayList<>();
            for (int i = 0; i < rank; i++) {
                row.add(Rational.of(images.get(i)[j], system.scale()));
            }
            if (series == Series.B || series == Series.D) {
                row.set(rank - 1, row.get(rank - 1).dividedBy(Rational.of(2)));
            }
            if (series == Series.D) {
                Rational last = Rational.of(weights.get(rank - 1)[j], system.scale());
                row.set(rank - 2, row.get(rank - 1).minus(last));
            }
            rows.add(row);
        }
        return new Embedding(algebra, representation.algebra(), rows, name);
    }

    /** Of the defining irrep. */
    static int dimension(SimpleAlgebra algebra) {
        int rank = algebra.rank();
        return switch (algebra.series()) {
            case A -> rank + 1;
            case B -> 2 * rank + 1;
            case C, D -> 2 * rank;
            case E, F, G -> throw new IllegalArgumentException(algebra + " is not classical");
        };
    }

    private static void require(boolean fits, String otherwise) {
        if (!fits) {
            throw new IllegalArgumentException(otherwise);
        }
    }

    /** Irreps that are real come with a symmetric form, pairs of conjugates with forms of both kinds. */
    private static boolean keepsForm(Series series, DefiningRepresentation representation) {
        if (series == Series.A) {
            return true;
        }
        Reality paired = series == Series.C ? Reality.REAL : Reality.PSEUDOREAL;
        if (!representation.conjugate().equals(representation)) {
            return false;
        }
        return representation.sum().multiplicities().entrySet().stream()
                .allMatch(term -> reality(representation, term.getKey()) != paired || term.getValue() % 2 == 0);
    }

    private static Reality reality(DefiningRepresentation representation, ReductiveIrrep irrep) {
        boolean symmetric = irrep.charges().stream().allMatch(charge -> charge.signum() == 0);
        if (!symmetric) {
            return Reality.COMPLEX;
        }
        boolean real = true;
        for (int i = 0; i < irrep.weights().size(); i++) {
            SimpleAlgebra factor = representation.algebra().factors().get(i);
            Reality reality = Invariants.reality(factor, irrep.weights().get(i));
            if (reality == Reality.COMPLEX) {
                return reality;
            }
            real ^= reality == Reality.PSEUDOREAL;
        }
        return real ? Reality.REAL : Reality.PSEUDOREAL;
    }
}
