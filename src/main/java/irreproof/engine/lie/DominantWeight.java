package irreproof.engine.lie;

import java.util.Arrays;

/**
 * A dominant integral weight by its Dynkin labels in Bourbaki order, all of them 0 or more; names the irrep with this
 * highest weight. Ordered by the sum of the labels, then lexicographically, larger labels first: (1,0) before (0,1).
 */
public final class DominantWeight implements Comparable<DominantWeight> {
    private final int[] labels;
    private final int hash;
    private final long sum;

    private DominantWeight(int[] labels) {
        this.labels = labels;
        this.hash = Arrays.hashCode(labels);
        long total = 0;
        for (int label : labels) {
            total += label;
        }
        this.sum = total;
    }

    /** @throws IllegalArgumentException if a label is negative */
    public static DominantWeight of(int... labels) {
        for (int label : labels) {
            if (label < 0) {
                throw new IllegalArgumentException("not dominant: " + Arrays.toString(labels));
            }
        }
        return new DominantWeight(labels.clone());
    }

    public int rank() {
        return labels.length;
    }

    /** The label at a node, counted from 0. */
    public int label(int node) {
        return labels[node];
    }

    /** A copy. */
    public int[] labels() {
        return labels.clone();
    }

    public boolean isZero() {
        return sum == 0;
    }

    @Override
    public int compareTo(DominantWeight other) {
        int bySum = Long.compare(sum, other.sum);
        return bySum != 0 ? bySum : Arrays.compare(other.labels, labels);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof DominantWeight that && Arrays.equals(labels, that.labels);
    }

    @Override
    public int hashCode() {
        return hash;
    }

    /** {@code (1,0,2)}. */
    @Override
    public String toString() {
        StringBuilder text = new StringBuilder("(");
        for (int i = 0; i < labels.length; i++) {
            text.append(i == 0 ? "" : ",").append(labels[i]);
        }
        return text.append(')').toString();
    }
}
