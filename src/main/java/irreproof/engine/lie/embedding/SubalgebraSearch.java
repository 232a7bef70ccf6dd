package irreproof.engine.lie.embedding;

import irreproof.budget.Budget;
import irreproof.engine.Rational;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.ReductiveAlgebra;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import irreproof.engine.lie.WeylDimension;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * Subalgebras of a given type, by chains of maximal subalgebras, breadth first; simple factors and u(1)s that the type
 * does not name are dropped (SU(3) of SU(5) by way of SU(3) x SU(2) x U(1)). Chains that end in equal factors of equal
 * index with equal restrictions of the smallest irrep, up to labels, are followed once. Cost grows tenfold with each step for
 * large algebras: the caller names the longest chain.
 *
 * <p>Not found: diagonal subalgebras of products, and u(1)s that mix two charges of a chain.
 */
public final class SubalgebraSearch {
    private final ReductiveAlgebra wanted;
    private final Budget budget;
    private final Set<List<Object>> followed = new HashSet<>();
    private final Set<Fingerprint> known = new HashSet<>();
    private final List<Embedding> found = new ArrayList<>();

    private SubalgebraSearch(ReductiveAlgebra wanted, Budget budget) {
        this.wanted = wanted;
        this.budget = budget;
    }

    /**
     * Inequivalent embeddings with the factors in the wanted order, short chains first, each followed by its variants
     * ({@link EmbeddingVariants}). Charges of Levi subalgebras are coprime whole numbers, but those of chains need not be.
     *
     * @param steps how many maximal subalgebras a chain may have
     */
    public static List<Embedding> find(SimpleAlgebra algebra, ReductiveAlgebra wanted, int steps, Budget budget) {
        SubalgebraSearch search = new SubalgebraSearch(wanted, budget);
        List<Embedding> level = List.of(Embedding.identity(algebra));
        for (int step = 0; step < steps; step++) {
            List<Embedding> next = new ArrayList<>();
            for (Embedding chain : level) {
                search.extend(chain, next);
            }
            level = next;
        }
        return search.found;
    }

    private void extend(Embedding chain, List<Embedding> next) {
        for (int factor = 0; factor < chain.subalgebra().factors().size(); factor++) {
            for (Embedding step :
                    Embeddings.maximal(chain.subalgebra().factors().get(factor), budget)) {
                for (Embedding image : EmbeddingVariants.imagesOf(step, budget)) {
                    budget.spend(1);
                    Embedding longer =
                            chain.equals(Embedding.identity(chain.algebra())) ? image : chain.then(factor, image);
                    if (longer.subalgebra().rank() >= wanted.rank() && followed.add(type(longer))) {
                        next.add(longer);
                        match(longer, new ArrayList<>());
                    }
                }
            }
        }
    }

    /** The factors with their indices, and how small irreps split by dimensions. */
    private List<Object> type(Embedding embedding) {
        List<String> factors = new ArrayList<>();
        for (int i = 0; i < embedding.subalgebra().factors().size(); i++) {
            factors.add(embedding.subalgebra().factors().get(i) + " " + EmbeddingIndex.of(embedding, i));
        }
        factors.sort(null);
        List<Object> type = new ArrayList<>(factors);
        type.add(embedding.subalgebra().charges());
        List<String> parts = new ArrayList<>();
        Fingerprint.of(embedding, budget)
                .restriction()
                .multiplicities()
                .forEach((irrep, count) -> parts.add(count + " " + dimensions(embedding, irrep)));
        parts.sort(null);
        type.add(parts);
        return type;
    }

    private static List<String> dimensions(Embedding embedding, ReductiveIrrep irrep) {
        List<String> dimensions = new ArrayList<>();
        for (int i = 0; i < irrep.weights().size(); i++) {
            SimpleAlgebra factor = embedding.subalgebra().factors().get(i);
            dimensions.add(factor + " "
                    + WeylDimension.dimension(factor, irrep.weights().get(i)));
        }
        dimensions.sort(Comparator.naturalOrder());
        return dimensions;
    }

    /** Chooses a factor of the chain's end for each wanted one, in every way, then the charges. */
    private void match(Embedding chain, List<Integer> chosen) {
        int position = chosen.size();
        if (position == wanted.factors().size()) {
            choose(chain, chosen, new ArrayList<>());
            return;
        }
        SimpleAlgebra name = tabled(wanted.factors().get(position));
        for (int factor = 0; factor < chain.subalgebra().factors().size(); factor++) {
            if (!chosen.contains(factor)
                    && tabled(chain.subalgebra().factors().get(factor)).equals(name)) {
                chosen.add(factor);
                match(chain, chosen);
                chosen.remove(chosen.size() - 1);
            }
        }
    }

    private void choose(Embedding chain, List<Integer> factors, List<Integer> charges) {
        if (charges.size() < wanted.charges()) {
            int start = charges.isEmpty() ? 0 : charges.get(charges.size() - 1) + 1;
            for (int charge = start; charge < chain.subalgebra().charges(); charge++) {
                charges.add(charge);
                choose(chain, factors, charges);
                charges.remove(charges.size() - 1);
            }
            return;
        }
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < factors.size(); i++) {
            SimpleAlgebra own = chain.subalgebra().factors().get(factors.get(i));
            rows.addAll(
                    relabelled(chain.rows(factors.get(i)), own, wanted.factors().get(i)));
        }
        charges.forEach(charge -> rows.add(chain.chargeRows().get(charge)));
        Embedding match = new Embedding(chain.algebra(), wanted, rows, chain.name());
        if (known.add(Fingerprint.of(match, budget))) {
            for (Embedding variant : EmbeddingVariants.of(match, budget)) {
                known.add(Fingerprint.of(variant, budget));
                found.add(variant);
            }
        }
    }

    private static SimpleAlgebra tabled(SimpleAlgebra algebra) {
        if (algebra.series() == Series.B && algebra.rank() == 2) {
            return new SimpleAlgebra(Series.C, 2);
        }
        if (algebra.series() == Series.D && algebra.rank() == 3) {
            return new SimpleAlgebra(Series.A, 3);
        }
        return algebra;
    }

    /** B2 counts the nodes of C2 backwards; D3 has the middle node of A3 first. */
    private static List<List<Rational>> relabelled(List<List<Rational>> rows, SimpleAlgebra from, SimpleAlgebra to) {
        if (from.equals(to)) {
            return rows;
        }
        return rows.size() == 2 ? List.of(rows.get(1), rows.get(0)) : List.of(rows.get(1), rows.get(0), rows.get(2));
    }
}
