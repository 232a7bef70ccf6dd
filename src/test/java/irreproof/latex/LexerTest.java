package irreproof.latex;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** How a source falls into tokens: The TeXbook, chapter 8. */
final class LexerTest {
    private static List<Token> tokens(String text) {
        List<Token> tokens = new ArrayList<>();
        Lexer lexer = new Lexer(text);
        for (Token token = lexer.next(); token != null; token = lexer.next()) {
            tokens.add(token);
        }
        return tokens;
    }

    private static String kinds(String text) {
        StringBuilder shown = new StringBuilder();
        for (Token token : tokens(text)) {
            shown.append(shown.length() == 0 ? "" : " ").append(token.kind()).append(':');
            shown.append(
                    token.kind() == TokenKind.SPACE || token.kind() == TokenKind.PARAGRAPH_BREAK ? "" : token.text());
        }
        return shown.toString();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "a1é+ | LETTER:a DIGIT:1 LETTER:é OTHER:+",
                "\\foo bar | CONTROL_WORD:foo LETTER:b LETTER:a LETTER:r",
                "\\, \\\\[ | CONTROL_SYMBOL:, SPACE: CONTROL_SYMBOL:\\ OTHER:[",
                "{}&^_~ | BEGIN_GROUP:{ END_GROUP:} ALIGN:& SUPERSCRIPT:^ SUBSCRIPT:_ SPACE:",
                "$$$ | DISPLAY_SHIFT:$$ INLINE_SHIFT:$",
                "\\(\\)\\[\\] | INLINE_SHIFT:\\( INLINE_SHIFT:\\) DISPLAY_SHIFT:\\[ DISPLAY_SHIFT:\\]",
                "#1##2# | PARAMETER:1 PARAMETER:# DIGIT:2 OTHER:#",
                "\\verb+$%+a | VERBATIM:$% LETTER:a",
                "\\url{a%b}c | VERBATIM:a%b LETTER:c",
                "\\foo@bar | CONTROL_WORD:foo OTHER:@ LETTER:b LETTER:a LETTER:r",
                "\\%\\$ | CONTROL_SYMBOL:% CONTROL_SYMBOL:$",
                "\\begin{verbatim}$\\end{verbatim}a | VERBATIM:$ LETTER:a",
                "\\begin{align} | CONTROL_WORD:begin BEGIN_GROUP:{ LETTER:a LETTER:l LETTER:i LETTER:g LETTER:n END_GROUP:}",
            })
    void oneLine(String text, String expected) {
        assertEquals(expected, kinds(text));
    }

    @Test
    void blanksAndLineEnds() {
        for (String end : List.of("\n", "\r\n", "\r")) {
            assertEquals("LETTER:a SPACE: LETTER:b", kinds("a " + end + "\t b"));
            assertEquals("LETTER:a PARAGRAPH_BREAK: LETTER:b", kinds("a" + end + " " + end + "b"));
            assertEquals("CONTROL_WORD:x LETTER:b", kinds("\\x" + end + "b"));
            assertEquals("CONTROL_WORD:x PARAGRAPH_BREAK: LETTER:b", kinds("\\x" + end + end + "b"));
            assertEquals("LETTER:a COMMENT:c LETTER:b", kinds("a%c" + end + "  b"));
            assertEquals("LETTER:a COMMENT:c PARAGRAPH_BREAK: LETTER:b", kinds("a%c" + end + end + "b"));
            assertEquals("CONTROL_SYMBOL:  LETTER:b", kinds("\\" + end + "b"));
        }
    }

    @Test
    void theTokensCoverTheSource() {
        String text =
                "\\newcommand{\\x}[1]{a #1}% c\n$\\x{𝟛}$ \\verb+$+ \\[ & \\] é~\\begin{comment} $ \\end{comment}.";
        int end = 0;
        for (Token token : tokens(text)) {
            assertEquals("", text.substring(end, token.span().start()).strip());
            end = token.span().end();
        }
        assertEquals(text.length(), end);
    }
}
