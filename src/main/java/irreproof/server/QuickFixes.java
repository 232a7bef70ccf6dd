package irreproof.server;

import irreproof.check.FileReport;
import irreproof.check.Finding;
import irreproof.check.Fix;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.eclipse.lsp4j.CodeAction;
import org.eclipse.lsp4j.CodeActionContext;
import org.eclipse.lsp4j.CodeActionKind;
import org.eclipse.lsp4j.CodeActionParams;
import org.eclipse.lsp4j.Command;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.SnippetTextEdit;
import org.eclipse.lsp4j.TextDocumentEdit;
import org.eclipse.lsp4j.TextEdit;
import org.eclipse.lsp4j.VersionedTextDocumentIdentifier;
import org.eclipse.lsp4j.WorkspaceEdit;
import org.eclipse.lsp4j.jsonrpc.messages.Either;

/**
 * Code actions: the fixes of the findings at a place. They are taken from the report, never from what a diagnostic
 * carries, because many clients do not send that back.
 */
record QuickFixes(Document document, FileReport report, ClientProfile client) {
    /** For clients that take commands only; its arguments are a title and the edit. */
    static final String APPLY_COMMAND = "irreproof.applyFix";

    List<Either<Command, CodeAction>> at(CodeActionParams request) {
        if (!wanted(request.getContext()) || !client.actionLiterals() && !client.applyEdit()) {
            return List.of();
        }
        Diagnostics diagnostics = new Diagnostics(document, report, client);
        Span place = document.places(client.encoding()).span(request.getRange());
        List<Either<Command, CodeAction>> actions = new ArrayList<>();
        for (Finding finding : report.allFindings()) {
            Diagnostic diagnostic = diagnostics.of(finding);
            List<Diagnostic> shown = shown(request.getContext(), diagnostic);
            boolean here = finding.span().touches(place.start())
                    || place.touches(finding.span().start());
            if (here || !shown.isEmpty()) {
                finding.fixes().forEach(fix -> actions.add(action(fix, shown, actions.isEmpty())));
            }
        }
        return actions;
    }

    private static boolean wanted(CodeActionContext context) {
        List<String> only = context == null ? null : context.getOnly();
        return only == null
                || only.isEmpty()
                || only.contains(CodeActionKind.QuickFix)
                || only.contains(CodeActionKind.Empty);
    }

    /** The client's own copies of the diagnostic: an editor may ask for a whole line, or want to link the two. */
    private static List<Diagnostic> shown(CodeActionContext context, Diagnostic diagnostic) {
        if (context == null || context.getDiagnostics() == null) {
            return List.of();
        }
        return context.getDiagnostics().stream()
                .filter(other -> diagnostic.getRange().equals(other.getRange())
                        && diagnostic.getCode().equals(other.getCode()))
                .toList();
    }

    private Either<Command, CodeAction> action(Fix fix, List<Diagnostic> shown, boolean first) {
        if (!client.actionLiterals()) {
            return Either.forLeft(new Command(fix.title(), APPLY_COMMAND, List.of(fix.title(), edit(fix))));
        }
        CodeAction action = new CodeAction(fix.title());
        action.setKind(CodeActionKind.QuickFix);
        action.setEdit(edit(fix));
        if (!shown.isEmpty()) {
            action.setDiagnostics(shown);
        }
        if (first && client.preferredActions()) {
            action.setIsPreferred(true);
        }
        return Either.forRight(action);
    }

    private WorkspaceEdit edit(Fix fix) {
        Places places = document.places(client.encoding());
        List<TextEdit> edits = fix.edits().stream()
                .map(edit -> new TextEdit(places.range(edit.span()), edit.newText()))
                .toList();
        if (!client.versionedEdits()) {
            return new WorkspaceEdit(Map.of(document.uri(), edits));
        }
        VersionedTextDocumentIdentifier target =
                new VersionedTextDocumentIdentifier(document.uri(), document.version());
        TextDocumentEdit change = new TextDocumentEdit(
                target,
                edits.stream().map(Either::<TextEdit, SnippetTextEdit>forLeft).toList());
        WorkspaceEdit result = new WorkspaceEdit(List.of(Either.forLeft(change)));
        result.setChanges(null);
        return result;
    }
}
