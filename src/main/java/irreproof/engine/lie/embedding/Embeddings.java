package irreproof.engine.lie.embedding;

import irreproof.budget.Budget;
import irreproof.engine.BoundedCache;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.ArrayList;
import java.util.List;

/** The maximal reductive subalgebras of a simple algebra, each by one embedding; see {@link EmbeddingVariants} for others. */
public final class Embeddings {
    private static final long KEPT_ENTRIES = 500_000;
    private static final BoundedCache<SimpleAlgebra, List<Embedding>> MAXIMAL = new BoundedCache<>(
            KEPT_ENTRIES,
            embeddings -> embeddings.stream()
                    .mapToInt(embedding ->
                            embedding.projection().size() * embedding.algebra().rank())
                    .sum());

    private Embeddings() {}

    /**
     * Regular with U(1), regular semisimple, special, in this order; one of each class up to outer automorphisms. Complete
     * up to rank 8 (SO(8): the images of SO(7) and of SO(3) x SO(5) under triality come as variants); beyond, irreducible
     * simple subalgebras other than SU(2) are left out.
     */
    public static List<Embedding> maximal(SimpleAlgebra algebra, Budget budget) {
        return MAXIMAL.get(algebra, budget, allowed -> {
            List<Embedding> all = new ArrayList<>(RegularEmbeddings.maximal(algebra));
            all.addAll(
                    switch (algebra.series()) {
                        case A, B, C, D -> SpecialEmbeddings.of(algebra, allowed);
                        case E, F, G -> ExceptionalEmbeddings.of(algebra, allowed);
                    });
            all.forEach(embedding -> allowed.spend((long) embedding.projection().size() * algebra.rank()));
            return List.copyOf(all);
        });
    }
}
