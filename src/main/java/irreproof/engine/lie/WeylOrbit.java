package irreproof.engine.lie;

import irreproof.budget.Budget;
import java.math.BigInteger;
import java.util.Arrays;
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
        return system.parabolic(weight).orbitSize();
    }

    /**
     * Hands every weight of the orbit to the visitor, the dominant one first; the visitor must not change or keep the
     * labels.
     */
    public static void forEach(RootSystem system, DominantWeight weight, Budget budget, Consumer<int[]> visitor) {
        budget.require(size(system, weight), "the Weyl orbit of " + weight);
        int[][] open = new int[16][];
        open[0] = weight.labels();
        int waiting = 1;
        int[] labels = new int[system.rank()];
        while (waiting > 0) {
            budget.spend(1);
            // taken off by exchange: the array that was done with is kept there for a later child
            int[] next = open[--waiting];
            open[waiting] = labels;
            labels = next;
            visitor.accept(labels);
            int lowest = firstNegative(labels);
            for (int node = 0; node < labels.length; node++) {
                // beyond the smallest negative node only its neighbours can make it positive
                if (labels[node] > 0 && (node < lowest || system.cartan(node, lowest) != 0)) {
                    if (waiting == open.length) {
                        open = Arrays.copyOf(open, 2 * waiting);
                    }
                    int[] child = open[waiting] == null ? new int[labels.length] : open[waiting];
                    System.arraycopy(labels, 0, child, 0, labels.length);
                    system.reflect(child, node);
                    open[waiting] = child;
                    waiting += firstNegative(child) == node ? 1 : 0;
                }
            }
        }
    }

    /** The number of labels if none is negative. */
    private static int firstNegative(int[] labels) {
        int node = 0;
        while (node < labels.length && labels[node] >= 0) {
            node++;
        }
        return node;
    }
}
