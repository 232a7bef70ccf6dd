package irreproof.server;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.Gson;
import com.google.gson.JsonObject;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PipedInputStream;
import java.io.PipedOutputStream;
import java.io.UncheckedIOException;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import org.eclipse.lsp4j.ApplyWorkspaceEditParams;
import org.eclipse.lsp4j.ApplyWorkspaceEditResponse;
import org.eclipse.lsp4j.CodeAction;
import org.eclipse.lsp4j.CodeActionContext;
import org.eclipse.lsp4j.CodeActionParams;
import org.eclipse.lsp4j.Command;
import org.eclipse.lsp4j.DidChangeTextDocumentParams;
import org.eclipse.lsp4j.DidCloseTextDocumentParams;
import org.eclipse.lsp4j.DidOpenTextDocumentParams;
import org.eclipse.lsp4j.Hover;
import org.eclipse.lsp4j.HoverParams;
import org.eclipse.lsp4j.InitializeResult;
import org.eclipse.lsp4j.InitializedParams;
import org.eclipse.lsp4j.MessageActionItem;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.ShowMessageRequestParams;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.TextDocumentItem;
import org.eclipse.lsp4j.VersionedTextDocumentIdentifier;
import org.eclipse.lsp4j.jsonrpc.Launcher;
import org.eclipse.lsp4j.jsonrpc.RemoteEndpoint;
import org.eclipse.lsp4j.jsonrpc.messages.Either;
import org.eclipse.lsp4j.launch.LSPLauncher;
import org.eclipse.lsp4j.services.LanguageClient;
import org.eclipse.lsp4j.services.LanguageServer;

/** An editor for tests: a real client that talks to a real server over a pair of pipes. */
final class Editor implements LanguageClient, AutoCloseable {
    static final String URI = "file:///ws/paper.tex";

    /** Generous: a test that runs into it has failed. */
    private static final long SECONDS = 60;

    private final BlockingQueue<PublishDiagnosticsParams> published = new LinkedBlockingQueue<>();
    private final BlockingQueue<MessageParams> logged = new LinkedBlockingQueue<>();
    private final BlockingQueue<ApplyWorkspaceEditParams> edits = new LinkedBlockingQueue<>();
    private final CompletableFuture<Integer> exitCode = new CompletableFuture<>();
    private final OutputStream toServer;
    private final LanguageServer server;
    private final RemoteEndpoint endpoint;

