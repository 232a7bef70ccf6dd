package irreproof.engine.lie;

import irreproof.budget.Budget;
import java.math.BigInteger;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.function.Consumer;

/**
 * The Weyl group orbit of a dominant weight, walked as a tree without a table of weights seen: the parent of a weight is
 * its reflection at its smallest negative node, so every weight but the dominant one has exactly one parent (Snow,
 * Weyl group orbits, ACM Trans. Math. Software 16, 1990; from memory). One step per weight; time rank squared each.
 */
public final class WeylOrbit {
    private WeylOrbit() {}

    /** The number of weights, without enumerating them: the group's order over the stabiliser's. */
    public static BigInteger size(RootSystem system, DominantWeight weight) {
        system.algebra().requireWeight(weight);
        return system.weylGroupOrder().divide(WeylGroup.order(system, node -> weight.label(node) == 0));
    }

    /**
     * Hands every weight of the orbit to the visitor, the dominant one first; the visitor must not change or keep the
     * labels.
     */
    public static void forEach(RootSystem system, DominantWeight weight, Budget budget, Consumer<int[]> visitor) {
        budget.require(size(system, weight), "the Weyl orbit of " + weight);
        Deque<int[]> open = new ArrayDeque<>();
        open.push(weight.labels());
        while (!open.isEmpty()) {
            budget.spend(1);
            int[] labels = open.pop();
            visitor.accept(labels);
            for (int node = 0; node < labels.length; node++) {
                if (labels[node] > 0) {
                    int[] child = labels.clone();
                    system.reflect(child, node);
                    if (firstNegative(child) == node) {
                        open.push(child);
                    }
                }
            }
        }
    }

    private static int firstNegative(int[] labels) {
        int node = 0;
        while (labels[node] >= 0) {
            node++;
        }
        return node;
    }
}
