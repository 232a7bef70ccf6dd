package irreproof.server;

import irreproof.server.transport.EditorClient;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import org.eclipse.lsp4j.DidChangeTextDocumentParams;
import org.eclipse.lsp4j.DidCloseTextDocumentParams;
import org.eclipse.lsp4j.DidOpenTextDocumentParams;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.MessageType;
import org.eclipse.lsp4j.TextDocumentItem;
import org.eclipse.lsp4j.VersionedTextDocumentIdentifier;
import org.eclipse.lsp4j.jsonrpc.services.JsonNotification;

/**
 * Keeps the table of open documents as the client tells it and has them analysed: at once when opened, after a pause in
 * the typing when changed. Every language is read alike: the editor decides for which ones it asks this server.
 */
final class DocumentService {
    /** In UTF-16 units. No manuscript comes near; a data file that happens to be opened as LaTeX may. */
    private static final int LONGEST_DOCUMENT = 4 << 20;

    private final DocumentTable documents;
    private final Project project;
    private final Analyses analyses;
    private final PublishGate gate;
    private final EditorClient client;
    private final Supplier<Session> session;

    DocumentService(
            DocumentTable documents,
            Project project,
            Analyses analyses,
            PublishGate gate,
            EditorClient client,
            Supplier<Session> session) {
        this.documents = documents;
        this.project = project;
        this.analyses = analyses;
        this.gate = gate;
        this.client = client;
        this.session = session;
    }

    @JsonNotification("textDocument/didOpen")
    public void didOpen(DidOpenTextDocumentParams parameters) {
        TextDocumentItem item = parameters.getTextDocument();
        Document document = Document.of(item.getUri(), item.getVersion(), item.getText());
        documents.put(document);
        project.put(document);
        if (hasFairSize(document)) {
            analyses.start(document, project.sources(document));
        }
        again(analyses.dependentsOnPresence(document));
    }

    @JsonNotification("textDocument/didChange")
    public void didChange(DidChangeTextDocumentParams parameters) {
        VersionedTextDocumentIdentifier changed = parameters.getTextDocument();
        Document before = documents
                .find(changed.getUri())
                .orElseThrow(
                        () -> new IllegalArgumentException("a change of " + changed.getUri() + ", which is not open"));
        String text = ContentChanges.apply(
                before.source().content(),
                parameters.getContentChanges(),
                session.get().client().encoding());
        int version = Optional.ofNullable(changed.getVersion()).orElse(before.version());
        Document document = before.changed(version, text);
        documents.put(document);
        project.put(document);
        if (hasFairSize(document)) {
            analyses.startSoon(document, project.sources(document));
        }
        again(analyses.dependents(document));
    }

    @JsonNotification("textDocument/didClose")
    public void didClose(DidCloseTextDocumentParams parameters) {
        documents.remove(parameters.getTextDocument().getUri()).ifPresent(document -> {
            analyses.forget(document.uri());
            gate.close(document);
            project.remove(document);
            again(analyses.dependentsOnPresence(document));
        });
    }

    private void again(List<Document> dependents) {
        dependents.forEach(document -> analyses.startSoon(document, project.sources(document)));
    }

    private boolean hasFairSize(Document document) {
        if (document.source().content().length() <= LONGEST_DOCUMENT) {
            return true;
        }
        analyses.forget(document.uri());
        gate.close(document);
        client.logMessage(new MessageParams(
                MessageType.Warning, document.source().path() + " is too large to be checked while it is edited"));
        return false;
    }
}
