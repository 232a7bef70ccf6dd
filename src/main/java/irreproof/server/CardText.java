package irreproof.server;

import irreproof.check.Card;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.eclipse.lsp4j.MarkupContent;
import org.eclipse.lsp4j.MarkupKind;

/** Prints a card as Markdown that also reads well unrendered, or as plain text; no tables, which few editors render. */
record CardText(String title, List<Card.Row> rows) {
    /** What Markdown or an editor's mathematics extension might take for markup. */
    private static final Pattern SPECIAL = Pattern.compile("[\\\\`*_{}\\[\\]<>#~|&$]");

    private static final Pattern BACKTICKS = Pattern.compile("`+");

    MarkupContent in(boolean markdown) {
        return markdown
                ? new MarkupContent(MarkupKind.MARKDOWN, markdown())
                : new MarkupContent(MarkupKind.PLAINTEXT, plain());
    }

    private String markdown() {
        String head = title.isEmpty() ? "" : "**" + span(title) + "**\n\n";
        return head + rows.stream().map(CardText::markdown).collect(Collectors.joining("\n"));
    }

    private static String markdown(Card.Row row) {
        String value = row.value().contains("\n") ? "\n" + block(row.value()) : " " + span(row.value());
        return "- " + span(row.label()) + ":" + value;
    }

    private static String span(String text) {
        if (!SPECIAL.matcher(text).find()) {
            return text;
        }
        String fence = fence(text, 1);
        String padding = text.startsWith("`") || text.endsWith("`") ? " " : "";
        return fence + padding + text + padding + fence;
    }

    private static String block(String text) {
        String fence = fence(text, 3);
        return "\n" + fence + "text\n" + text.stripTrailing() + "\n" + fence;
    }

    /** More backticks than stand together anywhere in the text. */
    private static String fence(String text, int least) {
        int longest = BACKTICKS
                .matcher(text)
                .results()
                .mapToInt(run -> run.end() - run.start())
                .max()
                .orElse(0);
        return "`".repeat(Math.max(least, longest + 1));
    }

    private String plain() {
        String head = title.isEmpty() ? "" : title + "\n\n";
        return head + rows.stream().map(CardText::plain).collect(Collectors.joining("\n"));
    }

    private static String plain(Card.Row row) {
        String value = row.value().contains("\n") ? "\n" + row.value().indent(2).stripTrailing() : " " + row.value();
        return row.label() + ":" + value;
    }
}
