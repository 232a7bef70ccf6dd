package irreproof.engine.lie;

import irreproof.engine.Decomposition;
import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;

/**
 * Counts of weights, looked up by their labels without making objects: a hash table with open addressing whose keys lie
 * in one array. For the inner loops of characters and products. Not safe for threads; the labels are copied.
 */
final class WeightTable {
    private final int rank;
    private int[] labels;
    private long[] counts;
    private boolean[] taken;
    private int size;

    WeightTable(int rank) {
        this.rank = rank;
        allocate(16);
    }

    private void allocate(int slots) {
        labels = new int[Math.multiplyExact(slots, rank)];
        counts = new long[slots];
        taken = new boolean[slots];
    }

    /**
     * Adds to the count of a weight.
     *
     * @throws ArithmeticException if the count overflows
     */
    void add(int[] weight, long count) {
        int slot = slot(weight);
        if (!taken[slot]) {
            System.arraycopy(weight, 0, labels, slot * rank, rank);
            taken[slot] = true;
            counts[slot] = count;
            size++;
            if (2 * size > taken.length) {
                grow();
            }
        } else {
            counts[slot] = Math.addExact(counts[slot], count);
        }
    }

    /** The count of a weight, 0 if none was added. */
    long count(int[] weight) {
        return counts[slot(weight)];
    }

    private void grow() {
        int[] oldLabels = labels;
        long[] oldCounts = counts;
        boolean[] oldTaken = taken;
        allocate(2 * oldTaken.length);
        int[] weight = new int[rank];
        for (int old = 0; old < oldTaken.length; old++) {
            if (oldTaken[old]) {
                System.arraycopy(oldLabels, old * rank, weight, 0, rank);
                int slot = slot(weight);
                System.arraycopy(weight, 0, labels, slot * rank, rank);
                taken[slot] = true;
                counts[slot] = oldCounts[old];
            }
        }
    }

    /** Where a weight stands, or would stand. */
    private int slot(int[] weight) {
        int hash = 0;
        for (int label : weight) {
            hash = 31 * hash + label;
        }
        hash *= 0x9E3779B9;
        int mask = taken.length - 1;
        int slot = (hash >>> 16 ^ hash) & mask;
        while (taken[slot] && !equals(weight, slot * rank)) {
            slot = (slot + 1) & mask;
        }
        return slot;
    }

    private boolean equals(int[] weight, int from) {
        for (int node = 0; node < weight.length; node++) {
            if (labels[from + node] != weight[node]) {
                return false;
            }
        }
        return true;
    }

    /** The sum of irreps whose highest weights these are, each label changed by the same amount. */
    Decomposition<DominantWeight> toDecomposition(int change) {
        Map<DominantWeight, Long> terms = new HashMap<>();
        for (int slot = 0; slot < taken.length; slot++) {
            if (counts[slot] != 0) {
                int[] weight = Arrays.copyOfRange(labels, slot * rank, (slot + 1) * rank);
                for (int node = 0; node < rank; node++) {
                    weight[node] += change;
                }
                terms.put(DominantWeight.of(weight), counts[slot]);
            }
        }
        return Decomposition.of(terms);
    }
}
