package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.Gson;
import irreproof.text.LineIndex;
import java.util.List;
import org.eclipse.lsp4j.CodeAction;
import org.eclipse.lsp4j.CodeActionContext;
import org.eclipse.lsp4j.CodeActionKind;
import org.eclipse.lsp4j.Command;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.ExecuteCommandParams;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.eclipse.lsp4j.TextDocumentEdit;
import org.eclipse.lsp4j.TextEdit;
import org.eclipse.lsp4j.WorkspaceEdit;
import org.eclipse.lsp4j.jsonrpc.messages.Either;
import org.junit.jupiter.api.Test;

/** Quick fixes: offered where they belong, in the form that the client understands, and right when applied. */
class QuickFixesTest {
    private static final String LITERALS =
            "codeAction: {codeActionLiteralSupport: {codeActionKind: {valueSet: ['quickfix']}}, isPreferredSupport: true}";
    private static final String MODERN =
            "{capabilities: {textDocument: {" + LITERALS + "}, workspace: {workspaceEdit: {documentChanges: true}}}}";
    private static final String NO_DOCUMENT_CHANGES = "{capabilities: {textDocument: {" + LITERALS + "}}}";
    private static final String COMMANDS = "{capabilities: {workspace: {applyEdit: true}}}";

    private static final Marked WRONG = Marked.of("""
            2 \\otimes 2 = 3 \\oplus 1
            3 \\otimes 3 = 6 \\oplus 4, 1 \\otimes 1 = 2
                          ^
            """);
    private static final String MENDED = """
            2 \\otimes 2 = 3 \\oplus 1
            3 \\otimes 3 = 6 \\oplus 3, 1 \\otimes 1 = 2
            """;

    private static Range cursor(Position position) {
        return new Range(position, position);
    }

    private static List<Either<Command, CodeAction>> actions(Editor editor, Range range) {
        return editor.codeActions(range, new CodeActionContext(List.of()));
    }

    private static String apply(String text, List<TextEdit> edits, PositionEncoding encoding) {
        Places places = new Places(text, new LineIndex(text), encoding);
        return irreproof.text.TextEdit.apply(
                text,
                edits.stream()
                        .map(edit -> new irreproof.text.TextEdit(places.span(edit.getRange()), edit.getNewText()))
                        .toList());
    }

    private static List<TextEdit> versioned(WorkspaceEdit edit, int version) {
        TextDocumentEdit change = edit.getDocumentChanges().get(0).getLeft();
        assertEquals(Editor.URI, change.getTextDocument().getUri());
        assertEquals(version, change.getTextDocument().getVersion());
        return change.getEdits().stream().map(Either::getLeft).toList();
    }

    @Test
    void aModernClientGetsVersionedEdits() {
        try (Editor editor = Editor.with(MODERN)) {
            editor.open(Editor.URI, 4, WRONG.text());
            CodeAction action =
                    actions(editor, cursor(WRONG.range().getStart())).get(0).getRight();
            assertEquals("Replace by 3", action.getTitle());
            assertEquals(CodeActionKind.QuickFix, action.getKind());
            assertTrue(action.getIsPreferred());
            assertEquals(MENDED, apply(WRONG.text(), versioned(action.getEdit(), 4), PositionEncoding.UTF_16));
        }
    }

    @Test
    void applyingTheFixMakesTheDiagnosticGo() {
        try (Editor editor = Editor.with(MODERN)) {
            editor.open(WRONG.text());
            assertEquals(2, editor.nextDiagnostics().getDiagnostics().size());
            CodeAction action =
                    actions(editor, cursor(WRONG.range().getStart())).get(0).getRight();
            TextEdit edit = versioned(action.getEdit(), 1).get(0);
            editor.change(2, new TextDocumentContentChangeEvent(edit.getRange(), edit.getNewText()));
            List<Diagnostic> left = editor.nextDiagnostics().getDiagnostics();
            assertEquals(1, left.size());
            assertEquals(40, left.get(0).getRange().getStart().getCharacter(), "the other statement's");
        }
    }

