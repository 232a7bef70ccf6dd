package irreproof.notation;

import irreproof.notation.parser.StatementParser;
import irreproof.text.Span;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Locale;

/**
 * Cuts the lexemes of a passage into segments. A comma, a semicolon or an arrow between assertions always cuts outside
 * brackets; the end of a row, a cell, wide space and words cut only where the formula cannot go on: not beside an
 * operator or a relation.
 */
final class Segmenter {
    private static final int NONE = -1;

    private final List<Lexeme> lexemes;
    /** For each opening lexeme where it closes, and the other way round; negative if nowhere. */
    private final int[] partners;

    private Segmenter(List<Lexeme> lexemes) {
        this.lexemes = lexemes;
        partners = partners(lexemes);
    }

    static List<Segment> cut(List<Lexeme> lexemes) {
        List<Lexeme> unwrapped = new Segmenter(lexemes).withoutOuterGroups();
        return new Segmenter(unwrapped).segments();
    }

    private static int[] partners(List<Lexeme> lexemes) {
        int[] partners = new int[lexemes.size()];
        Deque<Integer> open = new ArrayDeque<>();
        for (int i = 0; i < partners.length; i++) {
            partners[i] = NONE;
            Lexeme lexeme = lexemes.get(i);
            if (Adjacency.opens(lexeme)) {
                open.push(i);
            } else if (lexeme.is(StatementParser.GROUP_CLOSE)) {
                while (!open.isEmpty() && !Adjacency.opensGroup(lexemes.get(open.peek()))) {
                    open.pop();
                }
                pair(partners, open, i);
            } else if (Adjacency.closesBracket(lexeme)
                    && !open.isEmpty()
                    && !Adjacency.opensGroup(lexemes.get(open.peek()))) {
                pair(partners, open, i);
            }
        }
        return partners;
    }

    private static void pair(int[] partners, Deque<Integer> open, int close) {
        if (!open.isEmpty()) {
            int opener = open.pop();
            partners[opener] = close;
            partners[close] = opener;
        }
    }

    /**
     * Groups that hold whole sides ({@code {\color{red} 8\otimes 8 = ...}}) are taken away, and brackets that do, as
     * around a condition ({@code (N=3)}), cut like a break.
     */
    private List<Lexeme> withoutOuterGroups() {
        boolean[] unwrapped = new boolean[lexemes.size()];
        Deque<Integer> open = new ArrayDeque<>();
        for (int i = 0; i < unwrapped.length; i++) {
            Lexeme lexeme = lexemes.get(i);
            if (Adjacency.opens(lexeme) && partners[i] != NONE) {
                open.push(i);
            } else if (partners[i] != NONE) {
                open.pop();
            } else if (lexeme.is(StatementParser.RELATION) || lexeme.is(StatementParser.BREAK)) {
                unwrap(open, unwrapped, lexeme.is(StatementParser.RELATION));
            }
        }
        List<Lexeme> kept = new ArrayList<>();
        for (int i = 0; i < unwrapped.length; i++) {
            Lexeme lexeme = lexemes.get(i);
            boolean group = lexeme.is(StatementParser.GROUP_OPEN) || lexeme.is(StatementParser.GROUP_CLOSE);
            if (!unwrapped[i]) {
                kept.add(lexeme);
            } else if (!group) {
                kept.add(Lexeme.bare(StatementParser.BREAK, lexeme.span()));
            }
        }
        return kept;
    }

    private void unwrap(Deque<Integer> open, boolean[] unwrapped, boolean relation) {
        for (int opener : open) {
            boolean group = lexemes.get(opener).is(StatementParser.GROUP_OPEN);
            if (unwrapped[opener] || !group && !(relation && standsAlone(opener))) {
                return;
            }
            unwrapped[opener] = true;
            unwrapped[partners[opener]] = true;
        }
    }

    /** A printing bracket that no operator ties to what stands before or behind it. */
    private boolean standsAlone(int opener) {
        Lexeme before = neighbour(opener, -1);
        Lexeme behind = neighbour(partners[opener], 1);
        return !lexemes.get(opener).is(StatementParser.BAR_OPEN)
                && (before == null || !Adjacency.joins(before) && !Adjacency.opens(before))
                && (behind == null || !Adjacency.joins(behind) && !Adjacency.isMark(behind));
    }

