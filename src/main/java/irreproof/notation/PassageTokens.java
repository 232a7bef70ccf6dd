package irreproof.notation;

import irreproof.latex.Cell;
import irreproof.latex.Passage;
import irreproof.latex.Row;
import irreproof.latex.Token;
import irreproof.latex.TokenKind;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;

/**
 * Strings the cells of a passage together again, row by row, with a token for the end of each cell and row. Equations set
 * side by side in one alignment (two cells of a row that begin with a relation) make one stream for each pair of columns.
 */
final class PassageTokens {
    private PassageTokens() {}

    static List<List<Token>> streams(Passage passage) {
        boolean sideBySide = passage.rows().stream().anyMatch(PassageTokens::holdsTwoEquations);
        if (!sideBySide) {
            return List.of(stream(passage.rows(), 0, Integer.MAX_VALUE));
        }
        int columns = passage.rows().stream()
                .mapToInt(row -> row.cells().size())
                .max()
                .orElse(0);
        List<List<Token>> streams = new ArrayList<>();
        for (int column = 0; column < columns; column += 2) {
            streams.add(stream(passage.rows(), column, column + 2));
        }
        return streams;
    }

    /** One row alone. */
    static List<Token> stream(Row row) {
        return stream(List.of(row), 0, Integer.MAX_VALUE);
    }

    private static List<Token> stream(List<Row> rows, int from, int to) {
        List<Token> tokens = new ArrayList<>();
        int place = 0;
        for (Row row : rows) {
            for (int i = from; i < Math.min(to, row.cells().size()); i++) {
                Cell cell = row.cells().get(i);
                if (i > from) {
                    tokens.add(new Token(TokenKind.ALIGN, "&", new Span(place, place)));
                }
                tokens.addAll(cell.tokens());
                place = cell.span().end();
            }
            tokens.add(new Token(TokenKind.CONTROL_SYMBOL, "\\", new Span(place, place)));
        }
        return tokens;
    }

    private static boolean holdsTwoEquations(Row row) {
        long beginning =
                row.cells().stream().filter(PassageTokens::beginsWithRelation).count();
        return beginning > 1
                && !isBlank(row.cells().get(0))
                && (row.cells().size() < 3 || !isBlank(row.cells().get(2)));
    }

    private static boolean isBlank(Cell cell) {
        return cell.tokens().stream().allMatch(token -> token.kind() == TokenKind.SPACE);
    }

    private static boolean beginsWithRelation(Cell cell) {
        for (Token token : cell.tokens()) {
            if (token.kind() == TokenKind.SPACE) {
                continue;
            }
            if (token.kind() == TokenKind.CONTROL_WORD) {
                Commands.Meaning meaning = Commands.of(token.text());
                return meaning instanceof Commands.Related || meaning instanceof Commands.LongArrow;
            }
            return token.text().length() == 1
                    && Characters.relation(token.text().charAt(0)) != null;
        }
        return false;
    }
}
