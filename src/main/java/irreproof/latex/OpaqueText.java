package irreproof.latex;

import irreproof.text.Span;
import java.util.HashSet;
import java.util.Set;

/**
 * Finds what TeX does not read as TeX: verbatim-like environments, {@code \\verb} and its kin, addresses. A command whose
 * argument does not close on its line is taken to end there.
 */
final class OpaqueText {
    private static final Set<String> ENVIRONMENTS = Set.of(
            "verbatim",
            "verbatim*",
            "Verbatim",
            "Verbatim*",
            "BVerbatim",
            "LVerbatim",
            "lstlisting",
            "minted",
            "comment",
            "filecontents",
            "filecontents*",
            "alltt",
            "luacode",
            "luacode*");
    private static final int LONGEST_ENVIRONMENT_NAME = 40;
    private static final int LONGEST_ADDRESS = 4000;

    /**
     * An opaque stretch.
     *
     * @param body without its delimiters
     * @param end behind its closing delimiter
     */
    record Stretch(Span body, int end) {}

    private final String text;
    private final Set<String> environments = new HashSet<>(ENVIRONMENTS);

    OpaqueText(String text) {
        this.text = text;
    }

    void addEnvironment(String name) {
        environments.add(name);
    }

    /** What the command, with its letters ending at the position, makes opaque; or null. */
    Stretch behind(String word, int position) {
        return switch (word) {
            case "begin" -> environment(position);
            case "verb", "Verb" -> delimited(position);
            case "lstinline" -> delimited(skipBracketed(position, '[', ']'));
            case "mintinline" -> delimited(skipBracketed(skipBracketed(position, '[', ']'), '{', '}'));
            case "url", "path", "nolinkurl", "href" -> address(position);
            default -> null;
        };
    }

    private Stretch environment(int open) {
        if (!stands('{', open)) {
            return null;
        }
        int last = Math.min(text.length(), open + LONGEST_ENVIRONMENT_NAME);
        int close = open + 1;
        while (close < last && text.charAt(close) != '}') {
            close++;
        }
        if (close == last) {
            return null;
        }
        String name = text.substring(open + 1, close);
        if (!environments.contains(name)) {
            return null;
        }
        String closing = "\\end{" + name + "}";
        int end = text.indexOf(closing, close);
        return end < 0
                ? new Stretch(new Span(close + 1, text.length()), text.length())
                : new Stretch(new Span(close + 1, end), end + closing.length());
    }

    private Stretch delimited(int from) {
        int open = stands('*', from) ? from + 1 : from;
        if (open >= text.length() || Lexer.isLineEnd(text.charAt(open)) || text.charAt(open) == '}') {
            return null;
        }
        char closer = text.charAt(open) == '{' ? '}' : text.charAt(open);
        int close = open + 1;
        while (close < text.length() && text.charAt(close) != closer && !Lexer.isLineEnd(text.charAt(close))) {
            close++;
        }
        return new Stretch(new Span(open + 1, close), stands(closer, close) ? close + 1 : close);
    }

    private Stretch address(int open) {
        int end = skipBracketed(open, '{', '}');
        return end == open ? null : new Stretch(new Span(open + 1, end - 1), end);
    }

    private boolean stands(char character, int position) {
        return position < text.length() && text.charAt(position) == character;
    }

    /** Behind a bracketed stretch that closes on the same line, or where it was asked to start. */
    private int skipBracketed(int from, char opener, char closer) {
        if (!stands(opener, from)) {
            return from;
        }
        int depth = 0;
        int last = Math.min(text.length(), from + LONGEST_ADDRESS);
        for (int i = from; i < last && !Lexer.isLineEnd(text.charAt(i)); i++) {
            char c = text.charAt(i);
            if (c == opener) {
                depth++;
            } else if (c == closer && --depth == 0) {
                return i + 1;
            }
        }
        return from;
    }
}
