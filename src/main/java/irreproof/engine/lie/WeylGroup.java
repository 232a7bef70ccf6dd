package irreproof.engine.lie;

import java.math.BigInteger;
import java.util.ArrayDeque;
import java.util.ArrayList;
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
        int strongest = 1;
        boolean strongestAtAnEnd = false;
        int shortArms = 0;
        int ends = 0;
        for (int node : component) {
            int bond = bond(system, component, node);
            strongest = Math.max(strongest, bond);
            if (degree(system, component, node) <= 1) {
                ends++;
                strongestAtAnEnd |= bond == 2;
                shortArms += isShortArm(system, component, node) ? 1 : 0;
            }
        }
        if (strongest == 3) {
            return BigInteger.valueOf(12);
        }
        if (strongest == 2) {
            return strongestAtAnEnd ? factorial(rank).shiftLeft(rank) : BigInteger.valueOf(1152);
        }
        if (ends < 3) {
            return factorial(rank + 1);
        }
        return shortArms >= 2 ? factorial(rank).shiftLeft(rank - 1) : exceptional(rank);
    }

    private static int degree(RootSystem system, List<Integer> component, int node) {
        int degree = 0;
        for (int other : system.neighboursOf(node)) {
            degree += component.contains(other) ? 1 : 0;
        }
        return degree;
    }

    /** The strongest bond at a node within the component: 1, 2 or 3 lines. */
    private static int bond(RootSystem system, List<Integer> component, int node) {
        int bond = 1;
        for (int other : system.neighboursOf(node)) {
            if (component.contains(other)) {
                bond = Math.max(bond, system.cartan(node, other) * system.cartan(other, node));
            }
        }
        return bond;
    }

    /** Whether an end is joined to the branching node: so are two or three ends of D_n, and one of E_n. */
    private static boolean isShortArm(RootSystem system, List<Integer> component, int end) {
        for (int other : system.neighboursOf(end)) {
            if (component.contains(other) && degree(system, component, other) == 3) {
                return true;
            }
        }
        return false;
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
