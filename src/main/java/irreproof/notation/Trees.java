package irreproof.notation;

import irreproof.notation.Expression.Conjugate;
import irreproof.notation.Expression.Decoration;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.Dots;
import irreproof.notation.Expression.Face;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Multiple;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Part;
import irreproof.notation.Expression.Power;
import irreproof.notation.Expression.Product;
import irreproof.notation.Expression.Sum;
import irreproof.text.Span;
import java.math.BigInteger;
import java.util.List;

/** Questions about trees. */
final class Trees {
    private Trees() {}

    /** Its parts, those of a list included. */
    static List<Expression> children(Expression tree) {
        return tree instanceof ListName list ? list.entries() : tree.parts();
    }

    /** True if the tree multiplies anywhere. */
    static boolean multiplies(Expression tree) {
        return tree instanceof Product
                || tree instanceof Power
                || tree instanceof Part
                || tree.parts().stream().anyMatch(Trees::multiplies);
    }

    /** A plain whole number without anything attached. */
    static boolean isCount(Expression tree) {
        return tree instanceof NumberName name
                && name.face() == Face.PLAIN
                && name.denominator() == 1
                && name.decoration().isEmpty();
    }

    static BigInteger count(Expression tree) {
        return ((NumberName) tree).numerator();
    }

    /** A name, or several copies of one, that says nothing yet of symmetry. */
    static boolean isUnmarkedName(Expression tree) {
        if (tree instanceof Multiple multiple) {
            return isUnmarkedName(multiple.body());
        }
        return tree instanceof Expression.Name name && name.decoration().symmetry() == null;
    }

    static Expression withSymmetry(Expression tree, Expression.Symmetry symmetry) {
        if (tree instanceof Multiple multiple) {
            return new Multiple(multiple.count(), withSymmetry(multiple.body(), symmetry), multiple.span());
        }
        Expression.Name name = (Expression.Name) tree;
        Decoration old = name.decoration();
        return Decorations.with(
                name,
                new Decoration(old.bars(), old.primes(), old.label(), symmetry, old.charges(), old.other()),
                name.span());
    }

    /** True if a number in front of this can only be a multiplicity: it holds a styled name, a list or a diagram. */
    static boolean cannotBeArithmetic(Expression tree) {
        if (tree instanceof ListName || tree instanceof DiagramName) {
            return true;
        }
        if (tree instanceof NumberName name) {
            return name.face() != Face.PLAIN;
        }
        return children(tree).stream().anyMatch(Trees::cannotBeArithmetic);
    }

    /** Outside lists a fraction is a spin, so it must have the denominator 2. */
    static void requireSpins(Expression tree) {
        if (tree instanceof NumberName name && name.denominator() > 2) {
            throw new UnreadableSide("a fraction that is no spin", name.span());
        }
        if (!(tree instanceof ListName)) {
            children(tree).forEach(Trees::requireSpins);
        }
    }

    /** The same tree at a wider place, when brackets around it were read. */
    static Expression at(Expression tree, Span span) {
        if (tree instanceof Sum sum) {
            return new Sum(sum.terms(), span);
        }
        if (tree instanceof Product product) {
            return new Product(product.factors(), span);
        }
        if (tree instanceof Multiple multiple) {
            return new Multiple(multiple.count(), multiple.body(), span);
        }
        if (tree instanceof Power power) {
            return new Power(power.base(), power.kind(), power.exponent(), span);
        }
        if (tree instanceof Part part) {
            return new Part(part.body(), part.symmetry(), span);
        }
        if (tree instanceof Conjugate conjugate) {
            return new Conjugate(conjugate.body(), span);
        }
        if (tree instanceof Dots) {
            return new Dots(span);
        }
        Expression.Name name = (Expression.Name) tree;
        return Decorations.with(name, name.decoration(), span);
    }
}
