package irreproof.latex;

import irreproof.budget.Budget;
import irreproof.text.SourceText;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * A manuscript of one or several files for tests, read on demand. Passages are shown as one line: tokens as TeX would
 * print them, cells joined by {@code &}, rows by {@code //}.
 */
public final class Manuscript {
    private static final String MAIN = "main.tex";
    private final String text;
    private final Map<String, String> files = new HashMap<>();
    private LatexDocument document;

    private Manuscript(String text) {
        this.text = text;
    }

    public static Manuscript of(String text) {
        return new Manuscript(text);
    }

    /** Adds a file that the main one may include. */
    public Manuscript with(String path, String content) {
        files.put(path, content);
        return this;
    }

    public LatexDocument document() {
        if (document == null) {
            SourceProvider sources =
                    (from, name) -> Optional.ofNullable(files.get(name)).map(content -> new SourceText(name, content));
            document = Reader.read(new SourceText(MAIN, text), sources, Budget.unlimited());
        }
        return document;
    }

    public List<String> passages() {
        return document().passages().stream().map(Manuscript::show).toList();
    }

    public String prose() {
        return document().prose().text();
    }

    public static String show(Passage passage) {
        return passage.rows().stream()
                .map(row ->
                        row.cells().stream().map(cell -> show(cell.tokens())).collect(Collectors.joining(" & ")))
                .collect(Collectors.joining(" // "));
    }

    /** Tokens as TeX would print them: a blank behind a control word that a letter follows. */
    public static String show(List<Token> tokens) {
        StringBuilder shown = new StringBuilder();
        boolean word = false;
        for (Token token : tokens) {
            boolean letter = token.kind() == TokenKind.LETTER;
            if (word && letter) {
                shown.append(' ');
            }
            word = token.kind() == TokenKind.CONTROL_WORD;
            boolean control = word || token.kind() == TokenKind.CONTROL_SYMBOL;
            shown.append(control ? "\\" : token.kind() == TokenKind.PARAMETER ? "#" : "")
                    .append(token.text());
        }
        return shown.toString();
    }
}
