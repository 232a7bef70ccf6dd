package irreproof.latex;

import irreproof.text.Span;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Set;

/**
 * Cuts a passage's tokens into rows and cells. Rows and cells inside groups and inner environments stay together,
 * except where an inner environment alone makes the formula's layout: then its rows are the rows. Linear, but for the
 * few levels of such environments.
 */
final class RowSplitter {
    private static final int DEEPEST = 8;
    private static final Set<String> ROW_ENDS = Set.of("cr", "tabularnewline");
    private static final Set<String> MARGINALIA = Set.of("label", "tag", "nonumber", "notag", "hline", "displaystyle");

    private static final Set<String> RULES =
            Set.of("hline", "toprule", "midrule", "bottomrule", "endhead", "endfirsthead", "endfoot", "endlastfoot");

    /** Counts the groups and environments that are open. */
    private static final class Nesting {
        private int groups;
        private int environments;

        /** Takes the next token; true if it stands outside all groups and environments and opens none. */
        boolean isOutside(Token token) {
            if (token.kind() == TokenKind.BEGIN_GROUP) {
                groups++;
            } else if (token.kind() == TokenKind.END_GROUP) {
                groups = Math.max(0, groups - 1);
            } else if (token.isWord("begin")) {
                environments++;
            } else if (token.isWord("end")) {
                environments = Math.max(0, environments - 1);
            } else {
                return groups == 0 && environments == 0;
            }
            return false;
        }
    }

    private final boolean table;
    private final BitSet mathematicalColumns;
    private final List<Row> rows = new ArrayList<>();
    private List<Cell> cells = new ArrayList<>();

    private RowSplitter(BitSet mathematicalColumns) {
        this.table = mathematicalColumns != null;
        this.mathematicalColumns = mathematicalColumns;
    }

    /** @param mathematicalColumns the columns of a table whose cells are mathematics as they stand; null if no table */
    static List<Row> split(List<Token> tokens, BitSet mathematicalColumns) {
        RowSplitter splitter = new RowSplitter(mathematicalColumns);
        splitter.rows(tokens, 0);
        return splitter.rows;
    }

    private void rows(List<Token> tokens, int level) {
        Nesting nesting = new Nesting();
        int rowStart = 0;
        for (int i = 0; i < tokens.size(); i++) {
            if (nesting.isOutside(tokens.get(i)) && endsRow(tokens.get(i))) {
                row(tokens.subList(rowStart, i), level);
                rowStart = behindRowEnd(tokens, i);
                i = rowStart - 1;
            }
        }
        row(tokens.subList(Math.min(rowStart, tokens.size()), tokens.size()), level);
    }

    private static boolean endsRow(Token token) {
        if (token.kind() == TokenKind.CONTROL_SYMBOL) {
            return token.text().equals("\\");
        }
        return token.kind() == TokenKind.CONTROL_WORD && (ROW_ENDS.contains(token.text()) || isIntertext(token));
    }

    private static boolean isIntertext(Token token) {
        return token.isWord("intertext") || token.isWord("shortintertext");
    }

    /** Where the next row starts: behind a star and a length in brackets, or behind a text between rows. */
    private static int behindRowEnd(List<Token> tokens, int end) {
        int next = end + 1;
        if (isIntertext(tokens.get(end))) {
            while (next < tokens.size() && tokens.get(next).kind() == TokenKind.SPACE) {
                next++;
            }
            return next < tokens.size() && tokens.get(next).kind() == TokenKind.BEGIN_GROUP
                    ? behindGroup(tokens, next)
                    : next;
        }
        if (next < tokens.size() && tokens.get(next).isCharacter('*')) {
            next++;
        }
        if (next < tokens.size() && tokens.get(next).isCharacter('[')) {
            for (int i = next; i < tokens.size() && i < next + 40; i++) {
                if (tokens.get(i).isCharacter(']')) {
                    return i + 1;
                }
            }
        }
        return next;
    }

    private static int behindGroup(List<Token> tokens, int open) {
        int depth = 0;
        for (int i = open; i < tokens.size(); i++) {
            TokenKind kind = tokens.get(i).kind();
            depth += kind == TokenKind.BEGIN_GROUP ? 1 : kind == TokenKind.END_GROUP ? -1 : 0;
            if (depth == 0) {
                return i + 1;
            }
        }
        return tokens.size();
    }

    private void row(List<Token> tokens, int level) {
        List<Token> inner = level < DEEPEST && !table ? soleEnvironment(tokens) : null;
        if (inner != null) {
            rows(inner, level + 1);
            return;
        }
        Nesting nesting = new Nesting();
        int cellStart = 0;
        for (int i = 0; i < tokens.size(); i++) {
            Token token = tokens.get(i);
            if (nesting.isOutside(token) && token.kind() == TokenKind.ALIGN) {
                cell(tokens.subList(cellStart, i), token.span().start());
                cellStart = i + 1;
            }
        }
        List<Token> last = tokens.subList(cellStart, tokens.size());
        cell(last, tokens.isEmpty() ? 0 : tokens.get(tokens.size() - 1).span().end());
        if (cells.stream().anyMatch(cell -> !cell.tokens().isEmpty())) {
            rows.add(new Row(cells));
        }
        cells = new ArrayList<>();
    }

