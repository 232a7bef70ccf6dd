package irreproof.latex;

import irreproof.text.Span;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.Deque;
import java.util.List;
import java.util.Set;

/**
 * Collects the tokens of one passage up to its end and cuts them into rows. A passage that does not close ends at the
 * paragraph, at the next display or heading, so that one missing dollar costs one passage; a table may hold paragraphs.
 */
final class PassageReader {
    private static final Set<String> SECTIONING = Set.of(
            "part", "chapter", "section", "subsection", "subsubsection", "paragraph", "bibliography", "maketitle");
    private static final Set<String> OUTSIDE_FORMULAS = Set.of("item", "bibitem", "caption");

    private final Expander expander;
    private final Flattener prose;
    private final String environment;
    private final boolean table;
    private final List<Token> tokens = new ArrayList<>();
    private final Deque<String> environments = new ArrayDeque<>();
    private final TextGroups groups = new TextGroups();
    private int groupsBefore;
    private boolean shifted;
    /** The columns of a table set as mathematics, or null if this is no table. */
    private BitSet mathematicalColumns;

    private Span span;
    private boolean closed;

    PassageReader(Expander expander, Flattener prose, Token opener, String environment) {
        this.expander = expander;
        this.prose = prose;
        this.environment = environment;
        this.table = MathEnvironments.isTable(environment);
        span = opener.span();
    }

    /** Reads to the passage's end; null if there is nothing in it or its expansion had to be given up. */
    Passage read() {
        expander.takeFailure();
        groupsBefore = expander.macros().openGroups();
        expander.macros().openGroup();
        mathMode(!table);
        if (!isShift()) {
            environments.push(environment);
            BitSet columns = TableColumns.mathematical(skipArguments(environment, false));
            mathematicalColumns = table ? columns : null;
        }
        Token token = expander.next();
        while (token != null && accept(token)) {
            token = expander.next();
        }
        mathMode(false);
        while (expander.macros().openGroups() > groupsBefore) {
            expander.macros().closeGroup();
        }
        if (expander.takeFailure() || tokens.isEmpty()) {
            return null;
        }
        List<Row> rows = RowSplitter.split(tokens, mathematicalColumns);
        return rows.isEmpty() ? null : new Passage(layout(), environment, rows, span);
    }

    /** False if the passage met something that cannot stand in it. */
    boolean isClosed() {
        return closed;
    }

    Span span() {
        return span;
    }

    private Passage.Layout layout() {
        if (table) {
            return Passage.Layout.TABLE;
        }
        boolean inline = environment.equals("$") || environment.equals("\\(") || environment.equals("math");
        return inline ? Passage.Layout.INLINE : Passage.Layout.DISPLAY;
    }

    private boolean isShift() {
        return environment.equals("$")
                || environment.equals("\\(")
                || environment.equals("$$")
                || environment.equals("\\[");
    }

    private void mathMode(boolean on) {
        expander.mathMode(on);
        prose.mathMode(on);
    }

    /** Takes one token in; false if the passage ended. */
    private boolean accept(Token token) {
        switch (token.kind()) {
            case INLINE_SHIFT:
                return inlineShift(token);
            case DISPLAY_SHIFT:
                return displayShift(token);
            case CONTROL_WORD:
                return word(token);
            case PARAGRAPH_BREAK:
                if (!table) {
                    expander.push(token);
                    return false;
                }
                closeFormulaOfCell(token);
                break;
            case BEGIN_GROUP:
                expander.macros().openGroup();
                break;
            case END_GROUP:
                if (groups.depth() == 0) {
                    return stray(token);
                }
                expander.macros().closeGroup();
                break;
            case ALIGN:
                closeFormulaOfCell(token);
                break;
            case CONTROL_SYMBOL:
                if (token.text().equals("\\")) {
                    closeFormulaOfCell(token);
                }
                break;
            default:
                break;
        }
        add(token);
        return true;
    }

    /** A closing brace without its opening one ends the passage if it closes a group around it, and is dropped if not. */
    private boolean stray(Token token) {
        if (groupsBefore == 0) {
            return true;
        }
        expander.push(token);
        return false;
    }

    /** A formula in a table's cell ends with the cell at the latest. */
    private void closeFormulaOfCell(Token token) {
        if (shifted && groups.depth() == 0 && environments.size() == 1) {
            inlineShift(new Token(
                    TokenKind.INLINE_SHIFT,
                    "$",
                    new Span(token.span().start(), token.span().start())));
        }
    }

