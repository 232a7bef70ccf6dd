package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.DiagnosticSeverity;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.junit.jupiter.api.Test;

/** Diagnostics follow the text of open documents. */
class DiagnosticsTest {
    private static final Marked WRONG = Marked.of("""
            In group SU(3) we have
            \\[ 3 \\otimes 3 = 6 \\oplus 4 \\]
                             ^^^^^^^^^^
            """);

    @Test
    void openingPublishesTheFindingsWithTheVersion() {
        try (Editor editor = Editor.plain()) {
            editor.open(Editor.URI, 7, WRONG.text());
            PublishDiagnosticsParams published = editor.nextDiagnostics();
            assertEquals(Editor.URI, published.getUri());
            assertEquals(7, published.getVersion());
            assertEquals(1, published.getDiagnostics().size());
            Diagnostic diagnostic = published.getDiagnostics().get(0);
            assertEquals(WRONG.range(), diagnostic.getRange());
            assertEquals(DiagnosticSeverity.Error, diagnostic.getSeverity());
            assertEquals(DimensionSums.RULE, diagnostic.getCode().getLeft());
            assertEquals("irreproof", diagnostic.getSource());
            assertEquals(
                    "the dimensions differ\nleft 9, right 10",
                    diagnostic.getMessage().getLeft());
            assertNull(diagnostic.getRelatedInformation(), "this client did not ask for it");
        }
    }

    @Test
    void aClientThatShowsFurtherPlacesIsToldWhereTheGroupIsNamed() {
        Marked group = Marked.of("""
                In group SU(3) we have
                         ^^^^^
                \\[ 3 \\otimes 3 = 6 \\oplus 4 \\]
                """);
        try (Editor editor =
                Editor.with("{capabilities: {textDocument: {publishDiagnostics: {relatedInformation: true}}}}")) {
            editor.open(group.text());
            Diagnostic diagnostic = editor.nextDiagnostics().getDiagnostics().get(0);
            assertEquals(
                    group.range(),
                    diagnostic.getRelatedInformation().get(0).getLocation().getRange());
        }
    }

    @Test
    void editingRepublishesAndClosingClears() {
        try (Editor editor = Editor.plain()) {
            shows(editor, 1, """
                    3 \\otimes 3 = 6 \\oplus 4
                                  ^^^^^^^^^^
                    """);
            shows(editor, 2, """
                    A new first line
                    3 \\otimes 3 = 6 \\oplus 4
                                  ^^^^^^^^^^
                    """);
            shows(editor, 3, """
                    A new first line
                    3 \\otimes 3 = 6 \\oplus 3
                    """);
            shows(editor, 4, """
                    3 \\otimes 3 = 9 \\oplus 3, and 2 \\otimes 2 = 1 \\oplus 1
                                  ^^^^^^^^^^                    ^^^^^^^^^^
                    2 \\otimes 2 = 4, 2 \\otimes 2 = 5
                                                   ^
                    """);
            editor.close(Editor.URI);
            PublishDiagnosticsParams cleared = editor.nextDiagnostics();
            assertEquals(4, cleared.getVersion());
            assertEquals(List.of(), cleared.getDiagnostics());
        }
    }

    /** Makes the text the document's and expects the marked findings in their order. */
    private static void shows(Editor editor, int version, String marked) {
        Marked expected = Marked.of(marked);
        if (version == 1) {
            editor.open(expected.text());
        } else {
            editor.change(version, new TextDocumentContentChangeEvent(expected.text()));
        }
        PublishDiagnosticsParams published = editor.nextDiagnostics();
        assertEquals(version, published.getVersion());
        assertEquals(
                expected.ranges(),
                published.getDiagnostics().stream().map(Diagnostic::getRange).toList());
    }

    @Test
    void anEmptyListAfterAnEmptyListIsNotPublished() {
        try (Editor editor = Editor.plain()) {
            editor.open("clean");
            assertEquals(List.of(), editor.nextDiagnostics().getDiagnostics());
            editor.change(2, new TextDocumentContentChangeEvent("still clean"));
            assertEquals(List.of(), editor.drainDiagnostics());
            editor.change(3, new TextDocumentContentChangeEvent(WRONG.text()));
            assertEquals(3, editor.nextDiagnostics().getVersion());
        }
    }

    @Test
    void aReopenedDocumentStartsAfresh() {
        try (Editor editor = Editor.plain()) {
            editor.open(Editor.URI, 5, WRONG.text());
            editor.nextDiagnostics();
            editor.close(Editor.URI);
            editor.nextDiagnostics();
            editor.open(Editor.URI, 0, WRONG.text());
            PublishDiagnosticsParams again = editor.nextDiagnostics();
            assertEquals(0, again.getVersion());
            assertEquals(1, again.getDiagnostics().size());
        }
    }

    @Test
    void aVeryLongDocumentIsLeftAloneWithAMessage() {
        try (Editor editor = Editor.plain()) {
            editor.open(WRONG.text() + "%".repeat(5 << 20));
            assertEquals(List.of(), editor.nextDiagnostics().getDiagnostics());
            assertTrue(editor.nextLog().getMessage().contains("too large"));
            editor.change(2, new TextDocumentContentChangeEvent(WRONG.text()));
            assertEquals(1, editor.nextDiagnostics().getDiagnostics().size());
        }
    }
}
