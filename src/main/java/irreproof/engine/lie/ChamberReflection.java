package irreproof.engine.lie;

/**
 * Moves a weight into the dominant chamber by simple reflections, at the smallest negative node each time (Humphreys,
 * Reflection Groups and Coxeter Groups, 1.12). At most as many reflections as there are positive roots.
 */
final class ChamberReflection {
    private ChamberReflection() {}

    /**
     * Replaces a weight by its dominant conjugate.
     *
     * @return 1 or -1, the determinant of the Weyl group element used
     */
    static int toDominant(RootSystem system, int[] labels) {
        int sign = 1;
        int node = 0;
        while (node < labels.length) {
            if (labels[node] < 0) {
                node = system.reflect(labels, node);
                sign = -sign;
            } else {
                node++;
            }
        }
        return sign;
    }

    /**
     * The same for a weight shifted by rho, where weights on a wall do not count.
     *
     * @return the determinant, or 0 if the weight lies on a reflecting hyperplane (its labels are then of no use)
     */
    static int toStrictlyDominant(RootSystem system, int[] labels) {
        int sign = 1;
        int node = 0;
        while (node < labels.length) {
            if (labels[node] < 0) {
                node = system.reflect(labels, node);
                sign = -sign;
            } else if (labels[node] == 0) {
                return 0;
            } else {
                node++;
            }
        }
        return sign;
    }
}
