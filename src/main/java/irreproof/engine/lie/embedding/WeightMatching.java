package irreproof.engine.lie.embedding;

import irreproof.budget.Budget;
import irreproof.engine.Rational;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.LieRing;
import irreproof.engine.lie.RootSystem;
import irreproof.engine.lie.SimpleAlgebra;
import irreproof.engine.lie.WeylOrbit;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * The linear map of weights that turns the weights of an irrep of the algebra into those of a given representation of the
 * subalgebra, each as often. A total order of the subalgebra's weights orders the algebra's roots, and some chamber agrees
 * with it; so the highest weight goes to the highest, and the highest image not accounted for comes from a weight one
 * simple root below those that are. That settles one more simple root at each step, with a choice among at most rank
 * many, undone when an image occurs too often.
 *
 * <p>Cost: weights times rank for each choice tried; the smallest irreps of exceptional algebras take well under a
 * thousand choices. The map found restricts characters rightly; that it belongs to a subalgebra is Dynkin's list's word.
 */
final class WeightMatching {
    /** @param depth the highest weight minus this one, over the simple roots */
    private record Place(int[] depth, long count) {}

    private final RootSystem system;
    private final Budget budget;
    private final Comparator<long[]> order;
    private final long scale;
    private final int width;
    private final Map<List<Long>, Long> wanted = new LinkedHashMap<>();
    private final Map<AnyWeight, Place> places = new LinkedHashMap<>();
    private final long[] top;
    private final long[][] images;

    /** Any weight, as a key. */
    private record AnyWeight(List<Integer> labels) {
        static AnyWeight of(int[] labels) {
            return new AnyWeight(Arrays.stream(labels).boxed().toList());
        }
    }

    private WeightMatching(
            SimpleAlgebra algebra, DominantWeight irrep, DefiningRepresentation representation, Budget budget) {
        this.system = RootSystem.of(algebra);
        this.budget = budget;
        WeightSystem target = WeightSystem.of(representation.algebra(), representation.sum(), budget);
        this.order = target.order();
        this.scale = target.scale();
        this.width = representation.algebra().rank();
        target.weights().forEach(weight -> wanted.merge(key(weight), 1L, Long::sum));
        this.top = target.weights().get(0);
        this.images = new long[algebra.rank()][];
        placeAll(algebra, irrep);
    }

    private static List<Long> key(long[] weight) {
        return Arrays.stream(weight).boxed().toList();
    }

    private void placeAll(SimpleAlgebra algebra, DominantWeight irrep) {
        Map<AnyWeight, Long> counts = new HashMap<>();
        new LieRing(algebra)
                .character(irrep, budget)
                .forEach((dominant, count) ->
                        WeylOrbit.forEach(system, dominant, budget, weight -> counts.put(AnyWeight.of(weight), count)));
        List<AnyWeight> open = new ArrayList<>();
        AnyWeight highest = AnyWeight.of(irrep.labels());
        open.add(highest);
        places.put(highest, new Place(new int[algebra.rank()], 1));
        for (int next = 0; next < open.size(); next++) {
            for (int node = 0; node < algebra.rank(); node++) {
                AnyWeight lower = below(open.get(next), node);
                if (counts.containsKey(lower) && !places.containsKey(lower)) {
                    int[] depth = places.get(open.get(next)).depth.clone();
                    depth[node]++;
                    places.put(lower, new Place(depth, counts.get(lower)));
                    open.add(lower);
                }
            }
        }
    }

    private AnyWeight below(AnyWeight weight, int node) {
        int[] labels = new int[system.rank()];
        for (int i = 0; i < labels.length; i++) {
            labels[i] = weight.labels.get(i) - system.cartan(node, i);
        }
        return AnyWeight.of(labels);
    }

    /**
     * One such embedding.
     *
     * @throws IllegalArgumentException if there is none
     */
    static Embedding of(
            SimpleAlgebra algebra,
            DominantWeight irrep,
            DefiningRepresentation representation,
            String name,
            Budget budget) {
        WeightMatching matching = new WeightMatching(algebra, irrep, representation, budget);
        if (!matching.settle()) {
            throw new IllegalArgumentException(name + " does not match the weights of " + irrep);
        }
        return new Embedding(algebra, representation.algebra(), matching.rows(), name);
    }

    private boolean settle() {
        Map<List<Long>, Long> left = new LinkedHashMap<>(wanted);
        long[][] highest = new long[images.length][];
        for (var entry : places.entrySet()) {
            budget.spend(1);
            long[] image = image(entry.getValue().depth);
            if (image == null) {
                continue;
            }
            long rest = left.getOrDefault(key(image), 0L) - entry.getValue().count;
            if (rest < 0) {
                return false;
            }
            left.put(key(image), rest);
            for (int node = 0; node < images.length; node++) {
                boolean unsettled = images[node] == null && places.containsKey(below(entry.getKey(), node));
                if (unsettled && (highest[node] == null || order.compare(image, highest[node]) > 0)) {
                    highest[node] = image;
                }
            }
        }
        // the wanted weights stand in descending order
        return left.entrySet().stream()
                .filter(entry -> entry.getValue() > 0)
                .findFirst()
                .map(entry -> choose(entry.getKey(), highest))
                .orElse(true);
    }

    private boolean choose(List<Long> next, long[][] highest) {
        for (int node = 0; node < images.length; node++) {
            if (images[node] != null || highest[node] == null) {
                continue;
            }
            long[] root = new long[width];
            for (int i = 0; i < width; i++) {
                root[i] = highest[node][i] - next.get(i);
            }
            if (order.compare(root, new long[width]) >= 0) {
                images[node] = root;
                if (settle()) {
                    return true;
                }
                images[node] = null;
            }
        }
        return false;
    }

    /** Null while a simple root on the way is unsettled. */
    private long[] image(int[] depth) {
        long[] image = top.clone();
        for (int node = 0; node < depth.length; node++) {
            if (depth[node] == 0) {
                continue;
            }
            if (images[node] == null) {
                return null;
            }
            for (int i = 0; i < width; i++) {
                image[i] -= depth[node] * images[node][i];
            }
        }
        return image;
    }

    /** Fundamental weights over the simple roots: the form with another fundamental weight, over half that root's length. */
    private List<List<Rational>> rows() {
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < width; i++) {
            List<Rational> row = new ArrayList<>();
            for (int weight = 0; weight < images.length; weight++) {
                Rational entry = Rational.ZERO;
                for (int node = 0; node < images.length; node++) {
                    Rational coefficient = Rational.of(2 * system.form(weight, node), system.formDenominator())
                            .dividedBy(RegularEmbeddings.length(system, node));
                    entry = entry.plus(coefficient.times(Rational.of(images[node][i], scale)));
                }
                row.add(entry);
            }
            rows.add(row);
        }
        return rows;
    }
}
