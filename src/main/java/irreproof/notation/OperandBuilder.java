package irreproof.notation;

import irreproof.notation.Expression.Bracket;
import irreproof.notation.Expression.Conjugate;
import irreproof.notation.Expression.Decoration;
import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.Dots;
import irreproof.notation.Expression.Face;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Part;
import irreproof.notation.Expression.Power;
import irreproof.notation.Expression.Sum;
import irreproof.notation.Expression.Symmetry;
import irreproof.notation.parser.StatementParser;
import irreproof.notation.parser.StatementParser.AtomContext;
import irreproof.notation.parser.StatementParser.GroupContext;
import irreproof.notation.parser.StatementParser.MarkContext;
import irreproof.notation.parser.StatementParser.NumberContext;
import irreproof.notation.parser.StatementParser.OperandContext;
import irreproof.text.Span;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/** Builds one operand: a name, a bracket or a group with all that is attached to it. */
final class OperandBuilder {
    private final SumBuilder sums;
    private final ListBuilder lists;

    OperandBuilder(SumBuilder sums) {
        this.sums = sums;
        lists = new ListBuilder(sums);
    }

    Expression operand(OperandContext context) {
        List<Lexeme> prefixes = new ArrayList<>();
        OperandContext innermost = context;
        while (innermost.PREFIX() != null) {
            prefixes.add((Lexeme) innermost.PREFIX().getSymbol());
            innermost = innermost.operand();
        }
        Expression tree = atom(innermost.atom());
        for (MarkContext mark : innermost.mark()) {
            tree = marked(tree, SumBuilder.lexeme(mark));
        }
        if (!prefixes.isEmpty()) {
            tree = argument(tree);
        }
        for (int i = prefixes.size() - 1; i >= 0; i--) {
            Lexeme prefix = prefixes.get(i);
            tree = power(tree, prefix, prefix.span().cover(tree.span()));
        }
        return tree;
    }

    /** In {@code S^2(248)} the brackets hold what the power is taken of; they are no list of one label. */
    private static Expression argument(Expression tree) {
        boolean brackets = tree instanceof ListName list
                && list.bracket() == Bracket.ROUND
                && list.entries().size() == 1
                && list.decoration().isEmpty();
        return brackets ? Trees.at(((ListName) tree).entries().get(0), tree.span()) : tree;
    }

    private Expression atom(AtomContext context) {
        if (context.number() != null) {
            return number(context.number());
        }
        if (context.group() != null) {
            return group(context.group());
        }
        if (context.brackets() != null) {
            return lists.brackets(context.brackets());
        }
        Lexeme lexeme = SumBuilder.lexeme(context);
        return lexeme.content() instanceof Lexeme.Shape shape
                ? new DiagramName(shape.rows(), Decoration.NONE, lexeme.span())
                : new Dots(lexeme.span());
    }

    private static Expression number(NumberContext context) {
        Span span = SumBuilder.span(context);
        if (context.FRACTION() != null) {
            Lexeme.Fraction fraction =
                    (Lexeme.Fraction) SumBuilder.lexeme(context).content();
            return number(fraction.numerator(), fraction.denominator(), fraction.face(), span);
        }
        Lexeme.Digits first = (Lexeme.Digits) ((Lexeme) context.NUMBER(0).getSymbol()).content();
        if (context.SLASH() == null) {
            return number(first.digits(), "1", first.face(), span);
        }
        Lexeme.Digits second = (Lexeme.Digits) ((Lexeme) context.NUMBER(1).getSymbol()).content();
        return number(first.digits(), second.digits(), first.face(), span);
    }

    private static NumberName number(String numerator, String denominator, Face face, Span span) {
        if (denominator.length() > 9 || denominator.startsWith("0")) {
            throw new UnreadableSide("this fraction has no sensible denominator", span);
        }
        return new NumberName(new BigInteger(numerator), Integer.parseInt(denominator), face, Decoration.NONE, span);
    }

    private Expression group(GroupContext context) {
        Expression inner = sums.sum(context.sum());
        Span span = SumBuilder.span(context);
        if (context.BAR_OPEN() == null) {
            return Trees.at(inner, span);
        }
        return inner instanceof Name name ? Decorations.withBars(name, 1, span) : new Conjugate(inner, span);
    }

    /**
     * A subscript S or A behind a bracket makes a part of a square; behind a bracketed sum of names, which has none, it
     * says of each name to which part it belongs.
     */
    private static Expression marked(Expression tree, Lexeme mark) {
        Span span = tree.span().cover(mark.span());
        if (mark.is(StatementParser.EXPONENT)) {
            return power(tree, mark, span);
        }
        if (mark.content() instanceof Lexeme.Count count) {
            if (tree instanceof Name name) {
                return mark.is(StatementParser.STARS)
                        ? Decorations.withBars(name, count.count(), span)
                        : Decorations.withPrimes(name, count.count(), span);
            }
            if (mark.is(StatementParser.STARS) && !(tree instanceof Dots)) {
                return count.count() % 2 == 1 ? new Conjugate(tree, span) : Trees.at(tree, span);
            }
        }
        if (mark.content() instanceof Lexeme.Script script) {
            if (tree instanceof Name name) {
                return Decorations.withScript(name, script, span);
            }
            Symmetry symmetry = symmetry(script.meaning());
            if (symmetry != null
                    && tree instanceof Sum sum
                    && sum.terms().stream().allMatch(Trees::isUnmarkedName)) {
                return new Sum(
                        sum.terms().stream()
                                .map(term -> Trees.withSymmetry(term, symmetry))
                                .toList(),
                        span);
            }
            if (symmetry != null && !(tree instanceof Dots)) {
                return new Part(tree, symmetry, span);
            }
        }
        throw new UnreadableSide("what is attached here belongs to no single name", mark.span());
    }

    private static Symmetry symmetry(ScriptMeaning meaning) {
        if (meaning instanceof ScriptMeaning.Part part) {
            return part.symmetry();
        }
        return meaning instanceof ScriptMeaning.Label label && label.label().equals("s") ? Symmetry.SYMMETRIC : null;
    }

    private static Expression power(Expression base, Lexeme mark, Span span) {
        Lexeme.Exponent exponent = (Lexeme.Exponent) mark.content();
        if (base instanceof Dots) {
            throw new UnreadableSide("a power of nothing", mark.span());
        }
        return new Power(base, exponent.kind(), exponent.exponent(), span);
    }

    /** The charges that a bracket behind a name holds, or null if it holds anything else. */
    static List<String> charges(Expression bracket) {
        if (!(bracket instanceof ListName list)
                || list.bracket() != Expression.Bracket.ROUND
                || !list.decoration().isEmpty()) {
            return null;
        }
        List<String> charges = new ArrayList<>();
        for (Expression entry : list.entries()) {
            if (!(entry instanceof NumberName number)
                    || number.face() != Face.PLAIN
                    || !number.decoration().isEmpty()) {
                return null;
            }
            charges.add(number.numerator() + (number.denominator() == 1 ? "" : "/" + number.denominator()));
        }
        return charges;
    }
}
