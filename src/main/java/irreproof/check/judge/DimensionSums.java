package irreproof.check.judge;

import irreproof.check.judge.Interpretation.Numbers;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Conjugate;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.Dots;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Multiple;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Part;
import irreproof.notation.Expression.Power;
import irreproof.notation.Expression.Product;
import irreproof.notation.Expression.Sum;
import java.math.BigInteger;
import java.util.Optional;

/**
 * The dimensions of the sides of a statement whose group is not known: names of dimensions add and multiply by
 * themselves. Empty where a name is not a number or a size depends on the group.
 */
public final class DimensionSums {
    private static final int LARGEST_EXPONENT = 64;

    private DimensionSums() {}

    /** The dimension of a side, or empty. */
    public static Optional<BigInteger> of(Expression expression, Numbers numbers) {
        if (expression instanceof NumberName name) {
            return ofNumber(name, numbers);
        }
        if (expression instanceof Sum sum) {
            return fold(sum.terms(), numbers, BigInteger.ZERO, BigInteger::add);
        }
        if (expression instanceof Product product) {
            return fold(product.factors(), numbers, BigInteger.ONE, BigInteger::multiply);
        }
        if (expression instanceof Multiple multiple) {
            return of(multiple.body(), numbers).map(multiple.count()::multiply);
        }
        if (expression instanceof Conjugate conjugate) {
            return of(conjugate.body(), numbers);
        }
        if (expression instanceof Power power) {
            return of(power.base(), numbers).flatMap(base -> ofPower(base, power));
        }
        if (expression instanceof Part
                || expression instanceof Dots
                || expression instanceof ListName
                || expression instanceof DiagramName) {
            return Optional.empty();
        }
        throw new AssertionError(expression);
    }

    private static Optional<BigInteger> ofNumber(NumberName name, Numbers numbers) {
        boolean half = name.denominator() == 2;
        return switch (numbers) {
            case DIMENSION -> half || name.numerator().signum() <= 0 ? Optional.empty() : Optional.of(name.numerator());
            case SPIN ->
                Optional.of(half ? name.numerator() : name.numerator().shiftLeft(1))
                        .map(BigInteger.ONE::add);
        };
    }

    private static Optional<BigInteger> fold(
            Iterable<Expression> parts,
            Numbers numbers,
            BigInteger start,
            java.util.function.BinaryOperator<BigInteger> join) {
        BigInteger total = start;
        for (Expression part : parts) {
            Optional<BigInteger> value = of(part, numbers);
            if (value.isEmpty()) {
                return Optional.empty();
            }
            total = join.apply(total, value.get());
        }
        return Optional.of(total);
    }

    private static Optional<BigInteger> ofPower(BigInteger base, Power power) {
        int exponent = power.exponent();
        if (exponent > LARGEST_EXPONENT) {
            return Optional.empty();
        }
        return Optional.of(
                switch (power.kind()) {
                    case TENSOR -> base.pow(exponent);
                    case SYMMETRIC -> binomial(base.add(BigInteger.valueOf(exponent - 1L)), exponent);
                    case EXTERIOR -> binomial(base, exponent);
                });
    }

    private static BigInteger binomial(BigInteger top, int bottom) {
        BigInteger result = BigInteger.ONE;
        for (int i = 0; i < bottom; i++) {
            result = result.multiply(top.subtract(BigInteger.valueOf(i))).divide(BigInteger.valueOf(i + 1L));
        }
        return result;
    }
}
