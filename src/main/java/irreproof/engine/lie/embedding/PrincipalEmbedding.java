package irreproof.engine.lie.embedding;

import irreproof.engine.Rational;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.ReductiveAlgebra;
import irreproof.engine.lie.RootSystem;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/** Subalgebras SU(2) by the SU(2) labels of the simple roots: 2 for all (the principal one: Kostant 1959), or 0 for some. */
public final class PrincipalEmbedding {
    private PrincipalEmbedding() {}

    public static Embedding of(SimpleAlgebra algebra) {
        return of(algebra, Set.of());
    }

    /**
     * @param zeros the nodes, from 0, whose simple roots restrict to 0; whether such a subalgebra exists (Dynkin 1952
     *     lists them) is not checked
     */
    public static Embedding of(SimpleAlgebra algebra, Set<Integer> zeros) {
        RootSystem system = RootSystem.of(algebra);
        List<Rational> row = new ArrayList<>();
        for (int weight = 0; weight < algebra.rank(); weight++) {
            Rational entry = Rational.ZERO;
            for (int node = 0; node < algebra.rank(); node++) {
                if (!zeros.contains(node)) {
                    Rational coefficient = Rational.of(4 * system.form(weight, node), system.formDenominator());
                    entry = entry.plus(coefficient.dividedBy(RegularEmbeddings.length(system, node)));
                }
            }
            row.add(entry);
        }
        ReductiveAlgebra su2 = ReductiveAlgebra.of(new SimpleAlgebra(Series.A, 1));
        // entry (i): twice the sum of the fundamental weight's coefficients over the simple roots that count
        return new Embedding(
                algebra, su2, List.of(row), zeros.isEmpty() ? "principal SU(2)" : "SU(2) by labels 2 and 0");
    }
}
