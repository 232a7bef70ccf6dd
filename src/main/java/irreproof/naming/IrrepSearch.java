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
 * formula grows or stays), so the largest label at a node that keeps within the bound is found by bisection, and smaller
 * ones are tried one by one, node after node; at the last node only the largest can fit. A label plus 1 is itself a
 * factor of Weyl's numerator, whose denominator has no prime from the Coxeter number on; so most labels are dismissed by
 * a division. Nodes whose fundamental irrep is already too large take no part; those with small fundamental irreps come
 * last, where most labels are skipped.
 *
 * <p>Cost: at most one dimension for each dominant weight below the bound that has label 0 at the last node, times the
 * logarithm of that label. Labels beyond 2^30 are refused.
 */
final class IrrepSearch {
    private static final int LARGEST_LABEL = 1 << 30;

    private final SimpleAlgebra algebra;
    private final BigInteger bound;
    private final Budget budget;
    private final long stepsPerDimension;
    private final int[] labels;
    private final int[] nodes;
    private final int[] denominatorPrimes;
    private final List<DominantWeight> found = new ArrayList<>();
    private long steps;

    private IrrepSearch(SimpleAlgebra algebra, BigInteger bound, Budget budget) {
        this.algebra = algebra;
        this.bound = bound;
        this.budget = budget;
        this.stepsPerDimension = 1 + (long) algebra.rank() * algebra.rank();
        this.labels = new int[algebra.rank()];
        this.nodes = smallFundamentals();
        this.denominatorPrimes = primesBelow(coxeterNumber(algebra));
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

    /** The nodes whose fundamental irreps keep within the bound, those with the smallest ones last. */
    private int[] smallFundamentals() {
        record Node(int index, BigInteger dimension) {}
        List<Node> nodes = new ArrayList<>();
        int rank = algebra.rank();
        int first = 0;
        int last = rank - 1;
        // along a classical diagram the fundamental dimensions rise, then fall: the large ones lie in the middle
        boolean classical = switch (algebra.series()) {
            case A, B, C, D -> true;
            case E, F, G -> false;
        };
        for (; first < rank; first++) {
            BigInteger dimension = fundamental(first);
            if (dimension.compareTo(bound) <= 0) {
                nodes.add(new Node(first, dimension));
            } else if (classical) {
                break;
            }
        }
        for (; last > first; last--) {
            BigInteger dimension = fundamental(last);
            if (dimension.compareTo(bound) > 0) {
                break;
            }
            nodes.add(new Node(last, dimension));
        }
        return nodes.stream()
                .sorted(Comparator.comparing(Node::dimension).reversed())
                .mapToInt(Node::index)
                .toArray();
    }

    private BigInteger fundamental(int node) {
        labels[node] = 1;
        BigInteger dimension = dimension();
        labels[node] = 0;
        return dimension;
    }

    /** One more than the height of the highest root, and of the highest coroot (Bourbaki, plates, item II). */
    private static int coxeterNumber(SimpleAlgebra algebra) {
        int rank = algebra.rank();
        return switch (algebra.series()) {
            case A -> rank + 1;
            case B, C -> 2 * rank;
            case D -> 2 * rank - 2;
            case E -> rank == 6 ? 12 : rank == 7 ? 18 : 30;
            case F -> 12;
            case G -> 6;
        };
    }

    private static int[] primesBelow(int limit) {
        return IntStream.range(2, limit)
                .filter(number -> IntStream.range(2, number).noneMatch(divisor -> number % divisor == 0))
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
        int most = largestWithin(node);
        if (position == nodes.length - 1) {
            labels[node] = most;
            if (dimension().equals(bound)) {
                found.add(DominantWeight.of(labels));
            }
        } else {
            steps = Math.addExact(steps, most);
            budget.spend(most);
            for (int label = 0; label <= most; label++) {
                if (canBeFactor(label + 1)) {
                    labels[node] = label;
                    findExactly(position + 1);
                }
            }
        }
        labels[node] = 0;
    }

    /** Whether the number, freed from all primes that Weyl's denominator can hold, divides the dimension. */
    private boolean canBeFactor(int number) {
        int free = number;
        for (int prime : denominatorPrimes) {
            while (free % prime == 0) {
                free /= prime;
            }
        }
        return free == 1 || bound.mod(BigInteger.valueOf(free)).signum() == 0;
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
