package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.check.CheckOptions;
import irreproof.check.Checker;
import irreproof.check.Finding;
import irreproof.text.SourceText;
import irreproof.workspace.FileCache;
import irreproof.workspace.OpenDocuments;
import irreproof.workspace.ProjectSources;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import org.eclipse.lsp4j.CodeActionContext;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.eclipse.lsp4j.TextEdit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The server with the real check on the demo manuscript. */
class ManuscriptTest {
    private static final Path DEMO = Path.of("src", "demo").toAbsolutePath();

    private static Editor editor() {
        Editor editor = new Editor(Checker::check, Duration.ZERO);
        editor.initialize("{capabilities: {textDocument: {hover: {contentFormat: ['markdown']},"
                + " codeAction: {codeActionLiteralSupport: {codeActionKind: {valueSet: []}}}}}}");
        return editor;
    }

    @ParameterizedTest
    @ValueSource(strings = {"lantern.tex", "spinors.tex", "clean.tex"})
    void theEditorShowsWhatTheCommandLineFinds(String name) throws IOException {
        Path file = DEMO.resolve(name);
        SourceText source = new SourceText(file.toString(), Files.readString(file));
        ProjectSources sources = new ProjectSources(source, OpenDocuments.none(), new FileCache());
        List<String> expected = Checker.check(
                        source, new CheckOptions("", sources, CheckOptions.DEFAULT_STEPS), Budget.unlimited())
                .allFindings()
                .stream()
                .map(Finding::rule)
                .toList();
        try (Editor editor = editor()) {
            editor.open(file.toUri().toString(), 1, source.content());
            PublishDiagnosticsParams published = editor.nextDiagnostics();
            assertEquals(
                    expected,
                    published.getDiagnostics().stream()
                            .map(Diagnostic::getCode)
                            .map(code -> code.getLeft())
                            .toList());
        }
    }

    @Test
    void macrosThatAreBeingWrittenCountAtOnce() {
        String macros = DEMO.resolve("macros.tex").toUri().toString();
        try (Editor editor = editor()) {
            editor.open(
                    DEMO.resolve("new.tex").toUri().toString(),
                    1,
                    "\\input{macros} In SU(3) $\\wick\\otimes\\wick = \\rep{6}\\oplus\\rep{3}$");
            assertEquals(List.of(), editor.nextDiagnostics().getDiagnostics(), "\\wick means nothing yet");
            editor.open(macros, 1, "");
            editor.change(
                    macros,
                    2,
                    new TextDocumentContentChangeEvent(
                            "\\newcommand{\\rep}[1]{\\mathbf{#1}} \\newcommand{\\wick}{\\rep{3}}"));
            PublishDiagnosticsParams published = editor.nextDiagnostics();
            while (published.getDiagnostics().isEmpty()) {
                published = editor.nextDiagnostics();
            }
            assertEquals(1, published.getDiagnostics().size());
        }
    }

    @Test
    void hoverOnAnIrrepGivesItsFacts() {
        try (Editor editor = editor()) {
            editor.open("In SU(3) $\\mathbf{3}\\otimes\\mathbf{8} = \\overline{\\mathbf{6}}$");
            String octet = editor.hover(0, 33);
            for (String fact : List.of(
                    "of SU(3)",
                    "- dimension: 8",
                    "- Dynkin label: (1,1)",
                    "- reality: real",
                    "- index: ",
                    "- quadratic Casimir: ",
                    "- Young diagram:")) {
                assertTrue(octet.contains(fact), fact + " in:\n" + octet);
            }
        }
    }

    @Test
    void everyQuickFixMendsItsFindingAndBreaksNothing() throws IOException {
        String uri = DEMO.resolve("lantern.tex").toUri().toString();
        String text = Files.readString(DEMO.resolve("lantern.tex"));
        try (Editor editor = editor()) {
            editor.open(uri, 1, text);
            List<Diagnostic> shown = editor.nextDiagnostics().getDiagnostics();
            int version = 1;
            int fixed = 0;
            for (Diagnostic finding : shown) {
                for (var action :
                        editor.codeActions(uri, finding.getRange(), new CodeActionContext(List.of(finding)))) {
                    TextEdit edit =
                            action.getRight().getEdit().getChanges().get(uri).get(0);
                    editor.change(
                            uri, ++version, new TextDocumentContentChangeEvent(edit.getRange(), edit.getNewText()));
                    List<Diagnostic> left = editor.nextDiagnostics().getDiagnostics();
                    assertEquals(shown.size() - 1, left.size(), edit.toString());
                    assertFalse(left.contains(finding), edit.toString());
                    editor.change(uri, ++version, new TextDocumentContentChangeEvent(text));
                    assertEquals(shown, editor.nextDiagnostics().getDiagnostics());
                    fixed++;
                }
            }
            assertTrue(fixed >= 4, fixed + " fixes");
        }
    }

    @Test
    void theGroupOfTheSettingsDecides() {
        try (Editor editor = new Editor(Checker::check, Duration.ZERO)) {
            editor.initialize("{initializationOptions: {group: 'SU(4)'}}");
            editor.open("$\\mathbf{4}\\otimes\\mathbf{4} = \\mathbf{6}\\oplus\\mathbf{10}$"
                    + " and $\\mathbf{4}\\otimes\\mathbf{4} = \\mathbf{15}\\oplus\\mathbf{1}$");
            assertEquals(1, editor.nextDiagnostics().getDiagnostics().size());
            assertTrue(editor.hover(0, 3).contains("of SU(4)"), editor.hover(0, 3));
        }
    }
}
