package irreproof.check.judge;

import irreproof.notation.Expression;
import irreproof.notation.Expression.Dots;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.Part;
import irreproof.notation.Expression.Power;
import irreproof.notation.Expression.Product;
import irreproof.notation.Expression.Sum;
import java.util.ArrayList;
import java.util.List;

/** Walks over expressions. */
public final class Names {
    private Names() {}

    /** Every name in the expression, left to right. */
    public static List<Name> of(Expression expression) {
        List<Name> names = new ArrayList<>();
        collect(expression, names);
        return names;
    }

    private static void collect(Expression expression, List<Name> names) {
        if (expression instanceof Name name) {
            names.add(name);
        }
        expression.parts().forEach(child -> collect(child, names));
    }

    /** True if the side leaves terms out at its top level: a sum with dots. */
    public static boolean isOpen(Expression side) {
        return side instanceof Dots
                || side instanceof Sum sum && sum.terms().stream().anyMatch(Dots.class::isInstance);
    }

    /** True if nothing is written but dots. */
    public static boolean isOnlyDots(Expression side) {
        return terms(side).stream().allMatch(Dots.class::isInstance);
    }

    /** True if dots stand anywhere below the top level, where they leave the meaning open. */
    public static boolean hasInnerDots(Expression side) {
        return side.parts().stream().anyMatch(child -> !(child instanceof Dots) && holdsDots(child))
                || side instanceof Product product && product.factors().stream().anyMatch(Dots.class::isInstance);
    }

    private static boolean holdsDots(Expression expression) {
        return expression instanceof Dots || expression.parts().stream().anyMatch(Names::holdsDots);
    }

    /** True if the expression multiplies: the side that the others must agree with. */
    public static boolean multiplies(Expression expression) {
        return expression instanceof Product
                || expression instanceof Power
                || expression instanceof Part
                || expression.parts().stream().anyMatch(Names::multiplies);
    }

    /** The summands of a side as written; a side that is no sum is its own only term. */
    public static List<Expression> terms(Expression side) {
        return side instanceof Sum sum ? sum.terms() : List.of(side);
    }
}
