package irreproof.server.transport;

import com.google.gson.JsonObject;
import java.util.concurrent.CompletableFuture;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.jsonrpc.services.JsonNotification;
import org.eclipse.lsp4j.jsonrpc.services.JsonRequest;

/** What this server ever says to an editor of its own accord. No method waits for the editor. */
public interface EditorClient {
    @JsonNotification("textDocument/publishDiagnostics")
    void publishDiagnostics(PublishDiagnosticsParams diagnostics);

    @JsonNotification("window/logMessage")
    void logMessage(MessageParams message);

    /** @param parameters {@code ApplyWorkspaceEditParams}, kept as JSON: an edit that went through the client and back */
    @JsonRequest("workspace/applyEdit")
    CompletableFuture<Object> applyEdit(JsonObject parameters);
}
