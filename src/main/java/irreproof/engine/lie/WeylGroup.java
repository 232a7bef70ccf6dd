package irreproof.engine.lie;

import java.math.BigInteger;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.Deque;
import java.util.List;
import java.util.function.IntPredicate;

/**
 * Orders of the Weyl groups of a Dynkin diagram and its subdiagrams, by recognising each connected component and
 * multiplying the known orders (Bourbaki, Lie IV-VI, plates I-IX). Linear in the rank, up to the factorials.
 */
final class WeylGroup {
    private WeylGroup() {}

    /** The order of the subgroup that the simple reflections at the given nodes generate. */
    static BigInteger order(RootSystem system, IntPredicate nodes) {
        BitSet left = new BitSet();
        for (int node = 0; node < system.rank(); node++) {
            left.set(node, nodes.test(node));
        }
        BigInteger order = BigInteger.ONE;
        while (!left.isEmpty()) {
            order = order.multiply(componentOrder(system, takeComponent(system, left)));
        }
        return order;
    }

    private static List<Integer> takeComponent(RootSystem system, BitSet left) {
        List<Integer> component = new ArrayList<>();
        Deque<Integer> open = new ArrayDeque<>(List.of(left.nextSetBit(0)));
        left.clear(left.nextSetBit(0));
        while (!open.isEmpty()) {
            int node = open.pop();
            component.add(node);
            for (int other : system.neighboursOf(node)) {
                if (left.get(other)) {
                    left.clear(other);
                    open.push(other);
                }
            }
        }
        return component;
    }

    private static BigInteger componentOrder(RootSystem system, List<Integer> component) {
        int rank = component.size();
        int strongest = component.stream()
                .mapToInt(node -> bond(system, component, node))
                .max()
                .orElse(1);
        List<Integer> ends = component.stream()
                .filter(node -> inside(system, component, node).length <= 1)
                .toList();
        if (strongest == 3) {
            return BigInteger.valueOf(12);
        }
        if (strongest == 2) {
            boolean atAnEnd = ends.stream().anyMatch(node -> bond(system, component, node) == 2);
            return atAnEnd ? factorial(rank).shiftLeft(rank) : BigInteger.valueOf(1152);
        }
        if (ends.size() < 3) {
            return factorial(rank + 1);
        }
        // D_n has two or three arms of length one, E_n has one
        long shortArms = ends.stream()
                .map(node -> inside(system, component, node)[0])
                .filter(next -> inside(system, component, next).length == 3)
                .count();
        return shortArms >= 2 ? factorial(rank).shiftLeft(rank - 1) : exceptional(rank);
    }

    private static int[] inside(RootSystem system, List<Integer> component, int node) {
        return Arrays.stream(system.neighboursOf(node))
                .filter(component::contains)
                .toArray();
    }

    /** The strongest bond at a node within the component: 1, 2 or 3 lines. */
    private static int bond(RootSystem system, List<Integer> component, int node) {
        return Arrays.stream(inside(system, component, node))
                .map(other -> system.cartan(node, other) * system.cartan(other, node))
                .max()
                .orElse(1);
    }

    private static BigInteger exceptional(int rank) {
        return switch (rank) {
            case 6 -> BigInteger.valueOf(51_840);
            case 7 -> BigInteger.valueOf(2_903_040);
            case 8 -> BigInteger.valueOf(696_729_600);
            default -> throw new IllegalStateException("no branched diagram E" + rank);
        };
    }

    private static BigInteger factorial(int n) {
        BigInteger product = BigInteger.ONE;
        for (int i = 2; i <= n; i++) {
            product = product.multiply(BigInteger.valueOf(i));
        }
        return product;
    }
}
