package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.budget.Budget;
import irreproof.check.CheckOptions;
import irreproof.check.FileReport;
import irreproof.check.Finding;
import irreproof.check.Severity;
import irreproof.text.SourceText;
import irreproof.text.Span;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A document follows the files it includes, first as they are in the editor, then as they are on disk. */
class IncludedFilesTest {
    @TempDir
    private Path folder;

    private String paper;
    private String macros;

    /** Tells as its finding what the included file holds. */
    private static FileReport quote(SourceText source, CheckOptions options, Budget budget) {
        Matcher input = Pattern.compile("\\\\input\\{(\\w+)}").matcher(source.content());
        if (!input.find()) {
            return new FileReport(source, List.of(), List.of());
        }
        Optional<SourceText> included = options.sources().find(source.path(), input.group(1));
        return new FileReport(
                source,
                List.of(),
                List.of(new Finding(
                        "quote",
                        Severity.ADVICE,
                        new Span(0, 1),
                        included.map(SourceText::content).orElse("missing"),
                        List.of(),
                        List.of())));
    }

    @BeforeEach
    void place() {
        paper = folder.resolve("paper.tex").toUri().toString();
        macros = folder.resolve("macros.tex").toUri().toString();
    }

    private static Editor editor() {
        Editor editor = new Editor(IncludedFilesTest::quote, Duration.ZERO);
        editor.initialize("{}");
        return editor;
    }

    /** Waits until the paper quotes this. */
    private void quotes(Editor editor, String expected) {
        PublishDiagnosticsParams published = editor.nextDiagnostics();
        while (!published.getUri().equals(paper) || published.getDiagnostics().isEmpty()) {
            published = editor.nextDiagnostics();
        }
        assertEquals(expected, published.getDiagnostics().get(0).getMessage().getLeft());
    }

    @Test
    void unsavedTextsWinOverTheDisk() throws IOException {
        Files.writeString(folder.resolve("macros.tex"), "saved");
        try (Editor editor = editor()) {
            editor.open(paper, 1, "\\input{macros}");
            quotes(editor, "saved");
            editor.open(macros, 1, "opened");
            quotes(editor, "opened");
            editor.change(macros, 2, new TextDocumentContentChangeEvent("edited"));
            quotes(editor, "edited");
            editor.close(macros);
            quotes(editor, "saved");
        }
    }

    @Test
    void aNewFileIsFoundWhenItIsOpened() {
        try (Editor editor = editor()) {
            editor.open(paper, 1, "\\input{macros}");
            quotes(editor, "missing");
            editor.open(macros, 1, "new");
            quotes(editor, "new");
        }
    }

    @Test
    void documentsThatIncludeNothingOfItAreLeftAlone() {
        try (Editor editor = editor()) {
            editor.open(paper, 1, "\\input{macros}");
            quotes(editor, "missing");
            editor.open(macros, 1, "new");
            quotes(editor, "new");
            String other = folder.resolve("other.tex").toUri().toString();
            editor.open(other, 1, "other");
            editor.change(other, 2, new TextDocumentContentChangeEvent("still other"));
            editor.change(macros, 2, new TextDocumentContentChangeEvent("newer"));
            quotes(editor, "newer");
        }
    }
}
