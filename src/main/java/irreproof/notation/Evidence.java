package irreproof.notation;

import irreproof.notation.Expression.DiagramName;
import irreproof.notation.Expression.Face;
import irreproof.notation.Expression.ListName;
import irreproof.notation.Expression.NumberName;
import irreproof.notation.Expression.Sum;
import irreproof.notation.parser.StatementParser;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * Decides whether a formula speaks about representations at all. It must hold a name that only an irrep can have (a
 * styled or barred number above 1, a diagram), or a number or list beside {@code \otimes} or {@code \oplus}. What looks
 * the same in other trades is turned away: exclusive or of bit strings and of numbers, sums of identities or indicator
 * functions, residue classes, direct sums of vectors.
 */
final class Evidence {
    private final List<Expression> sides;
    private final List<Relation> relations;
    private final List<Lexeme> lexemes;
    private final List<NumberName> numbers = new ArrayList<>();
    private final List<ListName> lists = new ArrayList<>();
    private boolean diagram;
    private final boolean power;

    /** @param lexemes those of the sides that were read */
    Evidence(List<Expression> sides, List<Relation> relations, List<Lexeme> lexemes) {
        this.sides = sides;
        this.relations = relations;
        this.lexemes = lexemes;
        power = lexemes.stream()
                .anyMatch(lexeme -> lexeme.content() instanceof Lexeme.Exponent exponent && exponent.operatorWritten());
        sides.forEach(this::collect);
    }

    private void collect(Expression tree) {
        if (tree instanceof NumberName number) {
            numbers.add(number);
        } else if (tree instanceof ListName list) {
            lists.add(list);
        } else if (tree instanceof DiagramName name) {
            diagram |= !name.rows().isEmpty();
        }
        Trees.children(tree).forEach(this::collect);
    }

    boolean isAboutRepresentations() {
        boolean tensor = has(StatementParser.OTIMES);
        boolean operator = tensor || has(StatementParser.OPLUS) || power;
        boolean named = diagram || numbers.stream().anyMatch(number -> isStyled(number) && isAboveOne(number));
        boolean joined = operator && (!lists.isEmpty() || numbers.stream().anyMatch(Evidence::isAboveOne));
        return (named || joined) && !isLookAlike(tensor);
    }

    private boolean isLookAlike(boolean tensor) {
        if (hasLeadingZero()) {
            return true;
        }
        if (diagram || tensor || power) {
            return false;
        }
        boolean styled = numbers.stream().anyMatch(Evidence::isStyled);
        boolean equation = relations.stream().allMatch(relation -> relation.kind() == Relation.Kind.EQUAL);
        if (!styled) {
            return isVectorSum() || isExclusiveOr(equation) || isBitString();
        }
        boolean residues = !has(StatementParser.OPLUS)
                && equation
                && sides.stream().anyMatch(side -> !(side instanceof NumberName))
                && numbers.stream().allMatch(Evidence::isPlainAndBarred);
        return residues;
    }

    private boolean has(int type) {
        return lexemes.stream().anyMatch(lexeme -> lexeme.is(type));
    }

    /** A bit string; in brackets, 01 is a pair of Dynkin labels. */
    private boolean hasLeadingZero() {
        int depth = 0;
        for (Lexeme lexeme : lexemes) {
            if (lexeme.is(StatementParser.ROUND_OPEN) || lexeme.is(StatementParser.SQUARE_OPEN)) {
                depth++;
            } else if (Adjacency.closesBracket(lexeme)) {
                depth--;
            }
            if (depth <= 0
                    && lexeme.content() instanceof Lexeme.Digits digits
                    && digits.digits().length() > 1
                    && digits.digits().startsWith("0")) {
                return true;
            }
        }
        return false;
    }

    /** {@code (0,1,0)\oplus(0,0,1)}: only lists of whole numbers, nothing to compare with, or a sum that is one vector. */
    private boolean isVectorSum() {
        return !lists.isEmpty()
                && lists.stream()
                        .allMatch(list -> list.entries().size() > 1
                                && list.entries().stream().allMatch(Trees::isCount))
                && (sides.size() == 1 || sumsToOneName());
    }

    /** {@code 5\oplus 3=6}: a sum on the left and a single number on the right is no decomposition. */
    private boolean isExclusiveOr(boolean equation) {
        return equation
                && lists.isEmpty()
                && sumsToOneName()
                && numbers.stream().allMatch(Trees::isCount);
    }

    private boolean sumsToOneName() {
        return sides.size() > 1
                && sides.get(0) instanceof Sum
                && sides.get(sides.size() - 1) instanceof Expression.Name;
    }

    private boolean isBitString() {
        return lists.isEmpty()
                && numbers.stream()
                        .allMatch(number -> number.numerator().toString().matches("[01]{2,}"))
                && numbers.stream()
                                .map(number -> number.numerator().toString().length())
                                .distinct()
                                .count()
                        == 1;
    }

    private static boolean isStyled(NumberName number) {
        return number.face() != Face.PLAIN || number.decoration().bars() > 0;
    }

    private static boolean isPlainAndBarred(NumberName number) {
        return number.face() == Face.PLAIN && number.decoration().bars() > 0;
    }

    private static boolean isAboveOne(NumberName number) {
        return number.denominator() > 1 || number.numerator().compareTo(BigInteger.ONE) > 0;
    }
}