    Editor(Analysis analysis, Duration pause) {
        try {
            PipedInputStream serverIn = new PipedInputStream(1 << 20);
            PipedInputStream clientIn = new PipedInputStream(1 << 20);
            toServer = new PipedOutputStream(serverIn);
            OutputStream serverOut = new PipedOutputStream(clientIn);
            Thread thread = new Thread(() -> {
                try {
                    exitCode.complete(ServerMain.run(serverIn, serverOut, analysis, pause));
                } catch (Throwable e) {
                    exitCode.completeExceptionally(e);
                }
            });
            thread.setDaemon(true);
            thread.start();
            Launcher<LanguageServer> launcher = LSPLauncher.createClientLauncher(this, clientIn, toServer);
            launcher.startListening();
            server = launcher.getRemoteProxy();
            endpoint = launcher.getRemoteEndpoint();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** With the small analysis of these tests and no pause, not yet initialized. */
    static Editor fresh() {
        return new Editor(DimensionSums::check, Duration.ZERO);
    }

    /** Initialized with the capabilities and options given as JSON. */
    static Editor with(String initializeParams) {
        Editor editor = fresh();
        editor.initialize(initializeParams);
        return editor;
    }

    static Editor plain() {
        return with("{}");
    }

    InitializeResult initialize(String json) {
        InitializeResult result = await(endpoint.request("initialize", new Gson().fromJson(json, JsonObject.class)))
                        instanceof InitializeResult answer
                ? answer
                : null;
        server.initialized(new InitializedParams());
        return result;
    }

    void open(String text) {
        open(URI, 1, text);
    }

    void open(String uri, int version, String text) {
        server.getTextDocumentService()
                .didOpen(new DidOpenTextDocumentParams(new TextDocumentItem(uri, "latex", version, text)));
    }

    void change(int version, TextDocumentContentChangeEvent... changes) {
        change(URI, version, changes);
    }

    void change(String uri, int version, TextDocumentContentChangeEvent... changes) {
        server.getTextDocumentService()
                .didChange(new DidChangeTextDocumentParams(
                        new VersionedTextDocumentIdentifier(uri, version), List.of(changes)));
    }

    void close(String uri) {
        server.getTextDocumentService().didClose(new DidCloseTextDocumentParams(new TextDocumentIdentifier(uri)));
    }

    CompletableFuture<Hover> askHover(int line, int character) {
        return server.getTextDocumentService()
                .hover(new HoverParams(new TextDocumentIdentifier(URI), new Position(line, character)));
    }

    String hover(int line, int character) {
        Hover hover = await(askHover(line, character));
        return hover == null ? null : hover.getContents().getRight().getValue();
    }

    List<Either<Command, CodeAction>> codeActions(Range range, CodeActionContext context) {
        return codeActions(URI, range, context);
    }

    List<Either<Command, CodeAction>> codeActions(String uri, Range range, CodeActionContext context) {
        return await(server.getTextDocumentService()
                .codeAction(new CodeActionParams(new TextDocumentIdentifier(uri), range, context)));
    }

    PublishDiagnosticsParams nextDiagnostics() {
        return next(published);
    }

    MessageParams nextLog() {
        return next(logged);
    }

    ApplyWorkspaceEditParams nextEdit() {
        return next(edits);
    }

    /** Everything published or logged before the server answers this. */
    List<PublishDiagnosticsParams> drainDiagnostics() {
        hover(0, 0);
        List<PublishDiagnosticsParams> result = new ArrayList<>();
        published.drainTo(result);
        return result;
    }

    List<MessageParams> drainLog() {
        List<MessageParams> result = new ArrayList<>();
        logged.drainTo(result);
        return result;
    }

    LanguageServer server() {
        return server;
    }

    RemoteEndpoint endpoint() {
        return endpoint;
    }

    /** Bytes past the client library. */
    OutputStream raw() {
        return toServer;
    }

    int awaitExit() {
        return await(exitCode);
    }

    /** The polite end. */
    void leave() {
        await(server.shutdown());
        server.exit();
        assertEquals(0, awaitExit());
    }

    @Override
    public void close() {
        try {
            toServer.close();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        awaitExit();
    }

    static <T> T await(CompletableFuture<T> future) {
        try {
            return future.get(SECONDS, TimeUnit.SECONDS);
        } catch (ExecutionException e) {
            if (e.getCause() instanceof RuntimeException cause) {
                throw cause;
            }
            throw new AssertionError(e.getCause());
        } catch (InterruptedException | TimeoutException e) {
            throw new AssertionError(e);
        }
    }

    private static <T> T next(BlockingQueue<T> queue) {
        try {
            T value = queue.poll(SECONDS, TimeUnit.SECONDS);
            assertTrue(value != null, "nothing came");
            return value;
        } catch (InterruptedException e) {
            throw new AssertionError(e);
        }
    }

    @Override
    public void publishDiagnostics(PublishDiagnosticsParams diagnostics) {
        published.add(diagnostics);
    }

    @Override
    public void logMessage(MessageParams message) {
        logged.add(message);
    }

    @Override
    public CompletableFuture<ApplyWorkspaceEditResponse> applyEdit(ApplyWorkspaceEditParams parameters) {
        edits.add(parameters);
        return CompletableFuture.completedFuture(new ApplyWorkspaceEditResponse(true));
    }

    @Override
    public void telemetryEvent(Object object) {
        throw new AssertionError("the server never measures its users");
    }

    @Override
    public void showMessage(MessageParams message) {
        throw new AssertionError(message.getMessage());
    }

    @Override
    public CompletableFuture<MessageActionItem> showMessageRequest(ShowMessageRequestParams request) {
        throw new AssertionError(request.getMessage());
    }
}
