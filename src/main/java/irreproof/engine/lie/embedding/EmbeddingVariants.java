package irreproof.engine.lie.embedding;

import irreproof.budget.Budget;
import irreproof.engine.Rational;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;

/**
 * The inequivalent embeddings that differ from a given one by diagram automorphisms: of the algebra (conjugation, the
 * exchange of an SO(2n)'s spinors, triality), of each simple factor, and by exchanges of equal factors. Charges stay as
 * they are: their sign and scale are the author's choice. Two maps are taken as the same if
 * they have one {@link Fingerprint}. Cost: that many small restrictions for each combination.
 */
public final class EmbeddingVariants {
    private EmbeddingVariants() {}

    /** The given embedding first. */
    public static List<Embedding> of(Embedding embedding, Budget budget) {
        List<Embedding> found = new ArrayList<>();
        Set<Fingerprint> seen = new HashSet<>();
        for (int[] nodes : automorphisms(embedding.algebra())) {
            for (List<List<Rational>> rows : rowOrders(embedding)) {
                List<List<Rational>> projection =
                        rows.stream().map(row -> permuted(row, nodes)).toList();
                Embedding variant =
                        new Embedding(embedding.algebra(), embedding.subalgebra(), projection, embedding.name());
                if (seen.add(Fingerprint.of(variant, budget))) {
                    found.add(variant);
                }
            }
        }
        return found;
    }

    /** Only those by automorphisms of the algebra. */
    static List<Embedding> imagesOf(Embedding embedding, Budget budget) {
        List<Embedding> found = new ArrayList<>();
        Set<Fingerprint> seen = new HashSet<>();
        for (int[] nodes : automorphisms(embedding.algebra())) {
            List<List<Rational>> projection = embedding.projection().stream()
                    .map(row -> permuted(row, nodes))
                    .toList();
            Embedding image = new Embedding(embedding.algebra(), embedding.subalgebra(), projection, embedding.name());
            if (seen.add(Fingerprint.of(image, budget))) {
                found.add(image);
            }
        }
        return found;
    }

    /** As permutations of the nodes, the identity first. */
    static List<int[]> automorphisms(SimpleAlgebra algebra) {
        int rank = algebra.rank();
        int[] identity = IntStream.range(0, rank).toArray();
        return switch (algebra.series()) {
            case A ->
                rank == 1
                        ? List.of(identity)
                        : List.of(
                                identity,
                                IntStream.range(0, rank).map(i -> rank - 1 - i).toArray());
            case D -> rank == 4 ? triality() : List.of(identity, swapped(identity, rank - 2, rank - 1));
            case E -> rank == 6 ? List.of(identity, new int[] {5, 1, 4, 3, 2, 0}) : List.of(identity);
            case B, C, F, G -> List.of(identity);
        };
    }

    private static List<int[]> triality() {
        return List.of(
                new int[] {0, 1, 2, 3},
                new int[] {0, 1, 3, 2},
                new int[] {2, 1, 0, 3},
                new int[] {3, 1, 2, 0},
                new int[] {2, 1, 3, 0},
                new int[] {3, 1, 0, 2});
    }

    private static int[] swapped(int[] nodes, int i, int j) {
        int[] copy = nodes.clone();
        copy[i] = nodes[j];
        copy[j] = nodes[i];
        return copy;
    }

    private static <T> List<T> permuted(List<T> items, int[] order) {
        return IntStream.of(order).mapToObj(items::get).toList();
    }

    /** The rows after an automorphism of each factor and a permutation of equal factors. */
    private static List<List<List<Rational>>> rowOrders(Embedding embedding) {
        List<List<List<Rational>>> orders = new ArrayList<>();
        List<SimpleAlgebra> factors = embedding.subalgebra().factors();
        collect(embedding, factors, new ArrayList<>(), new HashSet<>(), orders);
        return orders;
    }

    private static void collect(
            Embedding embedding,
            List<SimpleAlgebra> factors,
            List<List<Rational>> rows,
            Set<Integer> used,
            List<List<List<Rational>>> orders) {
        int position = used.size();
        if (position == factors.size()) {
            List<List<Rational>> all = new ArrayList<>(rows);
            all.addAll(embedding.chargeRows());
            orders.add(all);
            return;
        }
        for (int factor = 0; factor < factors.size(); factor++) {
            if (used.contains(factor) || !factors.get(factor).equals(factors.get(position))) {
                continue;
            }
            used.add(factor);
            for (int[] nodes : automorphisms(factors.get(factor))) {
                List<List<Rational>> longer = new ArrayList<>(rows);
                longer.addAll(permuted(embedding.rows(factor), nodes));
                collect(embedding, factors, longer, used, orders);
            }
            used.remove(factor);
        }
    }
}