    @Test
    void aClientWithoutDocumentChangesGetsPlainChanges() {
        try (Editor editor = Editor.with(NO_DOCUMENT_CHANGES)) {
            editor.open(WRONG.text());
            WorkspaceEdit edit = actions(editor, cursor(WRONG.range().getStart()))
                    .get(0)
                    .getRight()
                    .getEdit();
            assertNull(edit.getDocumentChanges());
            assertEquals(MENDED, apply(WRONG.text(), edit.getChanges().get(Editor.URI), PositionEncoding.UTF_16));
        }
    }

    @Test
    void aClientWithoutLiteralsGetsACommandThatSendsTheEdit() {
        try (Editor editor = Editor.with(COMMANDS)) {
            editor.open(WRONG.text());
            Command command =
                    actions(editor, cursor(WRONG.range().getStart())).get(0).getLeft();
            Editor.await(editor.server()
                    .getWorkspaceService()
                    .executeCommand(new ExecuteCommandParams(command.getCommand(), command.getArguments())));
            WorkspaceEdit edit = editor.nextEdit().getEdit();
            assertEquals(MENDED, apply(WRONG.text(), edit.getChanges().get(Editor.URI), PositionEncoding.UTF_16));
        }
    }

    @Test
    void aCommandThatIsNotOursDoesNothing() {
        try (Editor editor = Editor.with(COMMANDS)) {
            Editor.await(editor.server()
                    .getWorkspaceService()
                    .executeCommand(new ExecuteCommandParams("irreproof.applyFix", List.of(new Gson().toJsonTree(1)))));
            Editor.await(editor.server().getWorkspaceService().executeCommand(new ExecuteCommandParams("other", null)));
        }
    }

    @Test
    void onlyTheFindingsAtTheRangeAreFixed() {
        try (Editor editor = Editor.with(MODERN)) {
            editor.open(WRONG.text());
            assertEquals(0, actions(editor, cursor(new Position(0, 5))).size());
            assertEquals(0, actions(editor, cursor(new Position(1, 2))).size());
            assertEquals(1, actions(editor, cursor(new Position(1, 24))).size(), "right behind the finding");
            assertEquals(
                    2,
                    actions(editor, new Range(new Position(1, 0), new Position(2, 0)))
                            .size());
        }
    }

    @Test
    void onlyTheFirstActionIsPreferred() {
        try (Editor editor = Editor.with(MODERN)) {
            editor.open(WRONG.text());
            List<Either<Command, CodeAction>> both = actions(editor, new Range(new Position(1, 0), new Position(2, 0)));
            assertTrue(both.get(0).getRight().getIsPreferred());
            assertNull(both.get(1).getRight().getIsPreferred());
        }
    }

    @Test
    void aDiagnosticThatTheClientNamesIsFixedFromAnywhere() {
        try (Editor editor = Editor.with(MODERN)) {
            editor.open(WRONG.text());
            Diagnostic shown = editor.nextDiagnostics().getDiagnostics().get(0);
            // Some clients send back only what they keep themselves.
            Diagnostic kept = new Diagnostic(shown.getRange(), "text of its own");
            kept.setCode(shown.getCode());
            List<Either<Command, CodeAction>> actions =
                    editor.codeActions(cursor(new Position(1, 0)), new CodeActionContext(List.of(kept)));
            assertEquals(1, actions.size());
            assertEquals(List.of(kept), actions.get(0).getRight().getDiagnostics());
        }
    }

    @Test
    void otherKindsOfActionsAreNotOffered() {
        try (Editor editor = Editor.with(MODERN)) {
            editor.open(WRONG.text());
            Range place = cursor(WRONG.range().getStart());
            assertEquals(
                    0,
                    editor.codeActions(place, new CodeActionContext(List.of(), List.of("refactor")))
                            .size());
            assertEquals(
                    1,
                    editor.codeActions(place, new CodeActionContext(List.of(), List.of("quickfix")))
                            .size());
            assertEquals(
                    1,
                    editor.codeActions(place, new CodeActionContext(List.of(), List.of("")))
                            .size());
        }
    }

    @Test
    void aClientThatCanDoNeitherGetsNone() {
        try (Editor editor = Editor.plain()) {
            editor.open(WRONG.text());
            assertEquals(0, actions(editor, cursor(WRONG.range().getStart())).size());
        }
    }
}