    private void add(Token token) {
        span = span.cover(token.span());
        tokens.add(token);
        groups.accept(token);
        prose.accept(token);
    }

    private boolean inlineShift(Token token) {
        if (table || groups.inText()) {
            shifted = !shifted;
            mathMode(shifted);
            add(token);
            return true;
        }
        if (environment.equals("$") || environment.equals("\\(")) {
            return close(token);
        }
        return true;
    }

    private boolean displayShift(Token token) {
        if (table) {
            add(token);
            return true;
        }
        if (environment.equals("$") && token.text().equals("$$")) {
            // two inline formulas without anything between them
            Span place = token.span();
            boolean ownCharacters = place.length() == 2;
            Span second = ownCharacters ? new Span(place.start() + 1, place.end()) : place;
            expander.push(new Token(TokenKind.INLINE_SHIFT, "$", second));
            return close(token.at(ownCharacters ? new Span(place.start(), place.start() + 1) : place));
        }
        boolean closes = environment.equals("$$") && token.text().equals("$$")
                || environment.equals("\\[") && token.text().equals("\\]");
        if (closes) {
            return close(token);
        }
        expander.push(token);
        return false;
    }

    private boolean close(Token token) {
        span = span.cover(token.span());
        closed = true;
        return false;
    }

    private boolean word(Token token) {
        String name = token.text();
        if (name.equals("begin")) {
            return begin(token);
        }
        if (name.equals("end")) {
            return end(token);
        }
        if (name.equals("ensuremath")) {
            ensuredMathematics(token);
            return true;
        }
        if (SECTIONING.contains(name) || OUTSIDE_FORMULAS.contains(name) && !table) {
            expander.push(token);
            return false;
        }
        add(token);
        return true;
    }

    /** Met only in a table, outside its formulas. */
    private void ensuredMathematics(Token token) {
        List<Token> argument = expander.arguments().mandatory();
        if (argument != null) {
            List<Token> formula = new ArrayList<>();
            formula.add(new Token(TokenKind.INLINE_SHIFT, "$", token.span()));
            formula.addAll(argument);
            formula.add(new Token(TokenKind.INLINE_SHIFT, "$", token.span()));
            expander.push(formula);
        }
    }

    private boolean begin(Token token) {
        String name = expander.arguments().name();
        if (name == null) {
            return true;
        }
        List<Token> taken = expander.arguments().lastTaken();
        boolean misplaced = MathEnvironments.isDisplay(name) && !table;
        if (misplaced) {
            expander.push(taken);
            expander.push(token);
            return false;
        }
        environments.push(name);
        silently(token);
        taken.forEach(this::silently);
        skipArguments(name, true);
        expander.macros().openGroup();
        return true;
    }

    private boolean end(Token token) {
        String name = expander.arguments().name();
        List<Token> taken = expander.arguments().lastTaken();
        if (name == null) {
            return true;
        }
        boolean innermost = environments.contains(name);
        while (innermost && !environments.isEmpty() && !environments.peek().equals(name)) {
            environments.pop();
        }
        if (innermost) {
            environments.pop();
        }
        Span end = token.span();
        for (Token part : taken) {
            end = end.cover(part.span());
        }
        if (innermost && environments.isEmpty() && !isShift()) {
            return close(token.at(end));
        }
        if (!innermost) {
            if (!MathEnvironments.isDisplay(name)) {
                expander.push(taken);
                expander.push(token);
            }
            return false;
        }
        expander.macros().closeGroup();
        silently(token);
        taken.forEach(this::silently);
        return true;
    }

    /** Takes a token in that the prose does not show. */
    private void silently(Token token) {
        span = span.cover(token.span());
        tokens.add(token);
    }

    /** Reads the environment's arguments; returns the last one. */
    private List<Token> skipArguments(String name, boolean keep) {
        List<Token> last = List.of();
        for (char kind : MathEnvironments.arguments(name).toCharArray()) {
            List<Token> argument = kind == 'o'
                    ? expander.arguments().optional()
                    : expander.arguments().mandatory();
            if (argument != null && keep) {
                expander.arguments().lastTaken().forEach(this::silently);
            }
            last = argument == null ? last : argument;
        }
        return last;
    }
}
