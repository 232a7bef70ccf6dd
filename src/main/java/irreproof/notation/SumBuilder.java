package irreproof.notation;

import irreproof.notation.Expression.Multiple;
import irreproof.notation.Expression.Part;
import irreproof.notation.Expression.Product;
import irreproof.notation.Expression.Sum;
import irreproof.notation.Expression.Symmetry;
import irreproof.notation.parser.StatementParser;
import irreproof.notation.parser.StatementParser.FactorContext;
import irreproof.notation.parser.StatementParser.ProductContext;
import irreproof.notation.parser.StatementParser.SumContext;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;
import org.antlr.v4.runtime.tree.ParseTree;

/** Builds sums, products and multiplicities from the parse tree. */
final class SumBuilder {
    private final boolean otimesIsProduct;
    private final OperandBuilder operands = new OperandBuilder(this);

    SumBuilder(boolean otimesIsProduct) {
        this.otimesIsProduct = otimesIsProduct;
    }

    Expression side(StatementParser.SideContext context) {
        Expression tree = sum(context.sum());
        Trees.requireSpins(tree);
        return tree;
    }

    Expression sum(SumContext context) {
        boolean several = context.product().size() > 1;
        if (!several) {
            return product(context.product(0), false, false);
        }
        boolean counted = otimesIsProduct && !context.OPLUS().isEmpty();
        List<Expression> terms = new ArrayList<>();
        for (ProductContext product : context.product()) {
            terms.add(product(product, true, counted));
        }
        return new Sum(terms, span(context));
    }

    private Expression product(ProductContext context, boolean inSum, boolean counted) {
        List<Expression> factors = new ArrayList<>();
        for (FactorContext factor : context.factor()) {
            factors.add(factor(factor, inSum));
        }
        if (factors.size() == 1) {
            return factors.get(0);
        }
        Symmetry symmetry = symmetry(context);
        Span span = span(context);
        if (symmetry != null) {
            return new Part(new Product(factors, span), symmetry, span);
        }
        boolean timesFirst = context.times(0).TIMES() != null;
        if (timesFirst && Trees.isCount(factors.get(0)) && (counted || Trees.cannotBeArithmetic(factors.get(1)))) {
            Span rest =
                    factors.get(1).span().cover(factors.get(factors.size() - 1).span());
            Expression body =
                    factors.size() == 2 ? factors.get(1) : new Product(factors.subList(1, factors.size()), rest);
            return new Multiple(Trees.count(factors.get(0)), body, span);
        }
        return new Product(factors, span);
    }

    private static Symmetry symmetry(ProductContext context) {
        for (StatementParser.TimesContext times : context.times()) {
            Lexeme sign = lexeme(times);
            if (sign.content() instanceof Lexeme.Projected projected) {
                if (context.times().size() > 1) {
                    throw new UnreadableSide("a symmetrised product of more than two factors", sign.span());
                }
                return projected.symmetry();
            }
        }
        return null;
    }

    private Expression factor(FactorContext context, boolean inSum) {
        Expression first = operands.operand(context.operand(0));
        if (context.operand().size() == 1) {
            return first;
        }
        boolean dotted = context.getChild(1) != context.operand(1);
        Expression second = operands.operand(context.operand(1));
        if (!Trees.isCount(first) || !dotted && isCharge(second)) {
            return withCharges(context, 0, first);
        }
        Expression body = withCharges(context, 1, second);
        boolean barredTerm = inSum
                && body instanceof Expression.NumberName name
                && name.decoration().bars() > 0;
        if (!dotted && !barredTerm && !Trees.cannotBeArithmetic(body)) {
            throw new UnreadableSide("a number directly in front of this: a multiplicity, or a product?", body.span());
        }
        return new Multiple(Trees.count(first), body, span(context));
    }

    /**
     * {@code 16(1)}, {@code 10(-2)}; more than one entry behind a plain number is a list that is counted, {@code 2(1,1)},
     * and so are several digits without a sign, {@code 2(101)}.
     */
    private static boolean isCharge(Expression second) {
        List<String> charges = OperandBuilder.charges(second);
        return charges != null && charges.size() == 1 && !charges.get(0).matches("[0-9]{2,}");
    }

    /** The operand at the index, with the charges in brackets that may be all that follows it. */
    private Expression withCharges(FactorContext context, int index, Expression operand) {
        int size = context.operand().size();
        if (size == index + 1) {
            return operand;
        }
        Expression next = operands.operand(context.operand(index + 1));
        List<String> charges = OperandBuilder.charges(next);
        boolean dotted = context.CDOT().size() > index;
        if (size > index + 2 || dotted || charges == null || !(operand instanceof Expression.Name name)) {
            throw new UnreadableSide("this stands beside the name before it without an operator", next.span());
        }
        return Decorations.withCharges(name, charges, operand.span().cover(next.span()));
    }

    static Lexeme lexeme(ParseTree node) {
        ParseTree leaf = node;
        while (leaf.getChildCount() > 0) {
            leaf = leaf.getChild(0);
        }
        return (Lexeme) leaf.getPayload();
    }

    /** The author's characters from the first to the last lexeme of the node. */
    static Span span(org.antlr.v4.runtime.ParserRuleContext context) {
        return ((Lexeme) context.getStart()).span().cover(((Lexeme) context.getStop()).span());
    }
}
