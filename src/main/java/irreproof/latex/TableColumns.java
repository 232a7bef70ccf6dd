package irreproof.latex;

import java.util.BitSet;
import java.util.List;

/**
 * Reads a table's column specification for the columns that are set as mathematics: {@code >{$}c<{$}}. Repeated columns
 * ({@code *{3}{..}}) are unrolled a few times; columns of a type the document defines itself count as one plain column.
 */
final class TableColumns {
    private static final int MOST = 100;

    private final BitSet mathematical = new BitSet();
    private int column;
    private boolean mathematicsNext;

    private TableColumns() {}

    static BitSet mathematical(List<Token> specification) {
        TableColumns columns = new TableColumns();
        columns.read(specification, 0);
        return columns.mathematical;
    }

    private void read(List<Token> tokens, int depth) {
        for (int i = 0; i < tokens.size() && column < MOST; i++) {
            Token token = tokens.get(i);
            if (token.isCharacter('>')) {
                int end = argumentEnd(tokens, i + 1);
                mathematicsNext = tokens.subList(i + 1, end).stream().anyMatch(TableColumns::opensFormula);
                i = end - 1;
            } else if (token.isCharacter('<') || token.isCharacter('@') || token.isCharacter('!')) {
                i = argumentEnd(tokens, i + 1) - 1;
            } else if (token.isCharacter('*')) {
                int countEnd = argumentEnd(tokens, i + 1);
                int end = argumentEnd(tokens, countEnd);
                if (depth < 2 && end - countEnd > 2) {
                    String digits = Arguments.text(tokens.subList(i + 2, Math.max(i + 2, countEnd - 1)));
                    repeat(tokens.subList(countEnd + 1, end - 1), digits, depth);
                }
                i = end - 1;
            } else if (token.kind() == TokenKind.LETTER) {
                mathematical.set(column++, mathematicsNext);
                mathematicsNext = false;
                i = argumentEnd(tokens, i + 1) - 1;
            }
        }
    }

    private void repeat(List<Token> tokens, String digits, int depth) {
        int times = digits.matches("[0-9]{1,2}") ? Integer.parseInt(digits) : 1;
        for (int i = 0; i < times && column < MOST; i++) {
            read(tokens, depth + 1);
        }
    }

    private static boolean opensFormula(Token token) {
        return token.kind() == TokenKind.INLINE_SHIFT;
    }

    /** Behind the group that starts here, or here if none does. */
    private static int argumentEnd(List<Token> tokens, int from) {
        int depth = 0;
        for (int i = from; i < tokens.size(); i++) {
            TokenKind kind = tokens.get(i).kind();
            depth += kind == TokenKind.BEGIN_GROUP ? 1 : kind == TokenKind.END_GROUP ? -1 : 0;
            if (depth <= 0) {
                return kind == TokenKind.END_GROUP ? i + 1 : from;
            }
        }
        return from;
    }
}
