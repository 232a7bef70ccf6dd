package irreproof.latex;

import java.util.Set;

/**
 * Resolves TeX's conditionals as far as they can be known here: {@code \iftrue}, {@code \iffalse}, {@code \newif}
 * switches, {@code \ifmmode}. Of any other both branches are read in prose; in mathematics it spoils the passage.
 */
final class Conditionals {
    private static final Set<String> PRIMITIVES = Set.of(
            "if",
            "ifx",
            "ifcat",
            "ifnum",
            "ifdim",
            "ifodd",
            "ifcase",
            "iftrue",
            "iffalse",
            "ifmmode",
            "ifhmode",
            "ifvmode",
            "ifinner",
            "ifvoid",
            "ifhbox",
            "ifvbox",
            "ifeof",
            "ifdefined",
            "ifcsname",
            "iffontchar");

    private final Expander expander;
    private final MacroTable macros;

    Conditionals(Expander expander) {
        this.expander = expander;
        this.macros = expander.macros();
    }

    /** True if the word belonged to a conditional and has been dealt with. */
    boolean carryOut(Token word) {
        String name = word.text();
        switch (name) {
            case "newif":
                declare();
                return true;
            case "else", "or":
                // reached only at the end of a branch that was taken
                skip(false);
                return true;
            case "fi":
                return true;
            default:
                break;
        }
        if (isConditional(name)) {
            decide(word);
            return true;
        }
        return assigns(name, "true") || assigns(name, "false");
    }

    private void declare() {
        Token name = expander.arguments().controlSequence();
        if (name != null && name.text().startsWith("if")) {
            macros.setSwitch(name.text().substring(2), false);
        }
    }

    private boolean assigns(String name, String value) {
        if (!name.endsWith(value)) {
            return false;
        }
        String switchName = name.substring(0, name.length() - value.length());
        if (macros.switchState(switchName) == null) {
            return false;
        }
        macros.setSwitch(switchName, value.equals("true"));
        return true;
    }

    private boolean isConditional(String name) {
        return PRIMITIVES.contains(name) || name.startsWith("if") && macros.switchState(name.substring(2)) != null;
    }

    private void decide(Token word) {
        String name = word.text();
        Boolean value = switch (name) {
            case "iftrue" -> Boolean.TRUE;
            case "iffalse" -> Boolean.FALSE;
            case "ifmmode" -> expander.isMathMode();
            default -> macros.switchState(name.substring(2));
        };
        if (value == null) {
            if (expander.isMathMode()) {
                expander.fail("\\" + name + " in a formula cannot be decided", word.span());
            }
        } else if (!value) {
            skip(true);
        }
    }

    /** Skips to the matching {@code \fi}, or behind the matching {@code \else}. */
    private void skip(boolean stopAtElse) {
        int depth = 0;
        while (true) {
            Token token = expander.raw();
            if (token == null) {
                return;
            }
            if (token.kind() != TokenKind.CONTROL_WORD) {
                continue;
            }
            if (isConditional(token.text())) {
                depth++;
            } else if (token.isWord("fi") && depth-- == 0 || stopAtElse && depth == 0 && token.isWord("else")) {
                return;
            }
        }
    }
}
