package irreproof.naming;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.SimpleAlgebra;
import irreproof.engine.lie.WeylDimension;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/**
 * All irreps of one dimension, or up to one. The dimension grows strictly with every Dynkin label (each factor of Weyl's
 * formula grows or stays), so labels are raised one node after another until the bound is passed, and the last node is
 * found by bisection. Nodes whose fundamental irrep is already too large take no part; those with small fundamental
 * irreps come last, where most labels are skipped. Cost: one dimension for each dominant weight below the bound that has
 * label 0 at the last node, times the logarithm of that label; some 10^4 dimensions for 10^7 in SU(3), a few hundred in
 * SU(50). Labels beyond 2^30 are refused.
 */
final class IrrepSearch {
    private static final int LARGEST_LABEL = 1 << 30;

    private final SimpleAlgebra algebra;
    private final BigInteger bound;
    private final Budget budget;
    private final long stepsPerDimension;
    private final int[] labels;
    private final int[] nodes;
    private final List<DominantWeight> found = new ArrayList<>();
    private long steps;

    private IrrepSearch(SimpleAlgebra algebra, BigInteger bound, Budget budget) {
        this.algebra = algebra;
        this.bound = bound;
        this.budget = budget;
        this.stepsPerDimension = 1 + (long) algebra.rank() * algebra.rank();
        this.labels = new int[algebra.rank()];
        this.nodes = smallFundamentals();
    }

    /** What a search found, in the order of weights, and the steps it took. */
    record Result(List<DominantWeight> irreps, long steps) {}

    /** @throws BudgetExceeded if the budget ends first, or a label would pass 2^30 */
    static Result ofDimension(SimpleAlgebra algebra, BigInteger dimension, Budget budget) {
        IrrepSearch search = new IrrepSearch(algebra, dimension, budget);
        if (search.nodes.length == 0) {
            return new Result(
                    dimension.equals(BigInteger.ONE) ? List.of(DominantWeight.of(search.labels)) : List.of(),
                    search.steps);
        }
        search.findExactly(0);
        search.found.sort(Comparator.naturalOrder());
        return new Result(List.copyOf(search.found), search.steps);
    }

    /** All irreps of at most this dimension. */
    static List<DominantWeight> upToDimension(SimpleAlgebra algebra, BigInteger bound, Budget budget) {
        if (bound.signum() <= 0) {
            return List.of();
        }
        IrrepSearch search = new IrrepSearch(algebra, bound, budget);
        search.findAll(0);
        search.found.sort(Comparator.naturalOrder());
        return List.copyOf(search.found);
    }

    private int[] smallFundamentals() {
        record Node(int index, BigInteger dimension) {}
        return IntStream.range(0, algebra.rank())
                .mapToObj(node -> {
                    labels[node] = 1;
                    BigInteger dimension = dimension();
                    labels[node] = 0;
                    return new Node(node, dimension);
                })
                .filter(node -> node.dimension().compareTo(bound) <= 0)
                .sorted(Comparator.comparing(Node::dimension).reversed())
                .mapToInt(Node::index)
                .toArray();
    }

    private BigInteger dimension() {
        steps = Math.addExact(steps, stepsPerDimension);
        budget.spend(stepsPerDimension);
        return WeylDimension.dimension(algebra, DominantWeight.of(labels));
    }

    /** Labels at the nodes before this position are set; those from here on are 0. */
    private void findExactly(int position) {
        int node = nodes[position];
        if (position == nodes.length - 1) {
            labels[node] = largestWithin(node);
            if (dimension().equals(bound)) {
                found.add(DominantWeight.of(labels));
            }
        } else {
            while (dimension().compareTo(bound) <= 0) {
                findExactly(position + 1);
                labels[node]++;
            }
        }
        labels[node] = 0;
    }

    private void findAll(int position) {
        if (position == nodes.length) {
            found.add(DominantWeight.of(labels));
            return;
        }
        while (dimension().compareTo(bound) <= 0) {
            findAll(position + 1);
            labels[nodes[position]]++;
        }
        labels[nodes[position]] = 0;
    }

    /** The largest label at the node that keeps within the bound, by doubling, then halving; label 0 is known to. */
    private int largestWithin(int node) {
        int within = 0;
        int beyond = 1;
        while (isWithin(node, beyond)) {
            within = beyond;
            if (beyond >= LARGEST_LABEL) {
                throw new BudgetExceeded(
                        BudgetExceeded.Cause.TOO_LARGE, "the dimension " + bound + " is too large to search for");
            }
            beyond *= 2;
        }
        while (beyond - within > 1) {
            int middle = within + (beyond - within) / 2;
            if (isWithin(node, middle)) {
                within = middle;
            } else {
                beyond = middle;
            }
        }
        return within;
    }

    private boolean isWithin(int node, int label) {
        labels[node] = label;
        return dimension().compareTo(bound) <= 0;
    }
}
