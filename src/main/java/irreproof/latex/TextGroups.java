package irreproof.latex;

import java.util.BitSet;
import java.util.Set;

/**
 * The groups open inside a formula, and which of them hold text ({@code \\text{..}}), where blanks count and a dollar
 * opens mathematics. A group inside such a group holds text as well.
 */
final class TextGroups {
    private static final Set<String> COMMANDS = Set.of(
            "text",
            "mbox",
            "hbox",
            "textrm",
            "textbf",
            "textit",
            "textsf",
            "texttt",
            "textsc",
            "textnormal",
            "textup",
            "intertext",
            "shortintertext",
            "makebox",
            "fbox",
            "multicolumn",
            "footnote",
            "tag",
            "parbox",
            "raisebox",
            "colorbox",
            "textcolor");

    private final BitSet holdsText = new BitSet();
    private int depth;
    private boolean commandBefore;

    /** Takes note of a token; called for every one, in order. */
    void accept(Token token) {
        boolean furtherArgument = false;
        switch (token.kind()) {
            case BEGIN_GROUP -> {
                holdsText.set(depth, commandBefore || inText());
                depth++;
            }
            case END_GROUP -> {
                boolean text = inText();
                depth = Math.max(0, depth - 1);
                furtherArgument = text && !inText();
            }
            default -> {
                // changes no group
            }
        }
        boolean command = token.kind() == TokenKind.CONTROL_WORD && COMMANDS.contains(token.text());
        commandBefore = command || furtherArgument || commandBefore && token.kind() == TokenKind.SPACE;
    }

    int depth() {
        return depth;
    }

    boolean inText() {
        return depth > 0 && holdsText.get(depth - 1);
    }
}
