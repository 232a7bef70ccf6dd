package irreproof.engine.lie;

import irreproof.budget.Budget;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/**
 * Prints how the time of a product grows with the number of different weights of its smaller factor, over four decades:
 * squares of ever larger irreps of three algebras, characters made anew. Beside it the
 * slope of the logarithms by least squares; 1 is linear.
 */
public final class CostGrowth {
    private static final int ROUNDS = 7;

    private record Point(SimpleAlgebra algebra, DominantWeight irrep, long weights, int terms, double micros) {}

    private CostGrowth() {}

    public static void main(String[] arguments) {
        // once to warm up
        points();
        List<Point> points = points();
        System.out.println("| algebra | irrep, squared | weights | irreps in the square | µs | ns per weight |");
        System.out.println("|---|---|---:|---:|---:|---:|");
        for (Point point : points) {
            System.out.printf(
                    Locale.ROOT,
                    "| %s | %s | %d | %d | %.0f | %.0f |%n",
                    point.algebra,
                    point.irrep,
                    point.weights,
                    point.terms,
                    point.micros,
                    1000 * point.micros / point.weights);
        }
        System.out.printf(Locale.ROOT, "%nSlope of log time over log weights: %.2f%n", slope(points));
    }

    private static List<Point> points() {
        List<Point> points = new ArrayList<>();
        for (int labels : new int[] {1, 2, 4, 8, 16, 32}) {
            points.add(measured(new SimpleAlgebra(Series.B, 2), DominantWeight.of(labels, 2 * labels)));
        }
        for (int labels : new int[] {1, 2, 3, 5, 8, 12, 18}) {
            points.add(measured(new SimpleAlgebra(Series.C, 3), DominantWeight.of(labels, labels / 2, labels / 3)));
        }
        for (int[] labels : new int[][] {
            {1, 0, 0, 0, 0},
            {0, 0, 0, 0, 1},
            {0, 1, 0, 0, 0},
            {0, 0, 0, 1, 1},
            {0, 1, 0, 0, 1},
            {0, 1, 0, 1, 1},
            {0, 2, 0, 1, 1},
            {1, 1, 1, 1, 1}
        }) {
            points.add(measured(new SimpleAlgebra(Series.D, 5), DominantWeight.of(labels)));
        }
        return points;
    }

    private static Point measured(SimpleAlgebra algebra, DominantWeight irrep) {
        RootSystem system = RootSystem.of(algebra);
        BigInteger weights = BigInteger.ZERO;
        for (DominantWeight weight :
                DominantCharacter.of(algebra, irrep, Budget.unlimited()).keySet()) {
            weights = weights.add(WeylOrbit.size(system, weight));
        }
        // short ones many times, so that each round takes some milliseconds
        int repeats = (int) Math.max(1, 20_000 / weights.longValueExact());
        double[] micros = new double[ROUNDS];
        int terms = 0;
        for (int round = -ROUNDS; round < ROUNDS; round++) {
            long start = System.nanoTime();
            for (int i = 0; i < repeats; i++) {
                terms = KlimykProduct.product(algebra, irrep, irrep, Budget.unlimited())
                        .multiplicities()
                        .size();
            }
            micros[Math.max(0, round)] = (System.nanoTime() - start) / 1000.0 / repeats;
        }
        Arrays.sort(micros);
        return new Point(algebra, irrep, weights.longValueExact(), terms, micros[ROUNDS / 2]);
    }

    private static double slope(List<Point> points) {
        double x = 0;
        double y = 0;
        double xx = 0;
        double xy = 0;
        for (Point point : points) {
            double logWeights = Math.log(point.weights);
            double logTime = Math.log(point.micros);
            x += logWeights;
            y += logTime;
            xx += logWeights * logWeights;
            xy += logWeights * logTime;
        }
        int n = points.size();
        return (n * xy - x * y) / (n * xx - x * x);
    }
}
