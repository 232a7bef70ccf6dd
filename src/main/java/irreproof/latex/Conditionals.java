package irreproof.latex;

import java.util.List;
import java.util.Set;

/**
 * Resolves TeX's conditionals as far as they can be known here: {@code \iftrue}, {@code \iffalse}, {@code \newif}
 * switches, {@code \ifmmode}, {@code \ifx}, {@code \ifnum} of plain numbers. Of
 * any other the first branch is read in prose; in mathematics it spoils the passage. Of what is not known as a conditional
 * (a class file's own switch) both branches are read.
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
            "iffontchar",
            "ifpdf",
            "ifxetex",
            "ifluatex",
            "ifPDFTeX",
            "ifXeTeX",
            "ifLuaTeX");

    private final Expander expander;
    private final MacroTable macros;
    /** Branches being read whose end has not come yet; without any, an {@code \\else} belongs to nothing known. */
    private int openBranches;

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
                if (openBranches > 0) {
                    openBranches--;
                    skip(word, false);
                }
                return true;
            case "fi":
                openBranches = Math.max(0, openBranches - 1);
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
            case "iftrue", "ifpdf", "ifPDFTeX" -> Boolean.TRUE;
            case "iffalse", "ifxetex", "ifluatex", "ifXeTeX", "ifLuaTeX" -> Boolean.FALSE;
            case "ifmmode" -> expander.isMathMode();
            case "ifx" -> sameMeaning(expander.raw(), expander.raw());
            case "ifdefined" -> isDefined(expander.raw());
            case "ifnum" -> compare();
            default -> macros.switchState(name.substring(2));
        };
        if (value == null && expander.isMathMode()) {
            expander.fail("\\" + name + " in a formula cannot be decided", word.span());
        } else if (Boolean.FALSE.equals(value)) {
            skip(word, true);
        } else {
            openBranches++;
        }
    }

    private boolean sameMeaning(Token one, Token other) {
        if (one == null || other == null) {
            return false;
        }
        Macro first = meaning(one);
        Macro second = meaning(other);
        if (first != null || second != null) {
            return first != null && first.equals(second);
        }
        return one.kind() == other.kind() && one.text().equals(other.text());
    }

    /** The macro a control sequence stands for; {@code \empty} counts as one without tokens. */
    private Macro meaning(Token token) {
        if (token.kind() != TokenKind.CONTROL_WORD && token.kind() != TokenKind.CONTROL_SYMBOL) {
            return null;
        }
        Macro macro = macros.find(token.text());
        boolean empty = macro == null && (token.isWord("empty") || token.isWord("@empty"));
        return empty ? Macro.of(List.of(), List.of()) : macro;
    }

    /** Only of the user's own commands do we know it. */
    private Boolean isDefined(Token token) {
        return token != null && macros.find(token.text()) != null ? Boolean.TRUE : null;
    }

    /** {@code \ifnum} of two numbers written out, or null. */
    private Boolean compare() {
        Integer left = number();
        Token relation = expander.raw();
        if (left == null || relation == null) {
            expander.push(relation);
            return null;
        }
        Integer right = number();
        if (right == null) {
            return null;
        }
        int order = Integer.compare(left, right);
        return switch (relation.text()) {
            case "<" -> order < 0;
            case "=" -> order == 0;
            case ">" -> order > 0;
            default -> null;
        };
    }

    private Integer number() {
        Integer value = null;
        Token token = expander.raw();
        while (token != null && token.kind() == TokenKind.DIGIT && (value == null || value < 10_000_000)) {
            value = (value == null ? 0 : 10 * value) + token.text().charAt(0) - '0';
            token = expander.raw();
        }
        if (token == null || token.kind() != TokenKind.SPACE) {
            expander.push(token);
        }
        return value;
    }

    /** Skips to the matching {@code \fi}, or behind the matching {@code \else}, whose branch is then open. */
    private void skip(Token from, boolean stopAtElse) {
        int depth = 0;
        for (Token token = expander.raw(); token != null; token = expander.raw()) {
            if (token.kind() != TokenKind.CONTROL_WORD) {
                continue;
            }
            if (isConditional(token.text())) {
                depth++;
            } else if (token.isWord("fi") && depth-- == 0) {
                return;
            } else if (stopAtElse && depth == 0 && token.isWord("else")) {
                openBranches++;
                return;
            }
        }
        expander.report("\\" + from.text() + " has no \\fi; the rest is not read");
    }
}
