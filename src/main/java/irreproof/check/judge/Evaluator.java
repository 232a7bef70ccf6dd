package irreproof.check.judge;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.RepresentationRing;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Conjugate;
import irreproof.notation.Expression.Dots;
import irreproof.notation.Expression.Multiple;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.Part;
import irreproof.notation.Expression.Power;
import irreproof.notation.Expression.PowerKind;
import irreproof.notation.Expression.Product;
import irreproof.notation.Expression.Sum;
import irreproof.notation.Expression.Symmetry;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * Computes what an expression decomposes into under one reading. Powers of sums by Sym(A+B) = sum of Sym(A) Sym(B) (and
 * the same for exterior powers), so that only powers of single irreps are asked of the engine.
 */
final class Evaluator<I extends Comparable<? super I>> {
    private static final int LARGEST_EXPONENT = 64;

    private final Lexicon<I> lexicon;
    private final RepresentationRing<I> ring;
    private final Reading<I> reading;
    private final Budget budget;

    Evaluator(Lexicon<I> lexicon, Reading<I> reading, Budget budget) {
        this.lexicon = lexicon;
        this.ring = lexicon.ring();
        this.reading = reading;
        this.budget = budget;
    }

    /** The listed terms of the side; dots at its top level count as nothing. */
    Decomposition<I> value(Expression expression) {
        if (expression instanceof Name name) {
            return name(name);
        }
        if (expression instanceof Sum sum) {
            Decomposition<I> total = Decomposition.zero();
            for (Expression term : sum.terms()) {
                total = total.plus(value(term));
            }
            return total;
        }
        if (expression instanceof Product product) {
            return product(product.factors());
        }
        if (expression instanceof Multiple multiple) {
            return value(multiple.body()).times(exactCount(multiple.count()));
        }
        if (expression instanceof Power power) {
            return power(power);
        }
        if (expression instanceof Part part) {
            return part(part);
        }
        if (expression instanceof Conjugate conjugate) {
            return conjugate(value(conjugate.body()));
        }
        if (expression instanceof Dots) {
            return Decomposition.zero();
        }
        throw new AssertionError(expression);
    }

    private Decomposition<I> name(Name name) {
        Decomposition<I> value = reading.meanings()
                .get(lexicon.key(name, reading.interpretation()))
                .value();
        return lexicon.isBarred(name) ? conjugate(value) : value;
    }

    private Decomposition<I> conjugate(Decomposition<I> value) {
        Decomposition<I> result = Decomposition.zero();
        for (var term : value.multiplicities().entrySet()) {
            result = result.plus(Decomposition.of(ring.conjugate(term.getKey())), term.getValue());
        }
        return result;
    }

    private Decomposition<I> product(List<Expression> factors) {
        Decomposition<I> result = value(factors.get(0));
        for (Expression factor : factors.subList(1, factors.size())) {
            result = ring.product(result, value(factor), budget);
        }
        return result;
    }

    private Decomposition<I> power(Power power) {
        if (power.exponent() > LARGEST_EXPONENT) {
            throw new Undecidable("the exponent " + power.exponent() + " is too large");
        }
        Decomposition<I> base = value(power.base());
        if (power.kind() == PowerKind.TENSOR) {
            Decomposition<I> result = Decomposition.of(ring.trivial());
            for (int i = 0; i < power.exponent(); i++) {
                result = ring.product(result, base, budget);
            }
            return result;
        }
        return symmetrised(summands(base), 0, power.kind(), power.exponent());
    }

    private Decomposition<I> part(Part part) {
        Expression body = part.body();
        if (!(body instanceof Product product) || product.factors().size() != 2) {
            throw new Undecidable("only a product of two factors has a symmetric and an antisymmetric part");
        }
        Decomposition<I> left = value(product.factors().get(0));
        if (!left.equals(value(product.factors().get(1)))) {
            throw new Undecidable("the symmetric part of a product of different factors has no meaning");
        }
        return square(left, part.symmetry());
    }

    /** The symmetric or antisymmetric part of the square of a sum. */
    Decomposition<I> square(Decomposition<I> base, Symmetry symmetry) {
        PowerKind kind = switch (symmetry) {
            case SYMMETRIC -> PowerKind.SYMMETRIC;
            case ANTISYMMETRIC -> PowerKind.EXTERIOR;
        };
        return symmetrised(summands(base), 0, kind, 2);
    }

    private List<I> summands(Decomposition<I> sum) {
        List<I> irreps = new ArrayList<>();
        sum.multiplicities().forEach((irrep, count) -> {
            budget.require(BigInteger.valueOf(count), "a power of a sum");
            for (long i = 0; i < count; i++) {
                irreps.add(irrep);
            }
        });
        return irreps;
    }

    private Decomposition<I> symmetrised(List<I> irreps, int from, PowerKind kind, int exponent) {
        if (exponent == 0) {
            return Decomposition.of(ring.trivial());
        }
        if (from == irreps.size()) {
            return Decomposition.zero();
        }
        Decomposition<I> result = Decomposition.zero();
        for (int taken = 0; taken <= exponent; taken++) {
            Decomposition<I> rest = symmetrised(irreps, from + 1, kind, exponent - taken);
            if (!rest.isZero()) {
                Decomposition<I> first = kind == PowerKind.SYMMETRIC
                        ? ring.symmetricPower(irreps.get(from), taken, budget)
                        : ring.exteriorPower(irreps.get(from), taken, budget);
                result = result.plus(ring.product(first, rest, budget));
            }
        }
        return result;
    }

    private static long exactCount(BigInteger count) {
        if (count.bitLength() > 62) {
            throw new Undecidable("the multiplicity " + count + " is too large");
        }
        return count.longValue();
    }
}
