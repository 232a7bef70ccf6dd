package irreproof.engine.lie;

import irreproof.budget.Budget;
import irreproof.engine.Partition;
import java.math.BigInteger;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.TreeMap;

/**
 * The dominant weights of an irrep with their multiplicities, by Freudenthal's recursion over dominant weights, its sum
 * over roots shortened to one root per orbit of the weight's stabiliser (Moody and Patera, Bull. AMS 7, 1982, 237). The
 * dominant weights are reached from the highest by subtracting positive roots within the chamber (Stembridge, The
 * partial order of dominant weights, 1998).
 *
 * <p>Cost: per dominant weight one step for each positive root and each weight looked up. Multiplicities that do not fit
 * 64 bits, or whose sums do not, throw {@link ArithmeticException}. Rank limit as in {@link RootSystem}.
 */
public final class DominantCharacter {
    /** Smaller diagrams dominate a few thousand at most. */
    private static final int FEWEST_BOXES = 30;

    private final RootSystem system;
    private final DominantWeight highest;
    private final Budget budget;
    private final Map<DominantWeight, Long> multiplicities = new LinkedHashMap<>();
    /** The same, for the inner loop. */
    private final WeightTable table;

    private DominantCharacter(RootSystem system, DominantWeight highest, Budget budget) {
        this.system = system;
        this.highest = highest;
        this.budget = budget;
        this.table = new WeightTable(system.rank());
    }

    /** Dominant weights to multiplicities, the highest weight first, lower ones after all above them; unmodifiable. */
    public static Map<DominantWeight, Long> of(SimpleAlgebra algebra, DominantWeight highest, Budget budget) {
        algebra.requireWeight(highest);
        RootSystem system = RootSystem.of(algebra);
        budget.require(leastSteps(algebra, highest), "the character of " + highest);
        DominantCharacter character = new DominantCharacter(system, highest, budget);
        character.descend();
        return Collections.unmodifiableMap(character.multiplicities);
    }

    /** A lower bound on the dominant weights, times the roots. */
    private static BigInteger leastSteps(SimpleAlgebra algebra, DominantWeight highest) {
        // subtracting each simple root up to half its label stays dominant
        BigInteger weights = BigInteger.ONE;
        for (int node = 0; node < highest.rank(); node++) {
            weights = weights.multiply(BigInteger.valueOf(1 + highest.label(node) / 2));
        }
        weights = weights.max(BigInteger.valueOf(dominatedDiagrams(algebra, highest)));
        return weights.multiply(BigInteger.valueOf((algebra.dimension() - algebra.rank()) / 2));
    }

    /** Of the classical algebras, the weights that differ by roots e_i - e_j; 1 where too few or too many to count. */
    private static long dominatedDiagrams(SimpleAlgebra algebra, DominantWeight highest) {
        return switch (algebra.series()) {
            case A, B, C, D -> {
                long[] coordinates = OrthogonalCoordinates.of(algebra, highest, 0);
                int[] rows = new int[coordinates.length];
                long boxes = 0;
                for (int i = 0; i < rows.length; i++) {
                    // a spinor's halves, and the sign in D_n, are the same for all these weights
                    rows[i] = (int) Math.min(Integer.MAX_VALUE, Math.abs(coordinates[i]) / 2);
                    boxes += rows[i];
                }
                boolean counted = boxes >= FEWEST_BOXES && boxes <= DominatedDiagrams.MOST_BOXES;
                yield counted ? DominatedDiagrams.count(Partition.of(rows), rows.length) : 1;
            }
            case E, F, G -> 1;
        };
    }

    /** @param depth the highest weight minus this one, over the simple roots */
    private record Weight(DominantWeight labels, int[] depth) {}

    private void descend() {
        TreeMap<Integer, Map<DominantWeight, Weight>> layers = new TreeMap<>();
        layers.put(0, Map.of(highest, new Weight(highest, new int[system.rank()])));
        while (!layers.isEmpty()) {
            var layer = layers.pollFirstEntry();
            for (Weight weight : layer.getValue().values()) {
                budget.spend(system.positiveRoots().size());
                long multiplicity = layer.getKey() == 0 ? 1L : multiplicity(weight);
                multiplicities.put(weight.labels, multiplicity);
                table.add(weight.labels.labels(), multiplicity);
                for (Root root : system.positiveRoots()) {
                    if (staysDominant(weight.labels, root)) {
                        Weight lower = minus(weight, root);
                        layers.computeIfAbsent(layer.getKey() + root.height(), height -> new LinkedHashMap<>())
                                .putIfAbsent(lower.labels, lower);
                    }
                }
            }
        }
    }

    private boolean staysDominant(DominantWeight weight, Root root) {
        for (int node = 0; node < system.rank(); node++) {
            if (weight.label(node) < root.label(node)) {
                return false;
            }
        }
        return true;
    }

    private Weight minus(Weight weight, Root root) {
        int[] labels = weight.labels.labels();
        int[] depth = weight.depth.clone();
        for (int node = 0; node < labels.length; node++) {
            labels[node] = Math.subtractExact(labels[node], root.label(node));
            depth[node] = Math.addExact(depth[node], root.coefficient(node));
        }
        return new Weight(DominantWeight.of(labels), depth);
    }

    /** All lengths here are in units in which a short root has the squared length 1, and doubled. */
    private long multiplicity(Weight weight) {
        long gap = 0;
        for (int node = 0; node < system.rank(); node++) {
            long labels = 2L + highest.label(node) + weight.labels.label(node);
            long term = Math.multiplyExact(labels, (long) weight.depth[node] * system.simpleRootLength(node));
            gap = Math.addExact(gap, term);
        }
        long sum = 0;
        for (RootOrbits.Orbit orbit : system.parabolic(weight.labels).rootOrbits()) {
            sum = Math.addExact(
                    sum, Math.multiplyExact(2L * orbit.count(), above(weight.labels, orbit.representative())));
        }
        if (sum % gap != 0) {
            throw new IllegalStateException(
                    "Freudenthal's sum for " + weight.labels + " in " + highest + " leaves a rest");
        }
        return sum / gap;
    }

    /** The sum over the weights above along a root, of multiplicity times the form with the root. */
    private long above(DominantWeight weight, Root root) {
        int[] labels = weight.labels();
        long form = 0;
        for (int node = 0; node < labels.length; node++) {
            form += (long) root.coefficient(node) * labels[node] * system.simpleRootLength(node);
        }
        long length = 2L * system.length(root);
        long sum = 0;
        int[] dominant = new int[labels.length];
        while (true) {
            budget.spend(1);
            for (int node = 0; node < labels.length; node++) {
                labels[node] = Math.addExact(labels[node], root.label(node));
                dominant[node] = labels[node];
            }
            form += length;
            ChamberReflection.toDominant(system, dominant);
            long multiplicity = table.count(dominant);
            if (multiplicity == 0) {
                return sum;
            }
            sum = Math.addExact(sum, Math.multiplyExact(multiplicity, form));
        }
    }
}
