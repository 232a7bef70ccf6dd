package irreproof.engine.lie;

import java.math.BigInteger;
import java.util.HashMap;
import java.util.Map;

/**
 * A product of many small fractions that is known to be an integer. Few factors are multiplied in machine words while
 * they fit; of many, equal ones above and below are first struck out, which leaves little of a spinor's dimension, and
 * the rest is multiplied in balanced pairs.
 */
final class FactorQuotient {
    private final Product numerator = new Product();
    private final Product denominator = new Product();
    private final Map<Long, Integer> exponents;

    /** @param many whether thousands of factors are to be expected */
    FactorQuotient(boolean many) {
        this.exponents = many ? new HashMap<>() : null;
    }

    void factor(long above, long below) {
        if (exponents == null) {
            numerator.multiply(above);
            denominator.multiply(below);
        } else {
            exponents.merge(above, 1, Integer::sum);
            exponents.merge(below, -1, Integer::sum);
        }
    }

    BigInteger value() {
        if (exponents != null) {
            return remaining(1).divide(remaining(-1));
        }
        if (numerator.fits() && denominator.fits()) {
            return BigInteger.valueOf(numerator.small / denominator.small);
        }
        return numerator.value().divide(denominator.value());
    }

    private BigInteger remaining(int sign) {
        BigInteger[] powers = exponents.entrySet().stream()
                .filter(entry -> sign * entry.getValue() > 0)
                .map(entry -> BigInteger.valueOf(entry.getKey()).pow(sign * entry.getValue()))
                .toArray(BigInteger[]::new);
        return product(powers, 0, powers.length);
    }

    private static BigInteger product(BigInteger[] factors, int from, int to) {
        if (to - from <= 1) {
            return to == from ? BigInteger.ONE : factors[from];
        }
        int middle = (from + to) >>> 1;
        return product(factors, from, middle).multiply(product(factors, middle, to));
    }

    private static final class Product {
        private long small = 1;
        private BigInteger large = BigInteger.ONE;

        void multiply(long factor) {
            long low = small * factor;
            if (Math.multiplyHigh(small, factor) != low >> 63) {
                large = large.multiply(BigInteger.valueOf(small));
                small = factor;
            } else {
                small = low;
            }
        }

        boolean fits() {
            return large == BigInteger.ONE;
        }

        BigInteger value() {
            return large.multiply(BigInteger.valueOf(small));
        }
    }
}
