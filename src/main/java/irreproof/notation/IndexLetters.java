package irreproof.notation;

import irreproof.notation.parser.StatementParser;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Settles what the subscripts a and A mean. Beside a subscript b ({@code 15_a\\oplus 15_b},
 * {@code \mathbf{3}_A\otimes\mathbf{3}_B}) they tell names apart and do not say "antisymmetric".
 */
final class IndexLetters {
    private IndexLetters() {}

    static Segment settle(Segment segment) {
        boolean indexed = segment.sides().stream()
                .flatMap(List::stream)
                .anyMatch(lexeme -> letter(lexeme).toLowerCase(Locale.ROOT).equals("b"));
        if (!indexed) {
            return segment;
        }
        List<List<Lexeme>> sides = new ArrayList<>();
        for (List<Lexeme> side : segment.sides()) {
            sides.add(side.stream().map(IndexLetters::withoutPart).toList());
        }
        return new Segment(sides, segment.relations(), segment.listed());
    }

    private static Lexeme withoutPart(Lexeme lexeme) {
        if (!letter(lexeme).toLowerCase(Locale.ROOT).equals("a")) {
            return lexeme;
        }
        Lexeme.Script script = (Lexeme.Script) lexeme.content();
        return new Lexeme(
                StatementParser.SUBSCRIPT,
                new Lexeme.Script(new ScriptMeaning.Other(), script.written()),
                lexeme.span());
    }

    /** The one letter of a subscript, or nothing. */
    private static String letter(Lexeme lexeme) {
        boolean subscript = lexeme.is(StatementParser.SUBSCRIPT);
        if (!subscript || !(lexeme.content() instanceof Lexeme.Script script)) {
            return "";
        }
        String letter = script.written().replaceAll("\\\\[A-Za-z]+\\s*|[{}\\s]", "");
        return letter.length() == 1 ? letter : "";
    }
}
