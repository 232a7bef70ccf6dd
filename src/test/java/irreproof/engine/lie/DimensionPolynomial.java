package irreproof.engine.lie;

import irreproof.engine.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * Evaluates sums of dimension polynomials as the published tables write them, such as {@code 1 + 2*(N^2-1) + N^2(N-1)/4}:
 * a leading {@code k*} repeats a term, {@code conj} stands for the conjugate of the term before.
 */
final class DimensionPolynomial {
    private final String text;
    private final long n;
    private int at;

    private DimensionPolynomial(String text, long n) {
        this.text = text;
        this.n = n;
    }

    /** The dimensions of the terms, each as often as it occurs. */
    static List<BigInteger> terms(String sum, long n) {
        List<BigInteger> terms = new ArrayList<>();
        for (String term : sum.split(" \\+ ")) {
            if (term.startsWith("conj")) {
                terms.add(terms.get(terms.size() - 1));
                continue;
            }
            boolean repeated = term.matches("\\d+\\*.*");
            int times = repeated ? Integer.parseInt(term.substring(0, term.indexOf('*'))) : 1;
            String body = repeated ? term.substring(term.indexOf('*') + 1) : term;
            BigInteger value = new DimensionPolynomial(body, n).quotient().toIntegerExact();
            for (int i = 0; i < times; i++) {
                terms.add(value);
            }
        }
        terms.removeIf(value -> value.signum() == 0);
        return terms;
    }

    private Rational quotient() {
        Rational value = product();
        return take('/') ? value.dividedBy(Rational.of(number())) : value;
    }

    private Rational product() {
        Rational value = Rational.ONE;
        while (at < text.length() && (text.charAt(at) == '(' || Character.isLetterOrDigit(text.charAt(at)))) {
            value = value.times(power());
        }
        return value;
    }

    private Rational power() {
        Rational base;
        if (take('(')) {
            base = sum();
            take(')');
        } else {
            base = take('N') ? Rational.of(n) : Rational.of(number());
        }
        return take('^') ? base.times(raisedLess(base, number() - 1)) : base;
    }

    private static Rational raisedLess(Rational base, long exponent) {
        return exponent == 0 ? Rational.ONE : base.times(raisedLess(base, exponent - 1));
    }

    private Rational sum() {
        Rational value = quotient();
        while (at < text.length() && text.charAt(at) != ')') {
            value = take('+') ? value.plus(quotient()) : take('-') ? value.minus(quotient()) : value;
        }
        return value;
    }

    private long number() {
        int start = at;
        while (at < text.length() && Character.isDigit(text.charAt(at))) {
            at++;
        }
        return Long.parseLong(text.substring(start, at));
    }

    private boolean take(char wanted) {
        boolean found = at < text.length() && text.charAt(at) == wanted;
        at += found ? 1 : 0;
        return found;
    }
}
