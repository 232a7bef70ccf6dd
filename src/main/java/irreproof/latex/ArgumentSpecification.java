package irreproof.latex;

import java.util.ArrayList;
import java.util.List;

/** Reads the argument specification of {@code \NewDocumentCommand} ({@code s o m O{1}}). Unknown letters are left out. */
final class ArgumentSpecification {
    private final List<Token> tokens;
    private int position;

    private ArgumentSpecification(List<Token> tokens) {
        this.tokens =
                tokens.stream().filter(token -> token.kind() != TokenKind.SPACE).toList();
    }

    static List<Parameter> read(List<Token> specification) {
        return new ArgumentSpecification(specification).parameters();
    }

    private List<Parameter> parameters() {
        List<Parameter> parameters = new ArrayList<>();
        while (position < tokens.size()) {
            Token token = tokens.get(position++);
            String letter = token.kind() == TokenKind.LETTER || token.kind() == TokenKind.OTHER ? token.text() : "";
            switch (letter) {
                case "m" -> parameters.add(new Parameter.Plain());
                case "o" -> parameters.add(new Parameter.Bracketed('[', ']', null));
                case "O" -> parameters.add(new Parameter.Bracketed('[', ']', group()));
                case "s" -> parameters.add(new Parameter.Mark('*'));
                case "t" -> parameters.add(new Parameter.Mark(character()));
                case "d" -> parameters.add(new Parameter.Bracketed(character(), character(), null));
                case "D" -> parameters.add(new Parameter.Bracketed(character(), character(), group()));
                case "r" -> parameters.add(new Parameter.Bracketed(character(), character(), null));
                case "R" -> parameters.add(new Parameter.Bracketed(character(), character(), group()));
                case ">" -> group();
                default -> {
                    // "+" and "!" change nothing here
                }
            }
        }
        return parameters;
    }

    private char character() {
        return position < tokens.size() ? tokens.get(position++).text().charAt(0) : ' ';
    }

    private List<Token> group() {
        List<Token> content = new ArrayList<>();
        if (position >= tokens.size() || tokens.get(position).kind() != TokenKind.BEGIN_GROUP) {
            return content;
        }
        int depth = 0;
        while (position < tokens.size()) {
            Token token = tokens.get(position++);
            if (token.kind() == TokenKind.BEGIN_GROUP && depth++ == 0) {
                continue;
            }
            if (token.kind() == TokenKind.END_GROUP && --depth == 0) {
                break;
            }
            content.add(token);
        }
        return content;
    }
}
