package irreproof.server;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Function;
import org.eclipse.lsp4j.ClientCapabilities;
import org.eclipse.lsp4j.CodeActionCapabilities;
import org.eclipse.lsp4j.GeneralClientCapabilities;
import org.eclipse.lsp4j.HoverCapabilities;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.MarkupKind;
import org.eclipse.lsp4j.PublishDiagnosticsCapabilities;
import org.eclipse.lsp4j.TextDocumentClientCapabilities;
import org.eclipse.lsp4j.WorkspaceClientCapabilities;

/**
 * What this client can do, as far as the answers depend on it.
 *
 * @param encoding the units of its positions
 * @param encodingOffered whether the client itself offered that encoding, so that it may be named in the answer
 * @param markdown whether hovers may be Markdown
 * @param relatedInformation whether a diagnostic may point at further places
 * @param actionLiterals whether a code action may carry its edit; otherwise it is a command
 * @param preferredActions whether a code action may be marked as the preferred one
 * @param versionedEdits whether an edit may name the version it was made for
 * @param applyEdit whether the server may ask for an edit
 */
record ClientProfile(
        PositionEncoding encoding,
        boolean encodingOffered,
        boolean markdown,
        boolean relatedInformation,
        boolean actionLiterals,
        boolean preferredActions,
        boolean versionedEdits,
        boolean applyEdit) {

    /** A client counts in the encoding that the settings name, else in the first of its offers known here, else UTF-16. */
    static ClientProfile of(InitializeParams client, Settings settings) {
        Optional<ClientCapabilities> all = Optional.ofNullable(client.getCapabilities());
        Optional<TextDocumentClientCapabilities> text = all.map(ClientCapabilities::getTextDocument);
        Optional<CodeActionCapabilities> actions = text.map(TextDocumentClientCapabilities::getCodeAction);
        Optional<WorkspaceClientCapabilities> workspace = all.map(ClientCapabilities::getWorkspace);
        List<PositionEncoding> offers = all
                .map(ClientCapabilities::getGeneral)
                .map(GeneralClientCapabilities::getPositionEncodings)
                .orElse(List.of())
                .stream()
                .map(PositionEncoding::named)
                .flatMap(Optional::stream)
                .toList();
        PositionEncoding negotiated = offers.isEmpty() ? PositionEncoding.UTF_16 : offers.get(0);
        PositionEncoding encoding = Objects.requireNonNullElse(settings.positionEncoding(), negotiated);
        return new ClientProfile(
                encoding,
                offers.contains(encoding),
                text.map(TextDocumentClientCapabilities::getHover)
                        .map(HoverCapabilities::getContentFormat)
                        .orElse(List.of())
                        .contains(MarkupKind.MARKDOWN),
                is(
                        text.map(TextDocumentClientCapabilities::getPublishDiagnostics),
                        PublishDiagnosticsCapabilities::getRelatedInformation),
                actions.map(CodeActionCapabilities::getCodeActionLiteralSupport).isPresent(),
                is(actions, CodeActionCapabilities::getIsPreferredSupport),
                is(workspace.map(WorkspaceClientCapabilities::getWorkspaceEdit), edit -> edit.getDocumentChanges()),
                is(workspace, WorkspaceClientCapabilities::getApplyEdit));
    }

    private static <T> boolean is(Optional<T> capabilities, Function<T, Boolean> flag) {
        return capabilities.map(flag).orElse(false);
    }
}