    private void cell(List<Token> tokens, int emptyAt) {
        List<Token> kept = table ? ofTable(tokens) : new ArrayList<>(tokens);
        kept.removeIf(token -> token.kind() == TokenKind.INLINE_SHIFT || token.kind() == TokenKind.DISPLAY_SHIFT);
        int from = 0;
        int to = kept.size();
        while (from < to && kept.get(from).kind() == TokenKind.SPACE) {
            from++;
        }
        while (to > from && kept.get(to - 1).kind() == TokenKind.SPACE) {
            to--;
        }
        if (from == to) {
            cells.add(new Cell(List.of(), new Span(emptyAt, emptyAt)));
            return;
        }
        Span span = kept.get(from).span();
        for (Token token : kept.subList(from, to)) {
            span = span.cover(token.span());
        }
        cells.add(new Cell(kept.subList(from, to), span));
    }

    /** The mathematics of a table's cell. */
    private List<Token> ofTable(List<Token> tokens) {
        boolean plain = tokens.stream()
                .noneMatch(token -> token.kind() == TokenKind.INLINE_SHIFT
                        || token.kind() == TokenKind.DISPLAY_SHIFT
                        || token.isWord("multicolumn"));
        if (!plain || !mathematicalColumns.get(cells.size())) {
            return mathematics(tokens);
        }
        List<Token> kept = new ArrayList<>(tokens);
        kept.removeIf(token -> token.kind() == TokenKind.CONTROL_WORD && RULES.contains(token.text()));
        return kept;
    }

    /** What stands between math shifts. */
    private static List<Token> mathematics(List<Token> tokens) {
        List<Token> kept = new ArrayList<>();
        boolean inside = false;
        for (Token token : tokens) {
            if (token.kind() == TokenKind.INLINE_SHIFT || token.kind() == TokenKind.DISPLAY_SHIFT) {
                inside = !inside;
                if (!inside) {
                    kept.add(new Token(TokenKind.SPACE, " ", token.span()));
                }
            } else if (inside) {
                kept.add(token);
            }
        }
        return kept;
    }

    /**
     * If the row is one layout environment with nothing beside it but labels and punctuation: the environment's
     * content, with these put before and behind it.
     */
    private static List<Token> soleEnvironment(List<Token> tokens) {
        int begin = skipMarginalia(tokens, 0);
        if (begin >= tokens.size() || !tokens.get(begin).isWord("begin")) {
            return null;
        }
        int content = behindGroup(tokens, begin + 1);
        String name = Arguments.text(tokens.subList(begin + 2, Math.max(begin + 2, content - 1)));
        if (!MathEnvironments.isLayout(name)) {
            return null;
        }
        int end = content;
        for (int depth = 1; end < tokens.size(); end++) {
            depth += tokens.get(end).isWord("begin") ? 1 : tokens.get(end).isWord("end") ? -1 : 0;
            if (depth == 0) {
                break;
            }
        }
        int behind = end + 1 < tokens.size() ? behindGroup(tokens, end + 1) : tokens.size();
        int rest = behind;
        while (rest < tokens.size()) {
            int next = skipMarginalia(tokens, rest);
            boolean punctuation = next < tokens.size()
                    && (tokens.get(next).isCharacter('.')
                            || tokens.get(next).isCharacter(',')
                            || tokens.get(next).isCharacter(';'));
            if (next == rest && !punctuation) {
                return null;
            }
            rest = punctuation ? next + 1 : next;
        }
        List<Token> inner = new ArrayList<>(tokens.subList(0, begin));
        inner.addAll(tokens.subList(behindArguments(tokens, content, end, name), end));
        inner.addAll(tokens.subList(behind, tokens.size()));
        return inner;
    }

    private static int behindArguments(List<Token> tokens, int from, int end, String name) {
        int at = from;
        for (char kind : MathEnvironments.arguments(name).toCharArray()) {
            int next = at;
            while (next < end && tokens.get(next).kind() == TokenKind.SPACE) {
                next++;
            }
            if (kind == 'm' && next < end) {
                at = tokens.get(next).kind() == TokenKind.BEGIN_GROUP ? behindGroup(tokens, next) : next + 1;
            } else if (next < end && tokens.get(next).isCharacter('[')) {
                while (next < end && !tokens.get(next).isCharacter(']')) {
                    next++;
                }
                at = Math.min(end, next + 1);
            }
        }
        return Math.min(at, end);
    }

    private static int skipMarginalia(List<Token> tokens, int from) {
        int at = from;
        while (at < tokens.size()) {
            Token token = tokens.get(at);
            if (token.kind() == TokenKind.SPACE) {
                at++;
            } else if (token.kind() == TokenKind.CONTROL_WORD && MARGINALIA.contains(token.text())) {
                at++;
                boolean argument = token.text().equals("label") || token.text().equals("tag");
                if (argument && at < tokens.size() && tokens.get(at).kind() == TokenKind.BEGIN_GROUP) {
                    at = behindGroup(tokens, at);
                }
            } else {
                break;
            }
        }
        return at;
    }
}
