package irreproof.naming;

import java.math.BigInteger;

/**
 * The conventional dimension name of an irrep, such as {@code \overline{15}'} or {@code 8_v}.
 *
 * @param primes how many primes
 * @param suffix the subscript of SO(8)'s names ({@code v}, {@code s}, {@code c}, {@code vs}, ...), or empty
 */
public record IrrepLabel(BigInteger dimension, int primes, boolean barred, String suffix) {
    /** Plain text for logs and tests, a bar as a tilde in front: {@code ~15'}, {@code 8v}. */
    @Override
    public String toString() {
        return (barred ? "~" : "") + dimension + "'".repeat(primes) + suffix;
    }
}
