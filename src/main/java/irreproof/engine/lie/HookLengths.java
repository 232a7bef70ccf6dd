package irreproof.engine.lie;

import irreproof.engine.Partition;
import java.math.BigInteger;

/**
 * What the hook lengths of Young diagrams tell. A diagram of n boxes has f = n! / (product of its hooks) standard fillings,
 * and the squares of all f add up to n!, so no f exceeds the square root (Macdonald, Symmetric Functions and Hall
 * Polynomials, I.5 example 2 and I.7.6). One step per box and row.
 */
final class HookLengths {
    private HookLengths() {}

    /** The product of the hook lengths. */
    static BigInteger product(Partition diagram) {
        BigInteger product = BigInteger.ONE;
        for (int row = 0; row < diagram.length(); row++) {
            int below = diagram.length() - 1;
            for (int column = 0; column < diagram.row(row); column++) {
                while (diagram.row(below) <= column) {
                    below--;
                }
                product = product.multiply(BigInteger.valueOf((long) diagram.row(row) - column + below - row));
            }
        }
        return product;
    }

    /**
     * A lower bound on the number of irreps in a product, counted with multiplicity, for as many rows as both diagrams
     * have together or more: the fillings of the terms add up to those of both factors times a binomial coefficient.
     */
    static BigInteger leastTerms(Partition left, Partition right) {
        BigInteger most = BigInteger.ONE;
        for (long i = 2; i <= left.size() + right.size(); i++) {
            most = most.multiply(BigInteger.valueOf(i));
        }
        // rounded down by less than 1 in most.sqrt(), hence below the true bound
        return most.sqrt().divide(product(left).multiply(product(right))).max(BigInteger.ONE);
    }
}
