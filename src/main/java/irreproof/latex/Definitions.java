package irreproof.latex;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/** Carries out the commands that define commands and environments. What cannot be read defines nothing. */
final class Definitions {
    private static final Set<String> PREFIXES = Set.of("global", "long", "outer", "protected");

    private final Expander expander;
    private final MacroTable macros;
    private final Arguments arguments;

    Definitions(Expander expander) {
        this.expander = expander;
        this.macros = expander.macros();
        this.arguments = expander.arguments();
    }

    /** True if the word was a defining command; it and its arguments are then used up. */
    boolean carryOut(Token word) {
        if (PREFIXES.contains(word.text())) {
            return true;
        }
        switch (word.text()) {
            case "newcommand", "renewcommand", "DeclareRobustCommand", "newrobustcmd", "renewrobustcmd":
                command(true);
                return true;
            case "providecommand", "providerobustcmd":
                command(false);
                return true;
            case "def", "edef":
                primitive(false);
                return true;
            case "gdef", "xdef":
                primitive(true);
                return true;
            case "@namedef":
                named();
                return true;
            case "let":
                let();
                return true;
            case "DeclareMathOperator":
                operator();
                return true;
            case "DeclarePairedDelimiter":
                pairedDelimiter();
                return true;
            case "NewDocumentCommand", "RenewDocumentCommand", "DeclareDocumentCommand", "NewExpandableDocumentCommand":
                documentCommand(true);
                return true;
            case "ProvideDocumentCommand":
                documentCommand(false);
                return true;
            case "newenvironment", "renewenvironment":
                environment();
                return true;
            case "NewDocumentEnvironment", "RenewDocumentEnvironment", "DeclareDocumentEnvironment":
                documentEnvironment();
                return true;
            case "lstnewenvironment", "DefineVerbatimEnvironment", "newverbatim":
                verbatimEnvironment();
                return true;
            default:
                return false;
        }
    }

    private void command(boolean replace) {
        arguments.star();
        Token name = arguments.controlSequence();
        if (name == null) {
            return;
        }
        List<Parameter> parameters = countedParameters();
        List<Token> body = arguments.mandatory();
        if (body != null && (replace || macros.find(name.text()) == null)) {
            macros.define(name.text(), Macro.of(parameters, body));
        }
    }

    /** {@code [n][default]} */
    private List<Parameter> countedParameters() {
        List<Token> count = arguments.optional();
        List<Parameter> parameters = new ArrayList<>();
        if (count == null) {
            return parameters;
        }
        String digits = Arguments.text(count);
        int number = digits.length() == 1 && Character.isDigit(digits.charAt(0)) ? digits.charAt(0) - '0' : 0;
        List<Token> fallback = arguments.optional();
        for (int i = 0; i < number; i++) {
            boolean first = i == 0 && fallback != null;
            parameters.add(first ? new Parameter.Bracketed('[', ']', fallback) : new Parameter.Plain());
        }
        return parameters;
    }

    /** {@code \def\name<parameter text>{body}} */
    private void primitive(boolean global) {
        Token name = expander.raw();
        while (name != null && name.kind() == TokenKind.SPACE) {
            name = expander.raw();
        }
        if (name != null && name.isWord("expandafter")) {
            name = expander.raw();
        }
        if (name != null && name.isWord("csname")) {
            name = arguments.constructed(name);
        }
        if (name == null || name.kind() != TokenKind.CONTROL_WORD && name.kind() != TokenKind.CONTROL_SYMBOL) {
            expander.push(name);
            return;
        }
        List<Token> prefix = new ArrayList<>();
        List<Token> delimiter = prefix;
        List<Parameter> parameters = new ArrayList<>();
        boolean parameter = false;
        Token token = expander.raw();
        while (token != null && token.kind() != TokenKind.BEGIN_GROUP) {
            if (token.kind() == TokenKind.PARAGRAPH_BREAK || token.kind() == TokenKind.END_GROUP) {
                expander.push(token);
                return;
            }
            if (token.kind() == TokenKind.PARAMETER) {
                addParameter(parameters, parameter, delimiter);
                parameter = true;
                delimiter = new ArrayList<>();
            } else {
                delimiter.add(token);
            }
            token = expander.raw();
        }
        addParameter(parameters, parameter, delimiter);
        expander.push(token);
        List<Token> body = arguments.mandatory();
        if (body == null) {
            return;
        }
        Macro macro = new Macro(prefix, parameters, body, true);
        if (global) {
            macros.defineGlobally(name.text(), macro);
        } else {
            macros.define(name.text(), macro);
        }
    }

