package irreproof.engine.lie;

import java.math.BigInteger;
import java.util.Random;

/** Random irreps of bounded dimension, reproducible from a seed that the test prints. */
final class RandomIrreps {
    private final Random random;

    RandomIrreps(long seed, String test) {
        this.random = new Random(seed);
        System.out.println(test + ": seed " + seed);
    }

    int below(int bound) {
        return random.nextInt(bound);
    }

    /** Labels are raised at random nodes until the next step would exceed the dimension, or chance ends it. */
    DominantWeight next(SimpleAlgebra algebra, long largestDimension) {
        BigInteger limit = BigInteger.valueOf(largestDimension);
        int[] labels = new int[algebra.rank()];
        int misses = 0;
        while (misses < 4 && random.nextInt(12) > 0) {
            int node = random.nextInt(labels.length);
            labels[node]++;
            if (WeylDimension.dimension(algebra, DominantWeight.of(labels)).compareTo(limit) > 0) {
                labels[node]--;
                misses++;
            }
        }
        return DominantWeight.of(labels);
    }
}
