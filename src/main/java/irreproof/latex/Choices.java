package irreproof.latex;

import java.util.List;

/**
 * Carries out LaTeX's commands that choose between their arguments, as the bodies of macros with a star or an optional
 * argument use them.
 */
final class Choices {
    private final Expander expander;
    private final Arguments arguments;

    Choices(Expander expander) {
        this.expander = expander;
        this.arguments = expander.arguments();
    }

    /** True if the word was a choosing command and has been replaced by what it chooses. */
    boolean carryOut(Token word) {
        switch (word.text()) {
            case "IfNoValueTF", "IfNoValueT", "IfNoValueF":
                choose(word, stands(ArgumentScanner.NO_VALUE));
                return true;
            case "IfValueTF", "IfValueT", "IfValueF":
                choose(word, !stands(ArgumentScanner.NO_VALUE));
                return true;
            case "IfBooleanTF", "IfBooleanT", "IfBooleanF":
                choose(word, stands(ArgumentScanner.TRUE));
                return true;
            case "IfBlankTF", "IfBlankT", "IfBlankF":
                choose(word, isBlank(arguments.mandatory()));
                return true;
            case "@ifstar":
                ifCharacter('*', true);
                return true;
            case "@ifnextchar":
                List<Token> expected = arguments.mandatory();
                boolean single = expected != null && expected.size() == 1;
                ifCharacter(single ? expected.get(0).text().charAt(0) : ' ', false);
                return true;
            case "@ifundefined":
                String name = arguments.name();
                branch(name != null && expander.macros().find(name) == null, true, true);
                return true;
            case "texorpdfstring":
                branch(true, true, true);
                return true;
            case "ifthenelse":
                return equality(word);
            default:
                return false;
        }
    }

    private boolean stands(String marker) {
        List<Token> argument = arguments.mandatory();
        return argument != null && argument.size() == 1 && argument.get(0).isWord(marker);
    }

    private static boolean isBlank(List<Token> argument) {
        return argument == null || argument.stream().allMatch(token -> token.kind() == TokenKind.SPACE);
    }

    private void choose(Token word, boolean condition) {
        String name = word.text();
        boolean both = name.endsWith("TF");
        branch(condition, both || name.endsWith("T"), both || name.endsWith("F"));
    }

    private void branch(boolean condition, boolean hasTrue, boolean hasFalse) {
        List<Token> whenTrue = hasTrue ? arguments.mandatory() : List.of();
        List<Token> whenFalse = hasFalse ? arguments.mandatory() : List.of();
        List<Token> chosen = condition ? whenTrue : whenFalse;
        if (chosen != null) {
            expander.push(chosen);
        }
    }

    private void ifCharacter(char character, boolean eat) {
        List<Token> whenTrue = arguments.mandatory();
        List<Token> whenFalse = whenTrue == null ? null : arguments.mandatory();
        if (whenFalse == null) {
            return;
        }
        boolean found = arguments.mark(character);
        List<Token> eaten = arguments.lastTaken();
        if (found && !eat) {
            expander.push(eaten);
        }
        expander.push(found ? whenTrue : whenFalse);
    }

    /** {@code \ifthenelse{\equal{..}{..}}{..}{..}}; any other test is left to the reader of the tokens. */
    private boolean equality(Token word) {
        List<Token> test = arguments.mandatory();
        if (test == null) {
            return false;
        }
        List<Token> taken = arguments.lastTaken();
        if (test.isEmpty() || !test.get(0).isWord("equal")) {
            expander.push(taken);
            if (expander.isMathMode()) {
                expander.fail("\\ifthenelse in a formula cannot be decided", word.span());
            }
            return true;
        }
        expander.push(test.subList(1, test.size()));
        List<Token> left = arguments.mandatory();
        List<Token> right = left == null ? null : arguments.mandatory();
        boolean equal = right != null && Arguments.text(left).equals(Arguments.text(right));
        branch(equal, true, true);
        return true;
    }
}
