package irreproof.notation;

import irreproof.notation.Expression.Face;
import irreproof.notation.Expression.PowerKind;
import irreproof.notation.Expression.Symmetry;
import irreproof.text.Span;
import java.util.List;
import org.antlr.v4.runtime.CharStream;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.TokenSource;

/**
 * One token of the statement grammar, with what was read into it and the author's characters that it stands for. The
 * type is one of the constants of the generated parser.
 */
final class Lexeme implements Token {
    /** What a lexeme says beyond its type. */
    sealed interface Content {}

    /** A plain operator, bracket or break, or something unreadable. */
    record Bare() implements Content {}

    /** A run of digits. */
    record Digits(String digits, Face face) implements Content {}

    /** {@code \frac{1}{2}}. */
    record Fraction(String numerator, String denominator, Face face) implements Content {}

    /** A Young diagram's row lengths; empty for the singlet. */
    record Shape(List<Integer> rows) implements Content {}

    /** Primes or stars: how many. */
    record Count(int count) implements Content {}

    /** A subscript or a superscript: what it says, and how it was written. */
    record Script(ScriptMeaning meaning, String written) implements Content {}

    /** {@code ^2}, {@code ^{\otimes 3}}; or in front {@code \Lambda^2}. */
    record Exponent(PowerKind kind, int exponent, boolean operatorWritten) implements Content {}

    /** A relation sign. */
    record Sign(Relation.Kind kind, boolean negated) implements Content {}

    /** {@code \otimes_S}. */
    record Projected(Symmetry symmetry) implements Content {}

    /** Words set in a display. */
    record Words(String text) implements Content {}

    static final Content BARE = new Bare();

    private final int type;
    private final Content content;
    private final Span span;

    Lexeme(int type, Content content, Span span) {
        this.type = type;
        this.content = content;
        this.span = span;
    }

    static Lexeme bare(int type, Span span) {
        return new Lexeme(type, BARE, span);
    }

    Content content() {
        return content;
    }

    Span span() {
        return span;
    }

    boolean is(int wanted) {
        return type == wanted;
    }

    @Override
    public int getType() {
        return type;
    }

    /** The parser never looks at it. */
    @Override
    public String getText() {
        return "";
    }

    @Override
    public int getLine() {
        return 0;
    }

    @Override
    public int getCharPositionInLine() {
        return span.start();
    }

    @Override
    public int getChannel() {
        return DEFAULT_CHANNEL;
    }

    @Override
    public int getTokenIndex() {
        return -1;
    }

    @Override
    public int getStartIndex() {
        return span.start();
    }

    @Override
    public int getStopIndex() {
        return span.end() - 1;
    }

    @Override
    public TokenSource getTokenSource() {
        return null;
    }

    @Override
    public CharStream getInputStream() {
        return null;
    }
}
