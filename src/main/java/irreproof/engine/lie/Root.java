package irreproof.engine.lie;

import java.util.Arrays;

/** A root: its coefficients over the simple roots, and its Dynkin labels. Small numbers, hence bytes. */
final class Root {
    private final byte[] coefficients;
    private final byte[] labels;

    Root(byte[] coefficients, byte[] labels) {
        this.coefficients = coefficients;
        this.labels = labels;
    }

    int coefficient(int node) {
        return coefficients[node];
    }

    int label(int node) {
        return labels[node];
    }

    int height() {
        int height = 0;
        for (byte coefficient : coefficients) {
            height += coefficient;
        }
        return height;
    }

    /** This root plus so many times a simple root, whose Dynkin labels are given. */
    Root plus(int node, int times, int[] simpleRootLabels) {
        byte[] newCoefficients = coefficients.clone();
        byte[] newLabels = labels.clone();
        newCoefficients[node] += (byte) times;
        for (int i = 0; i < newLabels.length; i++) {
            newLabels[i] += (byte) (times * simpleRootLabels[i]);
        }
        return new Root(newCoefficients, newLabels);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Root that && Arrays.equals(coefficients, that.coefficients);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(coefficients);
    }

    @Override
    public String toString() {
        return Arrays.toString(coefficients);
    }
}