    private List<Segment> segments() {
        List<Segment> segments = new ArrayList<>();
        List<List<Lexeme>> sides = new ArrayList<>();
        List<Lexeme> relations = new ArrayList<>();
        List<Lexeme> side = new ArrayList<>();
        boolean listed = false;
        int depth = 0;
        for (int i = 0; i < lexemes.size(); i++) {
            Lexeme lexeme = resolved(i, depth);
            if (lexeme == null) {
                continue;
            }
            if (partners[i] != NONE) {
                depth += partners[i] > i ? 1 : -1;
            }
            if (depth == 0 && lexeme.is(StatementParser.RELATION)) {
                sides.add(side);
                relations.add(lexeme);
                side = new ArrayList<>();
            } else if (depth == 0 && breaks(lexeme)) {
                sides.add(side);
                add(segments, new Segment(sides, relations, listed));
                sides = new ArrayList<>();
                relations = new ArrayList<>();
                side = new ArrayList<>();
                listed = !lexemes.get(i).is(StatementParser.SOFT_BREAK);
            } else {
                append(side, lexeme);
            }
        }
        sides.add(side);
        add(segments, new Segment(sides, relations, listed));
        return segments;
    }

    private static void add(List<Segment> segments, Segment segment) {
        if (!segment.isEmpty()) {
            segments.add(segment);
        }
    }

    private static boolean breaks(Lexeme lexeme) {
        return lexeme.is(StatementParser.BREAK)
                || lexeme.is(StatementParser.COMMA)
                || lexeme.is(StatementParser.SEMICOLON);
    }

    /** Dots beside an operand are further terms of its sum. */
    private static void append(List<Lexeme> side, Lexeme lexeme) {
        Lexeme before = side.isEmpty() ? null : side.get(side.size() - 1);
        if (before != null
                && Adjacency.endsOperand(before)
                && Adjacency.beginsOperand(lexeme)
                && (before.is(StatementParser.DOTS) || lexeme.is(StatementParser.DOTS))) {
            Span between = new Span(before.span().end(), before.span().end());
            side.add(Lexeme.bare(StatementParser.PLUS, between));
        }
        side.add(lexeme);
    }

    /** The lexeme with its meaning at this place: a soft break, a dot, words; null if it means nothing here. */
    private Lexeme resolved(int index, int depth) {
        Lexeme lexeme = lexemes.get(index);
        Lexeme before = neighbour(index, -1);
        Lexeme behind = neighbour(index, 1);
        return switch (lexeme.getType()) {
            case StatementParser.SOFT_BREAK -> softBreak(lexeme, before, behind, depth);
            case StatementParser.WORDS -> words(lexeme, before, behind, depth);
            case StatementParser.CDOT -> {
                boolean between = before != null && Adjacency.endsOperand(before)
                        || behind != null && Adjacency.beginsOperand(behind);
                yield between
                        ? lexeme
                        : new Lexeme(StatementParser.DIAGRAM, new Lexeme.Shape(List.of()), lexeme.span());
            }
            default -> lexeme;
        };
    }

    private Lexeme neighbour(int index, int step) {
        int i = index + step;
        while (i >= 0 && i < lexemes.size() && lexemes.get(i).is(StatementParser.SOFT_BREAK)) {
            i += step;
        }
        return i < 0 || i >= lexemes.size() ? null : lexemes.get(i);
    }

    private static Lexeme softBreak(Lexeme lexeme, Lexeme before, Lexeme behind, int depth) {
        boolean goesOn = depth > 0
                || before == null
                || behind == null
                || Adjacency.joins(before)
                || Adjacency.joins(behind)
                || breaks(before)
                || breaks(behind);
        return goesOn ? null : Lexeme.bare(StatementParser.BREAK, lexeme.span());
    }

    private static Lexeme words(Lexeme lexeme, Lexeme before, Lexeme behind, int depth) {
        String text = lexeme.content() instanceof Lexeme.Words words ? words.text() : "";
        String word = text.replace('~', ' ').strip().toLowerCase(Locale.ROOT);
        if (word.isEmpty() || word.equals("spin") || word.equals("spin-")) {
            return null;
        }
        boolean function = behind != null && behind.is(StatementParser.ROUND_OPEN) && !text.endsWith(" ");
        boolean operand = behind != null && (Adjacency.joins(behind) || Adjacency.isMark(behind))
                || before != null && Adjacency.joins(before);
        return depth > 0 || function || operand
                ? Lexeme.bare(StatementParser.UNREADABLE, lexeme.span())
                : Lexeme.bare(StatementParser.BREAK, lexeme.span());
    }
}