    private void named() {
        String name = arguments.name();
        List<Token> body = name == null ? null : arguments.mandatory();
        if (body != null) {
            macros.define(name, Macro.of(List.of(), body));
        }
    }

    private static void addParameter(List<Parameter> parameters, boolean pending, List<Token> delimiter) {
        if (pending) {
            parameters.add(delimiter.isEmpty() ? new Parameter.Plain() : new Parameter.Delimited(delimiter));
        }
    }

    private void let() {
        Token name = arguments.controlSequence();
        if (name == null) {
            return;
        }
        Token meaning = expander.raw();
        while (meaning != null && (meaning.kind() == TokenKind.SPACE || meaning.isCharacter('='))) {
            meaning = expander.raw();
        }
        if (meaning == null || meaning.kind() == TokenKind.PARAGRAPH_BREAK) {
            return;
        }
        boolean command = meaning.kind() == TokenKind.CONTROL_WORD || meaning.kind() == TokenKind.CONTROL_SYMBOL;
        Macro macro = command ? macros.find(meaning.text()) : null;
        macros.define(name.text(), macro == null ? Macro.alias(meaning) : macro);
    }

    private void operator() {
        boolean star = arguments.star();
        Token name = arguments.controlSequence();
        List<Token> body = name == null ? null : arguments.mandatory();
        if (body == null) {
            return;
        }
        Token place = name;
        List<Token> expansion = new ArrayList<>();
        expansion.add(new Token(TokenKind.CONTROL_WORD, "operatorname", place.span()));
        if (star) {
            expansion.add(new Token(TokenKind.OTHER, "*", place.span()));
        }
        expansion.add(new Token(TokenKind.BEGIN_GROUP, "{", place.span()));
        expansion.addAll(body);
        expansion.add(new Token(TokenKind.END_GROUP, "}", place.span()));
        macros.define(name.text(), Macro.of(List.of(), expansion));
    }

    private void pairedDelimiter() {
        Token name = arguments.controlSequence();
        List<Token> left = name == null ? null : arguments.mandatory();
        List<Token> right = left == null ? null : arguments.mandatory();
        if (right == null) {
            return;
        }
        List<Token> expansion = new ArrayList<>(left);
        expansion.add(new Token(TokenKind.PARAMETER, "3", name.span()));
        expansion.addAll(right);
        List<Parameter> parameters =
                List.of(new Parameter.Mark('*'), new Parameter.Bracketed('[', ']', List.of()), new Parameter.Plain());
        macros.define(name.text(), Macro.of(parameters, expansion));
    }

    private void documentCommand(boolean replace) {
        Token name = arguments.controlSequence();
        List<Token> specification = name == null ? null : arguments.mandatory();
        List<Token> body = specification == null ? null : arguments.mandatory();
        if (body != null && (replace || macros.find(name.text()) == null)) {
            macros.define(name.text(), Macro.of(ArgumentSpecification.read(specification), body));
        }
    }

    private void environment() {
        arguments.star();
        String name = arguments.name();
        if (name == null) {
            return;
        }
        List<Parameter> parameters = countedParameters();
        List<Token> begin = arguments.mandatory();
        List<Token> end = begin == null ? null : arguments.mandatory();
        if (end != null) {
            Macro opening = Macro.of(parameters, begin);
            macros.defineEnvironment(name, new MacroTable.Environment(opening, Macro.of(List.of(), end)));
        }
    }

    private void documentEnvironment() {
        String name = arguments.name();
        List<Token> specification = name == null ? null : arguments.mandatory();
        List<Token> begin = specification == null ? null : arguments.mandatory();
        List<Token> end = begin == null ? null : arguments.mandatory();
        if (end != null) {
            Macro opening = Macro.of(ArgumentSpecification.read(specification), begin);
            macros.defineEnvironment(name, new MacroTable.Environment(opening, Macro.of(List.of(), end)));
        }
    }

    private void verbatimEnvironment() {
        String name = arguments.name();
        if (name != null) {
            expander.lexer().addVerbatimEnvironment(name);
        }
    }
}
