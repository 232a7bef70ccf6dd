package irreproof.check;

import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.ReductiveAlgebra;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;

/**
 * What a restriction becomes by the author's choices: diagram automorphisms of single factors (conjugations, the exchange
 * of spinors, triality) and sign changes of single charges.
 */
final class RestrictionImages {
    /** Beyond so many images none but the restriction itself is given. */
    private static final int MOST = 5000;

    private RestrictionImages() {}

    static Set<Decomposition<ReductiveIrrep>> of(Decomposition<ReductiveIrrep> sum, ReductiveAlgebra algebra) {
        Set<Decomposition<ReductiveIrrep>> images = new LinkedHashSet<>(Set.of(sum));
        for (int i = 0; i < algebra.factors().size(); i++) {
            int factor = i;
            Set<Decomposition<ReductiveIrrep>> more = new LinkedHashSet<>();
            for (int[] nodes : automorphisms(algebra.factors().get(i))) {
                images.forEach(image -> more.add(mapped(image, irrep -> permuted(irrep, factor, nodes))));
            }
            images = more;
            if (images.size() > MOST) {
                return Set.of(sum);
            }
        }
        for (int i = 0; i < algebra.charges(); i++) {
            int charge = i;
            Set<Decomposition<ReductiveIrrep>> more = new LinkedHashSet<>(images);
            images.forEach(image -> more.add(mapped(image, irrep -> reflected(irrep, charge))));
            images = more;
        }
        return images;
    }

    private static Decomposition<ReductiveIrrep> mapped(
            Decomposition<ReductiveIrrep> sum, UnaryOperator<ReductiveIrrep> map) {
        Map<ReductiveIrrep, Long> image = new TreeMap<>();
        sum.multiplicities().forEach((irrep, count) -> image.put(map.apply(irrep), count));
        return Decomposition.of(image);
    }

    private static ReductiveIrrep permuted(ReductiveIrrep irrep, int factor, int[] nodes) {
        List<DominantWeight> weights = new ArrayList<>(irrep.weights());
        DominantWeight weight = weights.get(factor);
        weights.set(
                factor, DominantWeight.of(IntStream.of(nodes).map(weight::label).toArray()));
        return new ReductiveIrrep(weights, irrep.charges());
    }

    private static ReductiveIrrep reflected(ReductiveIrrep irrep, int charge) {
        List<Rational> charges = new ArrayList<>(irrep.charges());
        charges.set(charge, charges.get(charge).negate());
        return new ReductiveIrrep(irrep.weights(), charges);
    }

    /** As permutations of the nodes, the identity first. */
    private static List<int[]> automorphisms(SimpleAlgebra algebra) {
        int rank = algebra.rank();
        int[] identity = IntStream.range(0, rank).toArray();
        int[] exchanged = identity.clone();
        return switch (algebra.series()) {
            case A ->
                List.of(
                        identity,
                        IntStream.range(0, rank).map(i -> rank - 1 - i).toArray());
            case D -> {
                exchanged[rank - 2] = rank - 1;
                exchanged[rank - 1] = rank - 2;
                yield rank != 4
                        ? List.of(identity, exchanged)
                        : List.of(
                                identity,
                                exchanged,
                                new int[] {2, 1, 0, 3},
                                new int[] {3, 1, 2, 0},
                                new int[] {2, 1, 3, 0},
                                new int[] {3, 1, 0, 2});
            }
            case E -> rank == 6 ? List.of(identity, new int[] {5, 1, 4, 3, 2, 0}) : List.of(identity);
            case B, C, F, G -> List.of(identity);
        };
    }
}
