package irreproof.server;

import irreproof.server.transport.EditorClient;
import irreproof.workspace.Version;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.function.Consumer;
import java.util.function.IntConsumer;
import org.eclipse.lsp4j.CodeActionKind;
import org.eclipse.lsp4j.CodeActionOptions;
import org.eclipse.lsp4j.ExecuteCommandOptions;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.InitializeResult;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.MessageType;
import org.eclipse.lsp4j.ServerCapabilities;
import org.eclipse.lsp4j.ServerInfo;
import org.eclipse.lsp4j.TextDocumentSyncKind;
import org.eclipse.lsp4j.TextDocumentSyncOptions;
import org.eclipse.lsp4j.jsonrpc.services.JsonNotification;
import org.eclipse.lsp4j.jsonrpc.services.JsonRequest;

/** From initialize to exit. */
final class LifeCycle {
    private final EditorClient client;
    private final Consumer<Session> begin;
    private final IntConsumer end;
    private boolean shutdownAsked;

    /**
     * @param begin told what initialize settled
     * @param end told the exit code
     */
    LifeCycle(EditorClient client, Consumer<Session> begin, IntConsumer end) {
        this.client = client;
        this.begin = begin;
        this.end = end;
    }

    @JsonRequest("initialize")
    public CompletableFuture<InitializeResult> initialize(InitializeParams parameters) {
        Settings settings = Settings.of(parameters.getInitializationOptions());
        ClientProfile profile = ClientProfile.of(parameters, settings);
        begin.accept(new Session(profile, settings));
        settings.problems().forEach(problem -> client.logMessage(new MessageParams(MessageType.Warning, problem)));
        // A process that is not to be seen from here (another machine's, another container's) says nothing.
        if (parameters.getProcessId() != null) {
            ProcessHandle.of(parameters.getProcessId())
                    .ifPresent(editor -> editor.onExit().thenRun(() -> end.accept(0)));
        }
        return CompletableFuture.completedFuture(
                new InitializeResult(capabilities(profile), new ServerInfo("irreproof", Version.text())));
    }

    @JsonRequest("shutdown")
    public CompletableFuture<Object> shutdown() {
        shutdownAsked = true;
        return CompletableFuture.completedFuture(null);
    }

    @JsonNotification("exit")
    public void exit() {
        end.accept(shutdownAsked ? 0 : 1);
    }

    private static ServerCapabilities capabilities(ClientProfile profile) {
        ServerCapabilities result = new ServerCapabilities();
        if (profile.encodingOffered()) {
            result.setPositionEncoding(profile.encoding().word());
        }
        TextDocumentSyncOptions sync = new TextDocumentSyncOptions();
        sync.setOpenClose(true);
        sync.setChange(TextDocumentSyncKind.Incremental);
        result.setTextDocumentSync(sync);
        result.setHoverProvider(true);
        if (profile.actionLiterals()) {
            result.setCodeActionProvider(new CodeActionOptions(List.of(CodeActionKind.QuickFix)));
        } else if (profile.applyEdit()) {
            result.setCodeActionProvider(true);
            result.setExecuteCommandProvider(new ExecuteCommandOptions(List.of(QuickFixes.APPLY_COMMAND)));
        }
        return result;
    }
}
