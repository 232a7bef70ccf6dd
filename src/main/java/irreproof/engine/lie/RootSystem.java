package irreproof.engine.lie;

import irreproof.budget.BudgetExceeded;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * The root system of a simple Lie algebra: Cartan matrix, invariant form, positive roots. Weights are given by Dynkin
 * labels in Bourbaki's numbering; the invariant form gives long roots the squared length 2, and is held as integers over
 * one {@link #formDenominator}. Immutable and safe for threads; the most recently used systems are kept.
 *
 * <p>Positive roots are found by height through root strings (Humphreys, Introduction to Lie Algebras, 11.1) when first
 * asked for; linear in rank times number of roots. Limit: rank 128, since matrices and roots are dense.
 */
public final class RootSystem {
    private static final int RANK_LIMIT = 128;
    private static final int KEPT = 64;
    private static final Map<SimpleAlgebra, RootSystem> CACHE = new LinkedHashMap<>(16, 0.75f, true) {
        @Override
        protected boolean removeEldestEntry(Map.Entry<SimpleAlgebra, RootSystem> eldest) {
            return size() > KEPT;
        }
    };

    private final SimpleAlgebra algebra;
    private final int[][] cartan;
    private final long[][] form;
    private final long formDenominator;
    private final int[][] neighbours;
    private List<Root> positiveRoots;
    private BigInteger weylGroupOrder;
    private final Map<BitSet, Parabolic> parabolics = new LinkedHashMap<>(16, 0.75f, true) {
        @Override
        protected boolean removeEldestEntry(Map.Entry<BitSet, Parabolic> eldest) {
            return size() > KEPT;
        }
    };

    private RootSystem(SimpleAlgebra algebra) {
        this.algebra = algebra;
        this.cartan = CartanMatrix.of(algebra);
        CartanMatrix.Inverse inverse = CartanMatrix.inverse(cartan);
        int rank = algebra.rank();
        this.form = inverse.adjugate();
        this.formDenominator = inverse.determinant() * algebra.lacing();
        for (int j = 0; j < rank; j++) {
            for (int i = 0; i < rank; i++) {
                form[i][j] *= simpleRootLength(j);
            }
        }
        this.neighbours = neighbours(cartan);
    }

    /** The Dynkin diagram is a chain but for the branches of D and E, which reach two nodes back. */
    private static int[][] neighbours(int[][] cartan) {
        int[][] neighbours = new int[cartan.length][];
        for (int node = 0; node < cartan.length; node++) {
            int[] found = new int[3];
            int count = 0;
            for (int other = Math.max(0, node - 2); other < Math.min(cartan.length, node + 3); other++) {
                if (other != node && cartan[node][other] != 0) {
                    found[count++] = other;
                }
            }
            neighbours[node] = Arrays.copyOf(found, count);
        }
        return neighbours;
    }

    /** @throws BudgetExceeded (too large) beyond rank 128 */
    public static RootSystem of(SimpleAlgebra algebra) {
        if (algebra.rank() > RANK_LIMIT) {
            throw new BudgetExceeded(
                    BudgetExceeded.Cause.TOO_LARGE, algebra + " has a rank beyond " + RANK_LIMIT + ", too large");
        }
        synchronized (CACHE) {
            return CACHE.computeIfAbsent(algebra, RootSystem::new);
        }
    }

    public SimpleAlgebra algebra() {
        return algebra;
    }

    public int rank() {
        return algebra.rank();
    }

    /** Simple root i paired with simple coroot j (nodes from 0). */
    public int cartan(int i, int j) {
        return cartan[i][j];
    }

    /** The Dynkin labels of a simple root; not to be changed. */
    int[] simpleRoot(int node) {
        return cartan[node];
    }

    /**
     * Reflects a weight at the hyperplane of a simple root, in place.
     *
     * @return the smallest node whose label changed
     * @throws ArithmeticException if a label overflows
     */
    int reflect(int[] labels, int node) {
        int label = labels[node];
        int smallest = node;
        for (int other : neighbours[node]) {
            labels[other] = Math.subtractExact(labels[other], Math.multiplyExact(label, cartan[node][other]));
            smallest = Math.min(smallest, other);
        }
        labels[node] = Math.negateExact(label);
        return smallest;
    }

    /** The nodes joined to a node of the Dynkin diagram; not to be changed. */
    int[] neighboursOf(int node) {
        return neighbours[node];
    }

    /** The squared length of a simple root in units of a short root's: 1 for the short ones, the lacing for long ones. */
    int simpleRootLength(int node) {
        int rank = algebra.rank();
        boolean shortRoot = switch (algebra.series()) {
            case A, D, E -> true;
            case B -> node == rank - 1;
            case C -> node < rank - 1;
            case F -> node >= 2;
            case G -> node == 0;
        };
        return shortRoot ? 1 : algebra.lacing();
    }

    /** The squared length of a root in the same units. */
    int length(Root root) {
        int total = 0;
        for (int i = 0; i < algebra.rank(); i++) {
            total += root.coefficient(i) * root.label(i) * simpleRootLength(i);
        }
        return total / 2;
    }

    /** The invariant form on two fundamental weights, times {@link #formDenominator}. */
    public long form(int i, int j) {
        return form[i][j];
    }

    public long formDenominator() {
        return formDenominator;
    }

    /** The invariant form on two weights, times {@link #formDenominator}. */
    long form(long[] left, long[] right) {
        long total = 0;
        for (int i = 0; i < left.length; i++) {
            if (left[i] == 0) {
                continue;
            }
            long row = 0;
            for (int j = 0; j < right.length; j++) {
                row = Math.addExact(row, Math.multiplyExact(form[i][j], right[j]));
            }
            total = Math.addExact(total, Math.multiplyExact(left[i], row));
        }
        return total;
    }

    /** The highest weight of the adjoint representation. */
    public DominantWeight highestRoot() {
        Root highest = positiveRoots().get(positiveRoots().size() - 1);
        int[] labels = new int[algebra.rank()];
        for (int i = 0; i < labels.length; i++) {
            labels[i] = highest.label(i);
        }
        return DominantWeight.of(labels);
    }

    /** By height, the highest root last. */
    synchronized List<Root> positiveRoots() {
        if (positiveRoots == null) {
            positiveRoots = List.copyOf(findPositiveRoots());
        }
        return positiveRoots;
    }

    /** The number of elements of the Weyl group. */
    public synchronized BigInteger weylGroupOrder() {
        if (weylGroupOrder == null) {
            weylGroupOrder = WeylGroup.order(this, node -> true);
        }
        return weylGroupOrder;
    }

    /** The stabiliser of a dominant weight in the Weyl group; the most recently used are kept. */
    Parabolic parabolic(DominantWeight weight) {
        BitSet zeros = new BitSet();
        for (int node = 0; node < rank(); node++) {
            if (weight.label(node) == 0) {
                zeros.set(node);
            }
        }
        synchronized (parabolics) {
            return parabolics.computeIfAbsent(zeros, nodes -> new Parabolic(this, nodes));
        }
    }

    private List<Root> findPositiveRoots() {
        int rank = algebra.rank();
        Set<Root> layer = new LinkedHashSet<>();
        for (int i = 0; i < rank; i++) {
            byte[] labels = new byte[rank];
            for (int j = 0; j < rank; j++) {
                labels[j] = (byte) cartan[i][j];
            }
            byte[] coefficients = new byte[rank];
            coefficients[i] = 1;
            layer.add(new Root(coefficients, labels));
        }
        Set<Root> found = new LinkedHashSet<>();
        while (!layer.isEmpty()) {
            found.addAll(layer);
            Set<Root> next = new LinkedHashSet<>();
            for (Root root : layer) {
                for (int node = 0; node < rank; node++) {
                    if (stringContinues(root, node, found)) {
                        next.add(root.plus(node, 1, cartan[node]));
                    }
                }
            }
            layer = next;
        }
        return new ArrayList<>(found);
    }

    /** Whether root + simple root is a root: the string through it reaches p down and p - label up. */
    private boolean stringContinues(Root root, int node, Set<Root> lower) {
        int label = root.label(node);
        if (label < 0) {
            return true;
        }
        if (algebra.lacing() == 1) {
            return false;
        }
        int down = 0;
        while (lower.contains(root.plus(node, -down - 1, cartan[node]))) {
            down++;
        }
        return down > label;
    }
}
