package irreproof.engine;

import java.math.BigInteger;

/** An exact rational number in lowest terms with a positive denominator. */
public record Rational(BigInteger numerator, BigInteger denominator) implements Comparable<Rational> {
    public static final Rational ZERO = of(0);
    public static final Rational ONE = of(1);

    /** @throws ArithmeticException if the denominator is zero */
    public Rational {
        if (denominator.signum() == 0) {
            throw new ArithmeticException("zero denominator");
        }
        BigInteger divisor = numerator.gcd(denominator);
        if (denominator.signum() < 0) {
            divisor = divisor.negate();
        }
        numerator = numerator.divide(divisor);
        denominator = denominator.divide(divisor);
    }

    public static Rational of(long value) {
        return new Rational(BigInteger.valueOf(value), BigInteger.ONE);
    }

    public static Rational of(long numerator, long denominator) {
        return new Rational(BigInteger.valueOf(numerator), BigInteger.valueOf(denominator));
    }

    public static Rational of(BigInteger value) {
        return new Rational(value, BigInteger.ONE);
    }

    public Rational plus(Rational other) {
        return new Rational(
                numerator.multiply(other.denominator).add(other.numerator.multiply(denominator)),
                denominator.multiply(other.denominator));
    }

    public Rational negate() {
        return new Rational(numerator.negate(), denominator);
    }

    public Rational minus(Rational other) {
        return plus(other.negate());
    }

    public Rational times(Rational other) {
        return new Rational(numerator.multiply(other.numerator), denominator.multiply(other.denominator));
    }

    /** @throws ArithmeticException if the divisor is zero */
    public Rational dividedBy(Rational divisor) {
        return new Rational(numerator.multiply(divisor.denominator), denominator.multiply(divisor.numerator));
    }

    public boolean isInteger() {
        return denominator.equals(BigInteger.ONE);
    }

    public int signum() {
        return numerator.signum();
    }

    /** @throws ArithmeticException if this is not an integer */
    public BigInteger toIntegerExact() {
        if (!isInteger()) {
            throw new ArithmeticException(this + " is not an integer");
        }
        return numerator;
    }

    @Override
    public int compareTo(Rational other) {
        return numerator.multiply(other.denominator).compareTo(other.numerator.multiply(denominator));
    }

    /** {@code 4/3}, {@code -2}. */
    @Override
    public String toString() {
        return isInteger() ? numerator.toString() : numerator + "/" + denominator;
    }
}
