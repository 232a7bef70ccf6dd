package irreproof.notation;

import irreproof.budget.Budget;
import irreproof.latex.Cell;
import irreproof.latex.Row;
import irreproof.notation.Expression.Face;
import irreproof.notation.Expression.NumberName;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Reads a table's row whose cells are the sides of one rule: a product in one cell, and in cells to its right what it
 * decomposes into. Cells with anything else (a label, a degree) are passed over.
 */
final class TableRow {
    private final String source;
    private final SideReader reader;
    private final Budget budget;

    TableRow(String source, SideReader reader, Budget budget) {
        this.source = source;
        this.reader = reader;
        this.budget = budget;
    }

    /** The statement that the row makes as a whole, if it does. */
    Optional<Statement> read(Row row) {
        List<Expression> sides = new ArrayList<>();
        List<Lexeme> lexemes = new ArrayList<>();
        for (Cell cell : row.cells()) {
            List<Lexeme> side = onlySide(cell);
            Expression tree =
                    side.isEmpty() ? null : reader.read(side, true, budget).tree();
            boolean takes = tree != null && (sides.isEmpty() ? Trees.multiplies(tree) : isDecomposition(tree));
            if (takes) {
                sides.add(tree);
                lexemes.addAll(side);
            }
        }
        if (sides.size() < 2) {
            return Optional.empty();
        }
        List<Relation> relations = new ArrayList<>();
        for (int i = 1; i < sides.size(); i++) {
            int end = sides.get(i - 1).span().end();
            relations.add(new Relation(Relation.Kind.CELL, false, new Span(end, end)));
        }
        if (!new Evidence(sides, relations, lexemes).isAboutRepresentations()) {
            return Optional.empty();
        }
        Span span = sides.get(0).span().cover(sides.get(sides.size() - 1).span());
        return Optional.of(new Statement(sides, relations, span, span.of(source), false, List.of()));
    }

    /** The lexemes of a cell that holds one side and no relation; empty otherwise. */
    private List<Lexeme> onlySide(Cell cell) {
        List<Segment> segments = Segmenter.cut(Lowering.lower(cell.tokens(), budget));
        return segments.size() == 1 && segments.get(0).relations().isEmpty()
                ? segments.get(0).sides().get(0)
                : List.of();
    }

    private static boolean isDecomposition(Expression tree) {
        if (tree instanceof NumberName name) {
            return name.face() != Face.PLAIN || name.decoration().bars() > 0;
        }
        return !Trees.multiplies(tree);
    }
}
