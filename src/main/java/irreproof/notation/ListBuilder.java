package irreproof.notation;

import irreproof.notation.Expression.Bracket;
import irreproof.notation.Expression.Decoration;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Power;
import irreproof.notation.parser.StatementParser.BracketsContext;
import irreproof.notation.parser.StatementParser.EntriesContext;
import irreproof.notation.parser.StatementParser.EntryContext;
import irreproof.notation.parser.StatementParser.FactorContext;
import irreproof.notation.parser.StatementParser.OperandContext;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;

/** Builds what stands in brackets: a list of labels or names, or a grouped expression. */
final class ListBuilder {
    private final SumBuilder sums;

    ListBuilder(SumBuilder sums) {
        this.sums = sums;
    }

    Expression brackets(BracketsContext context) {
        Span span = SumBuilder.span(context);
        if (context.CURLY_OPEN() != null) {
            return Trees.at(sums.sum(context.sum()), span);
        }
        Bracket bracket = context.ROUND_OPEN() != null ? Bracket.ROUND : Bracket.SQUARE;
        EntriesContext entries = context.entries();
        if (entries.entry().size() > 1) {
            List<Expression> list = new ArrayList<>();
            for (EntryContext entry : entries.entry()) {
                list.add(entry(entry, span));
            }
            return new ListName(bracket, list, Decoration.NONE, span);
        }
        List<Expression> spaced = spaced(entries.entry(0));
        if (spaced != null) {
            return new ListName(bracket, spaced, Decoration.NONE, span);
        }
        Expression only = entry(entries.entry(0), span);
        boolean label = only instanceof NumberName
                || only instanceof Power power
                        && !Trees.cannotBeArithmetic(power)
                        && power.base() instanceof NumberName;
        return label ? new ListName(bracket, List.of(only), Decoration.NONE, span) : Trees.at(only, span);
    }

    private Expression entry(EntryContext context, Span brackets) {
        if (context.sum() == null) {
            throw new UnreadableSide("an entry without a number", brackets);
        }
        Expression value = sums.sum(context.sum());
        if (context.sign() == null) {
            return value;
        }
        Span span = SumBuilder.span(context);
        if (value instanceof NumberName number && context.sign().PLUS_MINUS() == null) {
            return new NumberName(
                    context.sign().MINUS() == null
                            ? number.numerator()
                            : number.numerator().negate(),
                    number.denominator(),
                    number.face(),
                    number.decoration(),
                    span);
        }
        throw new UnreadableSide("a sign in front of something that is no number", span);
    }

    /** Labels set apart by spaces only, {@code (1\,0)}; null if it is anything else. */
    private static List<Expression> spaced(EntryContext entry) {
        if (entry.sign() != null || entry.sum() == null || entry.sum().product().size() > 1) {
            return null;
        }
        if (entry.sum().product(0).factor().size() > 1) {
            return null;
        }
        FactorContext factor = entry.sum().product(0).factor(0);
        if (factor.operand().size() < 2 || !factor.CDOT().isEmpty()) {
            return null;
        }
        List<Expression> labels = new ArrayList<>();
        for (OperandContext operand : factor.operand()) {
            boolean plain = operand.getChildCount() == 1
                    && operand.atom() != null
                    && operand.atom().number() != null
                    && operand.atom().number().getChildCount() == 1;
            if (!plain) {
                return null;
            }
            Lexeme lexeme = SumBuilder.lexeme(operand);
            if (!(lexeme.content() instanceof Lexeme.Digits digits)) {
                return null;
            }
            labels.add(new NumberName(
                    new java.math.BigInteger(digits.digits()), 1, digits.face(), Decoration.NONE, lexeme.span()));
        }
        return labels;
    }
}
