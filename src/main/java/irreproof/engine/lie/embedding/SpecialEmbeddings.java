package irreproof.engine.lie.embedding;

import irreproof.budget.Budget;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.ArrayList;
import java.util.List;

/**
 * The special (smaller rank) maximal subalgebras of classical algebras, up to outer automorphisms: the families at any
 * rank, and the irreducible simple ones up to rank 8 (Dynkin, Maximal subgroups of the classical groups, 1952; the list as
 * tabulated by McKay and Patera 1981, from memory). Beyond rank 8 the simple ones but SU(2) are left out: any of them is
 * had from {@link MatrixEmbedding} by its irrep.
 */
final class SpecialEmbeddings {
    /** @param labels of the irrep of the subalgebra that the defining irrep becomes */
    private record Irreducible(SimpleAlgebra algebra, SimpleAlgebra subalgebra, int... labels) {}

    private static final List<Irreducible> IRREDUCIBLE = List.of(
            new Irreducible(type(Series.A, 5), type(Series.A, 2), 0, 2),
            new Irreducible(type(Series.B, 3), type(Series.G, 2), 1, 0),
            new Irreducible(type(Series.B, 7), type(Series.A, 3), 1, 0, 1),
            new Irreducible(type(Series.C, 7), type(Series.C, 3), 0, 0, 1),
            new Irreducible(type(Series.C, 8), type(Series.C, 2), 1, 1),
            new Irreducible(type(Series.D, 4), type(Series.A, 2), 1, 1),
            new Irreducible(type(Series.D, 5), type(Series.C, 2), 2, 0),
            new Irreducible(type(Series.D, 7), type(Series.C, 2), 0, 2),
            new Irreducible(type(Series.D, 7), type(Series.C, 3), 0, 1, 0),
            new Irreducible(type(Series.D, 7), type(Series.G, 2), 0, 1),
            new Irreducible(type(Series.D, 8), type(Series.B, 4), 0, 0, 0, 1));

    private final SimpleAlgebra algebra;
    private final int dimension;
    private final Budget budget;
    private final List<Embedding> found = new ArrayList<>();

    private SpecialEmbeddings(SimpleAlgebra algebra, Budget budget) {
        this.algebra = algebra;
        this.dimension = MatrixEmbedding.dimension(algebra);
        this.budget = budget;
    }

    private static SimpleAlgebra type(Series series, int rank) {
        return new SimpleAlgebra(series, rank);
    }

    /** @throws IllegalArgumentException if the algebra is not classical */
    static List<Embedding> of(SimpleAlgebra algebra, Budget budget) {
        SpecialEmbeddings special = new SpecialEmbeddings(algebra, budget);
        switch (algebra.series()) {
            case A -> special.inUnitary();
            case B, D -> special.inOrthogonal();
            case C -> special.inSymplectic();
            case E, F, G -> throw new IllegalArgumentException(algebra + " is not classical");
        }
        IRREDUCIBLE.stream()
                .filter(entry -> entry.algebra.equals(algebra))
                .forEach(entry -> special.add(
                        DefiningRepresentation.of(entry.subalgebra, entry.labels),
                        "irrep " + DominantWeight.of(entry.labels) + " of " + entry.subalgebra));
        return special.found;
    }

    private void add(DefiningRepresentation representation, String name) {
        found.add(MatrixEmbedding.of(algebra, representation, name, budget));
    }

    private void inUnitary() {
        if (dimension >= 3) {
            found.add(ClassicalEmbeddings.orthogonalInUnitary(dimension, budget));
        }
        if (dimension >= 4 && dimension % 2 == 0) {
            found.add(ClassicalEmbeddings.symplecticInUnitary(dimension, budget));
        }
        for (int n = 2; n * n <= dimension; n++) {
            if (dimension % n == 0 && dimension > 4) {
                found.add(ClassicalEmbeddings.unitaryProduct(n, dimension / n, budget));
            }
        }
    }

    /** SO(3) in its seven-dimensional irrep lies in G2; factors SO(4) = Sp(2) x Sp(2) lie in larger products. */
    private void inOrthogonal() {
        if (dimension % 2 == 0) {
            for (int n = 1; 2 * n <= dimension; n += 2) {
                found.add(ClassicalEmbeddings.orthogonalSum(n, dimension - n, budget));
            }
        } else if (dimension == 5 || dimension > 7) {
            add(spin(dimension), "principal SU(2), irrep of dimension " + dimension);
        }
        for (int n = 3; n * n <= dimension; n++) {
            if (dimension % n == 0 && n != 4 && dimension != 4 * n) {
                found.add(ClassicalEmbeddings.orthogonalProduct(n, dimension / n, budget));
            }
        }
        for (int n = 2; n * n <= dimension; n += 2) {
            if (dimension % (2 * n) == 0) {
                found.add(ClassicalEmbeddings.symplecticProduct(n, dimension / n, budget));
            }
        }
    }

    private void inSymplectic() {
        for (int n = 2; 3 * n <= dimension; n += 2) {
            int other = dimension / n;
            if (dimension % n == 0 && (other != 4 || n == 2)) {
                found.add(ClassicalEmbeddings.mixedProduct(n, other, budget));
            }
        }
        add(spin(dimension), "principal SU(2), irrep of dimension " + dimension);
    }

    private static DefiningRepresentation spin(int dimension) {
        return DefiningRepresentation.of(type(Series.A, 1), dimension - 1);
    }
}
