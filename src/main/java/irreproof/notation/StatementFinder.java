package irreproof.notation;

import irreproof.budget.Budget;
import irreproof.latex.Passage;
import irreproof.latex.Row;
import irreproof.latex.Token;
import irreproof.notation.parser.StatementParser;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Pulls the statements out of a passage: strings the rows together, takes out the noise of typesetting, cuts at commas
 * and the like, parses the sides, and keeps what can only be about representations. Sides at the left end that cannot be
 * read (a field, a group, words) are dropped; any other unreadable side is a problem of the statement. Linear in the
 * length of the passage. Never throws on any input (but for an exceeded budget).
 */
public final class StatementFinder {
    private StatementFinder() {}

    /**
     * @param source the main document, which the spans of the passage's tokens refer to
     * @param budget one step for each token
     */
    public static List<Statement> find(String source, Passage passage, Budget budget) {
        List<Statement> statements = new ArrayList<>();
        SideReader reader = new SideReader();
        for (List<Token> tokens : streams(source, passage, reader, statements, budget)) {
            List<Segment> segments = Segmenter.cut(Lowering.lower(tokens, budget));
            for (int i = 0; i < segments.size(); i++) {
                Segment next = i + 1 < segments.size() ? segments.get(i + 1) : null;
                Segment segment = IndexLetters.settle(segments.get(i));
                Statement statement = read(source, segment, next, reader, budget);
                if (statement != null) {
                    statements.add(statement);
                }
            }
        }
        statements.sort(
                java.util.Comparator.comparingInt(statement -> statement.span().start()));
        return statements;
    }

    /**
     * The only side of a formula that is known to be about representations, so that no evidence is asked for: a single
     * name will do. Empty if the formula is anything else than one readable side.
     */
    public static Optional<Statement> side(String source, Passage passage, Budget budget) {
        List<List<Lexeme>> sides = new ArrayList<>();
        for (List<Token> tokens : PassageTokens.streams(passage)) {
            for (Segment segment : Segmenter.cut(Lowering.lower(tokens, budget))) {
                sides.addAll(IndexLetters.settle(segment).sides());
            }
        }
        if (sides.size() != 1 || sides.get(0).isEmpty()) {
            return Optional.empty();
        }
        List<Lexeme> only = sides.get(0);
        Expression tree = new SideReader().read(only, true, budget).tree();
        if (tree == null) {
            return Optional.empty();
        }
        Span span = only.get(0).span().cover(only.get(only.size() - 1).span());
        return Optional.of(new Statement(List.of(tree), List.of(), span, span.of(source), false, List.of()));
    }

    /** The tokens to look through; rows of a table that are statements as a whole are read here. */
    private static List<List<Token>> streams(
            String source, Passage passage, SideReader reader, List<Statement> statements, Budget budget) {
        if (passage.layout() != Passage.Layout.TABLE) {
            return PassageTokens.streams(passage);
        }
        TableRow tableRow = new TableRow(source, reader, budget);
        List<List<Token>> streams = new ArrayList<>();
        for (Row row : passage.rows()) {
            Optional<Statement> whole = tableRow.read(row);
            if (whole.isPresent()) {
                statements.add(whole.get());
            } else {
                streams.add(PassageTokens.stream(row));
            }
        }
        return streams;
    }

    private static Statement read(String source, Segment segment, Segment next, SideReader reader, Budget budget) {
        boolean otimes = segment.sides().stream()
                .anyMatch(side -> side.stream().anyMatch(lexeme -> lexeme.is(StatementParser.OTIMES)));
        List<Expression> sides = new ArrayList<>();
        List<Relation> relations = new ArrayList<>();
        List<Lexeme> lexemes = new ArrayList<>();
        List<Statement.Problem> problems = new ArrayList<>();
        Span span = null;
        boolean continued = false;
        for (int i = 0; i < segment.sides().size(); i++) {
            List<Lexeme> side = segment.sides().get(i);
            Lexeme before = i == 0 ? null : segment.relations().get(i - 1);
            if (side.isEmpty()) {
                if (before != null && span != null) {
                    problems.add(new Statement.Problem("nothing stands behind this", before.span()));
                }
                continue;
            }
            SideReader.Side result = reader.read(side, otimes, budget);
            if (result.tree() == null && span == null) {
                continue;
            }
            Span place = side.get(0).span().cover(side.get(side.size() - 1).span());
            span = span == null ? place : span.cover(place);
            if (result.tree() == null) {
                problems.add(result.problem());
                continue;
            }
            if (sides.isEmpty()) {
                continued = i > 0;
            } else {
                Lexeme.Sign sign = (Lexeme.Sign) before.content();
                relations.add(new Relation(sign.kind(), sign.negated(), before.span()));
            }
            sides.add(result.tree());
            lexemes.addAll(side);
        }
        if (sides.isEmpty() || sides.size() == 1 && isBareName(sides.get(0))) {
            return null;
        }
        if (!new Evidence(sides, relations, lexemes).isAboutRepresentations()) {
            return null;
        }
        if (next != null && goesOnWith(next)) {
            problems.add(new Statement.Problem("the sum seems to go on behind this as a list", span));
        }
        return new Statement(sides, relations, span, span.of(source), continued, problems);
    }

    private static boolean isBareName(Expression side) {
        return side instanceof Expression.Name || side instanceof Expression.Dots;
    }

    /** {@code = \mathbf{1}, \mathbf{8}}: what follows is no statement of its own but more of this one. */
    private static boolean goesOnWith(Segment next) {
        List<Lexeme> first = next.sides().get(0);
        if (first.isEmpty()) {
            return false;
        }
        if (Adjacency.joins(first.get(0))) {
            return true;
        }
        return next.listed()
                && next.relations().isEmpty()
                && first.stream().noneMatch(lexeme -> Adjacency.joins(lexeme) || lexeme.is(StatementParser.UNREADABLE));
    }
}
